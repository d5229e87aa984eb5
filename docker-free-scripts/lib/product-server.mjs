import { get } from 'node:http';
import process from 'node:process';
import { setTimeout as wait } from 'node:timers/promises';
import { isFree } from './ports.mjs';
import { start } from './processes.mjs';
import { Remedy } from './say.mjs';
import { projectDir } from './settings.mjs';

const STOP_WITHIN_MS = 15_000;
const READY_WITHIN_MS = 120_000;

/**
 * Starts the built server and answers when it reports itself healthy.
 *
 * @param {NodeJS.ProcessEnv} env
 * @param {object} [options]
 * @param {import('node:child_process').StdioOptions} [options.stdio]
 * @param {() => void} [options.orGoOn] throws when the waiting shall end
 */
export async function startBuiltServer(env, { stdio = 'inherit', orGoOn = () => undefined } = {}) {
  const server = start(process.execPath, ['dist/server/main.js'], { cwd: projectDir, env, stdio });
  const host = env['HOST'] ?? '127.0.0.1';
  const reachable = host === '0.0.0.0' ? '127.0.0.1' : host === '::' ? '[::1]' : host;
  const address = `http://${reachable}:${env['PORT'] ?? ''}`;
  const stop = async (/** @type {NodeJS.Signals} */ signal = 'SIGTERM') => {
    server.kill(signal);
    const late = setTimeout(() => server.kill('SIGKILL'), STOP_WITHIN_MS);
    await server.exited;
    clearTimeout(late);
  };
  try {
    await healthy(address, server.exited, orGoOn);
  } catch (error) {
    await stop();
    throw error;
  }
  return { address, pid: server.pid, exited: server.exited, stop };
}

/** @param {string} address @param {Promise<{ code: number | null }>} exited @param {() => void} orGoOn */
async function healthy(address, exited, orGoOn) {
  /** @type {{ code: number | null } | undefined} */
  let ended;
  void exited.then((how) => (ended = how));
  const giveUpAt = Date.now() + READY_WITHIN_MS;
  for (;;) {
    const answered = (await statusOf(`${address}/api/health`)) === 200;
    orGoOn();
    // Before the answer is believed: it may come from another server on the same port.
    if (ended) throw new Remedy('The server ended while starting; its reason is above.');
    if (answered) return;
    if (Date.now() > giveUpAt) throw new Remedy('The server did not become healthy within two minutes.');
    await wait(50);
  }
}

/** @param {string} url @returns {Promise<number>} the HTTP status, 0 when nobody answers */
function statusOf(url) {
  return new Promise((resolve) => {
    get(url, { agent: false, timeout: 5000 }, (response) => {
      response.resume();
      resolve(response.statusCode ?? 0);
    }).on('error', () => {
      resolve(0);
    });
  });
}

/**
 * Refuses a port that is in use. A server that is just ending gets a moment to let go of it.
 *
 * @param {string} host
 * @param {number} port
 */
export async function requireFreePort(host, port) {
  for (let attempt = 0; attempt < 30; attempt += 1) {
    if (await isFree(port, host)) return;
    await wait(100);
  }
  throw new Remedy(
    `Something listens on ${host}:${port} already (perhaps Dawnpeg itself); stop it, or choose another port with PORT=….`,
  );
}
