import request from 'supertest';
import type TestAgent from 'supertest/lib/agent.js';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { demoFile, invited, owner, startService, type RevisionBody, type Service } from './service.js';

type Page = { entries: { id: string; at: string; by: string | null; what: string }[]; next: string | null };

let service: Service;
let ada: TestAgent;
let project: string;

beforeAll(async () => {
  service = await startService({ demo: true });
  ada = await owner(service);
  project = ((await ada.get('/api/projects').expect(200)).body as { id: string }[])[0]?.id ?? '';
});
afterAll(() => service.stop());

const trail = async (query = ''): Promise<Page> =>
  (await ada.get(`/api/projects/${project}/audit${query}`).expect(200)).body as Page;

test('every write is there, the latest first, with its author', async () => {
  const made = (
    await ada
      .post(`/api/projects/${project}/revisions`)
      .send({ name: 'Tried', building: JSON.parse(demoFile('1-first-design')) as unknown })
      .expect(201)
  ).body as RevisionBody;
  const at = `/api/projects/${project}/revisions/${made.id}`;
  await ada
    .put(`${at}/building`)
    .set('if-match', '"1"')
    .set('content-type', 'application/json')
    .send(demoFile('2-client-changes'))
    .expect(200);
  await ada.patch(at).set('if-match', '"2"').send({ name: 'Tried twice' }).expect(200);
  await ada.post(`${at}/issue`).set('if-match', '"3"').send({ purpose: 'a look' }).expect(200);
  const { entries } = await trail();
  const said = entries.slice(0, 4).map(({ what }) => what);
  expect(said[0]).toMatch(/^Revision 4 “Tried twice”: issued for a look$/);
  expect(said[1]).toMatch(/^Revision 4 “Tried twice”: renamed from “Tried”$/);
  expect(said[2]).toMatch(/^Revision 4 “Tried”: building saved, hash [0-9a-f]{12} → [0-9a-f]{12}$/);
  expect(said[3]).toMatch(/^Revision 4 “Tried” made, hash [0-9a-f]{12}$/);
  for (const { by } of entries.slice(0, 4)) expect(by).toBe('Ada Marsh');
  expect(entries[entries.length - 1]).toMatchObject({
    by: 'Demo',
    what: 'Project “Demo: Ropewalk Yard, House 2” made',
  });
});

test('page by page, nothing twice and nothing left out', async () => {
  const whole = (await trail('?limit=500')).entries.map(({ id }) => id);
  const seen: string[] = [];
  let next: string | null = '';
  while (next !== null) {
    const page: Page = await trail(`?limit=3${next === '' ? '' : `&before=${next}`}`);
    seen.push(...page.entries.map(({ id }) => id));
    next = page.next;
  }
  expect(seen).toEqual(whole);
});

test('members come, change and go by name', async () => {
  await invited(service, ada, project, 'Bea', 'engineer');
  const said = (await trail()).entries.slice(0, 4).map(({ by, what }) => `${by ?? 'nobody'}: ${what}`);
  expect(said.some((entry) => / let in as engineer$/.test(entry))).toBe(true);
  expect(said.some((entry) => /^Ada Marsh: Invitation made for bea@example.org as engineer$/.test(entry))).toBe(true);
});

test('what is written past the service stands there without a name, and the trail itself cannot be changed', async () => {
  await service.sql.query(`UPDATE "project" SET "name" = 'Quietly renamed' WHERE "id" = $1`, [project]);
  expect((await trail()).entries[0]).toMatchObject({
    by: null,
    what: 'Project renamed from “Demo: Ropewalk Yard, House 2” to “Quietly renamed”',
  });
  for (const statement of [`UPDATE "audit" SET "actor_name" = 'Ada'`, `DELETE FROM "audit"`, `TRUNCATE "audit"`]) {
    await expect(service.sql.query(statement)).rejects.toThrow('only added to');
  }
});

test('a reader and a stranger do not see it', async () => {
  const reader = await invited(service, ada, project, 'Rob', 'reader');
  await reader.get(`/api/projects/${project}/audit`).expect(403);
  await request(service.url).get(`/api/projects/${project}/audit`).expect(401);
});
