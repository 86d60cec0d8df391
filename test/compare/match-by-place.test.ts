import { readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import type { Building } from '@groundward/engine/building/definition';
import { readBuilding, readBuildingText } from '@groundward/engine/building/read';
import { compareWithCauses } from '@groundward/engine/compare/causes';
import { compare, type Compared } from '@groundward/engine/compare/compare';
import { applyEdits } from '@groundward/engine/compare/edits';
import { matchByPlace } from '@groundward/engine/compare/match-by-place';
import { analyse } from '@groundward/engine/path/analyse';

function demo(name: string): Building {
  const result = readBuildingText(readFileSync(new URL(`../../prisma/demo/${name}.json`, import.meta.url), 'utf8'));
  if (!result.ok) throw new Error(JSON.stringify(result.faults));
  return result.value;
}

function analysed(building: Building): Compared {
  const read = readBuilding(building);
  if (!read.ok) throw new Error(JSON.stringify(read.faults));
  const result = analyse(read.value);
  if (!result.ok) throw new Error(JSON.stringify(result.faults));
  return { building: read.value, analysis: result.value };
}

/** The same building as another program would write it: new ids, another order. */
function imported(building: Building): Building {
  const copy = structuredClone(building);
  const level = new Map(copy.levels.map(({ id }, i) => [id, `E${i + 10}`]));
  for (const each of copy.levels) {
    each.id = level.get(each.id) ?? '';
    each.diaphragms?.forEach((diaphragm, d) => (diaphragm.id = `slab-${d}`));
  }
  copy.wallLines.reverse().forEach((line, l) => {
    line.id = `axis-${l}`;
    for (const storey of line.storeys) {
      storey.under = level.get(storey.under) ?? '';
      storey.piers.reverse().forEach((pier, p) => (pier.id = `wall-${p}`));
    }
    for (const collector of line.collectors ?? []) collector.level = level.get(collector.level) ?? '';
  });
  copy.loadCases.forEach((loadCase, c) => {
    loadCase.id = `case-${c}`;
    if ('forces' in loadCase) for (const force of loadCase.forces) force.level = level.get(force.level) ?? '';
  });
  return copy;
}

const first = demo('1-first-design');
const second = demo('2-client-changes');

describe('a building that comes back under other ids', () => {
  test('has no change but its ids, and the comparison says what was matched', () => {
    const before = analysed(first);
    const after = analysed(imported(first));
    const comparison = compare(before, after);
    expect(new Set(comparison.changes.map((change) => change.class))).toEqual(new Set(['unchanged']));
    expect(comparison.changes).toHaveLength(before.analysis.demands.length);
    const kinds = new Set(comparison.matches?.map(({ kind }) => kind));
    expect(kinds).toEqual(new Set(['level', 'diaphragm', 'wall-line', 'pier', 'load-case']));
    expect(applyEdits(first, comparison.edits)).toEqual(after.building);
  });

  test('tells the same changes and causes as under the ids that were', () => {
    const plain = compareWithCauses(analysed(first), analysed(second));
    const comparison = compareWithCauses(analysed(first), analysed(imported(second)));
    const tally = ({ changes }: typeof plain) => {
      const counts = new Map<string, number>();
      for (const change of changes) counts.set(change.class, (counts.get(change.class) ?? 0) + 1);
      return Object.fromEntries([...counts].sort());
    };
    expect(tally(comparison)).toEqual(tally(plain));
    expect(applyEdits(first, comparison.edits)).toEqual(imported(second));
    const pier = comparison.edits.find(({ what }) => what.includes('from: 17 → 18.6 m'));
    expect(pier).toBeDefined();
    expect(comparison.changes.some(({ causes }) => causes.some(({ edit }) => edit === pier?.id))).toBe(true);
  });
});

test('ids that both have stay what they are, even where another member stands nearer', () => {
  const swapped = structuredClone(first);
  const [a, b] = swapped.wallLines as [Building['wallLines'][number], Building['wallLines'][number]];
  [a.id, b.id] = [b.id, a.id];
  const { building, matches } = matchByPlace(first, swapped);
  expect(matches).toEqual([]);
  expect(building).toBe(first);
});

test('a line elsewhere, the other way round or at right angles is another line', () => {
  const line = (id: string, axis: [[number, number], [number, number]]): Building => ({
    ...structuredClone(first),
    wallLines: [{ id, axis, storeys: [{ under: 'L2', piers: [{ id: 'p', from: 1, to: 4 }] }] }],
  });
  const kinds = (now: Building) => matchByPlace(line('old', [[0, 0], [20, 0]]), now).matches.map(({ kind }) => kind); // prettier-ignore
  expect(kinds(line('new', [[0, 0.1], [20, 0.1]]))).toEqual(['wall-line']); // prettier-ignore
  expect(kinds(line('new', [[0, 2], [20, 2]]))).toEqual([]); // prettier-ignore
  expect(kinds(line('new', [[20, 0], [0, 0]]))).toEqual([]); // prettier-ignore
  expect(kinds(line('new', [[0, 0], [0, 20]]))).toEqual([]); // prettier-ignore
  expect(kinds(line('new', [[15, 0], [35, 0]]))).toEqual([]); // prettier-ignore
});
