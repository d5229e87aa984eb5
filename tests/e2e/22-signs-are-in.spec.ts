import type { Page } from '@playwright/test';
import { expect, test } from '#tests/support/journey.js';
import {
  beginEntry,
  expectAccessible,
  expectNoSidewaysScroll,
  signIn,
} from '#tests/support/journey-steps.js';

/*
 * An officer describes two signs once and lets an entry wait for them. An observer with a small phone says that they were
 * seen. Until both are in the entry says to prepare; then that people decide, and never that work begins.
 */
test.use({ actionTimeout: 15_000 });

const PHONE = { width: 320, height: 640 };
const ENTRY = 'Plant the watered strip';
const NOTICE = 'Frost in the lowest terraces on three nights. Cover what is up.';
const SIGNS = ['Soil breaks in the hand', 'Swallows over the water'];

test('an officer lets an entry wait for two signs of the village’s list', async ({ page }) => {
  test.setTimeout(120_000);
  await signIn(page, 'officer2');
  await page.goto('/village/signs');
  for (const name of SIGNS) {
    await page.getByRole('button', { name: 'Add a sign' }).click();
    const dialog = page.getByRole('dialog');
    await dialog.getByLabel('As people call it').fill(name);
    await dialog.getByLabel('What exactly to look for').fill('Three mornings in a row.');
    if (name === SIGNS[0]) await expectAccessible(page);
    await dialog.getByRole('button', { name: 'Save the sign' }).click();
    await expect(page.getByRole('heading', { name })).toBeVisible();
  }

  await page.goto('/calendars');
  await page.getByRole('link', { name: 'Open the draft' }).first().click();
  await beginEntry(page);
  await page.getByLabel(/^Name of the work or rite/).fill(ENTRY);
  const when = page.locator('[data-group="when"]');
  await when.getByRole('radio', { name: /^A fixed date/ }).check();
  await when.getByLabel('Month').first().selectOption('March');
  await when.getByLabel('Day', { exact: true }).first().selectOption('20');
  await when.getByLabel('Who set it, and where it is written').first().fill('the village');
  const signs = page.locator('[data-group="signs"]');
  await signs.locator('summary').first().click();
  await signs.getByText('More for the elders and the field').click();
  for (const name of SIGNS) {
    await signs.getByLabel('Choose from the village’s list').selectOption(name);
  }
  await signs.getByLabel('How many of them are needed').fill('2');
  await signs.getByLabel('Without which one nothing begins').selectOption('Soil breaks in the hand');
  await page.getByRole('button', { name: 'Save the entry' }).click();
  await expect(page.getByText(`Saved: ${ENTRY}.`)).toBeVisible();
  await expect(page.getByText('Prepare.', { exact: true })).toBeVisible();
  await expect(page.getByRole('img', { name: '0 signs of 2 are in' })).toBeVisible();
});

test('a notice of the weather service stands above the work, the rain beside it', async ({ page }) => {
  test.setTimeout(90_000);
  await page.setViewportSize(PHONE);
  await signIn(page, 'officer2');
  await page.goto('/');
  await page.getByRole('button', { name: 'Write down a notice' }).click();
  const dialog = page.getByRole('dialog');
  await dialog.getByLabel('What it says').fill(NOTICE);
  await dialog.getByLabel('Who issued it').fill('Mountain weather service');
  await dialog.getByLabel('Holds until').fill('2027-03-14');
  await dialog.getByRole('button', { name: 'Show the notice' }).click();
  await expect(page.getByRole('note', { name: 'Notice of Mountain weather service' })).toContainText(NOTICE);

  await page.getByRole('button', { name: 'Write down rain' }).click();
  await page.getByRole('dialog').getByLabel('In words').fill('wet to a finger depth');
  await page.getByRole('dialog').getByRole('button', { name: 'Keep it' }).click();
  await expect(page.getByText(/^10.March: wet to a finger depth/u)).toBeVisible();
  await expectNoSidewaysScroll(page);
  await expectAccessible(page);

  await openEntry(page);
  const notice = page.getByRole('note', { name: 'Notice of Mountain weather service' });
  const heading = page.getByRole('heading', { name: ENTRY });
  await expect(heading).toBeVisible();
  await expect(async () => {
    const [above, below] = [await notice.boundingBox(), await heading.boundingBox()];
    expect(above?.y ?? Infinity).toBeLessThan(below?.y ?? 0);
  }).toPass();
});

test('an observer marks them as seen on a small phone, and takes a slip back', async ({ page }) => {
  test.setTimeout(90_000);
  await page.setViewportSize(PHONE);
  await signIn(page, 'observer2');
  for (const name of SIGNS) {
    await page.getByRole('button', { name: 'I saw a sign' }).click();
    const dialog = page.getByRole('dialog');
    await dialog.getByLabel('Which sign').selectOption(name);
    await dialog.getByRole('button', { name: 'Mark as seen' }).click();
    await expect(page.getByText(new RegExp(`^${name}: 10.March`, 'u'))).toBeVisible();
  }
  await expectNoSidewaysScroll(page);
  await expectAccessible(page);
  await page.getByRole('button', { name: `Take back that ${SIGNS[1] ?? ''}` }).click();
  await expect(page.getByText(new RegExp(`^${SIGNS[1] ?? ''}: 10.March`, 'u'))).toHaveCount(0);
  await page.getByRole('link', { name: 'All signs of the village' }).click();
  await page.getByRole('button', { name: `Mark ${SIGNS[1] ?? ''} as seen` }).click();
  await page.getByRole('dialog').getByRole('button', { name: 'Mark as seen' }).click();
  await expect(page.getByText(`Marked as seen: ${SIGNS[1] ?? ''}.`)).toBeVisible();
  await expectNoSidewaysScroll(page);
});

test('the entry says that signs are in and that people decide', async ({ page }) => {
  test.setTimeout(60_000);
  await page.setViewportSize(PHONE);
  await signIn(page, 'officer2');
  await openEntry(page);
  await expect(page.getByText('Signs are in: you decide.', { exact: true })).toBeVisible();
  await expect(page.getByRole('img', { name: '2 signs of 2 are in' })).toBeVisible();
  await expect(page.getByText(/sow now/iu)).toHaveCount(0);
  await expectNoSidewaysScroll(page);
  await expectAccessible(page);
});

async function openEntry(page: Page): Promise<void> {
  await page.goto('/calendars');
  await page.getByRole('link', { name: 'Open the draft' }).first().click();
  await page.getByRole('link', { name: ENTRY }).first().click();
}
