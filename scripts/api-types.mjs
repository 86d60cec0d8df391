/** `npm run -w web types`: renews web/src/api-types.ts from the service's own OpenAPI document. */
import { mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { pathToFileURL } from 'node:url';
import { root } from './build/root.mjs';
import { ensureBuilt } from './build/steps.mjs';
import { startPostgres } from './database/postgres.mjs';
import { CLIENT_TYPES, clientTypes } from './openapi/client-types.mjs';
import { migrate } from './migrate/migrate.mjs';

await ensureBuilt(['engine', 'client', 'api'], { progress: console.log });
const folder = await mkdtemp(join(tmpdir(), 'groundward-types-'));
const database = await startPostgres({ dataDir: folder, ephemeral: true });
try {
  await migrate(database.url, { folder: join(root, 'prisma/migrations') });
  const { serve } = await import(pathToFileURL(join(root, 'api/dist/main.js')).href);
  const service = await serve({ port: 0, host: '127.0.0.1', databaseUrl: database.url });
  const answer = await fetch(`${service.url}/api/openapi.json`);
  await writeFile(CLIENT_TYPES, await clientTypes(await answer.json()));
  await service.close();
} finally {
  await database.stop();
  await rm(folder, { recursive: true, force: true });
}
