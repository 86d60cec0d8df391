import { join } from 'node:path';
import { setTimeout as pause } from 'node:timers/promises';
import { pathToFileURL } from 'node:url';
import { ensureInstalled } from '../build/install.mjs';
import { root } from '../build/root.mjs';
import { endRunning, step } from '../build/step.mjs';
import { everything, ensureBuilt } from '../build/steps.mjs';
import { sentenceOf } from '../fault.mjs';
import { addressFault, checkAddress } from './address.mjs';
import { openDatabase } from './database.mjs';
import { watchParent } from './parent.mjs';
import { readSettings } from './settings.mjs';

/** How long requests under way are waited for when the service stops [ms]. */
const LAST_REQUESTS = 10_000;

const progress = (/** @type {string} */ line) => console.log(line);

/** What is open, to be closed in the opposite order. @type {(() => Promise<unknown>)[]} */
const open = [];

/**
 * Starts everything, says where it is, and stops it all on Ctrl-C, SIGTERM or SIGHUP.
 *
 * @returns {Promise<void>}
 */
export async function start() {
  const asked = new AbortController();
  const starting = startAll(asked.signal);
  /** @type {Promise<void> | null} */
  let stopping = null;
  const stop = (/** @type {number} */ code) => {
    asked.abort();
    return (stopping ??= stopAll(starting, code));
  };
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, () => void stop(0));
  if (process.env['npm_lifecycle_event'] !== undefined) watchParent(() => void stop(0));
  process.on('uncaughtException', (error) => {
    console.error(error);
    void stop(1);
  });
  try {
    const { lost } = await starting;
    console.error(await lost);
  } catch (error) {
    if (stopping === null) console.error(sentenceOf(error));
  }
  await stop(1);
}

/**
 * @param {AbortSignal} asked that it stop: looked at between the steps
 * @returns {Promise<{ lost: Promise<string> }>} resolves once it serves; `lost` when the database has gone
 */
async function startAll(asked) {
  const settings = readSettings(process.env);
  await checkAddress(settings);
  await ensureInstalled({ progress });
  asked.throwIfAborted();
  await ensureBuilt(everything, { progress });
  asked.throwIfAborted();

  // The service's modules are read while the database starts.
  process.env['NODE_ENV'] = 'production';
  const modules = Promise.all([load('api/dist/seed.js'), load('api/dist/main.js')]);
  modules.catch(() => undefined);
  const database = await openDatabase(settings, progress);
  open.push(database.stop);
  asked.throwIfAborted();

  const [{ seed }, { serve }] = await step('Loading the service', progress, () => modules);
  await step('Filling in the demo', progress, () => seed({ databaseUrl: database.url }));
  asked.throwIfAborted();
  const service = await step('Starting the service', progress, async () => {
    return serve({
      port: settings.port,
      host: settings.host,
      databaseUrl: database.url,
      webDir: join(root, 'web'),
      secretFile: join(settings.dataDir, 'secret'),
    }).catch((/** @type {unknown} */ error) => {
      throw addressFault(settings, error) ?? error;
    });
  });
  open.push(() => Promise.race([service.close(), pause(LAST_REQUESTS, undefined, { ref: false })]));

  console.log(`Groundward is ready: ${service.url}`);
  if (service.ownerLink !== undefined) {
    console.log(`Become its owner with this link, which works once: ${service.ownerLink}`);
  }
  return { lost: database.lost };
}

/**
 * @param {Promise<unknown>} starting a start still under way is let come to its next resting place first
 * @param {number} code the exit code
 */
async function stopAll(starting, code) {
  endRunning();
  await starting.catch(() => undefined);
  for (const close of open.reverse()) {
    try {
      await close();
    } catch (error) {
      console.error(sentenceOf(error));
      code = 1;
    }
  }
  process.exit(code);
}

/** @param {string} file */
const load = (file) => import(pathToFileURL(join(root, file)).href);
