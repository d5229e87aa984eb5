import type { Calendar } from '#shared/contracts/calendars.js';
import { expect, test } from '#tests/support/journey.js';
import { expectAccessible, expectNoSidewaysScroll, signIn } from '#tests/support/journey-steps.js';

/*
 * Somebody of a group who has no other part in the review: Today says that something waits, the page shows the one
 * entry that the group keeps, four buttons and a note answer it, and nothing else of the submission opens.
 */
test.use({ viewport: { width: 360, height: 740 }, hasTouch: true });

test('an observer answers on a small phone for what their group keeps', async ({ page }) => {
  await signIn(page, 'observer3');
  await page.goto('/');
  await page.getByRole('link', { name: /1 entry that you keep waits for your answer/u }).click();
  await expect(page.getByRole('heading', { level: 1 })).toContainText('Berry week');
  await expect(page.getByText('First star again')).toHaveCount(0);
  const buttons = page.getByRole('group', { name: 'Your answer' });
  await expect(buttons.getByRole('button', { name: 'Agree' })).toBeInViewport();
  await expectNoSidewaysScroll(page);
  await expectAccessible(page);

  await buttons.getByRole('button', { name: 'Change this' }).click();
  await page.getByLabel('What should be different?').fill('The south side is ripe some days earlier');
  await page.getByRole('button', { name: 'Keep this answer' }).click();
  await expect(
    page.getByRole('heading', { name: 'You have answered everything that you keep.' }),
  ).toBeVisible();
  await expectNoSidewaysScroll(page);
  await expectAccessible(page);

  await page.getByRole('link', { name: 'Leave' }).last().click();
  await expect(page.getByText('that you keep waits for your answer')).toHaveCount(0);
  const { items } = (await (await page.request.get('/api/calendars')).json()) as { items: Calendar[] };
  const calendar = items.find(({ year }) => year === 2027);
  const version = `/calendars/${calendar?.id ?? ''}/versions/1`;
  expect((await page.request.get(`/api${version}`)).status()).toBe(404);

  // Taken back, so that it waits for the next who comes by.
  await page.goto(`${version}/own`);
  await expect(page.getByText('The south side is ripe some days earlier')).toBeVisible();
  await page.getByRole('button', { name: 'Take it back' }).click();
  await expect(page.getByText('Your answer is taken back.')).toBeVisible();
});
