/** People at their browsers: each an agent that keeps its cookies. */
import request from 'supertest';
import type TestAgent from 'supertest/lib/agent.js';
import type { Serving } from '../../api/dist/main.js';

type Place = Pick<Serving, 'url' | 'ownerLink'>;

export const PASSWORD = 'a long password';

/** Somebody who is not signed in. */
export function visitor({ url }: Place): TestAgent {
  return request.agent(url);
}

export function tokenIn(link: string | undefined): string {
  return link === undefined ? '' : (new URL(link).searchParams.get('token') ?? '');
}

/** Ada, the first owner, by the link of the first start. */
export async function owner(service: Place): Promise<TestAgent> {
  const agent = visitor(service);
  const token = tokenIn(service.ownerLink);
  await agent
    .post('/api/owner')
    .send({ token, name: 'Ada Marsh', email: 'ada@example.org', password: PASSWORD })
    .expect(200);
  return agent;
}

/** Somebody without an account until now, invited to a project and in. */
export async function invited(
  service: Place,
  by: TestAgent,
  projectId: string,
  name: string,
  role: string,
): Promise<TestAgent> {
  const email = `${name.toLowerCase()}@example.org`;
  const answer = await by.post(`/api/projects/${projectId}/members`).send({ email, role }).expect(200);
  const agent = visitor(service);
  const { invitation } = answer.body as { invitation: string };
  await agent.post('/api/invitations').send({ token: invitation, name, password: PASSWORD }).expect(200);
  return agent;
}

export async function newProject(by: TestAgent, name = 'Weir Street 4'): Promise<string> {
  const answer = await by.post('/api/projects').send({ name }).expect(201);
  return (answer.body as { id: string }).id;
}

/** A new draft of a building; answers the address of the revision. */
export async function newDraft(by: TestAgent, projectId: string, building: unknown, name = 'First'): Promise<string> {
  const revisions = `/api/projects/${projectId}/revisions`;
  const answer = await by.post(revisions).send({ name, building }).expect(201);
  return `${revisions}/${(answer.body as { id: string }).id}`;
}

export const idOf = (revision: string): string => revision.split('/').at(-1) ?? '';
