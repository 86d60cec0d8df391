/** `npm run -w web types`: renews web/src/api-types.ts from the service's own OpenAPI document. */
import { mkdtemp, rm, writeFile } from 'node:fs/promises';
import { createRequire } from 'node:module';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { pathToFileURL } from 'node:url';
import { root } from './build/root.mjs';
import { ensureBuilt } from './build/steps.mjs';
import { startPostgres } from './database/postgres.mjs';
import { migrate } from './migrate/migrate.mjs';

// It stands in web's own modules, beside the compiler that it needs.
const generator = createRequire(join(root, 'web/package.json')).resolve('openapi-typescript');
const { default: openapiTS, astToString } = createRequire(join(root, 'web/package.json'))(generator);

await ensureBuilt(['engine', 'client', 'api'], { progress: console.log });
const folder = await mkdtemp(join(tmpdir(), 'groundward-types-'));
const database = await startPostgres({ dataDir: folder, ephemeral: true });
try {
  await migrate(database.url, { folder: join(root, 'prisma/migrations') });
  const { serve } = await import(pathToFileURL(join(root, 'api/dist/main.js')).href);
  const service = await serve({ port: 0, host: '127.0.0.1', databaseUrl: database.url });
  const answer = await fetch(`${service.url}/api/openapi.json`);
  const types = astToString(await openapiTS(JSON.stringify(await answer.json())));
  await writeFile(join(root, 'web/src/api-types.ts'), types);
  await service.close();
} finally {
  await database.stop();
  await rm(folder, { recursive: true, force: true });
}
