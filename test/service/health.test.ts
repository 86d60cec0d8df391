import request from 'supertest';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { serve } from '../../api/dist/main.js';
import { startPostgres } from '../../scripts/database/postgres.mjs';
import { migrate } from '../../scripts/migrate/migrate.mjs';
import { owner, PASSWORD } from './people.js';
import { MIGRATIONS, onServer, startService, type Service } from './service.js';

describe('health', () => {
  let service: Service;
  beforeAll(async () => {
    service = await startService();
  });
  afterAll(() => service.stop());

  test('is well with its database, and tells its version', async () => {
    const well = await request(service.url).get('/api/health').expect(200);
    expect(well.body).toEqual({ status: 'ok', database: 'ok', version: '0.1.0' });
  });

  test('a database that lets nobody in is unwell, a problem for all, and well again afterwards', async () => {
    const ada = await owner(service);
    const name = new URL(service.databaseUrl).pathname.slice(1);
    const shut = async (away: boolean): Promise<void> => {
      await onServer(service.databaseUrl, `ALTER DATABASE "${name}" ALLOW_CONNECTIONS ${String(!away)}`);
      await onServer(
        service.databaseUrl,
        `SELECT pg_terminate_backend(pid) FROM pg_stat_activity WHERE datname = '${name}'`,
      );
    };
    await shut(true);
    const unwell = await request(service.url).get('/api/health').expect(503);
    expect(unwell.headers['content-type']).toMatch(/^application\/problem\+json/);
    expect(unwell.body).toMatchObject({ status: 503, code: 'database-down' });
    const others = await ada.get('/api/projects').expect(503);
    expect(others.body).toMatchObject({ status: 503, code: 'database-down' });
    const signIn = await request(service.url)
      .post('/api/auth/sign-in/email')
      .send({ email: 'ada@example.org', password: PASSWORD })
      .expect(503);
    expect(signIn.body).toMatchObject({ status: 503, code: 'database-down' });

    await shut(false);
    await request(service.url).get('/api/health').expect(200);
    await ada.get('/api/projects').expect(200);
  });
});

test('a database server that has gone is told in time', async () => {
  const server = await startPostgres({ ephemeral: true });
  await migrate(server.url, { folder: MIGRATIONS });
  const service = await serve({ port: 0, host: '127.0.0.1', databaseUrl: server.url });
  try {
    await request(service.url).get('/api/health').expect(200);
    await server.stop();
    const gone = await request(service.url).get('/api/health').timeout(8000).expect(503);
    expect(gone.body).toMatchObject({ title: 'Service Unavailable', code: 'database-down', instance: '/api/health' });
  } finally {
    await service.close();
    await server.stop();
  }
});
