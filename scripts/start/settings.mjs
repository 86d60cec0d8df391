import { join, resolve } from 'node:path';
import { calledFrom } from '../build/called-from.mjs';
import { root } from '../build/root.mjs';
import { Fault } from '../fault.mjs';

/**
 * What the environment says. `databaseUrl` is null where the embedded database is to be used.
 * @typedef {{ port: number, host: string, dataDir: string, databaseUrl: string | null }} Settings
 */

/**
 * @param {Record<string, string | undefined>} env
 * @returns {Settings}
 * @throws Fault when PORT isn't one
 */
export function readSettings(env) {
  const port = Number(given(env['PORT']) ?? 4600);
  if (!Number.isInteger(port) || port < 1 || port > 65535) {
    throw new Fault(`PORT must be a whole number from 1 to 65535; it is "${env['PORT']}".`);
  }
  return {
    port,
    host: given(env['HOST']) ?? '127.0.0.1',
    dataDir: resolve(calledFrom, given(env['GROUNDWARD_DATA']) ?? join(root, '.groundward')),
    databaseUrl: given(env['DATABASE_URL']) ?? null,
  };
}

/**
 * @param {string | undefined} value
 * @returns {string | undefined} an empty value counts as none
 */
const given = (value) => (value?.trim() === '' ? undefined : value?.trim());
