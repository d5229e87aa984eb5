import { expect, test } from '#tests/support/journey.js';
import { expectAccessible, expectNoSidewaysScroll, signIn } from '#tests/support/journey-steps.js';

test('an observer sees the peg, what to look for and when to stop, in the first minutes', async ({
  page,
}) => {
  await page.setViewportSize({ width: 320, height: 640 });
  await signIn(page, 'observer');
  // 10 March is the 69th day of the year.
  await expect(page.getByText('hole 69')).toBeVisible();
  await expect(page.getByRole('heading', { level: 1 })).toContainText('Wednesday');
  await expect(page.getByText(/^Look for/)).toBeVisible();
  await expect(page.getByText(/Eyes only: no phone camera, no binoculars/)).toBeVisible();
  await expect(page.getByText(/between .* and /).first()).toBeVisible();
  await expectNoSidewaysScroll(page);
  await expectAccessible(page);

  await page.getByRole('link', { name: /^More about/ }).click();
  await expect(page.getByRole('heading', { name: 'What these dates rest on' })).toBeVisible();
  await expectAccessible(page);
});

test('an observer is not offered what belongs to others', async ({ page }) => {
  await signIn(page, 'observer');
  await page.getByRole('link', { name: 'Calendar' }).click();
  await expect(page.getByText('Begin a calendar')).toHaveCount(0);
  await page.goto('/village/people');
  await expect(page.getByText('The list of people is for officers, elders and the steward.')).toBeVisible();
});
