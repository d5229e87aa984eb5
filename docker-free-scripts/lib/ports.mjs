import { randomInt } from 'node:crypto';
import { createServer } from 'node:net';

/** @param {number} port @param {string} [host] @returns {Promise<boolean>} */
export async function isFree(port, host = '127.0.0.1') {
  const server = createServer();
  return new Promise((resolve) => {
    server.once('error', () => {
      resolve(false);
    });
    server.listen({ port, host, exclusive: true }, () => {
      server.close(() => {
        resolve(true);
      });
    });
  });
}

/** Below the ports that systems hand out by themselves, so that none is given away between asking and listening. */
const FROM = 20_000;
const BELOW = 32_000;

/** A port nothing listens on at this moment. @returns {Promise<number>} */
export async function freePort() {
  for (let attempt = 0; attempt < 100; attempt += 1) {
    const port = randomInt(FROM, BELOW);
    if (await isFree(port)) return port;
  }
  throw new Error(`no free port from ${FROM} to ${BELOW}`);
}
