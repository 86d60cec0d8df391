import request from 'supertest';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { serve } from '../../api/src/main.js';
import { startPostgres } from '../../scripts/database/postgres.mjs';
import { migrate } from '../../scripts/migrate/migrate.mjs';
import { firstOwner } from './people.js';
import { MIGRATIONS, startService, type TestService } from './service.js';

describe('health', () => {
  let service: TestService;
  beforeAll(async () => {
    service = await startService();
  });
  afterAll(() => service.stop());

  test('is well with its database, and tells its version', async () => {
    const { body } = await request(service.url).get('/api/health').expect(200);
    expect(body).toEqual({ status: 'ok', database: 'ok', version: '0.1.0' });
  });

  test('a database that lets nobody in is unwell, a problem for all, and well again afterwards', async () => {
    const owner = await firstOwner(service);
    const [{ name }] = (await service.database.sql<{ name: string }>('SELECT current_database() AS name')) as [
      { name: string },
    ];
    const shut = async (allow: boolean) => {
      await service.database.sql(`ALTER DATABASE "${name}" ALLOW_CONNECTIONS ${String(allow)}`);
      await service.database.sql(
        'SELECT pg_terminate_backend(pid) FROM pg_stat_activity WHERE datname = $1 AND pid <> pg_backend_pid()',
        [name],
      );
    };
    await shut(false);
    const unwell = await request(service.url).get('/api/health').expect(503);
    expect(unwell.headers['content-type']).toMatch(/^application\/problem\+json/);
    expect(unwell.body).toMatchObject({ status: 503, code: 'database-down' });
    const others = await owner.get('/api/projects').expect(503);
    expect(others.body).toMatchObject({ status: 503, code: 'database-down' });
    const signIn = await request(service.url)
      .post('/api/auth/sign-in/email')
      .send({ email: 'eve@example.org', password: 'a long password' })
      .expect(503);
    expect(signIn.body).toMatchObject({ status: 503, code: 'database-down' });

    await shut(true);
    await request(service.url).get('/api/health').expect(200);
    await owner.get('/api/projects').expect(200);
  });
});

test('a database server that has gone is told in time', async () => {
  const server = await startPostgres({ ephemeral: true });
  await migrate(server.url, { folder: MIGRATIONS });
  const service = await serve({ port: 0, host: '127.0.0.1', databaseUrl: server.url });
  try {
    await request(service.url).get('/api/health').expect(200);
    await server.stop();
    const { body } = await request(service.url).get('/api/health').timeout(8000).expect(503);
    expect(body).toMatchObject({ title: 'Service Unavailable', code: 'database-down', instance: '/api/health' });
  } finally {
    await service.close();
    await server.stop();
  }
});
