/**
 * Published diaphragms: blocked wood structural panels, sheathing grade, framing of specific gravity 0.50, panel layouts 1 and 2.
 *
 * Source: SDPWS-2008/2015 Table 4.2A, seismic values from memory, not checked against the document (half of each is the IBC's allowable unit shear).
 * Wind values: 1.4 times, to the nearest 5 lb/ft, as every value of Table 4.3A is: derived. Apparent shear stiffnesses are not known here.
 * The 2021 edition's one nominal value is taken as the older wind value: derived.
 */
import type { DiaphragmAssembly, Units } from '../../building/definition.js';
import type { Edition, NominalUnitShear } from '../capacity.js';
import type { Nail } from '../nail-slip.js';
import { unitShearFromPlf } from './customary-units.js';

/** Nails at the diaphragm's boundaries [in] */
export type BoundarySpacing = 6 | 4 | 2.5 | 2;
/** Nominal width of the framing at panel edges [in] */
export type FramingWidth = 2 | 3;

export type PanelDiaphragm = {
  readonly id: string;
  readonly name: string;
  readonly thickness: '15/32';
  readonly nail: Nail;
  readonly boundarySpacingIn: BoundarySpacing;
  readonly framingWidthIn: FramingWidth;
  /** v_s [lb/ft] */
  readonly seismicPlf: number;
  /** v_w [lb/ft] */
  readonly windPlf: number;
};

/** Every diaphragm known, by nail, framing and spacing. */
export function panelDiaphragms(): readonly PanelDiaphragm[] {
  return diaphragms;
}

/** A published diaphragm by its id. */
export function panelDiaphragm(id: string): PanelDiaphragm | undefined {
  return diaphragms.find((diaphragm) => diaphragm.id === id);
}

/** The nominal unit shears of a diaphragm as an edition prints them [lb/ft]. */
export function panelDiaphragmNominalPlf(diaphragm: PanelDiaphragm, edition: Edition): Required<NominalUnitShear> {
  return { seismic: edition === '2015' ? diaphragm.seismicPlf : diaphragm.windPlf, wind: diaphragm.windPlf };
}

/** A published diaphragm as an assembly of a building file, in the file's units; its shear stiffness is for the engineer to state. */
export function panelDiaphragmAssembly(diaphragm: PanelDiaphragm, edition: Edition, units: Units): DiaphragmAssembly {
  const nominal = panelDiaphragmNominalPlf(diaphragm, edition);
  return {
    id: diaphragm.id,
    name: diaphragm.name,
    edition,
    nominalUnitShear: {
      seismic: unitShearFromPlf(nominal.seismic, units),
      wind: unitShearFromPlf(nominal.wind, units),
    },
  };
}

const spacings: readonly BoundarySpacing[] = [6, 4, 2.5, 2];

/** v_s [lb/ft] at 6, 4, 2.5, 2 in. */
const rows: readonly {
  readonly nail: Nail;
  readonly framingWidthIn: FramingWidth;
  readonly seismic: readonly [number, number, number, number];
}[] = [
  { nail: '8d', framingWidthIn: 2, seismic: [540, 720, 1060, 1200] },
  { nail: '8d', framingWidthIn: 3, seismic: [600, 800, 1200, 1350] },
  { nail: '10d', framingWidthIn: 2, seismic: [580, 770, 1150, 1310] },
  { nail: '10d', framingWidthIn: 3, seismic: [650, 860, 1300, 1470] },
];

const diaphragms: readonly PanelDiaphragm[] = rows.flatMap(({ nail, framingWidthIn, seismic }) =>
  spacings.map((boundarySpacingIn, i): PanelDiaphragm => {
    const seismicPlf = seismic[i]!;
    return {
      id: `blocked-15-32-${nail}-${boundarySpacingIn}in-${framingWidthIn}x`,
      name: `Blocked 15/32 in. panels, ${nail} at ${boundarySpacingIn} in., ${framingWidthIn}x framing`,
      thickness: '15/32',
      nail,
      boundarySpacingIn,
      framingWidthIn,
      seismicPlf,
      windPlf: 5 * Math.round((1.4 * seismicPlf) / 5),
    };
  }),
);
