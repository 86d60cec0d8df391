import { expect, test } from 'vitest';
import type { Building, LoadCase } from '@groundward/engine/building/definition';
import { levelForces } from '@groundward/engine/loads/level-forces';
import { weighedLevels } from '@groundward/engine/loads/seismic-weight';

const byBasis: LoadCase = { id: 'EX', kind: 'seismic', direction: 0, from: 'basis' };

/** Two storeys; the lower floor has a stair in a corridor, and façades along its long sides. */
function building(foot: number, kip: number, units: Building['units']): Building {
  const rectangle = (x: number, y: number, width: number, depth: number) =>
    [
      [x, y],
      [x + width, y],
      [x + width, y + depth],
      [x, y + depth],
    ].map(([a, b]): [number, number] => [(a as number) * foot, (b as number) * foot]);
  const area = kip / foot ** 2;
  return {
    schema: 'groundward.building/1',
    name: 'Mill',
    units,
    levels: [
      { id: 'base', elevation: 2 * foot },
      {
        id: 'L2',
        elevation: 12 * foot,
        diaphragms: [
          {
            id: 'floor',
            outline: rectangle(0, 0, 60, 40),
            openings: [{ id: 'stair', outline: rectangle(10, 16, 10, 8) }],
            weight: {
              area: 0.03 * area,
              zones: [{ id: 'corridor', outline: rectangle(0, 18, 70, 4), area: 0.05 * area }],
              lines: [
                {
                  id: 'south',
                  along: [
                    [0, 0],
                    [60 * foot, 0],
                  ],
                  perLength: (0.12 * kip) / foot,
                },
                {
                  id: 'north',
                  along: [
                    [0, 40 * foot],
                    [60 * foot, 40 * foot],
                  ],
                  perLength: (0.12 * kip) / foot,
                },
              ],
            },
          },
        ],
      },
      {
        id: 'roof',
        elevation: 22 * foot,
        diaphragms: [{ id: 'roof', outline: rectangle(0, 0, 60, 40), weight: { area: 0.02 * area } }],
      },
    ],
    wallLines: [],
    basis: { standard: 'ASCE 7-22', seismic: { SDS: 1, SD1: 0.6, R: 6.5 } },
    loadCases: [byBasis],
  };
}

const feet = building(1, 1, { length: 'ft', force: 'kip' });

test('a floor weighs its net area, zones in place of it within the outline, and its façades', () => {
  const corridor = 60 * 4 - 10 * 4; // the zone reaches beyond the outline and over the stair
  const rest = 60 * 40 - 10 * 8 - corridor;
  const floor = 0.05 * corridor + 0.03 * rest + 2 * 60 * 0.12;
  const [level, roof] = weighedLevels(feet);
  expect(level?.weight).toBeCloseTo(floor, 10);
  expect(roof?.weight).toBeCloseTo(60 * 40 * 0.02, 10);
  expect([level?.height, roof?.height]).toEqual([10, 20]);
});

test('the basis gives base shear, vertical distribution and diaphragm forces', () => {
  // ASCE 7-16 Eqs. 12.8-1, 12.8-2, 12.8-7, 12.8-12, 12.10-1 to 12.10-3, derived by hand: T_a = 0.02·20^0.75 = 0.189 s, k = 1,
  // C_s = 1/6.5; no other limit governs.
  const [floor, roof] = weighedLevels(feet).map(({ weight }) => weight) as [number, number];
  const shear = (floor + roof) / 6.5;
  const total = floor * 10 + roof * 20;
  const forces = [(shear * floor * 10) / total, (shear * roof * 20) / total] as const;
  const result = levelForces(feet, byBasis);
  if (!result.ok) throw new Error('refused');
  const [lower, upper] = result.value;
  expect([lower?.level, upper?.level]).toEqual(['L2', 'roof']);
  expect(lower?.force).toBeCloseTo(forces[0], 10);
  expect(lower?.diaphragmForce).toBeCloseTo(0.2 * floor, 10);
  expect(upper?.force).toBeCloseTo(forces[1], 10);
  expect(upper?.diaphragmForce).toBeCloseTo(forces[1], 10);
});

test('metres and kilonewtons give the same forces as feet and kips: 1 ft = 0.3048 m, 1 kip = 4.4482216152605 kN', () => {
  const kip = 4.4482216152605;
  const metric = levelForces(building(0.3048, kip, { length: 'm', force: 'kN' }), byBasis);
  const customary = levelForces(feet, byBasis);
  if (!metric.ok || !customary.ok) throw new Error('refused');
  metric.value.forEach((entry, i) => {
    expect(entry.force / kip).toBeCloseTo(customary.value[i]?.force ?? NaN, 9);
    expect(entry.diaphragmForce / kip).toBeCloseTo(customary.value[i]?.diaphragmForce ?? NaN, 9);
  });
});

test('the order of levels in the file changes nothing', () => {
  const turned = { ...feet, levels: [...feet.levels].reverse() };
  expect(levelForces(turned, byBasis)).toEqual(levelForces(feet, byBasis));
});

test('stated forces are taken as they stand; the diaphragm force is the level’s where none is stated', () => {
  const stated: LoadCase = {
    id: 'EY',
    kind: 'seismic',
    direction: 90,
    from: 'stated',
    forces: [
      { level: 'roof', force: 36 },
      { level: 'L2', force: 24, diaphragmForce: 30 },
    ],
  };
  expect(levelForces(feet, stated)).toEqual({
    ok: true,
    value: [
      { level: 'L2', force: 24, diaphragmForce: 30 },
      { level: 'roof', force: 36, diaphragmForce: 36 },
    ],
  });
});

test('a basis without weights, and a case without a basis, are refused with the reason', () => {
  const weightless = {
    ...feet,
    levels: feet.levels.map(({ diaphragms, ...level }) => ({
      ...level,
      ...(diaphragms === undefined ? {} : { diaphragms: diaphragms.map(({ id, outline }) => ({ id, outline })) }),
    })),
  };
  expect(levelForces(weightless, byBasis)).toMatchObject({ ok: false, faults: [{ code: 'no-weight' }] });
  const { basis: _, ...without } = feet;
  expect(levelForces(without, byBasis)).toMatchObject({ ok: false, faults: [{ code: 'no-basis' }] });
});
