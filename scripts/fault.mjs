/** Something that a person is told in one plain sentence, without a stack trace. */
export class Fault extends Error {
  /** @override */
  name = 'Fault';
}

/**
 * @param {unknown} error
 * @returns {string} a fault's sentence; of anything else, which nobody foresaw, all there is to know
 */
export function sentenceOf(error) {
  if (error instanceof Fault) return error.message;
  return error instanceof Error ? (error.stack ?? error.message) : String(error);
}

/**
 * @param {unknown} error
 * @param {...string} codes system error codes, as `ENOENT`, or SQLSTATEs
 * @returns {boolean} whether the error carries one of the codes
 */
export function hasCode(error, ...codes) {
  return error instanceof Error && 'code' in error && codes.includes(String(error.code));
}
