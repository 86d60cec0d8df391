/** `node scripts/migrate.mjs`: brings the database named in DATABASE_URL to the present state. */
import { join } from 'node:path';
import { root } from './build/root.mjs';
import { sentenceOf } from './fault.mjs';
import { migrate } from './migrate/migrate.mjs';

try {
  const { applied } = await migrate(process.env['DATABASE_URL'] ?? '', { folder: join(root, 'prisma', 'migrations') });
  console.log(applied.length === 0 ? 'Nothing to migrate.' : `Applied ${applied.join(', ')}.`);
} catch (error) {
  console.error(sentenceOf(error));
  process.exitCode = 1;
}
