/**
 * `npm run dev`: the database, the server from its sources (again after each change) and Vite's server for
 * the screens, which hands /api/ on. Ctrl-C stops all three.
 */
import path from 'node:path';
import { ensureDebianPackages } from './lib/debian.mjs';
import { isOurs, serverEnvironment, startKeptDatabase } from './lib/kept-database.mjs';
import { ensureNodePackages } from './lib/node-packages.mjs';
import { listenForEnd, start } from './lib/processes.mjs';
import { requireFreePort } from './lib/product-server.mjs';
import { runScript, say } from './lib/say.mjs';
import { projectDir, readSettings, requireNode20 } from './lib/settings.mjs';
import { watchSource } from './lib/source-tool.mjs';

await runScript(async () => {
  requireNode20();
  const settings = readSettings();
  const { end, orGoOn, wasAsked } = listenForEnd();
  /** @type {(() => Promise<unknown>)[]} */
  const stops = [];
  try {
    await requireFreePort(settings.host, settings.port);
    if (isOurs(settings)) await ensureDebianPackages('mariadb');
    orGoOn();
    await ensureNodePackages();
    orGoOn();
    const database = isOurs(settings) ? await startKeptDatabase(settings) : undefined;
    if (database && !database.wasRunning) stops.push(database.stop);
    orGoOn();

    const env = serverEnvironment(settings, database);
    const server = watchSource('server/main.ts', env);
    stops.push(() => ended(server));
    const screens = start(path.join(projectDir, 'node_modules/.bin/vite'), [], { cwd: projectDir, env });
    stops.push(() => ended(screens));
    say('The screens are at the address Vite prints; the server starts again after each change.');

    await Promise.race([end, server.exited, screens.exited]);
    return wasAsked() ? 0 : 1;
  } catch (error) {
    if (wasAsked()) return 0;
    throw error;
  } finally {
    for (const stop of stops.reverse()) await stop();
  }
});

/** @param {import('./lib/processes.mjs').Running} running */
async function ended(running) {
  running.kill('SIGTERM');
  await running.exited;
}
