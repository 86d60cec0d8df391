/** `npm run build`: engine, database client, service, dashboard; each only when its sources changed. */
import { ensureInstalled } from './build/install.mjs';
import { everything, ensureBuilt } from './build/steps.mjs';
import { sentenceOf } from './fault.mjs';

const progress = (/** @type {string} */ line) => console.log(line);

try {
  await ensureInstalled({ progress });
  await ensureBuilt(everything, { progress });
} catch (error) {
  console.error(sentenceOf(error));
  process.exitCode = 1;
}
