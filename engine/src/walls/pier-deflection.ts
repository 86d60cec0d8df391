/** What a pier's top moves under its shear, by the published equations, and the stiffness that follows from it. In the building's units. */
import type { HoldDownAssembly, Units } from '../building/definition.js';
import { feet, kipsPerInch, lengthFromInches, pounds, poundsPerFoot } from './assemblies/customary-units.js';
import { fourTermWallDeflection, threeTermWallDeflection, type WallDeflection } from './deflection.js';
import { nailForceLb, nailSlipIn } from './nail-slip.js';
import { referenceUnitShear, type WallProperties } from './wall-assembly.js';

/** A pier whose deflection is known: a shear wall of an assembly, with or without the slip of its hold-downs. */
export type DeflectingPier = {
  /** h [length] */
  readonly height: number;
  /** b [length] */
  readonly length: number;
  readonly wall: WallProperties;
  readonly holdDown: HoldDownAssembly | undefined;
  readonly units: Units;
};

/** Terms of a deflection [length]; the slip of nails is 0 where it is part of the apparent shear stiffness. */
export type DeflectionTerms = {
  readonly bending: number;
  readonly shear: number;
  readonly nailSlip: number;
  readonly rotation: number;
  readonly total: number;
};

/**
 * @param shear on the pier, either sense [force]
 * @returns magnitudes; undefined where the assembly has no shear stiffness
 * Source: SDPWS-2015 Eq. 4.3-1 (three terms), C4.3.2-1 (four), with Δ_a = T/k_a at the tension T = v·h of the hold-down.
 */
export function pierDeflection(pier: DeflectingPier, shear: number): DeflectionTerms | undefined {
  const { height, length, wall, units } = pier;
  const unitShear = Math.abs(shear) / length;
  const unitShearPlf = poundsPerFoot(unitShear, units);
  const own = {
    unitShearPlf,
    heightFt: feet(height, units),
    lengthFt: feet(length, units),
    endPostStiffnessLb: pounds(wall.endPostStiffness, units),
    anchorSlipIn: feet((unitShear * height) / anchorStiffness(pier.holdDown), units) * 12,
  };
  if (wall.nailed !== undefined) {
    const { nail, grade, edgeSpacingIn, panelRigidityLbPerIn } = wall.nailed;
    const slip = nailSlipIn(nail, nailForceLb(unitShearPlf, edgeSpacingIn), grade);
    return inUnits(fourTermWallDeflection({ ...own, panelRigidityLbPerIn, nailSlipIn: slip }), units);
  }
  if (wall.shearStiffness === undefined) return undefined;
  const apparentShearStiffnessKipPerIn = kipsPerInch(wall.shearStiffness, units);
  return inUnits(threeTermWallDeflection({ ...own, apparentShearStiffnessKipPerIn }), units);
}

/**
 * Shear per deflection [force/length]. The three-term deflection is proportional to its shear; the four-term one is taken by its secant at the
 * strength level of the assembly, where G_a is defined, so that shares do not depend on the load.
 */
export function deflectionStiffness(pier: DeflectingPier): number | undefined {
  const { nominalUnitShear, edition, nailed } = pier.wall;
  const unitShear = nailed === undefined ? 1 : referenceUnitShear(nominalUnitShear, edition);
  if (unitShear === undefined) return undefined;
  const shear = unitShear * pier.length;
  const terms = pierDeflection(pier, shear);
  return terms === undefined ? undefined : shear / terms.total;
}

/** k_a, force per elongation of the hold-down system; Infinity where no elongation is stated [force/length] */
export function anchorStiffness(holdDown: HoldDownAssembly | undefined): number {
  const { allowableTension, deflectionAtAllowable } = holdDown ?? {};
  if (allowableTension === undefined || deflectionAtAllowable === undefined) return Infinity;
  return allowableTension / deflectionAtAllowable;
}

function inUnits(
  { bendingIn, shearIn, nailSlipIn: slip, rotationIn, totalIn }: WallDeflection,
  units: Units,
): DeflectionTerms {
  return {
    bending: lengthFromInches(bendingIn, units),
    shear: lengthFromInches(shearIn, units),
    nailSlip: lengthFromInches(slip, units),
    rotation: lengthFromInches(rotationIn, units),
    total: lengthFromInches(totalIn, units),
  };
}
