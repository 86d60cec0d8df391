import { readFileSync } from 'node:fs';
import { expect, test } from 'vitest';
import { readBuildingText } from '@groundward/engine/building/read';
import { foundationCsv } from '@groundward/engine/foundation/csv';
import { foundation } from '@groundward/engine/foundation/foundation';
import { analyse } from '@groundward/engine/path/analyse';

const read = readBuildingText(readFileSync(new URL('../../prisma/demo/1-first-design.json', import.meta.url), 'utf8'));
if (!read.ok) throw new Error(JSON.stringify(read.faults));
const building = read.value;
const analysed = analyse(building);
if (!analysed.ok) throw new Error(JSON.stringify(analysed.faults));
const analysis = analysed.value;
const demands = foundation(building, analysis);

/** Storey forces by level, signed along the case. */
function forces(caseId: string): { force: number; elevation: number }[] {
  return building.levels.flatMap((level) => {
    const row = analysis.demands.find(
      (demand) =>
        demand.kind === 'level' &&
        demand.member === level.id &&
        demand.quantity === 'force' &&
        demand.case === caseId &&
        demand.sense === 1,
    );
    return row === undefined ? [] : [{ force: row.value, elevation: level.elevation }];
  });
}

test.each(['EX', 'EY', 'EY/+e', 'WX', 'WY'])(
  'totals under %s: base shear and overturning moment of the applied forces, both senses',
  (caseId) => {
    const shear = forces(caseId).reduce((sum, { force }) => sum + force, 0);
    const moment = forces(caseId).reduce((sum, { force, elevation }) => sum + force * elevation, 0);
    const alongX = caseId.includes('X');
    for (const sense of [1, -1]) {
      const total = demands.totals.find((entry) => entry.case === caseId && entry.sense === sense);
      expect(total?.fx).toBeCloseTo(alongX ? sense * shear : 0, 8);
      expect(total?.fy).toBeCloseTo(alongX ? 0 : sense * shear, 8);
      expect(total?.fz).toBeCloseTo(0, 8);
      // A downward force P at (x, y) has the moment (−y·P, x·P): a push along +x bears on the side of larger x.
      expect(total?.my).toBeCloseTo(alongX ? sense * moment : 0, 7);
      expect(total?.mx).toBeCloseTo(alongX ? 0 : -sense * moment, 7);
    }
  },
);

test('totals under dead load: all gravity on piers arrives', () => {
  const dead = building.wallLines
    .flatMap((line) => line.storeys.flatMap((storey) => storey.piers))
    .flatMap((pier) =>
      (pier.gravity ?? []).filter((load) => load.case === 'D').map((load) => load.perLength * (pier.to - pier.from)),
    )
    .reduce((sum, force) => sum + force, 0);
  expect(demands.totals.find((entry) => entry.case === 'D')?.fz).toBeCloseTo(dead, 8);
});

test('at each support one demand a quantity governs: the largest of the combinations', () => {
  for (const support of demands.supports) {
    for (const quantity of ['shear', 'uplift', 'bearing', 'moment']) {
      const rows = support.demands.filter((demand) => demand.quantity === quantity && demand.combination !== undefined);
      const marked = support.demands.filter((demand) => demand.quantity === quantity && demand.governing);
      const most = Math.max(0, ...rows.map((row) => row.value));
      expect(marked.map((row) => row.value)).toEqual(most > 0 ? [most] : []);
    }
  }
});

test('labels follow the plan, from west to east', () => {
  expect(demands.supports.map((support) => support.label)).toEqual(demands.supports.map((_, i) => `F${i + 1}`));
  const x = demands.supports.map((support) => support.at[0]);
  expect(x).toEqual([...x].sort((a, b) => a - b));
});

test('CSV: one line a demand, a head, a caution; a text that looks like a formula stays a text', () => {
  const lines = foundationCsv(demands).trimEnd().split('\r\n');
  expect(lines).toHaveLength(2 + demands.supports.reduce((sum, support) => sum + support.demands.length, 0));
  expect(lines[lines.length - 1]).toContain('licensed engineer');
  const odd = {
    ...demands,
    supports: demands.supports.slice(0, 1).map((support) => ({ ...support, line: '=1+1', member: 'a,"b"' })),
  };
  expect(foundationCsv(odd)).toContain(`F1,"a,""b""",'=1+1,`);
  const sums = { ...odd, supports: odd.supports.map((support) => ({ ...support, line: '-1+2', member: '-3' })) };
  expect(foundationCsv(sums)).toContain(`F1,-3,'-1+2,`);
});
