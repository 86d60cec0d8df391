/** The key that sessions are signed with. */
import { randomBytes } from 'node:crypto';
import { mkdir, readFile, writeFile } from 'node:fs/promises';
import { dirname } from 'node:path';

const SHORTEST = 32;

/**
 * GROUNDWARD_SECRET where it is set, else the key kept in a file, made once and readable by its owner alone: sessions
 * outlive a restart. Without a file the key lasts as long as the process.
 */
export async function secretOf(file: string | undefined): Promise<string> {
  const stated = process.env['GROUNDWARD_SECRET'];
  if (stated !== undefined && stated !== '') return checked(stated, 'GROUNDWARD_SECRET');
  if (file === undefined) return newSecret();
  const kept = await read(file);
  if (kept !== undefined) return checked(kept, file);
  await mkdir(dirname(file), { recursive: true });
  const secret = newSecret();
  try {
    await writeFile(file, `${secret}\n`, { mode: 0o600, flag: 'wx' });
    return secret;
  } catch (error) {
    // Another process made one in the meantime.
    if (!hasCode(error, 'EEXIST')) throw error;
    return checked((await read(file)) ?? '', file);
  }
}

function newSecret(): string {
  return randomBytes(SHORTEST).toString('base64url');
}

async function read(file: string): Promise<string | undefined> {
  try {
    return (await readFile(file, 'utf8')).trim();
  } catch (error) {
    if (hasCode(error, 'ENOENT')) return undefined;
    throw error;
  }
}

function checked(secret: string, from: string): string {
  if (secret.length >= SHORTEST) return secret;
  throw new Error(`The key in ${from} must have at least ${SHORTEST} characters.`);
}

function hasCode(error: unknown, code: string): boolean {
  return error instanceof Error && 'code' in error && error.code === code;
}
