import { describe, expect, test } from 'vitest';
import type { Building, Diaphragm, PlainCase, Point } from '@groundward/engine/building/definition';
import { readBuilding } from '@groundward/engine/building/read';
import { basisFindings } from '@groundward/engine/loads/basis-findings';
import { facadeAcross } from '@groundward/engine/loads/facade';
import { levelForces } from '@groundward/engine/loads/level-forces';
import { windOn } from '@groundward/engine/loads/asce7/wind-forces';
import type { AsceWind } from '@groundward/engine/building/basis';
import { analyse } from '@groundward/engine/path/analyse';

const rectangle = (x0: number, y0: number, x1: number, y1: number): Point[] => [
  [x0, y0],
  [x1, y0],
  [x1, y1],
  [x0, y1],
];

type Floor = readonly [id: string, elevation: number, ...outlines: Point[][]];

function building(
  floors: readonly Floor[],
  wind: AsceWind = { V: 115, exposure: 'B' },
  units: Building['units'] = { length: 'ft', force: 'kip' },
): Building {
  return {
    schema: 'groundward.building/1',
    name: 'Weir house',
    units,
    levels: [
      { id: 'base', elevation: 0 },
      ...floors.map(([id, elevation, ...outlines]) => ({
        id,
        elevation,
        diaphragms: outlines.map((outline, d): Diaphragm => ({ id: `d${d + 1}`, outline })),
      })),
    ],
    wallLines: [],
    basis: { standard: 'ASCE 7-16', wind },
    loadCases: [{ id: 'WY', kind: 'wind', direction: 90, from: 'basis' }],
  };
}

const Y: Point = [0, 1];
const parts = (of: Building, level: string, ground = 0) =>
  facadeAcross(of, Y, ground)
    .find((each) => each.level === level)
    ?.parts.map(({ from, to, low, high }) => [from, to, low, high]);

describe('façade', () => {
  test('a floor takes half of the storeys under and over it; the lowest half storey goes into the ground', () => {
    const two = building([
      ['L2', 10, rectangle(0, 0, 60, 40)],
      ['roof', 24, rectangle(0, 0, 60, 40)],
    ]);
    expect(parts(two, 'L2')).toEqual([[0, 60, 5, 17]]);
    expect(parts(two, 'roof')).toEqual([[0, 60, 17, 24]]);
  });

  test('over a podium the tower’s storey loads the podium’s roof only where the tower stands', () => {
    const tower = building([
      ['L2', 10, rectangle(0, 0, 100, 40)],
      ['roof', 24, rectangle(20, 0, 50, 40)],
    ]);
    expect(parts(tower, 'L2')).toEqual([
      [0, 20, 5, 10],
      [20, 50, 5, 17],
      [50, 100, 5, 10],
    ]);
    expect(parts(tower, 'roof')).toEqual([[20, 50, 17, 24]]);
  });

  test('beside a gallery the façade spans from the ground to the roof', () => {
    const gallery = building([
      ['gallery', 10, rectangle(0, 0, 20, 40)],
      ['roof', 24, rectangle(0, 0, 60, 40)],
    ]);
    expect(parts(gallery, 'roof')).toEqual([
      [0, 20, 17, 24],
      [20, 60, 12, 24],
    ]);
  });

  test('floors at or under the ground get none', () => {
    const cellar = building([
      ['L1', 10, rectangle(0, 0, 60, 40)],
      ['roof', 20, rectangle(0, 0, 60, 40)],
    ]);
    expect(facadeAcross(cellar, Y, 10).map(({ level }) => level)).toEqual(['roof']);
    expect(parts(cellar, 'roof', 10)).toEqual([[0, 60, 5, 10]]);
  });

  test('every height of every façade is taken once, or goes into the ground', () => {
    const set = building([
      ['L2', 10, rectangle(0, 0, 100, 40)],
      ['L3', 21, rectangle(10, 0, 90, 40), rectangle(95, 5, 110, 20)],
      ['roof', 33, rectangle(20, 0, 50, 40)],
    ]);
    const levels = facadeAcross(set, Y, 0);
    for (let s = 0.5; s < 110; s++) {
      const here = levels
        .flatMap((level) => level.parts.map((part) => ({ ...part, height: level.height })))
        .filter(({ from, to }) => from < s && to > s)
        .sort((a, b) => a.low - b.low);
      here.forEach((part, i) => {
        expect(part.high).toBe(here[i + 1]?.low ?? part.height);
        if (i === 0) expect(part.low).toBe(part.height / 2);
      });
    }
  });
});

