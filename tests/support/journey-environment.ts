import { freePort } from '../../docker-free-scripts/lib/ports.mjs';
import { randomText } from '../../docker-free-scripts/lib/secrets.mjs';
import { JOURNEY_NOW } from './journey-clock.js';

/** What the product is started with in journeys, besides its database. */
export async function journeyEnvironment(dataDir: string): Promise<NodeJS.ProcessEnv> {
  return {
    NODE_ENV: 'development',
    HOST: '127.0.0.1',
    PORT: String(await freePort()),
    PUBLIC_URL: '',
    DATA_DIR: dataDir,
    SESSION_SECRET: randomText(),
    DEMO: '1',
    FIXED_NOW: JOURNEY_NOW,
    LETTER_ROUND_SECONDS: '1',
    LOG_LEVEL: 'error',
    TRUST_PROXY: '0',
  };
}
