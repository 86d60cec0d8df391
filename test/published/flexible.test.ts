import { describe, expect, test } from 'vitest';
import { analysed, beside, value } from './cases.js';
import { check } from './verification.js';

describe('two levels onto one wall line, and a chord', () => {
  // The wall's own weight is not part of the file.
  const army = {
    source: 'U.S. Army Corps of Engineers, TI 809-04 (31 Dec 1998), church example, accumulation to a wall line, chord',
    seen: 'seen',
  } as const;
  const building = analysed('two-level-accumulation');

  test('a wall line carries what comes from the upper wall and its own roof', () => {
    const [upper, own] = [value(building, 'A/high', 'shear', 'EX'), value(building, 'A/low', 'reaction', 'EX')];
    check({ ...army, case: 'from the upper wall line [k]', expected: 19.8, got: upper, within: 5e-10 });
    check({ ...army, case: 'from its own low roof [k]', expected: 10.96, got: own, within: 5e-10 });
    const whole = value(building, 'A/low', 'shear', 'EX');
    check({ ...army, case: 'both, through horizontal bracing [k]', expected: 30.8, got: whole, within: 0.05 });
  });

  test('moment and chord force of a uniformly loaded diaphragm', () => {
    // 27.7 k over 90 ft: w = 308 plf, M = wL²/8 = 312 k-ft, T = M/9.67 = 32.3 k; tolerance 0.3 %
    const moment = value(building, 'low/d/1-2', 'moment', 'EY');
    check({ ...army, case: 'moment wL²/8 of 308 plf over 90 ft [k-ft]', expected: 312, got: moment, within: 0.936 });
    const chord = value(building, 'low/d/1-2', 'chord-force', 'EY');
    check({ ...army, case: 'chord force at a depth of 9.67 ft [k]', expected: 32.3, got: chord, within: 0.0969 });
  });
});

describe('two diaphragms on a common line, five depths', () => {
  // The printed depths are kept: 40, 80, 50, 60, 90 ft, and 90 ft for the second diaphragm.
  const five = { source: 'Malone and Rice, Ch. 8, Fig. 8.7', seen: 'seen' } as const;
  const building = analysed('two-diaphragms-five-depths');
  const at = (x: number) => beside(building, 'roof/1', 'EY', x);

  test.each([
    [30, 4, 0.1, 0.05],
    [60, -2, -0.04, -0.03333],
    [75, -5, -0.08333, -0.05556],
  ])('unit shears on both sides of the step at x = %d ft', (x, shear, left, right) => {
    check({ ...five, case: `shear at x = ${x} ft [k]`, expected: shear, got: at(x).before?.V, within: 5e-10 });
    const got = [at(x).before?.v, at(x).after?.v];
    const name = `unit shears left and right of x = ${x} ft [k/ft]`;
    check({ ...five, case: name, expected: [left, right], got, within: 5e-6 });
  });

  test('shear at the ends and at mid-span', () => {
    check({ ...five, case: 'unit shear at line 1 [k/ft]', expected: 0.25, got: at(0).after?.v, within: 5e-10 });
    check({ ...five, case: 'shear at mid-span [k]', expected: 0, got: at(50).before?.V, within: 5e-10 });
    const [left, right] = [at(100).before?.v, beside(building, 'roof/2', 'EY', 100).after?.v];
    check({ ...five, case: 'unit shear left of line 6 [k/ft]', expected: -0.11111, got: left, within: 5e-6 });
    check({ ...five, case: 'unit shear right of line 6 [k/ft]', expected: 0.1, got: right, within: 5e-10 });
  });

  test('reactions; the common line takes the sum of both', () => {
    const reaction = (line: string) => value(building, `${line}/roof`, 'reaction', 'EY');
    check({ ...five, case: 'R1 [k]', expected: 10, got: reaction('1'), within: 5e-10 });
    check({ ...five, case: 'R10 [k]', expected: 9, got: reaction('10'), within: 5e-10 });
    const common = { ...five, seen: 'derived', case: 'R6, the sum of both [k]' } as const;
    check({ ...common, expected: 19, got: reaction('6'), within: 5e-10 });
  });
});

