import { describe, expect, test } from 'vitest';
import type { Building } from '@groundward/engine/building/definition';
import { combinationsFor, gravityCombinations } from '@groundward/engine/loads/combinations';

const outline: [number, number][] = [
  [0, 0],
  [20, 0],
  [20, 10],
  [0, 10],
];

function building(combinations: Building['combinations'], basis?: Building['basis']): Building {
  return {
    schema: 'groundward.building/1',
    name: 'Gatehouse',
    units: { length: 'm', force: 'kN' },
    levels: [
      { id: 'base', elevation: 0 },
      { id: 'roof', elevation: 3, diaphragms: [{ id: 'd', outline }] },
    ],
    wallLines: [],
    loadCases: [{ id: 'EX', kind: 'seismic', direction: 0, from: 'stated', forces: [{ level: 'roof', force: 1 }] }],
    ...(combinations === undefined ? {} : { combinations }),
    ...(basis === undefined ? {} : { basis }),
  };
}

const seismic = { SDS: 1, SD1: 0.6, R: 6.5, redundancy: 1.3 };

/** All combinations that the building's one case can enter, seismic or wind, and those of gravity. */
function all(of: Building) {
  const [loadCase] = of.loadCases;
  if (loadCase === undefined) throw new Error('no load case');
  return [
    ...gravityCombinations(of),
    ...combinationsFor(of, loadCase),
    ...combinationsFor(of, { ...loadCase, kind: 'wind' }),
  ];
}

/** `D L Lr S | lateral` of a combination. */
function factors(set: Building['combinations'], id: string, basis?: Building['basis']): (number | undefined)[] {
  const found = all(building(set, basis)).find((combination) => combination.id === id);
  return [found?.gravity.D, found?.gravity.L, found?.gravity.Lr, found?.gravity.S, found?.lateral];
}

describe('published sets', () => {
  // ASCE 7-16 and 7-22 2.3.1, 2.3.6, 2.4.1, 2.4.5; from memory, not checked against the documents
  test.each([
    ['ASCE 7-16 allowable', 'D', [1, 0, 0, 0, 0]],
    ['ASCE 7-16 allowable', 'D+S', [1, 0, 0, 1, 0]],
    ['ASCE 7-16 allowable', 'D+0.75L+0.75S', [1, 0.75, 0, 0.75, 0]],
    ['ASCE 7-16 allowable', 'D+0.45W+0.75L+0.75S', [1, 0.75, 0, 0.75, 0.45]],
    ['ASCE 7-16 allowable', '0.6D+0.6W', [0.6, 0, 0, 0, 0.6]],
    ['ASCE 7-16 allowable', 'D+0.7E', [1, 0, 0, 0, 0.7]],
    ['ASCE 7-16 allowable', 'D+0.525E+0.75L+0.75S', [1, 0.75, 0, 0.75, 0.525]],
    ['ASCE 7-16 allowable', '0.6D+0.7E', [0.6, 0, 0, 0, 0.7]],
    ['ASCE 7-22 allowable', 'D+0.7S', [1, 0, 0, 0.7, 0]],
    ['ASCE 7-22 allowable', 'D+0.45W+0.75L+0.525S', [1, 0.75, 0, 0.525, 0.45]],
    ['ASCE 7-22 allowable', 'D+0.525E+0.75L+0.1S', [1, 0.75, 0, 0.1, 0.525]],
    ['ASCE 7-16 strength', '1.4D', [1.4, 0, 0, 0, 0]],
    ['ASCE 7-16 strength', '1.2D+1.6S+0.5W', [1.2, 0, 0, 1.6, 0.5]],
    ['ASCE 7-16 strength', '1.2D+W+L+0.5S', [1.2, 1, 0, 0.5, 1]],
    ['ASCE 7-16 strength', '1.2D+E+L+0.2S', [1.2, 1, 0, 0.2, 1]],
    ['ASCE 7-16 strength', '0.9D+E', [0.9, 0, 0, 0, 1]],
    ['ASCE 7-22 strength', '1.2D+S+L', [1.2, 1, 0, 1, 0]],
    ['ASCE 7-22 strength', '1.2D+W+L+0.3S', [1.2, 1, 0, 0.3, 1]],
    ['ASCE 7-22 strength', '1.2D+E+L+0.15S', [1.2, 1, 0, 0.15, 1]],
    // EN 1990:2002 Eqs. 6.10 and 6.12b, Tables A1.1 and A1.2; from memory, not checked against the document
    ['EN 1990', '1.35D+1.5L+0.75S', [1.35, 1.5, 0, 0.75, 0]],
    ['EN 1990', '1.35D+1.5W+1.05L+0.75S', [1.35, 1.05, 0, 0.75, 1.5]],
    ['EN 1990', '0.9D+1.5W', [0.9, 0, 0, 0, 1.5]],
    ['EN 1990', 'D+E+0.3L', [1, 0.3, 0, 0, 1]],
  ] as const)('%s, %s', (set, id, expected) => {
    expect(factors(set, id)).toEqual(expected);
  });

  test('ids differ within a set', () => {
    for (const set of [
      'ASCE 7-16 allowable',
      'ASCE 7-22 allowable',
      'ASCE 7-16 strength',
      'ASCE 7-22 strength',
      'EN 1990',
    ] as const) {
      const ids = all(building(set)).map(({ id }) => id);
      expect(new Set(ids).size).toBe(ids.length);
    }
  });

  test('E holds ρ on the lateral effect and 0.2·S_DS on dead load, in the direction that is worse', () => {
    // ASCE 7-16 12.4.2.1 and 12.4.2.2; from memory, not checked against the document.
    // 0.6 − 0.7·0.2·S_DS on a hold-down and 1 + 0.7·0.2·S_DS on a post are as seen in a municipal calculation sheet.
    const basis = { standard: 'ASCE 7-22', seismic } as const;
    expect(factors('ASCE 7-22 allowable', '0.6D+0.7E', basis)[0]).toBeCloseTo(0.46, 12);
    expect(factors('ASCE 7-22 allowable', 'D+0.7E', basis)[0]).toBeCloseTo(1.14, 12);
    expect(factors('ASCE 7-22 allowable', 'D+0.7E', basis)[4]).toBeCloseTo(0.91, 12);
    expect(factors('ASCE 7-22 allowable', 'D+0.525E+0.75L+0.1S', basis)[0]).toBeCloseTo(1.105, 12);
    expect(factors('ASCE 7-22 strength', '0.9D+E', basis)[0]).toBeCloseTo(0.7, 12);
    expect(factors('ASCE 7-22 strength', '1.2D+E+L+0.15S', basis)[4]).toBeCloseTo(1.3, 12);
    expect(factors('ASCE 7-22 allowable', '0.6D+0.6W', basis)).toEqual([0.6, 0, 0, 0, 0.6]);
  });
});

