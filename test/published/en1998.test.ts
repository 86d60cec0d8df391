import { describe, expect, test } from 'vitest';
import type { Building } from '@groundward/engine/building/definition';
import { basisFindings } from '@groundward/engine/loads/basis-findings';
import { baseShear } from '@groundward/engine/loads/en1998/lateral-force';
import { designSpectrum } from '@groundward/engine/loads/en1998/spectrum';
import { analyse } from '@groundward/engine/path/analyse';
import { analysed, value } from './cases.js';

/** The acceleration of gravity with which the masses of the example are weighed [m/s²]. */
const g = 9.81;

test('four storeys: period, design acceleration, base shear and storey forces', () => {
  // EN 1998-1:2004 Eqs. 3.14, 4.5, 4.6, 4.11: derived by hand from the equations, masses 300, 300, 300 and 250 t at 3, 6, 9, 12 m;
  // in the file they are G + ψ_E·Q with ψ_E = 0.3 (Eq. 3.17)
  const basis = { agR: 0.25, groundType: 'B', q: 3.9 } as const;
  const found = baseShear(basis, 12, 4);
  expect(found.period).toBeCloseTo(0.3224, 4);
  expect(found.spectrum.ratio * g).toBeCloseTo(1.8865, 4);
  expect(found.lambda).toBe(0.85);
  const building = analysed('lateral-force-method');
  expect(value(building, 'L1', 'storey-shear', 'EX')).toBeCloseTo(1844.1, 1);
  [197.6, 395.2, 592.7, 658.6].forEach((force, i) =>
    expect(Math.abs(value(building, `L${i + 1}`, 'force', 'EX') - force)).toBeLessThanOrEqual(0.05),
  );
  // 4.4.2.5(2): γd = 1.3 on the forces of diaphragms; from memory, not checked against the document
  expect(value(building, 'L4', 'diaphragm-force', 'EX')).toBeCloseTo(1.3 * value(building, 'L4', 'force', 'EX'), 9);
});

describe('design spectrum', () => {
  // EN 1998-1:2004 3.2.2.5(4) Eqs. 3.13 to 3.16 with Tables 3.2 and 3.3 (from memory, not checked against the document)
  const c1 = { agR: 0.2, groundType: 'C', q: 4, importance: 1.2 } as const;
  const ground = 1.2 * 0.2;
  test.each([
    [0, '3.13', (ground * 1.15 * 2) / 3],
    [0.3, '3.14', (ground * 1.15 * 2.5) / 4],
    [1.2, '3.15', (((ground * 1.15 * 2.5) / 4) * 0.6) / 1.2],
    [4, 'lower bound', 0.2 * ground],
  ])('type 1, ground type C, T = %d s: %s', (period, governs, ratio) => {
    const found = designSpectrum(c1, period);
    expect(found.governs).toBe(governs);
    expect(found.ratio).toBeCloseTo(ratio, 12);
  });
  test('type 2 falls with 1/T² beyond T_D = 1.2 s', () => {
    const d2 = { agR: 0.3, groundType: 'D', q: 1.5, spectrum: 'type 2', beta: 0 } as const;
    expect(designSpectrum(d2, 1.5)).toEqual({
      governs: '3.16',
      ratio: expect.closeTo((((0.3 * 1.8 * 2.5) / 1.5) * 0.3 * 1.2) / 1.5 ** 2, 12) as number,
    });
  });
});

test('λ is 0.85 only in a building of more than two storeys with T₁ ≤ 2·T_C', () => {
  // EN 1998-1:2004 4.3.3.2.2(1)
  const basis = { agR: 0.25, groundType: 'B', q: 3.9 } as const;
  expect(baseShear(basis, 6, 2).lambda).toBe(1);
  expect(baseShear({ ...basis, period: 1.01 }, 12, 4).lambda).toBe(1);
  expect(baseShear({ ...basis, period: 1 }, 12, 4).lambda).toBe(0.85);
  expect(baseShear({ ...basis, lambda: 1 }, 12, 4).coefficient).toBeCloseTo((0.25 * 1.2 * 2.5) / 3.9, 12);
});

