import { mkdtempSync, rmSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { ensureBuilt } from '../../docker-free-scripts/lib/build.mjs';
import { startBuiltServer } from '../../docker-free-scripts/lib/product-server.mjs';
import { randomText } from '../../docker-free-scripts/lib/secrets.mjs';
import { startThrowAway } from '../../docker-free-scripts/lib/throw-away.mjs';
import { JOURNEY_NOW } from './journey-clock.js';

/** Playwright's global setup: the built product with the demo villages, on a database of its own. */
export default async function setup(): Promise<() => Promise<void>> {
  await ensureBuilt();
  const database = await startThrowAway();
  const dataDir = mkdtempSync(path.join(os.tmpdir(), `dawnpeg-test-${process.pid}-files-`));
  const remove = async () => {
    await database.remove();
    rmSync(dataDir, { recursive: true, force: true });
  };
  try {
    const server = await startBuiltServer({
      ...process.env,
      NODE_ENV: 'development',
      HOST: '127.0.0.1',
      PORT: process.env['JOURNEY_PORT'],
      PUBLIC_URL: '',
      DB_HOST: '127.0.0.1',
      DB_PORT: String(database.port),
      DB_NAME: database.name,
      DB_USER: database.user,
      DB_PASSWORD: database.password,
      DATA_DIR: dataDir,
      SESSION_SECRET: randomText(),
      DEMO: '1',
      FIXED_NOW: JOURNEY_NOW,
      LOG_LEVEL: 'error',
      TRUST_PROXY: '0',
    });
    return async () => {
      await server.stop();
      await remove();
    };
  } catch (error) {
    await remove();
    throw error;
  }
}
