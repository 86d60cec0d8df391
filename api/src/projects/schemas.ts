import { z } from 'zod';
import { Role } from '../access/roles.js';
import { line } from '../http/text.js';
import { LatestRevision } from '../revisions/schemas.js';

export const ProjectName = line(200).trim().min(1);

export const ProjectRequest = z.strictObject({ name: ProjectName });

export const ProjectSummary = z.object({
  id: z.uuid(),
  name: z.string(),
  role: Role,
  updatedAt: z.iso.datetime(),
  latest: LatestRevision.nullable(),
});
export type ProjectSummary = z.infer<typeof ProjectSummary>;

export const Member = z.object({ userId: z.string(), name: z.string(), email: z.string(), role: Role });
export type Member = z.infer<typeof Member>;

export const ProjectDetail = z.object({
  id: z.uuid(),
  name: z.string(),
  role: Role,
  version: z.number().int(),
  members: z.array(Member),
});
export type ProjectDetail = z.infer<typeof ProjectDetail>;

export const MemberRequest = z.strictObject({ email: z.email().max(200), role: Role });

export const MemberAnswer = z.object({
  member: Member.nullable(),
  invitation: z.string().nullable().describe('A one-time token for somebody without an account'),
});
export type MemberAnswer = z.infer<typeof MemberAnswer>;
