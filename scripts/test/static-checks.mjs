import { join } from 'node:path';
import { root } from '../build/root.mjs';
import { runQuietly, step } from '../build/step.mjs';
import { sentenceOf } from '../fault.mjs';

/** @type {readonly (readonly [title: string, program: string, ...args: string[]])[]} */
const CHECKS = [
  ['Checking the format', 'prettier/bin/prettier.cjs', '--check', '.'],
  ['Checking the code', 'eslint/bin/eslint.js', '.', '--max-warnings', '0'],
  ['Checking the types of the tests', 'typescript/bin/tsc', '-p', 'test'],
  ['Checking the types of the scripts', 'typescript/bin/tsc', '-p', 'scripts'],
];

/**
 * Format, lint and the types of what no build compiles. Each counts as one check; all are run, whatever fails.
 *
 * @param {import('../build/step.mjs').Progress} progress
 * @returns {Promise<import('./test.mjs').Tally>}
 */
export async function staticChecks(progress) {
  const tally = { passed: 0, failed: 0, skipped: 0 };
  for (const [title, program, ...args] of CHECKS) {
    try {
      await step(title, progress, () =>
        runQuietly(process.execPath, [join(root, 'node_modules', program), ...args], { cwd: root }),
      );
      tally.passed += 1;
    } catch (error) {
      console.error(sentenceOf(error));
      tally.failed += 1;
    }
  }
  return tally;
}
