import { spawn } from 'node:child_process';
import { randomBytes } from 'node:crypto';
import { chown, link, mkdir, readdir, readFile, rename, rm, stat, writeFile } from 'node:fs/promises';
import { basename, join } from 'node:path';
import { isAlive } from '../build/alive.mjs';
import { Fault, hasCode } from '../fault.mjs';

/**
 * An initialised data folder and the superuser's password.
 * @typedef {{ folder: string, password: string }} Cluster
 */

/**
 * Initialises the data folder once: aside, and renamed when complete, so that no half-made one is ever found.
 *
 * @param {{ home: import('./home.mjs').Home, binaries: string, ephemeral: boolean }} options
 * @returns {Promise<Cluster>}
 * @throws Fault when the folder holds something else, or another version, or cannot be initialised
 */
export async function ensureCluster({ home, binaries, ephemeral }) {
  const folder = join(home.folder, 'cluster');
  const version = await versionOf(folder);
  const password = await passwordOf(home.folder, version !== null);
  if (version === null) {
    await removeBrokenOff(home.folder);
    await initialise({ home, binaries, ephemeral, folder, password });
  } else {
    await checkVersion(folder, version, binaries);
    await checkOwner(folder);
  }
  return { folder, password };
}

/**
 * @param {string} folder
 * @returns {Promise<string | null>} the major version that made the folder, or null when there is none
 */
async function versionOf(folder) {
  if ((await stat(folder).catch(() => null)) === null) return null;
  try {
    return (await readFile(join(folder, 'PG_VERSION'), 'utf8')).trim();
  } catch (error) {
    if (hasCode(error, 'ENOENT')) throw new Fault(`The folder ${folder} holds no database (no PG_VERSION in it).`);
    if (hasCode(error, 'EACCES')) throw new Fault(await foreign(folder));
    throw error;
  }
}

/**
 * @param {string} folder
 * @param {string} version
 * @param {string} binaries
 */
async function checkVersion(folder, version, binaries) {
  const ours = /^postgres-(\d+)/.exec(basename(binaries))?.[1];
  if (version !== ours) {
    throw new Fault(`The database in ${folder} was made by PostgreSQL ${version}; these packages carry ${ours}.`);
  }
}

/** @param {string} folder */
async function checkOwner(folder) {
  const uid = process.getuid?.() ?? 0;
  if (uid !== 0 && (await stat(folder)).uid !== uid) throw new Fault(await foreign(folder));
}

/** @param {string} folder */
async function foreign(folder) {
  return `The database in ${folder} belongs to another user (uid ${(await stat(folder)).uid}): start as that user or as root.`;
}

/**
 * @param {string} home
 * @param {boolean} expected whether a database exists that needs it
 * @returns {Promise<string>}
 */
async function passwordOf(home, expected) {
  const file = join(home, 'password');
  if (!expected) {
    const aside = `${file}.new-${process.pid}`;
    await writeFile(aside, randomBytes(24).toString('base64url'), { mode: 0o600 });
    try {
      // Whole or not at all, and never over a password that exists.
      await link(aside, file);
    } catch (error) {
      if (!hasCode(error, 'EEXIST')) throw error;
    } finally {
      await rm(aside, { force: true });
    }
  }
  try {
    return (await readFile(file, 'utf8')).trim();
  } catch (error) {
    if (hasCode(error, 'ENOENT')) throw new Fault(`The database's password is missing: ${file} is not there.`);
    if (hasCode(error, 'EACCES')) throw new Fault(`The database's password in ${file} is not readable for you.`);
    throw error;
  }
}

/**
 * @param {{ home: import('./home.mjs').Home, binaries: string, ephemeral: boolean, folder: string, password: string }} options
 */
async function initialise({ home, binaries, ephemeral, folder, password }) {
  const aside = `${folder}.new-${process.pid}`;
  const passwordFile = `${aside}.password`;
  try {
    await mkdir(aside, { mode: 0o700 });
    await writeFile(passwordFile, password, { mode: 0o600 });
    if (home.user !== null) {
      await chown(aside, home.user.uid, home.user.gid);
      await chown(passwordFile, home.user.uid, home.user.gid);
    }
    await initdb({ home, binaries, ephemeral, folder: aside, passwordFile });
    await rename(aside, folder);
  } catch (error) {
    // Another process was quicker: its folder counts, made with the same password.
    if (!hasCode(error, 'ENOTEMPTY', 'EEXIST')) throw error;
  } finally {
    await rm(aside, { recursive: true, force: true });
    await rm(passwordFile, { force: true });
  }
}

/**
 * @param {{ home: import('./home.mjs').Home, binaries: string, ephemeral: boolean, folder: string, passwordFile: string }} options
 * @returns {Promise<void>}
 */
function initdb({ home, binaries, ephemeral, folder, passwordFile }) {
  const args = [
    `--pgdata=${folder}`,
    '--username=groundward',
    `--pwfile=${passwordFile}`,
    '--auth=scram-sha-256',
    '--encoding=UTF8',
    '--locale=C',
    '--locale-provider=builtin',
    '--builtin-locale=C.UTF-8',
    '--no-instructions',
    ...(ephemeral ? ['--no-sync'] : []),
  ];
  return new Promise((resolve, reject) => {
    const child = spawn(join(binaries, 'bin', 'initdb'), args, {
      ...(home.user === null ? {} : { uid: home.user.uid, gid: home.user.gid }),
      cwd: home.folder,
      env: serverEnvironment,
      stdio: ['ignore', 'ignore', 'pipe'],
    });
    let said = '';
    child.stderr.on('data', (chunk) => (said += chunk));
    child.on('error', (error) => reject(new Fault(`The database cannot be made: ${error.message}.`)));
    child.on('close', (code) => {
      if (code === 0) resolve();
      else reject(new Fault(`The database in ${home.folder} cannot be made: ${firstFault(said)}.`));
    });
  });
}

/** @param {string} said */
const firstFault = (said) =>
  /(?:error|fatal):\s*(.+)/i.exec(said)?.[1] ?? said.trim().split('\n').at(-1) ?? 'initdb failed';

/** Nothing of the caller's environment, where `PG…` variables would change what the server does. */
export const serverEnvironment = { PATH: '/usr/bin:/bin', LANG: 'C', LC_ALL: 'C', TZ: 'UTC' };

/** @param {string} home */
async function removeBrokenOff(home) {
  for (const name of await readdir(home)) {
    const match = /^cluster\.new-(\d+)/.exec(name);
    const pid = Number(match?.[1]);
    if (match !== null && (pid === process.pid || !isAlive(pid))) {
      await rm(join(home, name), { recursive: true, force: true });
    }
  }
}
