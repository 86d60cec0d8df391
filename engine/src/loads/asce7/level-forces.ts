/** Level forces of the equivalent lateral force procedure, from the file's weights and heights. */
import type { AsceSeismic } from '../../building/basis.js';
import type { Building } from '../../building/definition.js';
import type { Result } from '../../building/fault.js';
import type { LevelForce } from '../level-forces.js';
import { noWeight, weighedLevels } from '../seismic-weight.js';
import { feetPer } from '../units.js';
import { baseShear, diaphragmLimits, verticalDistribution } from './equivalent-lateral-force.js';

/**
 * @param caseId the load case, for the fault
 * @returns levels above the base, ascending [force]
 */
export function equivalentLateralForces(
  building: Building,
  basis: AsceSeismic,
  caseId: string,
): Result<readonly LevelForce[]> {
  const perUnit = feetPer(building.units);
  const levels = weighedLevels(building).map(({ level, weight, height }) => ({
    level,
    weight,
    heightFt: height * perUnit,
  }));
  const total = levels.reduce((sum, level) => sum + level.weight, 0);
  if (!(total > 0)) return noWeight(caseId);
  const { coefficient, k } = baseShear(basis, levels[levels.length - 1]?.heightFt ?? 0, levels.length);
  const forces = verticalDistribution(levels, coefficient * total, k); // ASCE 7-16 Eq. 12.8-1
  const design = diaphragmLimits(levels, forces, basis);
  return {
    ok: true,
    value: design.map((limits, i) => ({
      level: levels[i]?.level ?? '',
      force: forces[i] as number,
      diaphragmForce: Math.min(Math.max(limits.inertial, limits.least), limits.most),
      limits,
    })),
  };
}
