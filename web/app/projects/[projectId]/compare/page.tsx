'use client';
import type { Building } from '@groundward/engine/building/definition';
import type { ChangeClass, Comparison } from '@groundward/engine/compare/result';
import { useQuery } from '@tanstack/react-query';
import Link from 'next/link';
import { useParams } from 'next/navigation';
import { Suspense, useMemo } from 'react';
import { api, type Revision } from '@/lib/api';
import { CLASSES } from '@/lib/changes';
import { useQueryPatch, useQueryState } from '@/lib/query-state';
import { ComparisonDrawings } from '@/parts/comparison-drawings';
import { ClassTag, ComparisonTable } from '@/parts/comparison-table';
import { EditList } from '@/parts/edit-list';
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
  const list = useMemo(() => revisions.data ?? [], [revisions.data]);
  const [after, setAfter] = useQueryState('after', list[list.length - 1]?.id ?? '');
  const [before, setBefore] = useQueryState('before', beforeOf(list, after));
  const ready = before !== '' && after !== '';
  const comparison = useQuery({
    queryKey: ['compare', before, after, versionOf(list, before), versionOf(list, after)],
    queryFn: () => api.compare(projectId, before, after),
    enabled: ready,
  });
  const causes = useQuery({
    queryKey: ['causes', before, after, versionOf(list, before), versionOf(list, after)],
    queryFn: () => api.causes(projectId, before, after),
    enabled: comparison.data !== undefined,
    staleTime: Infinity,
    retry: false,
  });
  const first = useBuilding(projectId, before, list);
  const second = useBuilding(projectId, after, list);
  const options = list.map((revision) => ({ value: revision.id, name: `${revision.number} ${revision.name}` }));
  return (
    <main>
      <div className="bar">
        <h1 style={{ marginRight: 12 }}>Compare</h1>
        <Select label="Before" value={before} options={options} onChange={setBefore} />
        <Select label="After" value={after} options={options} onChange={setAfter} />
        <Link href={`/projects/${projectId}`}>All revisions</Link>
        {ready && <Link href={`/projects/${projectId}/revisions/${after}/findings`}>Findings of the later one</Link>}
      </div>
      {list.length === 1 ? (
        <p>There is one revision; a second one can be compared with it.</p>
      ) : comparison.data === undefined || first.data === undefined || second.data === undefined ? (
        <Pending error={revisions.error ?? comparison.error ?? first.error ?? second.error} what="both revisions" />
      ) : (
        <ComparisonView
          comparison={causes.data ?? comparison.data}
          causes={causes.error === null ? (causes.data === undefined ? 'asked' : 'known') : 'failed'}
          before={first.data}
          after={second.data}
        />
      )}
    </main>
  );
}

function useBuilding(projectId: string, id: string, list: readonly Revision[]) {
  return useQuery({
    queryKey: ['building', id, versionOf(list, id)],
    queryFn: () => api.building(projectId, id),
    enabled: id !== '',
    staleTime: Infinity,
  });
}

/** The revision that another one was made from, or the one before it in the list. */
function beforeOf(list: readonly Revision[], after: string): string {
  const at = list.findIndex(({ id }) => id === after);
  const base = list[at]?.basedOn;
  return (list.find(({ id }) => id === base) ?? list[at - 1] ?? list.find(({ id }) => id !== after))?.id ?? '';
}

function versionOf(list: readonly Revision[], id: string): number | undefined {
  return list.find((revision) => revision.id === id)?.version;
}

function ComparisonView({
  comparison,
  causes,
  before,
  after,
}: {
  readonly comparison: Comparison;
  readonly causes: 'asked' | 'known' | 'failed';
  readonly before: Building;
  readonly after: Building;
}) {
  const patch = useQueryPatch();
  const counts = useMemo(() => {
    const tally = new Map<ChangeClass, number>();
    for (const change of comparison.changes) tally.set(change.class, (tally.get(change.class) ?? 0) + 1);
    return tally;
  }, [comparison]);
  const show = (member: string): void => {
    const [head = '', next = ''] = member.split('/');
    if (after.wallLines.some(({ id }) => id === head))
      patch({ line: head, ...(isLevel(after, next) ? { level: next } : {}) });
    else if (isLevel(after, head))
      patch({ level: head, ...(after.wallLines.some(({ id }) => id === next) ? { line: next } : {}) });
  };
  return (
    <div className="stack">
      <section className="panel">
        <h2>{`${comparison.edits.length} edit${comparison.edits.length === 1 ? ' lies' : 's lie'} between`}</h2>
        <EditList comparison={comparison} causes={causes} />
        <p className="tags" aria-label="Demands by class">
          {CLASSES.map((name) => (
            <ClassTag key={name} name={name} count={counts.get(name) ?? 0} />
          ))}
        </p>
      </section>
      <ComparisonDrawings comparison={comparison} before={before} after={after} />
      <ComparisonTable comparison={comparison} onPick={show} />
    </div>
  );
}

function isLevel(building: Building, id: string): boolean {
  return building.levels.some((level) => level.id === id);
}
