import { defineConfig } from '@playwright/test';
import { freePort } from './docker-free-scripts/lib/ports.mjs';

/**
 * Browser journeys against the built product. The port is chosen once, in the first process; the workers
 * inherit it. tests/support/journey-server.ts starts what listens there.
 */
process.env['JOURNEY_PORT'] ??= String(await freePort());

export default defineConfig({
  testDir: 'tests/e2e',
  // Playwright does not read the aliases of package.json; this file repeats them for it.
  tsconfig: './tests/e2e/tsconfig.json',
  outputDir: '.tmp/journeys',
  globalSetup: './tests/support/journey-server.ts',
  // One product, one database, one story after the other.
  workers: 1,
  retries: 0,
  forbidOnly: process.env['CI'] !== undefined,
  timeout: 60_000,
  expect: { timeout: 10_000 },
  reporter: [
    ['list'],
    ['json', { outputFile: process.env['PLAYWRIGHT_JSON_OUTPUT_FILE'] ?? '.tmp/e2e.json' }],
  ],
  use: {
    baseURL: `http://127.0.0.1:${process.env['JOURNEY_PORT']}`,
    browserName: 'chromium',
    locale: 'en-GB',
    timezoneId: 'UTC',
    screenshot: 'only-on-failure',
    trace: 'retain-on-failure',
    launchOptions: {
      // Debian's own; nothing is downloaded.
      executablePath: process.env['CHROMIUM'] ?? '/usr/bin/chromium',
      args: [
        '--no-sandbox',
        '--disable-gpu',
        '--disable-quic',
        '--no-first-run',
        '--disable-background-networking',
        '--disable-component-update',
        '--disable-sync',
        // A microphone that hums, for whoever records.
        '--use-fake-device-for-media-stream',
        '--use-fake-ui-for-media-stream',
      ],
    },
  },
});
