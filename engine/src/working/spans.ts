/** Workings of diaphragm spans: the largest shear, unit shear, moment and chord force between adjacent wall lines. */
import { supportsOf } from '../diaphragms/flexible.js';
import type { InnerForces, InnerPiece } from '../diaphragms/inner-forces.js';
import { totalLength } from '../geometry/profile.js';
import { shearAtCollectors } from '../path/diaphragm-demands.js';
import { clip } from '../path/collectors.js';
import type { Demand } from '../path/result.js';
import { spansOf, type SpanRange } from '../path/span-demands.js';
import { largest, largestRatio, valueAt, type Extreme } from '../statics/polynomial.js';
import { readOff, type Context } from './context.js';
import { diaphragmOf } from './design.js';
import { momentStep, shearStep, short, staticsOf, type Statics } from './left-of.js';
import type { Steps, Value } from './steps.js';

type Found = {
  readonly statics: Statics;
  readonly inner: InnerForces;
  readonly span: SpanRange;
  readonly pieces: readonly InnerPiece[];
};

/** A place at which a quantity is largest, and the side of it. */
type Place = { readonly s: number; readonly after: boolean; readonly piece: InnerPiece; readonly x: number };

export function spanShear(context: Context, demand: Demand, steps: Steps): void {
  const { statics, pieces } = spanOf(context, demand, steps);
  const { s, after } = largestOf(pieces, (piece, length) => largest(piece.shear, length));
  const shear = shearStep(statics, s, after, steps.fresh('V'));
  steps.add(steps.fresh('V_max'), `abs(${shear.symbol})`, [shear], demand.unit, { what: 'largest shear of the span' });
}

export function spanUnitShear(context: Context, demand: Demand, steps: Steps): void {
  const { statics, pieces, inner, span } = spanOf(context, demand, steps);
  const level = demand.member.split('/')[0] ?? '';
  const place = largestOf(pieces, (piece, length) => largestRatio(piece.shear, piece.depth, length));
  const here = Math.abs(valueAt(place.piece.shear, place.x) / valueAt(place.piece.depth, place.x));
  const collectors = shearAtCollectors(inner, span, level);
  if (collectors <= here) {
    const shear = shearStep(statics, place.s, place.after, steps.fresh('V'));
    const depth = depthAt(
      context,
      statics,
      'd',
      valueAt(place.piece.depth, place.x),
      `net depth at s = ${short(place.s)}`,
    );
    steps.add(steps.fresh('v'), `abs(${shear.symbol})/d`, [shear, depth], demand.unit, {
      what: 'largest unit shear of the span',
      clause: 'shear even over the net depth',
    });
    return;
  }
  // A collector that is shorter than the cut takes the floor's shear over its own length.
  for (const { line, cut } of inner.diaphragm.touches) {
    if (line.family !== inner.frame) continue;
    for (const [at, after, side] of [
      [span.from, true, cut.right],
      [span.to, false, cut.left],
    ] as const) {
      if (Math.abs(line.s - at) > inner.profile.tolerance) continue;
      const length = totalLength(clip(side, [line], level));
      const piece = pieces.find((each) => Math.abs((after ? each.from : each.to) - at) <= inner.profile.tolerance);
      const size = piece === undefined ? 0 : Math.abs(valueAt(piece.shear, after ? 0 : piece.to - piece.from)) / length;
      if (Math.abs(size - collectors) > 1e-9 * collectors) continue;
      const shear = shearStep(statics, at, after, steps.fresh('V'));
      const own = readOff(
        context,
        'l',
        `wallLines[${line.index}].collectors`,
        length,
        context.units.length,
        `length of the collector of line ${line.line.id} at level ${level}`,
      );
      steps.add(steps.fresh('v'), `abs(${shear.symbol})/l`, [shear, own], demand.unit, {
        what: 'largest unit shear of the span, along the collector at its end',
      });
      return;
    }
  }
  throw new Error(`no collector governs ${demand.member}`);
}

export function spanMoment(context: Context, demand: Demand, steps: Steps): void {
  const { statics, pieces } = spanOf(context, demand, steps);
  const { s } = largestOf(pieces, (piece, length) => largest(piece.moment, length));
  const moment = momentStep(statics, s, 'with-couples', steps.fresh('M'));
  steps.add(steps.fresh('M_max'), `abs(${moment.symbol})`, [moment], demand.unit, {
    what: 'largest moment of the span',
  });
}

export function spanChord(context: Context, demand: Demand, steps: Steps): void {
  const { statics, pieces } = spanOf(context, demand, steps);
  const place = largestOf(pieces, (piece, length) => largestRatio(piece.moment, piece.chordDepth, length));
  const moment = momentStep(statics, place.s, 'with-couples', steps.fresh('M'));
  const depth = depthAt(
    context,
    statics,
    'D',
    valueAt(place.piece.chordDepth, place.x),
    `distance of the chords at s = ${short(place.s)}`,
  );
  steps.add(steps.fresh('T'), `abs(${moment.symbol})/D`, [moment, depth], demand.unit, {
    what: 'largest chord force of the span',
    clause: 'couple of the two chords',
  });
}

export function depthAt(context: Context, statics: Statics, symbol: string, depth: number, what: string): Value {
  return readOff(
    context,
    symbol,
    `${statics.source.outcome.diaphragm.path}.outline`,
    depth,
    context.units.length,
    what,
  );
}

/** The frame in which a member is a span: that of the load, or of walls that stop on the diaphragm. */
function spanOf(context: Context, demand: Demand, steps: Steps): Found {
  const { outcome, inner } = diaphragmOf(context, demand.case, demand.member);
  for (const each of inner) {
    const spans = spansOf(each, supportsOf(outcome.diaphragm, each.frame));
    const span = spans.find(({ member }) => member === demand.member);
    if (span === undefined) continue;
    const pieces = each.pieces.filter(({ from, to }) => {
      const middle = (from + to) / 2;
      return middle >= span.from && middle <= span.to;
    });
    return { statics: staticsOf(context, demand, outcome, each.frame, steps), inner: each, span, pieces };
  }
  throw new Error(`no span ${demand.member}`);
}

function largestOf(pieces: readonly InnerPiece[], of: (piece: InnerPiece, length: number) => Extreme): Place {
  let best: { place: Place; size: number } | undefined;
  for (const piece of pieces) {
    const length = piece.to - piece.from;
    const { x, value } = of(piece, length);
    if (best !== undefined && !(Math.abs(value) > best.size)) continue;
    best = { size: Math.abs(value), place: { s: piece.from + x, after: x < length / 2, piece, x } };
  }
  if (best === undefined) throw new Error('a span without pieces');
  return best.place;
}
