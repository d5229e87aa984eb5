import { mkdtempSync, rmSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { ensureBuilt } from '../../docker-free-scripts/lib/build.mjs';
import { freePort } from '../../docker-free-scripts/lib/ports.mjs';
import { startBuiltServer } from '../../docker-free-scripts/lib/product-server.mjs';
import { randomText } from '../../docker-free-scripts/lib/secrets.mjs';
import { startThrowAway } from '../../docker-free-scripts/lib/throw-away.mjs';
import { JOURNEY_NOW } from '#tests/support/journey-clock.js';

/** Does something with the built product and the demo villages, on a database that is thrown away afterwards. */
export async function onBuiltProduct<T>(work: (address: string) => Promise<T>): Promise<T> {
  await ensureBuilt();
  const database = await startThrowAway({ durability: 'kept' });
  const dataDir = mkdtempSync(path.join(os.tmpdir(), `dawnpeg-test-${process.pid}-files-`));
  try {
    const server = await startBuiltServer({
      ...process.env,
      ...{ NODE_ENV: 'development', HOST: '127.0.0.1', PORT: String(await freePort()), PUBLIC_URL: '' },
      ...{
        DB_HOST: '127.0.0.1',
        DB_PORT: String(database.port),
        DB_SOCKET: database.socket ?? '',
        DB_NAME: database.name,
      },
      ...{ DB_USER: database.user, DB_PASSWORD: database.password, DATA_DIR: dataDir },
      ...{ SESSION_SECRET: randomText(), DEMO: '1', FIXED_NOW: JOURNEY_NOW, LOG_LEVEL: 'error' },
    });
    try {
      return await work(server.address);
    } finally {
      await server.stop();
    }
  } finally {
    await database.remove();
    rmSync(dataDir, { recursive: true, force: true });
  }
}
