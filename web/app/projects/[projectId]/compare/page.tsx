'use client';
import type { Change, ChangeClass, Comparison } from '@groundward/engine/compare/result';
import type { Building } from '@groundward/engine/building/definition';
import { useQuery } from '@tanstack/react-query';
import Link from 'next/link';
import { useParams } from 'next/navigation';
import { Suspense, useMemo, useState } from 'react';
import { ElevationDrawing } from '@/drawings/elevation';
import { PlanDrawing, planBox } from '@/drawings/plan';
import { boxOf, fitWidth } from '@/drawings/scale';
import { useWidth } from '@/drawings/use-width';
import { api } from '@/lib/api';
import { levelName, levelsAscending } from '@/lib/demands';
import { figure, percent, quantity, senseSign } from '@/lib/format';
import { useQueryState } from '@/lib/query-state';
import { Pending } from '@/parts/problem';
import { Select } from '@/parts/select';

export default function Page() {
  return (
    <Suspense>
      <ComparePage />
    </Suspense>
  );
}

function ComparePage() {
  const { projectId } = useParams<{ projectId: string }>();
  const revisions = useQuery({ queryKey: ['revisions', projectId], queryFn: () => api.revisions(projectId) });
  const list = revisions.data ?? [];
  const [after, setAfter] = useQueryState('after', list[list.length - 1]?.id ?? '');
  const chosen = list.find((revision) => revision.id === after);
  const [before, setBefore] = useQueryState(
    'before',
    chosen?.basedOn ?? list.find((revision) => revision.id !== after)?.id ?? '',
  );
  const ready = before !== '' && after !== '';
  const comparison = useQuery({
    queryKey: ['compare', before, after],
    queryFn: () => api.compare(projectId, before, after),
    enabled: ready,
  });
  const building = useQuery({
    queryKey: ['building-of', after],
    queryFn: () => api.building(projectId, after),
    enabled: ready,
  });
  const options = list.map((revision) => ({ value: revision.id, name: `${revision.number} ${revision.name}` }));
  return (
    <main>
      <div className="bar">
        <h1 style={{ marginRight: 12 }}>Compare</h1>
        <Select label="Before" value={before} options={options} onChange={setBefore} />
        <Select label="After" value={after} options={options} onChange={setAfter} />
        <Link href={`/projects/${projectId}`}>Back to the project</Link>
      </div>
      {comparison.data === undefined || building.data === undefined ? (
        <Pending error={revisions.error ?? comparison.error ?? building.error} what="both revisions" />
      ) : (
        <ComparisonView projectId={projectId} comparison={comparison.data} building={building.data} />
      )}
    </main>
  );
}

const CLASSES: readonly ChangeClass[] = ['added', 'removed', 'raised', 'lowered', 'moved', 'unchanged'];
const COLOURS: Record<ChangeClass, string> = {
  added: 'var(--added)',
  removed: 'var(--removed)',
  raised: 'var(--raised)',
  lowered: 'var(--lowered)',
  moved: 'var(--moved)',
  unchanged: 'var(--hair-2)',
};
const SYMBOLS: Record<ChangeClass, string> = {
  added: '+',
  removed: '✕',
  raised: '▲',
  lowered: '▼',
  moved: '↔',
  unchanged: '=',
};
const PAGE = 300;

/** The change over the larger value; what came or went counts as a whole. */
function sizeOf(change: Change): number {
  const before = Math.abs(change.before ?? 0);
  const after = Math.abs(change.after ?? 0);
  const most = Math.max(before, after);
  return most === 0 ? 0 : Math.abs((change.after ?? 0) - (change.before ?? 0)) / most;
}

