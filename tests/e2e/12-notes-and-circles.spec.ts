import { devices, type Page } from '@playwright/test';
import type { Calendar } from '#shared/contracts/calendars.js';
import type { SessionState } from '#shared/contracts/session.js';
import type { Version } from '#shared/contracts/versions.js';
import { expect, test } from '#tests/support/journey.js';
import { expectAccessible, expectNoSidewaysScroll, signIn } from '#tests/support/journey-steps.js';

/*
 * An elder remarks on a word of the published calendar, in writing and by voice; the officer answers, the elder closes
 * it. Then the elder makes the entry narrower: nobody else finds it, until giver and steward have widened it again.
 */
test.use({
  viewport: { width: 360, height: 760 },
  isMobile: true,
  hasTouch: true,
  userAgent: devices['Pixel 7'].userAgent,
  // Words that do not stand in the text are refused by the server, too.
  expectedNoise: [/422/u],
});
test.describe.configure({ mode: 'serial' });

const NOTE = 'My mother counted from the second evening.';
const ANSWER = 'Then I ask the others about it.';

async function json<T>(page: Page, path: string): Promise<T> {
  return (await (await page.request.get(path)).json()) as T;
}

/** The published calendar of the demo and its second entry, as the person who is signed in finds them. */
async function published(page: Page) {
  const { memberships } = await json<SessionState>(page, '/api/session');
  const communityId = memberships?.[0]?.communityId ?? '';
  const { items } = await json<{ items: Calendar[] }>(page, '/api/calendars');
  const calendar = items.find((one) => one.communityId === communityId && one.published !== null);
  const path = `/calendars/${calendar?.id ?? ''}/versions/${calendar?.published?.number ?? 0}`;
  const { entries } = await json<Version>(page, `/api${path}`);
  return { path, titles: entries.map(({ content }) => content.titleOfficer), content: entries[1]?.content };
}

/** Opens what stands beside the entry of that title. */
async function openBeside(page: Page, path: string, title: string) {
  await page.goto(path);
  const entry = page.getByRole('listitem').filter({ has: page.getByRole('heading', { name: title }) });
  await entry.getByRole('button', { name: 'Notes, voices, and who may see it' }).click();
  return page.getByRole('dialog', { name: title });
}

let title = '';

test('an elder pins a note to a word; half written it survives a reload', async ({ page }) => {
  await signIn(page, 'elder');
  const { path, content } = await published(page);
  title = content?.titleOfficer ?? '';
  const word = content?.titleOfficer.split(' ')[0] ?? '';
  const beside = await openBeside(page, path, title);
  await beside.getByRole('button', { name: 'Pin a note' }).click();
  await beside.getByLabel('Where to pin it').selectOption('Words of a text');
  await beside.getByLabel('The words it is about').fill('words that nobody wrote');
  await beside.getByLabel('Your note').fill(NOTE);
  await expect(beside.getByText('What you write stays on this device')).toBeVisible();
  await expectNoSidewaysScroll(page);
  await expectAccessible(page);
  await page.reload();

  const again = await openBeside(page, path, title);
  await expect(again.getByLabel('Your note')).toHaveValue(NOTE);
  await again.getByRole('button', { name: 'Pin the note' }).click();
  await expect(again.getByText('These words do not stand in the text.')).toBeVisible();
  await again.getByLabel('The words it is about').fill(word);
  await again.getByRole('button', { name: 'Pin the note' }).click();
  await expect(page.getByText('Your note is pinned.')).toBeVisible();
  await expect(again.getByText(NOTE)).toBeVisible();
});

