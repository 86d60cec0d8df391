/** The forces of a load case by level: stated in the file, or computed from its basis of design. */
import type { Building, PlainCase, StatedCase } from '../building/definition.js';
import type { Fault, Result } from '../building/fault.js';
import { unitVector } from '../geometry/frame.js';
import type { LoadPiece } from '../statics/span-load.js';
import { equivalentLateralForces } from './asce7/level-forces.js';
import type { DiaphragmForce } from './asce7/equivalent-lateral-force.js';
import { windOn } from './asce7/wind-forces.js';
import { basisOf, isAsce } from './basis-of.js';
import { lateralForces } from './en1998/level-forces.js';

export type LevelForce = {
  readonly level: string;
  /** Storey force [force] */
  readonly force: number;
  /** Diaphragm design force [force] */
  readonly diaphragmForce: number;
  /** What the diaphragm design force was chosen from, where a basis gave it. */
  readonly limits?: DiaphragmForce;
  /** How the force lies along s of the case's frame where it does not follow the weight: wind on a façade [force/length] */
  readonly line?: readonly LoadPiece[];
};

/**
 * @returns the levels that are pushed, ascending [force]
 */
export function levelForces(building: Building, loadCase: PlainCase): Result<readonly LevelForce[]> {
  if (loadCase.from === 'stated') return { ok: true, value: statedForces(building, loadCase) };
  const basis = basisOf(building, loadCase);
  if (loadCase.kind === 'wind') {
    if (isAsce(basis) && basis.wind !== undefined) {
      const { levels } = windOn(building, basis.standard, basis.wind, unitVector(loadCase.direction));
      return {
        ok: true,
        value: levels.map(({ facade: { level }, force, line }) => ({ level, force, diaphragmForce: force, line })),
      };
    }
  } else if (basis?.standard === 'EN 1998-1') return lateralForces(building, basis.seismic, loadCase.id);
  else if (basis?.seismic !== undefined) return equivalentLateralForces(building, basis.seismic, loadCase.id);
  return refused(
    'no-basis',
    'basis',
    `no basis of design that states ${loadCase.kind}`,
    `one for load case ${loadCase.id}`,
  );
}

function statedForces(building: Building, loadCase: StatedCase): LevelForce[] {
  const elevation = new Map(building.levels.map((level) => [level.id, level.elevation]));
  return loadCase.forces
    .map(({ level, force, diaphragmForce }) => ({ level, force, diaphragmForce: diaphragmForce ?? force }))
    .sort((a, b) => (elevation.get(a.level) ?? 0) - (elevation.get(b.level) ?? 0));
}

function refused(code: string, path: string, found: string, expected: string): { ok: false; faults: readonly Fault[] } {
  return { ok: false, faults: [{ code, path, found, expected }] };
}
