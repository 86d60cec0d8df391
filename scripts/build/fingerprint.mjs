import { createHash } from 'node:crypto';
import { readdir, readFile, stat } from 'node:fs/promises';
import { join, relative } from 'node:path';

/** What a build writes, next to what it reads. */
const OUTPUT = new Set(['node_modules', 'dist', '.next', 'generated', 'next-env.d.ts']);

/**
 * A digest of files and of all files below folders, by relative path and content.
 *
 * @param {string} root
 * @param {readonly string[]} inputs paths below `root`; one that doesn't exist counts as empty
 * @returns {Promise<string>} SHA-256, hexadecimal
 */
export async function fingerprint(root, inputs) {
  const hash = createHash('sha256');
  for (const input of inputs) {
    for (const file of await filesBelow(join(root, input))) {
      const content = await readFile(file);
      hash.update(`${relative(root, file)}\0${content.length}\0`).update(content);
    }
  }
  return hash.digest('hex');
}

/**
 * @param {string} path a file or a folder
 * @returns {Promise<string[]>} the file itself, or all files below the folder, sorted
 */
async function filesBelow(path) {
  const found = await stat(path).catch(() => null);
  if (found === null) return [];
  if (found.isFile()) return [path];
  const names = (await readdir(path)).filter((name) => !OUTPUT.has(name) && !name.endsWith('.tsbuildinfo')).sort();
  return (await Promise.all(names.map((name) => filesBelow(join(path, name))))).flat();
}
