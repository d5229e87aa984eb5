import type { Page } from '@playwright/test';
import type { Calendar, EntryInput } from '#shared/contracts/calendars.js';
import type { FigureDetail } from '#shared/contracts/figures.js';
import type { SessionState } from '#shared/contracts/session.js';
import { figureInput } from '#tests/support/figure-api.js';
import { expect, test } from '#tests/support/journey.js';
import { signIn } from '#tests/support/journey-steps.js';

/*
 * Script and markup that somebody stored is shown as the words that they are, on every screen that shows it, and runs on none.
 */
const EVIL = '<img src=x onerror="window.hit=1"><script>window.hit=1</script>';

const ENTRY: EntryInput = {
  ...{ titleVillage: EVIL, titleOfficer: EVIL, notes: EVIL, otherSigns: EVIL, ifLate: EVIL },
  ...{ kind: 'farm', icon: 'sow', crop: 'potato', caution: '', giver: '' },
  lead: { type: 'fixed-date', date: { month: 6, day: 1 }, source: EVIL },
  offsets: { earliestDays: 3, bestFromDays: 7, bestToDays: 23, lastAdvisedDays: 28 },
  ...{ hasLastDate: false, lastDate: null, protectiveWatch: false, agreedToPrint: false },
  sharingLevel: 'open',
};

test('script in a figure and an entry is text on every screen', async ({ page }) => {
  test.setTimeout(120_000);
  await signIn(page, 'officer2');
  const session = (await (await page.request.get('/api/session')).json()) as SessionState;
  const village = session.memberships?.[0]?.communityId ?? '';
  const send = async (path: string, data: object) => {
    const answer = await page.request.post(path, { data, headers: { 'X-CSRF-Token': session.csrfToken } });
    expect([path, answer.status()]).toEqual([path, 201]);
    return (await answer.json()) as unknown;
  };
  const names = [{ tag: 'en', name: EVIL.slice(0, 60) }];
  const variants = [{ toldBy: EVIL, text: EVIL }];
  const figure = (await send(
    `/api/communities/${village}/figures`,
    figureInput({ names, variants, story: EVIL }),
  )) as FigureDetail;
  const places = (await (await page.request.get(`/api/communities/${village}/places`)).json()) as {
    items: { id: string }[];
  };
  const placeId = places.items[0]?.id ?? '';
  const calendar = (await send(`/api/communities/${village}/calendars`, { placeId, year: 2033 })) as Calendar;
  await send(`/api/calendars/${calendar.id}/entries`, ENTRY);

  for (const [address, shown] of [
    [`/figures/${figure.id}`, EVIL],
    ['/village/figures', EVIL.slice(0, 40)],
    [`/calendars/${calendar.id}`, EVIL],
    ['/stars', EVIL.slice(0, 40)],
    ['/village/records', EVIL.slice(0, 40)],
  ] as const) {
    await page.goto(address);
    await expect(page.getByText(shown).first(), address).toBeVisible();
    await expectNothingRan(page);
  }
});

async function expectNothingRan(page: Page): Promise<void> {
  expect(await page.evaluate(() => 'hit' in window)).toBe(false);
  expect(await page.locator('img[src="x"], script:not([src])').count()).toBe(0);
}
