import { readFileSync } from 'node:fs';
import { Ajv2020 } from 'ajv/dist/2020.js';
import request from 'supertest';
import type TestAgent from 'supertest/lib/agent.js';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { CLIENT_TYPES, clientTypes } from '../../scripts/openapi/client-types.mjs';
import { demoFile, owner, PASSWORD, startService, type RevisionBody, type Service } from './service.js';

type Media = { schema: object };
type Method = 'post' | 'put' | 'patch' | 'delete';
type Operation = { responses: Record<string, { content?: Record<string, Media> }> };
type Document = { openapi: string; paths: Record<string, Record<string, Operation>> };

/** What is told to anybody. */
const OPEN = new Set(['/api/health', '/api/openapi.json', '/api/auth/get-session']);

let service: Service;
let ada: TestAgent;
let document: Document;

beforeAll(async () => {
  service = await startService({ demo: true });
  ada = await owner(service);
  document = (await request(service.url).get('/api/openapi.json').expect(200)).body as Document;
});
afterAll(() => service.stop());

const ajv = new Ajv2020({ strict: false, validateFormats: false });

function told(path: string, method: string, status: number): Operation['responses'][string] | undefined {
  return document.paths[path]?.[method]?.responses[String(status)];
}

function fits(path: string, method: string, status: number, type: string, body: unknown): void {
  const media = told(path, method, status)?.content?.[type];
  expect(media, `${method} ${path} ${status} ${type}`).toBeDefined();
  if (media === undefined) return;
  const validate = ajv.compile(media.schema);
  expect(validate(body), `${method} ${path}: ${JSON.stringify(validate.errors?.slice(0, 3))}`).toBe(true);
}

test('the dashboard’s client types are those of this document: `npm run -w web types` renews them', async () => {
  expect(readFileSync(CLIENT_TYPES, 'utf8') === (await clientTypes(document))).toBe(true);
});

test('the document names every route, and every route that it names is there', () => {
  const printed = service.app.getHttpAdapter().getInstance().printRoutes({ commonPrefix: false });
  const served = new Set<string>();
  // One line a route: its place in the tree by indentation, then its path and methods.
  const stack: string[] = [];
  for (const line of printed.split('\n')) {
    const match = /^([│ ]*)(?:├──|└──) (\S+)(?: \(([^)]*)\))?/.exec(line);
    if (match === null) continue;
    const depth = (match[1] ?? '').length / 4;
    stack.length = depth;
    stack[depth] = match[2] ?? '';
    const path = stack.join('').replaceAll(/:(\w+)/g, '{$1}');
    for (const method of (match[3] ?? '').split(', ')) {
      if (method !== '' && method !== 'HEAD' && path.startsWith('/api')) served.add(`${method} ${path}`);
    }
  }
  const documented = new Set(
    Object.entries(document.paths).flatMap(([path, operations]) =>
      Object.keys(operations).map((method) => `${method.toUpperCase()} ${path}`),
    ),
  );
  expect(served).toEqual(documented);
  expect(documented.size).toBeGreaterThan(20);
});

test('what the routes really answer fits what the document says', async () => {
  const [project] = (await ada.get('/api/projects')).body as { id: string }[];
  const revisions = (await ada.get(`/api/projects/${project?.id ?? ''}/revisions`)).body as RevisionBody[];
  const values: Record<string, string> = { projectId: project?.id ?? '', revisionId: revisions[2]?.id ?? '' };
  const fill = (path: string): string => path.replaceAll(/\{(\w+)\}/g, (_, name: string) => values[name] ?? '');
  const queries: Record<string, string> = {
    '/api/projects/{projectId}/revisions/{revisionId}/demands': '?kind=pier&limit=20',
    '/api/projects/{projectId}/revisions/{revisionId}/trace': '?member=A/L2&case=EX',
    '/api/projects/{projectId}/revisions/{revisionId}/working': '?member=A/L2&quantity=shear&case=EX&sense=1',
    '/api/projects/{projectId}/compare': `?before=${revisions[0]?.id ?? ''}&after=${revisions[1]?.id ?? ''}`,
    '/api/projects/{projectId}/history': '?member=A/L2&quantity=shear&case=EX&sense=1',
  };
  let checked = 0;
  for (const [path, operations] of Object.entries(document.paths)) {
    if (operations['get'] === undefined) continue;
    const answer = await ada.get(`${fill(path)}${queries[path] ?? ''}`).expect(200);
    const type = String(answer.headers['content-type']).split(';')[0] ?? '';
    fits(path, 'get', 200, type, type === 'text/csv' ? answer.text : answer.body);
    checked += 1;
    if (OPEN.has(path)) continue;
    const refused = await request(service.url)
      .get(`${fill(path)}${queries[path] ?? ''}`)
      .expect(401);
    fits(path, 'get', 401, 'application/problem+json', refused.body);
  }
  expect(checked).toBeGreaterThan(10);
});

