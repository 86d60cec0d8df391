/** Wall lines as the analysis sees them: planes with piers by storey, shares and stiffnesses. */
import type { Pier, Point, Units, WallLine } from '../building/definition.js';
import { dot, type Frame } from '../geometry/frame.js';
import { sharesByStiffness } from './equal-deflection.js';
import { unsharedPier, type PierModel } from './pier.js';
import type { Assemblies } from './wall-assembly.js';

export type { PierModel } from './pier.js';

export type StoreyModel = {
  readonly line: LineModel;
  /** Index of the level which this storey holds. */
  readonly level: number;
  readonly piers: readonly PierModel[];
  /** Stiffness along the line [force/length], or relative where `stated` is false [length] */
  readonly stiffness: number;
  /** Whether the stiffness comes from stated stiffnesses or assemblies, rather than from lengths. */
  readonly stated: boolean;
  /** Weights of the line in a group of collinear lines: by stiffness where every pier states one or it shares by deflection, else by length. */
  readonly pierLength: number;
  readonly pierStiffness: number | undefined;
};

export type LineModel = {
  readonly line: WallLine;
  readonly index: number;
  /** Unit vector along the axis, first point to second. */
  readonly along: Point;
  readonly length: number;
  /** Index of the family of parallel lines to which it belongs. */
  readonly family: number;
  readonly frame: Frame;
  /** 1 where the axis runs with the family's t, −1 against it. */
  readonly sign: 1 | -1;
  /** Place in the family's frame [length] */
  readonly s: number;
  readonly t0: number;
  /** By level index; undefined where the line does not brace the storey. */
  readonly storeys: readonly (StoreyModel | undefined)[];
};

/** A place on the axis, on plan. */
export function pointOn(line: LineModel, distance: number): Point {
  const [x, y] = line.line.axis[0];
  return [x + line.along[0] * distance, y + line.along[1] * distance];
}

/** `t` in the family's frame of a distance along the axis. */
export function tOn(line: LineModel, distance: number): number {
  return line.t0 + line.sign * distance;
}

/** Distance along the axis of a `t` in the family's frame. */
export function distanceAt(line: LineModel, t: number): number {
  return line.sign * (t - line.t0);
}

/**
 * @param levels elevations by level index, ascending [length]
 */
export function lineModel(
  line: WallLine,
  index: number,
  family: number,
  frame: Frame,
  levels: { readonly index: ReadonlyMap<string, number>; readonly elevations: readonly number[] },
  assemblies: Assemblies,
  units: Units,
): LineModel {
  const [a, b] = line.axis;
  const length = Math.hypot(b[0] - a[0], b[1] - a[1]);
  const along: Point = [(b[0] - a[0]) / length, (b[1] - a[1]) / length];
  const storeys: (StoreyModel | undefined)[] = levels.elevations.map(() => undefined);
  const model: LineModel = {
    line,
    index,
    along,
    length,
    family,
    frame,
    sign: dot(along, frame.t) >= 0 ? 1 : -1,
    s: dot(a, frame.s),
    t0: dot(a, frame.t),
    storeys,
  };
  for (const storey of line.storeys) {
    const level = levels.index.get(storey.under);
    if (level === undefined || level === 0) continue;
    const height = (levels.elevations[level] as number) - (levels.elevations[level - 1] as number);
    storeys[level] = storeyModel(model, level, storey.under, storey.piers, height, assemblies, units);
  }
  return model;
}

function storeyModel(
  line: LineModel,
  level: number,
  under: string,
  piers: readonly Pier[],
  height: number,
  assemblies: Assemblies,
  units: Units,
): StoreyModel {
  const unshared = [...piers]
    .sort((a, b) => a.from - b.from)
    .map((pier) => unsharedPier(line.line, under, pier, height, assemblies, units));
  const stiffnesses = unshared.map((pier) => pier.stiffness);
  const absolute = stiffnesses.every((k) => k !== undefined);
  const weights = unshared.map((pier) => pier.length);
  const by = line.line.shareBy ?? 'length';
  const shares = sharesByStiffness(by !== 'length' && absolute ? stiffnesses : weights);
  const pierLength = weights.reduce((sum, value) => sum + value, 0);
  const everyStated = absolute && (by === 'deflection' || piers.every((pier) => pier.stiffness !== undefined));
  const stiffness = absolute ? stiffnesses.reduce((sum, k) => sum + k, 0) : pierLength;
  return {
    line,
    level,
    piers: unshared.map((pier, i) => ({ ...pier, share: shares[i] as number })),
    stiffness,
    stated: absolute,
    pierLength,
    pierStiffness: everyStated ? stiffness : undefined,
  };
}
