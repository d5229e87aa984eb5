import { mkdtempSync, rmSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { createConnection } from 'mysql2/promise';
import { ensureBuilt } from '../../docker-free-scripts/lib/build.mjs';
import { startBuiltServer } from '../../docker-free-scripts/lib/product-server.mjs';
import { copyIn, copyOut, createEmpty } from '../../docker-free-scripts/lib/sql-copy.mjs';
import { startThrowAway } from '../../docker-free-scripts/lib/throw-away.mjs';
import { journeyEnvironment } from './journey-environment.js';

/** How a worker reaches the MariaDB of this run; Playwright hands its environment on to the workers. */
const VARIABLE = 'JOURNEY_DATABASE';

interface JourneyDatabase {
  readonly port: number;
  readonly socket: string | null;
  readonly user: string;
  readonly password: string;
  /** The demo villages as a file, made once: every story begins with a copy of them. */
  readonly villages: string;
}

/** Playwright's global setup: the product is built, one throw-away MariaDB serves all journeys, the demo is made once. */
export default async function setup(): Promise<() => Promise<void>> {
  await ensureBuilt();
  const { port, socket, user, password, name, remove } = await startThrowAway();
  const folder = mkdtempSync(path.join(os.tmpdir(), `dawnpeg-test-${process.pid}-files-`));
  const villages = path.join(folder, 'villages.sql.gz');
  const end = async () => {
    await remove();
    rmSync(folder, { recursive: true, force: true });
  };
  try {
    const database = { port, socket, user, password, villages } satisfies JourneyDatabase;
    const server = await startBuiltServer({
      ...process.env,
      ...(await journeyEnvironment(folder)),
      ...reach(database, name),
    });
    await server.stop();
    await copyOut({ host: '127.0.0.1', port, user, password, database: name }, villages);
    process.env[VARIABLE] = JSON.stringify(database);
    return end;
  } catch (error) {
    await end();
    throw error;
  }
}

/** The demo villages in a database of this name, and what the server needs to reach it. */
export async function freshJourneyDatabase(name: string): Promise<NodeJS.ProcessEnv> {
  const database = JSON.parse(process.env[VARIABLE] ?? '{}') as JourneyDatabase;
  const { port, user, password, villages } = database;
  const connection = await createConnection({ host: '127.0.0.1', port, user, password });
  await createEmpty(connection, name);
  await connection.end();
  await copyIn({ host: '127.0.0.1', port, user, password, database: name }, villages);
  return reach(database, name);
}

function reach({ port, socket, user, password }: JourneyDatabase, name: string): NodeJS.ProcessEnv {
  return {
    DB_HOST: '127.0.0.1',
    DB_PORT: String(port),
    DB_SOCKET: socket ?? '',
    DB_NAME: name,
    DB_USER: user,
    DB_PASSWORD: password,
  };
}
