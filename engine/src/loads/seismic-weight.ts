/** The weight that an earthquake moves, by level. */
import type { Building } from '../building/definition.js';
import type { Fault } from '../building/fault.js';
import { massOf, massWith } from '../geometry/area.js';
import { frameAlong } from '../geometry/frame.js';
import { profileOf } from '../geometry/profile.js';

/** A level with the weight that goes with it. */
export type WeighedLevel = {
  readonly level: string;
  /** Effective seismic weight [force] */
  readonly weight: number;
  /** Height above the base [length] */
  readonly height: number;
};

/**
 * Levels above the base with the weight of their diaphragms, ascending.
 *
 * @param liveShare part of the live load that belongs to it
 */
export function weighedLevels(building: Building, liveShare = 0): WeighedLevel[] {
  const sorted = [...building.levels].sort((a, b) => a.elevation - b.elevation);
  const base = sorted[0]?.elevation ?? 0;
  const frame = frameAlong([0, 1]);
  return sorted.slice(1).map((level) => ({
    level: level.id,
    weight: (level.diaphragms ?? []).reduce(
      (sum, diaphragm) => sum + massWith(massOf(diaphragm, profileOf(diaphragm, frame)), liveShare).weight,
      0,
    ),
    height: level.elevation - base,
  }));
}

/** Nothing is there for an earthquake to move. */
export function noWeight(caseId: string): { ok: false; faults: readonly Fault[] } {
  return {
    ok: false,
    faults: [
      {
        code: 'no-weight',
        path: 'levels',
        found: 'no seismic weight on any level',
        expected: `weights from which load case ${caseId} takes its forces`,
      },
    ],
  };
}
