import { readFile } from 'node:fs/promises';
import type { CalendarFile } from '#shared/contracts/calendar-file.js';
import type { Calendar } from '#shared/contracts/calendars.js';
import { expect, test } from '#tests/support/journey.js';
import { addPictureTo } from '#tests/support/journey-media.js';
import { expectAccessible, expectNoSidewaysScroll, signIn } from '#tests/support/journey-steps.js';
import { unzipped, zipped } from '#tests/support/zip.js';

/*
 * The officer brings last year's spreadsheet in on a phone: a column is matched by hand, a line is put right, the network
 * goes in the middle, and nothing comes twice. Then a calendar that was taken along whole comes back, with a picture.
 */
test.use({ viewport: { width: 320, height: 740 }, hasTouch: true, expectedNoise: [/ERR_FAILED|404|409/u] });

test('the officer brings a table in, line by line looked at, and a calendar’s own file', async ({ page }) => {
  await signIn(page, 'officer');
  const { items } = (await (await page.request.get('/api/calendars')).json()) as { items: Calendar[] };
  const published = items.find((calendar) => calendar.published !== null);
  await page.goto('/calendars');
  await page.getByRole('button', { name: /^Begin 2028 from this one/u }).click();
  await page.getByRole('dialog').getByRole('button', { name: 'Begin 2028' }).click();
  await page.getByRole('link', { name: 'Open the draft of 2028' }).click();
  await page.getByRole('link', { name: 'Take along, bring in' }).click();
  const bring = page.getByRole('region', { name: 'Bring in' });
  const [template] = await Promise.all([
    page.waitForEvent('download'),
    bring.getByRole('button', { name: 'An empty table to fill in' }).click(),
  ]);
  const [titles = '', ...examples] = (await readFile(await template.path(), 'utf8')).trim().split('\r\n');
  expect(titles).toContain('name for the office');

  await bring.getByLabel('Language of the table').selectOption({ label: 'Español' });
  await expect(bring.getByText(/^These words were not yet read by somebody/u)).toBeVisible();
  const [spanish] = await Promise.all([
    page.waitForEvent('download'),
    bring.getByRole('button', { name: 'An empty table to fill in' }).click(),
  ]);
  expect(spanish.suggestedFilename()).toBe('dawnpeg-tabla.csv');
  const [spanishTitles = ''] = (await readFile(await spanish.path(), 'utf8')).split('\r\n');

  const choose = (name: string, content: string | Buffer) =>
    bring.getByLabel('File to bring in').setInputFiles({ name, mimeType: '', buffer: Buffer.from(content) });
  const table = (day: string) =>
    [
      ...['Work;type;When;days;from', `Bind sheaves;farm;Pleiades, first morning;${day};`],
      ...[
        'Sweep;household;6/7;;',
        'Cart;farm;actual date of Bind sheaves;2;',
        'Fold;farm;Geese go north;5;2 June',
      ],
    ].join('\n');
  await choose('last-year.csv', table('soon'));
  await bring.getByLabel('“When”').selectOption({ label: 'sign or day' });
  await bring.getByLabel('“days”').selectOption({ label: 'days from the sign: best from' });
  await bring.getByRole('button', { name: 'Look at every line' }).click();
  await expect(bring.getByText('3 lines need another look.')).toBeVisible();
  await expect(bring.getByText('days: Write a whole number of days.', { exact: true })).toBeVisible();
  await expectAccessible(page);
  await expectNoSidewaysScroll(page);

  const broken = [...spanishTitles.split(',').keys()].map((index) => (index === 3 ? 'magia' : ''));
  await choose('tabla.csv', [spanishTitles, broken.join(',')].join('\r\n'));
  await bring.getByRole('button', { name: 'Look at every line' }).click();
  // A line that needs another look names the column as its table does.
  await expect(bring.getByText(/^tipo: This kind is not known/u)).toBeVisible();

  await choose('last-year.csv', table('7'));
  // The choice was kept for these titles.
  await expect(bring.getByLabel('“When”')).toHaveValue('when');
  await bring.getByLabel('Days such as 6/7').selectOption({ label: 'The day comes first: 6 July' });
  await bring.getByRole('button', { name: 'Look at every line' }).click();
  await bring.getByRole('checkbox', { name: '“Geese go north” is a sign of nature' }).check();
  await bring.getByRole('button', { name: 'Look at every line' }).click();
  await expect(bring.getByText('All 4 lines are right. Nothing is kept yet.')).toBeVisible();
  await expect(bring.getByText('Its days come once that other work was really done.')).toBeVisible();
  await expectNoSidewaysScroll(page);
  await page.route('**/imports/table', async (route) => {
    // The server does it, and the answer never comes.
    await route.fetch();
    await route.abort();
  });
  await bring.getByRole('button', { name: 'Bring 4 entries in' }).click();
  await expect(bring.getByText(/There is no network just now/u)).toBeVisible();
  await page.unroute('**/imports/table');
  await bring.getByRole('button', { name: 'Bring 4 entries in' }).click();
  await expect(bring.getByText('4 entries were brought in. They are drafts.')).toBeVisible();
  await expectAccessible(page);
  await bring.getByRole('link', { name: 'Open the draft' }).click();
  await expect(page.getByText('Bind sheaves')).toHaveCount(1);

  await page.goBack();
  await choose('filled.csv', [titles, ...examples, '4,Ŋɔ́,Glean,farm,,,,,,1 August'].join('\r\n'));
  await expect(bring.getByText(/^3 example lines of the empty table are passed over/)).toBeVisible();

  const version = `/api/calendars/${published?.id ?? ''}/versions/${String(published?.published?.number)}`;
  const file = await (await page.request.get(`${version}/calendar.json`)).text();
  await choose('calendar.json', file.replace('"farm"', '"household"'));
  await expect(bring.getByText(/a checksum does not fit/u)).toBeVisible();

  await addPictureTo(page, JSON.parse(file) as CalendarFile, 'Sow short millet');
  const zip = await (await page.request.get(`${version}/calendar.zip`)).body();
  const others = (await unzipped(zip)).filter(({ path }) => !path.startsWith('files/'));
  await choose('calendar.zip', await zipped(others));
  await expect(bring.getByText('“A handful”: its file is not in the ZIP.')).toBeVisible();
  await expectAccessible(page);
  await expect(bring.getByRole('button', { name: /^Bring \d+ entries in$/u })).toHaveCount(0);
  await choose('calendar.zip', zip);
  await expect(bring.getByText(/^\d+ entries would come in\.$/u)).toBeVisible();
  await expect(bring.getByText(/^1 picture came along/u)).toBeVisible();
  await expectNoSidewaysScroll(page);
  await bring.getByRole('button', { name: /^Bring \d+ entries in$/u }).click();
  await expect(bring.getByText(/^\d+ entries were brought in/u)).toBeVisible();
});

