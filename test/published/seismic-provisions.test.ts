import { expect, test } from 'vitest';
import type { AsceSeismic } from '@groundward/engine/building/basis';
import type { Building } from '@groundward/engine/building/definition';
import { asceCombinations, overstrengthCombinations } from '@groundward/engine/loads/asce7/combinations';
import { overstrengthFactor } from '@groundward/engine/loads/asce7/overstrength';
import { analyse } from '@groundward/engine/path/analyse';
import type { Quantity } from '@groundward/engine/path/result';
import { analysed, value, type Case } from './cases.js';
import { check } from './verification.js';

const LEVELS = ['1', '2', '3', '4', '5'];

/** The same building on a changed basis. */
function withBasis({ building }: Case, change: Partial<AsceSeismic>): Case {
  const { basis } = building;
  if (basis?.standard !== 'ASCE 7-16' || basis.seismic === undefined) throw new Error('no basis of ASCE 7-16');
  return solved({ ...building, basis: { ...basis, seismic: { ...basis.seismic, ...change } } });
}

function solved(building: Building): Case {
  const result = analyse(building);
  if (!result.ok) throw new Error(JSON.stringify(result.faults));
  return { building, analysis: result.value };
}

function governs({ analysis }: Case, member: string, quantity: Quantity): string | undefined {
  return analysis.demands.find((row) => row.member === member && row.quantity === quantity)?.governs;
}

const five = analysed('five-storeys-diaphragm-forces');

test('five storeys from a file: the diaphragm design forces of the table', () => {
  check({
    case: 'Diaphragm design forces of five storeys from their file, lowest first [k]',
    source: 'N. Taly, Design of Reinforced Masonry Structures, 2nd ed., Table E7.10, p. 7.54',
    seen: 'seen',
    expected: [78.0, 80.1, 78.6, 80.6, 80.1],
    got: LEVELS.map((level) => value(five, level, 'diaphragm-force', 'EY')),
    within: 0.05,
  });
});

test('a collector takes the largest of Ω₀·F_x, Ω₀·F_px and the floor without Ω₀, but not more than the cap', () => {
  // ASCE 7-16 12.10.2.1 from memory, not checked against the document; the forces are those of Taly's Table E7.10.
  // One wall over 20 ft of a collector of 50 ft: half of the level's force comes in evenly, N at the pier's end = 0.6·F/2.
  const tension = (of: Case): number[] => LEVELS.map((level) => value(of, `${level}/1`, 'design-tension', 'EY'));
  const rules = (of: Case) => LEVELS.map((level) => governs(of, `${level}/1`, 'design-tension'));
  const source = 'ASCE 7-16 12.10.2.1 on the forces of Taly, Table E7.10';
  const force = (forces: number[]): number[] => forces.map((f) => 0.3 * f);
  check({
    case: 'Collector forces with Ω₀ = 1, lowest first: the floor holds at the bottom [k]',
    source,
    seen: 'derived',
    expected: force([78.0, 80.1, 78.6, 80.6, 80.1]),
    got: LEVELS.map((level) => value(five, `${level}/1`, 'design-compression', 'EY', -1)),
    within: 0.02,
  });
  expect(rules(five)[0]).toBe('0.2·S_DS·I_e·w_px (12.10.2.1 item 3)');
  expect(rules(five)[1]).toBe('Ω₀·F_px (12.10.2.1 item 2)');
  const raised = withBasis(five, { overstrength: 1.5 });
  check({
    case: 'Collector forces with Ω₀ = 1.5: Ω₀·F_px, and the cap at the top [k]',
    source,
    seen: 'derived',
    expected: force([1.5 * 71.6, 1.5 * 80.1, 1.5 * 78.6, 108, 96]),
    got: tension(raised),
    within: 0.03,
  });
  expect(rules(raised)[0]).toBe('Ω₀·F_px (12.10.2.1 item 2)');
  expect(rules(raised)[4]).toBe('0.4·S_DS·I_e·w_px (12.10.2.1 exception 1)');
});

test('light-frame walls and category B leave collectors without Ω₀; category A asks for nothing', () => {
  // ASCE 7-16 12.10.2.1, exception 2, from memory, not checked against the document
  for (const change of [{ lightFrame: true }, { designCategory: 'B' }] as const) {
    const plain = withBasis(five, { overstrength: 3, ...change });
    expect(value(plain, '5/1', 'axial-tension', 'EY')).toBeGreaterThan(20);
    expect(value(plain, '5/1', 'design-tension', 'EY')).toBe(value(plain, '5/1', 'axial-tension', 'EY'));
    expect(governs(plain, '5/1', 'design-tension')).toBe('F_px (12.10.1.1)');
  }
  const low = withBasis(five, { overstrength: 3, designCategory: 'A' });
  expect(governs(low, '5/1', 'design-tension')).toBeUndefined();
});