function ComparisonView({
  projectId,
  comparison,
  building,
}: {
  readonly projectId: string;
  readonly comparison: Comparison;
  readonly building: Building;
}) {
  const [kind, setKind] = useQueryState('kind', 'pier');
  const [what, setWhat] = useQueryState('quantity', kind === 'pier' ? 'unit-shear' : '');
  const [which, setWhich] = useQueryState('class', 'changed');
  const [sort, setSort] = useQueryState('sort', 'size');
  const [most, setMost] = useState(PAGE);
  const counts = useMemo(() => {
    const tally = new Map<ChangeClass, number>();
    for (const change of comparison.changes) tally.set(change.class, (tally.get(change.class) ?? 0) + 1);
    return tally;
  }, [comparison]);
  const kinds = [...new Set(comparison.changes.map((change) => change.kind))];
  const quantities = [
    ...new Set(
      comparison.changes.filter((change) => kind === '' || change.kind === kind).map((change) => change.quantity),
    ),
  ];
  const rows = useMemo(
    () =>
      comparison.changes
        .filter((change) => (kind === '' || change.kind === kind) && (what === '' || change.quantity === what))
        .filter((change) =>
          which === 'changed' ? change.class !== 'unchanged' : which === 'all' || change.class === which,
        )
        .sort((a, b) =>
          sort === 'member'
            ? a.member.localeCompare(b.member)
            : sort === 'after'
              ? Math.abs(b.after ?? 0) - Math.abs(a.after ?? 0)
              : sizeOf(b) - sizeOf(a) || Math.abs(b.after ?? 0) - Math.abs(a.after ?? 0),
        ),
    [comparison, kind, what, which, sort],
  );
  return (
    <div className="stack">
      <section className="panel">
        <h2>{`${comparison.edits.length} edits lie between`}</h2>
        <ul style={{ margin: 0, paddingLeft: 18, columns: '46ch' }}>
          {comparison.edits.map((edit) => (
            <li key={edit.id}>{edit.what}</li>
          ))}
        </ul>
      </section>
      <div>
        {CLASSES.map((name) => (
          <span key={name} className={`tag ${name}`} style={{ marginRight: 6 }}>
            {`${SYMBOLS[name]} ${counts.get(name) ?? 0} ${name}`}
          </span>
        ))}
      </div>
      <Marked comparison={comparison} building={building} />
      <section className="panel">
        <div className="bar">
          <Select
            label="Members"
            value={kind}
            options={[{ value: '', name: 'all kinds' }, ...kinds.map((value) => ({ value, name: value }))]}
            onChange={setKind}
          />
          <Select
            label="Quantity"
            value={what}
            options={[
              { value: '', name: 'all' },
              ...quantities.map((value) => ({ value, name: value.replaceAll('-', ' ') })),
            ]}
            onChange={setWhat}
          />
          <Select
            label="Class"
            value={which}
            options={[
              { value: 'changed', name: 'changed' },
              { value: 'all', name: 'all' },
              ...CLASSES.map((value) => ({ value, name: value })),
            ]}
            onChange={setWhich}
          />
          <Select
            label="Order"
            value={sort}
            options={[
              { value: 'size', name: 'size of change' },
              { value: 'after', name: 'value after' },
              { value: 'member', name: 'member' },
            ]}
            onChange={setSort}
          />
          <span className="note">{`${rows.length} demands of ${comparison.changes.length}`}</span>
        </div>
        <div className="scroll">
          <table>
            <thead>
              <tr>
                <th>Class</th>
                <th>Member</th>
                <th>Quantity</th>
                <th>Case</th>
                <th>Combination</th>
                <th className="n">Before</th>
                <th className="n">After</th>
                <th className="n">Change</th>
              </tr>
            </thead>
            <tbody>
              {rows.slice(0, most).map((change, i) => (
                <tr key={i}>
                  <td>
                    <span className={`tag ${change.class}`}>{`${SYMBOLS[change.class]} ${change.class}`}</span>
                  </td>
                  <td>{change.member}</td>
                  <td>{change.quantity.replaceAll('-', ' ')}</td>
                  <td>{`${change.case} ${senseSign(change.sense)}`}</td>
                  <td>{change.combination ?? 'unfactored'}</td>
                  <td className="n">{change.before === null ? '–' : quantity(change.before, change.unit)}</td>
                  <td className="n">{change.after === null ? '–' : quantity(change.after, change.unit)}</td>
                  <td className="n">{changeText(change)}</td>
                </tr>
              ))}
            </tbody>
          </table>
        </div>
        {rows.length > most && <button onClick={() => setMost(most + 1000)}>{`Show more of ${rows.length}`}</button>}
      </section>
      <p className="note">
        <Link href={`/projects/${projectId}`}>All revisions</Link>
      </p>
    </div>
  );
}

function changeText(change: Change): string {
  if (change.before === null || change.after === null) return change.before === null ? 'new' : 'gone';
  const before = Math.abs(change.before);
  if (before === 0) return figure(change.after - change.before, 3);
  const relative = (Math.abs(change.after) - before) / before;
  return `${relative > 0 ? '+' : ''}${percent(relative)}`;
}

/** Piers by the class of their largest change in unit shear, on plan and on elevation. */
function Marked({ comparison, building }: { readonly comparison: Comparison; readonly building: Building }) {
  const levels = levelsAscending(building).slice(1);
  const [level, setLevel] = useQueryState('level', levels[0]?.id ?? '');
  const [lineId, setLine] = useQueryState('line', building.wallLines[0]?.id ?? '');
  const line = building.wallLines.find((candidate) => candidate.id === lineId) ?? building.wallLines[0];
  const [ref, width] = useWidth<HTMLDivElement>();
  const marks = useMemo(() => {
    const largest = new Map<string, Change>();
    for (const change of comparison.changes) {
      if (change.kind !== 'pier' || change.quantity !== 'unit-shear') continue;
      const known = largest.get(change.member);
      if (known === undefined || sizeOf(change) > sizeOf(known)) largest.set(change.member, change);
    }
    return new Map(
      [...largest]
        .filter(([, change]) => change.class !== 'unchanged')
        .map(([member, change]) => [
          member,
          { colour: COLOURS[change.class], sign: SYMBOLS[change.class], says: change.class },
        ]),
    );
  }, [comparison]);
  const box = boxOf(planBox(building));
  const each = width > 900 ? (width - 24) / 2 : width;
  return (
    <section className="panel" ref={ref}>
      <div className="bar">
        <Select
          label="Plan of"
          value={level}
          options={levels.map(({ id }) => ({ value: id, name: levelName(building, id) }))}
          onChange={setLevel}
        />
        <Select
          label="Elevation of"
          value={line?.id ?? ''}
          options={building.wallLines.map(({ id, name }) => ({ value: id, name: name ?? id }))}
          onChange={setLine}
        />
        <span className="note">
          piers coloured by the change of their unit shear: <b style={{ color: 'var(--raised)' }}>▲ raised</b>,{' '}
          <b style={{ color: 'var(--lowered)' }}>▼ lowered</b>, <b style={{ color: 'var(--added)' }}>+ added</b>
        </span>
      </div>
      {width > 0 && (
        <div style={{ display: 'flex', flexWrap: 'wrap', gap: 24 }}>
          <PlanDrawing
            plan={{ building, level, marks, shown: line?.id }}
            box={box}
            scale={fitWidth(box, each, { left: 30, right: 20, top: 26, bottom: 30 }, 420)}
            onPick={setLine}
          />
          {line !== undefined && <ElevationDrawing view={{ building, line, marks }} width={each} />}
        </div>
      )}
    </section>
  );
}
