import { ensureInstalled } from '../build/install.mjs';
import { everything, ensureBuilt } from '../build/steps.mjs';
import { step } from '../build/step.mjs';
import { sentenceOf } from '../fault.mjs';
import { findChromium } from './chromium.mjs';
import { staticChecks } from './static-checks.mjs';
import { runVitest } from './vitest.mjs';

/**
 * What came of some checks.
 * @typedef {{ passed: number, failed: number, skipped: number }} Tally
 */

const progress = (/** @type {string} */ line) => console.log(line);

/**
 * @param {string[]} args for the test runner
 * @returns {Promise<number>} the exit code: 0 when nothing failed
 */
export async function test(args) {
  /** @type {Tally[]} */
  const tallies = [];
  try {
    await ensureInstalled({ progress });
    await ensureBuilt(everything, { progress });
    tallies.push(await staticChecks(progress));
    tallies.push(await withDatabase(args));
  } catch (error) {
    console.error(sentenceOf(error));
    tallies.push({ passed: 0, failed: 1, skipped: 0 });
  }
  const { passed, failed, skipped } = total(tallies);
  console.log(`${passed} passed, ${failed} failed, ${skipped} skipped`);
  return failed === 0 ? 0 : 1;
}

/** @param {string[]} args */
async function withDatabase(args) {
  const { startPostgres } = await import('../database/postgres.mjs');
  const { chromium, tally } = findBrowser();
  const database = await step('Starting the tests’ database', progress, () => startPostgres({ ephemeral: true }));
  try {
    const ran = await runVitest(args, {
      GROUNDWARD_TEST_DATABASE_URL: database.url,
      ...(chromium === null ? {} : { GROUNDWARD_CHROMIUM: chromium }),
    });
    return total([tally, ran]);
  } finally {
    await database.stop();
  }
}

/** @returns {{ chromium: string | null, tally: Tally }} */
function findBrowser() {
  const { path, looked } = findChromium(process.env);
  if (path !== null) return { chromium: path, tally: { passed: 0, failed: 0, skipped: 0 } };
  const missing = `no Chromium on this machine (looked for ${looked.join(', ')}; CHROMIUM_PATH names another)`;
  if (process.env['CI'] === 'true') {
    console.error(`The browser tests cannot run: ${missing}.`);
    return { chromium: null, tally: { passed: 0, failed: 1, skipped: 0 } };
  }
  console.log(`Skipping the browser tests: ${missing}.`);
  return { chromium: null, tally: { passed: 0, failed: 0, skipped: 0 } };
}

/**
 * @param {readonly Tally[]} tallies
 * @returns {Tally}
 */
function total(tallies) {
  const sum = { passed: 0, failed: 0, skipped: 0 };
  for (const tally of tallies) {
    sum.passed += tally.passed;
    sum.failed += tally.failed;
    sum.skipped += tally.skipped;
  }
  return sum;
}
