import { expect, test } from 'vitest';
import type { Building, LoadCase } from '@groundward/engine/building/definition';
import { readBuilding } from '@groundward/engine/building/read';
import { analyse } from '@groundward/engine/path/analyse';
import { basisOf } from '@groundward/engine/loads/basis-of';

const byBasis = (id: string, basis?: string): LoadCase => ({
  id,
  kind: 'seismic',
  direction: 90,
  from: 'basis',
  ...(basis === undefined ? {} : { basis }),
});

/** A shed of 10 × 8 m on four walls, weighing 160 kN at 3 m. */
function shed(change: Partial<Building>): Building {
  const corners: [number, number][] = [
    [0, 0],
    [10, 0],
    [10, 8],
    [0, 8],
  ];
  const line = (id: string, a: number, b: number, length: number): Building['wallLines'][number] => ({
    id,
    axis: [corners[a] as [number, number], corners[b] as [number, number]],
    storeys: [{ under: 'roof', piers: [{ id: 'a', from: 1, to: length - 1 }] }],
  });
  return {
    schema: 'groundward.building/1',
    name: 'Shed',
    units: { length: 'm', force: 'kN' },
    levels: [
      { id: 'base', elevation: 0 },
      { id: 'roof', elevation: 3, diaphragms: [{ id: 'd', outline: corners, weight: { area: 2 } }] },
    ],
    wallLines: [line('S', 0, 1, 10), line('E', 1, 2, 8), line('N', 3, 2, 10), line('W', 0, 3, 8)],
    loadCases: [byBasis('E')],
    ...change,
  };
}

const american = { standard: 'ASCE 7-22', seismic: { SDS: 0.65, SD1: 0.3, R: 6.5 } } as const;
const european = { standard: 'EN 1998-1', seismic: { agR: 0.1, groundType: 'A', q: 2.5 } } as const;

function force(building: Building, caseId: string): number | undefined {
  const read = readBuilding(building);
  if (!read.ok) throw new Error(JSON.stringify(read.faults));
  const result = analyse(read.value);
  if (!result.ok) throw new Error(JSON.stringify(result.faults));
  return result.value.demands.find((row) => row.quantity === 'force' && row.case === caseId)?.value;
}

test('two standards side by side: each case takes its forces from the basis that it names', () => {
  const building = shed({
    basis: american,
    bases: [{ id: 'en', ...european }],
    loadCases: [byBasis('US'), byBasis('EU', 'en')],
  });
  // C_s = 0.65/6.5 (ASCE 7-16 Eq. 12.8-2); S_d = 0.1·2.5/2.5 g with T₁ < 0.15 s below T_B (EN 1998-1 Eq. 3.13), λ = 1
  expect(force(building, 'US')).toBeCloseTo(16, 9);
  const period = 0.05 * 3 ** 0.75;
  expect(force(building, 'EU')).toBeCloseTo(160 * 0.1 * (2 / 3 + (period / 0.15) * (1 - 2 / 3)), 9);
});

test('the only basis of a list is every case’s', () => {
  expect(force(shed({ bases: [{ id: 'us', ...american }] }), 'E')).toBeCloseTo(16, 9);
});

test('the basis of a case: named, the file’s, or the only one', () => {
  const one = { id: 'one', ...american };
  const two = { id: 'two', ...european };
  const loadCases = [byBasis('E', 'two'), byBasis('W')];
  const of = (file: Pick<Building, 'basis' | 'bases'>, loadCase: LoadCase) => basisOf({ ...file, loadCases }, loadCase);
  expect(of({ basis: american, bases: [two] }, byBasis('E', 'two'))).toBe(two);
  expect(of({ basis: american, bases: [two] }, byBasis('E'))).toBe(american);
  expect(of({ bases: [one] }, byBasis('E'))).toBe(one);
  expect(of({ bases: [one, two] }, byBasis('E'))).toBeUndefined();
  expect(of({ basis: american, bases: [one] }, byBasis('E', 'three'))).toBeUndefined();
  const parts = [
    { case: 'E', factor: 1 },
    { case: 'W', factor: 0.3 },
  ];
  const both: LoadCase = { id: 'both', kind: 'seismic', from: 'combined', parts };
  expect(of({ basis: american, bases: [two] }, both)).toBe(two);
});

test.each([
  [
    'a basis that the file does not have',
    { basis: american, loadCases: [byBasis('E', 'en')] },
    'unknown-basis',
    'loadCases[0].basis',
  ],
  [
    'a case that names none of several',
    {
      bases: [
        { id: 'a', ...american },
        { id: 'b', ...european },
      ],
    },
    'basis-not-named',
    'loadCases[0].basis',
  ],
  ['a basis without a seismic block', { basis: { standard: 'ASCE 7-22' } }, 'no-basis', 'loadCases[0].from'],
  [
    'two bases of one id',
    {
      basis: american,
      bases: [
        { id: 'a', ...american },
        { id: 'a', ...european },
      ],
    },
    'duplicate-id',
    'bases[1].id',
  ],
  [
    'the keys of another standard',
    { basis: { standard: 'EN 1998-1', seismic: american.seismic } },
    'missing',
    'basis.seismic.agR',
  ],
  ['a standard that is not known', { basis: { ...american, standard: 'ASCE 7-98' } }, 'wrong-value', 'basis.standard'],
  [
    'combinations of one basis with two lateral loads',
    { bases: [{ id: 'a', ...american, combinations: [{ id: 'x', factors: { E: 1, W: 1 } }] }] },
    'two-lateral-loads',
    'bases[0].combinations[0].factors',
  ],
])('fault: %s', (_, change, code, path) => {
  const read = readBuilding({ ...shed({}), ...change });
  expect(read.ok ? [] : read.faults).toContainEqual(expect.objectContaining({ code, path }));
});
