import { mkdir, readFile, rm, writeFile } from 'node:fs/promises';
import { dirname } from 'node:path';
import { setTimeout as pause } from 'node:timers/promises';
import { isAlive } from './alive.mjs';

/**
 * Does a piece of work while no other process does it; waits for its turn. A lock whose process has died is void.
 *
 * @template T
 * @param {string} file the lock: holds the process id of its owner
 * @param {() => Promise<T>} work
 * @returns {Promise<T>}
 */
export async function alone(file, work) {
  await mkdir(dirname(file), { recursive: true });
  while (!(await taken(file))) {
    const owner = Number(await readFile(file, 'utf8').catch(() => ''));
    if (owner > 0 && !isAlive(owner)) await rm(file, { force: true });
    await pause(200);
  }
  try {
    return await work();
  } finally {
    await rm(file, { force: true });
  }
}

/** @param {string} file */
async function taken(file) {
  try {
    await writeFile(file, String(process.pid), { flag: 'wx' });
    return true;
  } catch (error) {
    if (error instanceof Error && 'code' in error && error.code === 'EEXIST') return false;
    throw error;
  }
}