test('100 % and 30 % together: each line gets both directions with its torsion, posts at corners get both', () => {
  // EN 1998-1:2004 4.3.3.5.1(3), E_Edx “+” 0.30 E_Edy; 4.3.2: eccentricities of ±5 % in every combination of signs
  const building = analysed('lateral-force-method');
  const south = value(building, 'S/L1', 'shear', 'EX/+e') - 0.3 * value(building, 'S/L1', 'shear', 'EY/-e');
  expect(value(building, 'S/L1', 'shear', 'EXY/+-/+e-e')).toBeCloseTo(south, 9);
  expect(value(building, 'W/L1', 'shear', 'EXY')).toBeCloseTo(0.3 * value(building, 'W/L1', 'shear', 'EY'), 9);
  const uplift = (caseId: string) => value(building, 'S/a/from', 'uplift', caseId, 1, 'D+E');
  const eccentric = ['+e+e', '+e-e', '-e+e', '-e-e'].map((signs) => uplift(`EXY/${signs}`));
  expect(Math.max(...eccentric)).toBeGreaterThan(uplift('EXY'));
  expect(Math.min(...eccentric)).toBeLessThan(uplift('EXY'));
});

test('live load moves with its part ψ_E, where it lies', () => {
  // EN 1998-1:2004 3.2.4(2), Eq. 3.17: half of a floor of 20 × 10 m carries 4 kN/m² of live load, all of it 2 kN/m² of its own;
  // with ψ_E = 0.5 the halves weigh 400 and 200 kN, and their centre lies at (400·5 + 200·15)/600 from the loaded end
  const outline: [number, number][] = [
    [0, 0],
    [20, 0],
    [20, 10],
    [0, 10],
  ];
  const wall = (id: string, a: [number, number], b: [number, number]): Building['wallLines'][number] => ({
    id,
    axis: [a, b],
    storeys: [{ under: 'roof', piers: [{ id: 'p', from: 1, to: 9 }] }],
  });
  const building: Building = {
    schema: 'groundward.building/1',
    name: 'Half loaded',
    units: { length: 'm', force: 'kN' },
    levels: [
      { id: 'base', elevation: 0 },
      {
        id: 'roof',
        elevation: 4,
        diaphragms: [
          {
            id: 'd',
            outline,
            behaviour: 'rigid',
            weight: {
              area: 2,
              zones: [
                {
                  id: 'store',
                  area: 2,
                  live: 4,
                  outline: [
                    [0, 0],
                    [10, 0],
                    [10, 10],
                    [0, 10],
                  ],
                },
              ],
            },
          },
        ],
      },
    ],
    wallLines: [
      wall('W', [0, 0], [0, 10]),
      wall('E', [20, 0], [20, 10]),
      wall('S', [0, 0], [20, 0]),
      wall('N', [0, 10], [20, 10]),
    ],
    basis: { standard: 'EN 1998-1', seismic: { agR: 0.2, groundType: 'A', q: 2, period: 0.3, psiE: 0.5 } },
    loadCases: [
      { id: 'EY', kind: 'seismic', direction: 90, from: 'basis' },
      {
        id: 'stated',
        kind: 'seismic',
        direction: 90,
        from: 'stated',
        basis: 'us',
        forces: [{ level: 'roof', force: 100 }],
      },
    ],
    bases: [{ id: 'us', standard: 'ASCE 7-22' }],
  };
  const result = analyse(building);
  if (!result.ok) throw new Error(JSON.stringify(result.faults));
  const c = { building, analysis: result.value };
  const force = 600 * 0.2 * (2.5 / 2);
  const centre = (400 * 5 + 200 * 15) / 600;
  expect(value(c, 'roof', 'force', 'EY')).toBeCloseTo(force, 9);
  expect(value(c, 'roof', 'centre-of-mass-x', 'EY')).toBeCloseTo(centre, 9);
  expect(value(c, 'W/roof', 'shear', 'EY') + value(c, 'E/roof', 'shear', 'EY')).toBeCloseTo(force, 9);
  expect(value(c, 'roof', 'torsion', 'EY')).toBeCloseTo(force * (10 - centre), 6);
  expect(value(c, 'roof', 'centre-of-mass-x', 'stated')).toBeCloseTo(10, 9);
  expect(value(c, 'roof', 'torsion', 'stated')).toBeCloseTo(0, 9);
});

test('a period beyond the smaller of 4·T_C and 2 s is found', () => {
  // EN 1998-1:2004 4.3.3.2.1(2); from memory, not checked against the document
  const { building } = analysed('lateral-force-method');
  const long = (period: number) =>
    basisFindings({
      ...building,
      basis: { standard: 'EN 1998-1', seismic: { agR: 0.25, groundType: 'A', q: 3.9, period } },
    }).filter(({ code }) => code === 'lateral-force-method-limit');
  expect(long(1.6)).toEqual([]);
  expect(long(1.7).map(({ member, numbers }) => [member, numbers?.['limit']])).toEqual([
    ['EX', 1.6],
    ['EY', 1.6],
  ]);
});
