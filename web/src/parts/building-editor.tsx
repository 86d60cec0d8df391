'use client';
import type { Building } from '@groundward/engine/building/definition';
import { useEffect, useState, type ChangeEvent } from 'react';
import { ApiProblem, api, type Revision } from '@/lib/api';
import { currentOf, useDraft, type Draft } from '@/lib/draft';
import { when } from '@/lib/format';
import { useQueryPatch, useQueryState } from '@/lib/query-state';
import { useRevision } from '@/lib/revision-data';
import type { SchemaNode } from '@/lib/schema';
import { AssembliesForm, BasisForm } from '@/parts/basis-form';
import { ForcesTable, LevelsTable, LinesTable, partsOf, WeightsTable } from '@/parts/building-tables';
import type { Editing } from '@/parts/edit-table';
import { MemberForm, memberAt } from '@/parts/member-form';
import { PiersTable } from '@/parts/piers-table';
import { Pending, ProblemView } from '@/parts/problem';
import { RawFile } from '@/parts/raw-file';

export function BuildingEditor({ schema }: { readonly schema: SchemaNode }) {
  const { projectId, revisionId, revision, building, error } = useRevision();
  if (revision === undefined || building === undefined) return <Pending error={error} what="the building" />;
  return (
    <Editor
      key={`${revisionId} ${revision.version}`}
      schema={schema}
      projectId={projectId}
      revision={revision}
      saved={building}
    />
  );
}

const SECTIONS = [
  ['forces', 'Forces'],
  ['levels', 'Levels'],
  ['weights', 'Floors and weights'],
  ['lines', 'Wall lines'],
  ['piers', 'Piers'],
  ['basis', 'Basis and load cases'],
  ['assemblies', 'Assemblies'],
  ['member', 'One member in full'],
  ['file', 'The file itself'],
] as const;

/** Sections of tables, into which a block from a spreadsheet can be pasted. */
const TABLES: readonly string[] = ['forces', 'levels', 'weights', 'lines', 'piers'];

/** Where the tables and forms show a place of the file. */
function sectionOf(path: string): (typeof SECTIONS)[number][0] {
  if (/^loadCases\[\d+\]\.forces/.test(path)) return 'forces';
  if (
    /^wallLines\[\d+\]\.storeys\[\d+\]\.piers\[\d+\]\.(from|to|assembly|holdDown|stiffness|endOffset|gravity)/.test(
      path,
    )
  )
    return 'piers';
  if (/^wallLines\[\d+\]\.(name|axis|shareBy)/.test(path)) return 'lines';
  if (/^levels\[\d+\]\.(name|elevation)/.test(path)) return 'levels';
  if (/^levels\[\d+\]\.diaphragms\[\d+\]\.(weight|behaviour|assembly)/.test(path)) return 'weights';
  if (/^(levels|wallLines)\[\d+\]/.test(path)) return 'member';
  if (/^assemblies/.test(path)) return 'assemblies';
  return path === '' || /^(schema|levels|wallLines)$/.test(path) ? 'file' : 'basis';
}