test('Ω₀ less 0.5 with flexible diaphragms, where it is 2.5 or more and the basis asks for it', () => {
  // ASCE 7-16 Table 12.2-1, footnote b; from memory, not checked against the document
  const asked = { overstrength: 3, reduceOverstrength: true };
  expect(overstrengthFactor(asked, true)).toBe(2.5);
  expect(overstrengthFactor(asked, false)).toBe(3);
  expect(overstrengthFactor({ overstrength: 2, reduceOverstrength: true }, true)).toBe(2);
  expect(overstrengthFactor({ overstrength: 3 }, true)).toBe(3);
});

/** Two storeys; line 2 stops under the roof, where its end posts stand on nothing or on the walls across. */
function stopping(change: Partial<AsceSeismic>, combinations: Building['combinations']): Building {
  const outline: [number, number][] = [
    [0, 0],
    [60, 0],
    [60, 30],
    [0, 30],
  ];
  const diaphragm = { id: 'd', outline, behaviour: 'flexible', weight: { area: 0.05 } } as const;
  const gravity = [{ case: 'D', perLength: 0.5 }] as const;
  const line = (id: string, x: number, under: readonly string[]): Building['wallLines'][number] => ({
    id,
    axis: [
      [x, 0],
      [x, 30],
    ],
    storeys: under.map((level) => ({ under: level, piers: [{ id: 'p', from: 5, to: 25, gravity: [...gravity] }] })),
  });
  return {
    schema: 'groundward.building/1',
    name: 'Wall that stops',
    units: { length: 'ft', force: 'kip' },
    levels: [
      { id: 'base', elevation: 0 },
      { id: '2', elevation: 10, diaphragms: [diaphragm] },
      { id: 'R', elevation: 20, diaphragms: [diaphragm] },
    ],
    wallLines: [line('1', 0, ['2', 'R']), line('2', 20, ['R']), line('3', 60, ['2', 'R'])],
    basis: {
      standard: 'ASCE 7-16',
      seismic: { SDS: 1, SD1: 0.6, R: 6, overstrength: 2.5, redundancy: 1.3, designCategory: 'D', ...change },
    },
    loadCases: [{ id: 'EY', kind: 'seismic', direction: 90, from: 'basis' }],
    ...(combinations === undefined ? {} : { combinations }),
  };
}

test('posts under a wall that stops take the combinations with Ω₀', () => {
  // ASCE 7-05 12.4.3.2 as in B. S. Taranath, Wind and Earthquake Resistant Buildings, Table 6.12:
  // (1.2 + 0.2·S_DS)·D + Ω₀·Q_E + L + 0.2·S and (0.9 − 0.2·S_DS)·D + Ω₀·Q_E
  const strength = overstrengthCombinations('ASCE 7-16 strength', { SDS: 1, SD1: 0.6, R: 6, redundancy: 1.3 }, 2.5);
  const read = (id: string) => {
    const found = strength.find((combination) => combination.id === id);
    return found === undefined ? [] : [found.gravity.D, found.lateral, found.gravity.L, found.gravity.S];
  };
  check({
    case: 'Factors on D, Q_E, L and S with overstrength, S_DS = 1 and Ω₀ = 2.5: compression',
    source: 'B. S. Taranath, Wind and Earthquake Resistant Buildings, Table 6.12 (ASCE 7-05)',
    seen: 'seen',
    expected: [1.4, 2.5, 1, 0.2],
    got: read('1.2D+Em+L+0.2S'),
    within: 1e-12,
  });
  check({
    case: 'Factors on D, Q_E, L and S with overstrength, S_DS = 1 and Ω₀ = 2.5: uplift',
    source: 'B. S. Taranath, Wind and Earthquake Resistant Buildings, Table 6.12 (ASCE 7-05)',
    seen: 'seen',
    expected: [0.7, 2.5, 0, 0],
    got: read('0.9D+Em'),
    within: 1e-12,
  });
  const of = solved(stopping({}, 'ASCE 7-16 allowable'));
  // The post at y = 5 of line 2 goes down from level 2 on nothing: D = 0.5·20/2 = 5 kip
  const post = '2/R/p/from';
  const quake = value(of, post, 'uplift', 'EY');
  expect(quake).toBeGreaterThan(1);
  expect(value(of, post, 'uplift', 'EY', 1, '0.6D+0.7Em')).toBeCloseTo(0.7 * 2.5 * quake - (0.6 - 0.14) * 5, 9);
  expect(value(of, post, 'bearing', 'EY', -1, 'D+0.7Em')).toBeCloseTo(0.7 * 2.5 * quake + (1 + 0.14) * 5, 9);
  // The wall that goes on to the foundation in its own plane takes none.
  expect(
    of.analysis.demands.some(({ member, combination }) => member === '1/p/from' && combination === 'D+0.7Em'),
  ).toBe(false);
});

