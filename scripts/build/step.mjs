import { spawn } from 'node:child_process';
import { Fault } from '../fault.mjs';

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
 * @throws Fault with the whole output when the program ends with anything but 0
 */
export function runQuietly(program, args, { cwd, env }) {
  return new Promise((resolve, reject) => {
    const child = spawn(program, args, { cwd, env: { ...process.env, ...env }, stdio: ['ignore', 'pipe', 'pipe'] });
    running.add(child);
    /** @type {Buffer[]} */
    const chunks = [];
    child.stdout.on('data', (chunk) => chunks.push(chunk));
    child.stderr.on('data', (chunk) => chunks.push(chunk));
    child.on('error', (error) => {
      running.delete(child);
      reject(error);
    });
    child.on('close', (code, signal) => {
      running.delete(child);
      const output = Buffer.concat(chunks).toString('utf8').trim();
      if (code === 0) resolve(output);
      else reject(new Fault(`${[program, ...args].join(' ')} ended with ${code ?? signal}:\n${output}`));
    });
  });
}

/** @type {Set<import('node:child_process').ChildProcess>} */
const running = new Set();

/** Ends all programs that {@link runQuietly} runs at the moment; each then fails. */
export function endRunning() {
  for (const child of running) child.kill('SIGTERM');
}
