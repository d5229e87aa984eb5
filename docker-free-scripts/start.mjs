/**
 * `npm start`: from a fresh clone to the running product in one command, and the same command every day
 * after. Everything it starts ends with it.
 */
import process from 'node:process';
import { ensureBuilt } from './lib/build.mjs';
import { ensureDebianPackages } from './lib/debian.mjs';
import { isOurs, serverEnvironment, startKeptDatabase } from './lib/kept-database.mjs';
import { logFile } from './lib/mariadb.mjs';
import { ensureNodePackages } from './lib/node-packages.mjs';
import { listenForEnd } from './lib/processes.mjs';
import { requireFreePort, startBuiltServer } from './lib/product-server.mjs';
import { runScript, say } from './lib/say.mjs';
import { readSettings, requireNode20 } from './lib/settings.mjs';
import { welcome } from './lib/welcome.mjs';

await runScript(async () => {
  requireNode20();
  const settings = readSettings();
  const { end, wasAsked, orGoOn } = listenForEnd();
  /** What has been started, in this order. @type {(() => Promise<void>)[]} */
  const stops = [];
  try {
    await requireFreePort(settings.host, settings.port);
    if (isOurs(settings)) await ensureDebianPackages('mariadb');
    orGoOn();
    await ensureNodePackages();
    orGoOn();
    await ensureBuilt(orGoOn);
    orGoOn();

    const database = isOurs(settings) ? await startKeptDatabase(settings) : undefined;
    if (database) {
      if (database.wasRunning)
        say(`MariaDB runs already on port ${database.port}; it is left running at the end.`);
      else stops.push(database.stop);
      say(`MariaDB serves ${database.folder} on 127.0.0.1:${database.port}.`);
    }
    orGoOn();

    // Without a request for more, the terminal shows what needs a person's attention.
    const quiet = settings.production ? {} : { LOG_LEVEL: 'warn' };
    const server = await startBuiltServer({ ...quiet, ...serverEnvironment(settings, database) }, { orGoOn });
    stops.push(server.stop);
    orGoOn();
    welcome(process.env['PUBLIC_URL'] ?? server.address, !settings.production && process.env['DEMO'] !== '0');

    const crashed = await Promise.race([
      end,
      server.exited.then(
        ({ code, signal }) => `The server ended by itself (${signal ?? `code ${code ?? '?'}`}).`,
      ),
      ...(database
        ? [database.exited.then(() => `MariaDB ended by itself; see ${logFile(database.folder)}.`)]
        : []),
    ]);
    if (crashed === undefined) return 0;
    say(crashed);
    return 1;
  } catch (error) {
    // A step that was cut short by Ctrl-C is no failure.
    if (wasAsked()) return 0;
    throw error;
  } finally {
    if (stops.length > 0) {
      for (const stop of stops.reverse()) await stop();
      say('Stopped; everything is saved.');
    }
  }
});
