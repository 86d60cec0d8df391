import { readFileSync } from 'node:fs';
import { hasCode } from '../fault.mjs';

/**
 * @param {number} pid
 * @returns {boolean} whether a process of this id runs, of whatever user; one that has ended and only waits for its
 *   parent to take notice doesn't
 */
export function isAlive(pid) {
  try {
    process.kill(pid, 0);
  } catch (error) {
    if (!hasCode(error, 'EPERM')) return false;
  }
  return !isDefunct(pid);
}

/** @param {number} pid */
function isDefunct(pid) {
  if (process.platform !== 'linux') return false;
  try {
    // The state follows the program's name, which stands in parentheses and may hold any character.
    return /^[^]*\) [ZX]/.test(readFileSync(`/proc/${pid}/stat`, 'utf8'));
  } catch (error) {
    if (hasCode(error, 'ENOENT', 'ESRCH')) return true;
    throw error;
  }
}
