import { chmod, mkdir, mkdtemp, readFile, realpath, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join, resolve } from 'node:path';
import { Fault, hasCode } from '../fault.mjs';
import { canReach, serverUser } from './user.mjs';

/**
 * The folder that holds a database with all that belongs to it, and the user who runs the server.
 * @typedef {{ folder: string, user: import('./user.mjs').ServerUser }} Home
 */

/** For root, where the user who runs the server cannot reach the folder that was asked for. */
const ELSEWHERE = '/var/lib/groundward';

/**
 * Finds the folder of the database that is kept for `dataDir`: that folder itself, or, where the user who runs the
 * server cannot reach it (a checkout below `/root`), one below `/var/lib/groundward`, which a file in `dataDir` names.
 *
 * @param {string} dataDir
 * @param {(line: string) => void} progress
 * @returns {Promise<Home>}
 * @throws Fault when there is no such folder
 */
export async function findHome(dataDir, progress) {
  const wanted = await makeFolder(resolve(dataDir));
  const pointer = join(wanted, 'database-folder');
  const noted = await readFile(pointer, 'utf8').catch((error) => {
    if (hasCode(error, 'ENOENT')) return null;
    throw error;
  });
  const folder = noted === null ? wanted : await makeFolder(noted.trim());
  const user = await serverUser(join(folder, 'cluster'));
  if (canReach(user, folder)) return { folder, user };

  const other = await makeElsewhere();
  if (!canReach(user, other)) {
    await rm(other, { recursive: true });
    throw new Fault(
      `The user ${user?.name}, who runs the database because PostgreSQL refuses root, can reach neither ${folder} nor ` +
        `${ELSEWHERE}: name a folder within its reach in GROUNDWARD_DATA.`,
    );
  }
  await writeFile(pointer, `${other}\n`);
  progress(`The database is kept in ${other}: the user ${user?.name}, who runs it, cannot reach ${wanted}.`);
  return { folder: other, user };
}

async function makeElsewhere() {
  const parent = await makeFolder(ELSEWHERE);
  const folder = await mkdtemp(join(parent, 'data-'));
  await chmod(folder, 0o711);
  return folder;
}

/**
 * A folder of its own, with a name that nobody can foresee.
 *
 * @returns {Promise<Home>}
 */
export async function ephemeralHome() {
  const user = await serverUser('');
  for (const parent of [tmpdir(), '/var/tmp', '/tmp']) {
    if (!canReach(user, parent)) continue;
    const folder = await mkdtemp(join(await realpath(parent), 'groundward-'));
    if (user !== null) await chmod(folder, 0o711);
    return { folder, user };
  }
  throw new Fault(`The user ${user?.name}, who runs the database, cannot reach the folder ${tmpdir()}.`);
}

/** @param {Home} home */
export async function removeHome({ folder }) {
  await rm(folder, { recursive: true, force: true, maxRetries: 5 });
}

/**
 * @param {string} path
 * @returns {Promise<string>} the folder's real path
 */
async function makeFolder(path) {
  try {
    const made = await mkdir(path, { recursive: true });
    // Whatever the umask: another user must be able to pass through what root made.
    if (made !== undefined) await chmod(path, process.getuid?.() === 0 ? 0o711 : 0o700);
    return await realpath(path);
  } catch (error) {
    throw new Fault(
      `The folder ${path} for the database cannot be made: ${error instanceof Error ? error.message : error}.`,
    );
  }
}
