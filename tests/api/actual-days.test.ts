import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { Calendar, Entry, EntryInput } from '#shared/contracts/calendars.js';
import type { Problem } from '#shared/contracts/problem.js';
import type { Today } from '#shared/contracts/today.js';
import { openTestApi, type Client, type TestApi } from '#tests/support/api.js';
import {
  addEntry,
  beginCalendar,
  entriesOf,
  entryInput,
  openVillage,
  publishDraft,
  readVersion,
  reasonOf,
  submit,
  type Village,
} from '#tests/support/calendar-api.js';

let api: TestApi;
let village: Village;
let calendar: Calendar;
beforeAll(async () => {
  api = await openTestApi();
});
beforeEach(async () => {
  await api.reset();
  village = await openVillage(api);
  calendar = await beginCalendar(village);
});
afterAll(() => api.close());

const DONE = { from: '2027-06-28', to: null, saidBy: 'Elder A-1', plots: '' };
const SOWING: Partial<EntryInput> = {
  titleOfficer: 'Sow',
  lead: { type: 'fixed-date', date: { month: 6, day: 10 }, source: 'the village' },
};
const weeding = (entryId: string): Partial<EntryInput> => ({
  titleOfficer: 'Weed',
  lead: { type: 'entry-actual', entryId },
  offsets: { earliestDays: 14, bestFromDays: 14, bestToDays: 21, lastAdvisedDays: 28 },
});
const entryPath = ({ id }: Pick<Entry, 'id'>) => `/api/calendars/${calendar.id}/entries/${id}`;
const actualPath = (entry: Pick<Entry, 'id'>) => `${entryPath(entry)}/actual-days`;
const fieldsOf = (body: unknown) =>
  ((body as Problem).errors ?? []).map(({ field, code }) => `${field}: ${code}`);

async function titled(client: Client, title: string): Promise<Entry> {
  const found = (await entriesOf(client, calendar.id)).find(({ content }) => content.titleOfficer === title);
  if (!found) throw new Error(`There is no entry ${title}.`);
  return found;
}

describe('the day on which work was done', () => {
  it('stands beside a version that was frozen before, whose own text still waits', async () => {
    const { officer, elder } = village;
    const sowing = await addEntry(officer, calendar.id, SOWING);
    const weed = await addEntry(officer, calendar.id, weeding(sowing.id));
    const published = await publishDraft(village, calendar.id);
    expect(published).not.toHaveProperty('doneSince');
    await elder.put(actualPath(sowing), DONE).expect(200);
    const read = await readVersion(await api.signIn('staff'), published);
    expect(read.doneSince).toMatchObject([
      {
        entryId: weed.id,
        anchorId: sowing.id,
        from: '2027-06-28',
        to: null,
        window: { bestFrom: '2027-07-12' },
      },
    ]);
    expect(read.entries.map(({ dates }) => dates)).toEqual(published.entries.map(({ dates }) => dates));
  });

  it('gives days to what hangs on it, and takes them again', async () => {
    const { officer, elder } = village;
    const sowing = await addEntry(officer, calendar.id, SOWING);
    const before = await addEntry(officer, calendar.id, weeding(sowing.id));
    expect(before.dates).toMatchObject({ window: null, counted: { basis: 'waiting' } });
    expect((await elder.put(actualPath(sowing), DONE).expect(200)).body).toMatchObject(DONE);
    expect((await titled(officer, 'Weed')).dates).toMatchObject({
      window: { bestFrom: '2027-07-12', bestTo: '2027-07-19' },
      counted: { basis: 'actual', from: '2027-06-28', to: '2027-06-28' },
    });
    expect((await titled(officer, 'Sow')).actual).toMatchObject(DONE);
    await officer.delete(actualPath(sowing)).expect(204);
    expect((await titled(officer, 'Weed')).dates.window).toBeNull();
  });

  it('is written down also while a submission is out: the text of the draft stays as it is', async () => {
    const { officer } = village;
    const sowing = await addEntry(officer, calendar.id, SOWING);
    await submit(officer, calendar.id);
    await officer.put(actualPath(sowing), DONE).expect(200);
    expect((await titled(officer, 'Sow')).version).toBe(sowing.version);
  });

  it('is of the calendar’s year or beside it, in order, and said by somebody', async () => {
    const { officer } = village;
    const sowing = await addEntry(officer, calendar.id, SOWING);
    const answers = [];
    for (const wrong of [
      { from: '2031-01-01' },
      { to: '2027-06-01' },
      { saidBy: '' },
      { from: '2027-02-30' },
    ]) {
      const answer = await officer.put(actualPath(sowing), { ...DONE, ...wrong }).expect(422);
      answers.push(fieldsOf(answer.body)[0]);
    }
    expect(answers).toEqual([
      ...['from: not-of-this-year', 'to: before-first', 'saidBy: required', 'from: date-form'],
    ]);
  });

  it('is not there for whoever does not see the entry', async () => {
    const kept = await addEntry(village.elder, calendar.id, { sharingLevel: 'elders' });
    expect(reasonOf(await village.officer.put(actualPath(kept), DONE))).toBe('404 not-found');
    expect(reasonOf(await village.officer.delete(actualPath(kept)))).toBe('404 not-found');
  });
});

