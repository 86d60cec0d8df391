import { readFileSync } from 'node:fs';
import { readBuildingText } from '@groundward/engine/building/read';
import { analyse } from '@groundward/engine/path/analyse';
import { describe, expect, test } from 'vitest';
import { casesOf, indexOf, type Facts } from './demands';
import { connected, flowOf } from './flow';
import { originOf } from './origin';

const file = new URL('../../../prisma/demo/3-engineers-answer.json', import.meta.url);

function factsOf(text: string): Facts {
  const building = readBuildingText(text);
  if (!building.ok) throw new Error(JSON.stringify(building.faults));
  const analysis = analyse(building.value);
  if (!analysis.ok) throw new Error(JSON.stringify(analysis.faults));
  return { building: building.value, analysis: analysis.value, index: indexOf(analysis.value) };
}

const facts = factsOf(readFileSync(file, 'utf8'));

describe.each(casesOf(facts.analysis).flatMap((caseId) => ([1, -1] as const).map((sense) => ({ caseId, sense }))))(
  'the drawing of forces going down, $caseId, sense $sense',
  (loading) => {
    const flow = flowOf(facts, loading);

    test('on every level the band ends in nothing: the lines take what the masses and transfers give', () => {
      for (const level of flow.levels) {
        const last = level.steps.filter(({ column }) => flow.columns[column]?.across === false).pop();
        expect(Math.abs(last?.after ?? NaN)).toBeLessThan(1e-9 * Math.max(1, level.storeyShear));
      }
    });

    test('a ribbon is as wide as what came from above and what the level gives', () => {
      for (const { steps } of flow.levels)
        for (const { above, reaction, shear } of steps) expect(above + reaction).toBeCloseTo(shear, 8);
    });

    test('the supports take the shear of the lowest storey', () => {
      const lowest = flow.levels[flow.levels.length - 1];
      for (const [column] of flow.columns.entries()) {
        const feet = flow.feet.filter((foot) => foot.column === column).reduce((sum, { shear }) => sum + shear, 0);
        expect(feet).toBeCloseTo(lowest?.steps[column]?.shear ?? NaN, 8);
      }
    });
  },
);

test('lines along the load stand in the order of the span, those across it apart', () => {
  const { columns } = flowOf(facts, { caseId: 'EY', sense: 1 });
  expect(columns.map(({ line }) => line.id).join('')).toBe('123456ABCDEF');
  expect(columns.filter(({ across }) => across)).toHaveLength(6);
});

test('what a line that stops carries is followed through the rigid level to lines on either side', () => {
  const found = connected(facts, '4/L3', 'EY');
  expect(found).toContain('roof/roof-main');
  expect(found).toContain('1/L2');
  expect(found).toContain('6/6b');
  expect(found).not.toContain('1/L3');
});

test('a number says what it is made of, with the numbers', () => {
  const demand = (member: string, quantity: 'reaction' | 'shear') => {
    const row = facts.index.of(member, quantity, 'EY', 1);
    return row === undefined ? '' : originOf(row, facts);
  };
  expect(demand('2/L3', 'reaction')).toContain('reaction of spans 1-2 and 2-3 at line 2');
  expect(demand('2/L2', 'reaction')).toContain('the rigid diaphragm L2-main, direct and torsional part');
  expect(demand('2/L2', 'reaction')).toContain('with the transfer from line 4');
  expect(demand('2/L2', 'shear')).toMatch(/from the storey above and .* from this level’s diaphragm/);
});
