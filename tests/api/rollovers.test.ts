import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { Calendar, Entry } from '#shared/contracts/calendars.js';
import type { RolledCalendar, RolloverReport } from '#shared/contracts/rollovers.js';
import type { Variant } from '#shared/contracts/variants.js';
import { openTestApi, type Client, type TestApi } from '#tests/support/api.js';
import {
  addEntry,
  beginCalendar,
  changePlace,
  entriesOf,
  openVillage,
  outcomes,
  publishDraft,
  reasonOf,
  submit,
  type Village,
} from '#tests/support/calendar-api.js';
import type { Consent, ConsentUse, ItemConsents } from '#shared/contracts/consents.js';
import { addConsent, consentsPath } from '#tests/support/consent-api.js';
import { details, sharingPath } from '#tests/support/sharing-api.js';
import { addVariant } from '#tests/support/variant-api.js';

let api: TestApi;
let village: Village;
let calendar: Calendar;
let entry: Entry;
beforeAll(async () => {
  api = await openTestApi();
});
beforeEach(async () => {
  await api.reset();
  village = await openVillage(api);
  calendar = await beginCalendar(village);
  entry = await addEntry(village.officer, calendar.id, { giverId: village.elder.personId });
});
afterAll(() => api.close());

const NEW_MOON = { kind: 'moon-phase', event: 'new' } as const;

