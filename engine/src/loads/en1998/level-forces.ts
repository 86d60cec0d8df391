/** Level forces of the lateral force method, from the file's weights and heights. */
import type { EnSeismic } from '../../building/basis.js';
import type { Building } from '../../building/definition.js';
import type { Result } from '../../building/fault.js';
import type { LevelForce } from '../level-forces.js';
import { noWeight, weighedLevels } from '../seismic-weight.js';
import { metresPer } from '../units.js';
import { liveShareOf } from './live-share.js';
import { baseShear, verticalDistribution } from './lateral-force.js';

/**
 * @param caseId the load case, for the fault
 * @returns levels above the base, ascending [force]
 */
export function lateralForces(building: Building, basis: EnSeismic, caseId: string): Result<readonly LevelForce[]> {
  const levels = weighedLevels(building, liveShareOf(basis)); // EN 1998-1 3.2.4(2)
  const total = levels.reduce((sum, level) => sum + level.weight, 0);
  if (!(total > 0)) return noWeight(caseId);
  const heightM = (levels[levels.length - 1]?.height ?? 0) * metresPer(building.units);
  const { coefficient } = baseShear(basis, heightM, levels.length);
  const forces = verticalDistribution(levels, coefficient * total);
  const overstrength = basis.diaphragmOverstrength ?? 1.3; // EN 1998-1 4.4.2.5(2)
  return {
    ok: true,
    value: levels.map(({ level }, i) => ({
      level,
      force: forces[i] as number,
      diaphragmForce: overstrength * (forces[i] as number),
    })),
  };
}
