/** The service on a database of its own: a real PostgreSQL, a real port. */
import { randomUUID } from 'node:crypto';
import { readFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import pg from 'pg';
import { serve, type Serving } from '../../api/dist/main.js';
import { seed } from '../../api/dist/seed.js';
import { startPostgres } from '../../scripts/database/postgres.mjs';
import { migrate } from '../../scripts/migrate/migrate.mjs';

export { invited, owner, PASSWORD, visitor } from './people.js';

export const MIGRATIONS = fileURLToPath(new URL('../../prisma/migrations', import.meta.url));

export type TestDatabase = {
  readonly url: string;
  /** Past the service, straight to the database. */
  readonly sql: pg.Pool;
  readonly drop: () => Promise<void>;
};

export type Service = Serving &
  Pick<TestDatabase, 'sql'> & { readonly databaseUrl: string; readonly stop: () => Promise<void> };

/** What the service tells of a revision, as far as tests read it. */
export type RevisionBody = {
  readonly id: string;
  readonly number: number;
  readonly name: string;
  readonly state: 'draft' | 'issued';
  readonly hash: string;
  readonly version: number;
};

/** @param options.demo with the demo project in it */
export async function startService({ demo = false }: { readonly demo?: boolean } = {}): Promise<Service> {
  const database = await newDatabase();
  if (demo) await seed({ databaseUrl: database.url });
  const serving = await serve({ port: 0, host: '127.0.0.1', databaseUrl: database.url });
  return {
    ...serving,
    sql: database.sql,
    databaseUrl: database.url,
    stop: async () => {
      await serving.close();
      await database.drop();
    },
  };
}

/** A database with the migrations applied, on the tests' server or, outside `npm test`, on one of its own. */
export async function newDatabase(): Promise<TestDatabase> {
  const server = await testServer();
  const name = `service_${randomUUID().replaceAll('-', '')}`;
  await query(server.url, `CREATE DATABASE "${name}"`);
  const address = new URL(server.url);
  address.pathname = `/${name}`;
  await migrate(address.href, { folder: MIGRATIONS });
  const sql = new pg.Pool({ connectionString: address.href, max: 4 });
  // A test that cuts the connections cuts idle ones of its own too; the pool opens others.
  sql.on('error', () => undefined);
  return {
    url: address.href,
    sql,
    drop: async () => {
      await sql.end();
      await query(server.url, `DROP DATABASE "${name}" WITH (FORCE)`);
      await server.stop();
    },
  };
}

/** A statement from outside a test's database, in that of the server's own. */
export function onServer(databaseUrl: string, statement: string): Promise<void> {
  const address = new URL(databaseUrl);
  address.pathname = '/postgres';
  return query(address.href, statement);
}

/** @param name of a building file of the demo, without its ending */
export function demoFile(name: string): string {
  return readFileSync(new URL(`../../prisma/demo/${name}.json`, import.meta.url), 'utf8');
}

async function testServer(): Promise<{ readonly url: string; readonly stop: () => Promise<void> }> {
  const url = process.env['GROUNDWARD_TEST_DATABASE_URL'];
  return url === undefined ? startPostgres({ ephemeral: true }) : { url, stop: () => Promise.resolve() };
}

async function query(url: string, statement: string): Promise<void> {
  const client = new pg.Client({ connectionString: url });
  await client.connect();
  try {
    await client.query(statement);
  } finally {
    await client.end();
  }
}
