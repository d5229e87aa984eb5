import type { Calendar } from '#shared/contracts/calendars.js';
import type { SessionState } from '#shared/contracts/session.js';
import { expect, test } from '#tests/support/journey.js';
import { expectAccessible, expectNoSidewaysScroll, signIn } from '#tests/support/journey-steps.js';
import { send } from '#tests/support/officer-pair.js';

/*
 * An officer switches the village's page on and hangs up its card. Somebody who passes by reads on a phone what was agreed
 * to for it. A common word that is taken for a name stands there once the officer says that nobody is meant.
 */
test.use({ viewport: { width: 320, height: 740 }, hasTouch: true });

test('whoever passes by reads what the village opened, and a word that is no name', async ({
  page,
  browser,
}) => {
  const stewards = await browser.newContext();
  const steward = await stewards.newPage();
  await signIn(steward, 'steward');
  const { memberships } = await send<SessionState>(steward, 'GET', '/api/session');
  const communityId = memberships?.[0]?.communityId ?? '';
  await send(steward, 'POST', `/api/communities/${communityId}/people`, {
    email: 'cluster@dawnpeg.example',
    displayName: 'Cluster Ostby',
    roles: ['observer'],
  });
  await stewards.close();

  await signIn(page, 'officer');
  const { items } = await send<{ items: Calendar[] }>(page, 'GET', '/api/calendars');
  const calendar = items.find((one) => one.communityId === communityId && one.published !== null);
  await page.goto(`/calendars/${calendar?.id ?? ''}/versions/${calendar?.published?.number ?? 0}`);
  const board = page.getByRole('region', { name: 'A page for everybody' });
  await board.getByRole('button', { name: 'Switch it on' }).click();
  await expect(board.getByText('It is on.')).toBeVisible();
  const card = await page.request.get(
    (await board.getByRole('link', { name: 'Card to hang up' }).getAttribute('href')) ?? '',
  );
  expect([card.status(), card.headers()['content-type']]).toEqual([200, 'application/pdf']);
  await expect(board.getByRole('link', { name: 'Ask about “Sow short millet”' })).toBeVisible();
  await expect(board.getByText('Taken for Cluster Ostby.')).toBeVisible();
  await expectAccessible(page);
  await expectNoSidewaysScroll(page);

  const address = (await board.getByRole('link', { name: 'See the page' }).getAttribute('href')) ?? '';
  const passers = await browser.newContext();
  const passer = await passers.newPage();
  await passer.goto(address);
  await expect(passer.getByRole('heading', { level: 1, name: /Upper Tazimel/u })).toBeVisible();
  await expect(passer.getByRole('heading', { name: 'Seed check and germination test' })).toBeVisible();
  await expect(passer.getByRole('heading', { name: 'Sow short millet' })).toHaveCount(0);
  await expect(passer.getByText('Cluster not seen at dusk')).toHaveCount(0);
  await expectAccessible(passer);
  await expectNoSidewaysScroll(passer);

  await board.getByRole('button', { name: 'This is no name' }).click();
  await page.getByRole('dialog').getByRole('button', { name: 'Nobody is meant' }).click();
  await expect(board.getByText(/^Not Cluster Ostby: said by/u)).toBeVisible();
  await passer.reload();
  await expect(passer.getByText('Look for: Cluster not seen at dusk')).toBeVisible();
  await board.getByRole('button', { name: 'It is a name after all' }).click();
  await expect(board.getByText('Taken for Cluster Ostby.')).toBeVisible();
  await passer.reload();
  await expect(passer.getByRole('heading', { name: 'Seed check and germination test' })).toBeVisible();
  await expect(passer.getByText('Cluster not seen at dusk')).toHaveCount(0);
  await passers.close();
});
