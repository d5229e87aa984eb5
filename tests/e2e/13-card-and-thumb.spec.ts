import type { Answer } from '#shared/contracts/reviews.js';
import type { Version } from '#shared/contracts/versions.js';
import type { Page } from '@playwright/test';
import { expect, test } from '#tests/support/journey.js';
import { expectAccessible, expectNoSidewaysScroll, signIn } from '#tests/support/journey-steps.js';
import { openReview, reviewPath } from '#tests/support/open-review.js';

/*
 * An elder without a password at hand: the steward makes a card, the elder chooses a PIN on somebody's phone and goes
 * through the open entries of a submission with four buttons; another elder's word is written down by
 * the officer and proved with the elder's own PIN.
 */
test.describe.configure({ mode: 'serial' });
// A wrong PIN is refused on purpose.
test.use({ expectedNoise: [/401|422/u] });

const PIN = '4711';

async function makeCard(page: Page, elder: string): Promise<string> {
  await page.goto('/village/cards');
  await page.getByRole('button', { name: new RegExp(`Make a (new )?card for ${elder}`, 'u') }).click();
  const dialog = page.getByRole('dialog', { name: `Card for ${elder}` });
  await expectAccessible(page);
  const code = await dialog.locator('[translate=no]').innerText();
  const download = page.waitForEvent('download');
  await dialog.getByRole('button', { name: 'Make the PDF' }).click();
  expect((await download).suggestedFilename()).toMatch(/\.pdf$/u);
  await dialog.getByRole('button', { name: 'Done' }).click();
  return code;
}

async function typePin(page: Page, pin: string, then: string): Promise<void> {
  for (const digit of pin) await page.getByRole('button', { name: digit, exact: true }).click();
  await page.getByRole('button', { name: then }).click();
}

test.beforeAll(async ({ browser }) => {
  const page = await browser.newPage();
  await signIn(page, 'officer');
  await openReview(page, 1);
  await page.close();
});

async function startWith(page: Page, code: string): Promise<void> {
  await page.goto(`/card#card=${code}`);
  await expect(page.getByRole('heading', { name: 'Choose a PIN' })).toBeVisible();
  // What opens the card does not stay in the address of a lent phone.
  await expect(page).toHaveURL(/\/card$/u);
  await typePin(page, PIN, 'Go on');
  await expect(page.getByRole('heading', { name: 'The same PIN once more' })).toBeVisible();
  await typePin(page, PIN, 'Open');
  await expect(page.getByRole('region', { name: 'Signed in by card' })).toBeVisible();
}

test('a card and a PIN open the review on a small phone; four buttons finish it; then nothing is left', async ({
  page,
  browser,
}) => {
  test.setTimeout(180_000);
  await signIn(page, 'steward');
  const code = await makeCard(page, 'Elder A-2');

  const context = await browser.newContext({ viewport: { width: 320, height: 640 }, hasTouch: true });
  const phone = await context.newPage();
  await startWith(phone, code);
  const path = await reviewPath(phone);
  const { entries } = (await (await phone.request.get(`/api${path}`)).json()) as Version;
  const agree = phone.getByRole('group', { name: 'Your answer' }).getByRole('button', { name: 'Agree' });
  for (const { entryId } of entries) {
    await phone.goto(`${path}/review?entry=${entryId}`);
    await expect(agree).toBeInViewport();
    await expectNoSidewaysScroll(phone);
    await agree.click();
    await expect(phone.getByText('Agree: kept.').last()).toBeVisible();
  }
  const given = (await (await phone.request.get(`/api${path}/answers`)).json()) as { items: Answer[] };
  const own = given.items.filter(({ elderName, answer }) => elderName === 'Elder A-2' && answer === 'agree');
  expect(own).toHaveLength(entries.length);
  await expectAccessible(phone);

  await phone.getByRole('region', { name: 'Signed in by card' }).getByRole('button').click();
  await expect(phone).toHaveURL(/sign-in/u);
  await phone.goto('/card');
  await phone.getByLabel('Letters on the card').fill(code.toLowerCase().replaceAll('-', ' '));
  await phone.getByRole('button', { name: 'On to the PIN' }).click();
  await expect(phone.getByRole('heading', { name: 'Your PIN' })).toBeVisible();
  await typePin(phone, '9025', 'Open');
  await expect(phone.getByText('This is not the PIN of this card.', { exact: false })).toBeVisible();
  await expectAccessible(phone);
  // A keyboard types it, too.
  await phone.getByLabel('PIN', { exact: true }).first().fill(PIN);
  await phone.keyboard.press('Enter');
  await expect(phone.getByRole('region', { name: 'Signed in by card' })).toBeVisible();
  await context.close();
});

test('the officer writes down what an elder says; the elder’s PIN proves it, a wrong one does not', async ({
  page,
  browser,
}) => {
  await signIn(page, 'steward');
  const code = await makeCard(page, 'Elder A-3');
  const context = await browser.newContext();
  await startWith(await context.newPage(), code);
  await context.close();

  const office = await browser.newPage();
  await signIn(office, 'officer');
  const path = await reviewPath(office);
  const { entries } = (await (await office.request.get(`/api${path}`)).json()) as Version;
  const { items } = (await (await office.request.get(`/api${path}/answers`)).json()) as { items: Answer[] };
  const open = entries.find(
    ({ entryId }) => !items.some((each) => each.entryId === entryId && each.elderName === 'Elder A-3'),
  );
  await office.goto(`${path}/review?entry=${open?.entryId ?? ''}`);
  await office.getByLabel('Which elder').selectOption({ label: 'Elder A-3' });
  await office.getByLabel('Or the elder’s PIN').fill('9025');
  await office.getByRole('button', { name: 'Agree' }).click();
  await expect(office.getByText('This is not their PIN.')).toBeVisible();
  await office.getByLabel('Or the elder’s PIN').fill(PIN);
  await office.getByRole('button', { name: 'Agree' }).click();
  await expect(office.getByText('Agree: kept.')).toBeVisible();
  await expect(office.getByLabel('Or the elder’s PIN')).toHaveValue('');
  await office.close();
});
