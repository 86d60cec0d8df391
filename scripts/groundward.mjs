#!/usr/bin/env node
/**
 * The command line's door: builds the engine when it is stale or absent, then hands over to it.
 * Standard output carries nothing but the command's own output; progress goes to standard error.
 */
import { readFile } from 'node:fs/promises';
import { resolve } from 'node:path';
import { pathToFileURL } from 'node:url';
import { calledFrom } from './build/called-from.mjs';
import { root } from './build/root.mjs';
import { sentenceOf } from './fault.mjs';
import { nodeVersionFault } from './start/node-version.mjs';

/** The commands' own exit codes are 0 to 3; this one says that none of them ran. */
const COULD_NOT_RUN = 70;

/**
 * Writes a text and waits until the stream has taken it, so that a long table on a pipe arrives whole.
 * A reader that went away (`| head`) is not an error.
 *
 * @param {NodeJS.WriteStream} stream
 */
function writer(stream) {
  stream.on('error', (error) => {
    if (!('code' in error) || error.code !== 'EPIPE') throw error;
  });
  /** @param {string} text */
  return (text) => {
    stream.write(text);
  };
}

async function readStdin() {
  const chunks = [];
  for await (const chunk of process.stdin) chunks.push(chunk);
  return Buffer.concat(chunks).toString('utf8');
}

const out = writer(process.stdout);
const err = writer(process.stderr);

async function run() {
  const fault = nodeVersionFault(process.versions.node);
  if (fault !== null) {
    err(`${fault}\n`);
    return COULD_NOT_RUN;
  }
  const { ensureInstalled } = await import('./build/install.mjs');
  const { ensureBuilt } = await import('./build/steps.mjs');
  /** @param {string} line */
  const progress = (line) => err(`${line}\n`);
  await ensureInstalled({ progress });
  await ensureBuilt(['engine'], { progress });
  const door = await import(pathToFileURL(`${root}/engine/dist/command/groundward.js`).href);
  return door.main(process.argv.slice(2), {
    readFile: (/** @type {string} */ path) => readFile(resolve(calledFrom, path), 'utf8'),
    readStdin,
    out,
    err,
  });
}

try {
  // The exit code alone is set: the process ends by itself once all output has been taken.
  process.exitCode = await run();
} catch (error) {
  err(`${sentenceOf(error)}\n`);
  process.exitCode = COULD_NOT_RUN;
}
