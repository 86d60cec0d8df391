import { expect, test } from 'vitest';
import type { AsceSeismic } from '@groundward/engine/building/basis';
import type { Building, Point } from '@groundward/engine/building/definition';
import { approximatePeriod, baseShear } from '@groundward/engine/loads/asce7/equivalent-lateral-force';
import { analyse } from '@groundward/engine/path/analyse';
import type { Analysis, Finding } from '@groundward/engine/path/result';
import { analysed } from './cases.js';
import { check } from './verification.js';

const plain = { SDS: 1, SD1: 0.6, R: 6.5 };

function solved(building: Building): Analysis {
  const result = analyse(building);
  if (!result.ok) throw new Error(JSON.stringify(result.faults));
  return result.value;
}

function finding({ findings }: Analysis, code: string): Finding | undefined {
  return findings.find((each) => each.code === code);
}

test('the approximate period by system', () => {
  check({
    case: 'C_t and x: steel moment frames, concrete moment frames, eccentrically braced, all other',
    source: 'ASCE 7-16 Table 12.8-2',
    seen: 'recalled',
    expected: [0.028, 0.8, 0.016, 0.9, 0.03, 0.75, 0.02, 0.75],
    got: (
      [
        'steel moment frames',
        'concrete moment frames',
        'eccentrically or buckling-restrained braced',
        'all other',
      ] as const
    ).flatMap((periodSystem) => {
      const { Ct, x } = approximatePeriod({ periodSystem });
      return [Ct, x];
    }),
    within: 0,
  });
  check({
    case: 'Approximate period of 20 ft, all other systems [s]',
    source: 'N. Taly, Design of Reinforced Masonry Structures, 2nd ed., Example 7.11, p. 7.57',
    seen: 'seen',
    expected: 0.19,
    got: baseShear(plain, 20).period,
    within: 0.005,
  });
  expect(approximatePeriod({ periodSystem: 'steel moment frames', Ct: 0.05 })).toEqual({ Ct: 0.05, x: 0.8 });
});

test('the cap on S_DS of regular structures of up to five storeys', () => {
  // ASCE 7-16 12.8.1.3, from memory, not checked against the document
  const high = { ...plain, SDS: 1.3, SD1: 0.9, shortPeriodCap: true };
  const at = (change: object, heightFt = 40, storeys = 4): number =>
    baseShear({ ...high, ...change }, heightFt, storeys).coefficient;
  expect(at({})).toBeCloseTo(1 / 6.5, 12);
  expect(at({ SDS: 1.8 })).toBeCloseTo((0.7 * 1.8) / 6.5, 12);
  expect(at({ SDS: 0.9 })).toBeCloseTo(0.9 / 6.5, 12);
  expect(at({}, 40, 6)).toBeCloseTo(1.3 / 6.5, 12);
  expect(at({ redundancy: 1.3 })).toBeCloseTo(1.3 / 6.5, 12);
  expect(at({ redundancyRule: 'determined' })).toBeCloseTo(1.3 / 6.5, 12);
  expect(at({ shortPeriodCap: false })).toBeCloseTo(1.3 / 6.5, 12);
  // A period above 0.5 s: 0.02·75^0.75 = 0.51 s
  expect(baseShear(high, 75, 5).spectral).toBe(1.3);
});

/** A published plan of four walls with a roof that weighs, on a basis that applies accidental torsion where it is required. */
function fromBasis(name: string, seismic: Partial<AsceSeismic>): Building {
  const { building } = analysed(name);
  return {
    ...building,
    levels: building.levels.map((level) => ({
      ...level,
      ...(level.diaphragms === undefined
        ? {}
        : { diaphragms: level.diaphragms.map((diaphragm) => ({ ...diaphragm, weight: { area: 0.05 } })) }),
    })),
    basis: { standard: 'ASCE 7-16', seismic: { ...plain, accidentalTorsion: 'required', ...seismic } },
    loadCases: [{ id: 'EY', kind: 'seismic', direction: 90, from: 'basis' }],
  };
}

