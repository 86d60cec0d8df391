/**
 * R. T. Malone and R. W. Rice, The Analysis of Irregular Shaped Structures: Diaphragms and Shear Walls (2012), Ch. 4, Figs. 4.1-4.2;
 * printed in lb and plf, tolerance 0.1 plf.
 *
 * Read so: 50 ft deep, cut down to 40 ft between x = 15 and 35 ft; line B is the chord of the shallow part at the notch, 40 ft from the
 * edge A that runs through and 10 ft from the edge C that the notch interrupts; both transfer diaphragms are 15 ft long. The numbers alone
 * were at hand, not the figure: the place of B follows from them. With B 10 ft from A and 40 ft from C no printed net shear would close,
 * as the last test shows by statics; as read here every one of them does, and every one is reproduced.
 */
import { describe, expect, test } from 'vitest';
import type { StrutDiagram, TransferDiagram } from '@groundward/engine/path/result';
import { analysed, beside, value } from './cases.js';
import { check } from './verification.js';

const SOURCE = 'Malone and Rice, The Analysis of Irregular Shaped Structures (2012), Ch. 4, Figs. 4.1-4.2';

const building = analysed('notched-diaphragm');
const at = (x: number) => beside(building, 'roof/d', 'EY', x);

const transfer = (member: string): TransferDiagram => {
  const found = building.analysis.diagrams.find(
    (each): each is TransferDiagram => each.kind === 'transfer-diaphragm' && each.member === member,
  );
  if (found === undefined) throw new Error(`no transfer diaphragm ${member}`);
  return found;
};

const valueOf = (c: readonly number[], x: number): number => c.reduceRight((sum, each) => sum * x + each, 0);

/** Net unit shear of the panel between A and B or between B and C at a place of a transfer diaphragm [plf] */
function net(member: string, x: number, panel: 'A-B' | 'B-C'): number {
  const found = transfer(member).panels.find(
    ({ from, to, lower }) => from <= x && x <= to && (valueOf(lower, 0) === 0) === (panel === 'A-B'),
  );
  if (found === undefined) throw new Error(`no panel at ${x}`);
  return (1000 * valueOf(found.shear, x - found.from)) / valueOf(found.depth, x - found.from);
}

describe('basic shears and chords', () => {
  const seen = (what: string, expected: number, got: number | undefined): void =>
    check({ case: what, source: SOURCE, seen: 'seen', expected, got, within: 5e-10 });
  const bothSeen = (what: string, expected: readonly number[], got: readonly (number | undefined)[]): void =>
    check({ case: what, source: SOURCE, seen: 'seen', expected, got, within: 5e-10 });

  test('reaction and shear at the first line', () => {
    seen('R1 [k]', 15, value(building, '1/roof', 'reaction', 'EY'));
    seen('unit shear at line 1 [k/ft]', 0.3, at(0).after?.v);
    expect(value(building, 'roof/d/1-9', 'unit-shear', 'EY')).toBeCloseTo(0.3, 9);
  });

  test.each([
    [15, 12, 0.24, 0.3],
    [35, 8, 0.2, 0.16],
  ])('unit shears on both sides of the step at x = %d ft', (x, shear, left, right) => {
    seen(`shear at x = ${x} ft [k]`, shear, at(x).before?.V);
    bothSeen(`unit shears left and right of x = ${x} ft [k/ft]`, [left, right], [at(x).before?.v, at(x).after?.v]);
  });

  test('shear at the end of the second transfer diaphragm', () => {
    seen('shear at x = 50 ft [k]', 5, at(50).before?.V);
    seen('unit shear left of x = 50 ft [k/ft]', 0.1, at(50).before?.v);
  });

  test('chord forces of the shallow part at both ends of the notch', () => {
    bothSeen('moments at both ends of the notch [k-ft]', [202.5, 402.5], [at(15).after?.M, at(35).before?.M]);
    check({
      case: 'chord at line B at both ends of the notch, in tension [lb]',
      source: SOURCE,
      seen: 'seen',
      expected: [5062.5, 10062.5],
      got: ['roof/d/corner-6/strut', 'roof/d/corner-5/strut'].map(
        (member) => 1000 * value(building, member, 'axial-tension', 'EY'),
      ),
      within: 0.05,
    });
    expect(value(building, 'roof/d/corner-5/strut', 'axial-compression', 'EY', -1)).toBeCloseTo(10.0625, 9);
  });
});

