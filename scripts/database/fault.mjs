/** A database that cannot be had, with the one sentence that a person is told. */
export class DatabaseFault extends Error {
  /** @override */
  name = 'DatabaseFault';
}

/**
 * @param {unknown} error
 * @param {...string} codes system error codes, as `ENOENT`
 * @returns {boolean} whether the error carries one of the codes
 */
export function hasCode(error, ...codes) {
  return error instanceof Error && 'code' in error && codes.includes(String(error.code));
}
