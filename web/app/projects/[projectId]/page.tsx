'use client';
import { useQuery, useQueryClient } from '@tanstack/react-query';
import Link from 'next/link';
import { useParams, useRouter } from 'next/navigation';
import { useState, type ChangeEvent } from 'react';
import { api, type Revision } from '@/lib/api';
import { AuditTrail } from '@/parts/audit-trail';
import { IssueForm } from '@/parts/issue-form';
import { Members } from '@/parts/members';
import { NameForm } from '@/parts/name-form';
import { Pending, ProblemView } from '@/parts/problem';
import { RevisionTable } from '@/parts/revision-table';

export default function Project() {
  const { projectId } = useParams<{ projectId: string }>();
  const project = useQuery({ queryKey: ['project', projectId], queryFn: () => api.project(projectId) });
  const revisions = useQuery({ queryKey: ['revisions', projectId], queryFn: () => api.revisions(projectId) });
  const client = useQueryClient();
  const router = useRouter();
  const [error, setError] = useState<unknown>(null);
  const [issuing, setIssuing] = useState<Revision | null>(null);
  const [naming, setNaming] = useState<Revision | null>(null);
  const [picked, setPicked] = useState<readonly string[]>([]);
  const list = revisions.data ?? [];
  const last = list[list.length - 1];
  const mayWrite = project.data?.role === 'owner' || project.data?.role === 'engineer';

  const attempt = async (work: () => Promise<unknown>): Promise<void> => {
    setError(null);
    try {
      await work();
      await client.invalidateQueries({ queryKey: ['revisions', projectId] });
    } catch (failure) {
      setError(failure);
    }
  };
  const follow = (from: Revision): Promise<void> =>
    attempt(async () => {
      const made = await api.createRevision(projectId, { name: `After ${from.name}`, from: from.id });
      router.push(`/projects/${projectId}/revisions/${made.id}/building`);
    });
  const upload = async (event: ChangeEvent<HTMLInputElement>): Promise<void> => {
    const file = event.target.files?.[0];
    if (file === undefined) return;
    event.target.value = '';
    await attempt(async () => {
      let building: unknown;
      try {
        building = JSON.parse(await file.text());
      } catch {
        throw new Error(`${file.name} is not JSON.`);
      }
      await api.createRevision(projectId, { name: file.name.replace(/\.json$/i, ''), building });
    });
  };
  const pick = (id: string): void =>
    setPicked((now) => (now.includes(id) ? now.filter((other) => other !== id) : [...now, id].slice(-2)));
  const pair = list.filter((revision) => picked.includes(revision.id));

  if (project.data === undefined || revisions.data === undefined) {
    return (
      <main>
        <Pending error={project.error ?? revisions.error} what="the project" />
      </main>
    );
  }
  return (
    <main className="stack">
      <h1>{project.data.name}</h1>
      <ProblemView error={error} />
      <div className="bar">
        {mayWrite && last !== undefined && (
          <button className="primary" onClick={() => void follow(last)}>
            New revision from the last one
          </button>
        )}
        {mayWrite && (
          <label>
            Building file as a new revision
            <input type="file" accept=".json,application/json" onChange={(event) => void upload(event)} />
          </label>
        )}
        {pair.length === 2 ? (
          <Link href={`/projects/${projectId}/compare?before=${pair[0]?.id ?? ''}&after=${pair[1]?.id ?? ''}`}>
            {`Compare revision ${pair[0]?.number ?? ''} with ${pair[1]?.number ?? ''}`}
          </Link>
        ) : (
          <span className="note">Tick two revisions to compare them.</span>
        )}
      </div>
      <RevisionTable
        revisions={[...list].reverse()}
        root={`/projects/${projectId}/revisions`}
        picked={picked}
        onPick={pick}
        actions={
          mayWrite
            ? {
                revise: (revision) => void follow(revision),
                rename: setNaming,
                issue: setIssuing,
                remove: (revision) => {
                  if (window.confirm(`Delete draft ${revision.number}, ${revision.name}?`))
                    void attempt(() => api.removeRevision(projectId, revision.id, revision.version));
                },
              }
            : undefined
        }
      />
      {naming !== null && (
        <NameForm
          key={naming.id}
          revision={naming}
          onCancel={() => setNaming(null)}
          onName={(name) =>
            void attempt(async () => {
              await api.renameRevision(projectId, naming.id, naming.version, name);
              setNaming(null);
            })
          }
        />
      )}
      {issuing !== null && (
        <IssueForm
          revision={issuing}
          onCancel={() => setIssuing(null)}
          onIssue={(body) =>
            attempt(async () => {
              await api.issue(projectId, issuing.id, issuing.version, body);
              setIssuing(null);
            })
          }
        />
      )}
      <Members project={project.data} />
      <AuditTrail project={project.data} />
    </main>
  );
}
