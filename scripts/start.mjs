/**
 * `npm start`: installs, builds, starts the database, migrates, seeds and serves, all that only as far as needed.
 * Everything but the Node version's check is imported after it, so that an old Node still gets its sentence.
 */
import { nodeVersionFault } from './start/node-version.mjs';

const fault = nodeVersionFault(process.versions.node);
if (fault === null) {
  const { start } = await import('./start/start.mjs');
  await start();
} else {
  console.error(fault);
  process.exitCode = 1;
}
