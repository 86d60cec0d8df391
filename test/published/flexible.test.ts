import { describe, expect, test } from 'vitest';
import { analysed, beside, value } from './cases.js';

describe('two levels onto one wall line, and a chord', () => {
  // U.S. Army Corps of Engineers, TI 809-04 (31 Dec 1998), church example; tolerance 0.3 %. The wall's own weight is not part of the file.
  const building = analysed('two-level-accumulation');

  test('a wall line carries what comes from the upper wall and its own roof', () => {
    // 19.8 k + 10.96 k = 30.8 k
    expect(value(building, 'A/high', 'shear', 'EX')).toBeCloseTo(19.8, 9);
    expect(value(building, 'A/low', 'reaction', 'EX')).toBeCloseTo(10.96, 9);
    expect(Math.abs(value(building, 'A/low', 'shear', 'EX') - 30.8)).toBeLessThanOrEqual(0.05);
  });

  test('moment and chord force of a uniformly loaded diaphragm', () => {
    // 27.7 k over 90 ft: w = 308 plf, M = wL²/8 = 312 k-ft, T = M/9.67 = 32.3 k
    expect(value(building, 'low/d/1-2', 'moment', 'EY') / 312).toBeCloseTo(1, 2);
    expect(Math.abs(value(building, 'low/d/1-2', 'chord-force', 'EY') / 32.3 - 1)).toBeLessThanOrEqual(0.003);
  });
});

describe('two diaphragms on a common line, five depths', () => {
  // Malone and Rice, Ch. 8, Fig. 8.7 (lb, plf). The printed depths are kept: 40, 80, 50, 60, 90 ft, and 90 ft for the second diaphragm.
  const building = analysed('two-diaphragms-five-depths');
  const at = (x: number) => beside(building, 'roof/1', 'EY', x);

  test.each([
    [30, 4, 0.1, 0.05],
    [60, -2, -0.04, -0.03333],
    [75, -5, -0.08333, -0.05556],
  ])('unit shears on both sides of the step at x = %d ft', (x, shear, left, right) => {
    expect(at(x).before?.V).toBeCloseTo(shear, 9);
    expect(at(x).before?.v).toBeCloseTo(left, 5);
    expect(at(x).after?.v).toBeCloseTo(right, 5);
  });

  test('shear at the ends and at mid-span', () => {
    expect(at(0).after?.v).toBeCloseTo(0.25, 9);
    expect(at(50).before?.V).toBeCloseTo(0, 9);
    expect(at(100).before?.v).toBeCloseTo(-0.11111, 5);
    expect(beside(building, 'roof/2', 'EY', 100).after?.v).toBeCloseTo(0.1, 9);
  });

  test('reactions; the common line takes the sum of both', () => {
    expect(value(building, '1/roof', 'reaction', 'EY')).toBeCloseTo(10, 9);
    expect(value(building, '10/roof', 'reaction', 'EY')).toBeCloseTo(9, 9);
    // Derived: 10,000 + 9,000 lb
    expect(value(building, '6/roof', 'reaction', 'EY')).toBeCloseTo(19, 9);
  });
});

