/** Workings of openings: the shear at the opening shared by the strips beside it, each bending on its own. */
import type { InnerForces } from '../diaphragms/inner-forces.js';
import { openingForces } from '../diaphragms/openings/opening.js';
import type { OpeningPlan } from '../diaphragms/openings/opening-plan.js';
import { totalLength } from '../geometry/profile.js';
import type { Demand } from '../path/result.js';
import { valueAt } from '../statics/polynomial.js';
import { readOff, type Context } from './context.js';
import { diaphragmOf } from './design.js';
import { momentStep, short, staticsOf, type Statics } from './left-of.js';
import { depthAt } from './spans.js';
import type { Steps, Value } from './steps.js';

const CLAUSE = 'method of ATC-7 (1981) and Diekmann (1982), from memory, not checked against the documents';

type Found = {
  readonly statics: Statics;
  readonly inner: InnerForces;
  readonly plan: OpeningPlan;
  readonly path: string;
};
type Half = OpeningPlan['halves'][number];

export function openingMoment(context: Context, demand: Demand, steps: Steps): void {
  const found = openingOf(context, demand, steps);
  const moments = bordered(found).flatMap((half) => {
    const edge = edgeForce(context, found, half, steps);
    return half.beside.map(([a, b]) => {
      const strip = readOff(context, 'd_strip', found.path, b - a, context.units.length, 'depth of the strip');
      return steps.add(steps.fresh('M_s'), `abs(${edge.symbol})·d_strip`, [edge, strip], demand.unit, {
        what: 'secondary moment of a strip',
      });
    });
  });
  largest(moments, demand.unit, 'largest secondary moment of a strip', steps);
}

export function openingCorner(context: Context, demand: Demand, steps: Steps): void {
  const found = openingOf(context, demand, steps);
  const forces = bordered(found).map((half) => edgeForce(context, found, half, steps));
  largest(forces, demand.unit, 'largest force of a strip’s inner edge', steps);
}

export function openingChord(context: Context, demand: Demand, steps: Steps): void {
  const found = openingOf(context, demand, steps);
  const outer = bordered(found).filter(({ strips, beside }) =>
    [strips[0], strips[strips.length - 1]].some((strip) => strip !== undefined && beside.includes(strip)),
  );
  const forces = outer.map((half) => {
    const edge = edgeForce(context, found, half, steps);
    const depth = chordDepth(found, half);
    if (depth === 0) return edge;
    const { middle } = found.plan;
    const moment = momentStep(found.statics, middle, 'with-couples', steps.fresh('M'));
    const whole = depthAt(context, found.statics, 'D', depth, `distance of the chords at s = ${short(middle)}`);
    return steps.add(
      steps.fresh('T_outer'),
      `${moment.symbol}/D + ${edge.symbol}`,
      [moment, whole, edge],
      demand.unit,
      {
        what: 'the diaphragm’s chord force at the middle and the strip’s own at the side',
        clause: CLAUSE,
      },
    );
  });
  largest(forces, demand.unit, 'largest force in a strip’s outer edge', steps);
}

function largest(values: readonly Value[], unit: string, what: string, steps: Steps): void {
  const sizes = values.map(({ symbol }) => `abs(${symbol})`);
  const formula = sizes.length === 0 ? '0' : sizes.length === 1 ? (sizes[0] ?? '0') : `max(${sizes.join(', ')})`;
  steps.add(steps.fresh('largest'), formula, values, unit, { what, clause: CLAUSE });
}

function bordered({ plan }: Found): Half[] {
  return plan.halves.filter(({ beside }) => beside.length > 0);
}

function openingOf(context: Context, demand: Demand, steps: Steps): Found {
  const { outcome, inner } = diaphragmOf(context, demand.case, demand.member);
  const id = demand.member.split('/')[2];
  for (const each of inner) {
    const plan = (outcome.diaphragm.openings[each.frame] ?? []).find(({ opening }) => opening.id === id);
    if (plan === undefined || openingForces(each, plan) === undefined) continue;
    const index = (outcome.diaphragm.diaphragm.openings ?? []).indexOf(plan.opening);
    const path = `${outcome.diaphragm.path}.openings[${index}].outline`;
    return { statics: staticsOf(context, demand, outcome, each.frame, steps), inner: each, plan, path };
  }
  throw new Error(`no opening ${demand.member}`);
}

/** The force in a strip's edges at a side of the opening: ∫V ds from there to the middle, over the depth of all strips. */
function edgeForce(context: Context, { statics, plan, path }: Found, half: Half, steps: Steps): Value {
  const { length, force } = context.units;
  const from = Math.min(half.side, plan.middle);
  const to = Math.max(half.side, plan.middle);
  const near = momentStep(statics, from, 'without-couples', steps.fresh('Q'));
  const far = momentStep(statics, to, 'without-couples', steps.fresh('Q'));
  const depth = readOff(context, 'd', path, totalLength(half.strips), length, 'net depth beside the opening');
  const turned = half.ahead < 0 ? `(${near.symbol} − ${far.symbol})/d` : `(${far.symbol} − ${near.symbol})/d`;
  return steps.add(steps.fresh('L'), turned, [near, far, depth], force, {
    what: `shear from s = ${short(from)} to s = ${short(to)} summed up, over the depth: force in the strips’ edges`,
    clause: 'a point of inflection at the middle of the opening; shear shared by depth',
  });
}

function chordDepth({ inner, plan }: Found, { ahead }: Half): number {
  const { tolerance } = inner.profile;
  const s = plan.middle;
  const piece = inner.pieces.find(({ from, to }) =>
    ahead < 0 ? s > from + tolerance && s <= to + tolerance : s >= from - tolerance && s < to - tolerance,
  );
  return piece === undefined ? 0 : valueAt(piece.chordDepth, s - piece.from);
}