test('accidental torsion enters the forces only where a torsional irregularity asks for it', () => {
  // ASCE 7-16 12.8.4.2 and 12.8.4.3, from memory, not checked against the document
  const cases = (of: Analysis) => [...new Set(of.demands.map((row) => row.case))].filter((id) => id.startsWith('EY'));
  const regular = solved(fromBasis('four-walls-regular', { designCategory: 'D' }));
  check({
    case: 'Largest over average edge drift of four walls without irregularity, eccentricity 5 %',
    source: 'N. Taly, Design of Reinforced Masonry Structures, 2nd ed., Example 7.12, p. 7.73',
    seen: 'seen',
    expected: 1.145,
    got: finding(regular, 'accidental-torsion-not-needed')?.numbers?.['ratio'],
    within: 0.005,
  });
  expect(cases(regular)).toEqual(['EY']);
  const irregular = solved(fromBasis('four-walls-irregular', { designCategory: 'D' }));
  check({
    case: 'The same of four walls with torsional irregularity type 1a, with the amplification that follows',
    source: 'Taly, Example 7.13, p. 7.74 (classification); ratio and A_x from ASCE 7-16 Eq. 12.8-14',
    seen: 'derived',
    expected: [1.218, 1.0304],
    got: (['torsional-ratio', 'torsional-amplification'] as const).map((quantity) =>
      Math.max(
        ...irregular.demands.flatMap((row) => (row.quantity === quantity && row.case !== 'EY' ? [row.value] : [])),
      ),
    ),
    within: 0.0005,
  });
  expect(cases(irregular)).toEqual(['EY', 'EY/+e', 'EY/-e']);
  // In category B type 1a asks for nothing.
  expect(cases(solved(fromBasis('four-walls-irregular', { designCategory: 'B' })))).toEqual(['EY']);
  expect(
    finding(solved(fromBasis('four-walls-regular', { accidentalTorsion: 'stated' })), 'no-accidental-torsion'),
  ).toBeDefined();
});

/** One storey of 10 ft on a plan of 60 by 40 ft, with walls along every edge: from and to on each, x edges then y edges. */
function oneStorey(
  behaviour: 'flexible' | 'rigid',
  walls: { readonly along: readonly [number, number][]; readonly across: readonly [number, number][] },
  seismic: Partial<AsceSeismic> = {},
): Building {
  const outline: Point[] = [
    [0, 0],
    [60, 0],
    [60, 40],
    [0, 40],
  ];
  const line = (id: string, axis: [Point, Point], piers: readonly [number, number][]) => ({
    id,
    axis,
    storeys: [{ under: 'R', piers: piers.map(([from, to], i) => ({ id: `p${i}`, from, to })) }],
  });
  return {
    schema: 'groundward.building/1',
    name: 'One storey',
    units: { length: 'ft', force: 'kip' },
    levels: [
      { id: 'base', elevation: 0 },
      { id: 'R', elevation: 10, diaphragms: [{ id: 'd', outline, behaviour, weight: { area: 0.05 } }] },
    ],
    wallLines: [
      line('A', [outline[0] as Point, outline[1] as Point], walls.along),
      line('B', [outline[3] as Point, outline[2] as Point], walls.along),
      line('1', [outline[0] as Point, outline[3] as Point], walls.across),
      line('2', [outline[1] as Point, outline[2] as Point], walls.across),
    ],
    basis: {
      standard: 'ASCE 7-16',
      seismic: { ...plain, designCategory: 'D', redundancyRule: 'determined', ...seismic },
    },
    combinations: 'ASCE 7-16 strength',
    loadCases: [{ id: 'EY', kind: 'seismic', direction: 90, from: 'basis' }],
  };
}

const square: [number, number][] = [[0, 40]];

