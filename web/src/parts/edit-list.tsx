'use client';
import type { Comparison } from '@groundward/engine/compare/result';
import { useMemo } from 'react';
import { count } from '@/lib/format';
import { useQueryState } from '@/lib/query-state';

const SAID = {
  asked: 'Working out what each edit did …',
  known: 'Pick an edit to see all that it did, in the table below.',
  failed: 'What each edit did could not be worked out.',
} as const;

/** The edits between two revisions; when their causes are known, each leads to all that it did. */
export function EditList({
  comparison,
  causes,
}: {
  readonly comparison: Comparison;
  readonly causes: keyof typeof SAID;
}) {
  const [picked, pick] = useQueryState('edit', '');
  const touched = useMemo(() => {
    const tally = new Map<string, number>();
    for (const change of comparison.changes) {
      for (const { edit } of change.causes) tally.set(edit, (tally.get(edit) ?? 0) + 1);
    }
    return tally;
  }, [comparison]);
  if (comparison.edits.length === 0) return null;
  return (
    <>
      <ul className="plain edits">
        {comparison.edits.map(({ id, what }) => (
          <li key={id}>
            {causes === 'known' ? (
              <button
                className="quiet"
                aria-pressed={picked === id}
                title={picked === id ? 'Show all changes' : 'Show what this edit did'}
                onClick={() => pick(picked === id ? '' : id)}
              >
                {id}
              </button>
            ) : (
              id
            )}{' '}
            {what}
            {causes === 'known' && <span className="note">{` · ${touchedText(touched.get(id) ?? 0)}`}</span>}
          </li>
        ))}
      </ul>
      <p className="note" role="status">
        {SAID[causes]}
        {comparison.method?.kind === 'sampled' &&
          ` Shares are sampled from ${comparison.method.pairs} pairs of orders; their standard error stands behind ±.`}
      </p>
    </>
  );
}

function touchedText(touched: number): string {
  return touched === 0 ? 'changes no demand' : `changes ${count(touched)} demand${touched === 1 ? '' : 's'}`;
}