test('the officer opens a page for everybody, a passer-by reads it, and it is closed again', async ({
  page,
  browser,
}) => {
  await signIn(page, 'officer');
  const { items } = (await (await page.request.get('/api/calendars')).json()) as { items: Calendar[] };
  const calendar = items.find(({ published }) => published !== null);
  await page.goto(`/calendars/${calendar?.id ?? ''}/versions/${String(calendar?.published?.number)}`);
  const board = page.getByRole('region', { name: 'A page for everybody' });
  await expect(board.getByText('It is off.')).toBeVisible();
  await board
    .getByLabel('How much of the place it tells')
    .selectOption({ label: 'Its name, to a whole degree (about 110 km)' });
  await board.getByRole('button', { name: 'Switch it on' }).click();
  const address = await board.locator('code').innerText();
  await expect(board.getByRole('img', { name: 'The address as a picture' })).toBeVisible();
  await expectAccessible(page);
  await expectNoSidewaysScroll(page);

  await expect(board.getByText('Nobody was asked about these:')).toBeVisible();
  await expect(board.getByRole('link', { name: 'Ask about “Sow short millet”' })).toBeVisible();

  const passing = await browser.newContext({ viewport: { width: 320, height: 740 } });
  const passerBy = await passing.newPage();
  const opened = await passerBy.goto(new URL(address).pathname + new URL(address).search);
  expect(opened?.headers()['x-robots-tag']).toBe('noindex, nofollow');
  await expect(passerBy.getByRole('heading', { level: 1, name: /^The year’s work of/u })).toBeVisible();
  await expect(passerBy.getByText('Never look at the Sun', { exact: false })).toBeVisible();
  await expect(passerBy.getByRole('heading', { level: 3 }).first()).toBeVisible();
  await expect(passerBy.getByText(/about \d+° north/u)).toBeVisible();
  await expect(passerBy.getByText(/Elder A-|Officer A/u)).toHaveCount(0);
  await expectAccessible(passerBy);
  await expectNoSidewaysScroll(passerBy);

  await board.getByRole('button', { name: 'Switch it off' }).click();
  await page.getByRole('button', { name: 'Switch it off now' }).click();
  await expect(board.getByText('It is off.')).toBeVisible();
  await passerBy.reload();
  await expect(passerBy.getByText('There is no such page')).toBeVisible();
  await passing.close();
});