describe('an entry that hangs on another one', () => {
  it('cannot wait for itself by way of others, and is told the way', async () => {
    const { officer } = village;
    const sowing = await addEntry(officer, calendar.id, SOWING);
    const weed = await addEntry(officer, calendar.id, weeding(sowing.id));
    const content = entryInput({
      ...SOWING,
      lead: { type: 'entry-planned', entryId: weed.id, day: 'bestFrom' },
    });
    const answer = await officer.put(entryPath(sowing), { content, version: 1 }).expect(422);
    expect(fieldsOf(answer.body)).toEqual(['content.lead.entryId: anchor-circle']);
    expect((answer.body as Problem).names).toEqual(['Sow', 'Weed', 'Sow']);
    expect((await titled(officer, 'Sow')).content.lead.type).toBe('fixed-date');
  });

  it('goes by what is in the same draft and seen by who writes it', async () => {
    const { officer, elder } = village;
    const kept = await addEntry(elder, calendar.id, { sharingLevel: 'elders' });
    const path = `/api/calendars/${calendar.id}/entries`;
    for (const entryId of [kept.id, calendar.id]) {
      const answer = await officer.post(path, entryInput(weeding(entryId))).expect(422);
      expect(fieldsOf(answer.body)).toEqual(['lead.entryId: unknown-entry']);
    }
    expect(await entriesOf(officer, calendar.id)).toEqual([]);
  });

  it('is never seen by more people than the other one', async () => {
    const { elder } = village;
    const kept = await addEntry(elder, calendar.id, { sharingLevel: 'sealed' });
    const path = `/api/calendars/${calendar.id}/entries`;
    const wider = entryInput({ ...weeding(kept.id), sharingLevel: 'elders' });
    expect(fieldsOf((await elder.post(path, wider).expect(422)).body)).toEqual(['lead.entryId: anchor-kept']);
    await elder.post(path, { ...wider, sharingLevel: 'sealed' }).expect(201);
  });

  it('loses its days where the other one becomes narrower, so that they do not tell of it', async () => {
    const { officer, elder } = village;
    const sowing = await addEntry(officer, calendar.id, { ...SOWING, giverId: elder.personId });
    await addEntry(officer, calendar.id, {
      ...weeding(sowing.id),
      lead: { type: 'entry-planned', entryId: sowing.id, day: 'bestFrom' },
    });
    expect((await titled(officer, 'Weed')).dates.window).not.toBeNull();
    const content = { ...sowing.content, sharingLevel: 'elders' as const };
    await elder.put(entryPath(sowing), { content, version: 1 });
    await officer.put(entryPath(sowing), { content, version: 1 });
    expect((await titled(officer, 'Weed')).dates).toMatchObject({ window: null, warnings: ['anchor-gone'] });
  });

  it('keeps the other one in the draft, and says which it is', async () => {
    const { officer } = village;
    const sowing = await addEntry(officer, calendar.id, SOWING);
    const weed = await addEntry(officer, calendar.id, weeding(sowing.id));
    const answer = await officer.delete(entryPath(sowing));
    expect(reasonOf(answer)).toBe('409 entries-hang-on-it');
    expect((answer.body as Problem).names).toEqual(['Weed']);
    await officer.delete(entryPath(weed)).expect(204);
    await officer.delete(entryPath(sowing)).expect(204);
  });

  it('is frozen with the days that it had', async () => {
    const { officer } = village;
    const sowing = await addEntry(officer, calendar.id, SOWING);
    await addEntry(officer, calendar.id, weeding(sowing.id));
    await officer.put(actualPath(sowing), DONE).expect(200);
    const version = await submit(officer, calendar.id);
    await officer.put(actualPath(sowing), { ...DONE, from: '2027-07-03' }).expect(200);
    const path = `/api/calendars/${calendar.id}/versions/${version.number}`;
    const { entries } = (await officer.get(path).expect(200)).body as typeof version;
    const weed = entries.find(({ content }) => content.titleOfficer === 'Weed');
    expect(weed?.dates.window?.bestFrom).toBe('2027-07-12');
  });
});

