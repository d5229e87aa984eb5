import { test as base, expect } from '@playwright/test';
import { JOURNEY_NOW } from './journey-clock.js';
import { JourneyProduct } from './journey-product.js';

const START_WITHIN_MS = 120_000;

/**
 * Playwright's `test` for journeys: the product runs for this file alone, the page lives at the journeys' moment, and a
 * journey fails when the page wrote a warning or an error to its console, or threw one. A journey that means to meet a
 * refusal says so: `test.use({ expectedNoise: [/409/] })`.
 */
export const test = base.extend<
  { address: string; expectedNoise: RegExp[]; quietPage: undefined },
  { product: JourneyProduct }
>({
  product: [
    async ({}, use, { workerIndex }) => {
      const product = new JourneyProduct(workerIndex);
      await use(product);
      await product.stop();
    },
    { scope: 'worker' },
  ],
  // Its start is not of the test's time.
  address: [
    async ({ product }, use, { file }) => use(await product.addressFor(file)),
    { timeout: START_WITHIN_MS },
  ],
  baseURL: ({ address }, use) => use(address),
  expectedNoise: [[], { option: true }],
  quietPage: [
    async ({ context, page, expectedNoise }, use) => {
      const noise: string[] = [];
      context.on('console', (message) => {
        if (['warning', 'error'].includes(message.type())) noise.push(`${message.type()}: ${message.text()}`);
      });
      context.on('weberror', (error) => noise.push(`thrown: ${error.error().message}`));
      await page.clock.setFixedTime(JOURNEY_NOW);
      await use(undefined);
      const unexpected = noise.filter((line) => !expectedNoise.some((pattern) => pattern.test(line)));
      expect(unexpected, 'the page wrote nothing unexpected to its console').toEqual([]);
    },
    { auto: true },
  ],
});

export { expect } from '@playwright/test';
