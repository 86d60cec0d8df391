import { Ajv2020 } from 'ajv/dist/2020.js';
import request from 'supertest';
import type TestAgent from 'supertest/lib/agent.js';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { AUTH_ROUTES } from '../../api/dist/http/auth-routes.js';
import { owner, startService, type RevisionBody, type Service } from './service.js';

type Media = { schema: object };
type Operation = { responses: Record<string, { content?: Record<string, Media> }> };
type Document = { openapi: string; paths: Record<string, Record<string, Operation>> };

let service: Service;
let ada: TestAgent;
let document: Document;

beforeAll(async () => {
  service = await startService({ demo: true });
  ada = await owner(service);
  document = (await request(service.url).get('/api/openapi.json').expect(200)).body as Document;
});
afterAll(() => service.stop());

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
  for (const { method, url } of AUTH_ROUTES) served.delete(`${method} ${url}`);
  served.delete('GET /api/openapi.json');
  const told = new Set(
    Object.entries(document.paths).flatMap(([path, operations]) =>
      Object.keys(operations).map((method) => `${method.toUpperCase()} ${path}`),
    ),
  );
  expect(served).toEqual(told);
  expect(told.size).toBeGreaterThan(15);
});

test('what the routes really answer fits what the document says', async () => {
  const ajv = new Ajv2020({ strict: false, validateFormats: false });
  const [project] = (await ada.get('/api/projects')).body as { id: string }[];
  const revisions = (await ada.get(`/api/projects/${project?.id ?? ''}/revisions`)).body as RevisionBody[];
  const values: Record<string, string> = { projectId: project?.id ?? '', revisionId: revisions[2]?.id ?? '' };
  const fill = (path: string): string => path.replaceAll(/\{(\w+)\}/g, (_, name: string) => values[name] ?? '');
  const queries: Record<string, string> = {
    '/api/projects/{projectId}/revisions/{revisionId}/demands': '?kind=pier&limit=20',
    '/api/projects/{projectId}/revisions/{revisionId}/trace': '?member=A/L2&case=EX',
    '/api/projects/{projectId}/compare': `?before=${revisions[0]?.id ?? ''}&after=${revisions[1]?.id ?? ''}`,
    '/api/projects/{projectId}/history': '?member=A/L2&quantity=shear&case=EX&sense=1',
  };
  const fits = (path: string, method: string, status: number, type: string, body: unknown): void => {
    const media = document.paths[path]?.[method]?.responses[String(status)]?.content?.[type];
    expect(media, `${method} ${path} ${status} ${type}`).toBeDefined();
    if (media === undefined) return;
    const validate = ajv.compile(media.schema);
    expect(validate(body), `${method} ${path}: ${JSON.stringify(validate.errors?.slice(0, 3))}`).toBe(true);
  };
  let checked = 0;
  for (const [path, operations] of Object.entries(document.paths)) {
    if (operations['get'] === undefined) continue;
    const answer = await ada.get(`${fill(path)}${queries[path] ?? ''}`).expect(200);
    const type = String(answer.headers['content-type']).split(';')[0] ?? '';
    fits(path, 'get', 200, type, type === 'text/csv' ? answer.text : answer.body);
    checked += 1;
    if (path === '/api/health') continue;
    const refused = await request(service.url)
      .get(`${fill(path)}${queries[path] ?? ''}`)
      .expect(401);
    fits(path, 'get', 401, 'application/problem+json', refused.body);
  }
  expect(checked).toBeGreaterThan(10);
  const url = '/api/projects/{projectId}/revisions/{revisionId}';
  const put = await ada
    .put(`${fill(url)}/building`)
    .set('content-type', 'application/json')
    .set('if-match', '"1"')
    .send('{}')
    .expect(422);
  fits(`${url}/building`, 'put', 422, 'application/problem+json', put.body);
  const stale = await ada.patch(fill(url)).set('if-match', '"999"').send({ name: 'x' }).expect(412);
  fits(url, 'patch', 412, 'application/problem+json', stale.body);
  const made = await ada
    .post(fill('/api/projects/{projectId}/revisions'))
    .send({ name: 'x', from: values['revisionId'] })
    .expect(201);
  fits('/api/projects/{projectId}/revisions', 'post', 201, 'application/json', made.body);
});

test('health tests the database', async () => {
  expect((await request(service.url).get('/api/health').expect(200)).body).toMatchObject({
    status: 'ok',
    database: 'ok',
  });
  await service.sql.query('ALTER TABLE "project" RENAME TO "project_away"');
  try {
    const down = await request(service.url).get('/api/health').expect(503);
    expect(down.body).toMatchObject({ code: 'database-down' });
  } finally {
    await service.sql.query('ALTER TABLE "project_away" RENAME TO "project"');
  }
  await request(service.url).get('/api/health').expect(200);
});

test('headers that keep a browser from doing what it should not', async () => {
  const answer = await request(service.url).get('/api/health').expect(200);
  expect(answer.headers['content-security-policy']).toContain("frame-ancestors 'none'");
  expect(answer.headers['x-content-type-options']).toBe('nosniff');
  expect(answer.headers['cache-control']).toBe('no-store');
});
