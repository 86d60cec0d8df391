/** The forces of a load case by level: stated in the file, or computed from the basis of design. */
import type { Building, LoadCase } from '../building/definition.js';
import type { Fault, Result } from '../building/fault.js';
import { massOf } from '../geometry/area.js';
import { frameAlong } from '../geometry/frame.js';
import { profileOf } from '../geometry/profile.js';
import { baseShear, diaphragmForces, verticalDistribution, type WeighedLevel } from './equivalent-lateral-force.js';

export type LevelForce = {
  readonly level: string;
  /** Storey force [force] */
  readonly force: number;
  /** Diaphragm design force [force] */
  readonly diaphragmForce: number;
};

/** Exact: 1 ft = 0.3048 m. */
const METRES_PER_FOOT = 0.3048;

/**
 * @returns the levels that are pushed, ascending [force]
 */
export function levelForces(building: Building, loadCase: LoadCase): Result<readonly LevelForce[]> {
  if (loadCase.from === 'stated') {
    const elevation = new Map(building.levels.map((level) => [level.id, level.elevation]));
    const stated = loadCase.forces.map(({ level, force, diaphragmForce }) => ({
      level,
      force,
      diaphragmForce: diaphragmForce ?? force,
    }));
    stated.sort((a, b) => (elevation.get(a.level) ?? 0) - (elevation.get(b.level) ?? 0));
    return { ok: true, value: stated };
  }
  const basis = building.basis?.seismic;
  if (basis === undefined)
    return refused('no-basis', 'basis', 'no seismic basis of design', `basis.seismic for load case ${loadCase.id}`);
  const levels = weighedLevels(building);
  const total = levels.reduce((sum, level) => sum + level.weight, 0);
  if (!(total > 0)) {
    return refused(
      'no-weight',
      'levels',
      'no seismic weight on any level',
      `weights from which load case ${loadCase.id} takes its forces`,
    );
  }
  const height = levels[levels.length - 1]?.heightFt ?? 0;
  const { coefficient, k } = baseShear(basis, height);
  const forces = verticalDistribution(levels, coefficient * total, k); // ASCE 7-16 Eq. 12.8-1
  const design = diaphragmForces(levels, forces, basis);
  return {
    ok: true,
    value: levels.map(({ level }, i) => ({ level, force: forces[i] as number, diaphragmForce: design[i] as number })),
  };
}

function refused(code: string, path: string, found: string, expected: string): { ok: false; faults: readonly Fault[] } {
  return { ok: false, faults: [{ code, path, found, expected }] };
}

/** Levels above the base with the weight of their diaphragms, ascending. */
export function weighedLevels(building: Building): WeighedLevel[] {
  const sorted = [...building.levels].sort((a, b) => a.elevation - b.elevation);
  const base = sorted[0]?.elevation ?? 0;
  const perFoot = building.units.length === 'ft' ? 1 : METRES_PER_FOOT;
  const frame = frameAlong([0, 1]);
  return sorted.slice(1).map((level) => ({
    level: level.id,
    weight: (level.diaphragms ?? []).reduce(
      (sum, diaphragm) => sum + massOf(diaphragm, profileOf(diaphragm, frame)).weight,
      0,
    ),
    heightFt: (level.elevation - base) / perFoot,
  }));
}
