import { Building } from '@groundward/engine/building/definition';
import { z } from 'zod';
import { line, prose } from '../http/text.js';

export const RevisionState = z.enum(['draft', 'issued']);

export const Summary = z.object({
  findings: z.object({ note: z.number().int(), warning: z.number().int(), openEnd: z.number().int() }),
  worstResidual: z.number(),
  levels: z.number().int(),
  wallLines: z.number().int(),
});
export type Summary = z.infer<typeof Summary>;

export const RevisionView = z.object({
  id: z.uuid(),
  number: z.number().int(),
  name: z.string(),
  state: RevisionState,
  hash: z.string().describe('SHA-256 of the building’s canonical text, RFC 8785'),
  version: z.number().int(),
  basedOn: z.uuid().nullable(),
  createdAt: z.iso.datetime(),
  createdBy: z.string(),
  updatedAt: z.iso.datetime(),
  issuedAt: z.iso.datetime().nullable(),
  purpose: z.string().nullable(),
  remarks: z.string().nullable(),
  summary: Summary,
});
export type RevisionView = z.infer<typeof RevisionView>;

export const LatestRevision = RevisionView.pick({ id: true, number: true, name: true, state: true });
export type LatestRevision = z.infer<typeof LatestRevision>;

const RevisionName = line(200).trim().min(1);

export const NewRevision = z
  .strictObject({ name: RevisionName, from: z.uuid().optional(), building: z.unknown().optional() })
  .refine((body) => (body.from === undefined) !== (body.building === undefined), {
    error: 'name either a revision to start from or a building',
  });

export const RevisionChange = z.strictObject({ name: RevisionName });

export const IssueRequest = z.strictObject({
  purpose: prose(500).trim().min(1),
  remarks: prose(5000).trim().optional(),
});

export { Building };
