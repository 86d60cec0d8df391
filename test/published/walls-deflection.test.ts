import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { fourTermDiaphragmDeflection, threeTermDiaphragmDeflection } from '@groundward/engine/diaphragms/deflection';
import { fourTermWallDeflection, threeTermWallDeflection } from '@groundward/engine/walls/deflection';
import {
  pierStiffnessLbPerIn,
  sharesByDeflection,
  sharesByStiffness,
  type DeflectionLaw,
} from '@groundward/engine/walls/equal-deflection';
import { apparentShearStiffnessKipPerIn, nailForceLb, nailSlipIn } from '@groundward/engine/walls/nail-slip';
import { slenderness } from '@groundward/engine/walls/slender';

describe('deflection of a wall', () => {
  // SDPWS-2008/2015 Eq. 4.3-1, seen quoted; numbers derived from it, printed to four digits
  const wide = {
    unitShearPlf: 350,
    heightFt: 9,
    lengthFt: 8,
    endPostStiffnessLb: 1.6e6 * 10.5,
    apparentShearStiffnessKipPerIn: 22,
    anchorSlipIn: 0.1,
  };
  const narrow = {
    unitShearPlf: 500,
    heightFt: 8,
    lengthFt: 4,
    endPostStiffnessLb: 1.7e6 * 8.25,
    apparentShearStiffnessKipPerIn: 19,
    anchorSlipIn: 0.08,
  };

  test.each([
    [wide, [0.01519, 0.14318, 0.1125], 0.2709],
    [narrow, [0.03651, 0.21053, 0.16], 0.407],
  ] as const)('three terms', (wall, terms, total) => {
    const { bendingIn, shearIn, nailSlipIn: slip, rotationIn, totalIn } = threeTermWallDeflection(wall);
    [bendingIn, shearIn, rotationIn].forEach((term, i) =>
      expect(Math.abs(term - terms[i]!)).toBeLessThanOrEqual(0.000005 + 1e-9),
    );
    expect(slip).toBe(0);
    expect(Math.abs(totalIn - total)).toBeLessThanOrEqual(0.00005);
  });

  test('four terms equal three where the apparent stiffness is made: at 1.4 times the allowable shear', () => {
    // APA Technical Topic TT-053A, seen; SDPWS commentary C4.3.2, from memory: this is how G_a is defined
    const panel = { nail: '8d', grade: 'sheathing', edgeSpacingIn: 4, panelRigidityLbPerIn: 83_500 } as const;
    const unitShearPlf = 1.4 * 380;
    const shared = { ...wide, unitShearPlf };
    const four = fourTermWallDeflection({
      ...shared,
      panelRigidityLbPerIn: panel.panelRigidityLbPerIn,
      nailSlipIn: nailSlipIn(panel.nail, nailForceLb(unitShearPlf, panel.edgeSpacingIn), panel.grade),
    });
    const three = threeTermWallDeflection({
      ...shared,
      apparentShearStiffnessKipPerIn: apparentShearStiffnessKipPerIn(panel, 380),
    });
    expect(four.totalIn).toBeCloseTo(three.totalIn, 12);
    expect(four.nailSlipIn).toBeGreaterThan(0);
  });

  test('four terms of a wall, one by one', () => {
    // Derived from APA Technical Topic TT-053A (Feb 2007): 8vh³/(EAb) + vh/(Gt) + 0.75 h e_n + (h/b) d_a
    const found = fourTermWallDeflection({ ...wide, panelRigidityLbPerIn: 84_000, nailSlipIn: 0.02 });
    expect(found.bendingIn).toBeCloseTo(0.0151875, 9);
    expect(found.shearIn).toBeCloseTo(0.0375, 9);
    expect(found.nailSlipIn).toBeCloseTo(0.135, 9);
    expect(found.rotationIn).toBeCloseTo(0.1125, 9);
    expect(found.totalIn).toBeCloseTo(0.3001875, 9);
  });
});

