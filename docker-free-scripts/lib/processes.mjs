import { spawn } from 'node:child_process';
import { existsSync } from 'node:fs';
import process from 'node:process';

/** True where the script may change users. */
export const isRoot = process.getuid?.() === 0;

const setpriv = ['/usr/bin/setpriv', '/bin/setpriv'].find((file) => existsSync(file));

/**
 * @typedef {object} Running
 * @property {number} pid
 * @property {Promise<{ code: number | null, signal: NodeJS.Signals | null }>} exited
 * @property {(signal?: NodeJS.Signals) => boolean} kill
 */

/**
 * Starts a program that must not outlive this script.
 *
 * It gets a process group of its own, so a Ctrl-C in the terminal reaches this script alone, which then
 * stops its children in order. And it asks the kernel for SIGTERM when this script dies without a word
 * (kill -9), so nothing stays behind.
 *
 * @param {string} command
 * @param {string[]} args
 * @param {object} [options]
 * @param {string} [options.cwd]
 * @param {NodeJS.ProcessEnv} [options.env]
 * @param {string | undefined} [options.user] run as this user (only as root)
 * @param {import('node:child_process').StdioOptions} [options.stdio]
 * @param {boolean} [options.outlives] true for `db.mjs start`, whose server goes on until `stop`
 * @returns {Running}
 */
export function start(command, args, options = {}) {
  const { user, outlives = false, stdio = 'inherit', cwd, env } = options;
  const as = user ? [`--reuid=${user}`, `--regid=${user}`, '--clear-groups'] : [];
  const dying = outlives ? [] : ['--pdeathsig', 'TERM'];
  const wrapped = setpriv && as.length + dying.length > 0;
  const child = wrapped
    ? spawn(setpriv, [...as, ...dying, '--', command, ...args], { stdio, cwd, env, detached: true })
    : spawn(command, args, { stdio, cwd, env, detached: true });
  /** @type {Running['exited']} */
  const exited = new Promise((resolve, reject) => {
    child.once('error', reject);
    child.once('exit', (code, signal) => {
      resolve({ code, signal });
    });
  });
  exited.catch(() => undefined);
  if (outlives) child.unref();
  return { pid: child.pid ?? -1, exited, kill: (signal = 'SIGTERM') => child.kill(signal) };
}

/**
 * Runs a program to its end and answers its exit code and what it wrote.
 *
 * @param {string} command
 * @param {string[]} args
 * @param {object} [options]
 * @param {string} [options.cwd]
 * @param {NodeJS.ProcessEnv} [options.env]
 * @param {string | undefined} [options.user]
 * @param {boolean} [options.show] true shows the output while it comes instead of keeping it
 * @param {boolean} [options.undisturbed] true lets it finish when this script is asked to end: half an
 *   installation of Debian's packages helps nobody
 * @returns {Promise<{ code: number, output: string }>}
 */
export async function run(command, args, options = {}) {
  const { show = false, undisturbed = false, user, cwd, env } = options;
  const full =
    user && setpriv
      ? [setpriv, `--reuid=${user}`, `--regid=${user}`, '--clear-groups', '--', command, ...args]
      : [command, ...args];
  const child = spawn(String(full[0]), full.slice(1), {
    cwd,
    env,
    stdio: ['ignore', 'pipe', 'pipe'],
    detached: undisturbed,
  });
  if (!undisturbed) endable.add(child);
  let output = '';
  for (const stream of [child.stdout, child.stderr]) {
    stream.setEncoding('utf8');
    stream.on('data', (/** @type {string} */ text) => {
      if (show) process.stdout.write(text);
      else output += text;
    });
  }
  return new Promise((resolve) => {
    child.once('error', (error) => {
      resolve({ code: 127, output: `${output}${error.message}\n` });
    });
    child.once('close', (code, signal) => {
      endable.delete(child);
      if (signal) process.stdout.write(`${command} was ended by ${signal}.\n`);
      resolve({ code: code ?? 1, output });
    });
  });
}

/** Thrown between two steps when the script has been asked to end. */
class Ended extends Error {}

/** What `run` has started and may be cut short. @type {Set<import('node:child_process').ChildProcess>} */
const endable = new Set();

/**
 * Listens for what ends a script: Ctrl-C, kill, a closed terminal, or the death of the `npm` that started
 * it. A second Ctrl-C changes nothing: the terminal and npm both send one.
 */
export function listenForEnd() {
  let asked = false;
  /** @type {Promise<void>} */
  const end = new Promise((resolve) => {
    const ask = () => {
      if (asked) return;
      asked = true;
      for (const child of endable) child.kill('SIGTERM');
      resolve();
    };
    for (const signal of /** @type {NodeJS.Signals[]} */ (['SIGINT', 'SIGTERM', 'SIGHUP']))
      process.on(signal, ask);
    if (process.env['npm_lifecycle_event'] === undefined) return;
    const parent = process.ppid;
    setInterval(() => {
      if (process.ppid !== parent) ask();
    }, 500).unref();
  });
  return {
    /** Resolves when asked. */
    end,
    wasAsked: () => asked,
    /** Throws when asked: called between steps. */
    orGoOn: () => {
      if (asked) throw new Ended();
    },
  };
}
