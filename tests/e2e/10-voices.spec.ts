import { devices, type Page } from '@playwright/test';
import sharp from 'sharp';
import type { Attachment } from '#shared/contracts/attachments.js';
import type { Calendar } from '#shared/contracts/calendars.js';
import type { SessionState } from '#shared/contracts/session.js';
import type { Version } from '#shared/contracts/versions.js';
import { expect, test } from '#tests/support/journey.js';
import { expectAccessible, expectNoSidewaysScroll, signIn } from '#tests/support/journey-steps.js';
import { photoWithPlace } from '#tests/support/media.js';

/*
 * An elder speaks about an entry of the demo's second submission. The page is closed in the middle and the line breaks
 * once; nothing of what was said is lost, and nobody hears it who is not meant to.
 */
test.use({
  viewport: { width: 360, height: 740 },
  isMobile: true,
  hasTouch: true,
  userAgent: devices['Pixel 7'].userAgent,
  // A guessed address is answered 404, and one sending is cut on purpose.
  expectedNoise: [/404|ERR_INTERNET_DISCONNECTED/u],
});
test.describe.configure({ mode: 'serial' });

const TITLE = 'Why we wait for the second rain';
const panel = (page: Page) => page.getByRole('region', { name: 'Voices and pictures' });

async function json<T>(page: Page, path: string): Promise<T> {
  return (await (await page.request.get(path)).json()) as T;
}

/** The first entry of the demo's second submission, as the person who is signed in finds it. */
async function findEntry(page: Page): Promise<{ communityId: string; calendarId: string; entryId: string }> {
  const { memberships } = await json<SessionState>(page, '/api/session');
  const communityId = memberships?.[0]?.communityId ?? '';
  const { items } = await json<{ items: Calendar[] }>(page, '/api/calendars');
  const own = items.find((calendar) => calendar.communityId === communityId && calendar.year === 2027);
  const calendarId = own?.id ?? '';
  const { entries } = await json<Version>(page, `/api/calendars/${calendarId}/versions/2`);
  return { communityId, calendarId, entryId: entries[0]?.entryId ?? '' };
}

async function attachmentsOf(page: Page): Promise<Attachment[]> {
  const { communityId, entryId } = await findEntry(page);
  const path = `/api/communities/${communityId}/attachments?subjectType=entry&subjectId=${entryId}`;
  return (await json<{ items: Attachment[] }>(page, path)).items;
}

test('an elder records, closes the page in the middle, finds it again, listens and keeps it', async ({
  page,
  context,
}) => {
  await signIn(page, 'elder2');
  const { calendarId, entryId } = await findEntry(page);
  const review = `/calendars/${calendarId}/versions/2/review?entry=${entryId}`;
  await page.goto(review);
  await page.getByRole('button', { name: 'Record a voice' }).click();
  await expect(page.getByRole('radio', { name: /The elders/ })).toBeChecked();
  await expectAccessible(page);
  await page.getByRole('button', { name: 'On to the spoken agreement' }).click();
  await page.getByRole('button', { name: 'Record the agreement' }).click();
  await expect(page.getByRole('timer')).not.toHaveText('0:00');
  await page.getByRole('button', { name: 'Stop' }).click();
  const agreement = page.getByRole('group', { name: 'Spoken agreement' });
  await expect(agreement.getByRole('button', { name: 'Listen' })).toBeVisible();
  await page.getByRole('button', { name: 'Yes, on to the recording' }).click();
  await page.getByRole('button', { name: 'Record', exact: true }).click();
  await expect(page.getByRole('timer')).toHaveText('0:05');
  await expectNoSidewaysScroll(page);
  await page.close();

  const again = await context.newPage();
  await again.goto(review);
  await expect(panel(again).getByText('An unsent recording is here')).toBeVisible();
  await panel(again).getByRole('button', { name: 'Listen to it' }).click();
  const voice = again.getByRole('group', { name: /^Recording of/ });
  await voice.getByRole('button', { name: 'Listen' }).click();
  await expect(voice.getByRole('button', { name: 'Pause' })).toBeVisible();
  await again.getByLabel('What is it about?').fill(TITLE);
  await expectAccessible(again);

  await context.route(/\/parts$/u, (route) => route.abort('internetdisconnected'), { times: 1 });
  await again.getByRole('button', { name: 'Keep it' }).click();
  await expect(again.getByText('Not sent yet. It is kept on this device.')).toBeVisible();
  await again.getByRole('button', { name: 'Send it again' }).click();
  await expect(again.getByText('Kept with the village.')).toBeVisible();

  const kept = panel(again).getByRole('article', { name: TITLE });
  await expect(kept.getByRole('button', { name: 'Listen' })).toBeVisible();
  await kept.getByRole('radio', { name: '0.8 ×' }).check();
  await kept.getByRole('button', { name: 'Listen' }).click();
  await expect(kept.getByRole('button', { name: 'Pause' })).toBeVisible();
  await expect(panel(again).getByText('An unsent recording is here')).toBeHidden();
  await expectNoSidewaysScroll(again);
  await expectAccessible(again);
  const [attachment, ...more] = await attachmentsOf(again);
  expect(more).toEqual([]);
  expect(attachment?.parts.map(({ part, contentType }) => [part, contentType])).toEqual([
    [0, 'audio/webm'],
    [1, 'audio/webm'],
  ]);
  expect(attachment?.parts[1]?.seconds).toBeGreaterThan(1);
  expect(attachment?.parts[1]?.bytes).toBeGreaterThan(1000);
  await again.close();
});