test('what writes really answer fits what the document says', async () => {
  const project = '/api/projects/{projectId}';
  const revisions = `${project}/revisions`;
  const revision = `${revisions}/{revisionId}`;
  const building = JSON.parse(demoFile('1-first-design')) as object;
  const values: Record<string, string> = {};
  const write = async (method: Method, path: string, status: number, body?: object, version?: number) => {
    const asked = ada[method](path.replaceAll(/\{(\w+)\}/g, (_, name: string) => values[name] ?? ''));
    if (version !== undefined) void asked.set('if-match', `"${version}"`);
    const answer = await asked.send(body).expect(status);
    const type = (answer.headers['content-type'] ?? '').split(';')[0] ?? '';
    if (status === 204) expect(told(path, method, status)).toBeDefined();
    else fits(path, method, status, type, answer.body);
    written.add(`${method} ${path}`);
    return answer.body as { id: string; invitation: string };
  };
  const written = new Set<string>();

  values['projectId'] = (await write('post', '/api/projects', 201, { name: 'Barn' })).id;
  await write('post', '/api/projects', 400, { title: 'Barn' });
  await write('patch', project, 200, { name: 'Byre' }, 1);
  await write('patch', project, 412, { name: 'Byre' }, 1);
  await write('patch', project, 428, { name: 'Byre' });
  const { invitation } = await write('post', `${project}/members`, 200, { email: 'cy@example.org', role: 'reader' });
  await write('post', '/api/invitations', 400, { token: invitation });
  const cy = await request(service.url)
    .post('/api/invitations')
    .send({ token: invitation, name: 'Cy', password: PASSWORD })
    .expect(200);
  fits('/api/invitations', 'post', 200, 'application/json', cy.body);
  await write('post', '/api/invitations', 410, { token: invitation, name: 'Cy', password: PASSWORD });
  await write('post', '/api/owner', 410, { token: 'x', name: 'Di', email: 'di@example.org', password: PASSWORD });
  await write('post', `${project}/members`, 200, { email: 'cy@example.org', role: 'engineer' });
  const { members } = (await ada.get(`/api/projects/${values['projectId'] ?? ''}`)).body as {
    members: { userId: string; email: string }[];
  };
  values['userId'] = members.find(({ email }) => email === 'cy@example.org')?.userId ?? '';
  await write('delete', `${project}/members/{userId}`, 204);
  await write('delete', `${project}/members/{userId}`, 404);

  values['revisionId'] = (await write('post', revisions, 201, { name: 'First', building })).id;
  await write('post', revisions, 400, { name: 'Neither' });
  await write('post', revisions, 422, { name: 'Bad', building: {} });
  await write('put', `${revision}/building`, 200, building, 1);
  await write('put', `${revision}/building`, 412, building, 1);
  await write('put', `${revision}/building`, 422, {}, 2);
  await write('put', `${revision}/building`, 428, building);
  await write('patch', revision, 200, { name: 'Second' }, 2);
  await write('delete', revision, 412, undefined, 2);
  await write('post', `${revision}/issue`, 400, {}, 3);
  await write('post', `${revision}/issue`, 200, { purpose: 'For a check' }, 3);
  await write('post', `${revision}/issue`, 409, { purpose: 'For a check' }, 4);
  await write('put', `${revision}/building`, 409, building, 4);
  values['revisionId'] = (await write('post', revisions, 201, { name: 'Third', from: values['revisionId'] })).id;
  await write('delete', revision, 204, undefined, 1);

  await write('post', '/api/auth/sign-out', 200, {});
  await write('post', '/api/projects', 401, { name: 'Barn' });
  await write('post', '/api/auth/sign-in/email', 401, { email: 'ada@example.org', password: 'another password' });
  await write('post', '/api/auth/sign-in/email', 200, { email: 'ada@example.org', password: PASSWORD });

  const writes = Object.entries(document.paths).flatMap(([path, operations]) =>
    Object.keys(operations)
      .filter((method) => method !== 'get')
      .map((method) => `${method} ${path}`),
  );
  expect([...written].sort()).toEqual(writes.sort());
});

test('headers that keep a browser from doing what it should not', async () => {
  const answer = await request(service.url).get('/api/health').expect(200);
  expect(answer.headers['content-security-policy']).toContain("frame-ancestors 'none'");
  expect(answer.headers['x-content-type-options']).toBe('nosniff');
  expect(answer.headers['cache-control']).toBe('no-store');
});
