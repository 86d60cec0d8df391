/** People at their browsers: each an agent that keeps its cookies. */
import request from 'supertest';
import type TestAgent from 'supertest/lib/agent.js';
import type { Role } from '../../api/src/access/roles.js';
import type { TestService } from './service.js';

export type Person = TestAgent;

export const PASSWORD = 'a long password';

export function visitor({ url }: Pick<TestService, 'url'>): Person {
  return request.agent(url);
}

/** The first owner, by the link of the first start. */
export async function firstOwner(service: TestService, email = 'eve@example.org'): Promise<Person> {
  const person = visitor(service);
  await person
    .post('/api/owner')
    .send({ token: tokenIn(service.ownerLink), name: 'Eve', email, password: PASSWORD })
    .expect(200);
  return person;
}

export function tokenIn(link: string | undefined): string {
  return new URL(link ?? 'http://no.link/').searchParams.get('token') ?? '';
}

/** Somebody without an account, invited to a project and now its member. */
export async function invited(
  service: TestService,
  by: Person,
  projectId: string,
  email: string,
  role: Role,
): Promise<Person> {
  const { body } = await by.post(`/api/projects/${projectId}/members`).send({ email, role }).expect(200);
  const person = visitor(service);
  const { invitation } = body as { invitation: string };
  await person.post('/api/invitations').send({ token: invitation, name: email, password: PASSWORD }).expect(200);
  return person;
}

export async function newProject(person: Person, name = 'Weir Street 4'): Promise<string> {
  const { body } = await person.post('/api/projects').send({ name }).expect(201);
  return (body as { id: string }).id;
}

/** A new draft of a building; answers the address of the revision. */
export async function newDraft(person: Person, projectId: string, building: unknown, name = 'First'): Promise<string> {
  const revisions = `/api/projects/${projectId}/revisions`;
  const { body } = await person.post(revisions).send({ name, building }).expect(201);
  return `${revisions}/${(body as { id: string }).id}`;
}

export const idOf = (revision: string): string => revision.split('/').at(-1) ?? '';
