/** The forces of a load case by level: stated in the file, or computed from the basis of design. */
import type { Building, LoadCase } from '../building/definition.js';
import type { Result } from '../building/fault.js';

export type LevelForce = {
  readonly level: string;
  /** Storey force [force] */
  readonly force: number;
  /** Diaphragm design force [force] */
  readonly diaphragmForce: number;
};

/**
 * @returns the levels that are pushed [force]
 */
export function levelForces(building: Building, loadCase: LoadCase): Result<readonly LevelForce[]> {
  if (loadCase.from === 'stated') {
    return {
      ok: true,
      value: loadCase.forces.map(({ level, force, diaphragmForce }) => ({
        level,
        force,
        diaphragmForce: diaphragmForce ?? force,
      })),
    };
  }
  return {
    ok: false,
    faults: [
      {
        code: 'no-basis',
        path: 'basis',
        found: building.basis === undefined ? 'no basis of design' : 'a basis of design',
        expected: `seismic values for load case ${loadCase.id}`,
      },
    ],
  };
}
