import { mkdtempSync, rmSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { ensureBuilt } from '../../docker-free-scripts/lib/build.mjs';
import { freePort } from '../../docker-free-scripts/lib/ports.mjs';
import { startBuiltServer } from '../../docker-free-scripts/lib/product-server.mjs';
import { randomText } from '../../docker-free-scripts/lib/secrets.mjs';
import { startThrowAway, type ThrowAwayDatabase } from '../../docker-free-scripts/lib/throw-away.mjs';

/** What the product runs as: two processes that can be killed and started again on the same data. */
export interface RunningProduct {
  readonly address: string;
  kill(what: readonly ('server' | 'database')[]): Promise<void>;
  startAgain(): Promise<void>;
  remove(): Promise<void>;
}

/** The built server with the demo villages, and a MariaDB with the settings that real data is kept with. */
export async function runProduct(): Promise<RunningProduct> {
  await ensureBuilt();
  const port = await freePort();
  const sessionSecret = randomText();
  const dataDir = mkdtempSync(path.join(os.tmpdir(), `dawnpeg-test-${process.pid}-files-`));
  let database = await startThrowAway({ durability: 'kept' });
  let server: Awaited<ReturnType<typeof startBuiltServer>> | null = null;
  let databaseRuns = true;

  const startServer = () =>
    startBuiltServer(environment(database, port, dataDir, sessionSecret), { stdio: 'ignore' });
  const product: RunningProduct = {
    address: `http://127.0.0.1:${port}`,
    kill: async (what) => {
      if (what.includes('database')) {
        await database.stop('SIGKILL');
        databaseRuns = false;
      }
      if (what.includes('server')) {
        await server?.stop('SIGKILL');
        server = null;
      }
    },
    startAgain: async () => {
      if (!databaseRuns) database = await database.startAgain();
      databaseRuns = true;
      server ??= await startServer();
    },
    remove: async () => {
      await server?.stop();
      await database.remove();
      rmSync(dataDir, { recursive: true, force: true });
    },
  };
  try {
    await product.startAgain();
    return product;
  } catch (error) {
    await product.remove();
    throw error;
  }
}

function environment(
  database: ThrowAwayDatabase,
  port: number,
  dataDir: string,
  sessionSecret: string,
): NodeJS.ProcessEnv {
  return {
    PATH: process.env['PATH'],
    NODE_ENV: 'development',
    HOST: '127.0.0.1',
    PORT: String(port),
    DB_HOST: '127.0.0.1',
    DB_PORT: String(database.port),
    DB_SOCKET: database.socket ?? '',
    DB_NAME: database.name,
    DB_USER: database.user,
    DB_PASSWORD: database.password,
    DATA_DIR: dataDir,
    SESSION_SECRET: sessionSecret,
    DEMO: '1',
    LOG_LEVEL: 'silent',
  };
}
