import { execFileSync } from 'node:child_process';
import { expect, test } from '#tests/support/journey.js';
import { expectAccessible, expectNoSidewaysScroll, signIn } from '#tests/support/journey-steps.js';

test('staff land on the sheet, look at every page and take the PDF of the published version', async ({
  page,
}) => {
  await signIn(page, 'staff');
  await expect(page.getByRole('heading', { name: 'The sheet' })).toBeVisible();
  const pages = page.getByRole('list', { name: 'All pages' });
  // The server lays a whole year out and draws it once before the first page shows.
  await expect(pages.getByRole('button', { name: 'June', exact: true })).toBeVisible({ timeout: 30_000 });
  await pages.getByRole('button', { name: 'June', exact: true }).click();
  await expect(page.getByRole('img', { name: /June/ })).toBeVisible();
  await expectAccessible(page);
  // Only what was published can be chosen.
  await expect(page.getByLabel('Which version').getByRole('option', { name: /draft/i })).toHaveCount(0);

  const download = page.waitForEvent('download');
  await page.getByRole('link', { name: 'Make the PDF' }).click();
  const file = await (await download).path();
  const text = execFileSync('pdftotext', ['-layout', file, '-'], { encoding: 'utf8' });
  expect(text).toContain('2027-');
  expect(text).toContain('Sow long millet');
  expect(text).toContain('Stars tell the season, not the rain.');
});

test('the year board shows its tiles on a phone as well', async ({ page }) => {
  await page.setViewportSize({ width: 320, height: 640 });
  await signIn(page, 'staff');
  await page.getByRole('radio', { name: /Year board/ }).check();
  await expect(page.getByRole('img', { name: /Page 1/ })).toBeVisible({ timeout: 30_000 });
  await expectNoSidewaysScroll(page);
});
