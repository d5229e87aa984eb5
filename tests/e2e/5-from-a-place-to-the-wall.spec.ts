import { execFileSync } from 'node:child_process';
import type { Browser, Page } from '@playwright/test';
import { expect, test } from '#tests/support/journey.js';
import {
  beginEntry,
  expectAccessible,
  expectNoSidewaysScroll,
  signIn,
} from '#tests/support/journey-steps.js';
import { sayEverything } from '#tests/support/officer-pair.js';

/*
 * An officer with a new place: coordinates as degrees and minutes, a skyline from a pasted table, a calendar for 2027
 * with five entries, the submission that freezes them, and then everybody else's part until it hangs on the wall.
 */
test.describe.configure({ mode: 'serial' });

const WORK = [
  { title: 'Clean the channels', star: 'Pleiades' },
  { title: 'Sow the lower field', star: 'Aldebaran' },
  { title: 'Weed the lower field', star: 'Sirius' },
  { title: 'Guard against birds', star: 'Regulus' },
  { title: 'Bring the harvest in', star: 'Spica' },
];

let calendarPath = '';

test('an officer goes from an empty place to a submission of five entries', async ({ page }) => {
  test.setTimeout(180_000);
  await signIn(page, 'officer');
  await makePlace(page);
  await expectAccessible(page);

  await page.getByRole('link', { name: 'Calendar' }).click();
  await page.getByRole('combobox', { name: /^Place/ }).selectOption({ label: 'Lower field' });
  await page.getByRole('button', { name: 'Begin 2027' }).click();
  await expect(page.getByText('No entries yet')).toBeVisible();

  await page.getByRole('button', { name: 'Add the first entry' }).click();
  await refusedWithoutATitle(page);
  for (const [index, { title, star }] of WORK.entries()) {
    if (index > 0) await beginEntry(page);
    await addEntry(page, title, star);
  }
  await expectAccessible(page);

  calendarPath = new URL(page.url()).pathname;
  await page.getByRole('button', { name: 'Submit for review' }).click();
  const dialog = page.getByRole('dialog');
  await expect(dialog.getByText(/^5 entries do not say everything yet/u)).toBeVisible();
  await expect(dialog.getByText(/what to do if it is late/u).first()).toBeVisible();
  await expect(dialog.getByRole('button', { name: 'Submit it' })).toHaveCount(0);
  await sayEverything(page, calendarPath.replace(/^.*\//u, ''));
  await page.goto(calendarPath);
  await page.getByRole('button', { name: 'Submit for review' }).click();
  await expect(page.getByText('5 entries as they are saved now, with their days')).toBeVisible();
  await page
    .getByRole('dialog')
    .getByRole('button', { name: /Submit/ })
    .click();
  await expect(page.getByRole('heading', { name: 'Submission 1' })).toBeVisible();
  await expect(page.getByText('In review').first()).toBeVisible();
});

test('elders and the steward sign it, the officer publishes it, staff print it', async ({
  page,
  browser,
}) => {
  test.setTimeout(180_000);
  await agreesAndSigns(browser, 'elder', calendarPath);
  await agreesAndSigns(browser, 'elder2', calendarPath);

  await signIn(page, 'steward');
  await page.goto(`${calendarPath}/versions/1`);
  await page.getByRole('button', { name: 'Sign as the steward' }).click();
  await expect(page.getByText('with that the calendar is signed off')).toBeVisible();

  const office = await browser.newPage();
  await signIn(office, 'officer');
  await office.goto(`${calendarPath}/versions/1`);
  await office.getByRole('button', { name: 'Publish it' }).click();
  await office.getByRole('dialog').getByRole('button', { name: 'Publish it' }).click();
  await expect(office.getByRole('heading', { level: 1 })).toContainText('2027-1');
  await office.close();

  const print = await browser.newPage();
  await signIn(print, 'staff');
  await print.goto(`${calendarPath}/sheet`);
  const made = print.waitForEvent('download', { timeout: 60_000 });
  await print.getByRole('link', { name: 'Make the PDF' }).click();
  const file = await (await made).path();
  const words = execFileSync('pdftotext', ['-layout', file, '-'], { encoding: 'utf8' });
  expect(words).toContain('2027-1');
  for (const { title } of WORK) expect(words).toContain(title);
  await print.close();
});

test('what an officer typed survives a reload', async ({ page }) => {
  await signIn(page, 'officer');
  await page.goto('/places/new');
  await page.getByLabel('Name of the place').fill('The far spring');
  await page.getByLabel('Latitude').fill('12° 75′ N');
  await page.getByLabel('Longitude').click();
  await expect(page.getByText('Minutes go up to 59. What you typed is still here; change 75.')).toBeVisible();
  await expect(page.getByText(/kept on this device/).or(page.getByText('Name of the place'))).toBeVisible();
  // The text is kept after a short pause in typing.
  await expect
    .poll(() => page.evaluate(() => JSON.stringify(Object.values(localStorage))), { timeout: 5_000 })
    .toContain('The far spring');
  await page.reload();
  await expect(page.getByLabel('Name of the place')).toHaveValue('The far spring');
  await expect(page.getByLabel('Latitude')).toHaveValue('12° 75′ N');
});

test('the stars and the editor fit a phone of 320 pixels', async ({ page }) => {
  await page.setViewportSize({ width: 320, height: 640 });
  await signIn(page, 'officer');
  await page.goto('/stars?year=2027');
  await expect(page.getByText(/Good markers here/)).toBeVisible();
  await expectNoSidewaysScroll(page);
  await expectAccessible(page);
  await page.getByRole('link', { name: 'Calendar' }).click();
  await page
    .getByRole('link', { name: /Read the draft|Open the draft/ })
    .first()
    .click();
  await expect(page.getByRole('heading', { name: 'Calendar 2027' })).toBeVisible();
  await expectNoSidewaysScroll(page);
});

/** An elder goes through all entries on a phone, agrees to each and signs. */
async function agreesAndSigns(browser: Browser, mailbox: string, calendar: string): Promise<void> {
  const page = await browser.newPage({ viewport: { width: 360, height: 740 } });
  await signIn(page, mailbox);
  await page.goto(`${calendar}/versions/1/review`);
  const answers = page.getByRole('group', { name: 'Your answer' });
  for (const { title } of WORK) {
    await expect(page.getByRole('heading', { level: 1 })).toContainText(title);
    // Nothing may lie over the answers, however quickly somebody goes on.
    await answers.getByRole('button', { name: 'Agree' }).click({ timeout: 2_000 });
  }
  await page.getByRole('button', { name: 'Sign it' }).click();
  await expect(page.getByText('You have signed. Thank you.')).toBeVisible();
  await page.close();
}

async function makePlace(page: Page): Promise<void> {
  await page.goto('/places/new');
  await page.getByLabel('Name of the place').fill('Lower field');
  await page.getByLabel('Latitude').fill('11° 48′ N');
  await page.getByLabel('Longitude').fill('39° 06′ E');
  await page.getByLabel('Height, metres').fill('1720');
  await expect(page.getByText('Africa/Addis')).toBeVisible();
  await page.getByText('Paste or load a table instead').click();
  const table = page.getByLabel('Skyline table');
  await table.fill('0, 1\n90, high\n180, 2\n360, 1');
  await expect(page.getByText(/“high”/)).toBeVisible();
  await table.fill('0, 1\n90, 4\n180, 2\n270, 1.5\n360, 1');
  await page.getByRole('button', { name: 'Use this table' }).click();
  await page.getByRole('button', { name: 'Save the place' }).click();
  await expect(page.getByText('Lower field is there.')).toBeVisible();
}

async function refusedWithoutATitle(page: Page): Promise<void> {
  await page.getByRole('button', { name: 'Save the entry' }).click();
  await expect(page.getByText('Fill this in.').first()).toBeVisible();
}

async function addEntry(page: Page, title: string, star: string): Promise<void> {
  await page.getByLabel(/^Name of the work or rite/).fill(title);
  await page.getByRole('button', { name: 'Choose a star or figure' }).click();
  const dialog = page.getByRole('dialog');
  await dialog.getByLabel('Find it by name, letter or HR number').fill(star);
  await dialog
    .getByRole('button', { name: new RegExp(star) })
    .first()
    .click();
  await page.getByRole('radio', { name: /First morning seen/ }).check();
  await page.getByRole('button', { name: 'Save the entry' }).click();
  await expect(page.getByText(`Saved: ${title}.`)).toBeVisible();
}
