/** Workings of openings: the shear at the opening shared by the strips beside it, each bending on its own. */
import type { Opening } from '../building/definition.js';
import type { InnerForces } from '../diaphragms/inner-forces.js';
import { stripsBeside } from '../diaphragms/opening.js';
import { dot } from '../geometry/frame.js';
import { cutAt, totalLength } from '../geometry/profile.js';
import { valueAt } from '../statics/polynomial.js';
import type { Demand } from '../path/result.js';
import { readOff, type Context } from './context.js';
import { diaphragmOf } from './design.js';
import { depthAt } from './spans.js';
import { momentStep, short, staticsOf } from './left-of.js';
import type { Steps, Value } from './steps.js';

const CLAUSE = 'method of ATC-7 (1981) and Diekmann (1982), from memory, not checked against the documents';

export function openingMoment(context: Context, demand: Demand, steps: Steps): void {
  const found = stripMoments(context, demand, steps, false);
  steps.add(
    steps.fresh('M_s'),
    most(found.map(({ moment }) => moment)),
    found.map(({ moment }) => moment),
    demand.unit,
    { what: 'largest secondary moment of a strip' },
  );
}

export function openingCorner(context: Context, demand: Demand, steps: Steps): void {
  const found = stripMoments(context, demand, steps, false);
  const forces = found.map(({ moment, strip }, i) =>
    steps.add(steps.fresh(`C_${i + 1}`), `${moment.symbol}/${strip.symbol}`, [moment, strip], demand.unit, {
      what: 'couple of the strip’s edges',
    }),
  );
  steps.add(steps.fresh('C'), most(forces), forces, demand.unit, {
    what: 'largest force of a strip’s inner edge',
    clause: CLAUSE,
  });
}

export function openingChord(context: Context, demand: Demand, steps: Steps): void {
  const found = stripMoments(context, demand, steps, true);
  const forces = found.map(({ moment, strip, chord }, i) =>
    steps.add(
      steps.fresh(`T_${i + 1}`),
      `abs(${chord?.symbol ?? '0'}) + ${moment.symbol}/${strip.symbol}`,
      [...(chord === undefined ? [] : [chord]), moment, strip],
      demand.unit,
      {
        what: 'the diaphragm’s chord force and the strip’s own',
      },
    ),
  );
  steps.add(steps.fresh('T'), most(forces), forces, demand.unit, {
    what: 'largest force in a strip’s outer chord',
    clause: CLAUSE,
  });
}

function most(values: readonly Value[]): string {
  return values.length === 0 ? '0' : `max(${values.map(({ symbol }) => symbol).join(', ')})`;
}

/** The secondary moment of every strip at both ends of the opening, with the diaphragm's chord force there where it is asked for. */
function stripMoments(context: Context, demand: Demand, steps: Steps, chords: boolean) {
  const { outcome, inner } = diaphragmOf(context, demand.case, demand.member);
  const id = demand.member.split('/')[2];
  const opening = (outcome.diaphragm.diaphragm.openings ?? []).find((each) => each.id === id);
  // Rows of an opening come from the last frame that has them.
  const each = [...inner]
    .reverse()
    .find(
      (forces) =>
        opening !== undefined &&
        openingParts(forces, opening).halves.some(({ strips }) => strips.length > 0) &&
        forces.pieces.some(({ shear }) => shear.some((c) => c !== 0)),
    );
  if (opening === undefined || each === undefined) throw new Error(`no opening ${demand.member}`);
  const statics = staticsOf(context, demand, outcome, each.frame, steps);
  const parts = openingParts(each, opening);
  const { length, moment: unit, force } = context.units;
  const path = `${outcome.diaphragm.path}.openings[${(outcome.diaphragm.diaphragm.openings ?? []).indexOf(opening)}].outline`;
  const out: { moment: Value; strip: Value; chord?: Value }[] = [];
  parts.halves.forEach(({ strips, depth, from, to, end, chordDepth }, h) => {
    if (strips.length === 0) return;
    const near = momentStep(statics, from, 'without-couples', steps.fresh(`Q_${2 * h + 1}`));
    const far = momentStep(statics, to, 'without-couples', steps.fresh(`Q_${2 * h + 2}`));
    const area = steps.add(steps.fresh(`V_a_${h + 1}`), `abs(${far.symbol} − ${near.symbol})`, [far, near], unit, {
      what: `shear from s = ${short(from)} to s = ${short(to)}, one half of the opening, summed up`,
      clause: 'a point of inflection at the middle of the opening',
    });
    let chord: Value | undefined;
    if (chords && chordDepth > 0) {
      const whole = momentStep(statics, end, 'with-couples', steps.fresh(`M_${h + 1}`));
      const D = depthAt(context, statics, 'D', chordDepth, `distance of the chords at s = ${short(end)}`);
      chord = steps.add(steps.fresh(`K_${h + 1}`), `${whole.symbol}/D`, [whole, D], force, {
        what: `chord force of the diaphragm at s = ${short(end)}`,
      });
    }
    const total = readOff(context, 'd', path, depth, length, 'net depth beside the opening');
    for (const size of strips) {
      const strip = readOff(context, `d_${out.length + 1}`, path, size, length, 'depth of the strip');
      const moment = steps.add(
        steps.fresh(`M_s_${out.length + 1}`),
        `${area.symbol}·${strip.symbol}/d`,
        [area, strip, total],
        unit,
        {
          what: 'secondary moment of a strip, in proportion to its depth',
          clause: CLAUSE,
        },
      );
      out.push({ moment, strip, ...(chord === undefined ? {} : { chord }) });
    }
  });
  return out;
}

/** The two halves of an opening along the span, each with the strips beside it. */
function openingParts({ profile, pieces }: InnerForces, opening: Opening) {
  const { frame, tolerance } = profile;
  const s = opening.outline.map((point) => dot(point, frame.s));
  const t = opening.outline.map((point) => dot(point, frame.t));
  const [near, far] = [Math.min(...s), Math.max(...s)];
  const middle = (near + far) / 2;
  const cut = cutAt(profile, middle);
  const chordBefore = pieces.find(({ from, to }) => near > from + tolerance && near <= to + tolerance);
  const chordAfter = pieces.find(({ from, to }) => far >= from - tolerance && far < to - tolerance);
  const half = (
    strips: typeof cut.left,
    from: number,
    to: number,
    end: number,
    piece: (typeof pieces)[number] | undefined,
  ) => ({
    strips: stripsBeside(strips, Math.min(...t), Math.max(...t), tolerance).map(([a, b]) => b - a),
    depth: totalLength(strips),
    from,
    to,
    end,
    chordDepth: piece === undefined ? 0 : valueAt(piece.chordDepth, end - piece.from),
  });
  return { halves: [half(cut.left, near, middle, near, chordBefore), half(cut.right, middle, far, far, chordAfter)] };
}
