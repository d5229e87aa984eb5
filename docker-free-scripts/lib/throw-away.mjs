import { rmSync } from 'node:fs';
import { throwAwayFolder } from './database-folder.mjs';
import { startMariaDb } from './mariadb.mjs';
import { freePort } from './ports.mjs';
import { randomText } from './secrets.mjs';

/**
 * @typedef {object} ThrowAwayDatabase
 * @property {string} folder
 * @property {number} port
 * @property {string | null} socket
 * @property {number} pid
 * @property {string} user may make and drop databases whose name begins with `dawnpeg`
 * @property {string} password
 * @property {string} name a database that exists and is empty
 * @property {(signal?: NodeJS.Signals) => Promise<void>} stop stops the server and keeps the folder
 * @property {() => Promise<ThrowAwayDatabase>} startAgain after stop: the same data, the same port
 * @property {() => Promise<void>} remove stops the server and removes the folder
 */

/**
 * A MariaDB for one test run.
 *
 * @param {object} [options]
 * @param {'kept' | 'throw-away'} [options.durability] 'kept' runs it with the settings of real data
 * @returns {Promise<ThrowAwayDatabase>}
 */
export async function startThrowAway({ durability = 'throw-away' } = {}) {
  const folder = await throwAwayFolder();
  const account = { name: 'dawnpeg', user: 'dawnpeg', password: randomText(), rootPassword: randomText() };
  /** @type {(port: number) => Promise<ThrowAwayDatabase>} */
  const started = async (port) => {
    const server = await startMariaDb({ folder, port, account, durability });
    let stopped = false;
    const stop = async (/** @type {NodeJS.Signals} */ signal = 'SIGTERM') => {
      if (!stopped) await server.stop(signal);
      stopped = true;
    };
    return {
      folder,
      port,
      socket: server.socket,
      pid: server.pid,
      user: account.user,
      password: account.password,
      name: account.name,
      stop,
      startAgain: () => started(port),
      remove: async () => {
        await stop();
        rmSync(folder, { recursive: true, force: true });
      },
    };
  };
  try {
    return await started(await freePort());
  } catch (error) {
    rmSync(folder, { recursive: true, force: true });
    throw error;
  }
}
