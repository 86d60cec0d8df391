/** As in package.json's `engines`. */
const WANTED = [20, 19];

/**
 * @param {string} version `process.versions.node`
 * @returns {string | null} the sentence that says what is wrong with this Node, or null
 */
export function nodeVersionFault(version) {
  const [major = 0, minor = 0] = version.split('.').map(Number);
  const [wantedMajor = 0, wantedMinor = 0] = WANTED;
  if (major > wantedMajor || (major === wantedMajor && minor >= wantedMinor)) return null;
  return `Groundward needs Node.js ${WANTED.join('.')} or newer; this is ${version}.`;
}
