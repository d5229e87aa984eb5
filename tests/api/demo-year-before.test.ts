import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { seedDemoCalendar } from '#server/features/demo/demo-calendar.service.js';
import type { Calendar } from '#shared/contracts/calendars.js';
import type { ConsentLine } from '#shared/contracts/consents.js';
import type { ReviewedEntry, SeasonReview, SeasonTask } from '#shared/contracts/season-reviews.js';
import type { Version } from '#shared/contracts/versions.js';
import { openTestApi, type Client, type TestApi } from '#tests/support/api.js';

let api: TestApi;
beforeAll(async () => {
  api = await openTestApi();
  await api.reset();
  await seedDemoCalendar(api.dataSource, api.clock);
}, 60_000);
afterAll(() => api.close());

async function calendarsOf(client: Client): Promise<Calendar[]> {
  return ((await client.get('/api/calendars').expect(200)).body as { items: Calendar[] }).items;
}

async function reviewOf(client: Client): Promise<SeasonReview> {
  const id = (await calendarsOf(client)).find(({ year }) => year === 2026)?.id ?? '';
  return (await client.get(`/api/calendars/${id}/season-review`).expect(200)).body as SeasonReview;
}

function called(title: string, { entries }: SeasonReview): ReviewedEntry {
  const found = entries.find(({ titleOfficer }) => titleOfficer === title);
  if (!found) throw new Error(`${title} is not there`);
  return found;
}

describe('the first village of the demo', () => {
  it('has a year behind it: planned and done, stars seen, signs that came and that nobody marked', async () => {
    const review = await reviewOf(await api.signIn('elder3'));
    expect(review).toMatchObject({ label: '2026-2', year: 2026 });
    expect(review.entries).toHaveLength(9);
    const sowing = called('Sow long millet', review);
    expect(sowing.star?.seen).toMatchObject({ date: '2026-06-08', agreedBy: 'Elder A-2' });
    expect(sowing.signs.map(({ cameOn }) => cameOn)).toEqual(['2026-06-20', '2026-06-14', null]);
    expect(sowing.planned.window?.bestFrom).toBe('2026-06-15');
    const harvest = called('Harvest long millet', review);
    expect((harvest.actual?.to ?? '') > (harvest.planned.window?.bestTo ?? '')).toBe(true);
    expect(called('Second weeding', review).actual).toBeNull();
    expect(called('First weeding', review).planned.window?.bestFrom).toBe('2026-07-10');
    expect(review.entries.every(({ signs }) => signs.every(({ canBeMarked }) => canBeMarked))).toBe(true);
  });

  it('decided three things for 2027, which stand beside its entries; one is ticked off', async () => {
    const officer = await api.signIn('officer');
    const review = await reviewOf(officer);
    const tasksPath = `/api/calendars/${review.nextCalendarId ?? ''}/season-tasks`;
    const { items } = (await officer.get(tasksPath).expect(200)).body as { items: SeasonTask[] };
    expect(items.map(({ title, done, entryId }) => [title, done !== null, entryId !== null])).toEqual([
      ['Seed check and germination test', true, true],
      ['Sow long millet', false, true],
      ['Sow short millet', false, true],
    ]);
  });

  it('shows 2026 as it was published, and nothing of the looking back, to whoever prints', async () => {
    const staff = await api.signIn('staff');
    const [next, before] = await calendarsOf(staff);
    expect([next?.year, before?.year]).toEqual([2027, 2026]);
    const version = (await staff.get(`/api/calendars/${before?.id ?? ''}/versions/2`).expect(200))
      .body as Version;
    expect(version).toMatchObject({ state: 'published', label: '2026-2' });
    await staff.get(`/api/calendars/${before?.id ?? ''}/season-review`).expect(403);
  });

  it('asks again about the things of this year alone', async () => {
    const steward = await api.signIn('steward');
    const { items } = (await steward.get(`/api/communities/${steward.communityId}/consents`).expect(200))
      .body as { items: ConsentLine[] };
    expect(items.filter(({ isDue }) => isDue).map(({ title }) => title)).toEqual(['Seed-lending evening']);
  });

  it('is not made twice', async () => {
    await seedDemoCalendar(api.dataSource, api.clock);
    expect(await calendarsOf(await api.signIn('officer'))).toHaveLength(2);
  });
});