describe('a line’s force among its piers by equal deflection', () => {
  // SDPWS-2015 4.3.3.4.1 with Eq. 4.3-1 as 1/k = 8h³/(EAb²) + h/(1000 G_a b) + h²/(k_a b²), seen; numbers derived
  const pier = (lengthFt: number) => ({
    heightFt: 8,
    lengthFt,
    endPostStiffnessLb: 1.6e6 * 10.5,
    apparentShearStiffnessKipPerIn: 13,
    anchorStiffnessLbPerIn: 40_000,
  });
  const stiffnesses = [pierStiffnessLbPerIn(pier(8)), pierStiffnessLbPerIn(pier(4))];

  test('stiffnesses and shears of a wide and a narrow pier', () => {
    expect(Math.abs(stiffnesses[0]! - 9457.8)).toBeLessThanOrEqual(0.05);
    expect(Math.abs(stiffnesses[1]! - 3716.3)).toBeLessThanOrEqual(0.05);
    const shears = sharesByStiffness(stiffnesses).map((share) => 3000 * share);
    expect(Math.abs(shears[0]! - 2153.7)).toBeLessThanOrEqual(0.05);
    expect(Math.abs(shears[1]! - 846.3)).toBeLessThanOrEqual(0.05);
    expect(Math.abs(shears[0]! / 8 - 269.2)).toBeLessThanOrEqual(0.05);
    expect(Math.abs(shears[1]! / 4 - 211.6)).toBeLessThanOrEqual(0.05);
  });

  test('the deflection equation gives both piers the same deflection under these shears', () => {
    const deflections = sharesByStiffness(stiffnesses).map((share, i) => {
      const { heightFt, lengthFt, endPostStiffnessLb, apparentShearStiffnessKipPerIn: stiffness } = pier([8, 4][i]!);
      const unitShearPlf = (3000 * share) / lengthFt;
      return threeTermWallDeflection({
        unitShearPlf,
        heightFt,
        lengthFt,
        endPostStiffnessLb,
        apparentShearStiffnessKipPerIn: stiffness,
        anchorSlipIn: (unitShearPlf * heightFt) / 40_000,
      }).totalIn;
    });
    expect(deflections[0]).toBeCloseTo(deflections[1]!, 12);
    expect(deflections[0]).toBeCloseTo(3000 / (stiffnesses[0]! + stiffnesses[1]!), 12);
  });

  test('proportional laws are shared by stiffness, in the sense of the force', () => {
    const laws = stiffnesses.map(
      (k): DeflectionLaw =>
        (shear) =>
          shear / k,
    );
    const [wide, narrow] = sharesByDeflection(-3000, laws);
    expect(wide).toBeCloseTo(-3000 * sharesByStiffness(stiffnesses)[0]!, 6);
    expect(narrow).toBeCloseTo(-3000 * sharesByStiffness(stiffnesses)[1]!, 6);
  });

  test('with nail slip, shears add up to the force and the piers move alike', () => {
    const length = fc.double({ min: 2.5, max: 30, noNaN: true });
    fc.assert(
      fc.property(
        fc.array(length, { minLength: 1, maxLength: 6 }),
        fc.double({ min: 10, max: 1e5, noNaN: true }),
        (lengths, force) => {
          const laws = lengths.map((lengthFt): DeflectionLaw => (shear) => {
            const unitShearPlf = shear / lengthFt;
            return fourTermWallDeflection({
              unitShearPlf,
              heightFt: 9,
              lengthFt,
              endPostStiffnessLb: 1.6e6 * 10.5,
              panelRigidityLbPerIn: 83_500,
              nailSlipIn: nailSlipIn('8d', nailForceLb(unitShearPlf, 6), 'sheathing'),
              anchorSlipIn: (unitShearPlf * 9) / 40_000,
            }).totalIn;
          });
          const shears = sharesByDeflection(force, laws);
          expect(shears.reduce((sum, shear) => sum + shear, 0) / force).toBeCloseTo(1, 12);
          const deflections = shears.map((shear, i) => laws[i]!(shear));
          expect(Math.max(...deflections) / Math.min(...deflections)).toBeCloseTo(1, 9);
        },
      ),
      { seed: 7, numRuns: 300 },
    );
  });

  test('what cannot be shared is refused', () => {
    expect(() => sharesByStiffness([])).toThrow(RangeError);
    expect(() => sharesByStiffness([1, 0])).toThrow(RangeError);
    expect(() => sharesByDeflection(1, [])).toThrow(RangeError);
    expect(() => sharesByDeflection(1, [() => 0])).toThrow(RangeError);
    expect(sharesByDeflection(0, [(shear) => shear])).toEqual([0]);
  });
});

