import { Fault } from '../fault.mjs';

/**
 * Compares the migrations' files with what the database says was applied.
 *
 * @param {readonly import('./files.mjs').Migration[]} migrations
 * @param {readonly { name: string, checksum: string, finished: boolean }[]} history
 * @returns {import('./files.mjs').Migration[]} those not applied yet, in order
 * @throws Fault when one failed earlier, is unknown here, or was edited after it was applied
 */
export function checkHistory(migrations, history) {
  const files = new Map(migrations.map((migration) => [migration.name, migration]));
  for (const { name, checksum, finished } of history) {
    if (!finished) {
      throw new Fault(
        `The migration ${name} failed earlier and may have been applied in part: put the database right, then mark the row ` +
          'in _prisma_migrations as finished or rolled back.',
      );
    }
    const file = files.get(name);
    if (file === undefined) {
      throw new Fault(`The database knows a migration ${name} that is not here: a newer Groundward has used it.`);
    }
    if (file.checksum !== checksum) {
      throw new Fault(`The migration ${name} was edited after it was applied to this database.`);
    }
  }
  const applied = new Set(history.map(({ name }) => name));
  return migrations.filter(({ name }) => !applied.has(name));
}
