import { gzipSync } from 'node:zlib';
import type { Page } from '@playwright/test';
import { expect, test } from '#tests/support/journey.js';
import { signIn } from '#tests/support/journey-steps.js';

const CODE_MAX_BYTES = 250_000;
const FONT_MAX_BYTES = 150_000;

/** Sizes of what a page fetches: scripts and styles as gzip makes them, fonts as they are. */
function weigh(page: Page): { code: Promise<number>[]; fonts: Promise<number>[] } {
  const weights = { code: [] as Promise<number>[], fonts: [] as Promise<number>[] };
  page.on('response', (response) => {
    const kind = response.request().resourceType();
    if (kind === 'script' || kind === 'stylesheet') {
      weights.code.push(response.body().then((body) => gzipSync(body).byteLength));
    } else if (kind === 'font') weights.fonts.push(response.body().then((body) => body.byteLength));
  });
  return weights;
}

const sum = async (parts: Promise<number>[]) => (await Promise.all(parts)).reduce((a, b) => a + b, 0);

test('the first load is small: code up to 250 kB gzip, one font up to 150 kB', async ({ page }) => {
  const weights = weigh(page);
  await page.goto('/sign-in');
  await expect(page.getByRole('button', { name: 'Sign in' })).toBeVisible();
  await page.evaluate(() => document.fonts.ready);
  expect(await sum(weights.code)).toBeLessThan(CODE_MAX_BYTES);
  expect(weights.fonts).toHaveLength(1);
  expect(await sum(weights.fonts)).toBeLessThan(FONT_MAX_BYTES);
});

test('a screen fetches its own code only when it is opened', async ({ page }) => {
  await signIn(page, 'observer');
  await page.reload();
  const weights = weigh(page);
  await page.getByRole('link', { name: 'Stars' }).click();
  await expect(page.getByRole('heading', { name: 'Stars' })).toBeVisible();
  expect(weights.code.length).toBeGreaterThan(0);
});
