import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { Entry } from '#shared/contracts/calendars.js';
import { EMPTY_RECORD, type EventRecord } from '#shared/contracts/event-record.js';
import type { Look } from '#shared/contracts/look.js';
import type { Phenomenon } from '#shared/sky/vocabulary.js';
import { openTestApi, type Client, type TestApi } from '#tests/support/api.js';
import {
  addEntry,
  beginCalendar,
  changePlace,
  entriesOf,
  openVillage,
  type Village,
} from '#tests/support/calendar-api.js';

/** What there is to look at in each entry of a draft, beside what its own days say. */
let api: TestApi;
let village: Village;
let calendarId: string;
beforeAll(async () => {
  api = await openTestApi();
});
beforeEach(async () => {
  await api.reset();
  village = await openVillage(api);
  calendarId = (await beginCalendar(village)).id;
});
afterAll(() => api.close());

const adviceFor = async (client: Client) =>
  Object.fromEntries(
    (await entriesOf(client, calendarId)).map(({ content, advice = [] }: Entry) => [
      content.titleOfficer,
      advice,
    ]),
  );
const done = (responsible: string, more: Partial<EventRecord> = {}) => ({
  record: { ...EMPTY_RECORD, work: { ...EMPTY_RECORD.work, responsible }, ...more },
});
const by = (markerKey: string, phenomenon: Phenomenon = 'heliacal-rising') =>
  ({ type: 'marker', markerKey, phenomenon, occurrence: 1 }) as const;

describe('the list of a draft', () => {
  it('says of each entry what to look at: people, cloud, cautions, and how far its star moved', async () => {
    const { officer } = village;
    await changePlace(api, village.placeId, { rainMonths: Array.from({ length: 12 }, () => true) });
    const trust = { ...EMPTY_RECORD.trust, sinceYear: -1500 };
    await addEntry(officer, calendarId, {
      titleOfficer: 'Sow',
      lead: by('pleiades'),
      ...done('all', { trust }),
    });
    await addEntry(officer, calendarId, { titleOfficer: 'Mend', lead: by('pleiades'), ...done('All') });
    await addEntry(officer, calendarId, { titleOfficer: 'Care', kind: 'safety', caution: '' });
    const told = await adviceFor(village.elder);
    expect(told['Sow']).toEqual(expect.arrayContaining(['same-people', 'cloudy-season', 'drifted']));
    expect(told['Mend']).toEqual(expect.arrayContaining(['same-people', 'cloudy-season']));
    expect(told['Mend']).not.toContain('drifted');
    expect(told['Care']).toContain('no-safety-line');
  });

  it('speaks of no entry that the person does not see', async () => {
    const { officer, elder, elder2 } = village;
    const kept = { kind: 'belief', sharingLevel: 'sealed', giverId: elder.personId } as const;
    await addEntry(elder, calendarId, { titleOfficer: 'Kept', ...kept, ...done('all') });
    await addEntry(officer, calendarId, { titleOfficer: 'Sow', ...done('all') });
    expect((await adviceFor(elder2))['Sow']).not.toContain('same-people');
    expect((await adviceFor(elder))['Sow']).toContain('same-people');
  });

  it('tells of a bright Moon beside the stars that have one on their day, and of no others', async () => {
    const { officer } = village;
    const keys = ['pleiades', 'hyades', 'hr2491', 'hr1713', 'hr5340', 'hr7001', 'hr6134'];
    for (const key of keys) {
      await addEntry(officer, calendarId, { titleOfficer: key, lead: by(key, 'acronychal-rising') });
    }
    const told = await adviceFor(officer);
    const bright = [];
    for (const { content, dates } of await entriesOf(officer, calendarId)) {
      const day = dates.marker?.expected.gregorian;
      if (day === undefined) continue;
      const query = `marker=${content.titleOfficer}&phenomenon=acronychal-rising&date=${day}`;
      const look = (await officer.get(`/api/places/${village.placeId}/look?${query}`).expect(200))
        .body as Look;
      if (look.moon?.moonlight === 'strong') bright.push(content.titleOfficer);
    }
    expect(keys.filter((key) => told[key]?.includes('moonlit'))).toEqual(bright);
    expect(bright.length).toBeGreaterThan(0);
  });
});
