import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { Calendar, Entry } from '#shared/contracts/calendars.js';
import type { LongLook } from '#shared/contracts/decades.js';
import { openTestApi, type Client, type TestApi } from '#tests/support/api.js';
import {
  addEntry,
  beginCalendar,
  openVillage,
  publishDraft,
  reasonOf,
  type Village,
} from '#tests/support/calendar-api.js';
import { details } from '#tests/support/sharing-api.js';

let api: TestApi;
let village: Village;
let calendar: Calendar;
let sow: Entry;
beforeAll(async () => {
  api = await openTestApi();
});
beforeEach(async () => {
  await api.reset();
  village = await openVillage(api);
  calendar = await beginCalendar(village);
  sow = await addEntry(village.officer, calendar.id);
});
afterAll(() => api.close());

const path = (query = 'from=2027') => `/api/calendars/${calendar.id}/long-look?${query}`;
const look = async (client: Client, query?: string) =>
  (await client.get(path(query)).expect(200)).body as LongLook;
const spread = ({ years }: LongLook['entries'][number]) => {
  const days = years.flatMap(({ window }) => (window ? [Date.parse(`2027${window.bestFrom.slice(4)}`)] : []));
  return (Math.max(...days) - Math.min(...days)) / 86_400_000;
};

describe('ten years of a calendar', () => {
  it('keep a star’s work within days and let a Moon’s wander by weeks, each year by its own sky', async () => {
    await addEntry(village.officer, calendar.id, {
      lead: { type: 'sky', spec: { kind: 'moon-phase', event: 'full' }, occurrence: 6 },
    });
    const found = await look(village.officer);
    expect(found).toMatchObject({ number: 'draft', from: 2027, years: 10 });
    const [star, moon] = found.entries;
    if (!star || !moon) throw new Error('no entries');
    expect(star.years.map(({ year }) => year)).toEqual([
      2027, 2028, 2029, 2030, 2031, 2032, 2033, 2034, 2035, 2036,
    ]);
    expect(star.years[0]?.window).toEqual(sow.dates.window);
    expect(spread(star)).toBeLessThanOrEqual(2);
    expect(spread(moon)).toBeGreaterThan(14);
  });

  it('say which year has no day, and stand by planned days where nobody has done the work yet', async () => {
    await addEntry(village.officer, calendar.id, {
      lead: { type: 'sky', spec: { kind: 'moon-phase', event: 'new' }, occurrence: 13 },
    });
    await addEntry(village.officer, calendar.id, { lead: { type: 'entry-actual', entryId: sow.id } });
    const [, thirteenth, weed] = (await look(village.officer)).entries;
    expect(thirteenth?.years.filter(({ window }) => window === null).length).toBeGreaterThan(3);
    expect(weed?.years.every(({ window, isPlanned }) => window !== null && isPlanned)).toBe(true);
  });

  it('go by what is published where something is, and show nobody a draft or what is kept', async () => {
    const staff = await api.signIn('staff');
    expect(reasonOf(await staff.get(path()))).toBe('404 not-found');
    await publishDraft(village, calendar.id);
    await addEntry(village.officer, calendar.id, { titleOfficer: 'Weed' });
    await addEntry(village.elder, calendar.id, {
      titleOfficer: 'Lamp of the ridge',
      ...{ sharingLevel: 'elders', sharing: details() },
    });
    expect(await look(staff)).toMatchObject({ number: '1', label: '2027-1', entries: [{ entryId: sow.id }] });
    expect(reasonOf(await staff.get(path('from=2027&number=draft')))).toBe('404 not-found');
    const drafted = await look(village.officer, 'from=2027&years=1&number=draft');
    expect(drafted.entries.map(({ titleOfficer }) => titleOfficer)).toEqual(['Sow long millet', 'Weed']);
  });

  it('refuses years without calendars and more than twenty at once', async () => {
    await village.officer.get(path('from=1800')).expect(422);
    await village.officer.get(path('from=2027&years=21')).expect(422);
  });
});
