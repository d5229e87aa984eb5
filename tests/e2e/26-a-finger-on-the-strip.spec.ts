import type { Locator, Page } from '@playwright/test';
import { expect, test } from '#tests/support/journey.js';
import { signIn } from '#tests/support/journey-steps.js';
import { beginEmptyCalendar, draftOf, putIn } from '#tests/support/officer-pair.js';

/* On a phone a finger that goes sideways moves a bar by whole days; one that goes up or down scrolls the page and moves nothing. */
test.use({ viewport: { width: 360, height: 640 }, hasTouch: true, isMobile: true, actionTimeout: 15_000 });

interface Point {
  x: number;
  y: number;
}

/** A finger on the glass, as the browser itself is told of it: it decides what scrolls. */
async function swipe(page: Page, from: Point, to: Point): Promise<void> {
  const glass = await page.context().newCDPSession(page);
  const steps = 8;
  await glass.send('Input.dispatchTouchEvent', { type: 'touchStart', touchPoints: [from] });
  for (let step = 1; step <= steps; step += 1) {
    const x = from.x + ((to.x - from.x) * step) / steps;
    const y = from.y + ((to.y - from.y) * step) / steps;
    await glass.send('Input.dispatchTouchEvent', { type: 'touchMove', touchPoints: [{ x, y }] });
  }
  await glass.send('Input.dispatchTouchEvent', { type: 'touchEnd', touchPoints: [] });
  await glass.detach();
}

async function middleOf(bar: Locator): Promise<Point & { width: number }> {
  await bar.scrollIntoViewIfNeeded();
  const box = await bar.boundingBox();
  if (box === null) throw new Error('the bar is not there');
  return { x: box.x + box.width / 2, y: box.y + box.height / 2, width: box.width };
}

test('a finger drags a bar to whole days, and still scrolls the page over it', async ({ page }) => {
  await signIn(page, 'officer');
  const calendarId = await beginEmptyCalendar(page, 2034);
  await putIn(page, calendarId, 'Weed', 20);
  await page.goto(`/calendars/${calendarId}`);
  await page.getByText('The year as a strip').tap();
  const bar = page.getByRole('slider', { name: 'Move the days of Weed' });
  await expect(bar).toHaveAttribute('aria-valuetext', /^Possible from 20.June/u);
  await page.getByRole('radio', { name: 'Month' }).tap();
  await expect(page.getByRole('radio', { name: 'Month' })).toBeChecked();

  const held = await middleOf(bar);
  const pxPerDay = held.width / 15;
  await swipe(page, held, { x: held.x - 3.3 * pxPerDay, y: held.y + 2 });
  await expect(bar).toHaveAttribute('aria-valuetext', /^Possible from 17.June/u);
  const moved = await middleOf(bar);
  expect(Math.abs(held.x - moved.x - 3 * pxPerDay), 'pixels beside the day').toBeLessThan(2);

  const scrolled = () => page.evaluate(() => scrollY);
  const before = await scrolled();
  await swipe(page, moved, { x: moved.x + 4, y: moved.y - 220 });
  await expect.poll(scrolled).toBeGreaterThan(before + 100);
  await expect(bar).toHaveAttribute('aria-valuetext', /^Possible from 17.June/u);

  await page.getByRole('button', { name: 'Save 1 changed entry' }).tap();
  await expect(page.locator('.toast', { hasText: 'Saved: Weed.' })).toBeVisible();
  expect(await draftOf(page, calendarId)).toMatchObject([{ content: { offsets: { earliestDays: -3 } } }]);
});