describe('transfer diaphragms', () => {
  test.each([
    ['roof/d/corner-6', 1012.5, 67.5, 4050, 270],
    ['roof/d/corner-5', 2012.5, 134.2, 8050, 536.7],
  ])('%s: what edges A and C take, and as unit shears', (member, VA, vA, VC, vC) => {
    const [A, C] = transfer(member).edges;
    check({
      case: `transfer diaphragm ${member.slice(-1) === '6' ? '1-2' : '3-4'}: forces at edges A and C [lb]`,
      source: SOURCE,
      seen: 'seen',
      expected: [VA, VC],
      got: [Math.abs(1000 * (A?.axial ?? NaN)), Math.abs(1000 * (C?.axial ?? NaN))],
      within: 0.05,
    });
    expect(Math.abs((1000 * (A?.axial ?? 0)) / 15 / vA)).toBeCloseTo(1, 3);
    expect(Math.abs((1000 * (C?.axial ?? 0)) / 15 / vC)).toBeCloseTo(1, 3);
    expect(value(building, member, 'shear', 'EY')).toBeCloseTo(VC / 1000, 9);
  });

  test.each([
    ['roof/d/corner-6', 0, 'A-B', 367.5],
    ['roof/d/corner-6', 15, 'A-B', 307.5],
    ['roof/d/corner-6', 0, 'B-C', 30],
    ['roof/d/corner-6', 15, 'B-C', -30],
    ['roof/d/corner-5', 35, 'A-B', 25.8],
    ['roof/d/corner-5', 35, 'B-C', 696.7],
    ['roof/d/corner-5', 50, 'A-B', -34.2],
    ['roof/d/corner-5', 50, 'B-C', 636.7],
  ] as const)('%s, net unit shear at x = %d ft between %s: %d plf', (member, x, panel, plf) => {
    check({
      case: `net unit shear at x = ${x} ft between ${panel} [plf]`,
      source: SOURCE,
      seen: 'seen',
      expected: plf,
      got: net(member, x, panel),
      within: 0.1,
    });
  });

  test('net unit shears of the shallow part are its basic ones: 300 and 200 plf; beyond the second transfer 100 plf', () => {
    expect(1000 * (at(15).after?.v ?? 0)).toBeCloseTo(300, 6);
    expect(1000 * (at(35).before?.v ?? 0)).toBeCloseTo(200, 6);
    expect(1000 * (at(50).after?.v ?? 0)).toBeCloseTo(100, 6);
  });

  test('the largest net unit shear of the span', () => {
    expect(value(building, 'roof/d/1-9', 'net-unit-shear', 'EY')).toBeCloseTo(0.69666667, 6);
    expect(value(building, 'roof/d/corner-6', 'net-unit-shear', 'EY')).toBeCloseTo(0.3675, 9);
  });
});

describe('collectors: the average difference of the net shears on both sides times the length, closing to zero', () => {
  const strut = (member: string): StrutDiagram => {
    const found = building.analysis.diagrams.find(
      (each): each is StrutDiagram => each.kind === 'strut' && each.member === member,
    );
    if (found === undefined) throw new Error(`no strut ${member}`);
    return found;
  };

  test('the chord B on its way into the transfer diaphragms', () => {
    for (const [member, [x0, x1]] of [
      ['roof/d/corner-6', [0, 15]],
      ['roof/d/corner-5', [50, 35]],
    ] as const) {
      const average = (x: number): number => net(member, x, 'A-B') - net(member, x, 'B-C');
      const force = (((average(x0) + average(x1)) / 2) * (x1 - x0)) / 1000;
      const points = strut(`${member}/strut`).points;
      expect(points[0]?.axial).toBe(0);
      expect(points[points.length - 1]?.axial).toBeCloseTo(force, 9);
    }
  });

  test('line 1, where a wall runs along the whole depth: 67.5 plf more than the wall takes on 40 ft, 270 plf less on 10 ft', () => {
    expect(value(building, 'roof/1', 'axial-compression', 'EY')).toBeCloseTo(0.0675 * 40, 9);
    expect(value(building, 'roof/1', 'axial-compression', 'EY')).toBeCloseTo(0.27 * 10, 9);
  });

  test.each([
    ['roof/d/corner-6/drag', 0.3], // 30 plf on 10 ft; 307.5 − 300 plf on 40 ft
    ['roof/d/corner-5/drag', 6.96666667], // 696.7 plf on 10 ft; 200 − 25.8 plf on 40 ft
    ['roof/d/corner-5/end', 5.36666667], // 536.7 plf on 10 ft; 134.2 plf on 40 ft
  ])('%s', (member, force) => {
    const { points } = strut(member);
    expect(Math.max(...points.map(({ axial }) => Math.abs(axial)))).toBeCloseTo(force, 6);
    expect(points[0]?.axial).toBeCloseTo(0, 9);
    expect(points[points.length - 1]?.axial).toBeCloseTo(0, 9);
  });
});

describe('which way round the printed transfer shears close', () => {
  // Panel A-B carries 367.5 to 307.5 plf, panel B-C 30 to −30 plf, over 15 ft (printed).
  const [AB, BC, length, F] = [(367.5 + 307.5) / 2, (30 - 30) / 2, 15, 5062.5];

  test('edge A must reach the chord force of the shallow part at the step, edge C, which ends there, must reach nothing', () => {
    expect(AB * length).toBeCloseTo(F, 9); // N at A, from zero at line 1
    expect((AB - BC) * length).toBeCloseTo(F, 9); // N at B
    expect(BC * length).toBeCloseTo(0, 9); // N at C
  });

  test('with B 40 ft from A the printed shears add up to V, with B 10 ft from A they do not', () => {
    expect(367.5 * 40 + 30 * 10).toBeCloseTo(15000, 9);
    expect(367.5 * 10 + 30 * 40).toBeCloseTo(4875, 9); // against V = 15,000 lb: 10,125 lb short
    expect(67.5 * 40 - 270 * 10).toBeCloseTo(0, 9); // transfer shears alone
    expect(67.5 * 10 - 270 * 40).toBeCloseTo(-10125, 9);
  });
});
