import { devices, type Page } from '@playwright/test';
import type { Calendar } from '#shared/contracts/calendars.js';
import type { Consent } from '#shared/contracts/consents.js';
import type { SessionState } from '#shared/contracts/session.js';
import type { SheetPreview } from '#shared/contracts/sheets.js';
import type { Version } from '#shared/contracts/versions.js';
import { expect, test } from '#tests/support/journey.js';
import { expectAccessible, expectNoSidewaysScroll, signIn } from '#tests/support/journey-steps.js';

/*
 * An officer asks an elder about an entry of the published calendar, use by use. What is not ticked is not done: the
 * sheet loses the entry, and gets it back with a yes to print. Taken back, nobody finds it any more.
 */
test.use({
  viewport: { width: 390, height: 780 },
  isMobile: true,
  hasTouch: true,
  userAgent: devices['Pixel 7'].userAgent,
  // A yes without its proof is refused by the server, too.
  expectedNoise: [/422/u],
});
test.describe.configure({ mode: 'serial' });

async function json<T>(page: Page, path: string): Promise<T> {
  return (await (await page.request.get(path)).json()) as T;
}

/** The published calendar of the demo and its last entry, as the person who is signed in finds them. */
async function published(page: Page) {
  const { memberships } = await json<SessionState>(page, '/api/session');
  const communityId = memberships?.[0]?.communityId ?? '';
  const { items } = await json<{ items: Calendar[] }>(page, '/api/calendars');
  const calendar = items.find((one) => one.communityId === communityId && one.published !== null);
  const path = `/api/calendars/${calendar?.id ?? ''}/versions/${calendar?.published?.number ?? 0}`;
  const { entries } = await json<Version>(page, path);
  const entry = entries.at(-1);
  return { communityId, path, entryId: entry?.entryId ?? '', title: entry?.content.titleOfficer ?? '' };
}

const isOnSheet = async (page: Page, { path, title }: { path: string; title: string }) =>
  JSON.stringify((await json<SheetPreview>(page, `${path}/sheet?layout=month-cards`)).pages).includes(title);

test('an officer asks use by use, and the sheet goes by the tick for print', async ({ page }) => {
  await signIn(page, 'officer');
  const entry = await published(page);
  await expect.poll(() => isOnSheet(page, entry)).toBe(true);
  await page.goto(`/village/consents/entry/${entry.entryId}`);
  await expect(page.getByText('Nobody has been asked about this yet')).toBeVisible();
  await page
    .getByRole('button', { name: /^(Say what you agree to|Write down what somebody says)$/u })
    .click();
  await page.getByLabel('Somebody of the village here').selectOption('Somebody without an account');
  await page.getByLabel('Name, as they wish to be called').fill('Old Marrun');
  await page.getByRole('radio', { name: 'Yes', exact: true }).press(' ');
  const uses = page.getByRole('group', { name: 'What they said yes to' });
  await expect(uses.getByRole('checkbox')).toHaveCount(13);
  await expect(uses.getByRole('checkbox', { checked: true })).toHaveCount(0);
  await expectNoSidewaysScroll(page);
  await expectAccessible(page);

  await page.getByRole('button', { name: 'Write it down' }).click();
  await expect(page.getByText('Choose at least one.')).toBeVisible();
  await uses.getByRole('checkbox', { name: 'Keep it' }).press(' ');
  await uses.getByRole('checkbox', { name: 'Show it' }).press(' ');
  await page.reload();
  await page
    .getByRole('button', { name: /^(Say what you agree to|Write down what somebody says)$/u })
    .click();
  await expect(uses.getByRole('checkbox', { checked: true })).toHaveCount(2);
  await page.getByRole('button', { name: 'Write it down' }).click();
  await expect(page.getByText('A yes needs its proof')).toBeVisible();
  await page.getByRole('radio', { name: 'a witness' }).press(' ');
  await page.getByLabel('Who was there').fill('Tirel');
  await page.getByRole('button', { name: 'Write it down' }).click();
  await expect(page.getByRole('heading', { name: 'Old Marrun' })).toBeVisible();
  await expectNoSidewaysScroll(page);
  await expectAccessible(page);
  await expect.poll(() => isOnSheet(page, entry)).toBe(false);

  await page.getByRole('button', { name: 'Write down a new answer' }).click();
  await page.getByRole('radio', { name: 'Yes', exact: true }).press(' ');
  await expect(uses.getByText('Last time they said yes to: keep · show')).toBeVisible();
  for (const use of ['Keep it', 'Show it', 'Print it']) {
    await uses.getByRole('checkbox', { name: use }).press(' ');
  }
  await page.getByRole('radio', { name: 'a witness' }).press(' ');
  await page.getByLabel('Who was there').fill('Tirel');
  await page.getByRole('button', { name: 'Write it down' }).click();
  await expect(page.getByText('Written down.')).toBeVisible();
  await expect.poll(() => isOnSheet(page, entry)).toBe(true);
  const card = await page.request.get(
    (await page.getByRole('link', { name: 'Card to print' }).getAttribute('href')) ?? '',
  );
  expect([card.status(), card.headers()['content-type']]).toEqual([200, 'application/pdf']);
});

test('the steward finds it in the register and takes it back for the giver', async ({ page }) => {
  await signIn(page, 'steward');
  const entry = await published(page);
  await page.goto('/village/consents');
  await expectNoSidewaysScroll(page);
  await expectAccessible(page);
  await page.getByRole('link', { name: new RegExp(entry.title, 'u') }).click();
  // The register has buttons of this name too, for what the steward may not read.
  await expect(page).toHaveURL(new RegExp(`/consents/entry/${entry.entryId}`, 'u'));
  await page.getByRole('button', { name: 'Take it back' }).click();
  await page.getByRole('dialog').getByRole('button', { name: 'Take it back now' }).click();
  await expect(page.getByText('Taken back. It is hidden from now on.')).toBeVisible();
  await expect(page.getByText('This thing is hidden')).toBeVisible();
  const { entries } = await json<Version>(page, entry.path);
  expect(entries.map(({ entryId }) => entryId)).not.toContain(entry.entryId);
  await expect.poll(() => isOnSheet(page, entry)).toBe(false);
});

test('a yes that is due again waits on Today, for whoever asks for it', async ({ page }) => {
  await signIn(page, 'officer');
  const { communityId } = await json<SessionState>(page, '/api/session').then(({ memberships }) => ({
    communityId: memberships?.[0]?.communityId ?? '',
  }));
  const { items } = await json<{ items: Consent[] }>(page, `/api/communities/${communityId}/consents`);
  const line = items.find(({ giverName }) => giverName === 'Old Marrun');
  await page.goto(`/village/consents/entry/${line?.itemId ?? ''}`);
  await page.getByRole('button', { name: 'Write down a new answer' }).click();
  await page.getByRole('radio', { name: 'Yes', exact: true }).press(' ');
  for (const use of ['Keep it', 'Show it', 'Print it']) {
    await page.getByRole('checkbox', { name: use }).press(' ');
  }
  await page.getByLabel('Ask again by').fill('2027-04-01');
  await page.getByRole('radio', { name: 'a witness' }).press(' ');
  await page.getByLabel('Who was there').fill('Tirel');
  await page.getByRole('button', { name: 'Write it down' }).click();
  await expect(page.getByText('Ask again', { exact: true })).toBeVisible();
  await page.goto('/');
  await page.getByRole('link', { name: /2 consents are due to be asked again/u }).click();
  await expect(page.getByRole('heading', { name: 'To be asked again (2)' })).toBeVisible();
});
