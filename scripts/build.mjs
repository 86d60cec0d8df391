/** `npm run build`: engine, database client, service, dashboard; each only when its sources changed. */
import { ensureInstalled } from './build/install.mjs';
import { everything, ensureBuilt } from './build/steps.mjs';

const progress = (/** @type {string} */ line) => console.log(line);

try {
  await ensureInstalled({ progress });
  await ensureBuilt(everything, { progress });
} catch (error) {
  console.error(error instanceof Error ? error.message : error);
  process.exitCode = 1;
}
