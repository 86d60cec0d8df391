import { expect, test } from 'vitest';
import { analysed, value } from './cases.js';
import { check } from './verification.js';

// A semi-rigid floor that is stiff in shear bends between its chords alone: on stiff walls it is a continuous beam. Spans of 50 ft, 4 ft deep,
// wl = 100 k. The three-moment equation gives the same coefficients; the reference is for slender beams, which the floor is to within 0.2 %.
const source = 'AISC Manual, Table 3-23, continuous beams of equal spans (case numbers not checked)';

test.each([
  ['two spans, both loaded', 'continuous-two-spans', [0.375, 1.25, 0.375]],
  ['two spans, one loaded', 'continuous-one-span-loaded', [0.4375, 0.625, -0.0625]],
  ['three spans, all loaded', 'continuous-three-spans', [0.4, 1.1, 1.1, 0.4]],
  ['four spans, all loaded', 'continuous-four-spans', [0.3929, 1.1429, 0.9286, 1.1429, 0.3929]],
])('reactions of a semi-rigid floor over %s', (spans, name, expected) => {
  const building = analysed(name);
  const got = expected.map((_, i) => value(building, `${i + 1}/roof`, 'reaction', 'EY') / 100);
  check({ source, seen: 'recalled', case: `${spans}: reactions over wl`, expected, got, within: 0.002 });
  expect(building.analysis.certificate.worstResidual).toBeLessThan(1e-6);
});