test('the same elder says something to it', async ({ page }) => {
  await signIn(page, 'elder');
  const { path } = await published(page);
  const beside = await openBeside(page, path, title);
  // The village's languages come late: until then there is nothing to press, rather than a button that does nothing.
  await page.route('**/api/communities/*', async (route) => {
    await new Promise((resolve) => setTimeout(resolve, 700));
    await route.continue();
  });
  await beside.getByRole('button', { name: 'Say something to it' }).click();
  await expect(beside.getByText('Whoever reads the note may hear it.')).toBeVisible();
  await beside.getByRole('button', { name: 'On to the spoken agreement' }).click();
  for (const [record, next] of [
    ['Record the agreement', 'Yes, on to the recording'],
    ['Record', null],
  ] as const) {
    await beside.getByRole('button', { name: record, exact: true }).click();
    await expect(beside.getByRole('timer')).not.toHaveText('0:00');
    await beside.getByRole('button', { name: 'Stop' }).click();
    if (next !== null) await beside.getByRole('button', { name: next }).click();
  }
  await beside.getByRole('button', { name: 'Keep it' }).click();
  await expect(page.getByText('Kept with the village.')).toBeVisible();
  await expect(beside.getByRole('button', { name: 'Listen' }).first()).toBeVisible();
  await expectNoSidewaysScroll(page);
  await expectAccessible(page);
});

test('the officer reads, hears and answers; the elder closes the note', async ({ page, browser }) => {
  await signIn(page, 'officer');
  const { path } = await published(page);
  const beside = await openBeside(page, path, title);
  const note = beside
    .getByRole('list', { name: 'Open notes' })
    .getByRole('listitem')
    .filter({ hasText: NOTE });
  await expect(note.getByRole('button', { name: 'Listen' }).first()).toBeVisible();
  await expect(note.getByRole('button', { name: 'Close my note' })).toHaveCount(0);
  await note.getByRole('button', { name: 'Answer' }).click();
  await note.getByLabel('Your answer to the note').fill(ANSWER);
  await note.getByRole('button', { name: 'Send the answer' }).click();
  await expect(note.getByText(ANSWER)).toBeVisible();

  const elder = await browser.newPage();
  await signIn(elder, 'elder');
  const own = await openBeside(elder, path, title);
  await expect(own.getByText(ANSWER)).toBeVisible();
  await own.getByRole('button', { name: 'Close my note' }).click();
  await expect(own.getByText('1 closed note')).toBeVisible();
  await elder.close();
});

test('an elder makes the entry narrower: the observer finds it no more, until two have widened it', async ({
  page,
  browser,
}) => {
  const watcher = await browser.newPage();
  await signIn(watcher, 'observer');
  const titles = async () => (await published(watcher)).titles;
  expect(await titles()).toContain(title);

  await signIn(page, 'elder');
  const { path, content } = await published(page);
  const level = content?.sharingLevel === 'village' ? /^Village/u : /^Open/u;
  const change = async (to: RegExp, step: string) => {
    const beside = await openBeside(page, path, title);
    await beside.getByRole('button', { name: 'Change who may see this' }).click();
    const dialog = page.getByRole('dialog', { name: 'Change who may see this' });
    await dialog.getByRole('radio', { name: to }).check();
    await expectAccessible(page);
    await dialog.getByRole('button', { name: step }).click();
  };
  await change(/^Elders/u, 'Make it narrower now');
  await expect(page.getByText('It is narrower now.')).toBeVisible();
  expect(await titles()).not.toContain(title);
  await watcher.goto(path);
  await expect(watcher.getByRole('heading', { level: 1 })).toBeVisible();
  await expect(watcher.getByText(title, { exact: true })).toHaveCount(0);

  await change(level, 'Ask for this circle');
  await expect(page.getByText('You asked for a wider circle.')).toBeVisible();
  expect(await titles()).not.toContain(title);
  // The officer wrote it down, so theirs is the giver's word; the steward's is the other.
  for (const who of ['officer', 'steward']) {
    const agreeing = await browser.newPage();
    await signIn(agreeing, who);
    await agreeing.goto('/');
    await agreeing.getByRole('button', { name: 'Agree to it' }).click();
    await expect(agreeing.getByText(/You agreed\.|have agreed\./u)).toBeVisible();
    await agreeing.close();
  }
  await expect.poll(titles).toContain(title);
  await watcher.close();
});
