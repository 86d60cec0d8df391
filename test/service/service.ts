/** The service on a database of its own: a real PostgreSQL, a real port. */
import { randomUUID } from 'node:crypto';
import { fileURLToPath } from 'node:url';
import pg from 'pg';
import { serve, type Serving } from '../../api/src/main.js';
import { seed } from '../../api/src/seed.js';
import { startPostgres } from '../../scripts/database/postgres.mjs';
import { migrate } from '../../scripts/migrate/migrate.mjs';

export const MIGRATIONS = fileURLToPath(new URL('../../prisma/migrations', import.meta.url));

export type TestDatabase = {
  readonly url: string;
  /** Raw SQL, past the service. */
  readonly sql: <Row extends pg.QueryResultRow>(text: string, values?: readonly unknown[]) => Promise<Row[]>;
  readonly drop: () => Promise<void>;
};

export type TestService = Serving & { readonly database: TestDatabase; readonly stop: () => Promise<void> };

/** @param options.demo with the demo project in it */
export async function startService({ demo = false }: { readonly demo?: boolean } = {}): Promise<TestService> {
  const database = await newDatabase();
  if (demo) await seed({ databaseUrl: database.url });
  const serving = await serve({ port: 0, host: '127.0.0.1', databaseUrl: database.url });
  return {
    ...serving,
    database,
    stop: async () => {
      await serving.close();
      await database.drop();
    },
  };
}

/** An empty database with the migrations applied, on the tests' server or, outside `npm test`, on one of its own. */
export async function newDatabase(): Promise<TestDatabase> {
  const server = await testServer();
  const name = `service_${randomUUID().replaceAll('-', '')}`;
  await once(server.url, `CREATE DATABASE "${name}"`);
  const address = new URL(server.url);
  address.pathname = `/${name}`;
  await migrate(address.href, { folder: MIGRATIONS });
  const pool = new pg.Pool({ connectionString: address.href, max: 4 });
  return {
    url: address.href,
    sql: async <Row extends pg.QueryResultRow>(text: string, values: readonly unknown[] = []) =>
      (await pool.query<Row>(text, [...values])).rows,
    drop: async () => {
      await pool.end();
      await once(server.url, `DROP DATABASE "${name}" WITH (FORCE)`);
      await server.stop();
    },
  };
}

async function testServer(): Promise<{ readonly url: string; readonly stop: () => Promise<void> }> {
  const url = process.env['GROUNDWARD_TEST_DATABASE_URL'];
  return url === undefined ? startPostgres({ ephemeral: true }) : { url, stop: () => Promise.resolve() };
}

async function once(url: string, statement: string): Promise<void> {
  const client = new pg.Client({ connectionString: url });
  await client.connect();
  try {
    await client.query(statement);
  } finally {
    await client.end();
  }
}
