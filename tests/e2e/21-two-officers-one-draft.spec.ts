import type { Page, Route } from '@playwright/test';
import { expect, test } from '#tests/support/journey.js';
import {
  beginEntry,
  expectAccessible,
  expectNoSidewaysScroll,
  signIn,
} from '#tests/support/journey-steps.js';
import {
  beginEmptyCalendar,
  draftOf,
  makeIrvelOfficer,
  putIn,
  sayEverything,
} from '#tests/support/officer-pair.js';

/*
 * Two officers write one draft: each hears within seconds what the other saved and writes on; where both changed the same
 * thing, a person chooses. Then the network loses, doubles and delays every kind of write: nothing is lost, nothing comes twice.
 */
test.use({
  viewport: { width: 1280, height: 900 },
  actionTimeout: 15_000,
  // The browser tells of the connections that the journey breaks.
  expectedNoise: [/net::ERR_FAILED|409 \(Conflict\)/u],
});

const SECONDS = { timeout: 5_000 };

test('two officers in one draft hear of each other, and nobody’s text is lost', async ({
  page,
  browser,
  baseURL,
}) => {
  test.setTimeout(90_000);
  const steward = await browser.newContext({ baseURL: baseURL ?? '' });
  await makeIrvelOfficer(await steward.newPage());
  await steward.close();
  await signIn(page, 'officer');
  const calendarId = await beginEmptyCalendar(page, 2030);
  const { id } = await putIn(page, calendarId, 'Sow long millet');

  const phone = await browser.newContext({ baseURL: baseURL ?? '', viewport: { width: 320, height: 640 } });
  const irvel = await phone.newPage();
  await signIn(irvel, 'staff');
  await irvel.goto(`/calendars/${calendarId}?entry=${id}`);
  await irvel.getByText('What', { exact: true }).click();
  const notes = irvel.getByRole('textbox', { name: 'Notes' });
  await notes.pressSequentially('Lower terraces');

  await page.goto(`/calendars/${calendarId}?entry=${id}`);
  await page.getByText('What', { exact: true }).click();
  await page.getByLabel('Crop or variety').fill('short millet');
  await page.getByRole('button', { name: 'Save the entry' }).click();
  await expect(irvel.getByText('Beyno saved “Sow long millet”.')).toBeVisible(SECONDS);
  await notes.pressSequentially(' first');
  await expect(notes).toBeFocused();
  await expect(notes).toHaveValue('Lower terraces first');
  await expect(irvel.getByLabel('Crop or variety')).toHaveValue('short millet');

  await notes.fill('Upper terraces first');
  await page.getByRole('textbox', { name: 'Notes' }).fill('Nobody’s terraces');
  await page.getByRole('button', { name: 'Save the entry' }).click();
  await expect(irvel.getByText(/^Beyno saved this entry while you were writing/)).toBeVisible(SECONDS);
  await expect(notes).toHaveValue('Upper terraces first');
  await irvel.getByRole('button', { name: 'Save the entry' }).click();
  const both = irvel.getByRole('region', { name: 'Two people wrote to this entry' });
  const choice = both.getByRole('group', { name: 'Notes' });
  await expect(choice).toContainText('Nobody’s terraces');
  await expect(choice).toContainText('Upper terraces first');
  await expectNoSidewaysScroll(irvel);
  await expectAccessible(irvel);
  await choice.getByRole('radio').first().focus();
  await irvel.keyboard.press('Space');
  await irvel.keyboard.press('ArrowDown');
  await both.getByRole('button', { name: 'Save what I chose' }).focus();
  await irvel.keyboard.press('Enter');
  await expect(irvel.getByText('Saved: Sow long millet.')).toBeVisible();
  await expect(page.getByText('Irvel saved “Sow long millet”.')).toBeVisible(SECONDS);
  await expect(page.getByRole('textbox', { name: 'Notes' })).toHaveValue('Upper terraces first');
  await phone.close();
});

/** What a network does to the first write that passes; all others pass as they are. */
const MISHAPS = {
  lostOnTheWayBack: async (route: Route) => {
    await route.fetch();
    await route.abort();
  },
  doubled: async (route: Route) => {
    await route.fetch();
    await route.fulfill({ response: await route.fetch() });
  },
  late: async (route: Route) => {
    const early = route.fetch();
    await route.abort();
    await early;
  },
};

async function once(page: Page, mishap: (route: Route) => Promise<void>): Promise<void> {
  let isFirst = true;
  await page.unroute('**/api/calendars/**');
  await page.route('**/api/calendars/**', async (route) => {
    if (route.request().method() === 'GET' || !isFirst) {
      await route.fallback();
      return;
    }
    isFirst = false;
    await mishap(route);
  });
}

