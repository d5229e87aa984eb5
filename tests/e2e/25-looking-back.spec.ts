import { execFileSync } from 'node:child_process';
import type { Page } from '@playwright/test';
import type { Calendar } from '#shared/contracts/calendars.js';
import { expect, test } from '#tests/support/journey.js';
import { expectAccessible, expectNoSidewaysScroll, signIn } from '#tests/support/journey-steps.js';
import { putIn, send } from '#tests/support/officer-pair.js';

/*
 * At the end of the season: the officer types when sowing was really done, an elder says what the year taught, the officer
 * decides; next year's draft shows the decision as a task, and it is ticked off. The year prints on one page. A
 * year in whose draft something was written since says at its head how much stands there alone.
 */
test.use({ viewport: { width: 320, height: 700 }, hasTouch: true });
test.describe.configure({ mode: 'serial' });

const SOWING = 'Sow long millet';
const LESSON = 'Upper terraces were dry for ten days longer than the lower ones.';

/** The year also stands there as the sheet for paper, which no screen shows. */
const shown = (page: Page) => page.locator('.season-screen');

async function openYear(page: Page): Promise<void> {
  await page.goto('/calendars');
  await page.getByRole('link', { name: 'Look back at 2027' }).click();
  await expect(page.getByRole('heading', { level: 1, name: 'Looking back at 2027' })).toBeVisible();
  await shown(page).getByText(SOWING).first().click();
  await expect(shown(page).getByText(/^Pleiades: nobody wrote down when it was seen/u)).toBeVisible();
}

test('the officer types when it was done, and an elder says what the year taught', async ({
  page,
  browser,
  baseURL,
}) => {
  await signIn(page, 'officer');
  await openYear(page);
  await page.getByText('Write down the day').click();
  await page.getByLabel('First day').fill('2027-06-21');
  await page.getByLabel('Who said so').fill('Elder A-1');
  await page.getByRole('button', { name: 'Keep this day' }).click();
  await expect(page.getByText(/^The day is written down/u)).toBeVisible();
  await expect(shown(page).getByText(/21.June.*Elder A-1 said so/u)).toBeVisible();
  await expectNoSidewaysScroll(page);
  await expectAccessible(page);

  const elders = await browser.newContext({ baseURL: baseURL ?? '' });
  const elder = await elders.newPage();
  await signIn(elder, 'elder');
  await openYear(elder);
  await expect(elder.getByText('Decide something for 2028')).toHaveCount(0);
  await elder.getByText('Write down a lesson').last().click();
  await elder.getByRole('textbox', { name: 'What did the year teach?' }).fill(LESSON);
  await elder.getByRole('button', { name: 'Keep this lesson' }).click();
  await expect(elder.getByText('The lesson is written down.')).toBeVisible();
  await expect(elder.getByRole('listitem').filter({ hasText: LESSON })).toContainText('Elder A-1');
  await elders.close();
});

test('what the officer decides is a task of the next year’s draft, and is ticked off there', async ({
  page,
}) => {
  await signIn(page, 'officer');
  await openYear(page);
  await expect(shown(page).getByText(LESSON)).toBeVisible();
  await page.getByText('Decide something for 2028').last().click();
  await page.getByRole('combobox', { name: 'What is to be done otherwise?' }).selectOption('Do it later');
  await page.getByRole('textbox', { name: 'In words' }).fill('wait for the second rain');
  await page.getByRole('button', { name: 'Keep this decision' }).click();
  await expect(page.getByText('Decided. It is a task of 2028 now.')).toBeVisible();
  await expect(shown(page).getByText('Do it later: wait for the second rain')).toBeVisible();
  await expectAccessible(page);

  const input = await page.pdf({ preferCSSPageSize: true });
  expect(execFileSync('pdfinfo', ['-'], { input, encoding: 'utf8' })).toMatch(/^Pages:\s+1$/mu);
  const printed = execFileSync('pdftotext', ['-', '-'], { input, encoding: 'utf8' });
  expect(printed).toContain('Store-closing day');

  await page.goto('/calendars');
  await page.getByRole('button', { name: 'Begin 2028 from this one' }).click();
  await page.getByRole('dialog').getByRole('button', { name: 'Begin 2028' }).click();
  await expect(page.getByRole('heading', { level: 1, name: 'From 2027 to 2028' })).toBeVisible();
  await page.getByRole('link', { name: 'Open the draft of 2028' }).click();
  await page.getByText('From looking back at 2027').click();
  await expect(page.getByText(`${SOWING}: Do it later: wait for the second rain`)).toBeVisible();
  await expectNoSidewaysScroll(page);
  await expectAccessible(page);
  await page.getByRole('button', { name: /^Done: Sow long millet/u }).click();
  await expect(page.getByText(/^Done on .* by Beyno\.$/u)).toBeVisible();
  await expect(page.getByText('All is done')).toBeAttached();

  await page.getByRole('link', { name: 'Open the entry' }).click();
  await expect(page.getByRole('heading', { name: 'From looking back at 2027' })).toBeVisible();
  await page.getByRole('button', { name: /^Not done yet: Do it later/u }).click();
  await expect(page.getByText('Decided by Beyno.')).toBeVisible();
});

test('a year says by which calendar it went, and how much of it stands in the draft alone', async ({
  page,
}) => {
  await signIn(page, 'officer');
  const { items } = await send<{ items: Calendar[] }>(page, 'GET', '/api/calendars');
  const before = items.find(({ year }) => year === 2026)?.id ?? '';
  await page.goto(`/calendars/${before}/season-review`);
  await expect(shown(page).getByText(/By the calendar 2026-2$/u)).toBeVisible();
  await putIn(page, before, 'Clear the spring path');
  await page.reload();
  await expect(
    shown(page).getByText(/By the calendar 2026-2, and 1 entry that stands in the draft alone$/u),
  ).toBeVisible();
  await shown(page).getByText('Clear the spring path').first().click();
  await expect(
    shown(page).getByText(/\(in the draft alone, not in the published calendar\)$/u),
  ).toBeVisible();
  await expectNoSidewaysScroll(page);
});