function Editor({
  schema,
  projectId,
  revision,
  saved,
}: {
  readonly schema: SchemaNode;
  readonly projectId: string;
  readonly revision: Revision;
  readonly saved: Building;
}) {
  const draft = useDraft(projectId, revision, saved);
  const patch = useQueryPatch();
  const [section] = useQueryState('section', 'piers');
  const [target, setTarget] = useState('');
  const locked = revision.state === 'issued';
  useEffect(() => {
    if (target === '') return;
    const field = window.document.querySelector<HTMLElement>(`[data-path="${CSS.escape(target)}"]`);
    if (field === null) {
      if (section === 'file') setTarget('');
      return;
    }
    field.scrollIntoView({ block: 'center' });
    field.focus();
    setTarget('');
  }, [target, section]);
  const goTo = (path: string): void => {
    const line = /^wallLines\[(\d+)\]\.storeys/.exec(path)?.[1];
    const id = line === undefined ? undefined : partsOf(draft.document).wallLines[Number(line)]?.id;
    patch({ section: sectionOf(path), ...(id === undefined ? {} : { line: id }), ...memberAt(draft.document, path) });
    setTarget(path);
  };
  const editing: Editing = {
    document: draft.document,
    saved,
    faults: draft.error instanceof ApiProblem ? draft.error.faults : [],
    locked,
    onChange: draft.change,
  };
  return (
    <>
      <Bar projectId={projectId} revision={revision} draft={draft} locked={locked} />
      <Trouble draft={draft} onGo={goTo} />
      <nav className="tabs inner" aria-label="Parts of the building">
        {SECTIONS.map(([key, name]) => (
          <a
            key={key}
            href={`?section=${key}`}
            aria-current={section === key ? 'page' : undefined}
            onClick={(event) => {
              event.preventDefault();
              patch({ section: key });
            }}
          >
            {name}
          </a>
        ))}
      </nav>
      {section === 'forces' && <ForcesTable {...editing} />}
      {section === 'levels' && <LevelsTable {...editing} />}
      {section === 'weights' && <WeightsTable {...editing} />}
      {section === 'lines' && <LinesTable {...editing} />}
      {section === 'piers' && <PiersTable {...editing} />}
      {section === 'basis' && <BasisForm schema={schema} editing={editing} />}
      {section === 'assemblies' && <AssembliesForm schema={schema} editing={editing} />}
      {section === 'member' && <MemberForm schema={schema} editing={editing} />}
      {section === 'file' && (
        <RawFile
          key={draft.round}
          document={draft.document}
          locked={locked}
          onReplace={(next) => draft.replace(next)}
        />
      )}
      {TABLES.includes(section) && !locked && (
        <p className="note" style={{ marginTop: 10 }}>
          A block copied from a spreadsheet goes into the cell that has the focus and those right of it and below; Enter
          and the arrows go from row to row. What differs from the saved building is bold.
        </p>
      )}
    </>
  );
}

function Bar({
  projectId,
  revision,
  draft,
  locked,
}: {
  readonly projectId: string;
  readonly revision: Revision;
  readonly draft: Draft;
  readonly locked: boolean;
}) {
  const upload = async (event: ChangeEvent<HTMLInputElement>): Promise<void> => {
    const file = event.target.files?.[0];
    if (file === undefined) return;
    event.target.value = '';
    try {
      draft.replace(JSON.parse(await file.text()), `${file.name} is in the editor; it is checked when you save.`);
    } catch {
      draft.fail(new Error(`${file.name} is not JSON.`));
    }
  };
  return (
    <div className="bar">
      {!locked && (
        <button className="primary" disabled={!draft.dirty || draft.busy} onClick={() => void draft.save()}>
          {draft.busy ? 'Saving and analysing …' : 'Save and analyse'}
        </button>
      )}
      {!locked && draft.dirty && (
        <button disabled={draft.busy} onClick={draft.drop}>
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
          : draft.dirty
            ? 'Changed, not saved; kept in this browser.'
            : 'Saved.'}{' '}
        {draft.message}
      </span>
    </div>
  );
}

/** Faults with a way to their field; or somebody else’s save, and what to do about it. */
function Trouble({ draft, onGo }: { readonly draft: Draft; readonly onGo: (path: string) => void }) {
  const theirs = currentOf(draft.error);
  if (theirs === undefined) return <ProblemView error={draft.error} onGo={onGo} />;
  return (
    <div className="problem" role="alert">
      {`Somebody else saved this revision on ${when(theirs.updatedAt)}. What you typed is still here.`}{' '}
      <button onClick={draft.overrule}>Keep mine, over theirs</button>{' '}
      <button onClick={() => void draft.yieldToTheirs()}>Take theirs</button>
    </div>
  );
}
