/**
 * `npm test`: installs and builds what is needed, checks format, lint and types, runs all tests against a PostgreSQL
 * of their own, and closes with one line: how many passed, failed and were skipped.
 * Arguments after `--` go to the test runner: `npm test -- test/published`.
 */
import { nodeVersionFault } from './start/node-version.mjs';

const fault = nodeVersionFault(process.versions.node);
if (fault === null) {
  const { test } = await import('./test/test.mjs');
  process.exitCode = await test(process.argv.slice(2));
} else {
  console.error(fault);
  process.exitCode = 1;
}
