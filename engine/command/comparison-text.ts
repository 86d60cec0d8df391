/** A comparison as the terminal shows it: the edits, and the demands that changed, the largest change first. */
import type { Change, Comparison } from '../src/compare/result.js';
import { figure, senseText, tableText } from './table.js';

export function comparisonText(comparison: Comparison): string {
  const changed = comparison.changes.filter((change) => change.class !== 'unchanged');
  const counts = new Map<string, number>();
  for (const change of comparison.changes) counts.set(change.class, (counts.get(change.class) ?? 0) + 1);
  const rows = [...changed].sort((a, b) => size(b) - size(a));
  return [
    `Edits\n${comparison.edits.length === 0 ? 'none\n' : comparison.edits.map((edit) => `${edit.id}  ${edit.what}\n`).join('')}`,
    `Demands: ${[...counts].map(([name, count]) => `${count} ${name}`).join(', ')}\n`,
    rows.length === 0
      ? ''
      : tableText(
          [
            { head: 'class' },
            { head: 'member' },
            { head: 'quantity' },
            { head: 'case' },
            { head: 'sense' },
            { head: 'combination' },
            { head: 'before', align: 'right' },
            { head: 'after', align: 'right' },
            { head: 'unit' },
          ],
          rows.map((change) => [
            change.class,
            change.member,
            change.quantity,
            change.case,
            senseText(change.sense),
            change.combination ?? '',
            change.before === null ? '–' : figure(change.before),
            change.after === null ? '–' : figure(change.after),
            change.unit,
          ]),
        ),
  ].join('\n');
}

/** Change relative to the larger value; what came or went counts as a whole. */
function size(change: Change): number {
  const before = Math.abs(change.before ?? 0);
  const after = Math.abs(change.after ?? 0);
  const most = Math.max(before, after);
  return most === 0 ? 0 : Math.abs((change.after ?? 0) - (change.before ?? 0)) / most;
}
