/** Wall lines as the analysis sees them: planes with piers by storey, shares and stiffnesses. */
import type { Building, Pier, Point, WallLine } from '../building/definition.js';
import { dot, type Frame } from '../geometry/frame.js';

export type PierModel = {
  readonly pier: Pier;
  /** `line/under/pier` */
  readonly key: string;
  readonly from: number;
  readonly to: number;
  readonly length: number;
  readonly height: number;
  /** Near and far end post: distance along the axis [length] */
  readonly posts: readonly [number, number];
  readonly arm: number;
  /** Part of the line's shear in this storey; the shares of a storey add up to 1. */
  readonly share: number;
};

export type StoreyModel = {
  readonly line: LineModel;
  /** Index of the level which this storey holds. */
  readonly level: number;
  readonly piers: readonly PierModel[];
  /** Stiffness along the line [force/length], or relative where `stated` is false [length] */
  readonly stiffness: number;
  /** Whether the stiffness comes from stated stiffnesses or assemblies, rather than from lengths. */
  readonly stated: boolean;
  /** Weights of the line in a group of collinear lines: by stiffness where every pier states one, else by length. */
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
  building: Building,
  line: WallLine,
  index: number,
  family: number,
  frame: Frame,
  levels: { readonly index: ReadonlyMap<string, number>; readonly elevations: readonly number[] },
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
    storeys[level] = storeyModel(building, model, level, storey.under, storey.piers, height);
  }
  return model;
}

function storeyModel(
  building: Building,
  line: LineModel,
  level: number,
  under: string,
  piers: readonly Pier[],
  height: number,
): StoreyModel {
  const sorted = [...piers].sort((a, b) => a.from - b.from);
  const lengths = sorted.map((pier) => pier.to - pier.from);
  const stiffnesses = sorted.map((pier, i) => pierStiffness(building, pier, lengths[i] as number, height));
  const everyStated = sorted.every((pier) => pier.stiffness !== undefined);
  const absolute = stiffnesses.every((k) => k !== undefined);
  const basis = line.line.shareBy === 'stiffness' && absolute ? stiffnesses : lengths;
  const total = basis.reduce((sum, value) => sum + value, 0);
  const pierLength = lengths.reduce((sum, value) => sum + value, 0);
  return {
    line,
    level,
    piers: sorted.map((pier, i) => {
      const [near, far] = offsets(pier);
      return {
        pier,
        key: `${line.line.id}/${under}/${pier.id}`,
        from: pier.from,
        to: pier.to,
        length: lengths[i] as number,
        height,
        posts: [pier.from + near, pier.to - far],
        arm: pier.to - far - (pier.from + near),
        share: (basis[i] as number) / total,
      };
    }),
    stiffness: absolute ? stiffnesses.reduce((sum, k) => sum + k, 0) : pierLength,
    stated: absolute,
    pierLength,
    pierStiffness: everyStated ? sorted.reduce((sum, pier) => sum + (pier.stiffness ?? 0), 0) : undefined,
  };
}

/** Stated, or G_a·b/h of the assembly: a wall that deforms in shear alone. */
function pierStiffness(building: Building, pier: Pier, length: number, height: number): number | undefined {
  if (pier.stiffness !== undefined) return pier.stiffness;
  const assembly = building.assemblies?.walls?.find((wall) => wall.id === pier.assembly);
  const shearStiffness = assembly?.apparentShearStiffness;
  return shearStiffness === undefined ? undefined : (shearStiffness * length) / height;
}

function offsets(pier: Pier): readonly [number, number] {
  const offset = pier.endOffset ?? 0;
  return typeof offset === 'number' ? [offset, offset] : offset;
}
