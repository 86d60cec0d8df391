import { expect, test } from 'vitest';
import {
  openingFactor,
  openingFactorOfEqualOpenings,
  perforatedCapacity,
  perforatedDemand,
  perforatedNominalLimitPlf,
  segmentLength,
} from '@groundward/engine/walls/perforated';

// SDPWS Table 4.3.3.5: table from memory, not checked against the document; the formula (Eq. 4.3-5, 4.3-6) seen second-hand, and the two agree.
// Rows: percentage of full-height sheathing; columns: opening height over wall height.
const columns = [1 / 3, 1 / 2, 2 / 3, 5 / 6, 1];
const table: readonly (readonly [number, readonly number[]])[] = [
  [10, [1.0, 0.69, 0.53, 0.43, 0.36]],
  [20, [1.0, 0.71, 0.56, 0.45, 0.38]],
  [30, [1.0, 0.74, 0.59, 0.49, 0.42]],
  [40, [1.0, 0.77, 0.63, 0.53, 0.45]],
  [50, [1.0, 0.8, 0.67, 0.57, 0.5]],
  [60, [1.0, 0.83, 0.71, 0.63, 0.56]],
  [70, [1.0, 0.87, 0.77, 0.69, 0.63]],
  [80, [1.0, 0.91, 0.83, 0.77, 0.71]],
  [90, [1.0, 0.95, 0.91, 0.87, 0.83]],
  [100, [1.0, 1.0, 1.0, 1.0, 1.0]],
];

test.each(table)('opening factors of a wall with %d %% of full-height sheathing', (percent, printed) => {
  const [height, length] = [10, 100];
  printed.forEach((value, i) => {
    const part = columns[i]!;
    const openingArea = (length - percent) * part * height;
    const { factor } = openingFactor({ height, length, segments: [percent / 2, percent / 2], openingArea });
    // Printed to two digits, an exact half either way
    expect(Math.abs(factor - value)).toBeLessThanOrEqual(0.005 + 1e-9);
    expect(openingFactorOfEqualOpenings(percent / 100, part)).toBeCloseTo(factor, 12);
  });
});

// 80-ft wall with two 4-ft ends, h = 8 ft, A_o = 576 ft²: r = 0.100, C_o = 0.357, derived from the formula (a published discussion slips in r)
const long = { height: 8, length: 80, segments: [4, 4], openingArea: 576 };

test('a long wall open almost throughout', () => {
  const { areaRatio, factor } = openingFactor(long);
  expect(areaRatio).toBeCloseTo(0.1, 9);
  expect(Math.abs(factor - 0.357)).toBeLessThanOrEqual(0.0005);
});

test('capacity, unit shear and end forces of the whole wall', () => {
  // Seen: P. Line, Perforated Shear Wall Design, Eq. 1: V = v C_o ΣL_i; ends T = C = V h/(C_o ΣL_i). Values derived, C_o = 5/14.
  expect(perforatedCapacity(260, long)).toBeCloseTo((260 * 8 * 5) / 14, 9);
  const demand = perforatedDemand(-1000, long);
  expect(demand.unitShear).toBeCloseTo(350, 9);
  expect(demand.endForce).toBeCloseTo(2800, 9);
  // At capacity the segments stand at their own unit shear.
  expect(perforatedDemand(perforatedCapacity(260, long), long).unitShear).toBeCloseTo(260, 9);
});

test('a wall without openings is a plain wall', () => {
  const plain = { height: 8, length: 10, segments: [10], openingArea: 0 };
  expect(openingFactor(plain).factor).toBe(1);
  expect(perforatedDemand(2600, plain)).toEqual({ unitShear: 260, endForce: 2080 });
});

test('slender segments count for less', () => {
  // SDPWS-2015 4.3.4.3: from memory, not checked against the document
  expect(segmentLength(8, 4)).toBe(4);
  expect(segmentLength(9, 3)).toBeCloseTo(2, 12);
  expect(segmentLength(9, 2.5)).toBe(0);
});

test('the nominal unit shear that may be counted', () => {
  // SDPWS-2015 4.3.5.3: from memory, not checked against the document; 2021 derived
  expect(perforatedNominalLimitPlf('seismic', '2015')).toBe(1740);
  expect(perforatedNominalLimitPlf('wind', '2015')).toBe(2435);
  expect(perforatedNominalLimitPlf('seismic', '2021')).toBe(2435);
});

test('walls that cannot be are refused', () => {
  expect(() => openingFactor({ ...long, segments: [] })).toThrow(RangeError);
  expect(() => openingFactor({ ...long, segments: [50, 40] })).toThrow(RangeError);
  expect(() => openingFactor({ ...long, openingArea: -1 })).toThrow(RangeError);
  expect(() => openingFactorOfEqualOpenings(0, 0.5)).toThrow(RangeError);
});
