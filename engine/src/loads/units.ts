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

/** 1 mi/h = 0.44704 m/s. */
const METRES_PER_SECOND_PER_MPH = 0.44704;

/** 1 lb = 0.45359237 kg at 9.80665 m/s². */
const NEWTONS_PER_POUND = 0.45359237 * 9.80665;

/** @param speed in mi/h where the file is in feet, in m/s where it is in metres */
export function speedInMph(units: Units, speed: number): number {
  return units.length === 'ft' ? speed : speed / METRES_PER_SECOND_PER_MPH;
}

/** @returns one lb/ft² in the file's force/length² */
export function psfIn(units: Units): number {
  return units.length === 'ft' ? 1 / 1000 : NEWTONS_PER_POUND / (METRES_PER_FOOT * METRES_PER_FOOT) / 1000;
}
