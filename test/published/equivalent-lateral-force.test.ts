import { expect, test } from 'vitest';
import { analysed, value } from './cases.js';
import {
  baseShear,
  diaphragmForces,
  upperLimit,
  verticalDistribution,
} from '@groundward/engine/loads/asce7/equivalent-lateral-force';

const plain = { SDS: 1, SD1: 0.6, R: 6.5 };

test('five storeys: the floor of 0.2·S_DS governs the lowest diaphragm', () => {
  // N. Taly, Design of Reinforced Masonry Structures, 2nd ed., Example 7.10, Table E7.10, p. 7.54 (values printed to 0.1 kip)
  const levels = [650, 600, 500, 450, 400].map((weight) => ({ weight }));
  const forces = [26.0, 48.0, 60.1, 72.1, 80.1];
  const printed = [78.0, 80.1, 78.6, 80.6, 80.1];
  const computed = diaphragmForces(levels, forces, { SDS: 0.6, importance: 1 });
  printed.forEach((value, i) => expect(Math.abs((computed[i] as number) - value)).toBeLessThanOrEqual(0.05));
});

test('five storeys: the vertical distribution with k = 1 over equal storeys gives the printed forces', () => {
  // Same table; storey heights are not printed, equal ones reproduce it: derived.
  const levels = [650, 600, 500, 450, 400].map((weight, i) => ({ level: String(i), weight, heightFt: 10 * (i + 1) }));
  const computed = verticalDistribution(levels, 286.3, 1);
  [26.0, 48.0, 60.1, 72.1, 80.1].forEach((value, i) =>
    expect(Math.abs((computed[i] as number) - value)).toBeLessThanOrEqual(0.06),
  );
});

test('one storey: period, limits and coefficient', () => {
  // Taly, Example 7.11, pp. 7.56-7.57 (ASCE 7-05): T_a = 0.19 s, C_s = 0.10, C_s,max = 0.326, F_px = 296 lb/ft on 2960 lb/ft
  const basis = { SDS: 0.5, SD1: 0.31, R: 5, TL: 4 };
  const found = baseShear(basis, 20);
  expect(found.period).toBeCloseTo(0.19, 2);
  expect(found.coefficient).toBeCloseTo(0.1, 9);
  expect(found.governs).toBe('12.8-2');
  expect(0.31 / (0.19 * 5)).toBeCloseTo(0.326, 3);
  expect(diaphragmForces([{ weight: 2960 }], [0.1 * 2960], basis)[0]).toBeCloseTo(296, 6);
});

test('one storey, from its file: 296 lb/ft on the roof, and what a simple beam makes of it', () => {
  // Taly, Example 7.11, pp. 7.56-7.57: F_px = 296 lb/ft on a roof of 120 × 80 ft with walls of 84 psf tributary over 10 ft.
  // Shear, chord and unit shear derived by the simple beam's equations.
  const roof = analysed('one-storey-from-basis');
  expect(value(roof, 'roof', 'diaphragm-force', 'EY')).toBeCloseTo(0.296 * 120, 9);
  expect(value(roof, 'roof/d/1-2', 'shear', 'EY')).toBeCloseTo(17.76, 9);
  expect(value(roof, 'roof/d/1-2', 'unit-shear', 'EY')).toBeCloseTo(0.222, 9);
  expect(value(roof, 'roof/d/1-2', 'moment', 'EY')).toBeCloseTo(532.8, 9);
  expect(value(roof, 'roof/d/1-2', 'chord-force', 'EY')).toBeCloseTo(6.66, 9);
});

test('twelve storeys: k between 1 and 2 by the period, and the table of forces', () => {
  // FEMA 451 (2006) Sec. 3.1, twelve-storey steel building, ELF table; values from memory, not checked against the document
  const weights = [3097.0, 3066.1, 3066.1, 4323.8, 2330.8, 2330.8, 2330.8, 3403.0, 1595.8, 1595.8, 1595.8, 1656.5];
  const printed = [6.3, 16.6, 31.5, 71.4, 56.2, 77.0, 100.8, 186.3, 107.6, 129.9, 154.0, 186.9];
  const levels = weights.map((weight, i) => ({ level: String(i), weight, heightFt: 18 + 12.5 * i }));
  const { k } = baseShear({ ...plain, period: 2.23, Ct: 1, x: 1 }, 155.5);
  expect(k).toBeCloseTo(1.865, 12);
  const computed = verticalDistribution(levels, 1124.5, k);
  printed.forEach((value, i) => expect(Math.abs((computed[i] as number) - value)).toBeLessThanOrEqual(0.06));
});

test('three storeys of wood: forces, and the floor at the lowest diaphragm', () => {
  // FEMA 451 Sec. 10.1 / FEMA P-751 Ch. 11, apartment building in Seattle; values from memory, not checked against the document
  const levels = [
    { level: '2', weight: 284.2, heightFt: 9 },
    { level: '3', weight: 284.2, heightFt: 18 },
    { level: 'R', weight: 182.8, heightFt: 27 },
  ];
  const basis = { SDS: 0.893, SD1: 0.6, R: 6 };
  const { coefficient, k } = baseShear(basis, 27);
  expect(coefficient).toBeCloseTo(0.149, 3);
  expect(k).toBe(1);
  const forces = verticalDistribution(levels, 111.9, k);
  [22.7, 45.4, 43.8].forEach((value, i) => expect(Math.abs((forces[i] as number) - value)).toBeLessThanOrEqual(0.06));
  // Diaphragm forces derived from ASCE 7-16 Eqs. 12.10-1 to 12.10-3
  const design = diaphragmForces(levels, forces, basis);
  [50.8, 54.3, 43.8].forEach((value, i) => expect(Math.abs((design[i] as number) - value)).toBeLessThanOrEqual(0.06));
});

test('the coefficient keeps to each of its limits', () => {
  // ASCE 7-16 Eqs. 12.8-2 to 12.8-6; from memory, not checked against the document
  const at = (change: object) => baseShear({ ...plain, Ct: 1, x: 1, ...change }, 100);
  expect(at({ period: 0.1 })).toMatchObject({ coefficient: 1 / 6.5, governs: '12.8-2' });
  expect(at({ period: 1.2 })).toMatchObject({ coefficient: 0.6 / (1.2 * 6.5), governs: '12.8-3' });
  expect(at({ period: 5, TL: 4, SDS: 0.1, SD1: 0.6 })).toMatchObject({
    coefficient: (0.6 * 4) / (25 * 6.5),
    governs: '12.8-4',
  });
  expect(at({ period: 7 })).toMatchObject({ coefficient: 0.044, governs: '12.8-5' });
  expect(at({ period: 7, S1: 0.6 })).toMatchObject({ coefficient: 0.3 / 6.5, governs: '12.8-6' });
  expect(at({ SDS: 0.1, SD1: 0.01, period: 1 }).coefficient).toBe(0.01);
  expect(at({ period: 0.1, importance: 1.5 }).coefficient).toBeCloseTo(1.5 / 6.5, 12);
});

test('C_u over the approximate period', () => {
  // ASCE 7-16 Table 12.8-1; from memory, not checked against the document
  expect([0.05, 0.1, 0.15, 0.2, 0.25, 0.3, 0.4].map(upperLimit)).toEqual([
    1.7,
    1.7,
    1.6,
    1.5,
    expect.closeTo(1.45, 12),
    1.4,
    1.4,
  ]);
  const long = baseShear({ ...plain, period: 9 }, 27);
  expect(long.period).toBeCloseTo(1.4 * 0.02 * 27 ** 0.75, 12);
});
