/** What of the façade goes to which level: widths across the wind from the outlines, half of each storey up and down. */
import type { Building, Diaphragm, Level, Point } from '../building/definition.js';
import { dot, frameAlong } from '../geometry/frame.js';

/** A stretch of façade whose wind goes to one level. */
export type FacadePart = {
  /** Across the wind, s of the frame along it [length] */
  readonly from: number;
  readonly to: number;
  /** Heights of façade above the ground that go to the level [length] */
  readonly low: number;
  readonly high: number;
  /** Whether the level is the highest here. */
  readonly roof: boolean;
};

export type LevelFacade = {
  readonly level: string;
  /** Height above the ground [length] */
  readonly height: number;
  /** Dimensions of the level's outlines along and across the wind [length] */
  readonly along: number;
  readonly across: number;
  readonly parts: readonly FacadePart[];
};

type Reach = {
  readonly level: Level;
  readonly height: number;
  readonly intervals: readonly (readonly [number, number])[];
};

/**
 * The façade across a direction. At each place across the wind it runs from the ground to the highest floor there, and each floor
 * there takes half of the storey under it and half of the one above; the lowest half storey goes straight into the ground.
 *
 * @param direction unit vector of the wind
 * @param ground    elevation of the ground [length]
 * @returns levels above the ground with a floor, ascending
 */
export function facadeAcross(building: Building, direction: Point, ground: number): LevelFacade[] {
  const { s, t } = frameAlong(direction);
  const reaches = building.levels
    .filter((level) => level.elevation > ground && (level.diaphragms ?? []).length > 0)
    .sort((a, b) => a.elevation - b.elevation)
    .map((level): Reach => ({
      level,
      height: level.elevation - ground,
      intervals: (level.diaphragms ?? []).map((diaphragm) => extent(diaphragm, s)),
    }));
  const breaks = [...new Set(reaches.flatMap(({ intervals }) => intervals.flat()))].sort((a, b) => a - b);
  const parts = new Map<Level, FacadePart[]>(reaches.map(({ level }) => [level, []]));
  for (let i = 0; i + 1 < breaks.length; i++) {
    const from = breaks[i] as number;
    const to = breaks[i + 1] as number;
    const here = reaches.filter(({ intervals }) => intervals.some(([a, b]) => a <= from && b >= to));
    here.forEach(({ level, height }, k) => {
      const below = here[k - 1]?.height ?? 0;
      const above = here[k + 1]?.height;
      const high = above === undefined ? height : (height + above) / 2;
      parts.get(level)?.push({ from, to, low: (below + height) / 2, high, roof: above === undefined });
    });
  }
  return reaches.map(({ level, height, intervals }) => {
    const along = (level.diaphragms ?? []).map((diaphragm) => extent(diaphragm, t));
    return {
      level: level.id,
      height,
      along: spanned(along),
      across: spanned(intervals),
      parts: parts.get(level) ?? [],
    };
  });
}

function extent({ outline }: Diaphragm, axis: Point): readonly [number, number] {
  const places = outline.map((point) => dot(point, axis));
  return [Math.min(...places), Math.max(...places)];
}

function spanned(intervals: readonly (readonly [number, number])[]): number {
  return Math.max(...intervals.map(([, high]) => high)) - Math.min(...intervals.map(([low]) => low));
}
