/**
 * The one door between a building's own units and the feet, pounds and inches in which the clauses for wood assemblies are written.
 * Exact by definition: 1 ft = 0.3048 m, 1 lb = 4.4482216152605 N (international foot and pound, standard gravity).
 */
import type { Units } from '../../building/definition.js';

const METRES_PER_FOOT = 0.3048;
const NEWTONS_PER_POUND = 4.4482216152605;

/** A length of the building [ft] */
export function feet(length: number, units: Units): number {
  return units.length === 'ft' ? length : length / METRES_PER_FOOT;
}

/** A force of the building [lb] */
export function pounds(force: number, units: Units): number {
  return units.length === 'ft' ? force * 1000 : (force * 1000) / NEWTONS_PER_POUND;
}

/** A unit shear of the building [lb/ft] */
export function poundsPerFoot(unitShear: number, units: Units): number {
  return units.length === 'ft' ? unitShear * 1000 : (unitShear * 1000 * METRES_PER_FOOT) / NEWTONS_PER_POUND;
}

/** A shear stiffness, or a force per displacement, of the building [kip/in] */
export function kipsPerInch(stiffness: number, units: Units): number {
  return poundsPerFoot(stiffness, units) / 12_000;
}

/** [ft] into the building's length */
export function lengthFromFeet(lengthFt: number, units: Units): number {
  return units.length === 'ft' ? lengthFt : lengthFt * METRES_PER_FOOT;
}

/** [in] into the building's length */
export function lengthFromInches(lengthIn: number, units: Units): number {
  return units.length === 'ft' ? lengthIn / 12 : (lengthIn * METRES_PER_FOOT) / 12;
}

/** [lb] into the building's force */
export function forceFromPounds(forceLb: number, units: Units): number {
  return units.length === 'ft' ? forceLb / 1000 : (forceLb * NEWTONS_PER_POUND) / 1000;
}

/** [lb/ft] into the building's force/length */
export function unitShearFromPlf(unitShearPlf: number, units: Units): number {
  return units.length === 'ft' ? unitShearPlf / 1000 : (unitShearPlf * NEWTONS_PER_POUND) / (1000 * METRES_PER_FOOT);
}

/** [kip/in] into the building's force/length: an apparent shear stiffness G_a, or a force per displacement */
export function stiffnessFromKipPerIn(stiffnessKipPerIn: number, units: Units): number {
  return unitShearFromPlf(stiffnessKipPerIn * 12_000, units);
}