test('a list of the file’s own has no combination with overstrength: a finding says so', () => {
  const codes = (combinations: Building['combinations']) =>
    solved(stopping({}, combinations)).analysis.findings.map(({ code }) => code);
  expect(codes([{ id: 'mine', factors: { D: 0.6, E: 0.7 } }])).toContain('no-overstrength-combination');
  expect(codes('ASCE 7-16 allowable')).not.toContain('no-overstrength-combination');
});

test('the shear of a wall that stops joins the diaphragm design forces with Ω₀, the level’s own force with neither ρ nor Ω₀', () => {
  // ASCE 7-16 12.10.1.1, 12.3.4.1, from memory, not checked against the document. Statics of a simple beam of 60 ft with a point load at 20 ft.
  const of = solved(stopping({}, undefined));
  const own = value(of, '2', 'diaphragm-force', 'EY');
  const wall = value(of, '2/R', 'shear', 'EY');
  expect(wall).toBeGreaterThan(0);
  const unit = own / 60;
  const atWall = (own / 2 + (2.5 * wall * 40) / 60) * 20 - (unit * 20 * 20) / 2;
  const right = (x: number): number => {
    const reaction = own / 2 + (2.5 * wall * 20) / 60;
    return reaction * x - (unit * x * x) / 2;
  };
  const peak = Math.min(40, (own / 2 + (2.5 * wall * 20) / 60) / unit);
  expect(value(of, '2/d/1-3', 'moment', 'EY')).toBeCloseTo(Math.max(atWall, right(peak)), 8);
  // The storey set keeps Q_E: what reaches the foundation is not raised.
  expect(value(of, '1/2', 'shear', 'EY') + value(of, '3/2', 'shear', 'EY')).toBeCloseTo(
    value(of, '2', 'storey-shear', 'EY'),
    9,
  );
});

test('a wall that stops raises connections, and collectors without Ω₀, by 25 % in category D but not in C', () => {
  // ASCE 7-16 12.3.3.4, from memory, not checked against the document
  const inD = solved(stopping({ lightFrame: true }, undefined));
  const rows = (of: Case) => of.analysis.demands.filter(({ quantity }) => quantity === 'connection-force');
  expect(inD.analysis.findings.find(({ code }) => code === 'connections-raised')?.sentence).toContain('horizontal 4');
  expect(value(inD, 'R/1', 'connection-force', 'EY')).toBeCloseTo(
    1.25 * (value(inD, 'R', 'diaphragm-force', 'EY') / 60) * 10,
    9,
  );
  expect(value(inD, 'R/2', 'axial-tension', 'EY')).toBeGreaterThan(1);
  expect(value(inD, 'R/2', 'design-tension', 'EY')).toBeCloseTo(1.25 * value(inD, 'R/2', 'axial-tension', 'EY'), 12);
  expect(governs(inD, 'R/2', 'design-tension')).toBe('1.25·F_px (12.10.1.1, 12.3.3.4)');
  const inC = solved(stopping({ designCategory: 'C' }, undefined));
  expect(rows(inC)).toEqual([]);
});

test('a basis without a category leaves these rules out and says so', () => {
  const { building } = five;
  const basis = building.basis;
  if (basis?.standard !== 'ASCE 7-16' || basis.seismic === undefined) throw new Error('no basis');
  const { designCategory, ...seismic } = basis.seismic;
  expect(designCategory).toBe('D');
  const of = solved({ ...building, basis: { ...basis, seismic } });
  expect(of.analysis.findings.map(({ code }) => code)).toContain('design-category-not-stated');
  expect(governs(of, '1/1', 'design-tension')).toBeUndefined();
});

test('ρ is 1 where Ω₀ is used', () => {
  // ASCE 7-16 12.3.4.1, from memory, not checked against the document
  const basis = { SDS: 1, SD1: 0.6, R: 6, redundancy: 1.3 };
  expect(asceCombinations('ASCE 7-16 strength', basis).find(({ id }) => id === '0.9D+E')?.lateral).toBe(1.3);
  expect(overstrengthCombinations('ASCE 7-16 strength', basis, 3).find(({ id }) => id === '0.9D+Em')?.lateral).toBe(3);
});
