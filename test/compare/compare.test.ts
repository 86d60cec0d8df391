import { readFileSync } from 'node:fs';
import { expect, test } from 'vitest';
import type { Building } from '@groundward/engine/building/definition';
import { readBuildingText } from '@groundward/engine/building/read';
import { compare, type Compared } from '@groundward/engine/compare/compare';
import { applyEdits, editsBetween } from '@groundward/engine/compare/edits';
import { analyse } from '@groundward/engine/path/analyse';

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

test('an edit is one sentence in the trade’s words', () => {
  const sentences = editsBetween(second, third).map((edit) => edit.what);
  expect(sentences).toContain('wall line B, storey under L2, pier Bd added');
  expect(sentences).toContain('wall line A, storey under L2, pier Ad, from: 25 → 24.2');
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
