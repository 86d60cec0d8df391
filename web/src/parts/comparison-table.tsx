'use client';
import type { Change, ChangeClass, Comparison, Edit } from '@groundward/engine/compare/result';
import { useMemo, useState } from 'react';
import { CLASSES, crosses, difference, SIGNS, sorted, type Order } from '@/lib/changes';
import { count as tally, percent, quantity, senseSign, withSign, words } from '@/lib/format';
import { useQueryPatch, useQueryState } from '@/lib/query-state';
import { Causes } from './causes';
import { Select } from './select';
import { Table } from './table';

const PAGE = 200;
const CHANGED = 'changed';
const ALL = 'all';

const HEADS: readonly { readonly order: Order; readonly name: string; readonly number?: true }[] = [
  { order: 'class', name: 'Class' },
  { order: 'member', name: 'Member' },
  { order: 'quantity', name: 'Quantity' },
  { order: 'case', name: 'Case' },
  { order: 'combination', name: 'Combination' },
  { order: 'before', name: 'Before', number: true },
  { order: 'after', name: 'After', number: true },
  { order: 'change', name: 'Change', number: true },
  { order: 'size', name: 'Size', number: true },
];

/** Every demand of either revision, filtered and sorted; what is asked for stands in the address. */
export function ComparisonTable({
  comparison,
  onPick,
}: {
  readonly comparison: Comparison;
  readonly onPick: (member: string) => void;
}) {
  const patch = useQueryPatch();
  const [kind] = useQueryState('kind', 'pier');
  const [what, setWhat] = useQueryState('quantity', kind === 'pier' ? 'unit-shear' : ALL);
  const [which, setWhich] = useQueryState('class', CHANGED);
  const [caseId, setCase] = useQueryState('case', ALL);
  const [wanted, setWanted] = useQueryState('member', '');
  const [edit] = useQueryState('edit', '');
  const [order] = useQueryState('sort', 'size') as [Order, unknown];
  const [direction] = useQueryState('direction', 'falling');
  const [most, setMost] = useState(PAGE);
  const changes = comparison.changes;
  const rows = useMemo(
    () => sorted(changes.filter(wants({ kind, what, which, caseId, wanted, edit })), order, direction === 'falling'),
    [changes, kind, what, which, caseId, wanted, edit, order, direction],
  );
  const quantities = changes.filter((change) => kind === ALL || change.kind === kind).map((change) => change.quantity);
  return (
    <section className="panel">
      <div className="bar">
        <Select
          label="Members"
          value={kind}
          options={choices(changes.map((change) => change.kind))}
          onChange={(value) => patch({ kind: value, quantity: '' })}
        />
        <Select label="Quantity" value={what} options={choices(quantities)} onChange={setWhat} />
        <Select
          label="Class"
          value={which}
          options={[
            { value: CHANGED, name: 'changed' },
            { value: 'limit', name: 'limit crossed' },
            ...CLASSES.map((value) => ({ value, name: `${SIGNS[value]} ${value}` })),
            { value: ALL, name: 'all' },
          ]}
          onChange={setWhich}
        />
        <Select
          label="Case"
          value={caseId}
          options={choices(changes.map((change) => change.case))}
          onChange={setCase}
        />
        <label>
          Member begins with
          <input value={wanted} onChange={(event) => setWanted(event.target.value)} size={10} />
        </label>
        <span className="note">{`${tally(rows.length)} demands of ${tally(changes.length)}`}</span>
      </div>
      <Table label="Changed demands">
        <thead>
          <tr>
            {HEADS.map((head) => (
              <th
                key={head.order}
                className={head.number && 'n'}
                aria-sort={order === head.order ? (direction === 'falling' ? 'descending' : 'ascending') : undefined}
              >
                <button
                  onClick={() =>
                    patch({
                      sort: head.order,
                      direction: order === head.order && direction === 'falling' ? 'rising' : 'falling',
                    })
                  }
                >
                  {head.name}
                  {order === head.order ? (direction === 'falling' ? ' ↓' : ' ↑') : ''}
                </button>
              </th>
            ))}
            {comparison.method !== undefined && <th>Of which by</th>}
          </tr>
        </thead>
        <tbody>
          {rows.slice(0, most).map((change) => (
            <ChangeRow
              key={keyOf(change)}
              change={change}
              edits={comparison.method === undefined ? undefined : comparison.edits}
              onPick={onPick}
            />
          ))}
        </tbody>
      </Table>
      {rows.length > most && (
        <button style={{ marginTop: 8 }} onClick={() => setMost(most + 1000)}>
          {`Show more of ${tally(rows.length)}`}
        </button>
      )}
    </section>
  );
}

function ChangeRow({
  change,
  edits,
  onPick,
}: {
  readonly change: Change;
  readonly edits: readonly Edit[] | undefined;
  readonly onPick: (member: string) => void;
}) {
  return (
    <tr>
      <td>
        <ClassTag name={change.class} />
        {crosses(change) && <span className="tag open-end">limit crossed</span>}
      </td>
      <th scope="row">
        <button className="quiet" title="Show it on plan and elevation" onClick={() => onPick(change.member)}>
          {change.member}
        </button>
      </th>
      <td>{words(change.quantity)}</td>
      <td>{`${change.case} ${senseSign(change.sense)}`}</td>
      <td>{change.combination ?? 'unfactored'}</td>
      <td className="n">{change.before === null ? '–' : quantity(change.before, change.unit)}</td>
      <td className="n">{change.after === null ? '–' : quantity(change.after, change.unit)}</td>
      <td className="n">{withSign(quantity(difference(change), change.unit), difference(change))}</td>
      <td className="n">{relative(change)}</td>
      {edits !== undefined && (
        <td>
          <Causes change={change} edits={edits} />
        </td>
      )}
    </tr>
  );
}

export function ClassTag({ name, count }: { readonly name: ChangeClass; readonly count?: number }) {
  return (
    <span className={`tag ${name}`}>
      {count === undefined ? `${SIGNS[name]} ${name}` : `${SIGNS[name]} ${tally(count)} ${name}`}
    </span>
  );
}

function relative(change: Change): string {
  if (change.before === null) return 'new';
  if (change.after === null) return 'gone';
  const before = Math.abs(change.before);
  if (before === 0) return change.after === 0 ? '0' : 'from 0';
  const share = difference(change) / before;
  return withSign(percent(share), share);
}

type Wants = {
  readonly kind: string;
  readonly what: string;
  readonly which: string;
  readonly caseId: string;
  readonly wanted: string;
  readonly edit: string;
};

function wants({ kind, what, which, caseId, wanted, edit }: Wants): (change: Change) => boolean {
  return (change) =>
    (kind === ALL || change.kind === kind) &&
    (what === ALL || change.quantity === what) &&
    (caseId === ALL || change.case === caseId) &&
    change.member.startsWith(wanted) &&
    (edit === '' || change.causes.some((cause) => cause.edit === edit)) &&
    (which === ALL ||
      (which === CHANGED
        ? change.class !== 'unchanged'
        : which === 'limit'
          ? crosses(change)
          : change.class === which));
}

function choices(values: readonly string[]): { readonly value: string; readonly name: string }[] {
  return [{ value: ALL, name: 'all' }, ...[...new Set(values)].map((value) => ({ value, name: words(value) }))];
}

function keyOf(change: Change): string {
  return [change.member, change.quantity, change.case, change.sense, change.combination].join('|');
}
