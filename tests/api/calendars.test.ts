import { shareWithVillage } from '#tests/support/sharing-api.js';
import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { EntryEntity } from '#server/db/entities/entry.entity.js';
import type { Calendar, Entry } from '#shared/contracts/calendars.js';
import type { Problem } from '#shared/contracts/problem.js';
import { addDays, daysBetween } from '#shared/kernel/iso-date.js';
import { openTestApi, type TestApi } from '#tests/support/api.js';
import {
  addEntry,
  beginCalendar,
  entriesOf,
  entryInput,
  openVillage,
  outcomes,
  publishDraft,
  reasonOf,
  submit,
  takeBack,
  type Village,
  wholeEntry,
} from '#tests/support/calendar-api.js';

let api: TestApi;
let village: Village;
let calendar: Calendar;
let entries: string;
beforeAll(async () => {
  api = await openTestApi();
});
beforeEach(async () => {
  await api.reset();
  village = await openVillage(api);
  calendar = await beginCalendar(village);
  entries = `/api/calendars/${calendar.id}/entries`;
});
afterAll(() => api.close());

const titles = (items: Entry[]) => items.map(({ content }) => content.titleOfficer);

describe('beginning a calendar', () => {
  it('ties it to a place and a civil year', () => {
    expect(calendar).toMatchObject({
      communityName: 'Upper Tazimel',
      placeName: 'Upper terraces',
      year: 2027,
      locked: false,
      outNumber: null,
      published: null,
      entryCount: 0,
    });
  });

  it('happens once for a place and a year, also when two officers begin at once', async () => {
    const path = `/api/communities/${village.officer.communityId}/calendars`;
    const input = { placeId: village.placeId, year: 2028 };
    const answers = await Promise.all([village.officer.post(path, input), village.officer.post(path, input)]);
    expect(outcomes(answers)).toEqual(['201', '409 calendar-exists']);
  });

  it('takes places of the own village only, and years from 1900 to 2200', async () => {
    const path = `/api/communities/${village.officer.communityId}/calendars`;
    const stranger = await api.signIn('officer2');
    const foreign = (await stranger.get(`/api/communities/${stranger.communityId}`)).body as { id: string };
    const answer = await village.officer.post(path, { placeId: foreign.id, year: 2029 }).expect(422);
    expect((answer.body as Problem).errors).toMatchObject([{ field: 'placeId', code: 'unknown-place' }]);
    const year = await village.officer.post(path, { placeId: village.placeId, year: 1899 }).expect(422);
    expect((year.body as Problem).errors).toMatchObject([{ field: 'year', code: 'calendar-year' }]);
  });
});

describe('who sees what of a calendar', () => {
  it('is nothing for another village', async () => {
    const stranger = await api.signIn('officer2');
    await stranger.get(`/api/calendars/${calendar.id}`).expect(404);
    await stranger.get(entries).expect(404);
    await stranger.post(entries, entryInput()).expect(404);
    expect((await stranger.get('/api/calendars').expect(200)).body).toEqual({ items: [], nextCursor: null });
    await stranger.get(`/api/calendars?communityId=${village.officer.communityId}`).expect(404);
  });

  it('is the draft for officer, elder and steward; only the officer writes', async () => {
    await addEntry(village.officer, calendar.id);
    for (const client of [village.elder, village.steward]) {
      expect(await entriesOf(client, calendar.id)).toHaveLength(1);
    }
    await village.steward.post(entries, entryInput()).expect(403);
    expect(reasonOf(await village.elder.post(entries, entryInput()))).toBe('409 officers-write-this');
  });

  it('is no trace of a draft for staff and observer, but everything of what is published', async () => {
    const staff = await api.signIn('staff');
    const observer = await api.signIn('observer');
    await addEntry(village.officer, calendar.id);
    const version = await submit(village.officer, calendar.id);
    for (const client of [staff, observer]) {
      await client.get(entries).expect(403);
      const { items } = (await client.get('/api/calendars').expect(200)).body as { items: Calendar[] };
      expect(items).toMatchObject([{ locked: false, outNumber: null, published: null, entryCount: 0 }]);
    }
    const { items } = (await village.elder.get('/api/calendars')).body as { items: Calendar[] };
    expect(items).toMatchObject([{ locked: true, outNumber: 1, entryCount: 1 }]);

    await takeBack(village.officer, version);
    await addEntry(village.officer, calendar.id);
    api.clock.set(new Date('2026-12-05T06:00:00Z'));
    await publishDraft(village, calendar.id);
    api.clock.set(new Date('2026-12-06T06:00:00Z'));
    await addEntry(village.officer, calendar.id);
    expect((await observer.get(`/api/calendars/${calendar.id}`).expect(200)).body).toMatchObject({
      locked: false,
      published: { number: 2, label: '2027-1' },
      entryCount: 2,
      updatedAt: '2026-12-05T06:00:00.000Z',
    });
  });
});

