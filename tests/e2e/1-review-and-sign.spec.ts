import { devices } from '@playwright/test';
import { expect, test } from '#tests/support/journey.js';
import { expectAccessible, expectNoSidewaysScroll, signIn } from '#tests/support/journey-steps.js';

/*
 * The demo's second submission for 2027: Elder A-1 has answered everything, Elder A-2 nothing that changed, Elder A-3
 * keeps a difference at the sowing of long millet. Afterwards the officer publishes what they and the steward signed.
 */
test.use({
  viewport: { width: 360, height: 740 },
  isMobile: true,
  hasTouch: true,
  userAgent: devices['Pixel 7'].userAgent,
});
test.describe.configure({ mode: 'serial' });

test('an elder who answered everything is led to the signature at once', async ({ page }) => {
  await signIn(page, 'elder');
  await expect(page.getByText('Every entry has your answer.')).toBeVisible();
  await expectAccessible(page);
  await page.getByRole('button', { name: 'Sign it' }).click();
  await expect(page.getByText('You have signed. Thank you.')).toBeVisible();
  await expect(page.getByText('You have signed this submission.')).toBeVisible();
});

test('an elder meets one entry at a time, sees the kept difference, answers and signs', async ({ page }) => {
  await signIn(page, 'elder2');
  await expect(page.getByRole('heading', { level: 1 })).toContainText('Sow long millet');
  await expect(page.getByText('we wait for the red star')).toBeVisible();
  await expectNoSidewaysScroll(page);
  await expectAccessible(page);

  const answers = page.getByRole('group', { name: 'Your answer' });
  await answers.getByRole('button', { name: 'Change this' }).click();
  await page.getByRole('button', { name: 'Keep this answer' }).click();
  await expect(page.getByText('Say what should be different: write it, or speak it.')).toBeVisible();
  await page.getByLabel('What should be different?').fill('Begin three days later.');
  await page.reload();
  await answers.getByRole('button', { name: 'Change this' }).click();
  await expect(page.getByLabel('What should be different?')).toHaveValue('Begin three days later.');
  await page.getByRole('button', { name: 'Leave it as it is' }).click();

  for (const title of ['Sow long millet', 'Sow short millet', 'Bird-scaring rota']) {
    await expect(page.getByRole('heading', { level: 1 })).toContainText(title);
    await answers.getByRole('button', { name: 'Agree' }).click();
  }
  await expect(page.getByText('Every entry has your answer.')).toBeVisible();
  await page.getByRole('button', { name: 'Sign it' }).click();
  await expect(page.getByText('You have signed. Thank you.')).toBeVisible();
});

test('the elder who keeps another way signs as well, with the difference standing', async ({ page }) => {
  await signIn(page, 'elder3');
  const answers = page.getByRole('group', { name: 'Your answer' });
  for (const title of ['Sow short millet', 'Bird-scaring rota']) {
    await expect(page.getByRole('heading', { level: 1 })).toContainText(title);
    await answers.getByRole('button', { name: 'Agree' }).click();
  }
  await page.getByRole('button', { name: /Sow long millet/ }).click();
  await expect(page.getByText('Your difference stays beside the entry.')).toBeVisible();
  await page.getByRole('button', { name: /Next entry|To the end/ }).click();
  await page.goto(page.url().replace(/entry=[^&]+/, 'entry=end'));
  await page.getByRole('button', { name: 'Sign it' }).click();
  await expect(page.getByText('You have signed. Thank you.')).toBeVisible();
});

test('the steward’s signature completes the rule, and the officer publishes', async ({ page, browser }) => {
  await signIn(page, 'steward');
  await page.getByRole('link', { name: /waits for your signature/ }).click();
  await expectAccessible(page);
  await page.getByRole('button', { name: 'Sign as the steward' }).click();
  await expect(page.getByText('with that the calendar is signed off')).toBeVisible();

  const office = await browser.newPage();
  await signIn(office, 'officer');
  await office.getByRole('link', { name: /is signed off/ }).click();
  await office.getByRole('button', { name: 'Publish it' }).click();
  await office.getByRole('dialog').getByRole('button', { name: 'Publish it' }).click();
  await expect(office.getByRole('heading', { level: 1 })).toContainText('2027-2');
  await office.close();
});
