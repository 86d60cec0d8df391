import { createHash } from 'node:crypto';
import { readdir, readFile } from 'node:fs/promises';
import { join } from 'node:path';
import { Fault } from '../fault.mjs';

/**
 * One migration's file. `checksum`: SHA-256 of its bytes, hexadecimal, as Prisma records it.
 * @typedef {{ name: string, sql: string, checksum: string }} Migration
 */

/** A file that ended the transaction around it could fail half-way. */
const TRANSACTION = /^\s*(?:begin|start\s+transaction|commit|rollback)\s*;/im;

/**
 * @param {string} folder
 * @returns {Promise<Migration[]>} in the order of their names
 * @throws Fault when a file begins or ends transactions itself
 */
export async function readMigrations(folder) {
  const entries = await readdir(folder, { withFileTypes: true });
  const names = entries.filter((entry) => entry.isDirectory()).map(({ name }) => name);
  return Promise.all(names.sort().map((name) => readMigration(folder, name)));
}

/**
 * @param {string} folder
 * @param {string} name
 */
async function readMigration(folder, name) {
  const content = await readFile(join(folder, name, 'migration.sql'));
  const sql = content.toString('utf8');
  const found = TRANSACTION.exec(sql)?.[0].trim();
  if (found !== undefined) {
    throw new Fault(`The migration ${name} says "${found}": each file already runs in a transaction of its own.`);
  }
  return { name, sql, checksum: createHash('sha256').update(content).digest('hex') };
}