test('writes of the editor count once, whatever the network does to them', async ({ page }) => {
  await signIn(page, 'officer');
  const calendarId = await beginEmptyCalendar(page, 2031);
  await putIn(page, calendarId, 'Mend the walls', 1);
  const titles = async () => (await draftOf(page, calendarId)).map(({ content }) => content.titleOfficer);
  const toast = (text: string) => page.locator('.toast', { hasText: text }).last();
  await page.goto(`/calendars/${calendarId}`);

  await once(page, MISHAPS.late);
  await beginEntry(page);
  await page.getByLabel(/^Name of the work or rite/).fill('Sow');
  await page.getByRole('radio', { name: /^A fixed date/ }).check();
  await page.getByLabel('Who set it, and where it is written').first().fill('the village');
  await page.getByRole('button', { name: 'Save the entry' }).click();
  await expect(toast('Saved: Sow.')).toBeVisible();
  expect(await titles()).toEqual(['Mend the walls', 'Sow']);

  // The form stays as it was, with what stood open in it.
  await once(page, MISHAPS.lostOnTheWayBack);
  await page.getByLabel('Crop or variety').fill('beans');
  await page.getByRole('button', { name: 'Save the entry' }).click();
  await expect(page.getByText('Nothing is changed.')).toBeVisible();
  expect((await draftOf(page, calendarId))[1]?.content.crop).toBe('beans');

  await once(page, MISHAPS.doubled);
  await page.getByRole('button', { name: 'Duplicate' }).click();
  await expect(toast('A copy of Sow stands behind it.')).toBeVisible();
  expect(await titles()).toEqual(['Mend the walls', 'Sow', 'Sow']);

  await once(page, MISHAPS.lostOnTheWayBack);
  await page.getByRole('button', { name: 'Take it out' }).click();
  await expect(toast('Sow is taken out.')).toBeVisible();
  expect(await titles()).toEqual(['Mend the walls', 'Sow']);

  await once(page, MISHAPS.doubled);
  await toast('Sow is taken out.').getByRole('button', { name: 'Undo' }).click();
  await expect(toast('Sow is back.')).toBeVisible();
  expect(await titles()).toEqual(['Mend the walls', 'Sow', 'Sow']);
});

test('what was on its way when the page went is sent again by itself, once', async ({ page }) => {
  test.setTimeout(90_000);
  await signIn(page, 'officer');
  const calendarId = await beginEmptyCalendar(page, 2032);
  await putIn(page, calendarId, 'Weed', 20);
  const { id } = await putIn(page, calendarId, 'Mend the walls', 1);
  const lost = async (route: Route) => {
    if (route.request().method() === 'GET') {
      await route.fallback();
      return;
    }
    await MISHAPS.lostOnTheWayBack(route);
  };
  // A route is taken away only when nothing is on its way through it.
  const oneIsLost = () => page.waitForEvent('requestfailed', (request) => request.method() !== 'GET');
  await page.route('**/api/calendars/**', lost);
  await page.goto(`/calendars/${calendarId}`);
  await beginEntry(page);
  await page.getByLabel(/^Name of the work or rite/).fill('Sow');
  await page.getByRole('radio', { name: /^A fixed date/ }).check();
  await page.getByLabel('Who set it, and where it is written').first().fill('the village');
  const first = oneIsLost();
  await page.getByRole('button', { name: 'Save the entry' }).click();
  await expect(page.getByText(/It is sent again by itself, and saved once/)).toBeVisible();
  await first;
  // Written on while nobody knows what became of the first text.
  await page.getByLabel('Crop or variety').fill('beans');
  await expect(page.getByText(/Kept on this device/)).toBeVisible();
  const second = oneIsLost();
  await page.reload();
  await expect(page.getByLabel('Crop or variety')).toHaveValue('beans');
  await second;
  await page.unroute('**/api/calendars/**');
  await page.evaluate(() => dispatchEvent(new Event('online')));
  await expect(page.locator('.toast', { hasText: 'Saved: Sow.' }).last()).toBeVisible();
  // The address names the saved entry, no new one any more.
  await expect(page).toHaveURL(/entry=[\da-f]{8}-/u);
  await page.getByRole('button', { name: 'Save the entry' }).click();
  await expect(page.getByText('Nothing is changed.')).toBeVisible();
  // What came through by itself in the end is no trouble any more.
  await page.route('**/api/calendars/**', lost);
  await page.getByLabel('Crop or variety').fill('peas');
  const third = oneIsLost();
  await page.getByRole('button', { name: 'Save the entry' }).click();
  await third;
  const trouble = page.getByText(/There is no network just now/);
  await expect(trouble).toBeVisible();
  await page.unroute('**/api/calendars/**');
  await page.evaluate(() => dispatchEvent(new Event('online')));
  await expect(page.getByText('Nothing is changed.')).toBeVisible();
  await expect(trouble).toHaveCount(0);
  expect(
    (await draftOf(page, calendarId)).map(({ content }) => [content.titleOfficer, content.crop]),
  ).toEqual([
    ['Weed', ''],
    ['Mend the walls', ''],
    ['Sow', 'peas'],
  ]);

  await sayEverything(page, calendarId);
  // Moved and submitted while answers are lost: done once each.
  await once(page, MISHAPS.lostOnTheWayBack);
  await page.goto(`/calendars/${calendarId}?entry=${id}`);
  await page.getByRole('button', { name: 'Change the order' }).click();
  await page.getByRole('button', { name: 'Move Mend the walls up' }).click();
  await expect
    .poll(async () => (await draftOf(page, calendarId)).map(({ content }) => content.titleOfficer))
    .toEqual(['Mend the walls', 'Weed', 'Sow']);
  await once(page, MISHAPS.lostOnTheWayBack);
  await page.getByRole('button', { name: 'Submit for review' }).click();
  await page.getByRole('dialog').getByRole('button', { name: 'Submit it' }).click();
  await expect(page).toHaveURL(/versions\/1$/u);
});