test('another elder hears it; the officer, who is not of that circle, finds nothing', async ({
  page,
  browser,
}) => {
  await signIn(page, 'elder3');
  const [attachment] = await attachmentsOf(page);
  expect(attachment?.title).toBe(TITLE);
  const address = `/api/attachments/${attachment?.id}/parts/1`;
  expect((await page.request.get(address, { headers: { Range: 'bytes=0-99' } })).status()).toBe(206);

  const office = await browser.newPage();
  await signIn(office, 'officer');
  const { calendarId, entryId } = await findEntry(office);
  await office.goto(`/calendars/${calendarId}?entry=${entryId}`);
  await expect(panel(office).getByText('Nobody has added a voice or a picture yet.')).toBeVisible();
  await expect(office.getByText(TITLE)).toHaveCount(0);
  expect((await office.request.get(address)).status()).toBe(404);
  await office.close();
});

test('a photo loses where it was taken; who is in it has to have agreed', async ({ page }) => {
  await signIn(page, 'officer');
  const { calendarId, entryId } = await findEntry(page);
  await page.goto(`/calendars/${calendarId}?entry=${entryId}`);
  await panel(page).getByRole('button', { name: 'Add a picture' }).click();
  const photo = await photoWithPlace();
  expect((await sharp(photo).metadata()).exif?.toString('latin1')).toContain('Telltale');
  await page
    .getByLabel('Choose a picture')
    .setInputFiles({ name: 'terrace.jpg', mimeType: 'image/jpeg', buffer: photo });
  await expect(page.getByRole('img', { name: 'The picture you chose' })).toBeVisible();
  await page.getByLabel('What does it show?').fill('The upper terraces');
  await page.getByRole('button', { name: 'Keep it' }).click();
  await expect(page.getByText('Choose one of the two.')).toBeVisible();
  await expectAccessible(page);
  await page.getByRole('radio', { name: 'Nobody can be made out' }).check();
  await page.getByRole('button', { name: 'Keep it' }).click();
  await expect(panel(page).getByRole('button', { name: /Show it large/ })).toBeVisible();
  await expectNoSidewaysScroll(page);
  const [picture] = await attachmentsOf(page);
  for (const part of ['parts/1', 'thumbnail']) {
    const served = await (await page.request.get(`/api/attachments/${picture?.id}/${part}`)).body();
    expect((await sharp(served).metadata()).exif).toBeUndefined();
    expect(served.toString('latin1')).not.toMatch(/Telltale|GPS/u);
  }
});
