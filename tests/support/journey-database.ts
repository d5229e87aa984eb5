import { createConnection } from 'mysql2/promise';
import { ensureBuilt } from '../../docker-free-scripts/lib/build.mjs';
import { startThrowAway } from '../../docker-free-scripts/lib/throw-away.mjs';

/** How a worker reaches the MariaDB of this run; Playwright hands its environment on to the workers. */
const VARIABLE = 'JOURNEY_DATABASE';

interface JourneyDatabase {
  readonly port: number;
  readonly user: string;
  readonly password: string;
}

/** Playwright's global setup: the product is built, and one throw-away MariaDB serves all journeys. */
export default async function setup(): Promise<() => Promise<void>> {
  await ensureBuilt();
  const { port, user, password, remove } = await startThrowAway();
  process.env[VARIABLE] = JSON.stringify({ port, user, password } satisfies JourneyDatabase);
  return remove;
}

/** An empty database of its own name, and what the server needs to reach it. */
export async function freshJourneyDatabase(name: string): Promise<NodeJS.ProcessEnv> {
  const { port, user, password } = JSON.parse(process.env[VARIABLE] ?? '{}') as JourneyDatabase;
  const connection = await createConnection({ host: '127.0.0.1', port, user, password });
  await connection.query(`CREATE DATABASE \`${name}\``);
  await connection.end();
  return {
    DB_HOST: '127.0.0.1',
    DB_PORT: String(port),
    DB_NAME: name,
    DB_USER: user,
    DB_PASSWORD: password,
  };
}
