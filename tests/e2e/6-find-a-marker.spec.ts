import { expect, test } from '#tests/support/journey.js';
import { expectAccessible, expectNoSidewaysScroll, signIn } from '#tests/support/journey-steps.js';

/*
 * "We used to start when the Pleiades come back": an officer in the village, with a phone, finds out what has become of
 * that sign, what falls on its old day now, and takes it to a calendar.
 */
test('an officer goes from an old sign to a well-founded one on a phone', async ({ page }) => {
  await page.setViewportSize({ width: 320, height: 640 });
  await signIn(page, 'officer');
  await page.getByRole('link', { name: 'Stars' }).click();
  await page.getByRole('link', { name: 'Which sign falls near a day?' }).click();
  await expect(page.getByRole('heading', { name: 'Which sign falls near this day?' })).toBeVisible();
  await expect(page.getByText(/signs? within twenty days of/)).toBeVisible();
  await expectAccessible(page);

  await page.getByRole('radio', { name: /An old sign/ }).check();
  await expect(page.getByText('Choose the star or figure that people used to go by.')).toBeVisible();
  await page.getByRole('combobox', { name: 'We used to go by' }).fill('Pleia');
  await page.getByRole('option', { name: /Pleiades/ }).click();
  await page.getByRole('spinbutton', { name: 'Since about the year' }).fill('1100');
  await page.getByRole('spinbutton', { name: 'Since about the year' }).press('Enter');

  const old = page.getByRole('region', { name: 'What has become of the old sign' });
  await expect(old.getByText(/In 1100/)).toBeVisible();
  await expect(old.getByText(/It has moved \d+ days later/)).toBeVisible();
  await expectNoSidewaysScroll(page);
  await expectAccessible(page);

  await page.getByText('More about it').first().click();
  await expect(page.getByText('Keeps its day', { exact: true }).first()).toBeVisible();
  await page
    .getByRole('link', { name: /^Tie work to / })
    .first()
    .click();
  await expect(page.getByRole('heading', { name: 'Which calendar shall go by it?' })).toBeVisible();
});

test('anybody sees how a star moved through the centuries, as a picture, a table and a file', async ({
  page,
}) => {
  await signIn(page, 'observer');
  await page.goto('/stars/pleiades?year=2027');
  await page.getByRole('link', { name: 'How it moved through the centuries' }).click();
  await expect(page.getByRole('heading', { name: 'How Pleiades moved' })).toBeVisible();
  await expect(
    page.getByRole('img', { name: /It moves later by about 1\.\d days in a century/ }),
  ).toBeVisible();
  await page.getByRole('radio', { name: '3001 BC to 3000' }).click();
  await expect(page.getByRole('img', { name: /from 3001 BC to 3000/ })).toBeVisible();
  await page.getByText('Show as a table').click();
  await expect(page.getByRole('row', { name: /2027, the year on screen/ })).toBeVisible();
  await expectAccessible(page);

  const downloading = page.waitForEvent('download');
  await page.getByRole('link', { name: /as a CSV file/ }).click();
  expect((await downloading).suggestedFilename()).toMatch(/^Pleiades from .* -3000 to 3000\.csv$/);
});
