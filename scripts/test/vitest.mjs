import { spawn } from 'node:child_process';
import { mkdtemp, readFile, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { root } from '../build/root.mjs';

/**
 * Runs the tests, showing what the runner shows.
 *
 * @param {readonly string[]} args
 * @param {Record<string, string>} env added to the present environment
 * @returns {Promise<import('./test.mjs').Tally>}
 */
export async function runVitest(args, env) {
  const folder = await mkdtemp(join(tmpdir(), 'groundward-report-'));
  const report = join(folder, 'report.json');
  try {
    const code = await run([...args, '--reporter=default', '--reporter=json', `--outputFile.json=${report}`], env);
    return tallyOf(await readFile(report, 'utf8').catch(() => null), code);
  } finally {
    await rm(folder, { recursive: true, force: true });
  }
}

/**
 * Reads the runner's report. What failed outside of any test (a file that doesn't load, a promise nobody waited for,
 * a runner that broke off) counts as one failure at least.
 *
 * @param {string | null} report as JSON; null when there is none
 * @param {number} code the runner's exit code
 * @returns {import('./test.mjs').Tally}
 */
export function tallyOf(report, code) {
  if (report === null) return { passed: 0, failed: 1, skipped: 0 };
  const { numPassedTests, numFailedTests, numPendingTests, numTodoTests, testResults } = JSON.parse(report);
  const unloaded = testResults.filter(
    (/** @type {{ status: string, assertionResults: { status: string }[] }} */ { status, assertionResults }) =>
      status === 'failed' && !assertionResults.some((result) => result.status === 'failed'),
  ).length;
  const failed = numFailedTests + unloaded;
  return {
    passed: numPassedTests,
    failed: failed === 0 && code !== 0 ? 1 : failed,
    skipped: numPendingTests + numTodoTests,
  };
}

/**
 * @param {readonly string[]} args
 * @param {Record<string, string>} env
 * @returns {Promise<number>} the exit code
 */
function run(args, env) {
  return new Promise((resolve, reject) => {
    const child = spawn(process.execPath, [join(root, 'node_modules/vitest/vitest.mjs'), 'run', ...args], {
      cwd: root,
      env: { ...process.env, ...env },
      stdio: ['ignore', 'inherit', 'inherit'],
    });
    child.on('error', reject);
    child.on('close', (code) => resolve(code ?? 1));
  });
}
