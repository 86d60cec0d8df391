import request from 'supertest';
import type TestAgent from 'supertest/lib/agent.js';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { demoFile, invited, owner, PASSWORD, startService, type RevisionBody, type Service } from './service.js';

let service: Service;
let ada: TestAgent;
let project: string;
let first: RevisionBody;

beforeAll(async () => {
  service = await startService({ demo: true });
  ada = await owner(service);
  project = ((await ada.get('/api/projects')).body as { id: string }[])[0]?.id ?? '';
  first = ((await ada.get(`/api/projects/${project}/revisions`)).body as RevisionBody[])[0] as RevisionBody;
});
afterAll(() => service.stop());

describe('accounts', () => {
  test('the owner’s link works once', async () => {
    const token = new URL(service.ownerLink ?? '').searchParams.get('token');
    await request(service.url)
      .post('/api/owner')
      .send({ token, name: 'Eve', email: 'eve@example.org', password: PASSWORD })
      .expect(410);
    await request(service.url)
      .post('/api/owner')
      .send({ token: 'guess', name: 'Eve', email: 'eve@example.org', password: PASSWORD })
      .expect(410);
  });

  test('sign-in with a session; a wrong password, nobody’s address and no session are refused', async () => {
    const agent = request.agent(service.url);
    await agent.get('/api/me').expect(401);
    await agent
      .post('/api/auth/sign-in/email')
      .send({ email: 'ada@example.org', password: 'another password' })
      .expect(401);
    await agent.post('/api/auth/sign-in/email').send({ email: 'nobody@example.org', password: PASSWORD }).expect(401);
    const answer = await agent
      .post('/api/auth/sign-in/email')
      .send({ email: 'ada@example.org', password: PASSWORD })
      .expect(200);
    const cookie = String(answer.headers['set-cookie']);
    expect(cookie).toContain('HttpOnly');
    expect(cookie).toMatch(/SameSite=Lax/i);
    expect((await agent.get('/api/me').expect(200)).body).toMatchObject({
      name: 'Ada Marsh',
      email: 'ada@example.org',
    });
    await agent.post('/api/auth/sign-out').send({}).expect(200);
    await agent.get('/api/me').expect(401);
  });

  test('nobody makes an account without a link', async () => {
    await request(service.url)
      .post('/api/auth/sign-up/email')
      .send({ name: 'Eve', email: 'eve@example.org', password: PASSWORD })
      .expect(404);
  });

  test('a write from another site is refused', async () => {
    await ada.post('/api/projects').set('origin', 'http://elsewhere.example').send({ name: 'Theirs' }).expect(403);
  });

  test('no password and no token stands in the database as it is', async () => {
    const token = new URL(service.ownerLink ?? '').searchParams.get('token') ?? '';
    const { rows } = await service.sql.query<{ all: string }>(
      `SELECT string_agg("t"::text, ' ') AS "all" FROM (SELECT "account"::text AS "t" FROM "account" UNION ALL SELECT "link"::text FROM "link") AS "s"`,
    );
    expect(rows[0]?.all).not.toContain(PASSWORD);
    expect(rows[0]?.all).not.toContain(token);
  });
});

describe('one project’s people cannot see another’s', () => {
  test('neither the list nor any of its addresses', async () => {
    const other = (await ada.post('/api/projects').send({ name: 'Other house' }).expect(201)).body as { id: string };
    const bo = await invited(service, ada, other.id, 'Bo', 'owner');
    expect(((await bo.get('/api/projects').expect(200)).body as { id: string }[]).map(({ id }) => id)).toEqual([
      other.id,
    ]);
    const revision = `/api/projects/${project}/revisions/${first.id}`;
    for (const path of [
      `/api/projects/${project}`,
      `/api/projects/${project}/revisions`,
      revision,
      `${revision}/building`,
      `${revision}/analysis`,
      `${revision}/demands`,
      `${revision}/trace?member=A/L2&case=EX`,
      `${revision}/foundation`,
      `${revision}/foundation.csv`,
      `/api/projects/${project}/compare?before=${first.id}&after=${first.id}`,
      `/api/projects/${project}/history?member=A/L2&quantity=shear&case=EX&sense=1`,
      // A revision of another project under one's own.
      `/api/projects/${other.id}/revisions/${first.id}`,
      `/api/projects/${other.id}/revisions/${first.id}/building`,
    ]) {
      await bo.get(path).expect(404);
      await request(service.url).get(path).expect(401);
    }
    await bo
      .put(`${revision}/building`)
      .set('content-type', 'application/json')
      .set('if-match', '"1"')
      .send(demoFile('1-first-design'))
      .expect(404);
    await bo.post(`/api/projects/${project}/revisions`).send({ name: 'x', from: first.id }).expect(404);
    await bo.post(`/api/projects/${other.id}/revisions`).send({ name: 'x', from: first.id }).expect(404);
  });
});

describe('roles', () => {
  test.each([
    ['engineer', 201, 403],
    ['checker', 403, 403],
    ['foundation-designer', 403, 403],
    ['reader', 403, 403],
  ])('%s: reads; a new revision answers %d, letting in others %d', async (role, write, manage) => {
    const agent = await invited(service, ada, project, `New-${role}`, role);
    await agent.get(`/api/projects/${project}/revisions/${first.id}/foundation`).expect(200);
    await agent.post(`/api/projects/${project}/revisions`).send({ name: 'Tried', from: first.id }).expect(write);
    await agent
      .post(`/api/projects/${project}/members`)
      .send({ email: 'x@example.org', role: 'reader' })
      .expect(manage);
  });

  test('a project keeps an owner', async () => {
    const me = (await ada.get('/api/me')).body as { id: string };
    await ada.delete(`/api/projects/${project}/members/${me.id}`).expect(409);
    await ada.post(`/api/projects/${project}/members`).send({ email: 'ada@example.org', role: 'reader' }).expect(409);
  });

  test('a project is renamed on the version that was seen', async () => {
    const before = await ada.get(`/api/projects/${project}`).expect(200);
    await ada.patch(`/api/projects/${project}`).send({ name: 'House' }).expect(428);
    await ada
      .patch(`/api/projects/${project}`)
      .set('if-match', before.headers['etag'] ?? '')
      .send({ name: 'House' })
      .expect(200);
    await ada
      .patch(`/api/projects/${project}`)
      .set('if-match', before.headers['etag'] ?? '')
      .send({ name: 'Barn' })
      .expect(412);
  });
});
