import { randomUUID } from 'node:crypto';
import pg from 'pg';
import { Fault, hasCode } from '../fault.mjs';
import { reachFault } from '../database/reach.mjs';
import { checkHistory } from './history.mjs';
import { readMigrations } from './files.mjs';

/** The lock that Prisma's own migration command takes, so that the two never run at once. */
const LOCK = 72707369;

/**
 * Brings a database to the state that the migrations describe: takes a lock, compares what was applied with the
 * files, and applies each missing file in a transaction of its own. A file that fails leaves nothing behind.
 *
 * @param {string} databaseUrl
 * @param {{ folder: string }} options `folder` holds one folder a migration, with a `migration.sql` in it
 * @returns {Promise<{ applied: string[] }>} the names of those applied now
 * @throws Fault when the database cannot be reached, its history doesn't fit the files, or a file fails
 */
export async function migrate(databaseUrl, { folder }) {
  const migrations = await readMigrations(folder);
  const client = await connect(databaseUrl);
  try {
    await lock(client);
    await client.query(HISTORY_TABLE);
    const { rows } = await client.query(
      'select migration_name as name, checksum, finished_at is not null as finished from _prisma_migrations where rolled_back_at is null',
    );
    const pending = checkHistory(migrations, rows);
    for (const migration of pending) await apply(client, migration);
    return { applied: pending.map(({ name }) => name) };
  } finally {
    // Ends the session, and with it the lock.
    await client.end();
  }
}

/** @param {string} databaseUrl */
async function connect(databaseUrl) {
  try {
    const client = new pg.Client({ connectionString: databaseUrl, connectionTimeoutMillis: 10_000 });
    // A connection that breaks fails the query under way, which says so.
    client.on('error', () => undefined);
    await client.connect();
    return client;
  } catch (error) {
    throw new Fault(reachFault(databaseUrl, error));
  }
}

/** @param {pg.Client} client */
async function lock(client) {
  await client.query("set lock_timeout = '60s'");
  try {
    await client.query('select pg_advisory_lock($1)', [LOCK]);
  } catch (error) {
    if (!hasCode(error, '55P03')) throw error;
    throw new Fault('Another process has been migrating the database for more than a minute.');
  }
}

/**
 * @param {pg.Client} client
 * @param {import('./files.mjs').Migration} migration
 */
async function apply(client, { name, sql, checksum }) {
  const id = randomUUID();
  try {
    await client.query('begin');
    await client.query(
      'insert into _prisma_migrations (id, checksum, migration_name, started_at) values ($1, $2, $3, clock_timestamp())',
      [id, checksum, name],
    );
    await client.query(sql);
    await client.query(
      'update _prisma_migrations set finished_at = clock_timestamp(), applied_steps_count = 1 where id = $1',
      [id],
    );
    await client.query('commit');
  } catch (error) {
    // Where the connection broke, the server has taken it back already.
    await client.query('rollback').catch(() => undefined);
    const message = error instanceof Error ? error.message : String(error);
    throw new Fault(`The migration ${name} failed and was taken back: ${message}.`);
  }
}

/** As Prisma makes it. */
const HISTORY_TABLE = `create table if not exists _prisma_migrations (
  id varchar(36) primary key not null,
  checksum varchar(64) not null,
  finished_at timestamptz,
  migration_name varchar(255) not null,
  logs text,
  rolled_back_at timestamptz,
  started_at timestamptz not null default now(),
  applied_steps_count integer not null default 0
)`;
