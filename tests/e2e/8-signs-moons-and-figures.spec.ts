import { readFileSync } from 'node:fs';
import type { Page } from '@playwright/test';
import { expect, test } from '#tests/support/journey.js';
import {
  beginEntry,
  expectAccessible,
  expectNoSidewaysScroll,
  signIn,
} from '#tests/support/journey-steps.js';

/*
 * An officer high in the hills leads entries by the Sun, by a star at its height and by a figure of the village, reads
 * the Moons as the village counts them, and takes what a watch needs along. On a phone, from the first to the last step.
 */
test.use({ viewport: { width: 390, height: 844 }, actionTimeout: 15_000 });

const OFFICER = 'officer2';
const FIGURE = 'Pesûn';
const BY_THE_SUN = 'Count the seed lots';
const BY_A_STAR = 'Clean the channels';
const BY_THE_FIGURE = 'Open the cold store';

test('entries go by the Sun and by a star at its height, as far as the sheet', async ({ page }) => {
  test.setTimeout(120_000);
  await signIn(page, OFFICER);
  await page.getByRole('link', { name: 'Calendar' }).click();
  // Begun already where an earlier journey came by.
  const begin = page.getByRole('button', { name: 'Begin 2027' });
  await begin
    .or(page.getByRole('link', { name: 'Open the draft' }))
    .first()
    .click();
  await beginEntry(page);
  const calendarPath = new URL(page.url()).pathname;

  await page.getByLabel(/^Name of the work or rite/).fill(BY_THE_SUN);
  await page.getByRole('button', { name: 'Choose a star or figure' }).click();
  const dialog = page.getByRole('dialog');
  await dialog.getByRole('radio', { name: 'Sun and sky' }).check();
  await dialog.getByLabel('Find a sign by a word in it').fill('solstice');
  await expectAccessible(page);
  await dialog.getByRole('button', { name: /^June solstice/ }).click();
  await expect(page.getByText(/Never look at the Sun/)).toBeVisible();
  await expect(page.getByText(/About 21.June, between 16 and 26.June/).last()).toBeVisible();
  await save(page, BY_THE_SUN);

  await beginEntry(page);
  await page.getByLabel(/^Name of the work or rite/).fill(BY_A_STAR);
  await page.getByRole('button', { name: 'Choose a star or figure' }).click();
  await dialog.getByRole('radio', { name: 'Sun and sky' }).check();
  await dialog.getByLabel('Find a sign by a word in it').fill('Spica');
  await dialog.getByRole('button', { name: /^Spica highest at dusk/ }).click();
  await save(page, BY_A_STAR);
  await expectNoSidewaysScroll(page);
  await expectAccessible(page);

  await page.goto(`${calendarPath}/sheet?number=draft`);
  const pages = page.getByRole('list', { name: 'All pages' });
  await pages.getByRole('button', { name: 'June', exact: true }).click({ timeout: 30_000 });
  await page.getByText('The words of this page').click();
  // What leads here is no star, and the key says so.
  await expect(page.getByText('sign’s days', { exact: true }).last()).toBeVisible();
  await expect(page.getByText(/June solstice/).last()).toBeVisible();
  await expectAccessible(page);
});

test('Moons are told by their number in the year, counted from a star, and as a file', async ({ page }) => {
  await signIn(page, OFFICER);
  await page.goto('/stars/moons?year=2027');
  await page.getByText('How the months are counted').click();
  const from = page.getByLabel('Counted from');
  await from.selectOption({ label: 'Do not count months' });
  await expect(page.getByText(/The local year \d+ has/)).toHaveCount(0);

  await from.selectOption({ label: 'Pleiades' });
  await page.getByRole('radio', { name: 'New Moon' }).check();
  await expect(page.getByText(/The local year \d+ has a thirteenth month/)).toBeVisible();
  await page.getByText('Show as a table').first().click();
  await expect(page.getByRole('table', { name: /^Moons of 2027/ })).toContainText('holds the sign');
  await expectNoSidewaysScroll(page);
  await expectAccessible(page);

  const downloading = page.waitForEvent('download');
  await page.getByRole('link', { name: 'These Moons as a CSV file' }).click();
  const lines = readFileSync(await (await downloading).path(), 'utf8')
    .trim()
    .split('\n');
  // A head, and twelve or thirteen new Moons a year.
  expect(lines.length).toBeGreaterThanOrEqual(13);
});

test('a figure is put together by keyboard, stands among the stars and leads an entry', async ({ page }) => {
  test.setTimeout(120_000);
  await signIn(page, OFFICER);
  await page.goto('/figures/new');
  await page.getByLabel('Name in Vardescan').fill(FIGURE);
  await page.getByLabel('Name in English').fill('The three pegs');
  await putInByKeyboard(page);
  await page.getByRole('button', { name: 'Move south' }).focus();
  await page.keyboard.press('Enter');
  await page.keyboard.press('Enter');
  await putInByKeyboard(page);
  await expectNoSidewaysScroll(page);
  await expectAccessible(page);
  await page.getByRole('button', { name: 'Save the figure' }).press('Enter');
  await expect(page.getByText(`${FIGURE} is saved.`)).toBeVisible();
  await expect(page.getByRole('heading', { level: 1 })).toHaveText(FIGURE);

  await page.goto('/stars?year=2027');
  await expect(page.getByText(FIGURE).first()).toBeVisible();

  await page.getByRole('link', { name: 'Calendar' }).click();
  await page.getByRole('link', { name: 'Open the draft' }).click();
  await beginEntry(page);
  await page.getByLabel(/^Name of the work or rite/).fill(BY_THE_FIGURE);
  await page.getByRole('button', { name: 'Choose a star or figure' }).click();
  const dialog = page.getByRole('dialog');
  await dialog.getByLabel('Find it by name, letter or HR number').fill(FIGURE);
  await dialog.getByRole('button', { name: new RegExp(FIGURE) }).click();
  await save(page, BY_THE_FIGURE);
});

test('a star’s air goes from year to year, and a watch goes along on paper', async ({ page }) => {
  await signIn(page, OFFICER);
  await page.goto('/stars/hr2491/air?year=2027');
  await expect(page.getByRole('heading', { name: 'What the model rests on' })).toBeVisible();
  await page.getByRole('button', { name: 'One more' }).click();
  await expect(page.getByText('Painted reservoir, 2028')).toBeVisible();
  await expect(page).toHaveURL(/year=2028/u);
  await expectNoSidewaysScroll(page);
  await expectAccessible(page);

  await page.goto('/look?marker=pleiades');
  const card = page.getByRole('link', { name: 'Print a card to take along' });
  await expect(card).toBeVisible();
  const downloading = page.waitForEvent('download');
  await card.click();
  expect(
    readFileSync(await (await downloading).path())
      .subarray(0, 5)
      .toString(),
  ).toBe('%PDF-');
});

async function save(page: Page, title: string): Promise<void> {
  await page.getByRole('button', { name: 'Save the entry' }).click();
  await expect(page.getByText(`Saved: ${title}.`)).toBeVisible();
  await page.getByRole('link', { name: /Back|All entries/ }).click();
  await expect(page.getByRole('button', { name: 'Add an entry' })).toBeVisible();
}

/** Puts the star in the middle of the picture in, with the keys below it alone. */
async function putInByKeyboard(page: Page): Promise<void> {
  const key = page.getByRole('button', { name: /^Put .* in$/ });
  const name = /^Put (.*) in$/u.exec((await key.textContent()) ?? '')?.[1] ?? '';
  await key.focus();
  await page.keyboard.press('Enter');
  await expect(page.getByText(`${name} is in.`)).toBeAttached();
}
