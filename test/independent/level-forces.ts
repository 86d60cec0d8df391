/** Level forces of a case: as stated, or by the equivalent lateral force procedure of ASCE 7-16/-22 with a period of its own height. */
import type { Building, LoadCase } from '@groundward/engine/building/definition';
import { seismicWeight } from './push.js';

/** Force by level id [force] */
export function levelForcesOf(building: Building, loadCase: LoadCase): Map<string, number> {
  if (loadCase.from === 'stated') return new Map(loadCase.forces.map(({ level, force }) => [level, force]));
  const { basis } = building;
  if (basis === undefined || !('seismic' in basis) || !basis.standard.startsWith('ASCE')) throw new Error('no basis');
  const {
    SDS,
    SD1,
    R,
    importance = 1,
    S1 = 0,
  } = basis.seismic as Record<string, number> & {
    SDS: number;
    SD1: number;
    R: number;
  };
  const base = Math.min(...building.levels.map(({ elevation }) => elevation));
  const perFoot = building.units.length === 'ft' ? 1 : 1 / 0.3048;
  const masses = building.levels
    .filter(({ elevation }) => elevation > base)
    .map(({ id, elevation, diaphragms = [] }) => ({
      id,
      feet: (elevation - base) * perFoot,
      weight: diaphragms.reduce((sum, floor) => sum + seismicWeight(floor), 0),
    }));
  const period = 0.02 * Math.max(...masses.map(({ feet }) => feet)) ** 0.75; // Eq. 12.8-7, Table 12.8-2
  const quotient = R / importance;
  const floor = Math.max(0.044 * SDS * importance, 0.01, S1 >= 0.6 ? (0.5 * S1) / quotient : 0); // Eqs. 12.8-5, 12.8-6
  const coefficient = Math.max(floor, Math.min(SDS / quotient, SD1 / (period * quotient))); // Eqs. 12.8-2, 12.8-3
  const k = Math.min(2, Math.max(1, 0.75 + period / 2)); // 12.8.3
  const whole = masses.reduce((sum, { weight }) => sum + weight, 0);
  const moments = masses.reduce((sum, { weight, feet }) => sum + weight * feet ** k, 0);
  return new Map(masses.map(({ id, weight, feet }) => [id, (coefficient * whole * weight * feet ** k) / moments]));
}