describe('an entry', () => {
  it('gets its dates from the sky over the place and its window from the offsets', async () => {
    const { dates } = await addEntry(village.officer, calendar.id);
    const expected = dates.marker?.expected.gregorian ?? '';
    // The demo notes estimate 7 June 2027 at this place to within five days.
    expect(Math.abs(daysBetween('2027-06-07', expected))).toBeLessThanOrEqual(5);
    expect((dates.marker?.early?.gregorian ?? '') <= expected).toBe(true);
    expect((dates.marker?.late?.gregorian ?? '') >= expected).toBe(true);
    expect(dates).toMatchObject({
      starOutcome: 'rises-and-sets',
      phenomenonOutcome: 'dated',
      window: {
        earliest: addDays(expected, 3),
        bestFrom: addDays(expected, 7),
        bestTo: addDays(expected, 23),
        lastAdvised: addDays(expected, 28),
        lastAdvisedBy: 'offset',
      },
      warnings: [],
    });
  });

  it('is cut by the fixed last date of the responsible office', async () => {
    const source = 'District agricultural office';
    const lastDate = { date: { month: 6, day: 20 }, source };
    const { dates } = await addEntry(village.officer, calendar.id, { hasLastDate: true, lastDate });
    expect(dates).toMatchObject({
      window: { bestTo: '2027-06-20', lastAdvised: '2027-06-20', lastAdvisedBy: 'fixed' },
      warnings: ['window-shortened-by-last-date'],
    });
    const june = { date: { month: 6, day: 1 }, source };
    const closed = await addEntry(village.officer, calendar.id, { hasLastDate: true, lastDate: june });
    expect(closed.dates).toMatchObject({ window: null, warnings: ['window-closed-by-last-date'] });
  });

  it('has no date but a reason where the star cannot serve', async () => {
    // Polaris (HR 424) stands 12° high over 12° N all year.
    const lead = {
      type: 'marker' as const,
      markerKey: 'hr424',
      phenomenon: 'heliacal-rising' as const,
      occurrence: 1 as const,
    };
    const { dates } = await addEntry(village.officer, calendar.id, { lead });
    expect(dates).toMatchObject({
      starOutcome: 'never-sets',
      phenomenonOutcome: null,
      marker: null,
      window: null,
      warnings: ['star-does-not-serve'],
    });
  });

  it('warns of a copy whose days were not changed, on both, until they are', async () => {
    const first = await addEntry(village.officer, calendar.id);
    const copy = (await village.officer.post(`${entries}/${first.id}/copy`).expect(201)).body as Entry;
    expect(copy.dates.warnings).toEqual(['windows-overlap']);
    expect((await entriesOf(village.officer, calendar.id)).map(({ dates }) => dates.warnings)).toEqual([
      ['windows-overlap'],
      ['windows-overlap'],
    ]);
    const offsets = { earliestDays: 40, bestFromDays: 45, bestToDays: 50, lastAdvisedDays: 55 };
    await village.officer
      .put(`${entries}/${copy.id}`, { content: entryInput({ offsets }), version: copy.version })
      .expect(200);
    expect((await entriesOf(village.officer, calendar.id)).flatMap(({ dates }) => dates.warnings)).toEqual(
      [],
    );
  });

  it('answers 422 with one entry per bad field, and saves nothing', async () => {
    const answer = await village.officer
      .post(
        entries,
        entryInput({
          titleOfficer: '  ',
          hasLastDate: true,
          lead: { type: 'fixed-date', date: { month: 2, day: 29 }, source: '' },
          offsets: { earliestDays: 0.5, bestFromDays: 400, bestToDays: 1, lastAdvisedDays: 2 },
        }),
      )
      .expect(422);
    const fields = (answer.body as Problem).errors?.map(({ field, code }) => `${field} ${code}`) ?? [];
    expect(fields).toEqual(
      expect.arrayContaining([
        'titleOfficer required',
        'lead.date.day no-such-day',
        'lead.source required',
        'offsets.earliestDays whole-days',
        'offsets.bestFromDays offset-range',
      ]),
    );
    expect(new Set(fields).size).toBe(fields.length);
    expect(await entriesOf(village.officer, calendar.id)).toEqual([]);
  });

  it('goes by a marker of the table only', async () => {
    const lead = {
      type: 'marker',
      markerKey: 'hr9999',
      phenomenon: 'heliacal-rising',
      occurrence: 1,
    } as const;
    const added = await village.officer.post(entries, entryInput({ lead })).expect(422);
    expect((added.body as Problem).errors).toMatchObject([
      { field: 'lead.markerKey', code: 'unknown-marker' },
    ]);
    const entry = await addEntry(village.officer, calendar.id);
    const saved = await village.officer
      .put(`${entries}/${entry.id}`, { content: entryInput({ lead }), version: 1 })
      .expect(422);
    expect((saved.body as Problem).errors).toMatchObject([
      { field: 'content.lead.markerKey', code: 'unknown-marker' },
    ]);
  });

  it('stands in one calendar only: under another one’s path it is not found', async () => {
    const entry = await addEntry(village.officer, calendar.id);
    const other = await beginCalendar(village, 2028);
    const path = `/api/calendars/${other.id}/entries/${entry.id}`;
    await village.officer.put(path, { content: entryInput(), version: 1 }).expect(404);
    await village.officer.delete(path).expect(404);
    await village.officer.post(`${path}/copy`).expect(404);
    await village.officer.post(`${path}/restore`).expect(404);
  });
});

