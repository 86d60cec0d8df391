import { setTimeout as pause } from 'node:timers/promises';
import { isAlive } from '../build/alive.mjs';
import { connect } from './client.mjs';
import { Fault, hasCode } from '../fault.mjs';

/**
 * A process owns a server as long as one session of its holds this advisory lock. The session ends with the process,
 * even a killed one, so that ownership can never outlive its owner. ("grnd", in the low half of the key.)
 */
const KEY = 0x67726e64;

/** The session of a process that was killed may live a moment longer than the process [ms]. */
const GRACE = 1500;

/** How long a server may take to accept a connection, after a crash for example [ms]. */
const PATIENCE = 60_000;

/**
 * `ended` resolves when the session ends, for whatever reason.
 * @typedef {{ ended: Promise<void>, release: () => Promise<void> }} Ownership
 *
 * What came of a claim: the server is owned now, or another living process owns it, or it ended meanwhile.
 * @typedef {{ state: 'owned', ownership: Ownership } | { state: 'taken', owner: string } | { state: 'ended' }} Claim
 */

/**
 * Makes this process the owner of a running server.
 *
 * @param {import('./postmaster.mjs').Server} server
 * @param {string} password
 * @returns {Promise<Claim>}
 * @throws Fault when the server doesn't accept the password
 */
export async function claim(server, password) {
  const client = await connectWhenReady(server, password);
  if (client === null) return { state: 'ended' };
  /** @type {Promise<void>} */
  const ended = new Promise((resolve) => client.once('end', () => resolve()));
  // The end of the session is told by `ended`; its cause stands in the server's log.
  client.on('error', () => undefined);
  const release = () => client.end();
  const deadline = Date.now() + GRACE;
  for (;;) {
    const { rows } = await client.query('select pg_try_advisory_lock($1) as owned', [KEY]);
    if (rows[0].owned === true) return { state: 'owned', ownership: { ended, release } };
    if (Date.now() > deadline) break;
    await pause(50);
  }
  const owner = await ownerOf(client);
  await release();
  return { state: 'taken', owner };
}

/**
 * @param {import('./postmaster.mjs').Server} server
 * @param {string} password
 */
async function connectWhenReady(server, password) {
  const deadline = Date.now() + PATIENCE;
  for (;;) {
    try {
      return await connect(server, password);
    } catch (error) {
      if (!isAlive(server.pid)) return null;
      if (hasCode(error, '28P01', '28000')) {
        throw new Fault('The database does not accept the password that is kept beside it.');
      }
      // 57P03: it starts, recovers or stops; 57P01: it stopped while answering.
      if (!hasCode(error, 'ECONNREFUSED', 'ECONNRESET', '57P03', '57P01') || Date.now() > deadline) throw error;
      await pause(50);
    }
  }
}

/**
 * @param {import('pg').Client} client
 * @returns {Promise<string>} in words, with its process id where it is known
 */
async function ownerOf(client) {
  const { rows } = await client.query(
    `select a.application_name as name from pg_locks l join pg_stat_activity a using (pid)
     where l.locktype = 'advisory' and l.classid = 0 and l.objid = $1 and l.granted`,
    [KEY],
  );
  const pid = /^groundward (\d+)$/.exec(rows[0]?.name ?? '')?.[1];
  return pid === undefined ? 'Another Groundward' : `Another Groundward (process ${pid})`;
}
