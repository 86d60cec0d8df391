/**
 * A comparison as the terminal shows it: the edits, and the demands that changed. The largest change comes first, measured by the
 * largest demand of its kind and quantity, so that nothing small that doubled goes before something large that grew.
 */
import type { Change, Comparison } from '../src/compare/result.js';
import { figure, senseText, tableText } from './table.js';

export function comparisonText(comparison: Comparison): string {
  const changed = comparison.changes.filter((change) => change.class !== 'unchanged');
  const counts = new Map<string, number>();
  for (const change of comparison.changes) counts.set(change.class, (counts.get(change.class) ?? 0) + 1);
  const largest = new Map<string, number>();
  for (const change of comparison.changes) {
    const key = measureOf(change);
    const most = Math.max(largest.get(key) ?? 0, Math.abs(change.before ?? 0), Math.abs(change.after ?? 0));
    largest.set(key, most);
  }
  const size = (change: Change): number =>
    Math.abs((change.after ?? 0) - (change.before ?? 0)) / (largest.get(measureOf(change)) || 1);
  const rows = changed
    .map((change) => ({ change, size: size(change) }))
    .sort((a, b) => b.size - a.size)
    .map(({ change }) => change);
  return [
    `Edits\n${comparison.edits.length === 0 ? 'none\n' : comparison.edits.map((edit) => `${edit.id}  ${edit.what}\n`).join('')}`,
    comparison.matches === undefined
      ? ''
      : `Known again by place: ${comparison.matches.map(({ kind, before, after: now }) => `${kind} ${before} is ${now}`).join(', ')}\n`,
    comparison.method?.kind === 'sampled'
      ? `Shares are sampled: ${comparison.method.pairs} pairs of orders, seed ${comparison.method.seed}; the standard error stands behind ±\n`
      : '',
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
            ...(comparison.method === undefined ? [] : [{ head: 'of which by' }]),
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
            ...(comparison.method === undefined ? [] : [causesText(change)]),
          ]),
        ),
  ]
    .filter((part) => part !== '')
    .join('\n');
}

function measureOf(change: Change): string {
  return `${change.kind} ${change.quantity}`;
}

/** `e2 +1.2 e1 −0.3`: the largest share first. */
function causesText({ causes }: Change): string {
  return [...causes]
    .sort((a, b) => Math.abs(b.share) - Math.abs(a.share))
    .map(
      ({ edit, share, error }) =>
        `${edit} ${share < 0 ? '−' : '+'}${figure(Math.abs(share))}${error === undefined ? '' : ` ±${figure(error)}`}`,
    )
    .join('  ');
}