test('windows are moved on the strip by keys and by hand, and saved like anything else', async ({ page }) => {
  await signIn(page, 'officer');
  const calendarId = await beginEmptyCalendar(page, 2033);
  await putIn(page, calendarId, 'Mend the walls', 1);
  await putIn(page, calendarId, 'Weed', 20);
  await page.goto(`/calendars/${calendarId}`);
  const bar = (title: string) => page.getByRole('slider', { name: `Move the days of ${title}` });
  await bar('Mend the walls').focus();
  await page.keyboard.press('ArrowRight');
  await page.keyboard.press('Shift+ArrowRight');
  await expect(bar('Mend the walls')).toHaveAttribute('aria-valuetext', /^Possible from 12.June/u);
  await page.keyboard.press('ArrowDown');
  await expect(bar('Weed')).toBeFocused();
  await page.keyboard.press('Enter');
  await expect(page.getByRole('heading', { name: /^Weed/ })).toBeVisible();

  await page.getByRole('radio', { name: 'Month' }).check({ force: true });
  const box = await bar('Weed').boundingBox();
  if (box === null) throw new Error('the bar is not there');
  const pxPerDay = box.width / 15;
  const [x, y] = [box.x + box.width / 2, box.y + box.height / 2];
  await page.mouse.move(x, y);
  await page.mouse.down();
  await page.mouse.move(x - 2.2 * pxPerDay, y, { steps: 4 });
  await page.mouse.up();
  await expect(bar('Weed')).toHaveAttribute('aria-valuetext', /^Possible from 18.June/u);

  await page.getByText('How the strip is shown').click();
  await page.getByLabel('Second scale').selectOption('market');
  await page.getByText('Market weeks as a table').click();
  await expect(page.getByRole('rowheader', { name: /^Market week from/ }).first()).toBeVisible();
  await page.getByLabel('Second scale').selectOption('months');
  await expect(page.getByRole('row', { name: /^Ŋɔ́rɛ̃ 8.Jun.2033/u })).toBeVisible();
  await page.getByText('Show as a table').click();
  await page.getByLabel('Name of Weed').fill('Weed twice');
  await page.getByLabel('Days to last, Weed twice').fill('16');
  await expectNoSidewaysScroll(page);
  await page.getByRole('button', { name: 'Save all 2 changed entries' }).click();
  await expect(page.locator('.toast', { hasText: 'Saved: Weed twice.' })).toBeVisible();
  await page.reload();
  await expect(bar('Mend the walls')).toHaveAttribute('aria-valuetext', /^Possible from 12.June/u);
  await expect(bar('Weed twice')).toHaveAttribute(
    'aria-valuetext',
    /^Possible from 18.June.*advised 6.July/u,
  );

  await page.setViewportSize({ width: 320, height: 700 });
  await page.goto(`/calendars/${calendarId}`);
  await page.getByText('The year as a strip').click();
  await expect(bar('Weed twice')).toBeVisible();
  await page.getByText('Show as a table').click();
  await expectNoSidewaysScroll(page);
  await page.evaluate(() => {
    scrollTo(0, 0);
  });
  await expectAccessible(page);
});
