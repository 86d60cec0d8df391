import { readFileSync } from 'node:fs';
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { Building } from '@groundward/engine/building/definition';
import { readBuildingText } from '@groundward/engine/building/read';
import { compare, type Compared, type Tolerance } from '@groundward/engine/compare/compare';
import { applyEdits, editsBetween } from '@groundward/engine/compare/edits';
import { analyse } from '@groundward/engine/path/analyse';
import type { Demand } from '@groundward/engine/path/result';

function demo(name: string): Building {
  const result = readBuildingText(readFileSync(new URL(`../../prisma/demo/${name}.json`, import.meta.url), 'utf8'));
  if (!result.ok) throw new Error(JSON.stringify(result.faults));
  return result.value;
}

function analysed(building: Building): Compared {
  const result = analyse(building);
  if (!result.ok) throw new Error(JSON.stringify(result.faults));
  return { building, analysis: result.value };
}

const revisions = ['1-first-design', '2-client-changes', '3-engineers-answer'].map(demo);
const [first, second, third] = revisions as [Building, Building, Building];

test('edits, applied in order, turn the earlier file into the later one, between any two revisions', () => {
  for (const before of revisions) {
    for (const after of revisions) expect(applyEdits(before, editsBetween(before, after))).toEqual(after);
  }
});

test('lists that were reordered, shortened and lengthened are patched by identity', () => {
  const shuffled = structuredClone(first);
  shuffled.wallLines.reverse();
  const [taken] = shuffled.wallLines.splice(2, 1);
  shuffled.wallLines.push({ ...structuredClone(taken as Building['wallLines'][number]), id: 'N' });
  (shuffled.wallLines[0] as Building['wallLines'][number]).name = 'Another name';
  expect(applyEdits(first, editsBetween(first, shuffled))).toEqual(shuffled);
  expect(applyEdits(shuffled, editsBetween(shuffled, first))).toEqual(first);
});

test('edits that an engineer would call one change are one, in one sentence', () => {
  const sentences = editsBetween(second, third).map((edit) => edit.what);
  expect(sentences).toEqual([
    'wall line A, storey under L2, pier Ad, from: 25 → 24.2 m; to: 28.6 → 29.4 m',
    'wall line B, storey under L2 and L3, pier Bd added',
    'wall line F, storey under L3, pier Fa and Fb, assembly: wall-3 → wall-2',
  ]);
});

test('a building against itself has no edit and every demand unchanged', () => {
  const same = compare(analysed(first), analysed(structuredClone(first)));
  expect(same.edits).toEqual([]);
  expect(new Set(same.changes.map((change) => change.class))).toEqual(new Set(['unchanged']));
});

test('classes follow before and after', () => {
  const { changes } = compare(analysed(second), analysed(third));
  for (const change of changes) {
    const before = Math.abs(change.before ?? 0);
    const after = Math.abs(change.after ?? 0);
    if (change.class === 'added') expect(change.before).toBeNull();
    if (change.class === 'removed') expect(change.after).toBeNull();
    if (change.class === 'raised') expect(after).toBeGreaterThanOrEqual(before);
    if (change.class === 'lowered') expect(after).toBeLessThan(before);
    if (change.class === 'unchanged')
      expect(Math.abs(after - before)).toBeLessThanOrEqual(1e-9 + 1e-3 * Math.max(before, after));
  }
  const ofPier = changes.filter((change) => change.member === 'B/L2/Bd' && change.quantity === 'shear');
  expect(ofPier.length).toBeGreaterThan(0);
  expect(new Set(ofPier.map((change) => change.class))).toEqual(new Set(['added']));
  const shopfront = changes.find(
    (change) => change.member === 'A/L2/Ac' && change.quantity === 'unit-shear' && change.case === 'EX',
  );
  expect(shopfront?.class).toBe('lowered');
});

test('every demand of either analysis stands in the comparison once', () => {
  const before = analysed(first);
  const after = analysed(second);
  const { changes } = compare(before, after);
  expect(changes.filter((change) => change.after !== null)).toHaveLength(after.analysis.demands.length);
  expect(changes.filter((change) => change.before !== null)).toHaveLength(before.analysis.demands.length);
});