describe('slender piers', () => {
  // SDPWS-2015 4.3.4.2 (1.25 − 0.125 h/b) and 4.3.3.4.1 exception 1 (2b/h): from memory, not checked against the document; values derived
  test.each([
    [2, 1, 1],
    [2.5, 0.9375, 0.8],
    [3, 0.875, 0.6667],
    [3.5, 0.8125, 0.5714],
  ])('h/b = %d', (ratio, equalDeflection, strength) => {
    for (const edition of ['2015', '2021'] as const) {
      const of = (sharing: 'equal-deflection' | 'strength') =>
        slenderness(ratio * 4, 4, 'panels-blocked', sharing, edition);
      expect(of('equal-deflection').factor).toBeCloseTo(equalDeflection, 12);
      expect(Math.abs(of('strength').factor - strength)).toBeLessThanOrEqual(0.00005);
      expect(of('strength').permitted).toBe(true);
    }
  });

  test('limits by sheathing', () => {
    // SDPWS-2015 Table 4.3.4: from memory, not checked against the document
    expect(slenderness(8, 2, 'panels-blocked', 'strength', '2015')).toMatchObject({
      permitted: false,
      factor: 0,
      limit: 3.5,
    });
    expect(slenderness(8, 3, 'panels-unblocked', 'equal-deflection', '2015')).toMatchObject({
      permitted: false,
      limit: 2,
    });
    expect(slenderness(8, 3, 'gypsum', 'equal-deflection', '2021')).toMatchObject({ permitted: false, limit: 2 });
    expect(slenderness(8, 4, 'plaster', 'equal-deflection', '2021')).toMatchObject({ permitted: true, factor: 1 });
    expect(() => slenderness(8, 0, 'gypsum', 'strength', '2015')).toThrow(RangeError);
  });
});

describe('deflection of a diaphragm', () => {
  // SDPWS-2015 Eq. 4.2-1 and commentary C4.2.2-1: from memory, not checked against the document (the form of the four terms seen as IBC-2021
  // Eq. 23-1); numbers derived
  const span = { unitShearPlf: 285, lengthFt: 120, widthFt: 80, chordStiffnessLb: 1.6e6 * 16.5 };

  test('three terms', () => {
    const found = threeTermDiaphragmDeflection({ ...span, apparentShearStiffnessKipPerIn: 15, chordSplices: [] });
    expect(Math.abs(found.bendingIn - 0.1457)).toBeLessThanOrEqual(0.00005);
    expect(Math.abs(found.shearIn - 0.57)).toBeLessThanOrEqual(0.00005);
    expect(Math.abs(found.totalIn - 0.7157)).toBeLessThanOrEqual(0.00005);
  });

  test('chord slip adds Σ(xΔ_c)/(2W)', () => {
    const chordSplices = [20, 40, 60, 40, 20].flatMap((distanceFt) => [
      { distanceFt, slipIn: 0.02 },
      { distanceFt, slipIn: 0.01 },
    ]);
    const found = threeTermDiaphragmDeflection({ ...span, apparentShearStiffnessKipPerIn: 15, chordSplices });
    expect(found.chordSlipIn).toBeCloseTo((180 * 0.03) / 160, 12);
    expect(found.totalIn).toBeCloseTo(found.bendingIn + found.shearIn + found.chordSlipIn, 12);
  });

  test('four terms', () => {
    const found = fourTermDiaphragmDeflection({
      ...span,
      panelRigidityLbPerIn: 85_500,
      nailSlipIn: 0.02,
      chordSplices: [],
    });
    expect(Math.abs(found.bendingIn - 0.1457)).toBeLessThanOrEqual(0.00005);
    expect(found.shearIn).toBeCloseTo(0.1, 12);
    expect(found.nailSlipIn).toBeCloseTo(0.4512, 12);
  });
});
