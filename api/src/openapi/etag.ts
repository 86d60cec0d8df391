/** Versions as entity tags: `"7"`. */
import { Problem } from '../faults/problem.js';

export function etagOf(version: number): string {
  return `"${version}"`;
}

/** The version that a write names in If-Match. */
export function versionIn(ifMatch: string | undefined): number {
  if (ifMatch === undefined || ifMatch.trim() === '') {
    throw new Problem(428, 'version-missing', 'A write must name in If-Match the ETag that it saw.');
  }
  const match = /^(?:W\/)?"(\d{1,9})"$/.exec(ifMatch.trim());
  if (match === null)
    throw new Problem(400, 'wrong-version', `If-Match must be one ETag such as "3"; it is ${ifMatch.slice(0, 40)}.`);
  return Number(match[1]);
}
