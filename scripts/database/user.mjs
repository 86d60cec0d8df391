import { spawnSync } from 'node:child_process';
import { readFile, stat } from 'node:fs/promises';

/**
 * The user who runs the server. `null` means: the present one.
 * @typedef {{ uid: number, gid: number, name: string } | null} ServerUser
 */

/** PostgreSQL refuses to run as root: the first of these that the machine knows runs it instead. */
const SUBSTITUTES = ['postgres', 'nobody', 'daemon'];

/**
 * @param {string} cluster the folder of the data; an existing one is served by the user who owns it
 * @returns {Promise<ServerUser>}
 * @throws Error when this process is root and the machine knows no other user
 */
export async function serverUser(cluster) {
  if (process.getuid?.() !== 0) return null;
  const users = await knownUsers();
  const owner = (await stat(cluster).catch(() => null))?.uid ?? 0;
  const owning = users.find((user) => user.uid === owner && owner !== 0);
  if (owning !== undefined) return owning;
  const found = SUBSTITUTES.map((name) => users.find((user) => user.name === name)).find((user) => user !== undefined);
  if (found === undefined) {
    throw new Error(`PostgreSQL refuses to run as root, and there is no user ${SUBSTITUTES.join(', ')} to run it as.`);
  }
  return found;
}

async function knownUsers() {
  const lines = (await readFile('/etc/passwd', 'utf8')).split('\n');
  return lines.flatMap((line) => {
    const [name, , uid, gid] = line.split(':');
    return name !== undefined && uid !== undefined ? [{ name, uid: Number(uid), gid: Number(gid) }] : [];
  });
}

/**
 * @param {ServerUser} user
 * @param {string} folder
 * @returns {boolean} whether the user can go into the folder, through all folders above it
 */
export function canReach(user, folder) {
  if (user === null) return true;
  const { uid, gid } = user;
  return spawnSync('/bin/sh', ['-c', 'cd -- "$1"', 'sh', folder], { uid, gid, cwd: '/', stdio: 'ignore' }).status === 0;
}
