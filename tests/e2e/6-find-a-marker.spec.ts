import type { Locator, Page } from '@playwright/test';
import { expect, test } from '#tests/support/journey.js';
import { expectAccessible, expectNoSidewaysScroll, signIn } from '#tests/support/journey-steps.js';

/*
 * "We used to start when the Pleiades come back": an officer in the village, with a phone, finds out what has become of
 * that sign, what falls on its old day now, and takes it to a calendar.
 */
test('an officer goes from an old sign to a well-founded one on a phone', async ({ page }) => {
  await page.setViewportSize({ width: 320, height: 640 });
  await signIn(page, 'officer');
  await page.getByRole('link', { name: 'Stars' }).click();
  await page.getByRole('link', { name: 'Which sign falls near a day?' }).click();
  await expect(page.getByRole('heading', { name: 'Which sign falls near this day?' })).toBeVisible();
  await expect(page.getByText(/signs? within twenty days of/)).toBeVisible();
  await expectAccessible(page);

  await page.getByRole('radio', { name: /An old sign/ }).check();
  await expect(page.getByText('Choose the star or figure that people used to go by.')).toBeVisible();
  await choosePleiades(page);
  await page.getByRole('spinbutton', { name: 'Since about the year' }).fill('1100');
  await page.getByRole('spinbutton', { name: 'Since about the year' }).press('Enter');

  const old = page.getByRole('region', { name: 'What has become of the old sign' });
  await expect(old.getByText(/In 1100/)).toBeVisible();
  await expect(old.getByText(/It has moved \d+ days later/)).toBeVisible();
  await expectNoSidewaysScroll(page);
  await expectAccessible(page);

  await page.getByText('More about it').first().click();
  await expect(page.getByText('Keeps its day', { exact: true }).first()).toBeVisible();
  await page
    .getByRole('link', { name: /^Tie work to / })
    .first()
    .click();
  await expect(page.getByRole('heading', { name: 'Which calendar shall go by it?' })).toBeVisible();
});

/**
 * Nothing on the way may keep a person waiting for two seconds, the first look through a place's whole sky included. A
 * machine that runs all checks at once gets three times as long.
 */
const LONGEST_WAIT_MS = 6_000;
/** From Today to a saved entry; typing not counted. */
const MOST_TAPS = 10;

test('high in the hills the way from an old sign to a saved entry is short and never waits', async ({
  page,
}) => {
  const way = await beginAt(page, 'officer2');
  await way.tap(page.getByRole('radio', { name: /An old sign/ }));
  await choosePleiades(page);
  // The field and the name in its list.
  way.taps += 2;
  await way.waitFor(page.getByText(/It has moved \d+ days later/));
  await saveWithFirstSign(page, way, /^Tie work to /, 'Open the cold store');
});

test('beyond the arctic circle the Sun serves where no star does, on a way as short', async ({ page }) => {
  const way = await beginAt(page, 'officer3');
  await page.getByRole('combobox', { name: 'Month' }).selectOption('June');
  await page.getByRole('combobox', { name: 'Day', exact: true }).selectOption('20');
  // Two taps for each of the two lists.
  way.taps += 4;
  const solstice = page.getByRole('link', { name: /^Tie work to this sign: June solstice/ });
  await way.waitFor(solstice);
  await expect(page.getByRole('heading', { name: /No easy star serves here near 20.June/ })).toBeVisible();
  await expect(page.getByText(/Around that time the nights stay light/)).toBeVisible();
  await expectNoSidewaysScroll(page);
  await expectAccessible(page);
  await saveWithFirstSign(page, way, /^Tie work to this sign: June solstice/, 'Cut the hay');
  await expect(page.getByText(/June solstice/).last()).toBeVisible();
});

test('anybody sees how a star moved through the centuries, as a picture, a table and a file', async ({
  page,
}) => {
  await signIn(page, 'observer');
  await page.goto('/stars/pleiades?year=2027');
  await page.getByRole('link', { name: 'How it moved through the centuries' }).click();
  await expect(page.getByRole('heading', { name: 'How Pleiades moved' })).toBeVisible();
  await expect(
    page.getByRole('img', { name: /It moves later by about 1\.\d days in a century/ }),
  ).toBeVisible();
  await page.getByRole('radio', { name: '3001 BC to 3000' }).click();
  await expect(page.getByRole('img', { name: /from 3001 BC to 3000/ })).toBeVisible();
  await page.getByText('Show as a table').click();
  await expect(page.getByRole('row', { name: /2027, the year on screen/ })).toBeVisible();
  await expectAccessible(page);

  const downloading = page.waitForEvent('download');
  await page.getByRole('link', { name: /as a CSV file/ }).click();
  expect((await downloading).suggestedFilename()).toMatch(/^Pleiades from .* -3000 to 3000\.csv$/);
});

/** The list closes while the page scrolls under it, as it may when the field is reached: then the name is typed again. */
async function choosePleiades(page: Page): Promise<void> {
  const field = page.getByRole('combobox', { name: 'We used to go by' });
  await expect(async () => {
    await field.fill('Pleia');
    await page.getByRole('option', { name: 'Pleiades' }).click({ timeout: 2_000 });
    await expect(field).toHaveValue('Pleiades', { timeout: 1_000 });
  }).toPass({ timeout: 30_000 });
}

interface Way {
  taps: number;
  /** Taps, then waits for what the tap brings. */
  tap: (target: Locator, brings?: Locator) => Promise<void>;
  waitFor: (brings: Locator) => Promise<void>;
}

/** An officer at a place whose sky nobody has looked through yet, on a phone, with the finder open. */
async function beginAt(page: Page, mailbox: string): Promise<Way> {
  await page.setViewportSize({ width: 360, height: 740 });
  await signIn(page, mailbox);
  const way: Way = {
    taps: 0,
    tap: async (target, brings) => {
      await target.click();
      way.taps += 1;
      if (brings !== undefined) await way.waitFor(brings);
    },
    waitFor: async (brings) => {
      const before = Date.now();
      await brings.first().waitFor();
      expect(Date.now() - before, 'milliseconds waited').toBeLessThan(LONGEST_WAIT_MS);
    },
  };
  const finder = page.getByRole('link', { name: 'Which sign falls near a day?' });
  await way.tap(page.getByRole('link', { name: 'Stars' }), finder);
  await way.tap(finder, page.getByText(/signs? within twenty days of/));
  return way;
}

async function saveWithFirstSign(page: Page, way: Way, sign: RegExp, title: string): Promise<void> {
  await way.tap(
    page.getByRole('link', { name: sign }).first(),
    page.getByRole('heading', { name: 'Which calendar shall go by it?' }),
  );
  const name = page.getByLabel(/^Name of the work or rite/);
  // Into the calendar whose draft is open; where it is in review, into the next one.
  const into = page
    .getByRole('link', { name: /^Put it into the calendar of 2027/ })
    .or(page.getByRole('button', { name: 'Begin 2028' }));
  await way.tap(into.first(), name);
  await way.tap(name);
  await name.fill(title);
  await way.tap(page.getByRole('button', { name: 'Save the entry' }), page.getByText(`Saved: ${title}.`));
  expect(way.taps).toBeLessThanOrEqual(MOST_TAPS);
}
