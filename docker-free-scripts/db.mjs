/**
 * `npm run db:start | db:stop | db:reset | db:migrate | db:seed`: the project's own MariaDB by itself, for
 * working on the product. `npm start` needs none of these.
 */
import { rmSync } from 'node:fs';
import process from 'node:process';
import { createInterface } from 'node:readline/promises';
import { keptDatabaseFolder } from './lib/database-folder.mjs';
import { ensureDebianPackages } from './lib/debian.mjs';
import { isOurs, serverEnvironment, startKeptDatabase } from './lib/kept-database.mjs';
import { runningIn } from './lib/mariadb.mjs';
import { ensureNodePackages } from './lib/node-packages.mjs';
import { Remedy, runScript, say } from './lib/say.mjs';
import { readSettings, requireNode20 } from './lib/settings.mjs';
import { sourceTool } from './lib/source-tool.mjs';

const usage = 'Use: node docker-free-scripts/db.mjs start | stop | reset [--yes] | migrate | seed';

await runScript(async () => {
  requireNode20();
  const settings = readSettings();
  const [action = ''] = process.argv.slice(2);
  switch (action) {
    case 'start':
      return start(settings);
    case 'stop':
      return stop(settings);
    case 'reset':
      return reset(settings);
    case 'migrate':
    case 'seed':
      return onDatabase(settings, action);
    default:
      throw new Remedy(usage);
  }
});

/** @typedef {import('./lib/settings.mjs').Settings} Settings */

/** @param {Settings} settings */
async function start(settings) {
  const database = await running(settings, true);
  say(`MariaDB serves ${database.folder} on 127.0.0.1:${database.port} until \`npm run db:stop\`.`);
}

/** @param {Settings} settings */
async function stop(settings) {
  const server = runningIn(await keptDatabaseFolder(settings.dataDir));
  if (!server) {
    say('MariaDB is not running.');
    return;
  }
  await server.stop();
  say('MariaDB has stopped.');
}

/** Throws the database away; asks first, because nothing brings it back. @param {Settings} settings */
async function reset(settings) {
  const folder = await keptDatabaseFolder(settings.dataDir);
  if (settings.production)
    throw new Remedy('NODE_ENV=production: the database of real people is not reset by a script.');
  if (!process.argv.includes('--yes') && !(await agrees(`Delete everything in ${folder}? (yes/no) `)))
    throw new Remedy('Nothing was deleted. Without a keyboard, add --yes.');
  await runningIn(folder)?.stop();
  rmSync(folder, { recursive: true, force: true });
  say(`Deleted ${folder}; the next start makes a new database.`);
}

/** @param {Settings} settings @param {'migrate' | 'seed'} action */
async function onDatabase(settings, action) {
  const database = isOurs(settings) ? await running(settings, false) : undefined;
  try {
    const done = await sourceTool(['server/db-command.ts', action], serverEnvironment(settings, database));
    return done.code;
  } finally {
    if (database && !database.wasRunning) await database.stop();
  }
}

/** @param {Settings} settings @param {boolean} outlives */
async function running(settings, outlives) {
  if (!isOurs(settings))
    throw new Remedy(`DB_HOST is ${settings.dbHost}: that database is started there, not here.`);
  await ensureDebianPackages('mariadb');
  await ensureNodePackages();
  return startKeptDatabase(settings, { outlives });
}

/** @param {string} question */
async function agrees(question) {
  if (!process.stdin.isTTY) return false;
  const asker = createInterface({ input: process.stdin, output: process.stdout });
  const answer = await asker.question(question);
  asker.close();
  return answer.trim().toLowerCase() === 'yes';
}
