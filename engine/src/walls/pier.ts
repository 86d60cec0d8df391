/** A pier as the analysis sees it: its place, posts, weight and stiffness among the piers of its line. */
import type { HoldDownAssembly, Pier, Units, WallLine } from '../building/definition.js';
import { deflectionStiffness, type DeflectingPier } from './pier-deflection.js';
import type { Assemblies, WallProperties } from './wall-assembly.js';

export type UnsharedPier = {
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
  readonly wall: WallProperties | undefined;
  readonly holdDown: HoldDownAssembly | undefined;
  /** Where its assembly tells how it deflects; see `pierDeflection`. */
  readonly deflecting: DeflectingPier | undefined;
  /** Stated, or by its assembly: the whole deflection where the line shares by it, else G_a·b/h alone [force/length] */
  readonly stiffness: number | undefined;
};

export type PierModel = UnsharedPier & {
  /** Part of the line's shear in this storey; the shares of a storey add up to 1. */
  readonly share: number;
};

export function unsharedPier(
  line: WallLine,
  under: string,
  pier: Pier,
  height: number,
  assemblies: Assemblies,
  units: Units,
): UnsharedPier {
  const [near, far] = offsets(pier);
  const length = pier.to - pier.from;
  const wall = pier.assembly === undefined ? undefined : assemblies.walls.get(pier.assembly);
  const holdDown = pier.holdDown === undefined ? undefined : assemblies.holdDowns.get(pier.holdDown);
  const deflecting =
    wall?.shearStiffness === undefined && wall?.nailed === undefined
      ? undefined
      : { height, length, wall, holdDown, units };
  return {
    pier,
    key: `${line.id}/${under}/${pier.id}`,
    from: pier.from,
    to: pier.to,
    length,
    height,
    posts: [pier.from + near, pier.to - far],
    arm: length - far - near,
    wall,
    holdDown,
    deflecting,
    stiffness: pier.stiffness ?? stiffnessOf(deflecting, line.shareBy === 'deflection'),
  };
}

function stiffnessOf(deflecting: DeflectingPier | undefined, byDeflection: boolean) {
  if (deflecting === undefined) return undefined;
  if (byDeflection) return deflectionStiffness(deflecting);
  const { shearStiffness } = deflecting.wall;
  return shearStiffness === undefined ? undefined : (shearStiffness * deflecting.length) / deflecting.height;
}

function offsets(pier: Pier): readonly [number, number] {
  const offset = pier.endOffset ?? 0;
  return typeof offset === 'number' ? [offset, offset] : offset;
}
