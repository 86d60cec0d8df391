import { chmod, mkdir, mkdtemp, readdir, readFile, rm, stat, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import pg from 'pg';
import { afterEach, beforeEach, describe, expect, test } from 'vitest';
import { isAlive } from '../../scripts/build/alive.mjs';
import { startPostgres } from '../../scripts/database/postgres.mjs';
import { type Holder, holdDatabase } from './holder.js';

const asRoot = process.getuid?.() === 0;

/** What differs for root and for other users: each run tests its own part. */
const rootTest = (name: string, body: () => Promise<void>) => (asRoot ? test(name, body) : undefined);
const userTest = (name: string, body: () => Promise<void>) => (asRoot ? undefined : test(name, body));

let parent: string;
let dataDir: string;
/** What a test leaves running: ended before its folder is removed. */
let running: (() => Promise<void>)[];

beforeEach(async () => {
  running = [];
  parent = await mkdtemp(join(tmpdir(), 'ground test '));
  if (asRoot) await chmod(parent, 0o711);
  dataDir = join(parent, 'data');
});

afterEach(async () => {
  for (const end of running.reverse()) await end();
  await rm(parent, { recursive: true, force: true });
});

async function query<Row extends pg.QueryResultRow>(url: string | null, sql: string): Promise<Row[]> {
  const client = new pg.Client({ connectionString: url ?? '' });
  await client.connect();
  try {
    return (await client.query<Row>(sql)).rows;
  } finally {
    await client.end();
  }
}

async function hold(folder?: string): Promise<Holder> {
  const holder = await holdDatabase(folder);
  running.push(() => holder.end('SIGTERM'));
  return holder;
}

async function open(): Promise<string> {
  const postgres = await startPostgres({ dataDir });
  running.push(() => postgres.stop());
  return postgres.url;
}

async function postmasterPid(): Promise<number> {
  return Number((await readFile(join(dataDir, 'cluster', 'postmaster.pid'), 'utf8')).split('\n')[0]);
}

/** Makes a database in `dataDir` and leaves it stopped. */
async function makeDatabase(): Promise<void> {
  const postgres = await startPostgres({ dataDir });
  await postgres.stop();
}

test('a database is kept from one start to the next, whatever port it gets', async () => {
  const first = await startPostgres({ dataDir });
  await query(first.url, 'create table kept as select 7 as value');
  await first.stop();
  expect(await query(await open(), 'select value from kept')).toEqual([{ value: 7 }]);
});

test('kill -9 loses nothing committed, and the server left behind is replaced', async () => {
  const killed = await hold(dataDir);
  await query(killed.url, 'create table kept as select 7 as value');
  const orphan = await postmasterPid();
  await killed.end('SIGKILL');
  expect(isAlive(orphan)).toBe(true);

  const next = await hold(dataDir);
  expect(await query(next.url, 'select value from kept')).toEqual([{ value: 7 }]);
  expect(isAlive(orphan)).toBe(false);
});

test('a server that was killed too recovers at the next start', async () => {
  const killed = await hold(dataDir);
  await query(killed.url, 'create table kept as select 7 as value');
  const server = await postmasterPid();
  await killed.end('SIGKILL');
  process.kill(server, 'SIGKILL');

  const next = await hold(dataDir);
  expect(await query(next.url, 'select value from kept')).toEqual([{ value: 7 }]);
});

test('a second process on the same folder is refused, and the first keeps its database', async () => {
  const first = await hold(dataDir);
  const second = await hold(dataDir);
  expect(second.refused).toBe(
    `Another Groundward (process ${first.pid}) is already using the database in this folder.`,
  );
  expect(await query(first.url, 'select 1 as one')).toEqual([{ one: 1 }]);
});

test('of several processes that start at once on a new folder, one gets the database', async () => {
  const holders = await Promise.all([hold(dataDir), hold(dataDir), hold(dataDir)]);
  const owners = holders.filter(({ url }) => url !== null);
  expect(owners).toHaveLength(1);
  expect(await query(owners[0]!.url, 'select 1 as one')).toEqual([{ one: 1 }]);
});

test('an initialisation that was broken off is not taken for a database', async () => {
  await mkdir(join(dataDir, 'cluster.new-999999999', 'base'), { recursive: true, mode: 0o711 });
  if (asRoot) await chmod(dataDir, 0o711);
  await makeDatabase();
  expect(await readdir(dataDir)).not.toContain('cluster.new-999999999');
});

test('a process id on record that another program has by now does not keep the server from starting', async () => {
  await makeDatabase();
  const file = join(dataDir, 'cluster', 'postmaster.pid');
  await writeFile(file, `${process.pid}\n${join(dataDir, 'cluster')}\n1\n1\n\n127.0.0.1\n\nready\n`, { mode: 0o644 });
  const next = await hold(dataDir);
  expect(next.refused).toBeNull();
  expect(await query(next.url, 'select 1 as one')).toEqual([{ one: 1 }]);
});

test('the server listens on the loopback address alone, without a socket file, and asks for the password', async () => {
  const url = await open();
  expect(
    await query(
      url,
      `select current_setting('listen_addresses') as address, current_setting('unix_socket_directories') as sockets,
        (select rolpassword like 'SCRAM-SHA-256$%' from pg_authid where rolname = current_user) as scram`,
    ),
  ).toEqual([{ address: '127.0.0.1', sockets: '', scram: true }]);
  const wrong = new URL(url);
  wrong.password = 'wrong';
  await expect(query(wrong.href, 'select 1')).rejects.toMatchObject({ code: '28P01' });
  expect((await stat(join(dataDir, 'password'))).mode & 0o777).toBe(0o600);
  expect((await stat(join(dataDir, 'cluster'))).mode & 0o777).toBe(0o700);
});

test('the end of the server is told to the process that started it', async () => {
  const postgres = await startPostgres({ dataDir });
  process.kill(await postmasterPid(), 'SIGQUIT');
  expect(await postgres.lost).toMatch(/^The database stopped unexpectedly; its log is .+\/postgres\.log\.$/);
  await postgres.stop();
});

describe('a broken database is told in one sentence', () => {
  test('a folder that holds something else', async () => {
    await mkdir(join(dataDir, 'cluster'), { recursive: true });
    if (asRoot) await chmod(dataDir, 0o711);
    await expect(startPostgres({ dataDir })).rejects.toThrow(
      /^The folder \S.*cluster holds no database \(no PG_VERSION/,
    );
  });

  test('data of another version', async () => {
    await makeDatabase();
    await writeFile(join(dataDir, 'cluster', 'PG_VERSION'), '12\n');
    await expect(startPostgres({ dataDir })).rejects.toThrow(
      /^The database in .+ was made by PostgreSQL 12; these packages carry 18\.$/,
    );
  });

  test('damaged files', async () => {
    await makeDatabase();
    await rm(join(dataDir, 'cluster', 'global', 'pg_control'));
    await expect(startPostgres({ dataDir })).rejects.toThrow(
      /^The database in .+ did not start: .+pg_control.+ \(its log: .+postgres\.log\)\.$/,
    );
  });

  userTest('a folder that may not be written to', async () => {
    await mkdir(dataDir, { mode: 0o500 });
    await expect(startPostgres({ dataDir })).rejects.toThrow(
      /^The database in .+ cannot be started: EACCES: permission denied.+\.$/,
    );
  });

  test('a lost password', async () => {
    await makeDatabase();
    await rm(join(dataDir, 'password'));
    await expect(startPostgres({ dataDir })).rejects.toThrow(/^The database's password is missing: .+ is not there\.$/);
  });

  test('a password that is not the database’s', async () => {
    await makeDatabase();
    await writeFile(join(dataDir, 'password'), 'another');
    await expect(startPostgres({ dataDir })).rejects.toThrow('does not accept the password');
    await expect(postmasterPid()).rejects.toThrow('ENOENT');
  });
});

describe('an ephemeral database', () => {
  async function folderOf(url: string | null): Promise<string> {
    const [row] = await query<{ folder: string }>(url, `select current_setting('data_directory') as folder`);
    return join(row!.folder, '..');
  }

  test('leaves nothing when it is stopped', async () => {
    const postgres = await startPostgres({ ephemeral: true });
    const folder = await folderOf(postgres.url);
    await postgres.stop();
    await expect(stat(folder)).rejects.toThrow('ENOENT');
  });

  test('leaves nothing when its process is killed', async () => {
    const killed = await hold();
    const folder = await folderOf(killed.url);
    await killed.end('SIGKILL');
    await expect
      .poll(
        () =>
          stat(folder).then(
            () => 'there',
            () => 'gone',
          ),
        { timeout: 20_000 },
      )
      .toBe('gone');
  });
});

rootTest('root keeps the database where the user who runs it can reach it', async () => {
  await chmod(parent, 0o700);
  const lines: string[] = [];
  const first = await startPostgres({ dataDir, progress: (line) => lines.push(line) });
  await query(first.url, 'create table kept as select 7 as value');
  await first.stop();
  const elsewhere = (await readFile(join(dataDir, 'database-folder'), 'utf8')).trim();
  running.push(() => rm(elsewhere, { recursive: true, force: true }));
  expect(elsewhere).toMatch(/^\/var\/lib\/groundward\/data-\w{6}$/);
  expect(lines).toEqual([expect.stringContaining(`The database is kept in ${elsewhere}`)]);

  expect(await query(await open(), 'select value from kept')).toEqual([{ value: 7 }]);
});

rootTest('as root the server runs as another user', async () => {
  await open();
  expect((await stat(`/proc/${await postmasterPid()}`)).uid).not.toBe(0);
});
