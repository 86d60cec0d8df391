import { readFile } from 'node:fs/promises';
import { join } from 'node:path';
import { root } from './root.mjs';
import { runQuietly, step } from './step.mjs';

/**
 * Installs the packages that `package-lock.json` names, unless they are there already.
 *
 * @param {{ progress: import('./step.mjs').Progress }} options
 * @throws Fault with npm's own words when the installation fails
 */
export async function ensureInstalled({ progress }) {
  if (await isInstalled(root)) return;
  const args = ['ci', '--include=dev', '--ignore-scripts', '--no-audit', '--no-fund'];
  // Called through `npm start`, the same npm does the work, without a search along the PATH.
  const npm = process.env['npm_execpath'];
  await step('Installing packages (npm ci)', progress, () =>
    npm?.endsWith('npm-cli.js') === true
      ? runQuietly(process.execPath, [npm, ...args], { cwd: root })
      : runQuietly('npm', args, { cwd: root }),
  );
}

/**
 * Compares the lock file with the record that npm leaves in `node_modules` after each complete installation.
 * An optional package (binaries of another platform) may be absent, but not of another version.
 *
 * @param {string} folder
 * @returns {Promise<boolean>}
 */
export async function isInstalled(folder) {
  const wanted = await packagesOf(join(folder, 'package-lock.json'));
  const present = await packagesOf(join(folder, 'node_modules', '.package-lock.json'));
  if (wanted === null || present === null) return false;
  return Object.entries(wanted)
    .filter(([path]) => path.includes('node_modules/'))
    .every(([path, entry]) => {
      const found = present[path];
      if (found === undefined) return entry.optional === true || entry.devOptional === true;
      return found.version === entry.version && found.integrity === entry.integrity;
    });
}

/**
 * @param {string} file
 * @returns {Promise<Record<string, { version?: string, integrity?: string, optional?: boolean, devOptional?: boolean }> | null>}
 */
async function packagesOf(file) {
  try {
    return JSON.parse(await readFile(file, 'utf8')).packages;
  } catch (error) {
    if (error instanceof Error && 'code' in error && error.code === 'ENOENT') return null;
    throw error;
  }
}
