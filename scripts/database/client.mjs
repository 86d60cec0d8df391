import pg from 'pg';

/**
 * Connects to a server of this launcher's.
 *
 * @param {import('./postmaster.mjs').Server} server
 * @param {string} password
 * @param {{ database?: string }} [options]
 * @returns {Promise<pg.Client>}
 */
export async function connect(server, password, { database = 'postgres' } = {}) {
  const client = new pg.Client({
    host: '127.0.0.1',
    port: server.port,
    user: 'groundward',
    password,
    database,
    ssl: false,
    // By it a second process learns who owns the server.
    application_name: `groundward ${process.pid}`,
    connectionTimeoutMillis: 10_000,
    keepAlive: true,
  });
  await client.connect();
  return client;
}

/**
 * @param {import('./postmaster.mjs').Server} server
 * @param {string} password
 * @param {string} name of the database: a plain word
 */
export async function ensureDatabase(server, password, name) {
  const client = await connect(server, password);
  try {
    const found = await client.query('select from pg_database where datname = $1', [name]);
    if (found.rowCount === 0) await client.query(`create database "${name}"`);
  } finally {
    await client.end();
  }
}
