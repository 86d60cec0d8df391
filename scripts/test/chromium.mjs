import { spawnSync } from 'node:child_process';
import { delimiter, join } from 'node:path';

const NAMES = ['chromium', 'chromium-browser', 'google-chrome', 'google-chrome-stable'];
const PLACES = [
  '/usr/bin/chromium',
  '/Applications/Chromium.app/Contents/MacOS/Chromium',
  '/Applications/Google Chrome.app/Contents/MacOS/Google Chrome',
];

/**
 * Finds a Chromium that starts: the one that CHROMIUM_PATH names and no other, else one along the PATH.
 *
 * @param {Record<string, string | undefined>} env
 * @returns {{ path: string | null, looked: string[] }} `looked`: what was looked for
 */
export function findChromium(env) {
  const named = env['CHROMIUM_PATH'];
  if (named !== undefined && named !== '') return { path: starts(named) ? named : null, looked: [named] };
  const folders = (env['PATH'] ?? '').split(delimiter).filter((folder) => folder !== '');
  const candidates = [...NAMES.flatMap((name) => folders.map((folder) => join(folder, name))), ...PLACES];
  return { path: candidates.find(starts) ?? null, looked: NAMES };
}

/**
 * A name along the PATH may be a mere stub that tells how to install the browser: only one that answers counts.
 *
 * @param {string} path
 */
const starts = (path) => spawnSync(path, ['--version'], { stdio: 'ignore', timeout: 20_000 }).status === 0;
