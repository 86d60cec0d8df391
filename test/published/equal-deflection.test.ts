import { analyse } from '@groundward/engine/path/analyse';
import { describe, expect, test } from 'vitest';
import { analysed, value } from './cases.js';
import { check } from './verification.js';

describe('a line whose piers share its force by equal deflection', () => {
  const building = analysed('equal-deflection');
  // SDPWS-2015 4.3.3.4.1 with Eq. 4.3-1: b 8 and 4 ft, h 8 ft, E 1.6e6 psi, A 10.5 in², G_a 13 kip/in, hold-downs of 40,000 lb/in, 3 kip
  const derived = { source: 'SDPWS-2015 4.3.3.4.1 with Eq. 4.3-1', seen: 'derived' } as const;
  const pier = (id: string, quantity: 'shear' | 'unit-shear' | 'deflection') =>
    value(building, `1/roof/${id}`, quantity, 'EY');

  test('shears, unit shears and stiffnesses of a wide and a narrow pier', () => {
    check({
      ...derived,
      case: 'shears of an 8-ft and a 4-ft pier under 3 kip [kip]',
      expected: [2.1537, 0.8463],
      got: [pier('wide', 'shear'), pier('narrow', 'shear')],
      within: 0.00005,
    });
    check({
      ...derived,
      case: 'unit shears of the two [kip/ft]',
      expected: [0.2692, 0.2116],
      got: [pier('wide', 'unit-shear'), pier('narrow', 'unit-shear')],
      within: 0.00005,
    });
    check({
      ...derived,
      case: 'stiffnesses, shear over deflection [kip/in]',
      expected: [9.4578, 3.7163],
      got: ['wide', 'narrow'].map((id) => pier(id, 'shear') / (pier(id, 'deflection') * 12)),
      within: 0.00005,
    });
  });

  test('both piers move alike', () => {
    expect(pier('wide', 'deflection')).toBeCloseTo(pier('narrow', 'deflection'), 12);
  });

  test('a published wall by name deflects as the same values stated', () => {
    // 15/32 in. sheathing, 8d at 6 in., oriented strand board: G_a 13 kip/in in SDPWS-2015 Table 4.3A
    const shear = value(building, '2/roof/table', 'shear', 'EY');
    expect(value(building, '2/roof/table', 'deflection', 'EY') / shear).toBeCloseTo(
      pier('wide', 'deflection') / pier('wide', 'shear'),
      12,
    );
  });

  test('a pier without a deflection is refused, with its place in the file', () => {
    const { assemblies: _, ...without } = building.building;
    const stripped = {
      ...without,
      wallLines: without.wallLines.map((line) => ({
        ...line,
        storeys: line.storeys.map((storey) => ({
          ...storey,
          piers: storey.piers.map(({ id, from, to }) => ({ id, from, to })),
        })),
      })),
    };
    const result = analyse(stripped);
    expect(result.ok ? [] : result.faults.map(({ code, path }) => `${code} ${path}`)).toContain(
      'no-deflection wallLines[0].storeys[0].piers[1].assembly',
    );
  });
});