test('ρ from what the loss of one wall does to the storey', () => {
  // ASCE 7-16 12.3.4.2 and Table 12.3-3, from memory, not checked against the document; losses by hand
  const numbers = (building: Building) => finding(solved(building), 'redundancy')?.numbers;
  // One slender wall of 8 ft on each side: half of the strength goes, and 0.8 bays are fewer than 2.
  const two = { along: square, across: [[0, 8]] as [number, number][] };
  expect(numbers(oneStorey('flexible', two))).toMatchObject({ redundancy: 1.3, loss: 0.5 });
  expect(numbers(oneStorey('flexible', two))?.['bays']).toBeCloseTo(0.8, 12);
  // Two slender walls on each side: a quarter goes.
  const four = {
    along: square,
    across: [
      [0, 8],
      [30, 38],
    ] as [number, number][],
  };
  expect(numbers(oneStorey('flexible', four))).toEqual({ redundancy: 1, loss: 0.25 });
  // One long wall on each side: no pier taller than long.
  const long = { along: square, across: [[0, 12]] as [number, number][] };
  expect(numbers(oneStorey('flexible', long))).toEqual({ redundancy: 1 });
  // A wall of 9 ft and one of 6 ft on each side: 9 of 30 go.
  const mixed = {
    along: square,
    across: [
      [0, 9],
      [20, 26],
    ] as [number, number][],
  };
  expect(numbers(oneStorey('flexible', mixed))?.['loss']).toBeCloseTo(0.3, 12);
  // Categories B and C: ρ = 1 whatever the walls.
  expect(numbers(oneStorey('flexible', two, { designCategory: 'C' }))).toEqual({ redundancy: 1 });
});

test('ρ = 1.3 where the storey without one wall is extremely irregular in torsion', () => {
  // Three walls of 9 ft on the left, three of 9 ft on the right: the loss of one is a sixth, far below 33 %.
  const three: [number, number][] = [
    [0, 9],
    [15, 24],
    [31, 40],
  ];
  const stiff = oneStorey('rigid', { along: square, across: three });
  expect(finding(solved(stiff), 'redundancy')?.numbers?.['redundancy']).toBe(1);
  // With next to no walls along x to hold the turning, and one light wall on the right, it turns far.
  const weak = oneStorey('rigid', { along: [[0, 4]], across: three });
  const lines = weak.wallLines.map((line) =>
    line.id === '2'
      ? {
          ...line,
          storeys: [
            {
              under: 'R',
              piers: [
                { id: 'p0', from: 0, to: 9 },
                { id: 'p1', from: 20, to: 29 },
              ],
            },
          ],
        }
      : line,
  );
  const found = finding(solved({ ...weak, wallLines: lines }), 'redundancy')?.numbers;
  expect(found?.['loss']).toBeLessThan(0.33);
  expect(found?.['torsion']).toBeGreaterThan(1.4);
  expect(found?.['redundancy']).toBe(1.3);
});

test('ρ = 1 for a regular plan with two bays of wall on every side', () => {
  // ASCE 7-16 12.3.4.2(b), from memory, not checked against the document: with light framing 8 + 3 ft over 10 ft count 2.2 bays.
  const walls = {
    along: square,
    across: [
      [0, 9.5],
      [30, 31],
    ] as [number, number][],
  };
  const heavy = finding(solved(oneStorey('flexible', walls)), 'redundancy')?.numbers;
  const light = finding(solved(oneStorey('flexible', walls, { lightFrame: true })), 'redundancy')?.numbers;
  expect(heavy?.['redundancy']).toBe(1.3);
  expect(heavy?.['bays']).toBeCloseTo(1.05, 12);
  expect(light?.['redundancy']).toBe(1);
  expect(light?.['bays']).toBeCloseTo(2.1, 12);
});

test('ρ as determined stands in the combinations', () => {
  const rows = solved(oneStorey('flexible', { along: square, across: [[0, 8]] })).demands;
  const shear = (combination?: string) =>
    rows.find(
      (row) =>
        row.member === '1/p0' && row.quantity === 'shear' && row.case === 'EY' && row.combination === combination,
    )?.value;
  expect(shear('0.9D+E')).toBeCloseTo(1.3 * (shear() ?? NaN), 12);
});
