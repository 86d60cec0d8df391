import Link from 'next/link';
import type { Revision } from '@/lib/api';
import { scientific, shortHash, when } from '@/lib/format';
import { Table } from './table';
import { FindingCounts, StateTag } from './title-block';

export type RevisionActions = {
  readonly revise: (revision: Revision) => void;
  readonly rename: (revision: Revision) => void;
  readonly issue: (revision: Revision) => void;
  readonly remove: (revision: Revision) => void;
};

/** The revisions of a project, two of which can be picked to be compared. */
export function RevisionTable({
  revisions,
  root,
  picked,
  onPick,
  actions,
}: {
  readonly revisions: readonly Revision[];
  readonly root: string;
  readonly picked: readonly string[];
  readonly onPick: (id: string) => void;
  /** Left out for those who may only read. */
  readonly actions: RevisionActions | undefined;
}) {
  return (
    <Table label="Revisions">
      <thead>
        <tr>
          <th aria-label="Compare" />
          <th className="n">No.</th>
          <th>Revision</th>
          <th>State</th>
          <th>Findings</th>
          <th className="n">Residual</th>
          <th>Purpose</th>
          <th>By</th>
          <th>Date</th>
          <th>Hash</th>
          <th aria-label="Actions" />
        </tr>
      </thead>
      <tbody>
        {revisions.map((revision) => (
          <tr key={revision.id}>
            <td>
              <input
                type="checkbox"
                aria-label={`Compare revision ${revision.number}`}
                checked={picked.includes(revision.id)}
                onChange={() => onPick(revision.id)}
              />
            </td>
            <td className="n">{revision.number}</td>
            <th scope="row" className="wrap">
              <Link href={`${root}/${revision.id}/level`}>{revision.name}</Link>
              {revision.remarks !== null && <div className="note">{revision.remarks}</div>}
            </th>
            <td>
              <StateTag state={revision.state} />
            </td>
            <td>
              <Link href={`${root}/${revision.id}/findings`}>
                <FindingCounts findings={revision.summary.findings} />
              </Link>
            </td>
            <td className="n">
              <Link href={`${root}/${revision.id}/findings#certificate`}>
                {scientific(revision.summary.worstResidual)}
              </Link>
            </td>
            <td className="wrap short">{revision.purpose ?? ''}</td>
            <td>{revision.createdBy}</td>
            <td>{when(revision.issuedAt ?? revision.updatedAt)}</td>
            <td className="mono" title={revision.hash}>
              {shortHash(revision.hash)}
            </td>
            <td>{actions !== undefined && <Actions revision={revision} actions={actions} />}</td>
          </tr>
        ))}
        {revisions.length === 0 && (
          <tr>
            <td colSpan={11}>No revision yet: upload a building file.</td>
          </tr>
        )}
      </tbody>
    </Table>
  );
}

function Actions({ revision, actions }: { readonly revision: Revision; readonly actions: RevisionActions }) {
  const draft = revision.state === 'draft';
  return (
    <span className="actions">
      <button className="quiet" onClick={() => actions.revise(revision)}>
        Revise
      </button>
      {draft && (
        <button className="quiet" onClick={() => actions.rename(revision)}>
          Rename …
        </button>
      )}
      {draft && (
        <button className="quiet" onClick={() => actions.issue(revision)}>
          Issue …
        </button>
      )}
      {draft && (
        <button className="quiet" onClick={() => actions.remove(revision)}>
          Delete
        </button>
      )}
    </span>
  );
}
