import { spawn } from 'node:child_process';

/**
 * Takes the lines that tell a waiting person what is being done.
 * @typedef {(line: string) => void} Progress
 */

/** Steps quicker than this are not worth a line [ms]. */
const WORTH_A_LINE = 1000;

/**
 * Does one step and says so, once it has taken longer than a second, and again when it is done.
 *
 * @template T
 * @param {string} title what is being done, as a phrase: `Building the engine`
 * @param {Progress} progress
 * @param {() => Promise<T>} work
 * @returns {Promise<T>}
 */
export async function step(title, progress, work) {
  const begun = Date.now();
  let told = false;
  const timer = setTimeout(() => {
    told = true;
    progress(`${title} …`);
  }, WORTH_A_LINE);
  try {
    const result = await work();
    if (told) progress(`${title}: done in ${((Date.now() - begun) / 1000).toFixed(1)} s`);
    return result;
  } finally {
    clearTimeout(timer);
  }
}

/**
 * Runs a program to its end without showing what it prints.
 *
 * @param {string} program
 * @param {readonly string[]} args
 * @param {{ cwd: string, env?: Record<string, string> }} options `env` is added to the present environment
 * @returns {Promise<string>} what it printed
 * @throws Error with the whole output when the program ends with anything but 0
 */
export function runQuietly(program, args, { cwd, env }) {
  return new Promise((resolve, reject) => {
    const child = spawn(program, args, { cwd, env: { ...process.env, ...env }, stdio: ['ignore', 'pipe', 'pipe'] });
    /** @type {Buffer[]} */
    const chunks = [];
    child.stdout.on('data', (chunk) => chunks.push(chunk));
    child.stderr.on('data', (chunk) => chunks.push(chunk));
    child.on('error', reject);
    child.on('close', (code, signal) => {
      const output = Buffer.concat(chunks).toString('utf8').trim();
      if (code === 0) resolve(output);
      else reject(new Error(`${[program, ...args].join(' ')} ended with ${code ?? signal}:\n${output}`));
    });
  });
}
