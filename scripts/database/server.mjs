import { spawn } from 'node:child_process';
import { chown, open, readFile, stat } from 'node:fs/promises';
import { join } from 'node:path';
import { setTimeout as pause } from 'node:timers/promises';
import { isAlive } from '../build/alive.mjs';
import { serverEnvironment } from './cluster.mjs';
import { Fault, hasCode } from '../fault.mjs';
import { postmasterOf } from './postmaster.mjs';

/** A log longer than this is begun anew at a start [bytes]. */
const LONG_LOG = 4_000_000;

/** What another process's start, or the end of an earlier server, may cause for a moment. */
const PASSING = /lock file "postmaster\.pid"|pre-existing shared memory|could not create any TCP\/IP sockets/;

/**
 * Starts a server and waits until it accepts connections.
 *
 * @param {{ home: import('./home.mjs').Home, binaries: string, cluster: import('./cluster.mjs').Cluster,
 *   ephemeral: boolean, port: number }} options
 * @returns {Promise<{ server: import('./postmaster.mjs').Server | null, reason: string }>} no server, and the reason,
 *   when it is worth trying again
 * @throws Fault when it isn't
 */
export async function launch({ home, binaries, cluster, ephemeral, port }) {
  const log = await openLog(home);
  const begin = (await log.handle.stat()).size;
  const child = spawn(join(binaries, 'bin', 'postgres'), serverArguments(cluster.folder, port, ephemeral), {
    ...(home.user === null ? {} : { uid: home.user.uid, gid: home.user.gid }),
    cwd: cluster.folder,
    env: serverEnvironment,
    stdio: ['ignore', log.handle.fd, log.handle.fd],
    // A group of its own: Ctrl-C in the terminal must stop the service first, and the server after it.
    detached: true,
  });
  child.unref();
  /** @type {Promise<string>} */
  const ended = new Promise((resolve) => {
    child.on('error', (error) => resolve(error.message));
    child.on('exit', (code, signal) => resolve(`it ended with ${code ?? signal}`));
  });
  let end = '';
  void ended.then((how) => (end = how));
  try {
    while (end === '') {
      const server = await postmasterOf(cluster.folder).catch(overlook('EACCES'));
      if (server !== null && server.pid === child.pid && server.ready) return { server, reason: '' };
      await pause(20);
    }
  } finally {
    await log.handle.close();
  }
  const reason = lastFault((await readFile(log.path)).subarray(begin).toString('utf8')) ?? end;
  if (PASSING.test(reason)) return { server: null, reason };
  throw new Fault(`The database in ${cluster.folder} did not start: ${reason} (its log: ${log.path}).`);
}

/**
 * Ends a server: it rolls back what is under way, writes all that is committed and stops.
 *
 * @param {number} pid
 * @throws Fault when it doesn't end
 */
export async function stopServer(pid) {
  for (const [signal, patience] of /** @type {const} */ ([
    ['SIGINT', 60_000],
    ['SIGQUIT', 10_000],
  ])) {
    try {
      process.kill(pid, signal);
    } catch (error) {
      if (hasCode(error, 'ESRCH')) return;
      throw error;
    }
    const deadline = Date.now() + patience;
    while (Date.now() < deadline) {
      if (!isAlive(pid)) return;
      await pause(20);
    }
  }
  throw new Fault(`The database server (process ${pid}) does not stop.`);
}

/**
 * @param {string} folder
 * @param {number} port
 * @param {boolean} ephemeral
 */
function serverArguments(folder, port, ephemeral) {
  const settings = [
    'listen_addresses=127.0.0.1',
    // No socket file: nothing in a folder that others can write to.
    'unix_socket_directories=',
    'log_timezone=UTC',
    'timezone=UTC',
    ...(ephemeral ? ['fsync=off', 'synchronous_commit=off', 'full_page_writes=off'] : []),
  ];
  return ['-D', folder, '-p', String(port), ...settings.flatMap((setting) => ['-c', setting])];
}

/** @param {import('./home.mjs').Home} home */
async function openLog({ folder, user }) {
  const path = join(folder, 'postgres.log');
  const size = (await stat(path).catch(overlook('ENOENT')))?.size ?? 0;
  const handle = await open(path, size > LONG_LOG ? 'w' : 'a', 0o600);
  if (user !== null) await chown(path, user.uid, user.gid);
  return { path, handle };
}

/**
 * @param {string} text what the server wrote to its log
 * @returns {string | null} why it ended: its last fatal line, or what it said before it had a log
 */
function lastFault(text) {
  const fatal = [...text.matchAll(/(?:FATAL|PANIC|error while loading[^:]*):\s*(.+)/g)].at(-1)?.[1];
  const plain = text.split('\n').filter((line) => line !== '' && !/^\d{4}-\d\d-\d\d /.test(line));
  return (
    fatal ??
    (plain.length === 0
      ? null
      : plain
          .slice(0, 3)
          .join(' ')
          .replace(/^postgres: /, ''))
  );
}

/** @param {string} code */
const overlook = (code) => (/** @type {unknown} */ error) => {
  if (hasCode(error, code)) return null;
  throw error;
};