describe('rolling over to the next year', () => {
  it('keeps pairings and order, computes the days anew, and leaves the old draft as it is', async () => {
    const weed = await addEntry(village.officer, calendar.id, {
      titleOfficer: 'Weed',
      lead: { type: 'fixed-date', date: { month: 7, day: 1 }, source: 'office' },
    });
    const next = await rolledOver();
    const [sow, weeding] = await entriesOf(village.officer, next);
    expect(sow?.content).toEqual(entry.content);
    expect(weeding?.content).toEqual(weed.content);
    expect(sow?.id).not.toBe(entry.id);
    expect(sow?.dates.window?.bestFrom).toMatch(/^2028-/u);
    expect((await entriesOf(village.officer, calendar.id)).map(({ id }) => id)).toEqual([entry.id, weed.id]);
    const report = await reportOf(village.officer, next);
    expect(report).toMatchObject({ fromYear: 2027, year: 2028, fromCalendarId: calendar.id });
    expect(report.entries.map(({ outcome }) => outcome)).toEqual(['stays', 'stays']);
    expect(report.entries[0]?.before).toEqual(entry.dates);
  });

  it('names what moved by more than three days: a Moon’s day does, a star’s does not', async () => {
    await addEntry(village.officer, calendar.id, {
      lead: { type: 'sky', spec: NEW_MOON, occurrence: 6 },
    });
    const { entries } = await reportOf(village.officer, await rolledOver());
    expect(entries.map(({ outcome }) => outcome)).toEqual(['stays', 'moved']);
    expect(Math.abs(entries[1]?.movedDays ?? 0)).toBeGreaterThan(3);
    expect(entries[1]?.why?.causes).toEqual([{ cause: 'year', days: entries[1]?.movedDays }]);
  });

  it('tells the year from what people changed since: air, days from the lead, and a day that was seen', async () => {
    const star = { markerKey: 'pleiades', phenomenon: 'heliacal-rising', occurrence: 1 } as const;
    const seen = { date: '2027-06-29', by: 'Marrun', agreedBy: 'A-1' };
    api.clock.set(new Date('2027-07-01T09:00:00Z'));
    village = await openVillage(api);
    await addEntry(village.officer, calendar.id, { lead: { type: 'marker-as-seen', ...star, seen } });
    const next = await rolledOver();
    const [sow] = await entriesOf(village.officer, next);
    if (!sow) throw new Error('no entry');
    const offsets = { earliestDays: 8, bestFromDays: 12, bestToDays: 28, lastAdvisedDays: 33 };
    const content = { ...sow.content, offsets };
    const path = `/api/calendars/${next}/entries/${sow.id}`;
    await village.officer.put(path, { content, version: sow.version }).expect(200);
    await changePlace(api, village.placeId, { sameSideShiftDeg: 3 });
    const { entries } = await reportOf(village.officer, next);
    const causesOf = (index: number) => entries[index]?.why?.causes.map(({ cause }) => cause) ?? [];
    expect(entries[0]?.why?.causes).toContainEqual({ cause: 'offsets', days: 5 });
    expect(causesOf(0)).toContain('threshold');
    expect(causesOf(1)).toContain('seen');
    const kept = await api.dataSource.query<{ timing: unknown }[]>('SELECT timing FROM rolled_item');
    expect(kept).toHaveLength(2);
    expect(JSON.stringify(kept)).not.toMatch(/Marrun|A-1/u);
  });

  it('names what lost its day in the new year: the thirteenth new Moon', async () => {
    // 2024 has thirteen new Moons, 2025 has twelve (their days as the product computes them).
    const long = await beginCalendar(village, 2024);
    const thirteenth = await addEntry(village.officer, long.id, {
      lead: { type: 'sky', spec: NEW_MOON, occurrence: 13 },
    });
    expect(thirteenth.dates.window).not.toBeNull();
    const { entries } = await reportOf(village.officer, await rolledOver(long.id));
    expect(entries).toMatchObject([{ outcome: 'lost-days', movedDays: null, after: { window: null } }]);
  });

  it('answers a second click with the same draft, also two at once', async () => {
    const path = `/api/calendars/${calendar.id}/next-year`;
    const answers = await Promise.all([village.officer.post(path), village.officer.post(path)]);
    expect(outcomes(answers)).toEqual(['200', '200']);
    const ids = answers.map(({ body }) => (body as RolledCalendar).calendarId);
    expect(ids[0]).toBe(ids[1]);
    expect(await entriesOf(village.officer, ids[0] ?? '')).toHaveLength(1);
  });

  it('is refused where next year has a calendar of its own, and after the last year', async () => {
    await beginCalendar(village, 2028);
    const path = `/api/calendars/${calendar.id}/next-year`;
    expect(reasonOf(await village.officer.post(path))).toBe('409 calendar-exists');
    const last = await beginCalendar(village, 2200);
    const beyond = await village.officer.post(`/api/calendars/${last.id}/next-year`);
    expect(reasonOf(beyond)).toBe('409 no-year-after');
  });

  it('makes nothing agreed, and whoever rolls over has written to the draft', async () => {
    await publishDraft(village, calendar.id);
    const next = await rolledOver();
    const version = await submit(village.officer, next);
    expect(version.signatures).toEqual([]);
    const answers = await village.officer.get(`/api/calendars/${next}/versions/1/answers`).expect(200);
    expect(JSON.stringify(answers.body)).not.toContain('"agree"');
    expect(version.gaps.map(({ code }) => code)).not.toEqual([]);
  });

  it('can be read again until the draft is submitted, and its calendar says so', async () => {
    const next = await rolledOver();
    const read = () => village.officer.get(`/api/calendars/${next}`).expect(200);
    expect((await read()).body).toMatchObject({ rolledFromYear: 2027 });
    await reportOf(village.elder, next);
    await submit(village.officer, next);
    expect((await read()).body).not.toHaveProperty('rolledFromYear');
    expect(reasonOf(await village.officer.get(`/api/calendars/${next}/rollover`))).toBe('404 not-found');
    const again = await village.officer.post(`/api/calendars/${calendar.id}/next-year`).expect(200);
    expect(again.body).toEqual({ calendarId: next, hasReport: false });
  });
});

