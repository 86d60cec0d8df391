'use client';
import { useInfiniteQuery } from '@tanstack/react-query';
import { api, type ProjectDetail } from '@/lib/api';
import { when } from '@/lib/format';
import { Pending } from './problem';
import { Table } from './table';

/** Who may read it, as the service has it. */
const READERS: readonly ProjectDetail['role'][] = ['owner', 'engineer', 'checker'];

/** All that was written in the project, by whom: added to by the database itself and never changed. */
export function AuditTrail({ project }: { readonly project: ProjectDetail }) {
  const trail = useInfiniteQuery({
    queryKey: ['audit', project.id],
    queryFn: ({ pageParam }) => api.audit(project.id, pageParam),
    initialPageParam: '',
    getNextPageParam: ({ next }) => next,
    enabled: READERS.includes(project.role),
  });
  if (!READERS.includes(project.role)) return null;
  const entries = trail.data?.pages.flatMap((page) => page.entries) ?? [];
  return (
    <section className="panel">
      <h2>What was done</h2>
      {trail.data === undefined ? (
        <Pending error={trail.error} what="what was done" />
      ) : (
        <Table label="What was done">
          <tbody>
            {entries.map(({ id, at, by, what }) => (
              <tr key={id}>
                <td>{when(at)}</td>
                <td>{by ?? <span className="tag open-end">outside the service</span>}</td>
                <td>{what}</td>
              </tr>
            ))}
          </tbody>
        </Table>
      )}
      {trail.hasNextPage && (
        <button style={{ marginTop: 8 }} disabled={trail.isFetchingNextPage} onClick={() => void trail.fetchNextPage()}>
          Show what was before
        </button>
      )}
    </section>
  );
}
