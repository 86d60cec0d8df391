import type { Revision } from '../generated/client.js';
import type { RevisionView, Summary } from './schemas.js';

/** A revision without its building, as the service shows it. */
export type RevisionRow = Omit<Revision, 'building'>;

/** The columns of a revision but its building, which may be large. */
export const REVISION_COLUMNS = {
  id: true,
  projectId: true,
  number: true,
  name: true,
  state: true,
  hash: true,
  version: true,
  basedOn: true,
  createdAt: true,
  createdBy: true,
  updatedAt: true,
  issuedAt: true,
  purpose: true,
  remarks: true,
  summary: true,
} as const;

export function revisionView(row: RevisionRow): RevisionView {
  return {
    id: row.id,
    number: row.number,
    name: row.name,
    state: row.state,
    hash: row.hash,
    version: row.version,
    basedOn: row.basedOn,
    createdAt: row.createdAt.toISOString(),
    createdBy: row.createdBy,
    updatedAt: row.updatedAt.toISOString(),
    issuedAt: row.issuedAt?.toISOString() ?? null,
    purpose: row.purpose,
    remarks: row.remarks,
    summary: row.summary as Summary,
  };
}
