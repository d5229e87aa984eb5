import { expect, test } from '#tests/support/journey.js';
import { expectAccessible, expectNoSidewaysScroll, signIn } from '#tests/support/journey-steps.js';

/*
 * The officer reads why days moved between the published calendar and the draft, takes the submission back, sets the draft
 * back to what is published, and looks at ten years at once. On a phone.
 */
test.use({ viewport: { width: 320, height: 700 }, hasTouch: true });

test('the officer compares, sets the draft back and looks ten years ahead', async ({ page }) => {
  await signIn(page, 'officer');
  await page.goto('/calendars');
  await page.getByRole('link', { name: 'All versions' }).first().click();
  await page.getByRole('link', { name: 'Compare two of them' }).click();
  const sowing = page.getByRole('region', { name: 'Sow long millet' });
  await expect(sowing).toContainText('Why: the days from the lead, changed by hand.');
  await page.getByRole('radio', { name: 'Days', exact: true }).press('Space');
  await expect(page.getByText('3 entries differ in their days.')).toBeVisible();
  await expect(page.getByRole('region', { name: 'Sow short millet' })).toHaveCount(0);
  await page.getByRole('radio', { name: 'Side by side' }).press('Space');
  await expect(page.getByRole('table', { name: 'Every difference, before and now' })).toContainText('17');
  await expectNoSidewaysScroll(page);
  await expectAccessible(page);

  await page.getByRole('link', { name: 'Back' }).click();
  await page.getByRole('link', { name: /Submission 2/u }).click();
  await page.getByRole('button', { name: 'Take it back' }).click();
  await page.getByRole('dialog').getByRole('button', { name: 'Open the draft' }).click();
  await expect(page).toHaveURL(/\/calendars\/[^/]+$/u);

  await page.goto('/calendars');
  await page.getByRole('link', { name: /Open 2027-1/u }).click();
  await page.getByRole('button', { name: 'Set the draft back to this' }).click();
  const question = page.getByRole('dialog', { name: 'Set the draft back to 2027-1?' });
  await expect(question).toContainText('Nothing is agreed by this');
  await question.getByRole('button', { name: 'Set it back' }).click();
  const report = page.getByRole('region', { name: 'The draft, set back to 2027-1' });
  await expect(report).toContainText('3 entries say again what they said:');
  await expect(report).toContainText('Sow long millet');
  await expectAccessible(page);

  await page.goto('/calendars');
  await page.getByRole('link', { name: 'Ten years at once' }).first().click();
  await expect(page.getByRole('heading', { level: 1, name: '2027 to 2036' })).toBeVisible();
  await expect(page.getByRole('img', { name: /Sow long millet: a bar for each year/u })).toBeVisible();
  await expectNoSidewaysScroll(page);
  await expectAccessible(page);
  await page.getByRole('radio', { name: 'As a table' }).press('Space');
  await expect(page.getByRole('columnheader', { name: '2036' })).toBeAttached();
  await page.getByRole('link', { name: 'Ten years after' }).click();
  await expect(page.getByRole('heading', { level: 1, name: '2037 to 2046' })).toBeVisible();
});