describe('saving an entry', () => {
  it('counts its version up and says who saved', async () => {
    const entry = await addEntry(village.officer, calendar.id);
    api.clock.set(new Date('2026-12-02T06:00:00Z'));
    const content = wholeEntry({ notes: 'Upper terraces first' });
    const saved = (
      await village.officer.put(`${entries}/${entry.id}`, { content, version: entry.version }).expect(200)
    ).body as Entry;
    expect(saved).toMatchObject({
      content,
      version: entry.version + 1,
      updatedBy: 'Beyno',
      updatedAt: '2026-12-02T06:00:00.000Z',
    });
  });

  it('over a newer state answers 409 with both, and keeps the newer one', async () => {
    const { id, version } = await addEntry(village.officer, calendar.id);
    const first = entryInput({ notes: 'first' });
    const second = entryInput({ notes: 'second' });
    await village.officer.put(`${entries}/${id}`, { content: first, version }).expect(200);
    const late = await village.officer.put(`${entries}/${id}`, { content: second, version }).expect(409);
    expect(late.body).toMatchObject({
      type: '/problems/stale',
      current: { id, version: version + 1, content: { notes: 'first' } },
      sent: { version, content: { notes: 'second' } },
    });
    expect((await entriesOf(village.officer, calendar.id))[0]?.content.notes).toBe('first');
  });

  it('at once with somebody else: one is saved, the other answers 409 and loses nothing', async () => {
    const { id, version } = await addEntry(village.officer, calendar.id);
    const answers = await Promise.all(
      ['one', 'two', 'three'].map((notes) =>
        village.officer.put(`${entries}/${id}`, { content: entryInput({ notes }), version }),
      ),
    );
    expect(outcomes(answers)).toEqual(['200', '409 stale', '409 stale']);
    const winner = answers.find(({ status }) => status === 200)?.body as Entry;
    expect((await entriesOf(village.officer, calendar.id))[0]).toMatchObject({
      version: version + 1,
      content: { notes: winner.content.notes },
    });
  });

  it('of what is stored already changes nothing', async () => {
    const { id, version } = await addEntry(village.officer, calendar.id);
    const again = await village.officer
      .put(`${entries}/${id}`, { content: wholeEntry(), version })
      .expect(200);
    expect((again.body as Entry).version).toBe(version);
  });
});

