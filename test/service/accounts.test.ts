import { mkdtemp, readFile, rm, stat } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type TestAgent from 'supertest/lib/agent.js';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { serve } from '../../api/dist/main.js';
import { newProject } from './people.js';
import { invited, owner, PASSWORD, startService, visitor, type Service } from './service.js';

let service: Service;
let ada: TestAgent;
beforeAll(async () => {
  service = await startService();
  ada = await owner(service);
});
afterAll(() => service.stop());

describe('sign-in', () => {
  test('a wrong password is a problem like any other', async () => {
    const answer = await visitor(service)
      .post('/api/auth/sign-in/email')
      .send({ email: 'ada@example.org', password: 'another password' })
      .expect(401);
    expect(answer.headers['content-type']).toMatch(/^application\/problem\+json/);
    expect(answer.body).toMatchObject({ status: 401, code: 'invalid-email-or-password', title: 'Unauthorized' });
  });

  test('a body that is not JSON is a problem too', async () => {
    const answer = await visitor(service)
      .post('/api/auth/sign-in/email')
      .set('content-type', 'application/json')
      .send('{"email":')
      .expect(400);
    expect(answer.body).toMatchObject({ status: 400, code: 'not-json' });
  });
});

describe('a project’s people', () => {
  test('are part of what its ETag stands for', async () => {
    const project = `/api/projects/${await newProject(ada)}`;
    const before = await ada.get(project).expect(200);
    await invited(service, ada, project.split('/').at(-1) ?? '', 'Finn', 'reader');
    const after = await ada.get(project).expect(200);
    expect(after.headers['etag']).not.toBe(before.headers['etag']);
    await ada
      .patch(project)
      .set('if-match', before.headers['etag'] ?? '')
      .send({ name: 'Stale' })
      .expect(412);
  });

  test('who is taken out sees nothing any more', async () => {
    const project = await newProject(ada);
    const gus = await invited(service, ada, project, 'Gus', 'engineer');
    const { id } = (await gus.get('/api/me').expect(200)).body as { id: string };
    await gus.get(`/api/projects/${project}`).expect(200);
    await ada.delete(`/api/projects/${project}/members/${id}`).expect(204);
    await gus.get(`/api/projects/${project}`).expect(404);
    expect((await gus.get('/api/projects').expect(200)).body).toEqual([]);
  });

  test('who has an account is let in at once, and an invitation works once', async () => {
    const hal = await invited(service, ada, await newProject(ada), 'Hal', 'reader');
    const second = await newProject(ada, 'Second');
    const added = await ada
      .post(`/api/projects/${second}/members`)
      .send({ email: 'HAL@example.org', role: 'checker' })
      .expect(200);
    expect(added.body).toMatchObject({ member: { name: 'Hal', role: 'checker' }, invitation: null });
    expect((await hal.get(`/api/projects/${second}`).expect(200)).body).toMatchObject({ role: 'checker' });

    const invitation = await ada
      .post(`/api/projects/${second}/members`)
      .send({ email: 'ira@example.org', role: 'reader' })
      .expect(200);
    const { invitation: token } = invitation.body as { invitation: string };
    const accept = () => visitor(service).post('/api/invitations').send({ token, name: 'Ira', password: PASSWORD });
    const answers = await Promise.all([accept(), accept(), accept()]);
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 410, 410]);
    // An invitation makes nobody the owner of everything.
    await visitor(service)
      .post('/api/owner')
      .send({ token, name: 'Ira', email: 'ira2@example.org', password: PASSWORD })
      .expect(410);
  });

  test.each([
    ['a zero character', 'Weir\u0000'],
    ['half a character pair', 'Weir \ud83d'],
    ['nothing but space', '   '],
  ])('a name with %s is refused', async (_, name) => {
    await ada.post('/api/projects').send({ name }).expect(400);
  });
});

test('sessions outlive a restart, by a key that only its owner can read', async () => {
  const folder = await mkdtemp(join(tmpdir(), 'groundward-secret-'));
  const options = {
    port: 0,
    host: '127.0.0.1',
    databaseUrl: service.databaseUrl,
    secretFile: join(folder, 'in', 'it'),
  };
  try {
    const [one, other] = await Promise.all([serve(options), serve(options)]);
    const answer = await visitor(one)
      .post('/api/auth/sign-in/email')
      .send({ email: 'ada@example.org', password: PASSWORD })
      .expect(200);
    const cookies = (answer.headers['set-cookie'] as unknown as string[]).map((cookie) => cookie.split(';')[0]);
    await one.close();
    // Whichever of the two made the key, both sign with the one that was kept.
    await visitor(other).get('/api/me').set('cookie', cookies.join('; ')).expect(200);
    await other.close();
    expect((await stat(options.secretFile)).mode & 0o777).toBe(0o600);
    const kept = await readFile(options.secretFile, 'utf8');
    const again = await serve(options);
    await visitor(again).get('/api/me').set('cookie', cookies.join('; ')).expect(200);
    await again.close();
    expect(await readFile(options.secretFile, 'utf8')).toBe(kept);
  } finally {
    await rm(folder, { recursive: true, force: true });
  }
});

// Last: this address has no try left afterwards.
test('tries are counted by the caller’s address, whatever it says of itself', async () => {
  const statuses: number[] = [];
  for (let i = 0; i < 24; i++) {
    const { status } = await visitor(service)
      .post('/api/auth/sign-in/email')
      .set('x-groundward-address', `192.0.2.${i}`)
      .send({ email: 'nobody@example.org', password: 'another password' });
    statuses.push(status);
  }
  expect(statuses.at(-1)).toBe(429);
  expect(statuses.filter((status) => status === 401).length).toBeLessThanOrEqual(20);
});