test('metres, kilonewtons and m/s give the same forces: 1 ft = 0.3048 m, 1 mi/h = 0.44704 m/s, 1 kip = 4.4482216152605 kN', () => {
  const wind: AsceWind = { V: 130, exposure: 'C', parapet: 3, heightRule: 'mean', Kzt: 1.2 };
  const shape = (f: number): Floor[] => [
    ['L2', 14 * f, rectangle(0, 0, 60 * f, 90 * f)],
    ['roof', 40 * f, rectangle(0, 0, 45 * f, 90 * f)],
  ];
  const feet = windOn(building(shape(1)), 'ASCE 7-22', wind, Y);
  const metric = { ...wind, V: 130 * 0.44704, parapet: 3 * 0.3048 };
  const metres = windOn(building(shape(0.3048), metric, { length: 'm', force: 'kN' }), 'ASCE 7-22', metric, Y);
  feet.levels.forEach(({ force }, i) =>
    expect((metres.levels[i]?.force ?? NaN) / force).toBeCloseTo(4.4482216152605, 9),
  );
});

test('the least pressure governs in light wind: 16 lb/ft² on every wall', () => {
  // ASCE 7-16 27.1.5; from memory, not checked against the document
  const calm = building([['roof', 20, rectangle(0, 0, 60, 40)]], { V: 60, exposure: 'B' });
  const found = levelForces(calm, calm.loadCases[0] as PlainCase);
  if (!found.ok) throw new Error('refused');
  expect(found.value[0]?.force).toBeCloseTo((16 * 60 * 10) / 1000, 12);
  expect(basisFindings(calm)).toMatchObject([{ code: 'least-wind-pressure', severity: 'note', member: 'roof' }]);
});

test('a parapet adds 2.5·q_p over its height to the roof under it', () => {
  // ASCE 7-16 27.3.4: GC_pn +1.5 and −1.0; from memory, not checked against the document
  const roof: Floor = ['roof', 20, rectangle(0, 0, 60, 40)];
  const plain = windOn(building([roof]), 'ASCE 7-16', { V: 115, exposure: 'B' }, Y);
  const crowned = windOn(building([roof]), 'ASCE 7-16', { V: 115, exposure: 'B', parapet: 4 }, Y);
  const top = 0.00256 * 2.01 * (24 / 1200) ** (2 / 7) * 0.85 * 115 * 115;
  const more = (crowned.levels[0]?.force ?? 0) - (plain.levels[0]?.force ?? 0);
  expect(more).toBeCloseTo((2.5 * top * 4 * 60) / 1000, 9);
});

test('the line load of a level adds up to its force, whatever the plan', () => {
  const set = building([
    ['L2', 10, rectangle(0, 0, 100, 40)],
    ['L3', 21, rectangle(10, 0, 90, 40), rectangle(95, 5, 110, 20)],
  ]);
  for (const { line, force } of windOn(set, 'ASCE 7-16', { V: 115, exposure: 'D' }, [Math.SQRT1_2, Math.SQRT1_2])
    .levels) {
    expect(line.reduce((sum, { from, to, w }) => sum + (w[0] ?? 0) * (to - from), 0)).toBeCloseTo(force, 9);
  }
});

