/** Wall lines storey by storey, straight from the file. */
import type { Building, Pier, Point, WallLine } from '@groundward/engine/building/definition';
import { extentOf, lengthOnFloor, minus, type Floor } from './plan.js';

export type Storey = {
  readonly line: WallLine;
  readonly along: Point;
  /** Index of the level that it holds, the base being 0. */
  readonly level: number;
  readonly height: number;
  readonly piers: readonly Pier[];
  /** Part of the line's shear, by pier. */
  readonly shares: readonly number[];
  /** Sum of the piers' stiffnesses where all are stated or follow from their assembly [force/length] */
  readonly stiffness: number | undefined;
  readonly statedStiffness: number | undefined;
  readonly pierLength: number;
};

export type Levels = readonly { readonly id: string; readonly elevation: number; readonly floors: readonly Floor[] }[];

/** Levels from the base up; the base holds nothing. */
export function levelsOf(building: Building): Levels {
  return [...building.levels]
    .sort((a, b) => a.elevation - b.elevation)
    .map(({ id, elevation, diaphragms = [] }, i) => ({ id, elevation, floors: i === 0 ? [] : diaphragms }));
}

export function storeysOf(building: Building): Storey[] {
  const levels = levelsOf(building);
  return building.wallLines.flatMap((line) => {
    const [a, b] = line.axis;
    const length = Math.hypot(...minus(b, a));
    const along: Point = [(b[0] - a[0]) / length, (b[1] - a[1]) / length];
    return line.storeys.map(({ under, piers }): Storey => {
      const level = levels.findIndex(({ id }) => id === under);
      const height = (levels[level]?.elevation ?? 0) - (levels[level - 1]?.elevation ?? 0);
      const lengths = piers.map((pier) => pier.to - pier.from);
      const stiffnesses = piers.map((pier) => stiffnessOf(building, pier, height));
      const known = stiffnesses.every((k) => k !== undefined);
      const weights = line.shareBy === 'stiffness' && known ? stiffnesses : lengths;
      const stated = piers.map((pier) => pier.stiffness);
      return {
        line,
        along,
        level,
        height,
        piers,
        shares: weights.map((weight) => weight / sum(weights)),
        stiffness: known ? sum(stiffnesses) : undefined,
        statedStiffness: stated.every((k) => k !== undefined) ? sum(stated) : undefined,
        pierLength: sum(lengths),
      };
    });
  });
}

function stiffnessOf(building: Building, pier: Pier, height: number): number | undefined {
  const assembly = building.assemblies?.walls?.find(({ id }) => id === pier.assembly);
  const shear = assembly?.apparentShearStiffness;
  return pier.stiffness ?? (shear === undefined ? undefined : (shear * (pier.to - pier.from)) / height);
}

/** Length of a line on a floor, seen from both of its sides: 0 where they do not meet. */
export function meetingsOf(building: Building): (line: WallLine, floor: Floor) => number {
  const little = 1e-7 * extentOf(building);
  const known = new Map<WallLine, Map<Floor, number>>(building.wallLines.map((line) => [line, new Map()]));
  return (line, floor) => {
    const of = known.get(line) as Map<Floor, number>;
    const [a, b] = line.axis;
    if (!of.has(floor)) of.set(floor, lengthOnFloor(floor, a, b, little) + lengthOnFloor(floor, a, b, -little));
    return of.get(floor) as number;
  };
}

export function sum(values: readonly number[]): number {
  return values.reduce((total, value) => total + value, 0);
}