describe('what goes along into the next year', () => {
  it('are other keepers’ timings, and the one that drives the board still does', async () => {
    const { variantId } = await addVariant(village.elder3, calendar.id, entry.id);
    const content = {
      ...entry.content,
      board: { shows: 'variant' as const, variantId, reason: 'It came first for three years' },
    };
    const path = `/api/calendars/${calendar.id}/entries/${entry.id}`;
    await village.officer.put(path, { content, version: entry.version }).expect(200);
    const next = await rolledOver();
    const [rolled] = await entriesOf(village.officer, next);
    const beside = await village.elder3
      .get(`/api/calendars/${next}/entries/${rolled?.id ?? ''}/variants`)
      .expect(200);
    const { items } = beside.body as { items: Variant[] };
    expect(items.map((variant) => variant.variantId)).toEqual([rolled?.content.board?.variantId]);
    expect(items[0]?.variantId).not.toBe(variantId);
    expect(items[0]?.mine).toBe(true);
  });

  it('are kept entries, which the officer who rolls over neither sees nor counts', async () => {
    await addEntry(village.elder, calendar.id, {
      titleOfficer: 'Lamp of the ridge',
      ...{ sharingLevel: 'elders', sharing: details({ trace: 'none' }) },
    });
    const next = await rolledOver();
    const officers = await reportOf(village.officer, next);
    expect(officers.entries.map(({ titleOfficer }) => titleOfficer)).toEqual(['Sow long millet']);
    const list = await village.officer.get(`/api/calendars/${next}/entries`).expect(200);
    expect(list.body).toMatchObject({ keptCount: 0 });
    const elders = await reportOf(village.elder, next);
    expect(elders.entries.map(({ titleOfficer }) => titleOfficer)).toContain('Lamp of the ridge');
    expect((await entriesOf(village.elder, next)).map(({ mine }) => mine)).toContain(true);
  });

  it('is the work that other work is counted from, in its own next year; what was seen or done stays behind', async () => {
    const { officer } = village;
    const hung = await addEntry(officer, calendar.id, {
      titleOfficer: 'Weed',
      lead: { type: 'entry-planned', entryId: entry.id, day: 'bestTo' },
    });
    api.clock.set(new Date('2027-07-01T09:00:00Z'));
    village = await openVillage(api);
    await addEntry(village.officer, calendar.id, {
      titleOfficer: 'Mend',
      lead: {
        ...{ type: 'marker-as-seen', markerKey: 'pleiades', phenomenon: 'heliacal-rising', occurrence: 1 },
        seen: { date: '2027-06-20', by: 'Marrun', agreedBy: 'A-1' },
      },
    });
    const next = await rolledOver();
    const [sow, weed, mend] = await entriesOf(village.officer, next);
    expect(weed?.content.lead).toMatchObject({ type: 'entry-planned', entryId: sow?.id });
    expect(weed?.dates.window?.bestFrom).toMatch(/^2028-/u);
    expect(hung.dates.window?.bestFrom).toMatch(/^2027-/u);
    expect(mend?.content.lead).toMatchObject({ type: 'marker-as-seen', seen: null });
  });

  it('is a no: what was only agreed to be kept is hidden in the next year, too', async () => {
    await addConsent(village.elder, 'entry', entry.id, { uses: ['keep'], giverId: village.elder.personId });
    const next = await rolledOver();
    expect(await entriesOf(village.officer, next)).toEqual([]);
    expect((await reportOf(village.officer, next)).entries).toEqual([]);
  });

  it('names whose consent is due when the new year begins', async () => {
    await addEntry(village.officer, calendar.id, { titleOfficer: 'Weed' });
    await addConsent(village.elder, 'entry', entry.id, {
      ...{ uses: ['keep', 'show', 'print'], giverId: village.elder.personId, reviewBy: '2027-12-20' },
    });
    const { entries } = await reportOf(village.officer, await rolledOver());
    expect(entries.map(({ titleOfficer, needsConsent }) => [titleOfficer, needsConsent])).toEqual([
      ['Sow long millet', true],
      ['Weed', false],
    ]);
  });

  it('goes from every year when it is taken back in one, and is paused in every year', async () => {
    const next = await rolledOver();
    const after = await rolledOver(next);
    const [middle] = await entriesOf(village.officer, next);
    const item = `/api/communities/${village.elder.communityId}/items/entry/${middle?.id ?? ''}`;
    await village.elder.post(`${item}/pause`, { askedById: null }).expect(204);
    for (const id of [calendar.id, next, after]) expect(await entriesOf(village.officer, id)).toEqual([]);
    await village.elder.delete(`${item}/pause`).expect(204);
    for (const id of [calendar.id, next, after]) expect(await entriesOf(village.officer, id)).toHaveLength(1);
    await village.elder.post(`${item}/withdrawal`, { leavesTrace: false, askedById: null }).expect(204);
    for (const id of [calendar.id, next, after]) expect(await entriesOf(village.elder, id)).toEqual([]);
  });
});

