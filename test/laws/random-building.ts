/** Random sound buildings: rectilinear and oblique plans with openings, zones and façades, stacks of walls, flexible and rigid levels. */
import fc from 'fast-check';
import type { Building, Diaphragm, Pier, Point, WallLine } from '@groundward/engine/building/definition';

/** Small whole numbers in sixteenths: exact in binary, so that the file itself carries no rounding. */
const sixteenths = (from: number, to: number): fc.Arbitrary<number> =>
  fc.integer({ min: from * 16, max: to * 16 }).map((n) => n / 16);

/** The depth of the plan is cut off by steps at both edges (rectilinear) or by slants (oblique); the middle strip is always there. */
type Edge = { readonly low: readonly number[]; readonly high: readonly number[]; readonly oblique: boolean };

const WIDTH = 60;
const DEPTH = 30;
const CORE: readonly [number, number] = [10, 20];

const edges: fc.Arbitrary<Edge> = fc.record({
  low: fc.array(sixteenths(0, 9), { minLength: 1, maxLength: 4 }),
  high: fc.array(sixteenths(21, DEPTH), { minLength: 1, maxLength: 4 }),
  oblique: fc.boolean(),
});

function outlineOf({ low, high, oblique }: Edge): Point[] {
  const along = (values: readonly number[]): Point[] => {
    const step = WIDTH / values.length;
    if (oblique && values.length > 1) return values.map((y, i) => [(i * WIDTH) / (values.length - 1), y]);
    return values.flatMap((y, i): Point[] => [
      [i * step, y],
      [(i + 1) * step, y],
    ]);
  };
  const ring = [...along(low), ...along(high).reverse()];
  return ring.filter(([x, y], i) => {
    const [px, py] = ring[(i + ring.length - 1) % ring.length] as Point;
    return x !== px || y !== py;
  });
}

const rect = (x0: number, y0: number, x1: number, y1: number): Point[] => [
  [x0, y0],
  [x1, y0],
  [x1, y1],
  [x0, y1],
];

const diaphragm = (
  id: string,
  edge: Edge,
  rigid: boolean,
  opening: number | null,
  area: number,
  facade: number,
): Diaphragm => ({
  id,
  outline: outlineOf(edge),
  behaviour: rigid ? 'rigid' : 'flexible',
  ...(opening === null ? {} : { openings: [{ id: 'o', outline: rect(opening, 12, opening + 5, 17) }] }),
  weight: {
    area,
    zones: [{ id: 'z', outline: rect(3, 11, 57, 19), area: area * 2 }],
    lines: [
      {
        id: 'f',
        along: [
          [0, CORE[0]],
          [0, CORE[1]],
          [WIDTH, CORE[1]],
        ],
        perLength: facade,
      },
      {
        id: 'p',
        along: [
          [7, 10.5],
          [23, 19.5],
        ],
        perLength: facade / 2,
      },
    ],
  },
});

/** Piers in a line of a length: two, side by side or apart, with offsets and gravity. */
const piers = (length: number): fc.Arbitrary<Pier[]> =>
  fc
    .record({
      a: sixteenths(0, 1),
      b: sixteenths(2, 4),
      c: sixteenths(5, 6),
      d: sixteenths(7, Math.floor(length)),
      dead: sixteenths(0, 3),
      offset: sixteenths(0, 0.375),
      k: fc.integer({ min: 1, max: 9 }),
    })
    .map(({ a, b, c, d, dead, offset, k }) => [
      { id: 'a', from: a, to: b, stiffness: k * 100, endOffset: offset, gravity: [{ case: 'D', perLength: dead }] },
      {
        id: 'b',
        from: c,
        to: d,
        stiffness: 1000 - k * 100,
        endOffset: [offset, 0],
        gravity: [{ case: 'L', perLength: dead }],
      },
    ]);

/** A wall line through the core; it may be absent from some storeys, but never where it is one of the `always` lines. */
function wallLine(
  id: string,
  axis: [Point, Point],
  levels: readonly string[],
  always: boolean,
): fc.Arbitrary<WallLine> {
  const length = Math.hypot(axis[1][0] - axis[0][0], axis[1][1] - axis[0][1]);
  return fc
    .tuple(
      fc.constantFrom<WallLine['shareBy']>('length', 'stiffness'),
      fc.boolean(),
      ...levels.map(() => fc.tuple(piers(length), fc.integer({ min: 0, max: 3 }))),
    )
    .map(([shareBy, reversed, ...storeys]) => {
      const there = storeys.map(([row, n], i) => ({ under: levels[i] as string, piers: row, kept: always || n > 0 }));
      const kept = there.filter((storey) => storey.kept);
      return {
        id,
        axis: reversed ? ([axis[1], axis[0]] as [Point, Point]) : axis,
        shareBy,
        storeys: (kept.length > 0 ? kept : there.slice(0, 1)).map(({ under, piers: row }) => ({ under, piers: row })),
      };
    });
}

