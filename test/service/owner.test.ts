import { afterEach, beforeEach, describe, expect, test } from 'vitest';
import { serve } from '../../api/dist/main.js';
import { owner, PASSWORD, tokenIn, visitor } from './people.js';
import { startService, type Service } from './service.js';

const eve = { name: 'Eve', email: 'eve@example.org', password: PASSWORD };

describe('the owner link of the first start', () => {
  let service: Service;
  beforeEach(async () => {
    service = await startService();
  });
  afterEach(() => service.stop());

  test('makes the visitor the owner, signed in, once', async () => {
    expect(service.ownerLink).toMatch(new RegExp(`^${service.url}/welcome\\?token=[\\w-]{40,}$`));
    const person = visitor(service);
    const token = tokenIn(service.ownerLink);
    const { headers } = await person
      .post('/api/owner')
      .send({ ...eve, token })
      .expect(200);
    const cookie = String(headers['set-cookie']);
    expect(cookie).toMatch(/HttpOnly/);
    expect(cookie).toMatch(/SameSite=Lax/);
    expect((await person.get('/api/me').expect(200)).body).toMatchObject({ name: 'Eve', email: 'eve@example.org' });

    const again = await visitor(service)
      .post('/api/owner')
      .send({ ...eve, email: 'mal@example.org', token })
      .expect(410);
    expect(again.body).toMatchObject({ code: 'link-gone' });
    expect((await service.sql.query('SELECT email FROM "user"')).rows).toEqual([{ email: 'eve@example.org' }]);
  });

  test('is given back when the account is refused', async () => {
    const token = tokenIn(service.ownerLink);
    const person = visitor(service);
    const refused = await person
      .post('/api/owner')
      .send({ ...eve, password: 'short', token })
      .expect(400);
    expect(refused.body).toMatchObject({ code: 'wrong-request', faults: [{ path: 'password' }] });
    await person
      .post('/api/owner')
      .send({ ...eve, token })
      .expect(200);
  });

  test('of several that use it at once, one becomes owner', async () => {
    const token = tokenIn(service.ownerLink);
    const answers = await Promise.all(
      ['a', 'b', 'c', 'd'].map((name) =>
        visitor(service)
          .post('/api/owner')
          .send({ ...eve, email: `${name}@example.org`, token }),
      ),
    );
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 410, 410, 410]);
    expect((await service.sql.query('SELECT 1 FROM "user"')).rows).toHaveLength(1);
  });

  test('is replaced at the next start while nobody has used it, and not made once somebody has', async () => {
    const start = () => serve({ port: 0, host: '127.0.0.1', databaseUrl: service.databaseUrl });
    const second = await start();
    try {
      expect(tokenIn(second.ownerLink)).not.toBe(tokenIn(service.ownerLink));
      await visitor(service)
        .post('/api/owner')
        .send({ ...eve, token: tokenIn(service.ownerLink) })
        .expect(410);
      await owner({ ...service, ...second });
    } finally {
      await second.close();
    }
    const third = await start();
    try {
      expect(third.ownerLink).toBeUndefined();
    } finally {
      await third.close();
    }
  });

  test('is not kept in the database, only its hash', async () => {
    const { rows } = await service.sql.query<object>('SELECT * FROM "link"');
    expect(rows).toHaveLength(1);
    expect(JSON.stringify(rows)).not.toContain(tokenIn(service.ownerLink));
  });

  test('is worth nothing once somebody has an account, whoever kept another one', async () => {
    // Two processes that start at the same moment may each have made a link.
    await service.sql.query(
      `INSERT INTO "link" ("token_hash", "role", "expires_at")
       VALUES (encode(sha256('another'), 'hex'), 'owner', now() + interval '1 day')`,
    );
    await owner(service);
    await visitor(service)
      .post('/api/owner')
      .send({ ...eve, email: 'mal@example.org', token: 'another' })
      .expect(410);
  });

  test('has an end', async () => {
    await service.sql.query(`UPDATE "link" SET "expires_at" = now() - interval '1 second'`);
    await visitor(service)
      .post('/api/owner')
      .send({ ...eve, token: tokenIn(service.ownerLink) })
      .expect(410);
  });
});

test('the first owner owns the demo', async () => {
  const service = await startService({ demo: true });
  try {
    const ada = await owner(service);
    expect((await ada.get('/api/projects').expect(200)).body).toMatchObject([
      { role: 'owner', latest: { number: 3, state: 'draft' } },
    ]);
  } finally {
    await service.stop();
  }
});
