/** A wall assembly with everything that its file states or that is published for it, in the building's own units. */
import type { Building, HoldDownAssembly, Units, WallAssembly } from '../building/definition.js';
import { feet, kipsPerInch, poundsPerFoot, stiffnessFromKipPerIn } from './assemblies/customary-units.js';
import { panelWall, panelWallAssembly } from './assemblies/panel-walls.js';
import { formatFactor, type Edition, type Format, type NominalUnitShear } from './capacity.js';
import { apparentShearStiffnessKipPerIn, type NailedPanel } from './nail-slip.js';
import type { Sheathing } from './slender.js';

export type WallProperties = {
  readonly assembly: WallAssembly;
  readonly nominalUnitShear: NominalUnitShear;
  readonly edition: Edition;
  /** Where the combinations do not bring one. */
  readonly format: Format;
  readonly specificGravity: number;
  readonly sheathing: Sheathing | 'other';
  /** G_a [force/length] */
  readonly shearStiffness: number | undefined;
  /** E·A of one end post [force]; Infinity where none is stated */
  readonly endPostStiffness: number;
  /** For the four-term deflection. */
  readonly nailed: NailedPanel | undefined;
};

export type Assemblies = {
  readonly walls: ReadonlyMap<string, WallProperties>;
  readonly holdDowns: ReadonlyMap<string, HoldDownAssembly>;
};

/** Every wall and hold-down assembly of a building by its id. */
export function assembliesOf(building: Building): Assemblies {
  const { walls = [], holdDowns = [] } = building.assemblies ?? {};
  return {
    walls: new Map(walls.map((assembly) => [assembly.id, wallProperties(assembly, building.units)])),
    holdDowns: new Map(holdDowns.map((assembly) => [assembly.id, assembly])),
  };
}

function wallProperties(assembly: WallAssembly, units: Units): WallProperties {
  const edition = assembly.edition ?? '2015';
  const row = assembly.published === undefined ? undefined : panelWall(assembly.published);
  const published = row === undefined ? undefined : panelWallAssembly(row, edition, units);
  const nominalUnitShear = nominalOf(assembly, published);
  const nailed = nailedPanel(assembly, units);
  return {
    assembly,
    nominalUnitShear,
    edition,
    format: assembly.format ?? 'allowable',
    specificGravity: assembly.specificGravity ?? 0.5,
    sheathing: assembly.sheathing ?? 'panels-blocked',
    shearStiffness:
      assembly.apparentShearStiffness ??
      published?.apparentShearStiffness ??
      apparentStiffness(nailed, referenceUnitShear(nominalUnitShear, edition), units),
    endPostStiffness: assembly.endPostStiffness ?? Infinity,
    nailed,
  };
}

/** Stated, and beside it what is published. */
function nominalOf(assembly: WallAssembly, published: WallAssembly | undefined): NominalUnitShear {
  const seismic = assembly.nominalUnitShear?.seismic ?? published?.nominalUnitShear?.seismic;
  const wind = assembly.nominalUnitShear?.wind ?? published?.nominalUnitShear?.wind;
  return { ...(seismic === undefined ? {} : { seismic }), ...(wind === undefined ? {} : { wind }) };
}

function nailedPanel({ fourTerm }: WallAssembly, units: Units): NailedPanel | undefined {
  if (fourTerm === undefined) return undefined;
  return {
    nail: fourTerm.nail,
    grade: fourTerm.grade ?? 'sheathing',
    edgeSpacingIn: feet(fourTerm.edgeSpacing, units) * 12,
    panelRigidityLbPerIn: kipsPerInch(fourTerm.panelRigidity, units) * 1000,
  };
}

/**
 * The unit shear at which a deflection that is not proportional to its shear is made so: 1.4 times the allowable one, the strength level at
 * which G_a itself is defined (SDPWS commentary C4.2.2, C4.3.2) [force/length]
 */
export function referenceUnitShear(nominal: NominalUnitShear, edition: Edition): number | undefined {
  const hazard = nominal.seismic === undefined ? 'wind' : 'seismic';
  const value = nominal[hazard];
  return value === undefined ? undefined : 1.4 * value * formatFactor(hazard, edition, 'allowable').factor;
}

function apparentStiffness(
  nailed: NailedPanel | undefined,
  reference: number | undefined,
  units: Units,
): number | undefined {
  if (nailed === undefined || reference === undefined) return undefined;
  return stiffnessFromKipPerIn(apparentShearStiffnessKipPerIn(nailed, poundsPerFoot(reference, units) / 1.4), units);
}
