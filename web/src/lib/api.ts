/** The service, by its HTTP interface alone; the types are generated from its OpenAPI document. */
import type { Building } from '@groundward/engine/building/definition';
import type { Fault } from '@groundward/engine/building/fault';
import type { Analysis } from '@groundward/engine/path/result';
import type { Trace } from '@groundward/engine/path/trace-result';
import type { Comparison } from '@groundward/engine/compare/result';
import type { Foundation } from '@groundward/engine/foundation/result';
import type { Working } from '@groundward/engine/working/result';
import type { paths } from '../api-types';

type Json<
  Path extends keyof paths,
  Method extends keyof paths[Path],
  Status extends number,
> = paths[Path][Method] extends {
  responses: Record<Status, { content: { 'application/json': infer Body } }>;
}
  ? Body
  : never;

export type Me = Json<'/api/me', 'get', 200>;
export type ProjectSummary = Json<'/api/projects', 'get', 200>[number];
export type ProjectDetail = Json<'/api/projects/{projectId}', 'get', 200>;
export type Revision = Json<'/api/projects/{projectId}/revisions/{revisionId}', 'get', 200>;
export type History = Json<'/api/projects/{projectId}/history', 'get', 200>;
export type AuditPage = Json<'/api/projects/{projectId}/audit', 'get', 200>;
export type MemberAnswer = Json<'/api/projects/{projectId}/members', 'post', 200>;
export type Role = ProjectDetail['role'];

/** A problem as the service tells it. */
export class ApiProblem extends Error {
  readonly status: number;
  readonly code: string;
  readonly faults: readonly Fault[];
  readonly current: unknown;

  constructor(status: number, body: { code?: string; detail?: string; faults?: Fault[]; current?: unknown }) {
    super(body.detail ?? `The service answered ${status}.`);
    this.status = status;
    this.code = body.code ?? 'unknown';
    this.faults = body.faults ?? [];
    this.current = body.current;
  }
}

type Options = { readonly method?: string; readonly body?: unknown; readonly version?: number | undefined };

async function call(path: string, { method = 'GET', body, version }: Options = {}): Promise<unknown> {
  const headers: Record<string, string> = {};
  if (body !== undefined) headers['content-type'] = 'application/json';
  if (version !== undefined) headers['if-match'] = `"${version}"`;
  const response = await fetch(path, {
    method,
    headers,
    ...(body === undefined ? {} : { body: typeof body === 'string' ? body : JSON.stringify(body) }),
  });
  const text = await response.text();
  const answer: unknown = text === '' ? undefined : parsed(text);
  if (!response.ok) throw new ApiProblem(response.status, answer ?? {});
  return answer;
}

function parsed(text: string): unknown {
  try {
    return JSON.parse(text);
  } catch {
    return { detail: text.slice(0, 200) };
  }
}

const project = (id: string): string => `/api/projects/${encodeURIComponent(id)}`;
const revision = (projectId: string, id: string): string => `${project(projectId)}/revisions/${encodeURIComponent(id)}`;

export type Saved = { readonly building: Building; readonly revision: Revision };

export const api = {
  me: () => call('/api/me') as Promise<Me>,
  signIn: (email: string, password: string) =>
    call('/api/auth/sign-in/email', { method: 'POST', body: { email, password } }),
  signOut: () => call('/api/auth/sign-out', { method: 'POST', body: {} }),
  becomeOwner: (body: { token: string; name: string; email: string; password: string }) =>
    call('/api/owner', { method: 'POST', body }),
  acceptInvitation: (body: { token: string; name: string; password: string }) =>
    call('/api/invitations', { method: 'POST', body }),
  projects: () => call('/api/projects') as Promise<ProjectSummary[]>,
  createProject: (name: string) => call('/api/projects', { method: 'POST', body: { name } }) as Promise<ProjectDetail>,
  project: (id: string) => call(project(id)) as Promise<ProjectDetail>,
  addMember: (id: string, email: string, role: Role) =>
    call(`${project(id)}/members`, { method: 'POST', body: { email, role } }) as Promise<MemberAnswer>,
  removeMember: (id: string, userId: string) =>
    call(`${project(id)}/members/${encodeURIComponent(userId)}`, { method: 'DELETE' }),
  audit: (id: string, before: string) =>
    call(`${project(id)}/audit?limit=30${before === '' ? '' : `&before=${before}`}`) as Promise<AuditPage>,
  revisions: (id: string) => call(`${project(id)}/revisions`) as Promise<Revision[]>,
  createRevision: (id: string, body: { name: string; from?: string; building?: unknown }) =>
    call(`${project(id)}/revisions`, { method: 'POST', body }) as Promise<Revision>,
  revision: (projectId: string, id: string) => call(revision(projectId, id)) as Promise<Revision>,
  renameRevision: (projectId: string, id: string, version: number, name: string) =>
    call(revision(projectId, id), { method: 'PATCH', body: { name }, version }) as Promise<Revision>,
  removeRevision: (projectId: string, id: string, version: number) =>
    call(revision(projectId, id), { method: 'DELETE', version }),
  building: (projectId: string, id: string) => call(`${revision(projectId, id)}/building`) as Promise<Building>,
  save: (projectId: string, id: string, text: string, version: number) =>
    call(`${revision(projectId, id)}/building`, { method: 'PUT', body: text, version }) as Promise<Revision>,
  issue: (projectId: string, id: string, version: number, body: { purpose: string; remarks?: string }) =>
    call(`${revision(projectId, id)}/issue`, { method: 'POST', body, version }) as Promise<Revision>,
  analysis: (projectId: string, id: string) => call(`${revision(projectId, id)}/analysis`) as Promise<Analysis>,
  trace: (projectId: string, id: string, member: string, caseId: string) =>
    call(`${revision(projectId, id)}/trace?${new URLSearchParams({ member, case: caseId })}`) as Promise<Trace>,
  working: (projectId: string, id: string, query: Readonly<Record<string, string>>) =>
    call(`${revision(projectId, id)}/working?${new URLSearchParams(query)}`) as Promise<Working>,
  foundation: (projectId: string, id: string) => call(`${revision(projectId, id)}/foundation`) as Promise<Foundation>,
  compare: (projectId: string, before: string, after: string) =>
    call(`${project(projectId)}/compare?${new URLSearchParams({ before, after })}`) as Promise<Comparison>,
  /** The comparison with the share of every edit in every change: many analyses, so it may take a while. */
  causes: (projectId: string, before: string, after: string) =>
    call(
      `${project(projectId)}/compare?${new URLSearchParams({ before, after, causes: 'true' })}`,
    ) as Promise<Comparison>,
  history: (
    projectId: string,
    query: { member: string; quantity: string; case: string; sense: string; combination?: string },
  ) => call(`${project(projectId)}/history?${new URLSearchParams(query)}`) as Promise<History>,
  downloadHref: (projectId: string, id: string) => `${revision(projectId, id)}/building?download=1`,
  csvHref: (projectId: string, id: string) => `${revision(projectId, id)}/foundation.csv`,
};
