import type { Page } from '@playwright/test';
import { expect, test } from '#tests/support/journey.js';
import { expectAccessible, expectNoSidewaysScroll, signIn } from '#tests/support/journey-steps.js';

/*
 * How people are asked, and how somebody new comes in: the steward sends an invitation, the person reads it in the inbox
 * of development, chooses a password, forgets it, and gets in again by a letter.
 */
test.describe.configure({ mode: 'serial' });
test.use({ viewport: { width: 390, height: 844 }, actionTimeout: 15_000 });

const TALU = 'talu@example.org';

test('a person chooses how they are asked, and finds the choice again', async ({ page }) => {
  await signIn(page, 'elder-c1');
  await page.goto('/account');
  await page.getByRole('radio', { name: /Once a day at most/ }).check();
  await page.getByLabel('From', { exact: true }).selectOption('19:00');
  await page.getByLabel('Until', { exact: true }).selectOption('08:00');
  await page.getByRole('checkbox', { name: /I would rather be visited/ }).check();
  await saveChoice(page);
  await expectNoSidewaysScroll(page);
  await expectAccessible(page);

  await page.reload();
  await expect(page.getByRole('radio', { name: /Once a day at most/ })).toBeChecked();
  await expect(page.getByLabel('From', { exact: true })).toHaveValue('19');
  await expect(page.getByRole('checkbox', { name: /I would rather be visited/ })).toBeChecked();

  await page.getByRole('radio', { name: /Do not write/ }).check();
  await expect(page.getByRole('radio', { name: /Once a day at most/ })).toHaveCount(0);
  await saveChoice(page);
  await page.reload();
  await expect(page.getByRole('radio', { name: /Do not write/ })).toBeChecked();
});

test('somebody new comes in by a letter, and in again when the password is forgotten', async ({
  page,
  browser,
}) => {
  test.setTimeout(180_000);
  await signIn(page, 'steward3');
  await page.goto('/village/people');
  await page.getByLabel('How they are called').fill('Talu');
  await page.getByLabel('E-mail address').fill(TALU);
  await page.getByRole('button', { name: 'Add them' }).click();
  await page.getByRole('dialog').getByRole('button', { name: 'I have passed it on' }).click();
  await page.getByRole('button', { name: 'Send an invitation by e-mail' }).click();
  await expect(page.getByText(`An invitation goes to ${TALU}.`)).toBeVisible();
  await expectAccessible(page);

  const device = await browser.newContext({ viewport: { width: 390, height: 844 } });
  const talu = await device.newPage();
  await openLetter(talu, 'You are invited to Tholmere Landing');
  await talu.getByLabel('E-mail address').fill(TALU);
  await talu.getByLabel('Choose a password', { exact: true }).fill('three boats on ice');
  await expectAccessible(talu);
  await talu.getByRole('button', { name: 'Start' }).click();
  await expect(talu).not.toHaveURL(/welcome/u);
  await talu.goto('/account');
  await expect(talu.getByText('Signed in as Talu')).toBeVisible();
  await talu.getByRole('button', { name: 'Sign out', exact: true }).click();

  await talu.goto('/sign-in');
  await talu.getByRole('link', { name: 'I have forgotten my password' }).click();
  await expect(talu.getByRole('heading', { name: 'Forgotten your password' })).toBeVisible();
  await talu.getByLabel('E-mail address').fill(TALU);
  await talu.getByRole('button', { name: 'Send me a link' }).click();
  await expect(talu.getByText(/If the address belongs to an account/).last()).toBeVisible();
  await expectAccessible(talu);
  await openLetter(talu, 'Choose a new password');
  await talu.getByLabel('New password', { exact: true }).fill('the net is dry again');
  await talu.getByRole('button', { name: 'Save and go on' }).click();
  await expect(talu).not.toHaveURL(/reset/u);
  await talu.goto('/account');
  await expect(talu.getByText('Signed in as Talu')).toBeVisible();
  await device.close();
});

async function saveChoice(page: Page): Promise<void> {
  await page.getByRole('button', { name: 'Save how you are asked' }).click();
  await expect(page.getByText('Saved. It counts from the next letter on.').first()).toBeVisible();
}

/** Waits for the next round of letters, then follows the link. */
async function openLetter(page: Page, subject: string): Promise<void> {
  const letter = page
    .getByRole('article')
    .filter({ hasText: TALU })
    .filter({ has: page.getByRole('heading', { name: subject }) });
  await expect(async () => {
    await page.goto('/dev/letters');
    await expect(letter).toBeVisible({ timeout: 500 });
  }).toPass({ timeout: 90_000, intervals: [1_000] });
  await letter.getByRole('link').first().click();
}
