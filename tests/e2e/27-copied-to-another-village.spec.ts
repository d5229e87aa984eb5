import type { Calendar } from '#shared/contracts/calendars.js';
import type { Place } from '#shared/contracts/places.js';
import { expect, test } from '#tests/support/journey.js';
import { expectAccessible, expectNoSidewaysScroll, signIn } from '#tests/support/journey-steps.js';
import { send } from '#tests/support/officer-pair.js';

/*
 * Somebody compiles for two villages: what one does by which sign goes to the other on a phone, looked at first, once also
 * where the network goes in the middle, without names, and to be asked for there.
 */
test.use({ viewport: { width: 320, height: 740 }, hasTouch: true, expectedNoise: [/ERR_FAILED/u] });

test('an officer of two villages copies a calendar, and nothing of it is agreed to there', async ({
  page,
  browser,
}) => {
  const stewards = await browser.newContext();
  const steward = await stewards.newPage();
  await signIn(steward, 'steward2');
  const communityId = await firstVillage(steward);
  await send(steward, 'POST', `/api/communities/${communityId}/people`, {
    ...{ email: 'officer@dawnpeg.example', displayName: 'Beyno', roles: ['officer'] },
  });
  await stewards.close();

  await signIn(page, 'officer');
  const places = await send<{ items: Place[] }>(page, 'GET', `/api/communities/${communityId}/places`);
  const into = await send<Calendar>(page, 'POST', `/api/communities/${communityId}/calendars`, {
    ...{ placeId: places.items[0]?.id, year: 2031 },
  });
  const { items } = await send<{ items: Calendar[] }>(page, 'GET', '/api/calendars');
  const from = items.find(({ communityId: own, published }) => own !== communityId && published !== null);

  await page.goto(`/calendars/${from?.id ?? ''}`);
  await page.getByRole('link', { name: 'Take along, bring in' }).click();
  const copy = page.getByRole('region', { name: 'Copy to another village' });
  await copy.getByLabel('Into which calendar').selectOption(into.id);
  await copy.getByRole('button', { name: 'Look at what would come' }).click();
  await expect(copy.getByRole('rowheader', { name: 'Sow long millet' })).toBeVisible();
  await expect(copy.getByText('Without its last date', { exact: false }).first()).toBeVisible();
  await expect(copy.getByText(/Elder A-/u)).toHaveCount(0);
  await expectAccessible(page);
  await expectNoSidewaysScroll(page);

  const button = copy.getByRole('button', { name: /^Copy \d+ entries$/u });
  const count = /\d+/u.exec(await button.innerText())?.[0] ?? '';
  await page.route('**/copies', async (route) => {
    // The server does it, and the answer never comes.
    await route.fetch();
    await route.abort();
  });
  await button.click();
  await expect(copy.getByText(/There is no network just now/u)).toBeVisible();
  await page.unroute('**/copies');
  await button.click();
  await expect(
    copy.getByText(`${count} entries were copied. Consent is to be asked for there.`),
  ).toBeVisible();

  await page.goto(`/calendars/${into.id}`);
  await expect(page.getByText('Sow long millet')).toHaveCount(1);
  await expect(page.getByText(/Elder A-/u)).toHaveCount(0);
  const there = await send<{ items: { id: string }[] }>(page, 'GET', `/api/calendars/${into.id}/entries`);
  expect(String(there.items.length)).toBe(count);
  const item = `/api/communities/${communityId}/items/entry/${there.items[0]?.id ?? ''}`;
  const asked = await send<{ items: { content: { answer: string } }[] }>(page, 'GET', `${item}/consents`);
  expect(asked.items.map(({ content }) => content.answer)).toEqual(['asked']);
});

async function firstVillage(page: Parameters<typeof send>[0]): Promise<string> {
  const { memberships } = await send<{ memberships: { communityId: string }[] }>(page, 'GET', '/api/session');
  return memberships[0]?.communityId ?? '';
}
