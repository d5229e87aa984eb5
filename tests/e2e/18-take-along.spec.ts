import { readFile } from 'node:fs/promises';
import type { CalendarFile } from '#shared/contracts/calendar-file.js';
import type { Calendar } from '#shared/contracts/calendars.js';
import { expect, test } from '#tests/support/journey.js';
import { addPictureTo } from '#tests/support/journey-media.js';
import { expectAccessible, expectNoSidewaysScroll, signIn } from '#tests/support/journey-steps.js';
import { unzipped } from '#tests/support/zip.js';

test('an officer takes the published calendar along, gives it to a telephone, and ends that again', async ({
  page,
  request,
}) => {
  await page.setViewportSize({ width: 320, height: 720 });
  await signIn(page, 'officer');
  const { items } = (await (await page.request.get('/api/calendars')).json()) as { items: Calendar[] };
  const calendar = items.find(({ published }) => published !== null);
  const version = `/calendars/${calendar?.id ?? ''}/versions/${String(calendar?.published?.number)}`;
  const file = (await (await page.request.get(`/api${version}/calendar.json`)).json()) as CalendarFile;
  await addPictureTo(page, file, 'Sow short millet');
  await page.goto(version);
  const along = page.getByRole('region', { name: 'Take along' });
  await along.getByLabel('Remind me on the telephone').selectOption({ label: '3 days ahead' });
  const [ics] = await Promise.all([
    page.waitForEvent('download'),
    along.getByRole('link', { name: 'For a telephone’s calendar' }).click(),
  ]);
  const text = await readFile(await ics.path(), 'utf8');
  expect(text).toContain('BEGIN:VCALENDAR\r\n');
  expect(text).toContain('TRIGGER:-P3D\r\n');
  const [csv] = await Promise.all([
    page.waitForEvent('download'),
    along.getByRole('link', { name: 'As a table (CSV)' }).click(),
  ]);
  expect(await readFile(await csv.path(), 'utf8')).toContain('name in the village,name for the office');
  await expect(along.getByText('1 picture goes along.')).toBeVisible();
  const [zip] = await Promise.all([
    page.waitForEvent('download'),
    along.getByRole('link', { name: 'Whole, with voices and pictures (ZIP, about 0.1 MB)' }).click(),
  ]);
  const [whole, picture] = await unzipped(await readFile(await zip.path()));
  expect(String(whole?.content)).toContain('"A handful"');
  expect(picture?.path).toMatch(/^files\/[0-9a-f]{64}\.jpg$/u);

  const feeds = page.getByRole('region', { name: 'Always fresh on your telephone' });
  await feeds.getByRole('button', { name: 'Make an address' }).click();
  const address = await feeds.getByRole('status').locator('code').innerText();
  await expect(feeds.getByText('No telephone has looked at it yet.')).toBeVisible();
  expect(await (await request.get(address)).text()).toContain('BEGIN:VEVENT');
  await expectAccessible(page);
  await expectNoSidewaysScroll(page);
  await page.reload();
  await expect(feeds.getByText(/Last looked at on/)).toBeVisible();
  await expect(feeds.locator('code')).toHaveCount(0);
  await feeds.getByRole('button', { name: 'End it' }).click();
  await page.getByRole('button', { name: 'End it now' }).click();
  await expect(feeds.getByRole('button', { name: 'End it' })).toHaveCount(0);
  expect((await request.get(address)).status()).toBe(404);
});
