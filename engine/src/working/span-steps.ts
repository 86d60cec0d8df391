/** Statics of the simple spans of a flexible diaphragm: what lies on them, and what their ends hand over. */
import { supportsOf, type Support } from '../diaphragms/flexible.js';
import type { Profile } from '../geometry/profile.js';
import type { DiaphragmOutcome } from '../path/descent.js';
import type { Demand } from '../path/result.js';
import { fromDemand, linePath, readOff, type Context } from './context.js';
import { floorParts, type Reach } from './floor-parts.js';
import { levelInertias, totalStep } from './floor-total.js';
import { pushStep, type ForceSet } from './level-push.js';
import type { Steps, Value } from './steps.js';

/** A force along the direction that counts, and where it acts along s. */
export type SpanForce = { readonly force: Value; readonly at: Value };

/** What pushes a diaphragm along a frame, once for all of its spans. */
export type SpanSource = {
  readonly context: Context;
  readonly steps: Steps;
  readonly of: Pick<Demand, 'case' | 'sense'>;
  readonly outcome: DiaphragmOutcome;
  readonly profile: Profile;
  readonly frame: number;
  readonly supports: readonly Support[];
  /** Sign of the direction that counts against the frame's t. */
  readonly along: 1 | -1;
  /** The level's force along that direction, and the whole on which it lies; absent where it acts along another frame. */
  readonly push: { readonly force: Value; readonly whole: Value } | undefined;
};

export function spanSource(
  context: Context,
  of: Pick<Demand, 'case' | 'sense'>,
  outcome: DiaphragmOutcome,
  frame: number,
  along: 1 | -1,
  set: ForceSet,
  steps: Steps,
): SpanSource {
  const { diaphragm, pushed } = outcome;
  const level = context.model.levels[diaphragm.level];
  if (level === undefined) throw new Error(`no level of ${diaphragm.key}`);
  const acts = pushed.inertia.frame === frame && pushed.inertia.share > 0;
  const push = acts
    ? {
        force: pushStep(context, of, level.id, set, along, steps, steps.fresh('F')),
        whole: totalStep(context, levelInertias(context, of, level.index), steps),
      }
    : undefined;
  const profile = diaphragm.profiles[frame] as Profile;
  return { context, steps, of, outcome, profile, frame, supports: supportsOf(diaphragm, frame), along, push };
}

/** Whether a place along s is that of a support: a force there goes straight into it. */
export function onSupport({ supports, profile }: SpanSource, s: number): boolean {
  return supports.some((support) => Math.abs(support.s - s) <= profile.tolerance);
}

/** Steps for the forces within a reach: parts of the floor with their share of the level's force, and walls that stop here. */
export function forcesWithin(source: SpanSource, reach: Reach): SpanForce[] {
  const { context, steps, outcome, push } = source;
  const out: SpanForce[] = [];
  if (push !== undefined) {
    for (const { size, at } of floorParts(context, outcome.pushed.inertia, reach, steps)) {
      const values = [push.force, size, push.whole];
      const formula = values.map(({ symbol }) => symbol);
      const force = steps.add(
        steps.fresh('f'),
        `${formula[0] ?? ''}·${formula[1] ?? ''}/${formula[2] ?? ''}`,
        values,
        context.units.force,
        { what: `its part of the level’s force` },
      );
      out.push({ force, at });
    }
  }
  return [...out, ...stoppedWithin(source, reach)];
}

/** Walls that stop at the level: the shear that they hand to the diaphragm. */
export function stoppedWithin(source: SpanSource, reach: Pick<Reach, 'holds'>): SpanForce[] {
  const { context, steps, outcome, frame, along, of } = source;
  const { diaphragm, taken } = outcome;
  const out: SpanForce[] = [];
  for (const [line] of taken) {
    if (line.family !== frame || !reach.holds(line.s)) continue;
    const above = context.model.levels[diaphragm.level + 1];
    const shear = fromDemand(context, 'V_above', of, `${line.line.id}/${above?.id ?? ''}`, 'shear');
    if (shear === undefined) continue;
    const part = partMet(source, line.index);
    const sign = line.sign * along < 0 ? '−' : '';
    const force = steps.add(
      steps.fresh('P'),
      part === undefined ? `${sign}V_above` : `${sign}V_above·m`,
      part === undefined ? [shear] : [shear, part],
      context.units.force,
      { what: `wall line ${line.line.id} stops here and hands its shear to the diaphragm` },
    );
    const at = readOff(
      context,
      `s_${force.symbol}`,
      `${linePath(line)}.axis`,
      line.s,
      context.units.length,
      'its place along the span',
    );
    out.push({ force, at });
  }
  return out;
}

/** The part of a wall's length in this diaphragm, where it meets several. */
function partMet({ context, outcome, of }: SpanSource, line: number): Value | undefined {
  const model = context.model.lines[line];
  const taken = model === undefined ? undefined : outcome.taken.get(model)?.[0];
  const run = context.runs.find((candidate) => candidate.subCase.id === of.case);
  const whole = run?.outcomes[outcome.diaphragm.level]?.above[line]?.[0];
  if (taken === undefined || whole === undefined || whole === 0 || Math.abs(taken / whole - 1) < 1e-12)
    return undefined;
  return readOff(
    context,
    'm',
    `${outcome.diaphragm.path}.outline`,
    taken / whole,
    '1',
    'part of the wall that meets this diaphragm, raised by Ω_0 or ρ where the standard raises transfers',
  );
}

/** A place along s where a support or a break of the outline stands. */
export function supportPlace({ context, supports }: SpanSource, symbol: string, i: number): Value {
  const support = supports[i];
  const line = support?.lines[0]?.line;
  if (support === undefined || line === undefined) throw new Error(`no support ${i}`);
  return readOff(
    context,
    symbol,
    `${linePath(line)}.axis`,
    support.s,
    context.units.length,
    `place of line ${support.name} along the span`,
  );
}

/** What lies on the span after support `i`, with the overhangs of end spans; what stands on a support is left out. */
export function spanReach(source: SpanSource, i: number): Reach {
  const { supports, profile } = source;
  const last = supports.length - 2;
  const from = i === 0 ? profile.from : (supports[i]?.s ?? profile.from);
  const to = i === last ? profile.to : (supports[i + 1]?.s ?? profile.to);
  return {
    from,
    to,
    holds: (s) => s >= from - profile.tolerance && s <= to + profile.tolerance && !onSupport(source, s),
  };
}

/**
 * What the span after support `i` hands to one of its ends.
 *
 * @param forces on that span
 */
export function handedOver(
  source: SpanSource,
  i: number,
  end: 'near' | 'far',
  forces: readonly SpanForce[],
  symbol: string,
): Value {
  const { steps, context, supports } = source;
  const a = supportPlace(source, 's_A', i);
  const b = supportPlace(source, 's_B', i + 1);
  const arm = (at: Value): string => (end === 'near' ? `(s_B − ${at.symbol})` : `(${at.symbol} − s_A)`);
  const sum = forces.map(({ force, at }) => `${force.symbol}·${arm(at)}`).join(' + ');
  return steps.add(
    symbol,
    forces.length === 0 ? '0' : `(${sum})/(s_B − s_A)`,
    forces.length === 0 ? [] : [...forces.flatMap(({ force, at }) => [force, at]), a, b],
    context.units.force,
    {
      what: `handed to line ${supports[end === 'near' ? i : i + 1]?.name ?? ''} by the span ${supports[i]?.name ?? ''}–${supports[i + 1]?.name ?? ''}`,
      clause: 'statics of a simply supported beam',
    },
  );
}