export type Options = { readonly behaviours: 'flexible' | 'rigid' | 'mixed' };

/** @param options which behaviours the levels take */
export function buildings({ behaviours }: Options = { behaviours: 'mixed' }): fc.Arbitrary<Building> {
  return fc.integer({ min: 1, max: 4 }).chain((storeys) => {
    const ids = Array.from({ length: storeys }, (_, i) => `L${i + 2}`);
    return fc
      .record({
        heights: fc.array(sixteenths(2, 5), { minLength: storeys, maxLength: storeys }),
        plans: fc.array(
          fc.record({
            edge: edges,
            rigid: fc.boolean(),
            opening: fc.option(sixteenths(8, 50)),
            area: sixteenths(1, 4),
            facade: sixteenths(0, 3),
          }),
          { minLength: storeys, maxLength: storeys },
        ),
        across: fc.uniqueArray(sixteenths(4, 56), { minLength: 0, maxLength: 3 }),
        along: fc.uniqueArray(sixteenths(11, 19), { minLength: 0, maxLength: 2 }),
        forces: fc.array(fc.integer({ min: -50, max: 200 }), { minLength: storeys, maxLength: storeys }),
        design: fc.array(fc.integer({ min: 1, max: 200 }), { minLength: storeys, maxLength: storeys }),
        spread: fc.constantFrom<'weight' | 'area' | 'even'>('weight', 'area', 'even'),
        accidental: fc.boolean(),
      })
      .chain((plan) => {
        const y: [number, number] = [CORE[0], CORE[1]];
        const lines = [
          wallLine(
            'y0',
            [
              [0, y[0]],
              [0, y[1]],
            ],
            ids,
            true,
          ),
          wallLine(
            'y1',
            [
              [WIDTH, y[0]],
              [WIDTH, y[1]],
            ],
            ids,
            true,
          ),
          wallLine(
            'x0',
            [
              [0, y[0]],
              [WIDTH, y[0]],
            ],
            ids,
            true,
          ),
          wallLine(
            'x1',
            [
              [0, y[1]],
              [WIDTH, y[1]],
            ],
            ids,
            true,
          ),
          ...plan.across.map((x, i) =>
            wallLine(
              `y${i + 2}`,
              [
                [x, y[0]],
                [x, y[1]],
              ],
              ids,
              false,
            ),
          ),
          ...plan.along.map((at, i) =>
            wallLine(
              `x${i + 2}`,
              [
                [0, at],
                [WIDTH, at],
              ],
              ids,
              false,
            ),
          ),
        ];
        return fc.tuple(...lines).map((wallLines): Building => {
          let elevation = 0;
          const forces = ids.map((level, i) => ({
            level,
            force: plan.forces[i] as number,
            diaphragmForce: plan.design[i] as number,
          }));
          const accidental = plan.accidental ? { accidental: { ratio: 0.05 } } : {};
          return {
            schema: 'groundward.building/1',
            name: 'Random',
            units: { length: 'm', force: 'kN' },
            levels: [
              { id: 'base', elevation: 0 },
              ...ids.map((id, i) => {
                elevation += plan.heights[i] as number;
                const { edge, rigid, opening, area, facade } = plan.plans[i] as (typeof plan.plans)[number];
                const stiff = behaviours === 'mixed' ? rigid : behaviours === 'rigid';
                return { id, elevation, diaphragms: [diaphragm('d', edge, stiff, opening, area, facade)] };
              }),
            ],
            wallLines,
            loadCases: [
              { id: 'EX', kind: 'seismic', direction: 0, from: 'stated', spread: plan.spread, forces, ...accidental },
              { id: 'EY', kind: 'seismic', direction: 90, from: 'stated', spread: plan.spread, forces, ...accidental },
            ],
            combinations: [
              { id: '0.6D+0.7E', factors: { D: 0.6, E: 0.7 } },
              { id: 'D+L', factors: { D: 1, L: 1 } },
            ],
            postTolerance: 0.01,
          };
        });
      });
  });
}
