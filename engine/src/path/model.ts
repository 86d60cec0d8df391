/** The whole building prepared for analysis: everything that depends on the plan alone, once for all load cases. */
import type { Building, Point } from '../building/definition.js';
import { diaphragmModel, type DiaphragmModel } from '../diaphragms/diaphragm.js';
import { frameAlong, parallel, unitVector, type Frame } from '../geometry/frame.js';
import { assembliesOf } from '../walls/wall-assembly.js';
import { lineModel, type LineModel } from '../walls/wall-line.js';

export type LevelModel = {
  readonly id: string;
  readonly index: number;
  readonly elevation: number;
  /** Height of the storey under the level; 0 for the base [length] */
  readonly height: number;
  readonly diaphragms: readonly DiaphragmModel[];
};

export type Model = {
  readonly building: Building;
  /** Ascending; the base first. */
  readonly levels: readonly LevelModel[];
  readonly lines: readonly LineModel[];
  readonly frames: readonly Frame[];
  /** Index in `frames` of a direction on plan. */
  readonly frameOf: (direction: Point) => number;
  /** Largest dimension of the plan [length] */
  readonly extent: number;
  readonly postTolerance: number;
};

export function buildModel(building: Building): Model {
  const order = building.levels
    .map((level, position) => ({ level, position }))
    .sort((a, b) => a.level.elevation - b.level.elevation);
  const elevations = order.map(({ level }) => level.elevation);
  const index = new Map(order.map(({ level }, i) => [level.id, i]));

  const frames: Frame[] = [];
  const frameOf = (direction: Point): number => {
    const found = frames.findIndex((frame) => parallel(frame.t, direction));
    if (found >= 0) return found;
    frames.push(frameAlong(direction));
    return frames.length - 1;
  };
  const assemblies = assembliesOf(building);
  // Lines in order of their place, so that no result depends on the order of the file or of ids.
  const lines = building.wallLines.map((line, i) => {
    const [a, b] = line.axis;
    const length = Math.hypot(b[0] - a[0], b[1] - a[1]);
    const family = frameOf([(b[0] - a[0]) / length, (b[1] - a[1]) / length]);
    return lineModel(line, i, family, frames[family] as Frame, { index, elevations }, assemblies, building.units);
  });
  for (const loadCase of building.loadCases) if (loadCase.from !== 'combined') frameOf(unitVector(loadCase.direction));

  const levels = order.map(({ level, position }, i) => ({
    id: level.id,
    index: i,
    elevation: level.elevation,
    height: i === 0 ? 0 : level.elevation - (elevations[i - 1] as number),
    diaphragms: (i === 0 ? [] : (level.diaphragms ?? [])).map((diaphragm, d) =>
      diaphragmModel(
        diaphragm,
        { key: `${level.id}/${diaphragm.id}`, level: i, path: `levels[${position}].diaphragms[${d}]` },
        frames,
        lines,
      ),
    ),
  }));
  return {
    building,
    levels,
    lines,
    frames,
    frameOf,
    extent: extentOf(building),
    postTolerance: building.postTolerance ?? (building.units.length === 'ft' ? 0.25 : 0.075),
  };
}

function extentOf(building: Building): number {
  let low = Infinity;
  let high = -Infinity;
  for (const level of building.levels) {
    for (const diaphragm of level.diaphragms ?? []) {
      for (const [x, y] of diaphragm.outline) {
        low = Math.min(low, x, y);
        high = Math.max(high, x, y);
      }
    }
  }
  return Math.max(high - low, Number.MIN_VALUE);
}