test('a list of the file’s own is taken literally, whatever the basis', () => {
  const own = [
    { id: 'a', factors: { D: 0.6, E: 0.7 } },
    { id: 'b', factors: { D: 1, L: 0.5, W: 0.6 } },
    { id: 'c', factors: { D: 1.4 } },
  ];
  const found = all(building(own, { standard: 'ASCE 7-22', seismic }));
  expect([...found].sort((a, b) => (a.id < b.id ? -1 : 1))).toEqual([
    { id: 'a', applies: 'seismic', gravity: { D: 0.6, L: 0, Lr: 0, S: 0 }, lateral: 0.7 },
    { id: 'b', applies: 'wind', gravity: { D: 1, L: 0.5, Lr: 0, S: 0 }, lateral: 0.6 },
    { id: 'c', applies: 'gravity', gravity: { D: 1.4, L: 0, Lr: 0, S: 0 }, lateral: 0 },
  ]);
});

test('without combinations the components stay unfactored', () => {
  expect(all(building(undefined))).toEqual([]);
});

test('a case takes the set of its basis, with that basis’ own S_DS; gravity is combined by every set in use', () => {
  const [stated] = building(undefined).loadCases;
  if (stated === undefined) throw new Error('no load case');
  const en = { ...stated, id: 'EN', basis: 'en' };
  const mild = { ...stated, id: 'mild', basis: 'mild' };
  const file: Building = {
    ...building('ASCE 7-22 allowable', { standard: 'ASCE 7-22', seismic }),
    bases: [
      { id: 'en', standard: 'EN 1998-1', seismic: { agR: 0.2, groundType: 'B', q: 2 }, combinations: 'EN 1990' },
      { id: 'mild', standard: 'ASCE 7-22', seismic: { SDS: 0.5, SD1: 0.2, R: 6.5 } },
    ],
    loadCases: [stated, en, mild],
  };
  const dead = (loadCase: typeof stated, id: string) =>
    combinationsFor(file, loadCase).find((combination) => combination.id === id)?.gravity.D;
  expect(combinationsFor(file, en).map(({ id }) => id)).toEqual(['D+E+0.3L', 'D+E']);
  // 0.6 − 0.7·0.2·S_DS: ASCE 7-16 12.4.2.2
  expect(dead(stated, '0.6D+0.7E')).toBeCloseTo(0.46, 12);
  expect(dead(mild, '0.6D+0.7E')).toBeCloseTo(0.53, 12);
  const gravity = gravityCombinations(file).map(({ id }) => id);
  expect(gravity).toEqual(expect.arrayContaining(['D+0.7S', '1.35D+1.5L+0.75S']));
  expect(new Set(gravity).size).toBe(gravity.length);
});