describe('the page of the day', () => {
  it('shows what is counted from work that was done after the calendar was published', async () => {
    const { officer } = village;
    const sowing = await addEntry(officer, calendar.id, SOWING);
    await addEntry(officer, calendar.id, weeding(sowing.id));
    await publishDraft(village, calendar.id);
    api.clock.set(new Date('2027-07-14T06:00:00Z'));
    const openOnes = async () => {
      const observer = await api.signIn('observer');
      const answer = await observer.get(`/api/communities/${observer.communityId}/today`).expect(200);
      return (answer.body as Today).openWindows.map(({ titleOfficer }) => titleOfficer);
    };
    expect(await openOnes()).not.toContain('Weed');
    await (await api.signIn('officer')).put(actualPath(sowing), DONE).expect(200);
    expect(await openOnes()).toContain('Weed');
  });
});

describe('the first crescent as seen this year', () => {
  it('is counted from its evening, and is taken from no day that has not come', async () => {
    api.clock.set(new Date('2027-02-10T06:00:00Z'));
    const officer = await api.signIn('officer');
    const spec = { kind: 'moon-phase', event: 'first-crescent' } as const;
    const lead = { type: 'sky', spec, occurrence: 2 } as const;
    const computed = await addEntry(officer, calendar.id, { lead });
    const seen = { date: '2027-02-09', by: 'Tirel', agreedBy: 'Elder A-1' };
    const entry = await addEntry(officer, calendar.id, { lead: { ...lead, seen } });
    expect(entry.dates.counted).toMatchObject({ basis: 'seen', beside: computed.dates.window });
    expect(entry.dates.window?.bestFrom).toBe('2027-02-16');
    const early = await officer.post(
      `/api/calendars/${calendar.id}/entries`,
      entryInput({ lead: { ...lead, seen: { ...seen, date: '2028-01-30' } } }),
    );
    expect((early.body as Problem).errors).toMatchObject([
      { field: 'lead.seen.date', code: 'in-the-future' },
    ]);
  });
});

describe('a star as seen this year', () => {
  it('is counted from the day on which it was seen, with the computed days beside', async () => {
    let { officer } = village;
    const lead = { markerKey: 'pleiades', phenomenon: 'heliacal-rising', occurrence: 1 } as const;
    const computed = await addEntry(officer, calendar.id, { lead: { type: 'marker', ...lead } });
    const seen = { date: '2027-06-12', by: 'Tirel', agreedBy: 'Elder A-1' };
    const early = await officer.post(
      `/api/calendars/${calendar.id}/entries`,
      entryInput({ lead: { type: 'marker-as-seen', ...lead, seen } }),
    );
    expect((early.body as Problem).errors).toMatchObject([
      { field: 'lead.seen.date', code: 'in-the-future' },
    ]);
    api.clock.set(new Date('2027-06-12T09:00:00Z'));
    officer = await api.signIn('officer');
    const entry = await addEntry(officer, calendar.id, { lead: { type: 'marker-as-seen', ...lead, seen } });
    expect(entry.dates.marker).toEqual(computed.dates.marker);
    expect(entry.dates.window?.bestFrom).toBe('2027-06-19');
    expect(entry.dates.counted).toMatchObject({ basis: 'seen', beside: computed.dates.window });
    const unseen = await addEntry(officer, calendar.id, {
      crop: 'beans',
      lead: { type: 'marker-as-seen', ...lead, seen: null },
    });
    expect(unseen.dates).toEqual(computed.dates);
  });
});
