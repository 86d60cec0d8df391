import { mkdir } from 'node:fs/promises';
import { join } from 'node:path';
import { root } from '../build/root.mjs';
import { step } from '../build/step.mjs';
import { Fault } from '../fault.mjs';

/**
 * Opens the database that the settings name, or the embedded one, and brings it to the present state.
 * Its modules need installed packages and are therefore imported here only.
 *
 * @param {import('./settings.mjs').Settings} settings
 * @param {import('../build/step.mjs').Progress} progress
 * @returns {Promise<{ url: string, lost: Promise<string>, stop: () => Promise<void> }>} `lost` resolves with a sentence
 *   when an embedded database ends without having been asked to
 */
export async function openDatabase({ dataDir, databaseUrl }, progress) {
  const { startPostgres } = await import('../database/postgres.mjs');
  const { migrate } = await import('../migrate/migrate.mjs');
  // For the service's own secret; an embedded database makes the folder itself.
  if (databaseUrl !== null) await makeFolder(dataDir);
  const database =
    databaseUrl === null
      ? await step('Starting the database', progress, () => startPostgres({ dataDir, progress }))
      : { url: databaseUrl, lost: new Promise(() => undefined), stop: async () => undefined };
  try {
    await step('Migrating the database', progress, () =>
      migrate(database.url, { folder: join(root, 'prisma', 'migrations') }),
    );
    return database;
  } catch (error) {
    await database.stop();
    throw error;
  }
}

/** @param {string} folder */
async function makeFolder(folder) {
  try {
    await mkdir(folder, { recursive: true, mode: 0o700 });
  } catch (error) {
    const reason = error instanceof Error ? error.message : String(error);
    throw new Fault(`The folder ${folder} (GROUNDWARD_DATA) cannot be made: ${reason}.`);
  }
}
