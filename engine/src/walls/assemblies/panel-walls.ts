/**
 * Published shear walls: blocked wood structural panels on one side, framing of specific gravity 0.50, dry.
 *
 * Source: SDPWS-2008/2015 Table 4.3A, values seen in a copy of the table in a city's file; the few that this copy spoils are restored from twice the
 * allowable unit shears of the IBC, seen, and 1.4 times the seismic value, and carry `restored`. The 2021 edition's one nominal value is taken as the
 * older wind value: derived, agrees with the older allowable seismic shear within 0.3 %.
 */
import type { Units, WallAssembly } from '../../building/definition.js';
import type { Edition, NominalUnitShear } from '../capacity.js';
import type { Nail, PanelGrade } from '../nail-slip.js';
import { stiffnessFromKipPerIn, unitShearFromPlf } from './customary-units.js';

export type Panel = 'osb' | 'plywood';
/** Nominal panel thickness [in] */
export type PanelThickness = '5/16' | '3/8' | '7/16' | '15/32' | '19/32';
/** Nails at panel edges [in] */
export type EdgeSpacing = 6 | 4 | 3 | 2;

export type PanelWall = {
  readonly id: string;
  readonly name: string;
  readonly grade: PanelGrade;
  readonly thickness: PanelThickness;
  readonly nail: Nail;
  readonly edgeSpacingIn: EdgeSpacing;
  readonly panel: Panel;
  /** v_s [lb/ft] */
  readonly seismicPlf: number;
  /** v_w [lb/ft] */
  readonly windPlf: number;
  /** G_a [kip/in] */
  readonly apparentShearStiffnessKipPerIn: number;
  readonly provenance: 'seen' | 'restored';
};

/** Every published wall, by grade, thickness, nail, spacing and panel. */
export function panelWalls(): readonly PanelWall[] {
  return walls;
}

/** A published wall by its id. */
export function panelWall(id: string): PanelWall | undefined {
  return byId.get(id);
}

/** The nominal unit shears of a wall as an edition prints them [lb/ft]. */
export function panelWallNominalPlf(wall: PanelWall, edition: Edition): Required<NominalUnitShear> {
  return { seismic: edition === '2015' ? wall.seismicPlf : wall.windPlf, wind: wall.windPlf };
}

/** A published wall as an assembly of a building file, in the file's units. */
export function panelWallAssembly(wall: PanelWall, edition: Edition, units: Units): WallAssembly {
  const nominal = panelWallNominalPlf(wall, edition);
  return {
    id: wall.id,
    name: wall.name,
    edition,
    nominalUnitShear: {
      seismic: unitShearFromPlf(nominal.seismic, units),
      wind: unitShearFromPlf(nominal.wind, units),
    },
    apparentShearStiffness: stiffnessFromKipPerIn(wall.apparentShearStiffnessKipPerIn, units),
  };
}

type BySpacing = readonly [number, number, number, number];
type Row = {
  readonly grade: PanelGrade;
  readonly thickness: PanelThickness;
  readonly nail: Nail;
  readonly seismic: BySpacing;
  readonly wind: BySpacing;
  readonly osb: BySpacing;
  readonly plywood: BySpacing;
};

const spacings: readonly EdgeSpacing[] = [6, 4, 3, 2];

/** v_s [lb/ft], v_w [lb/ft], G_a with oriented strand board, with plywood [kip/in]; each at 6, 4, 3, 2 in. */
const rows: readonly Row[] = [
  row('structural-1', '5/16', '6d', [400, 600, 780, 1020], [560, 840, 1090, 1430], [13, 18, 23, 35], [10, 13, 16, 22]),
  row('structural-1', '3/8', '8d', [460, 720, 920, 1220], [645, 1010, 1290, 1710], [19, 24, 30, 43], [14, 17, 20, 24]),
  row(
    'structural-1',
    '7/16',
    '8d',
    [510, 790, 1010, 1340],
    [715, 1105, 1415, 1875],
    [16, 21, 27, 40],
    [13, 16, 19, 24],
  ),
  row(
    'structural-1',
    '15/32',
    '8d',
    [560, 860, 1100, 1460],
    [785, 1205, 1540, 2045],
    [14, 18, 24, 37],
    [11, 14, 17, 23],
  ),
  row(
    'structural-1',
    '15/32',
    '10d',
    [680, 1020, 1330, 1740],
    [950, 1430, 1860, 2435],
    [22, 29, 36, 51],
    [16, 20, 22, 28],
  ),
  row('sheathing', '5/16', '6d', [360, 540, 700, 900], [505, 755, 980, 1260], [13, 18, 24, 37], [9.5, 12, 14, 18]),
  row('sheathing', '3/8', '6d', [400, 600, 780, 1020], [560, 840, 1090, 1430], [11, 15, 20, 32], [8.5, 11, 13, 17]),
  row('sheathing', '3/8', '8d', [440, 640, 820, 1060], [615, 895, 1150, 1485], [17, 25, 31, 45], [12, 15, 17, 20]),
  row('sheathing', '7/16', '8d', [480, 700, 900, 1170], [670, 980, 1260, 1640], [15, 22, 28, 42], [11, 14, 17, 21]),
  row('sheathing', '15/32', '8d', [520, 760, 980, 1280], [730, 1065, 1370, 1790], [13, 19, 25, 39], [10, 13, 15, 20]),
  row('sheathing', '15/32', '10d', [620, 920, 1200, 1540], [870, 1290, 1680, 2155], [22, 30, 37, 52], [14, 17, 19, 23]),
  row(
    'sheathing',
    '19/32',
    '10d',
    [680, 1020, 1330, 1740],
    [950, 1430, 1860, 2435],
    [19, 26, 33, 48],
    [13, 16, 18, 22],
  ),
];

/** Values which the copy of the table spoils: Structural I, 15/32 in., 8d. */
function restored({ grade, thickness, nail }: Row, spacing: EdgeSpacing): boolean {
  return grade === 'structural-1' && thickness === '15/32' && nail === '8d' && (spacing === 4 || spacing === 2);
}

const walls: readonly PanelWall[] = rows.flatMap((line) =>
  spacings.flatMap((edgeSpacingIn, i) =>
    (['osb', 'plywood'] as const).map((panel): PanelWall => {
      const { grade, thickness, nail } = line;
      return {
        id: `${grade}-${thickness.replace('/', '-')}-${nail}-${edgeSpacingIn}in-${panel}`,
        name: `${grade === 'structural-1' ? 'Structural I' : 'Sheathing'} ${thickness} in. ${panel === 'osb' ? 'OSB' : 'plywood'}, ${nail} at ${edgeSpacingIn} in.`,
        grade,
        thickness,
        nail,
        edgeSpacingIn,
        panel,
        seismicPlf: line.seismic[i]!,
        windPlf: line.wind[i]!,
        apparentShearStiffnessKipPerIn: line[panel][i]!,
        provenance: restored(line, edgeSpacingIn) ? 'restored' : 'seen',
      };
    }),
  ),
);

const byId: ReadonlyMap<string, PanelWall> = new Map(walls.map((wall) => [wall.id, wall]));

function row(
  grade: PanelGrade,
  thickness: PanelThickness,
  nail: Nail,
  seismic: BySpacing,
  wind: BySpacing,
  osb: BySpacing,
  plywood: BySpacing,
): Row {
  return { grade, thickness, nail, seismic, wind, osb, plywood };
}
