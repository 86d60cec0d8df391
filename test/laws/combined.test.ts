import fc from 'fast-check';
import { expect, test } from 'vitest';
import type { Building, CombinedCase } from '@groundward/engine/building/definition';
import { readBuilding } from '@groundward/engine/building/read';
import { analyse } from '@groundward/engine/path/analyse';
import type { Analysis, Quantity } from '@groundward/engine/path/result';
import { foundation } from '@groundward/engine/foundation/foundation';
import { buildings } from './random-building.js';

const diagonal: CombinedCase = {
  id: 'XY',
  kind: 'seismic',
  from: 'combined',
  parts: [
    { case: 'EX', factor: 1 },
    { case: 'EY', factor: 0.3 },
  ],
};

function analysed(building: Building): Analysis {
  const result = analyse(building);
  if (!result.ok) throw new Error(JSON.stringify(result.faults));
  return result.value;
}

/** Signed value of a quantity of wall lines and piers by member, for sense 1; one without a row is 0. */
function signed(analysis: Analysis, quantity: Quantity, caseId: string): Map<string, number> {
  return new Map(
    analysis.demands
      .filter(
        (row) =>
          row.quantity === quantity &&
          (row.kind === 'wall-line' || row.kind === 'pier') &&
          row.case === caseId &&
          row.sense === 1 &&
          row.combination === undefined,
      )
      .map((row) => [`${row.kind} ${row.member}`, row.value]),
  );
}

function expectSum(
  analysis: Analysis,
  quantity: Quantity,
  id: string,
  parts: readonly (readonly [string, number])[],
): void {
  const whole = signed(analysis, quantity, id);
  const each = parts.map(([caseId, factor]) => ({ values: signed(analysis, quantity, caseId), factor }));
  const members = new Set([...whole.keys(), ...each.flatMap(({ values }) => [...values.keys()])]);
  for (const member of members) {
    const terms = each.map(({ values, factor }) => factor * (values.get(member) ?? 0));
    const scale = terms.reduce((sum, term) => sum + Math.abs(term), 0);
    const sum = terms.reduce((total, term) => total + term, 0);
    expect(Math.abs((whole.get(member) ?? 0) - sum)).toBeLessThanOrEqual(1e-9 * Math.max(scale, 1));
  }
}

test('walls and supports get the sum of the parts, in every combination of senses and eccentricities', () => {
  fc.assert(
    fc.property(buildings(), (random) => {
      const building = { ...random, loadCases: [...random.loadCases, diagonal] };
      const analysis = analysed(building);
      const cases = new Set(analysis.demands.map((row) => row.case));
      const eccentric = cases.has('EX/+e');
      const expected: [string, string, string, number][] = [
        ['XY', 'EX', 'EY', 0.3],
        ['XY/+-', 'EX', 'EY', -0.3],
        ...(eccentric
          ? ([
              ['XY/+e-e', 'EX/+e', 'EY/-e', 0.3],
              ['XY/+-/-e-e', 'EX/-e', 'EY/-e', -0.3],
            ] as [string, string, string, number][])
          : []),
      ];
      for (const [id, x, y, factor] of expected) {
        expectSum(analysis, 'reaction', id, [
          [x, 1],
          [y, factor],
        ]);
        expectSum(analysis, 'shear', id, [
          [x, 1],
          [y, factor],
        ]);
      }
      expect([...cases].filter((id) => id.startsWith('XY'))).toHaveLength(eccentric ? 10 : 2);
      const totals = foundation(building, analysis).totals;
      const total = (caseId: string) => totals.find((each) => each.case === caseId && each.sense === 1);
      for (const axis of ['fx', 'fy', 'mx', 'my', 'mz'] as const) {
        const sum = (total('EX')?.[axis] ?? 0) + 0.3 * (total('EY')?.[axis] ?? 0);
        const scale = Math.abs(total('EX')?.[axis] ?? 0) + Math.abs(total('EY')?.[axis] ?? 0) + 1;
        expect(Math.abs((total('XY')?.[axis] ?? 0) - sum)).toBeLessThanOrEqual(1e-8 * scale);
      }
    }),
    { numRuns: 40, seed: 33 },
  );
});

test('the path’s edges of a combined case close at every node', () => {
  fc.assert(
    fc.property(buildings({ behaviours: 'rigid' }), (random) => {
      const { path } = analysed({ ...random, loadCases: [...random.loadCases, diagonal] });
      const piers = new Set(path.nodes.filter(({ kind }) => kind === 'wall-line').map(({ id }) => id));
      for (const node of piers) {
        let sum = 0;
        let scale = 1;
        for (const edge of path.edges) {
          if (edge.case !== 'XY' || edge.acts !== 'horizontal') continue;
          if (edge.to === node) sum += edge.force;
          if (edge.from === node) sum -= edge.force;
          if (edge.to === node || edge.from === node) scale += Math.abs(edge.force);
        }
        expect(Math.abs(sum)).toBeLessThanOrEqual(1e-9 * scale);
      }
    }),
    { numRuns: 15, seed: 5 },
  );
});

test.each([
  [
    'a part that is not there',
    {
      parts: [
        { case: 'EX', factor: 1 },
        { case: 'EZ', factor: 0.3 },
      ],
    },
    'unknown-part',
    'parts[1].case',
  ],
  [
    'a part that is itself combined',
    {
      parts: [
        { case: 'EX', factor: 1 },
        { case: 'XY', factor: 0.3 },
      ],
    },
    'unknown-part',
    'parts[1].case',
  ],
  ['a part of another kind', { kind: 'wind' as const }, 'unknown-part', 'parts[0].case'],
  [
    'a part twice',
    {
      parts: [
        { case: 'EX', factor: 1 },
        { case: 'EX', factor: 0.3 },
      ],
    },
    'part-twice',
    'parts[1].case',
  ],
  [
    'a factor of nothing',
    {
      parts: [
        { case: 'EX', factor: 0 },
        { case: 'EY', factor: 0.3 },
      ],
    },
    'out-of-range',
    'parts[0].factor',
  ],
])('fault: %s', (_, change, code, path) => {
  const [random] = fc.sample(buildings(), { numRuns: 1, seed: 1 });
  if (random === undefined) throw new Error('no building');
  const read = readBuilding({ ...random, loadCases: [...random.loadCases, { ...diagonal, ...change }] });
  expect(read.ok ? [] : read.faults).toContainEqual(expect.objectContaining({ code, path: `loadCases[2].${path}` }));
});
