/**
 * A process to be killed: holds a database until it is told to stop.
 * Writes one line of JSON, `{ url }` or `{ refused }`, to standard output.
 */
import { startPostgres } from '../../scripts/database/postgres.mjs';

const [dataDir] = process.argv.slice(2);
try {
  const postgres = await startPostgres(dataDir === undefined ? { ephemeral: true } : { dataDir });
  console.log(JSON.stringify({ url: postgres.url }));
  process.once('SIGTERM', () => {
    void postgres.stop().then(() => process.exit(0));
  });
  setInterval(() => undefined, 1000);
} catch (error) {
  console.log(JSON.stringify({ refused: error instanceof Error ? error.message : String(error) }));
}