describe('beam formulas', () => {
  // AISC Manual, Beam Diagrams and Formulas, LRFD 2nd ed., pp. 4-190 ff.; l = 100, statics alone (deflections belong to no beam here).
  const moment = (name: string): number => value(analysed(name), 'roof/d/1-2', 'moment', 'EY');
  const reaction = (name: string, line: '1' | '2'): number => value(analysed(name), `${line}/roof`, 'reaction', 'EY');

  test('1: uniform load', () => {
    expect(reaction('beam-uniform', '1')).toBeCloseTo(100, 9);
    expect(moment('beam-uniform')).toBeCloseTo((2 * 100 ** 2) / 8, 6);
  });

  test('2: load rising to one end', () => {
    expect(reaction('beam-rising', '1')).toBeCloseTo(200 / 3, 9);
    expect(reaction('beam-rising', '2')).toBeCloseTo(400 / 3, 9);
    expect(moment('beam-rising') / (200 * 100)).toBeCloseTo(0.1283, 4);
    const building = analysed('beam-rising');
    const row = building.analysis.demands.find((demand) => demand.quantity === 'moment');
    expect(row?.at?.[0]).toBeCloseTo(57.74, 2);
  });

  test('3: load rising to the centre', () => {
    expect(reaction('beam-rising-to-centre', '1')).toBeCloseTo(100, 9);
    expect(moment('beam-rising-to-centre')).toBeCloseTo((200 * 100) / 6, 6);
  });

  test('4: partial uniform load', () => {
    const [w, a, b, c, l] = [2, 20, 30, 50, 100];
    const r1 = (w * b * (2 * c + b)) / (2 * l);
    expect(reaction('beam-partial', '1')).toBeCloseTo(r1, 9);
    expect(reaction('beam-partial', '2')).toBeCloseTo((w * b * (2 * a + b)) / (2 * l), 9);
    expect(moment('beam-partial')).toBeCloseTo(r1 * (a + r1 / (2 * w)), 6);
  });

  test('5: partial uniform load at one end', () => {
    const [w, a, l] = [2, 40, 100];
    const r1 = (w * a * (2 * l - a)) / (2 * l);
    expect(reaction('beam-partial-end', '1')).toBeCloseTo(r1, 9);
    expect(reaction('beam-partial-end', '2')).toBeCloseTo((w * a * a) / (2 * l), 9);
    expect(moment('beam-partial-end')).toBeCloseTo((r1 * r1) / (2 * w), 6);
  });

  test('6: partial uniform loads at each end', () => {
    const [w1, a, w2, c, l] = [1, 30, 3, 20, 100];
    expect(reaction('beam-both-ends', '1')).toBeCloseTo((w1 * a * (2 * l - a) + w2 * c * c) / (2 * l), 9);
  });

  test('8: point load', () => {
    const [P, a, b, l] = [50, 30, 70, 100];
    expect(reaction('beam-point', '1')).toBeCloseTo((P * b) / l, 9);
    expect(reaction('beam-point', '2')).toBeCloseTo((P * a) / l, 9);
    expect(moment('beam-point')).toBeCloseTo((P * a * b) / l, 9);
  });

  test('overhang under a uniform load', () => {
    // AISC Table 3-23, overhanging beams; from memory, not checked against the document.
    const [w, l, a] = [2, 100, 20];
    expect(reaction('beam-overhang', '1')).toBeCloseTo((w * (l * l - a * a)) / (2 * l), 9);
    expect(reaction('beam-overhang', '2')).toBeCloseTo((w * (l + a) ** 2) / (2 * l), 9);
    expect(value(analysed('beam-overhang'), 'roof/d/2-edge', 'moment', 'EY')).toBeCloseTo((w * a * a) / 2, 9);
  });
});

describe('limits of plan irregularities', () => {
  // ASCE 7-05 Table 12.3-1 as reproduced in Taly, Table 7.6: both projections beyond a re-entrant corner > 15 %; open area > 50 %.
  const codes = (name: string): string[] => analysed(name).analysis.findings.map((finding) => finding.code);

  test('16 % and 17 % of the dimensions, 52.5 % open: both flagged', () => {
    expect(codes('plan-limits-beyond')).toEqual(
      expect.arrayContaining(['re-entrant-corner', 'diaphragm-discontinuity']),
    );
  });

  test('16 % and 14 % of the dimensions, 49.4 % open: neither', () => {
    expect(codes('plan-limits-within')).not.toContain('re-entrant-corner');
    expect(codes('plan-limits-within')).not.toContain('diaphragm-discontinuity');
  });

  test('the projections themselves', () => {
    const finding = analysed('plan-limits-beyond').analysis.findings.find((each) => each.code === 're-entrant-corner');
    expect(finding?.numbers?.['first']).toBeCloseTo(0.16, 9);
    expect(finding?.numbers?.['second']).toBeCloseTo(0.17, 9);
  });
});

describe('a wall of three storeys with hold-downs', () => {
  // Statics; no published answer. Wall 10 ft, storeys 9 ft, hold-down 9.5 ft from the compression edge, forces 4/4/2 k, dead 2 k a storey.
  const building = analysed('stacked-wall');

  test.each([
    ['roof', 4, 36, 3.789, 3.158],
    ['3', 8, 108, 11.368, 10.105],
    ['2', 10, 198, 20.842, 18.947],
  ])(
    'under %s: storey shear, moment at its foot, tension without and with 0.6 D',
    (level, shear, moment, bare, net) => {
      expect(value(building, `1/${level}`, 'shear', 'EY')).toBeCloseTo(shear, 9);
      expect(value(building, `1/${level}`, 'overturning-moment', 'EY')).toBeCloseTo(moment, 9);
      expect(value(building, `1/${level}/a`, 'end-tension', 'EY')).toBeCloseTo(bare, 3);
      expect(value(building, `1/${level}/a`, 'end-tension', 'EY', 1, '0.6D+E')).toBeCloseTo(net, 3);
    },
  );
});
