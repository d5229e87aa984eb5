import { existsSync } from 'node:fs';
import { defineConfig } from '@playwright/test';

/** Debian's own, without windows where that is there; nothing is downloaded. */
const browsers = ['/usr/bin/chromium-headless-shell', '/usr/bin/chromium'];

/** Browser journeys against the built product. tests/support/journey-product.ts starts it anew for each file. */
export default defineConfig({
  testDir: 'tests/e2e',
  // Playwright does not read the aliases of package.json; this file repeats them for it.
  tsconfig: './tests/e2e/tsconfig.json',
  outputDir: '.tmp/journeys',
  globalSetup: './tests/support/journey-database.ts',
  // The tests of a file are one story and follow each other; files know nothing of each other.
  workers: 2,
  // A machine that stops for a moment is no fault of the product: once more, in fresh villages. The report names it.
  retries: 1,
  forbidOnly: process.env['CI'] !== undefined,
  timeout: 60_000,
  expect: { timeout: 10_000 },
  reporter: [
    ['list'],
    ['json', { outputFile: process.env['PLAYWRIGHT_JSON_OUTPUT_FILE'] ?? '.tmp/e2e.json' }],
  ],
  use: {
    browserName: 'chromium',
    locale: 'en-GB',
    timezoneId: 'UTC',
    screenshot: 'only-on-failure',
    // Recording every journey takes a third of its time; `TRACE=1` does it where a failure is not understood.
    trace: process.env['TRACE'] === '1' ? 'retain-on-failure' : 'off',
    launchOptions: {
      executablePath: process.env['CHROMIUM'] ?? browsers.find((file) => existsSync(file)) ?? 'chromium',
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
