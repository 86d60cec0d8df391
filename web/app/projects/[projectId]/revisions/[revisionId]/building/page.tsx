'use client';
import type { Building } from '@groundward/engine/building/definition';
import { useQueryClient } from '@tanstack/react-query';
import { useEffect, useState, type ChangeEvent } from 'react';
import { ApiProblem, api, type Revision } from '@/lib/api';
import { setAt } from '@/lib/edit';
import { useQueryState } from '@/lib/query-state';
import { useRevision } from '@/lib/revision-data';
import { ForcesTable, LinesTable, PiersTable, RawFile, WeightsTable } from '@/parts/building-tables';
import type { Change } from '@/parts/edit-table';
import { Pending, ProblemView } from '@/parts/problem';

export default function BuildingPage() {
  const { projectId, revisionId, revision, building, error } = useRevision();
  if (revision === undefined || building === undefined) return <Pending error={error} what="the building" />;
  return (
    <Editor key={`${revisionId} ${revision.version}`} projectId={projectId} revision={revision} saved={building} />
  );
}

type Kept = { readonly version: number; readonly document: unknown };

/** What was typed and not saved is kept in the browser until it is saved or dropped. */
function kept(id: string): Kept | null {
  const text = window.localStorage.getItem(`draft ${id}`);
  return text === null ? null : (JSON.parse(text) as Kept);
}

const SECTIONS = [
  ['forces', 'Forces'],
  ['weights', 'Weights'],
  ['lines', 'Wall lines'],
  ['piers', 'Piers'],
  ['file', 'The file itself'],
] as const;

function Editor({
  projectId,
  revision,
  saved,
}: {
  readonly projectId: string;
  readonly revision: Revision;
  readonly saved: Building;
}) {
  const client = useQueryClient();
  const [document, setDocument] = useState<unknown>(saved);
  const [version, setVersion] = useState(revision.version);
  const [error, setError] = useState<unknown>(null);
  const [busy, setBusy] = useState(false);
  const [message, setMessage] = useState('');
  const [section, setSection] = useQueryState('section', 'piers');
  const locked = revision.state === 'issued';
  const dirty = document !== saved;
  const store = `draft ${revision.id}`;
  useEffect(() => {
    const before = kept(revision.id);
    if (before !== null && !locked) {
      setDocument(before.document);
      setVersion(before.version);
      setMessage('Unsaved changes from before were brought back.');
    }
  }, [revision.id, locked]);
  const edit = (next: unknown): void => {
    setDocument(next);
    setMessage('');
    window.localStorage.setItem(store, JSON.stringify({ version, document: next }));
  };
  const change = (changes: readonly Change[]): void =>
    edit(changes.reduce<unknown>((now, { path, value }) => setAt(now, path, value), document));
  const drop = (): void => {
    window.localStorage.removeItem(store);
    setDocument(saved);
    setVersion(revision.version);
    setError(null);
    setMessage('');
  };
  const save = async (): Promise<void> => {
    setBusy(true);
    setError(null);
    setMessage('');
    try {
      await api.save(projectId, revision.id, JSON.stringify(document), version);
      window.localStorage.removeItem(store);
      await client.invalidateQueries({ queryKey: ['revision', revision.id] });
      await client.invalidateQueries({ queryKey: ['revisions', projectId] });
    } catch (failure) {
      setError(failure);
    }
    setBusy(false);
  };
  const upload = async (event: ChangeEvent<HTMLInputElement>): Promise<void> => {
    const file = event.target.files?.[0];
    if (file === undefined) return;
    event.target.value = '';
    try {
      edit(JSON.parse(await file.text()));
      setMessage(`${file.name} is in the editor; it is checked when you save.`);
    } catch {
      setError(new Error(`${file.name} is not JSON.`));
    }
  };
  const faults = error instanceof ApiProblem ? error.faults : [];
  const stale = error instanceof ApiProblem && error.status === 412;
  const shared = { document, faults, locked, onChange: change };
  return (
    <>
      <div className="bar">
        {!locked && (
          <button className="primary" disabled={!dirty || busy} onClick={() => void save()}>
            {busy ? 'Saving and analysing …' : 'Save and analyse'}
          </button>
        )}
        {!locked && dirty && (
          <button disabled={busy} onClick={drop}>
            Drop the changes
          </button>
        )}
        <a href={api.downloadHref(projectId, revision.id)} download>
          Download the building file
        </a>
        {!locked && (
          <label>
            Replace by a building file
            <input type="file" accept=".json,application/json" onChange={(event) => void upload(event)} />
          </label>
        )}
        <span className="note" role="status">
          {locked
            ? 'Issued: nothing here can change. Make a new revision from it.'
            : dirty
              ? 'Changed, not saved.'
              : 'Saved.'}{' '}
          {message}
        </span>
      </div>
      {stale ? (
        <div className="problem" role="alert">
          {error.message}{' '}
          <button
            onClick={() => {
              const current = error.current as { revision: Revision };
              setVersion(current.revision.version);
              setError(null);
              setMessage('Your next save replaces theirs.');
            }}
          >
            Keep mine, over theirs
          </button>{' '}
          <button
            onClick={() => {
              drop();
              void client.invalidateQueries({ queryKey: ['revision', revision.id] });
            }}
          >
            Take theirs
          </button>
        </div>
      ) : (
        <ProblemView error={error} />
      )}
      <nav className="tabs" aria-label="Parts of the building" style={{ padding: 0, marginBottom: 12 }}>
        {SECTIONS.map(([key, name]) => (
          <a
            key={key}
            href={`?section=${key}`}
            aria-current={section === key ? 'page' : undefined}
            onClick={(event) => {
              event.preventDefault();
              setSection(key);
            }}
          >
            {name}
          </a>
        ))}
      </nav>
      {section === 'forces' && <ForcesTable {...shared} />}
      {section === 'weights' && <WeightsTable {...shared} />}
      {section === 'lines' && <LinesTable {...shared} />}
      {section === 'piers' && <PiersTable {...shared} />}
      {section === 'file' && <RawFile document={document} locked={locked} onReplace={edit} />}
      {section !== 'file' && (
        <p className="note">
          A block copied from a spreadsheet can be pasted into any cell; it fills the cells to the right and below.
        </p>
      )}
    </>
  );
}
