import { describe, expect, test } from 'vitest';
import { analysed, value } from './cases.js';
import { check } from './verification.js';

describe('piers and hold-downs against what their assemblies may carry', () => {
  const building = analysed('wall-capacities');
  const ratio = (pier: string, caseId: string, combination: string) =>
    value(building, pier.replace('/', '/roof/'), 'ratio', caseId, 1, combination);
  const unitShear = (pier: string, caseId: string) =>
    value(building, pier.replace('/', '/roof/'), 'unit-shear', caseId);
  // 15/32 in. sheathing, 8d at 6 in.: allowable 260 lb/ft seismic, 365 wind (SDPWS-2015 Table 4.3A, half of 520 and 730)
  const source = 'SDPWS-2015 Table 4.3A with 4.2.3, 4.3.4.2, 4.3.3.4.1';

  test('by length, under 0.7 E and 0.6 W: species and the slender factor 2b/h', () => {
    // Unit shear 4.2/14 = 0.3 kip/ft on every pier; G = 0.42: factor 0.92; h/b = 3: 2/3
    check({
      case: '0.7 · 0.3 over 0.260 · 0.92, and over that times 2/3',
      source,
      seen: 'derived',
      expected: [0.21 / (0.26 * 0.92), 0.21 / ((0.26 * 0.92 * 2) / 3)],
      got: [ratio('2/a', 'EY', 'D+0.7E'), ratio('2/slender', 'EY', 'D+0.7E')],
      within: 1e-9,
    });
    check({
      case: '0.6 · 0.3 over 0.365 · 0.92 in wind',
      source,
      seen: 'derived',
      expected: 0.18 / (0.365 * 0.92),
      got: ratio('2/a', 'WY', 'D+0.6W'),
      within: 1e-9,
    });
  });

  test('by equal deflection a slender pier has the factor 1.25 − 0.125 h/b', () => {
    check({
      case: 'design unit shear at h/b = 3: 0.260 · 0.875 [kip/ft]',
      source,
      seen: 'derived',
      expected: 0.26 * 0.875,
      got: (0.7 * unitShear('1/slender', 'EY')) / ratio('1/slender', 'EY', 'D+0.7E'),
      within: 1e-9,
    });
  });

  test('a hold-down is held to the combination that pulls most', () => {
    // T = V·h/b = 0.3·9, no dead load: 0.7 · 2.7 kip over 3 kip
    check({
      case: '0.7 · 2.7 kip over 3 kip',
      source: 'statics of a cantilever wall',
      seen: 'derived',
      expected: (0.7 * 2.7) / 3,
      got: value(building, '2/roof/a', 'hold-down-ratio', 'EY', 1, 'D+0.7E'),
      within: 1e-9,
    });
  });

  test('what is over its capacity or too slender is a finding; what is too slender has no ratio', () => {
    const found = building.analysis.findings.map(({ code, member }) => `${code} ${member}`);
    expect(found).toContain('pier-over-capacity 2/roof/slender');
    expect(found).not.toContain('pier-over-capacity 2/roof/a');
    expect(found).toContain('pier-too-slender 2/roof/sliver');
    const ratios = building.analysis.demands.filter(({ quantity }) => quantity === 'ratio');
    expect(ratios.map(({ member }) => member)).not.toContain('2/roof/sliver');
  });
});
