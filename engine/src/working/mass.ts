/** Workings of what a floor weighs and where: seismic weight of a level, centre of mass. */
import { massParts, massWith } from '../geometry/area.js';
import type { Profile } from '../geometry/profile.js';
import { toPlan } from '../geometry/profile.js';
import type { DiaphragmOutcome } from '../path/descent.js';
import type { Demand } from '../path/result.js';
import { weightFactors, weightsOf, type Weighed } from './area-weight.js';
import { fromFile, readOff, runOf, type Context } from './context.js';
import { totalStep } from './floor-total.js';
import { bodyOf } from './body-member.js';
import { sumOf, type Steps, type Value } from './steps.js';

/**
 * The seismic weight of a level: all of its diaphragms with zones, façades and partitions.
 *
 * @param liveShare part of the live load that belongs to it
 */
export function weightStep(context: Context, level: number, steps: Steps, symbol: string, liveShare = 0): Value {
  const diaphragms = context.model.levels[level]?.diaphragms ?? [];
  const parts = diaphragms.map((diaphragm) => ({ diaphragm, frame: 0, spread: 'weight' as const, liveShare }));
  return totalStep(context, parts, steps, symbol, `seismic weight of level ${context.model.levels[level]?.id ?? ''}`);
}

export function centreOfMass(axis: 0 | 1) {
  return (context: Context, demand: Demand, steps: Steps): void => {
    const { diaphragm }: DiaphragmOutcome = bodyOf(context, demand);
    const { liveShare } = runOf(context, demand.case).subCase;
    const parts = partsOf(context, { diaphragm, liveShare }, axis, steps);
    const sum = parts.map(({ size, at }) => `${size.symbol}·${at.symbol}`).join(' + ');
    const values = parts.flatMap(({ size, at }) => [size, at]);
    steps.add(axis === 0 ? 'x_M' : 'y_M', `(${sum})/(${sumOf(parts.map(({ size }) => size))})`, values, demand.unit, {
      clause: 'centre of mass: first moment over the whole',
    });
  };
}

/** The floor in strips, with façades and partitions: what each weighs and where its centre lies; areas where nothing is weighed. */
function partsOf(
  context: Context,
  weighing: Required<Weighed>,
  axis: 0 | 1,
  steps: Steps,
): { size: Value; at: Value }[] {
  const { diaphragm, liveShare } = weighing;
  const profile = diaphragm.profiles[0] as Profile;
  const weighed = massWith(diaphragm.mass, liveShare).weight > 0;
  const { length, force, perLength } = context.units;
  const outline = `${diaphragm.path}.outline`;
  const strips = profile.slabs.flatMap((slab) =>
    slab.strips.filter(({ lower0, lower1, upper0, upper1 }) => upper0 - lower0 + upper1 - lower1 !== 0),
  );
  const lines = (diaphragm.diaphragm.weight?.lines ?? []).flatMap((line, l) =>
    line.along.slice(1).map(() => ({ line, path: `${diaphragm.path}.weight.lines[${l}]` })),
  );
  const name = axis === 0 ? 'x' : 'y';
  return massParts(diaphragm.diaphragm, profile).flatMap((part, i) => {
    const place = toPlan(profile.frame, part.s, part.t)[axis];
    const strip = strips[i];
    if (strip !== undefined) {
      const area = readOff(context, 'A', outline, part.area, `${length}²`, 'area of a strip of floor');
      const at = readOff(context, `${name}_${i + 1}`, outline, place, length, 'its centre');
      if (!weighed) return [{ size: steps.add(`n_${i + 1}`, 'A', [area], `${length}²`), at }];
      const weights = weightsOf(strip, liveShare).map((weight) =>
        weightFactors(context, weighing, weight, weight.of === 'area' ? 'q' : 'q_L'),
      );
      if (weights.length === 0) return [];
      const terms = weights.map((factors) => factors.map(({ symbol }) => symbol).join('·'));
      const formula = terms.length === 1 ? `${terms[0] ?? ''}·A` : `(${terms.join(' + ')})·A`;
      return [{ size: steps.add(`n_${i + 1}`, formula, [...weights.flat(), area], force), at }];
    }
    const along = lines[i - strips.length];
    if (along === undefined || part.weight === 0) return [];
    const own = readOff(
      context,
      'l',
      `${along.path}.along`,
      part.weight / along.line.perLength,
      length,
      'length of a stretch',
    );
    const p = fromFile(context, 'p', `${along.path}.perLength`, perLength);
    const at = readOff(context, `${name}_${i + 1}`, `${along.path}.along`, place, length, 'its centre');
    return [{ size: steps.add(`n_${i + 1}`, 'p·l', [p, own], force, { what: `weight line ${along.line.id}` }), at }];
  });
}
