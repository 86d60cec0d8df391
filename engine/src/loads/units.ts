/** The door to units: what the standards' equations want in fixed units, from a file's own. All factors are exact. */
import type { Units } from '../building/definition.js';

/** 1 ft = 0.3048 m (international foot). */
export const METRES_PER_FOOT = 0.3048;

/** @returns feet in a unit of length of the file */
export function feetPer(units: Units): number {
  return units.length === 'ft' ? 1 : 1 / METRES_PER_FOOT;
}

/** @returns metres in a unit of length of the file */
export function metresPer(units: Units): number {
  return units.length === 'm' ? 1 : METRES_PER_FOOT;
}
