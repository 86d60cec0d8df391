/**
 * Statics of a diaphragm cut at one place: every force on the part before the cut, along the frame's t. A flexible diaphragm is cut
 * within its simple span; a body is cut as a whole, with the forces of all its wall lines known.
 */
import { dot } from '../geometry/frame.js';
import { totalLength, toPlan } from '../geometry/profile.js';
import { cutOf } from '../diaphragms/inner-forces.js';
import type { DiaphragmOutcome } from '../path/descent.js';
import type { Demand } from '../path/result.js';
import type { LineModel } from '../walls/wall-line.js';
import { linePath, readOff, type Context } from './context.js';
import { resultantSteps, rigidBody, rigidShear } from './rigid-body.js';
import {
  forcesWithin,
  handedOver,
  onSupport,
  spanReach,
  spanSource,
  supportPlace,
  type SpanSource,
} from './span-steps.js';
import type { Steps, Value } from './steps.js';

/** One force before the cut: its sign in V, where it acts, and a couple of its own. */
export type Before = {
  readonly sign: 1 | -1;
  readonly force?: Value;
  readonly at?: Value;
  /** Moment about the cut of a force without a place of its own. */
  readonly moment?: Value;
  /** Of walls across the load; not part of ∫V ds. */
  readonly couple?: Value;
};

export type Statics = {
  /** @param after whether what acts at the place itself is on the part before the cut */
  readonly cutAt: (place: number, after: boolean) => readonly Before[];
  readonly source: SpanSource;
};

/** @param frame index of the frame along which the shear acts */
export function staticsOf(
  context: Context,
  of: Pick<Demand, 'case' | 'sense'>,
  outcome: DiaphragmOutcome,
  frame: number,
  steps: Steps,
): Statics {
  const source = spanSource(context, of, outcome, frame, 1, 'diaphragm-force', steps);
  const known = new Map<string, readonly Before[]>();
  const cutAt =
    outcome.rigid === undefined
      ? (place: number, after: boolean) => spanCut(source, place, after)
      : bodyCut(source, of, outcome, steps);
  return {
    source,
    cutAt(place, after) {
      const key = `${place} ${after}`;
      let found = known.get(key);
      if (found === undefined) known.set(key, (found = cutAt(place, after)));
      return found;
    },
  };
}

/** V by steps: the sum of all that acts before the cut. */
export function shearStep(statics: Statics, place: number, after: boolean, symbol: string): Value {
  const { steps, context } = statics.source;
  const before = statics.cutAt(place, after).filter(({ force }) => force !== undefined);
  const formula = signedSum(before.map(({ sign, force }) => ({ sign, text: force?.symbol ?? '' })));
  return steps.add(
    symbol,
    formula,
    before.flatMap(({ force }) => force ?? []),
    context.units.force,
    {
      what: `shear ${after ? 'just after' : 'just before'} s = ${short(place)}`,
      clause: 'equilibrium of the part before the cut',
    },
  );
}

/** M by steps; without the couples of walls across the load it is ∫V ds. */
export function momentStep(
  statics: Statics,
  place: number,
  couples: 'with-couples' | 'without-couples',
  symbol: string,
): Value {
  const { steps, context } = statics.source;
  const at = readOff(
    context,
    's_cut',
    `${statics.source.outcome.diaphragm.path}.outline`,
    place,
    context.units.length,
    'place of the cut',
  );
  const terms: { sign: 1 | -1; text: string }[] = [];
  const values: Value[] = [];
  for (const each of statics.cutAt(place, false)) {
    if (each.force !== undefined && each.at !== undefined) {
      terms.push({ sign: each.sign, text: `${each.force.symbol}·(s_cut − ${each.at.symbol})` });
      values.push(each.force, each.at, at);
    }
    if (each.moment !== undefined) {
      terms.push({ sign: 1, text: each.moment.symbol });
      values.push(each.moment);
    }
    if (couples === 'with-couples' && each.couple !== undefined) {
      terms.push({ sign: 1, text: each.couple.symbol });
      values.push(each.couple);
    }
  }
  return steps.add(symbol, signedSum(terms), values, context.units.moment, {
    what: `${couples === 'with-couples' ? 'moment' : 'area of the shear diagram up to'} s = ${short(place)}`,
    clause: 'equilibrium of the part before the cut',
  });
}

function signedSum(terms: readonly { readonly sign: 1 | -1; readonly text: string }[]): string {
  const text = terms
    .map(({ sign, text: term }, i) => `${sign < 0 ? (i === 0 ? '−' : '− ') : i === 0 ? '' : '+ '}${term}`)
    .join(' ');
  return text === '' ? '0' : text;
}

export function short(value: number): string {
  return String(Number(value.toPrecision(6)));
}

