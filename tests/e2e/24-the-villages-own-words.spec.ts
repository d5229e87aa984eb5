import { expect, test } from '#tests/support/journey.js';
import {
  beginEntry,
  expectAccessible,
  expectNoSidewaysScroll,
  signIn,
} from '#tests/support/journey-steps.js';

/*
 * An officer gives the village its own words, writes an entry with them and with a sign of its own, and marks that as seen.
 * The list says where there is something to look at; a warning is read, its way out used, and it is gone.
 */
// A word that is taken is refused by the server, and the browser notes it.
test.use({ actionTimeout: 15_000, expectedNoise: [/status of 422/] });

const PHONE = { width: 320, height: 640 };
const KIND = 'Work of the water';
const ENTRY = 'Open the upper sluice';

test('an officer names the kinds of the village and a crop with its length', async ({ page }) => {
  test.setTimeout(90_000);
  await page.setViewportSize(PHONE);
  await signIn(page, 'officer2');
  await page.goto('/village/words');
  await page.getByRole('button', { name: 'Add a word' }).click();
  const dialog = page.getByRole('dialog');
  await dialog.getByLabel('Word').fill('Safety');
  await dialog.getByLabel('It behaves like').selectOption('Caution and safety');
  await dialog.getByRole('button', { name: 'Save' }).click();
  await expect(dialog.getByText('This word means something already. Choose another.')).toBeVisible();
  await expectAccessible(page);
  await dialog.getByLabel('Word').fill(KIND);
  await dialog.getByRole('button', { name: 'Save' }).click();
  await expect(page.getByText('the village’s own · behaves like “Caution and safety”')).toBeVisible();
  await page.getByRole('button', { name: `Move “${KIND}” up` }).click();
  await expect(page.getByText(`“${KIND}” is number 7 of 8 now.`)).toBeAttached();
  await page.getByRole('radio', { name: 'Crops' }).click();
  await expect(page.getByRole('heading', { name: 'Crops' })).toBeVisible();
  await page.getByRole('button', { name: 'Add a crop' }).click();
  await dialog.getByLabel('Word').fill('Early tuber');
  await dialog.getByLabel('Days from sowing to harvest, at least').fill('95');
  await dialog.getByLabel('At most').fill('110');
  await dialog.getByRole('button', { name: 'Save' }).click();
  await expect(page.getByText('95 to 110 days')).toBeVisible();
  await expectNoSidewaysScroll(page);
});

test('an entry speaks these words, its warning is mended, and its own sign is marked as seen', async ({
  page,
}) => {
  test.setTimeout(120_000);
  await signIn(page, 'officer2');
  await page.goto('/calendars');
  await page.getByRole('link', { name: 'Open the draft' }).first().click();
  await beginEntry(page);
  await page.getByLabel(/^Name of the work or rite/).fill(ENTRY);
  await page.getByLabel('Kind', { exact: true }).selectOption(KIND);
  await page.getByLabel('Crop or variety').fill('early tuber');
  const what = page.locator('[data-group="what"]');
  await what.getByText('More for the elders and the field').click();
  await what.getByRole('button', { name: 'Take 95 to 110 days from the list of crops' }).click();
  await expect(what.getByLabel('At most')).toHaveValue('110');
  const when = page.locator('[data-group="when"]');
  await when.getByRole('radio', { name: /^A fixed date/ }).check();
  await when.getByLabel('Month').first().selectOption('January');
  await when.getByLabel('Day', { exact: true }).first().selectOption('10');
  await when.getByLabel('Who set it, and where it is written').first().fill('the village');
  const signs = page.locator('[data-group="signs"]');
  await signs.locator('summary').first().click();
  await signs.getByText('More for the elders and the field').click();
  await signs.getByRole('button', { name: 'Add a sign' }).click();
  await signs.getByLabel('As people call it').fill('Foam on the stream');
  await page.getByRole('button', { name: 'Save the entry' }).click();
  await expect(page.getByText(`Saved: ${ENTRY}.`)).toBeVisible();

  const warning = page.getByText('Somebody can be hurt here, and no line of caution is written.');
  const row = page.getByRole('link', { name: new RegExp(`^${ENTRY}`, 'u') });
  await expect(warning).toBeVisible();
  await expect(row).toContainText('1 thing to look at');
  await page.getByRole('button', { name: /^With something to look at/ }).click();
  await expect(row).toBeVisible();
  await expect(page.getByRole('link', { name: /^Harvest main potato/ })).toHaveCount(0);
  await page.getByRole('button', { name: 'Write the caution' }).click();
  await page.getByLabel('Caution', { exact: true }).fill('Two people at the sluice, never alone.');
  await expect(warning).toHaveCount(0);
  await expect(row).not.toContainText('to look at');
  await page.getByRole('button', { name: 'Save the entry' }).click();
  await expect(page.getByText('Nothing is changed.')).toBeVisible();
  await page.getByRole('button', { name: /^With something to look at/ }).click();
  await expect(page.getByRole('link', { name: /^Harvest main potato/ })).toBeVisible();

  await page.getByRole('button', { name: 'I saw a sign of this entry' }).click();
  const dialog = page.getByRole('dialog');
  await dialog.getByLabel('Who saw it').fill('Pesra');
  await dialog.getByRole('button', { name: 'Mark as seen' }).click();
  await expect(page.getByText(/^Foam on the stream: .*Pesra$/u)).toBeVisible();
  await expectAccessible(page);
});
