/** One floor with steps in its outline, loaded along y, for the laws of transfer diaphragms. */
import { Building, type Point, type Ring } from '@groundward/engine/building/definition';
import { analyse } from '@groundward/engine/path/analyse';
import type {
  Analysis,
  CollectorDiagram,
  Demand,
  DiaphragmDiagram,
  OpeningDiagram,
  Quantity,
  StrutDiagram,
  TransferDiagram,
} from '@groundward/engine/path/result';

export type SteppedFloor = {
  readonly outline: Ring;
  /** x of the wall lines, each along the whole depth of the plan. */
  readonly lines: readonly number[];
  readonly openings?: readonly Ring[];
  readonly transferLength?: number;
  readonly behaviour?: 'flexible' | 'rigid';
  readonly spread?: 'even' | 'area';
  /** Force per unit of width, spread evenly. */
  readonly w?: number;
};

/** An outline from left to right: [x where it begins, lower y, upper y], and the x where it ends. */
export function stepped(parts: readonly (readonly [number, number, number])[], end: number): Ring {
  const lower: Point[] = [];
  const upper: Point[] = [];
  parts.forEach(([x, low, high], i) => {
    const to = parts[i + 1]?.[0] ?? end;
    lower.push([x, low], [to, low]);
    upper.push([x, high], [to, high]);
  });
  const ring = [...lower, ...upper.reverse()];
  return ring.filter(([x, y], i) => {
    const [px, py] = ring[(i + ring.length - 1) % ring.length] as Point;
    return x !== px || y !== py;
  });
}

export function steppedBuilding(floor: SteppedFloor): Building {
  const xs = floor.outline.map(([x]) => x);
  const ys = floor.outline.map(([, y]) => y);
  const [low, high] = [Math.min(...ys), Math.max(...ys)];
  const [left, right] = [Math.min(...xs), Math.max(...xs)];
  const wall = (id: string, axis: [Point, Point], length: number) => ({
    id,
    axis,
    storeys: [{ under: 'roof', piers: [{ id: 'a', from: 0, to: length, stiffness: 1000 }] }],
  });
  return Building.parse({
    schema: 'groundward.building/1',
    name: 'Stepped floor',
    units: { length: 'm', force: 'kN' },
    levels: [
      { id: 'base', elevation: 0 },
      {
        id: 'roof',
        elevation: 4,
        diaphragms: [
          {
            id: 'd',
            outline: floor.outline,
            behaviour: floor.behaviour ?? 'flexible',
            ...(floor.transferLength === undefined ? {} : { transferLength: floor.transferLength }),
            openings: (floor.openings ?? []).map((outline, i) => ({ id: `o${i + 1}`, outline })),
          },
        ],
      },
    ],
    wallLines: [
      ...floor.lines.map((x, i) =>
        wall(
          `${i + 1}`,
          [
            [x, low],
            [x, high],
          ],
          high - low,
        ),
      ),
      ...(floor.behaviour === 'rigid'
        ? [
            wall(
              'A',
              [
                [left, low],
                [right, low],
              ],
              right - left,
            ),
          ]
        : []),
    ],
    loadCases: [
      {
        id: 'EY',
        kind: 'seismic',
        direction: 90,
        from: 'stated',
        spread: floor.spread ?? 'even',
        forces: [{ level: 'roof', force: (floor.w ?? 1) * (right - left) }],
      },
    ],
  });
}

export class SteppedCase {
  readonly analysis: Analysis;

  constructor(floor: SteppedFloor) {
    const result = analyse(steppedBuilding(floor));
    if (!result.ok) throw new Error(JSON.stringify(result.faults));
    this.analysis = result.value;
  }

  rows(member: string, quantity: Quantity, sense = 1): Demand[] {
    return this.analysis.demands.filter(
      (row) => row.member === member && row.quantity === quantity && row.sense === sense,
    );
  }

  value(member: string, quantity: Quantity, sense = 1): number {
    const [row, ...more] = this.rows(member, quantity, sense);
    if (row === undefined || more.length > 0) throw new Error(`${more.length + 1} rows of ${member} ${quantity}`);
    return row.value;
  }

  get floor(): DiaphragmDiagram {
    return this.analysis.diagrams.find(
      (each): each is DiaphragmDiagram => each.kind === 'diaphragm',
    ) as DiaphragmDiagram;
  }

  get transfers(): TransferDiagram[] {
    return this.analysis.diagrams.filter((each): each is TransferDiagram => each.kind === 'transfer-diaphragm');
  }

  get openings(): OpeningDiagram[] {
    return this.analysis.diagrams.filter((each): each is OpeningDiagram => each.kind === 'opening');
  }

  get bars(): (StrutDiagram | CollectorDiagram)[] {
    return this.analysis.diagrams.filter(
      (each): each is StrutDiagram | CollectorDiagram => each.kind === 'strut' || each.kind === 'collector',
    );
  }

  codes(): string[] {
    return this.analysis.findings.map(({ code }) => code);
  }
}

export const at = (c: readonly number[], x: number): number => c.reduceRight((sum, each) => sum * x + each, 0);

/** Net unit shear of the floor at a place inside it: of its panel where a transfer acts, else V/d. */
export function unitShear(found: SteppedCase, s: number, t: number): number {
  for (const { panels } of found.transfers) {
    for (const panel of panels) {
      const x = s - panel.from;
      if (x < 0 || s > panel.to || t < at(panel.lower, x) || t > at(panel.upper, x)) continue;
      return at(panel.shear, x) / at(panel.depth, x);
    }
  }
  const piece = found.floor.pieces.find(({ from, to }) => from <= s && s <= to);
  if (piece === undefined) throw new Error(`nothing at ${s}`);
  return at(piece.shear, s - piece.from) / at(piece.depth, s - piece.from);
}

export function momentAt(found: SteppedCase, s: number): number {
  const piece = found.floor.pieces.find(({ from, to }) => from <= s && s <= to);
  return piece === undefined ? 0 : at(piece.moment, s - piece.from);
}