describe('what is said about an entry later', () => {
  const levelsOf = async (calendarIds: readonly string[]) =>
    Promise.all(calendarIds.map(async (id) => (await entriesOf(village.elder, id))[0]?.content.sharingLevel));
  const share = async (itemId: string, level: 'elders' | 'village' | 'open') => {
    const path = sharingPath(village.elder, 'entry', itemId);
    const { version } = (await village.elder.get(path).expect(200)).body as { version: number };
    return village.elder.put(path, { sharing: { level, ...details() }, version }).expect(200);
  };

  it('holds for every year where a level is made tighter, from whichever year, also by an edit', async () => {
    const next = await rolledOver();
    const after = await rolledOver(next);
    const years = [calendar.id, next, after];
    const [middle] = await entriesOf(village.officer, next);
    await share(middle?.id ?? '', 'village');
    expect(await levelsOf(years)).toEqual(['village', 'village', 'village']);
    const [last] = await entriesOf(village.officer, after);
    if (!last) throw new Error('no entry');
    const content = { ...last.content, sharingLevel: 'elders' as const };
    const path = `/api/calendars/${after}/entries/${last.id}`;
    await village.officer.put(path, { content, version: last.version }).expect(200);
    for (const id of years) expect(await entriesOf(village.officer, id)).toEqual([]);
    expect(await levelsOf(years)).toEqual(['elders', 'elders', 'elders']);
  });

  it('holds for the one year where giver and steward make it wider, also after the next edit of another', async () => {
    await share(entry.id, 'village');
    const next = await rolledOver();
    const [rolled] = await entriesOf(village.officer, next);
    await share(rolled?.id ?? '', 'open');
    await village.steward
      .post(`${sharingPath(village.steward, 'entry', rolled?.id ?? '')}/agreement`)
      .expect(200);
    const [here] = await entriesOf(village.officer, calendar.id);
    const content = { ...here?.content, crop: 'sorghum' };
    await village.officer
      .put(`/api/calendars/${calendar.id}/entries/${entry.id}`, { content, version: here?.version })
      .expect(200);
    expect(await levelsOf([calendar.id, next])).toEqual(['village', 'open']);
  });

  it('holds for every year where a consent is taken back or narrowed, and for one where it says more', async () => {
    const giverId = village.elder.personId;
    const { id } = await addConsent(village.elder, 'entry', entry.id, {
      uses: ['keep', 'show', 'print'],
      giverId,
    });
    const next = await rolledOver();
    const usesOf = async (calendarId: string) => {
      const [there] = await entriesOf(village.elder, calendarId);
      const path = `/api/communities/${village.elder.communityId}/items/entry/${there?.id ?? ''}/consents`;
      const { items } = (await village.elder.get(path).expect(200)).body as ItemConsents;
      return items.map(({ uses }) => uses);
    };
    const path = consentsPath(village.elder, id);
    const change = async (uses: ConsentUse[]) => {
      const { content, version } = (await village.elder.get(path).expect(200)).body as Consent;
      await village.elder.put(path, { content: { ...content, uses }, version }).expect(200);
    };
    await change(['keep', 'show', 'print', 'radio']);
    expect(await usesOf(next)).toEqual([['keep', 'show', 'print']]);
    await change(['keep', 'show']);
    expect(await usesOf(next)).toEqual([['keep', 'show']]);
    const { version } = (await village.elder.get(path).expect(200)).body as Consent;
    await village.elder.post(`${path}/withdrawal`, { version }).expect(200);
    expect(await entriesOf(village.officer, next)).toEqual([]);
  });

  it('is a no for every year where it is the first word about it', async () => {
    const next = await rolledOver();
    await addConsent(village.elder, 'entry', entry.id, { uses: ['keep'], giverId: village.elder.personId });
    expect(await entriesOf(village.officer, next)).toEqual([]);
  });
});

async function rolledOver(calendarId = calendar.id): Promise<string> {
  const answer = await village.officer.post(`/api/calendars/${calendarId}/next-year`).expect(200);
  return (answer.body as RolledCalendar).calendarId;
}

async function reportOf(client: Client, calendarId: string): Promise<RolloverReport> {
  return (await client.get(`/api/calendars/${calendarId}/rollover`).expect(200)).body as RolloverReport;
}
