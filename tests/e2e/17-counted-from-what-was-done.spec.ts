import type { Page } from '@playwright/test';
import { expect, test } from '#tests/support/journey.js';
import {
  beginEntry,
  expectAccessible,
  expectNoSidewaysScroll,
  signIn,
} from '#tests/support/journey-steps.js';

/*
 * Weeding is counted from the day on which sowing is really done. Until that day is typed there is no window, only what it
 * would be as planned; then the window is there. What hangs in a circle, and taking the sowing out, is refused by name.
 */
test.use({
  viewport: { width: 390, height: 844 },
  actionTimeout: 15_000,
  // What others hang on is not taken out: the browser tells of the refusal.
  expectedNoise: [/409 \(Conflict\)/u],
});

const SOWING = 'Sow the lower field';
const WEEDING = 'Weed the lower field';

test('weeding has no days until the day of sowing is typed', async ({ page }) => {
  test.setTimeout(120_000);
  await signIn(page, 'officer2');
  await page.getByRole('link', { name: 'Calendar' }).click();
  await page
    .getByRole('button', { name: 'Begin 2027' })
    .or(page.getByRole('link', { name: 'Open the draft' }))
    .first()
    .click();
  await beginEntry(page);
  const calendarPath = new URL(page.url()).pathname;

  await page.getByLabel(/^Name of the work or rite/).fill(SOWING);
  await page.getByRole('radio', { name: /^A fixed date/ }).check();
  await page.getByLabel('Month').first().selectOption('June');
  await page.getByLabel('Day', { exact: true }).first().selectOption('10');
  await page.getByLabel('Who set it, and where it is written').first().fill('the village');
  await save(page, SOWING);

  await page.goto(calendarPath);
  await beginEntry(page);
  await page.getByLabel(/^Name of the work or rite/).fill(WEEDING);
  await page.getByRole('radio', { name: /^The day other work is done/ }).check();
  await page.getByLabel('Which work').selectOption(SOWING);
  await expect(page.getByText(/^Counted once the day is known. If all goes as planned/)).toBeVisible();
  await expectNoSidewaysScroll(page);
  await expectAccessible(page);
  await save(page, WEEDING);

  await page.goto(calendarPath);
  await page.getByRole('link', { name: SOWING }).first().click();
  await page.getByText('Write down the day').click();
  await page.getByLabel('First day').fill('2027-06-28');
  await page.getByLabel('Who said so').fill('a sister of the lower house');
  await page.getByRole('button', { name: 'Keep this day' }).click();
  await expect(page.getByText(/^The day is written down/)).toBeVisible();
  await expect(page.getByText(/a sister of the lower house said so/)).toBeVisible();
  await expectAccessible(page);

  await page.goto(calendarPath);
  await page.getByRole('link', { name: WEEDING }).first().click();
  await expect(page.getByText(/^Counted from 28.June, when it was done/)).toBeVisible();
  await expectNoSidewaysScroll(page);

  await page.goto(calendarPath);
  await page.getByRole('link', { name: SOWING }).first().click();
  await page.getByRole('button', { name: 'Take it out' }).click();
  await expect(
    page.getByText(`These entries count their days from this one: ${WEEDING}.`, { exact: false }),
  ).toBeVisible();
});

test('a record names what is still to be said, and the submission waits for it', async ({ page }) => {
  test.setTimeout(120_000);
  await signIn(page, 'officer2');
  await page.getByRole('link', { name: 'Calendar' }).click();
  await page.getByRole('link', { name: 'Open the draft' }).first().click();
  await page.getByRole('link', { name: WEEDING }).first().click();
  await page.getByText('Trust', { exact: true }).click();
  await page.getByLabel('How sure it is').selectOption('sure');
  await expect(page.getByText(/^Before elders are asked, \d+ things are to be said/)).toBeVisible();
  await expectNoSidewaysScroll(page);
  await expectAccessible(page);
  await save(page, WEEDING);
  await page.goto(new URL(page.url()).pathname);
  await page.getByRole('button', { name: 'Submit for review' }).click();
  const dialog = page.getByRole('dialog');
  await expect(dialog.getByText(/2 entries do not say everything yet/)).toBeVisible();
  await expect(dialog.getByRole('button', { name: 'Submit it' })).toHaveCount(0);
  await expectAccessible(page);
});

async function save(page: Page, title: string): Promise<void> {
  await page.getByRole('button', { name: 'Save the entry' }).click();
  await expect(page.getByText(`Saved: ${title}.`)).toBeVisible();
}
