import { expect, test } from '#tests/support/journey.js';
import { expectAccessible, expectNoSidewaysScroll, signIn } from '#tests/support/journey-steps.js';

/*
 * The officer begins next year's calendar from this one on a phone: one question, then a page of what the new year
 * changed. It can be opened again, and a second beginning is not offered.
 */
test.use({ viewport: { width: 360, height: 740 }, hasTouch: true });

test('the officer rolls the year over and reads what it changed', async ({ page }) => {
  await signIn(page, 'officer');
  await page.goto('/calendars');
  await page.getByRole('button', { name: 'Begin 2028 from this one' }).click();
  const question = page.getByRole('dialog', { name: 'Begin the calendar of 2028 from 2027?' });
  await expect(question).toContainText('Nothing is agreed by this');
  await question.getByRole('button', { name: 'Begin 2028' }).click();

  await expect(page.getByRole('heading', { level: 1, name: 'From 2027 to 2028' })).toBeVisible();
  await expect(page.getByText(/stays? within three days/u)).toBeVisible();
  await expect(page.getByRole('table').first()).toBeVisible();
  await expectNoSidewaysScroll(page);
  await expectAccessible(page);

  await page.getByRole('link', { name: 'Open the draft of 2028' }).click();
  await expect(page.getByRole('heading', { level: 1, name: /2028/u })).toBeVisible();
  await page.goto('/calendars');
  await expect(page.getByRole('button', { name: 'Begin 2028 from this one' })).toHaveCount(0);
  await expect(page.getByRole('link', { name: 'Open 2028' })).toBeVisible();
  await page.getByRole('link', { name: 'What changed from 2027 to 2028' }).click();
  await expect(page.getByRole('heading', { level: 1, name: 'From 2027 to 2028' })).toBeVisible();
});