describe('beam formulas', () => {
  // Statics alone (deflections belong to no beam here); l = 100.
  const aisc = {
    source: 'AISC Manual, Beam Diagrams and Formulas, LRFD 2nd ed., pp. 4-190 ff.',
    seen: 'seen',
  } as const;
  const moment = (name: string): number => value(analysed(name), 'roof/d/1-2', 'moment', 'EY');
  const reactions = (name: string): number[] =>
    ['1', '2'].map((line) => value(analysed(name), `${line}/roof`, 'reaction', 'EY'));
  const beam = (number: string, name: string, expected: readonly number[], largest: number): void => {
    check({ ...aisc, case: `${number}: R1, R2`, expected, got: reactions(name), within: 5e-10 });
    check({ ...aisc, case: `${number}: M_max`, expected: largest, got: moment(name), within: 5e-7 });
  };

  test('1: uniform load', () => {
    beam('1, uniform load', 'beam-uniform', [100, 100], (2 * 100 ** 2) / 8);
  });

  test('2: load rising to one end', () => {
    const name = '2, load rising to one end';
    const expected = [200 / 3, 400 / 3];
    check({ ...aisc, case: `${name}: R1, R2`, expected, got: reactions('beam-rising'), within: 5e-10 });
    const coefficient = moment('beam-rising') / (200 * 100);
    check({ ...aisc, case: `${name}: M_max/Wl`, expected: 0.1283, got: coefficient, within: 5e-5 });
    const row = analysed('beam-rising').analysis.demands.find((demand) => demand.quantity === 'moment');
    check({ ...aisc, case: `${name}: x of M_max`, expected: 57.74, got: row?.at?.[0], within: 5e-3 });
  });

  test('3: load rising to the centre', () => {
    beam('3, load rising to the centre', 'beam-rising-to-centre', [100, 100], (200 * 100) / 6);
  });

  test('4: partial uniform load', () => {
    const [w, a, b, c, l] = [2, 20, 30, 50, 100];
    const r1 = (w * b * (2 * c + b)) / (2 * l);
    const r2 = (w * b * (2 * a + b)) / (2 * l);
    beam('4, partial uniform load', 'beam-partial', [r1, r2], r1 * (a + r1 / (2 * w)));
  });

  test('5: partial uniform load at one end', () => {
    const [w, a, l] = [2, 40, 100];
    const r1 = (w * a * (2 * l - a)) / (2 * l);
    beam('5, partial uniform load at one end', 'beam-partial-end', [r1, (w * a * a) / (2 * l)], (r1 * r1) / (2 * w));
  });

  test('6: partial uniform loads at each end', () => {
    const [w1, a, w2, c, l] = [1, 30, 3, 20, 100];
    const r1 = (w1 * a * (2 * l - a) + w2 * c * c) / (2 * l);
    const [got] = reactions('beam-both-ends');
    check({ ...aisc, case: '6, partial uniform loads at each end: R1', expected: r1, got, within: 5e-10 });
  });

  test('8: point load', () => {
    const [P, a, b, l] = [50, 30, 70, 100];
    beam('8, point load', 'beam-point', [(P * b) / l, (P * a) / l], (P * a * b) / l);
  });

  test('overhang under a uniform load', () => {
    const source = 'AISC Manual, Table 3-23, beam overhanging one support, uniform load';
    const [w, l, a] = [2, 100, 20];
    const expected = [(w * (l * l - a * a)) / (2 * l), (w * (l + a) ** 2) / (2 * l)];
    const overhang = { source, seen: 'recalled', within: 5e-10 } as const;
    check({ ...overhang, case: 'R1, R2', expected, got: reactions('beam-overhang') });
    const got = value(analysed('beam-overhang'), 'roof/d/2-edge', 'moment', 'EY');
    check({ ...overhang, case: 'moment over the second support', expected: (w * a * a) / 2, got });
  });
});

describe('limits of plan irregularities', () => {
  // Both projections beyond a re-entrant corner > 15 %; open area > 50 %. The limits seen, the plans our own.
  const limits = { source: 'ASCE 7-05 Table 12.3-1 as reproduced in Taly, Table 7.6', seen: 'seen' } as const;
  const flagged = (name: string, code: string): boolean =>
    analysed(name).analysis.findings.some((finding) => finding.code === code);

  test.each([
    ['plan-limits-beyond', 'projections of 16 and 17 %', '52.5 % open', true],
    ['plan-limits-within', 'projections of 16 and 14 %', '49.4 % open', false],
  ])('%s', (name, projections, open, expected) => {
    const corner = flagged(name, 're-entrant-corner');
    check({ ...limits, case: `re-entrant corner: ${projections} (limit 15 %)`, expected, got: corner });
    const discontinuity = flagged(name, 'diaphragm-discontinuity');
    check({ ...limits, case: `diaphragm discontinuity: ${open} (limit 50 %)`, expected, got: discontinuity });
  });

  test('the projections themselves', () => {
    const finding = analysed('plan-limits-beyond').analysis.findings.find((each) => each.code === 're-entrant-corner');
    expect(finding?.numbers?.['first']).toBeCloseTo(0.16, 9);
    expect(finding?.numbers?.['second']).toBeCloseTo(0.17, 9);
  });
});

describe('a wall of three storeys with hold-downs', () => {
  // Wall 10 ft, storeys 9 ft, hold-down 9.5 ft from the compression edge, forces 4/4/2 k, dead 2 k a storey; no published answer.
  const wall = { source: 'Statics of a stacked wall with hold-downs, by hand', seen: 'derived' } as const;
  const building = analysed('stacked-wall');

  test.each([
    ['roof', 4, 36, 3.789, 3.158],
    ['3', 8, 108, 11.368, 10.105],
    ['2', 10, 198, 20.842, 18.947],
  ])(
    'under %s: storey shear, moment at its foot, tension without and with 0.6 D',
    (level, shear, moment, bare, net) => {
      const [line, pier] = [`1/${level}`, `1/${level}/a`];
      const under = { ...wall, within: 5e-10 };
      check({
        ...under,
        case: `under ${level}: shear [k]`,
        expected: shear,
        got: value(building, line, 'shear', 'EY'),
      });
      const overturning = value(building, line, 'overturning-moment', 'EY');
      check({ ...under, case: `under ${level}: moment at the foot [k-ft]`, expected: moment, got: overturning });
      const tension = [
        value(building, pier, 'end-tension', 'EY'),
        value(building, pier, 'end-tension', 'EY', 1, '0.6D+E'),
      ];
      const name = `under ${level}: tension without and with 0.6 D [k]`;
      check({ ...wall, case: name, expected: [bare, net], got: tension, within: 5e-4 });
    },
  );
});
