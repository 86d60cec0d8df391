/** Workings of what a floor weighs and where: seismic weight of a level, centre of mass. */
import { massParts } from '../geometry/area.js';
import type { DiaphragmModel } from '../diaphragms/diaphragm.js';
import type { Profile } from '../geometry/profile.js';
import { toPlan } from '../geometry/profile.js';
import type { DiaphragmOutcome } from '../path/descent.js';
import type { Demand } from '../path/result.js';
import { fromFile, readOff, type Context } from './context.js';
import { areaWeight } from './floor-parts.js';
import { totalStep } from './floor-total.js';
import { bodyOf } from './body-member.js';
import { sumOf, type Steps, type Value } from './steps.js';

/** The seismic weight of a level: all of its diaphragms with zones, façades and partitions. */
export function weightStep(context: Context, level: number, steps: Steps, symbol: string): Value {
  const diaphragms = context.model.levels[level]?.diaphragms ?? [];
  const parts = diaphragms.map((diaphragm) => ({ diaphragm, frame: 0, spread: 'weight' as const }));
  return totalStep(context, parts, steps, symbol, `seismic weight of level ${context.model.levels[level]?.id ?? ''}`);
}

export function centreOfMass(axis: 0 | 1) {
  return (context: Context, demand: Demand, steps: Steps): void => {
    const { diaphragm }: DiaphragmOutcome = bodyOf(context, demand);
    const parts = partsOf(context, diaphragm, axis, steps);
    const sum = parts.map(({ size, at }) => `${size.symbol}·${at.symbol}`).join(' + ');
    const values = parts.flatMap(({ size, at }) => [size, at]);
    steps.add(axis === 0 ? 'x_M' : 'y_M', `(${sum})/(${sumOf(parts.map(({ size }) => size))})`, values, demand.unit, {
      clause: 'centre of mass: first moment over the whole',
    });
  };
}

/** The floor in strips, with façades and partitions: what each weighs and where its centre lies; areas where nothing is weighed. */
function partsOf(context: Context, diaphragm: DiaphragmModel, axis: 0 | 1, steps: Steps): { size: Value; at: Value }[] {
  const profile = diaphragm.profiles[0] as Profile;
  const weighed = diaphragm.mass.weight > 0;
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
      if (strip.area === 0) return [];
      return [
        { size: steps.add(`n_${i + 1}`, 'q·A', [areaWeight(context, diaphragm, strip.area, 'q'), area], force), at },
      ];
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
