import type { Answer } from '#shared/contracts/reviews.js';
import type { Version } from '#shared/contracts/versions.js';
import { expect, test } from '#tests/support/journey.js';
import { expectAccessible, expectNoSidewaysScroll, signIn } from '#tests/support/journey-steps.js';
import { plainPicture } from '#tests/support/media.js';
import { ask, giveCard, JOURNEY_PIN, openReview, reviewPath } from '#tests/support/open-review.js';

/*
 * A grand-daughter who only reads types for an elder who shows the PIN; then an officer types in what the elders of a
 * meeting marked on paper.
 */
test.describe.configure({ mode: 'serial' });
// A wrong PIN is refused on purpose, and whoever stopped helping sees no review.
test.use({ expectedNoise: [/422|403|404/u] });

test.beforeAll(async ({ browser }) => {
  const page = await browser.newPage();
  await signIn(page, 'officer');
  await openReview(page, 1);
  await page.close();
});
test('an observer types for an elder: the bar says so on every screen, and "agree" is the elder’s own', async ({
  page,
  browser,
}) => {
  const steward = await browser.newPage();
  await signIn(steward, 'steward');
  const code = await giveCard(steward, 'Elder A-2');
  await steward.close();
  // Nothing is opened here: a page that is still asking for its session would get another one than this request.
  const visitor = await browser.newPage();
  await ask(visitor, 'post', '/session/card/pin', { code, pin: JOURNEY_PIN });
  await visitor.close();

  await page.setViewportSize({ width: 320, height: 640 });
  await signIn(page, 'observer');
  await page.goto('/account');
  await page.getByLabel('Whom do you help?').selectOption({ label: 'Elder A-2' });
  await page.getByLabel('Letters on their card').fill(code);
  await page.getByLabel('Their PIN').fill('9025');
  await page.getByRole('button', { name: 'Begin' }).click();
  await expect(page.getByText('This is not their PIN.')).toBeVisible();
  await page.getByLabel('Their PIN').fill(JOURNEY_PIN);
  await expectAccessible(page);
  await page.getByRole('button', { name: 'Begin' }).click();
  const bar = page.getByRole('region', { name: 'You are helping' });
  await expect(bar.getByText('You are typing for Elder A-2.')).toBeVisible();

  const path = await reviewPath(page);
  const { entries } = (await (await page.request.get(`/api${path}`)).json()) as Version;
  const read = async () =>
    ((await (await page.request.get(`/api${path}/answers`)).json()) as { items: Answer[] }).items;
  const before = await read();
  const open = entries.find(
    ({ entryId }) => !before.some((each) => each.entryId === entryId && each.elderName === 'Elder A-2'),
  );
  await page.goto(`${path}/review?entry=${open?.entryId ?? ''}`);
  await expect(bar).toBeInViewport();
  await page.getByRole('button', { name: 'Agree', exact: true }).click();
  await expect(page.getByRole('heading', { name: 'Agree: Elder A-2 says so themselves' })).toBeVisible();
  await expectNoSidewaysScroll(page);
  await expectAccessible(page);
  await page.getByLabel('Or Elder A-2 types their PIN').fill(JOURNEY_PIN);
  await page.getByRole('button', { name: 'Keep the answer with the PIN' }).click();
  await expect(page.getByText('Agree: kept.')).toBeVisible();
  const mine = (await read()).find(
    ({ entryId, elderName }) => entryId === open?.entryId && elderName === 'Elder A-2',
  );
  expect(mine).toMatchObject({ answer: 'agree', proof: { kind: 'pin' } });

  await bar.getByRole('button', { name: 'Done' }).click();
  await expect(bar).toBeHidden();
  expect((await page.request.get(`/api${path}/answers`)).status()).toBe(403);
});

test('an officer types in what was marked on paper, with its picture', async ({ page }) => {
  await page.setViewportSize({ width: 320, height: 640 });
  await signIn(page, 'officer');
  const path = await reviewPath(page);
  const sheet = await page.request.get(`/api${path}/read-back.pdf`);
  expect(sheet.headers()['content-type']).toBe('application/pdf');
  await page.goto(path);
  await page.getByRole('link', { name: 'Type in a meeting' }).click();
  await expectNoSidewaysScroll(page);
  await page.getByLabel('Day of the meeting').fill('2027-03-01');
  await page.getByLabel('Who was there and saw it').fill('Tirel');
  const row = page.getByRole('group', { name: 'Elder A-3: answer' }).last();
  await row.getByRole('button', { name: 'Change this' }).click();
  await page.getByRole('button', { name: 'Keep what stands on the paper' }).click();
  await expect(page.getByText('Choose the picture of the paper.')).toBeVisible();
  await expect(page.getByText('Say what should be different: write it, or speak it.')).toBeVisible();
  await expectAccessible(page);
  await page.getByLabel('Elder A-3: what was said').fill('A week later on the upper terraces');
  await page
    .getByLabel('Picture of the paper')
    .setInputFiles({ name: 'paper.jpg', mimeType: 'image/jpeg', buffer: await plainPicture('jpeg') });
  await page.getByRole('button', { name: 'Keep what stands on the paper' }).click();
  await expect(page.getByText('1 answer is kept.')).toBeVisible();
  const said = page.getByText('On paper, at the meeting of', { exact: false });
  await expect(said.first()).toBeVisible();
  await expect(page.getByRole('link', { name: 'See the paper' }).first()).toBeVisible();
});
