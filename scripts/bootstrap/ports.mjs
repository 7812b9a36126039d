// @ts-check
import { createServer } from 'node:net';
import { Refusal } from './refusal.mjs';

const FIRST_PORT = 3000;
const LAST_TRIED = 3999;

/**
 * Whether a server can listen on a port, on every address of this machine.
 * @param {number} port
 */
export async function isFree(port) {
  // A listener on one address alone leaves the others free, so each is tried.
  for (const host of ['0.0.0.0', '::', '127.0.0.1']) {
    const fault = await tryToListen(port, host);
    if (fault === 'EADDRINUSE' || fault === 'EACCES') return false;
  }
  return true;
}

/**
 * @param {number} port
 * @param {string} host
 * @returns {Promise<string | null>} the code of the fault
 */
function tryToListen(port, host) {
  return new Promise((resolve) => {
    const server = createServer();
    server.once('error', (fault) =>
      resolve(/** @type {NodeJS.ErrnoException} */ (fault).code ?? 'unknown'),
    );
    server.listen({ port, host, exclusive: true }, () => server.close(() => resolve(null)));
  });
}

/**
 * The port to serve on.
 * @param {number | null} wanted
 * @param {number} [from]
 */
export async function choosePort(wanted, from = FIRST_PORT) {
  if (wanted !== null) {
    if (await isFree(wanted)) return wanted;
    throw new Refusal(
      `PORT ${wanted} is taken or not allowed; free it, give another, or leave PORT out to take the next free one.`,
    );
  }
  for (let port = from; port <= LAST_TRIED; port += 1) {
    if (await isFree(port)) return port;
  }
  throw new Refusal(`No port from ${from} to ${LAST_TRIED} is free; give one as PORT.`);
}

/**
 * A port that nobody uses now, for a server of our own on loopback.
 * @returns {Promise<number>}
 */
export function anyFreePort() {
  return new Promise((resolve, reject) => {
    const server = createServer();
    server.once('error', reject);
    server.listen({ port: 0, host: '127.0.0.1' }, () => {
      const address = server.address();
      const port = typeof address === 'object' && address ? address.port : 0;
      server.close(() => resolve(port));
    });
  });
}
