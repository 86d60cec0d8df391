import { execFileSync } from 'node:child_process';
import { readFileSync } from 'node:fs';
import { readFile, writeFile } from 'node:fs/promises';
import { join } from 'node:path';
import { isAlive } from '../build/alive.mjs';
import { hasCode } from '../fault.mjs';

/**
 * A server that runs on a data folder.
 * @typedef {{ pid: number, port: number, log: string, ready: boolean }} Server
 */

/**
 * Reads which server runs on a data folder. After a crash or a restart of the machine the id on record may belong to
 * some other program by now, which would keep PostgreSQL from starting: the record is then put right.
 *
 * @param {string} cluster
 * @returns {Promise<Server | null>} null when none runs
 */
export async function postmasterOf(cluster) {
  const file = join(cluster, 'postmaster.pid');
  const text = await readFile(file, 'utf8').catch((error) => {
    if (hasCode(error, 'ENOENT')) return null;
    throw error;
  });
  if (text === null) return null;
  // One a line: process id, data folder, start time, port, socket folder, address, shared memory, state.
  const lines = text.split('\n');
  const pid = Number(lines[0]);
  if (!Number.isInteger(pid) || pid <= 0 || !isAlive(pid)) return null;
  if (!servesFolder(pid, cluster)) {
    // PostgreSQL overlooks a record with the id of its own parent, but still looks at the shared memory it names,
    // and so refuses to start beside the remains of a server that are still alive.
    await writeFile(file, [String(process.pid), ...lines.slice(1)].join('\n'));
    return null;
  }
  return { pid, port: Number(lines[3]), log: join(cluster, '..', 'postgres.log'), ready: lines[7]?.trim() === 'ready' };
}

/**
 * @param {number} pid
 * @param {string} cluster
 * @returns {boolean} whether the process is a server on this folder
 */
function servesFolder(pid, cluster) {
  return commandOf(pid).includes(cluster);
}

/**
 * @param {number} pid
 * @returns {string} its command line; empty when it ended meanwhile
 */
function commandOf(pid) {
  try {
    if (process.platform === 'linux') return readFileSync(`/proc/${pid}/cmdline`, 'utf8');
    return execFileSync('ps', ['-ww', '-o', 'command=', '-p', String(pid)], { encoding: 'utf8' });
  } catch (error) {
    if (hasCode(error, 'ENOENT', 'ESRCH')) return '';
    if (error instanceof Error && 'status' in error && error.status === 1) return '';
    throw error;
  }
}