/** Walls along y at both ends and in the middle of the 100 ft wide podium, along x at both edges. */
function withWalls(behaviour: NonNullable<Diaphragm['behaviour']>): Building {
  const plain = building([
    ['L2', 10, rectangle(0, 0, 100, 40)],
    ['roof', 24, rectangle(20, 0, 50, 40)],
  ]);
  const wall = (id: string, a: Point, b: Point, under: string[]): Building['wallLines'][number] => ({
    id,
    axis: [a, b],
    storeys: under.map((level) => ({ under: level, piers: [{ id: 'p', from: 2, to: 28 }] })),
  });
  const both = ['L2', 'roof'];
  return {
    ...plain,
    levels: plain.levels.map((level) => ({
      ...level,
      ...(level.diaphragms === undefined
        ? {}
        : { diaphragms: level.diaphragms.map((d) => ({ ...d, behaviour, assembly: 'a' })) }),
    })),
    assemblies: { diaphragms: [{ id: 'a', apparentShearStiffness: 50 }] },
    wallLines: [
      wall('1', [0, 0], [0, 40], ['L2']),
      wall('2', [20, 0], [20, 40], both),
      wall('3', [50, 0], [50, 40], both),
      wall('4', [100, 0], [100, 40], ['L2']),
      wall('A', [20, 0], [50, 0], both),
      wall('B', [20, 40], [50, 40], both),
    ],
  };
}

test('flexible floors: each span carries the façade that stands on it', () => {
  const file = withWalls('flexible');
  const read = readBuilding(file);
  if (!read.ok) throw new Error(JSON.stringify(read.faults));
  const result = analyse(read.value);
  if (!result.ok) throw new Error(JSON.stringify(result.faults));
  const podium = windOn(file, 'ASCE 7-16', { V: 115, exposure: 'B' }, Y).levels[0];
  const w = podium?.strips.map(({ load }) => load) ?? [];
  const reaction = (member: string) =>
    result.value.demands.find((d) => d.member === member && d.quantity === 'reaction' && d.sense === 1)?.value;
  // simple spans 0–20, 20–50 and 50–100 ft, each evenly loaded by its own façade
  expect(reaction('1/L2')).toBeCloseTo((w[0] ?? 0) * 10, 9);
  expect(reaction('2/L2')).toBeCloseTo((w[0] ?? 0) * 10 + (w[1] ?? 0) * 15, 9);
  expect(reaction('4/L2')).toBeCloseTo((w[2] ?? 0) * 25, 9);
});

test.each(['rigid', 'semi-rigid'] as const)(
  '%s floors: equilibrium closes under façade loads and their eccentricity',
  (behaviour) => {
    const file = withWalls(behaviour);
    const stiff: Building = {
      ...file,
      wallLines: file.wallLines.map((line) => ({
        ...line,
        shareBy: 'stiffness',
        storeys: line.storeys.map((storey) => ({
          ...storey,
          piers: storey.piers.map((pier) => ({ ...pier, stiffness: 200 })),
        })),
      })),
    };
    const result = analyse(stiff);
    if (!result.ok) throw new Error(JSON.stringify(result.faults));
    expect(result.value.certificate.worstResidual).toBeLessThan(1e-9);
    expect([...new Set(result.value.demands.map((row) => row.case))]).toEqual(['WY', 'WY/+e', 'WY/-e']);
  },
);

test.each([
  ['a spread', { spread: 'even' }, 'not-with-wind', 'loadCases[0].spread'],
  ['an accidental eccentricity', { accidental: { ratio: 0.05 } }, 'not-with-wind', 'loadCases[0].accidental'],
])('fault: %s of a wind case from a basis', (_, key, code, path) => {
  const file = withWalls('flexible');
  const read = readBuilding({ ...file, loadCases: [{ ...file.loadCases[0], ...key }] });
  expect(read.ok ? [] : read.faults).toContainEqual(expect.objectContaining({ code, path }));
});

test('fault: wind from a basis that states no wind', () => {
  const file = withWalls('flexible');
  const read = readBuilding({ ...file, basis: { standard: 'ASCE 7-16', seismic: { SDS: 1, SD1: 1, R: 5 } } });
  expect(read.ok ? [] : read.faults).toContainEqual(
    expect.objectContaining({ code: 'no-basis', path: 'loadCases[0].from' }),
  );
});