/** Within a simple span: what its near line takes, and what lies between the span's start and the cut. */
function spanCut(source: SpanSource, place: number, after: boolean): readonly Before[] {
  const { supports, profile } = source;
  const { tolerance } = profile;
  const first = supports[0]?.s ?? 0;
  const last = supports[supports.length - 1]?.s ?? 0;
  const start = place < first - tolerance || (!after && place <= first + tolerance);
  const end = place > last + tolerance || (after && place >= last - tolerance);
  if (start) {
    const holds = (s: number): boolean => upTo(s, place, after, tolerance) && !onSupport(source, s);
    return forcesWithin(source, { from: profile.from, to: place, holds }).map(({ force, at }) => ({
      sign: -1,
      force,
      at,
    }));
  }
  if (end) {
    // What lies beyond the cut holds it up as the part before would.
    const holds = (s: number): boolean => !upTo(s, place, after, tolerance) && !onSupport(source, s);
    return forcesWithin(source, { from: place, to: profile.to, holds }).map(({ force, at }) => ({
      sign: 1,
      force,
      at,
    }));
  }
  let i = supports.length - 2;
  while (i > 0 && ((supports[i]?.s ?? 0) > place + tolerance || (!after && (supports[i]?.s ?? 0) >= place - tolerance)))
    i -= 1;
  const reach = spanReach(source, i);
  const near = handedOver(source, i, 'near', forcesWithin(source, reach), source.steps.fresh('R'));
  const at = supportPlace(source, `s_${near.symbol}`, i);
  const holds = (s: number): boolean => reach.holds(s) && upTo(s, place, after, tolerance);
  const before = place - reach.from <= tolerance ? [] : forcesWithin(source, { from: reach.from, to: place, holds });
  return [
    { sign: 1, force: near, at },
    ...before.map(({ force, at: where }): Before => ({ sign: -1, force, at: where })),
  ];
}

function upTo(s: number, place: number, after: boolean, tolerance: number): boolean {
  return s < place - tolerance || (after && s <= place + tolerance);
}

/** A body as a whole: wall lines, the level's force with its eccentricity, and the couples of lines that run across. */
function bodyCut(source: SpanSource, of: Pick<Demand, 'case' | 'sense'>, outcome: DiaphragmOutcome, steps: Steps) {
  const { context, profile, frame } = source;
  const { diaphragm } = outcome;
  const { length, force: unit, moment } = context.units;
  const net = netForces(context, of, outcome, steps);
  const { tolerance } = profile;
  const { s, t } = profile.frame;
  const reference = dot(diaphragm.mass.centre, t);
  return (place: number, after: boolean): readonly Before[] => {
    const holds = (at: number): boolean => upTo(at, place, after, tolerance);
    const out: Before[] = [];
    if (place - profile.from > tolerance || after) {
      const reach = { from: profile.from, to: place, holds };
      out.push(
        ...forcesWithin({ ...source, outcome: { ...outcome, taken: new Map() } }, reach).map(
          ({ force, at }): Before => ({ sign: -1, force, at }),
        ),
      );
    }
    const moved = place - profile.from > tolerance ? eccentricPart(source, outcome, place, steps) : undefined;
    if (moved !== undefined) out.push(moved);
    for (const [line, { given, taken }] of net) {
      const along = `${linePath(line)}.axis`;
      if (line.family === frame) {
        if (!holds(line.s)) continue;
        for (const [value, sign] of [
          [given, line.sign],
          [taken, -line.sign],
        ] as const) {
          if (value === undefined) continue;
          const at = readOff(
            context,
            `s_${value.symbol}`,
            along,
            line.s,
            length,
            `place of line ${line.line.id} along the span`,
          );
          out.push({ sign: sign > 0 ? 1 : -1, force: value, at });
        }
        continue;
      }
      const parts = [given, taken].flatMap((value) => value ?? []);
      if (parts.length === 0) continue;
      const cut = cutOf(diaphragm, line);
      const whole = totalLength(cut);
      const acrossPart = dot(line.frame.t, s);
      const alongPart = dot(line.frame.t, t);
      for (const [t0, t1] of cut) {
        const a = toPlan(line.frame, line.s, acrossPart > 0 ? t0 : t1);
        const b = toPlan(line.frame, line.s, acrossPart > 0 ? t1 : t0);
        const from = dot(a, s);
        const to = dot(b, s);
        const end = Math.min(to, place);
        if (end - from <= 1e-12 * Math.abs(to - from)) continue;
        const fraction = (((t1 - t0) / whole) * (end - from)) / (to - from);
        const centre: [number, number] = [
          a[0] + ((b[0] - a[0]) * (end - from)) / (to - from) / 2,
          a[1] + ((b[1] - a[1]) * (end - from)) / (to - from) / 2,
        ];
        const share = readOff(
          context,
          'm',
          `${diaphragm.path}.outline`,
          fraction,
          '1',
          `part of line ${line.line.id} that lies before the cut`,
        );
        const force = netOf(given, taken);
        const arm = dot(centre, t) - reference;
        const turned = line.sign * acrossPart;
        const lever = readOff(
          context,
          'a',
          along,
          arm * turned,
          length,
          `lever of line ${line.line.id} about the centre of mass, with the sign of its turn`,
        );
        const couple = steps.add(steps.fresh('C'), `(${force.text})·m·a`, [...parts, share, lever], moment, {
          what: `couple of line ${line.line.id}, up to s = ${short(place)}`,
          clause: 'a force f per length at lever a adds f·a per unit span',
        });
        if (Math.abs(alongPart) <= 1e-12) out.push({ sign: 1, couple });
        else {
          const cosine = readOff(
            context,
            'c',
            along,
            alongPart * line.sign,
            '1',
            `cosine of line ${line.line.id} against the load`,
          );
          const own = steps.add(steps.fresh('G'), `(${force.text})·m·c`, [...parts, share, cosine], unit, {
            what: `part along the load of line ${line.line.id}, up to s = ${short(place)}`,
          });
          const at = readOff(
            context,
            `s_${own.symbol}`,
            along,
            dot([centre[0], centre[1]], s),
            length,
            'its centre along the span',
          );
          out.push({ sign: 1, force: own, at, couple });
        }
      }
    }
    return out;
  };
}