describe('the order of entries', () => {
  const three = async () => {
    const ids: string[] = [];
    for (const titleOfficer of ['a', 'b', 'c']) {
      ids.push((await addEntry(village.officer, calendar.id, { titleOfficer, crop: titleOfficer })).id);
    }
    return ids;
  };

  it('is that of adding; a copy stands behind its original', async () => {
    const [, b = ''] = await three();
    const copy = (await village.officer.post(`${entries}/${b}/copy`).expect(201)).body as Entry;
    expect(copy).toMatchObject({ position: 2, version: 1, content: { titleOfficer: 'b' } });
    const items = await entriesOf(village.officer, calendar.id);
    expect(titles(items)).toEqual(['a', 'b', 'b', 'c']);
    expect(items.map(({ position }) => position)).toEqual([0, 1, 2, 3]);
    expect(items[2]?.id).toBe(copy.id);
  });

  it('is set by a list that names each entry once, and makes no open form stale', async () => {
    const [a = '', b = '', c = ''] = await three();
    const order = `/api/calendars/${calendar.id}/order`;
    const answer = await village.officer.put(order, { entryIds: [c, a, b] }).expect(200);
    expect(titles((answer.body as { items: Entry[] }).items)).toEqual(['c', 'a', 'b']);
    expect((await entriesOf(village.officer, calendar.id)).map(({ version }) => version)).toEqual([1, 1, 1]);
    for (const entryIds of [
      [a, b],
      [a, b, b],
      [a, b, c, village.placeId],
    ]) {
      expect(reasonOf(await village.officer.put(order, { entryIds }))).toBe('409 order-differs');
    }
    expect(titles(await entriesOf(village.officer, calendar.id))).toEqual(['c', 'a', 'b']);
  });

  it('closes where an entry is taken out and opens at the same place when it is put back', async () => {
    const [a = '', b = ''] = await three();
    await village.officer.delete(`${entries}/${b}`).expect(204);
    await village.officer.delete(`${entries}/${a}`).expect(204);
    expect(titles(await entriesOf(village.officer, calendar.id))).toEqual(['c']);
    await village.officer.delete(`${entries}/${a}`).expect(404);
    await village.officer.put(`${entries}/${a}`, { content: entryInput(), version: 2 }).expect(404);
    await village.officer.post(`${entries}/${a}/restore`).expect(200);
    const restored = (await village.officer.post(`${entries}/${b}/restore`).expect(200)).body as Entry;
    expect(restored).toMatchObject({ position: 1, content: { titleOfficer: 'b' } });
    expect(titles(await entriesOf(village.officer, calendar.id))).toEqual(['a', 'b', 'c']);
    expect(reasonOf(await village.officer.post(`${entries}/${b}/restore`))).toBe('409 nothing-to-restore');
  });
});

describe('a full calendar', () => {
  it('holds 500 entries, whatever way they come in', async () => {
    const first = await addEntry(village.officer, calendar.id);
    const { content, calendarId, updatedAt, updatedBy } = await api.dataSource
      .getRepository(EntryEntity)
      .findOneByOrFail({ id: first.id });
    const ids = Array.from({ length: 499 }, () => randomUUID());
    await shareWithVillage(api, village.officer.communityId, ids);
    await api.dataSource.getRepository(EntryEntity).insert(
      ids.map((id, index) => ({
        id,
        position: index + 1,
        deletedAt: null,
        ...{ content, calendarId, updatedAt, updatedBy },
      })),
    );
    expect(await entriesOf(village.officer, calendar.id)).toHaveLength(500);
    expect(reasonOf(await village.officer.post(entries, entryInput()))).toBe('409 too-many-entries');
    expect(reasonOf(await village.officer.post(`${entries}/${first.id}/copy`))).toBe('409 too-many-entries');
    await village.officer.delete(`${entries}/${first.id}`).expect(204);
    await village.officer.post(entries, entryInput()).expect(201);
    expect(reasonOf(await village.officer.post(`${entries}/${first.id}/restore`))).toBe(
      '409 too-many-entries',
    );
  });
});
