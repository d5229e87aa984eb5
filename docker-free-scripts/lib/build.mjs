import { createHash } from 'node:crypto';
import { existsSync, mkdirSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import process from 'node:process';
import { setTimeout as wait } from 'node:timers/promises';
import { run } from './processes.mjs';
import { Remedy, say } from './say.mjs';
import { projectDir } from './settings.mjs';

const folders = ['server', 'shared', 'src', 'public'];
const files = [
  'index.html',
  'package.json',
  'package-lock.json',
  'postcss.config.js',
  'tsconfig.json',
  'vite.config.ts',
];
const stampFile = path.join(projectDir, 'dist/.built-from');
const lockFile = path.join(projectDir, '.tmp/build.lock');

/**
 * Builds server and screens into dist/ when a source has changed since the last build.
 *
 * @param {() => void} [orGoOn] throws when the waiting for another script's build shall end
 */
export async function ensureBuilt(orGoOn = () => undefined) {
  if (isBuilt()) return;
  await oneAtATime(orGoOn, async () => {
    if (isBuilt()) return;
    say('Building the server and the screens.');
    const stamp = sourcesStamp();
    for (const part of ['.built-from', 'server', 'shared'])
      rmSync(path.join(projectDir, 'dist', part), { recursive: true, force: true });
    const [server, client] = await Promise.all([
      tool('tsc', ['-p', 'server/tsconfig.build.json']),
      tool('vite', ['build', '--logLevel', 'warn']),
    ]);
    for (const [part, { code, output }] of /** @type {const} */ ([
      ['server', server],
      ['screens', client],
    ]))
      if (code !== 0) throw new Remedy(`${output.trim()}\n\nThe ${part} could not be built; see above.`);
    writeFileSync(stampFile, `${stamp}\n`);
  });
}

function isBuilt() {
  return existsSync(stampFile) && readFileSync(stampFile, 'utf8').trim() === sourcesStamp();
}

/**
 * A tool of node_modules, started directly: an `npx` in between would leave it running when it is stopped.
 *
 * @param {string} name
 * @param {string[]} args
 */
export async function tool(name, args) {
  return run(path.join(projectDir, 'node_modules/.bin', name), args, {
    cwd: projectDir,
    // Vite builds React for development where NODE_ENV says so.
    env: { ...process.env, NODE_ENV: 'production' },
  });
}

/** One number for all sources: contents, not dates, because a fresh clone has new dates. */
function sourcesStamp() {
  const hash = createHash('sha256').update(process.version);
  const all = [...folders.flatMap((folder) => filesBelow(folder)), ...files];
  for (const file of all.sort()) {
    const full = path.join(projectDir, file);
    if (existsSync(full)) hash.update(`\0${file}\0`).update(readFileSync(full));
  }
  return hash.digest('hex');
}

/** @param {string} folder @returns {string[]} */
function filesBelow(folder) {
  const full = path.join(projectDir, folder);
  if (!existsSync(full)) return [];
  return readdirSync(full, { recursive: true, withFileTypes: true })
    .filter((entry) => entry.isFile())
    .map((entry) => path.relative(projectDir, path.join(entry.parentPath, entry.name)));
}

/**
 * Two scripts may want to build at once (a test run beside `npm start`); the second waits.
 *
 * @param {() => void} orGoOn
 * @param {() => Promise<void>} work
 */
async function oneAtATime(orGoOn, work) {
  mkdirSync(path.dirname(lockFile), { recursive: true });
  for (;;) {
    orGoOn();
    try {
      writeFileSync(lockFile, String(process.pid), { flag: 'wx' });
      break;
    } catch {
      const owner = existsSync(lockFile) ? readFileSync(lockFile, 'utf8') : '';
      if (owner !== '' && !existsSync(`/proc/${owner}`)) rmSync(lockFile, { force: true });
      else await wait(200);
    }
  }
  try {
    await work();
  } finally {
    rmSync(lockFile, { force: true });
  }
}