function netOf(given: Value | undefined, taken: Value | undefined): { text: string } {
  if (given === undefined) return { text: `−${taken?.symbol ?? '0'}` };
  return { text: taken === undefined ? given.symbol : `${given.symbol} − ${taken.symbol}` };
}

/** What a body gives to each of its lines under the diaphragm design force, and what the lines bring from above, along their axis. */
export function netForces(
  context: Context,
  of: Pick<Demand, 'case' | 'sense'>,
  outcome: DiaphragmOutcome,
  steps: Steps,
): Map<LineModel, { given?: Value; taken?: Value }> {
  const net = new Map<LineModel, { given?: Value; taken?: Value }>();
  const semiRigid = outcome.rigid?.model.semiRigid !== undefined;
  const body = semiRigid ? undefined : rigidBody(context, of, outcome, 'diaphragm-force', steps);
  const { arriving } = body ?? resultantSteps(context, of, outcome, 'diaphragm-force', steps);
  for (const [line, values] of arriving) {
    const [only] = values;
    if (only === undefined) continue;
    const taken =
      values.length === 1
        ? only
        : steps.add(steps.fresh('H'), values.map(({ symbol }) => symbol).join(' + '), values, only.unit, {
            what: `all that line ${line.line.id} brings`,
          });
    net.set(line, { taken });
  }
  for (const [line, force] of outcome.given) {
    const symbol = `V_${line.index + 1}`;
    const given =
      body === undefined
        ? readOff(
            context,
            symbol,
            outcome.diaphragm.path,
            (force[0] ?? 0) * of.sense,
            context.units.force,
            `force into line ${line.line.id}: from the solution of K·u = F of the membrane`,
          )
        : rigidShear(body, line, symbol);
    net.set(line, { ...net.get(line), given });
  }
  return net;
}

/** The accidental eccentricity as a load that varies linearly over the width: no resultant, and the moment F·e. */
function eccentricPart(source: SpanSource, outcome: DiaphragmOutcome, place: number, steps: Steps): Before | undefined {
  const { context, push, profile } = source;
  const { inertia } = outcome.pushed;
  if (push === undefined || inertia.offset === 0) return undefined;
  const { length, force } = context.units;
  const outline = `${outcome.diaphragm.path}.outline`;
  const e = steps.list.find(({ symbol }) => symbol === 's_F');
  const m = steps.list.find(({ symbol }) => symbol === 's_M');
  if (e === undefined) throw new Error('no place of the push');
  const moved: Value = { symbol: 's_F', value: e.result, unit: e.unit, from: 's_F' };
  const centre: Value =
    m === undefined
      ? readOff(context, 's_M', outline, inertia.centre - inertia.offset, length, 'centre of the load across it')
      : { symbol: 's_M', value: m.result, unit: m.unit, from: 's_M' };
  const width = readOff(context, 'B', outline, profile.to - profile.from, length, 'width across the load');
  const x = readOff(
    context,
    'x',
    outline,
    Math.min(place, profile.to) - profile.from,
    length,
    'distance from the edge to the cut',
  );
  const own = diaphragmsBeside(context, outcome) > 1 ? steps.list.find(({ symbol }) => symbol === 'F_d') : undefined;
  const f: Value = own === undefined ? push.force : { symbol: 'F_d', value: own.result, unit: own.unit, from: 'F_d' };
  const values = [f, moved, centre, width, x];
  const part = steps.add(steps.fresh('f_e'), `6·${f.symbol}·(s_F − s_M)/B^3·(x^2 − B·x)`, values, force, {
    what: `of the load that varies linearly over the width and moves the level’s force by s_F − s_M, up to s = ${short(place)}`,
    clause: 'accidental eccentricity',
  });
  const turn = steps.add(
    steps.fresh('C_e'),
    `−12·${f.symbol}·(s_F − s_M)/B^3·(x^3/6 − B·x^2/4)`,
    values,
    context.units.moment,
    {
      what: 'moment of that load about the cut',
    },
  );
  return { sign: -1, force: part, moment: turn };
}

function diaphragmsBeside(context: Context, { diaphragm }: DiaphragmOutcome): number {
  return context.model.levels[diaphragm.level]?.diaphragms.length ?? 0;
}