describe('a demand that changes', () => {
  const row = (change: Partial<Demand> = {}): Demand => ({
    member: 'A/L2/Aa',
    kind: 'pier',
    quantity: 'end-tension',
    case: 'EX',
    sense: 1,
    value: 10,
    unit: 'kN',
    at: [4, 0],
    ...change,
  });
  const { analysis } = analysed(first);
  const having = (...demands: Demand[]): Compared => ({ building: first, analysis: { ...analysis, demands } });
  const classOf = (before: Demand[], after: Demand[], tolerance?: Tolerance) =>
    compare(having(...before), having(...after), tolerance).changes.map((change) => change.class);

  test.each([
    ['the same', row(), 'unchanged'],
    ['by less than 0.1 %', row({ value: 10.009 }), 'unchanged'],
    ['by more', row({ value: 10.02 }), 'raised'],
    ['downwards', row({ value: 9.9 }), 'lowered'],
    ['in place alone', row({ at: [4.5, 0] }), 'moved'],
    ['in place, by rounding', row({ at: [4 + 1e-9, 0] }), 'unchanged'],
    ['in place and in value', row({ at: [4.5, 0], value: 12 }), 'raised'],
    ['to nothing', row({ value: 0 }), 'lowered'],
    ['in direction alone', row({ quantity: 'shear', value: -10 }), 'raised'],
  ] as const)('%s', (_, after, expected) => {
    expect(classOf([row(after.quantity === 'shear' ? { quantity: 'shear' } : {})], [after])).toEqual([expected]);
  });

  test('the tolerance can be stated', () => {
    expect(classOf([row()], [row({ value: 10.4 })], { relative: 0.05, absolute: 0 })).toEqual(['unchanged']);
    expect(classOf([row()], [row({ value: 10.000001 })], { relative: 0, absolute: 0 })).toEqual(['raised']);
    expect(classOf([row()], [row({ value: 10.4 })], { relative: 0, absolute: 0.5 })).toEqual(['unchanged']);
  });

  test('member, quantity, case, sense and combination make it the same demand; any other is added or removed', () => {
    for (const other of [
      { member: 'A/L2/Ab' },
      { quantity: 'end-compression' },
      { case: 'EY' },
      { sense: -1 },
      { combination: 'D+0.7E' },
    ] as const) {
      expect(classOf([row()], [row(other)])).toEqual(['added', 'removed']);
    }
  });
});

test('an edit says the unit of what it changes, unless the file’s units change', () => {
  const moved = structuredClone(first);
  (moved.levels[1] as Building['levels'][number]).elevation = 3.5;
  expect(editsBetween(first, moved).map((edit) => edit.what)).toEqual(['level L2, elevation: 3.4 → 3.5 m']);
  const feet: Building = { ...moved, units: { length: 'ft', force: 'kip' } };
  expect(editsBetween(first, feet).map((edit) => edit.what)).toContain('level L2, elevation: 3.4 → 3.5');
});

test('edits turn any building into any other, whatever was added, taken away, moved or changed', () => {
  const pick = fc.constantFrom(...revisions);
  const cut = fc.array(fc.nat(), { maxLength: 6 });
  const changed = (building: Building, cuts: readonly number[]): Building => {
    const copy = structuredClone(building);
    for (const n of cuts) {
      const line = copy.wallLines[n % copy.wallLines.length];
      if (line === undefined) continue;
      if (n % 5 === 0) copy.wallLines.splice(n % copy.wallLines.length, 1);
      else if (n % 5 === 1) copy.wallLines.push({ ...structuredClone(line), id: `${line.id}~${n}` });
      else if (n % 5 === 2) line.storeys.reverse();
      else if (n % 5 === 3) line.shareBy = 'stiffness';
      else copy.levels.push({ id: `n${n}`, elevation: n });
    }
    return copy;
  };
  fc.assert(
    fc.property(pick, cut, pick, cut, (before, cutsBefore, after, cutsAfter) => {
      const from = changed(before, cutsBefore);
      const to = changed(after, cutsAfter);
      expect(applyEdits(from, editsBetween(from, to))).toEqual(to);
    }),
    { numRuns: 50 },
  );
});
