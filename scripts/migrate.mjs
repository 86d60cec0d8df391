/** `node scripts/migrate.mjs`: brings the database named in DATABASE_URL to the present state. */
import { join } from 'node:path';
import { root } from './build/root.mjs';
import { DatabaseFault } from './database/fault.mjs';
import { migrate } from './migrate/migrate.mjs';

try {
  const { applied } = await migrate(process.env['DATABASE_URL'] ?? '', { folder: join(root, 'prisma', 'migrations') });
  console.log(applied.length === 0 ? 'Nothing to migrate.' : `Applied ${applied.join(', ')}.`);
} catch (error) {
  if (!(error instanceof DatabaseFault)) throw error;
  console.error(error.message);
  process.exitCode = 1;
}
