import { describe, expect, test } from 'vitest';
import {
  exposureCoefficient,
  meanExposureCoefficient,
  velocityPressurePsf,
  type Exposure,
} from '@groundward/engine/loads/asce7/velocity-pressure';
import { leeward, wallPressure } from '@groundward/engine/loads/asce7/wind-pressure';
import { analysed, beside, value } from './cases.js';

describe('velocity pressure', () => {
  // ASCE 7-16 Table 26.10-1, printed to two digits, some of them cut off; values from memory, not checked against the document
  const heights = [15, 20, 30, 40, 50, 60, 100];
  test.each([
    ['B', [0.57, 0.62, 0.7, 0.76, 0.81, 0.85, 0.99]],
    ['C', [0.85, 0.9, 0.98, 1.04, 1.09, 1.13, 1.26]],
    ['D', [1.03, 1.08, 1.16, 1.22, 1.27, 1.31, 1.43]],
  ] as const)('K_z of exposure %s is the table’s', (exposure, printed) => {
    printed.forEach((value, i) =>
      expect(Math.abs(exposureCoefficient('ASCE 7-16', exposure, heights[i] as number) - value)).toBeLessThanOrEqual(
        0.01,
      ),
    );
  });

  test('below 15 ft it stays; at 33 ft in open country it is 1 in both editions', () => {
    // ASCE 7-16 and 7-22 26.10: the basic speed is measured at 33 ft in exposure C
    expect(exposureCoefficient('ASCE 7-16', 'B', 3)).toBe(exposureCoefficient('ASCE 7-16', 'B', 15));
    for (const edition of ['ASCE 7-16', 'ASCE 7-22'] as const)
      expect(exposureCoefficient(edition, 'C', 33)).toBeCloseTo(1, 2);
  });

  test.each([
    ['B', 0, 10],
    ['C', 4, 31],
    ['D', 40, 90],
  ] as const)('the mean over a height, exposure %s, %d to %d ft', (exposure: Exposure, low, high) => {
    const parts = 20000;
    let sum = 0;
    for (let i = 0; i < parts; i++)
      sum += exposureCoefficient('ASCE 7-22', exposure, low + ((i + 0.5) * (high - low)) / parts);
    expect(meanExposureCoefficient('ASCE 7-22', exposure, low, high)).toBeCloseTo(sum / parts, 8);
  });

  test('7-22 takes K_d out of q and into p: the wall’s pressure is the same', () => {
    // ASCE 7-16 Eqs. 26.10-1 and 27.3-1, ASCE 7-22 Eqs. 26.10-1 and 27.3-1; from memory, not checked against the documents
    const speed = { speedMph: 120, Kzt: 1.1, Kd: 0.85, Ke: 0.96 };
    const q16 = velocityPressurePsf('ASCE 7-16', speed, 0.9);
    const q22 = velocityPressurePsf('ASCE 7-22', speed, 0.9);
    expect(q16).toBeCloseTo(0.85 * q22, 12);
    const old = wallPressure('ASCE 7-16', { qz: q16, qh: q16, gust: 0.85, Kd: 0.85, ratio: 1 });
    const present = wallPressure('ASCE 7-22', { qz: q22, qh: q22, gust: 0.85, Kd: 0.85, ratio: 1 });
    expect(present.netPsf).toBeCloseTo(old.netPsf, 12);
  });
});

test('the leeward wall: −0.5, −0.3 at L/B 2, −0.2 from 4 on, linear between', () => {
  // ASCE 7-16 Fig. 27.3-1; from memory, not checked against the document
  expect([0.4, 1, 1.5, 2, 3, 4, 9].map(leeward)).toEqual([0.5, 0.5, 0.4, 0.3, 0.25, 0.2, 0.2]);
});

test('three storeys: storey forces from pressures at the floors', () => {
  // Derived by hand from ASCE 7-16 Eqs. 26.10-1 and 27.3-1 and Fig. 27.3-1: 115 mi/h, exposure B, 80 × 80 ft, floors at 12, 24, 36 ft;
  // p = 20.273, 21.890, 23.470 lb/ft² on 12, 12 and 6 ft
  const building = analysed('wind-three-storeys');
  const printed = { L2: 19.46, L3: 21.01, roof: 11.27 };
  for (const [level, force] of Object.entries(printed))
    expect(Math.abs(value(building, level, 'force', 'WX') - force)).toBeLessThanOrEqual(0.006);
  expect(Math.abs(value(building, 'L2', 'storey-shear', 'WX') - 51.74)).toBeLessThanOrEqual(0.01);
});

test('three storeys: the wind lies along the façade of each floor', () => {
  // Same case: a simple span of 80 ft between the outer walls under p·(half storeys); V = wL/2, M = wL²/8
  const building = analysed('wind-three-storeys');
  const w = 0.02189 * 12;
  const { after } = beside(building, 'L3/d', 'WY', 0);
  expect(after?.V).toBeCloseTo((w * 80) / 2, 3);
  expect(value(building, 'L3/d/W-E', 'moment', 'WY')).toBeCloseTo((w * 80 * 80) / 8, 1);
});

test('rigid floors are run with 75 % of the wind and an eccentricity of 15 % of the width', () => {
  // ASCE 7-16 Fig. 27.3-8, case 2; from memory, not checked against the document. Four equal walls at the edges of a square: the
  // moment 0.75·P·0.15·B goes to them as four equal forces on an arm of B/2.
  const building = analysed('wind-three-storeys-rigid');
  const whole = value(building, 'roof', 'force', 'WY');
  expect(value(building, 'roof', 'force', 'WY/+e')).toBeCloseTo(0.75 * whole, 9);
  const moment = 0.75 * whole * 0.15 * 80;
  expect(value(building, 'E/roof', 'shear', 'WY/+e')).toBeCloseTo((0.75 * whole) / 2 + moment / 4 / 40, 9);
  expect(value(building, 'W/roof', 'shear', 'WY/+e')).toBeCloseTo((0.75 * whole) / 2 - moment / 4 / 40, 9);
  expect(value(building, 'roof', 'torsion', 'WY/-e')).toBeCloseTo(moment, 9);
});
