import { createServer } from 'node:net';
import { Fault, hasCode } from '../fault.mjs';

/**
 * Makes sure that the address can be listened on, before anything that takes time is done.
 *
 * @param {{ port: number, host: string }} address
 * @returns {Promise<void>}
 * @throws Fault when it can't
 */
export function checkAddress({ port, host }) {
  return new Promise((resolve, reject) => {
    const probe = createServer();
    probe.on('error', (error) => reject(addressFault({ port, host }, error) ?? error));
    probe.listen({ port, host, exclusive: true }, () => probe.close(() => resolve()));
  });
}

/**
 * @param {{ port: number, host: string }} address
 * @param {unknown} error what listening failed with
 * @returns {Fault | null} null when it has nothing to do with the address
 */
export function addressFault({ port, host }, error) {
  if (hasCode(error, 'EADDRINUSE')) {
    return new Fault(`Port ${port} on ${host} is already in use: name another one in PORT.`);
  }
  if (hasCode(error, 'EACCES')) return new Fault(`You may not listen on port ${port}: name another one in PORT.`);
  if (hasCode(error, 'EADDRNOTAVAIL', 'ENOTFOUND', 'EAI_AGAIN')) {
    return new Fault(`This machine has no address ${host}: name another one in HOST.`);
  }
  return null;
}
