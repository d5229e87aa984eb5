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

/** A port nothing listens on at this moment. @returns {Promise<number>} */
export async function freePort() {
  const server = createServer();
  return new Promise((resolve, reject) => {
    server.once('error', reject);
    server.listen(0, '127.0.0.1', () => {
      const address = server.address();
      server.close(() => {
        if (address !== null && typeof address === 'object') resolve(address.port);
        else reject(new Error('no port given'));
      });
    });
  });
}
