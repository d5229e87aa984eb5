import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { PlaceEntity } from '#server/db/entities/place.entity.js';
import type { Calendar } from '#shared/contracts/calendars.js';
import type { Today, WaitingItem } from '#shared/contracts/today.js';
import { computeMarkerYear } from '#shared/sky/index.js';
import { openTestApi, TEST_NOW, type Client, type TestApi } from '#tests/support/api.js';
import {
  addEntry,
  answerAll,
  beginCalendar,
  openVillage,
  publish,
  publishDraft,
  says,
  sign,
  signOff,
  submit,
  takeBack,
  versionPath,
  type Village,
} from '#tests/support/calendar-api.js';

let api: TestApi;
let village: Village;
beforeAll(async () => {
  api = await openTestApi();
});
beforeEach(async () => {
  await api.reset();
  village = await openVillage(api);
});
afterAll(() => api.close());

/** In December 2026 the demo's year has not begun; whole days from here are set by each test. */
function setDay(date: string, time = '06:00'): void {
  api.clock.set(new Date(`${date}T${time}:00Z`));
}
/** Signs in anew: by then a session from before has run out. */
async function today(mailbox = 'officer'): Promise<Today> {
  return todayOf(await api.signIn(mailbox));
}
async function todayOf(client: Client): Promise<Today> {
  return (await client.get(`/api/communities/${client.communityId}/today`).expect(200)).body as Today;
}
/** The first morning of the Pleiades at the demo place in 2027, by the engine. */
async function clusterDays(): Promise<{
  early: number;
  expected: number;
  late: number;
  expectedIso: string;
}> {
  const place = await api.dataSource.getRepository(PlaceEntity).findOneByOrFail({ id: village.placeId });
  const [rising] = computeMarkerYear('pleiades', place, place, 2027).phenomena['heliacal-rising'].occurrences;
  if (!rising?.early || !rising.late) throw new Error('no range');
  const { year, month, day } = rising.expected.gregorian;
  return {
    early: rising.early.dayNumber,
    expected: rising.expected.dayNumber,
    late: rising.late.dayNumber,
    expectedIso: new Date(Date.UTC(year, month - 1, day)).toISOString().slice(0, 10),
  };
}
function daysLater(date: string, days: number): string {
  return new Date(Date.parse(date) + days * 86_400_000).toISOString().slice(0, 10);
}
const clusterOf = ({ coming }: Today) =>
  coming.find((one) => one.marker.markerKey === 'pleiades' && one.phenomenon === 'heliacal-rising');

describe('the day', () => {
  it('is the one that the place’s clock shows, with its hole and its row on the board', async () => {
    setDay('2027-06-07', '20:59');
    expect(await today()).toMatchObject({
      date: '2027-06-07',
      hole: 158,
      row: 6,
      placeName: 'Upper terraces',
      clarity: 'ordinary',
    });
    // Addis Ababa is three hours ahead.
    setDay('2027-06-07', '21:00');
    expect(await today()).toMatchObject({ date: '2027-06-08', hole: 159 });
  });

  it('has no stars where the village has no place yet', async () => {
    await api.dataSource.getRepository(PlaceEntity).delete({ id: village.placeId });
    expect(await today()).toMatchObject({ placeId: null, clarity: null, coming: [] });
  });

  it('is asked of a place of the village only', async () => {
    const other = await api.signIn('officer2');
    const foreign = await api.dataSource
      .getRepository(PlaceEntity)
      .findOneByOrFail({ communityId: other.communityId });
    const path = `/api/communities/${village.officer.communityId}/today?placeId=`;
    await village.officer.get(path + foreign.id).expect(404);
    await village.officer.get(`${path}somewhere`).expect(422);
    await village.officer.get(path + village.placeId).expect(200);
  });
});

describe('what to look for', () => {
  it('names a marker two weeks before its expected day and not a day sooner', async () => {
    const { expectedIso } = await clusterDays();
    setDay(daysLater(expectedIso, -14));
    expect(clusterOf(await today())).toMatchObject({ daysAway: 14 });
    setDay(daysLater(expectedIso, -15));
    expect(clusterOf(await today())).toBeUndefined();
  });

  it('keeps a marker while its range is open, and drops it the day after', async () => {
    const { expected, late, expectedIso } = await clusterDays();
    setDay(daysLater(expectedIso, late - expected));
    expect(clusterOf(await today())).toMatchObject({ daysAway: expected - late });
    setDay(daysLater(expectedIso, late - expected + 1));
    expect(clusterOf(await today())).toBeUndefined();
  });

  it('says where and until when to look', async () => {
    const { expectedIso } = await clusterDays();
    setDay(daysLater(expectedIso, -1));
    const cluster = clusterOf(await today());
    expect(cluster?.occurrence).toMatchObject({
      expected: { gregorian: expectedIso, compass: 'ene' },
      startLookingAt: null,
    });
    expect(cluster?.occurrence.stopLookingAt).toMatch(/^0[56]:\d\d$/);
    expect(cluster?.occurrence.early?.gregorian.localeCompare(expectedIso)).toBe(-1);
    expect(cluster?.occurrence.late?.gregorian.localeCompare(expectedIso)).toBe(1);
  });

  it('goes by when to look, and puts what the calendar goes by before other open ranges', async () => {
    const { id } = await beginCalendar(village);
    await addEntry(village.officer, id, { titleOfficer: 'Sow' });
    await publishDraft(village, id);
    const { expectedIso } = await clusterDays();
    setDay(expectedIso);
    const { coming } = await today('observer');
    expect(coming[0]).toMatchObject({ marker: { markerKey: 'pleiades' }, leads: ['Sow'] });
    const lookFrom = coming.map(({ daysAway }) => Math.max(0, daysAway));
    expect(lookFrom).toEqual([...lookFrom].sort((a, b) => a - b));
  });

  it('never announces a return of a star that is never hidden, unless a published entry goes by it', async () => {
    // Vega at 12° N: seen at dusk and at dawn in the same nights around New Year.
    const vega = (date: string) => {
      setDay(date);
      return today().then(({ coming }) =>
        coming.filter(({ marker }) => marker.name === 'Vega').map(({ phenomenon }) => phenomenon),
      );
    };
    const days = Array.from({ length: 12 }, (_, index) => daysLater('2026-12-15', index * 3));
    for (const date of days) expect(await vega(date)).toEqual([]);

    api.clock.set(TEST_NOW);
    const { id } = await beginCalendar(village);
    await addEntry(village.officer, id, {
      titleOfficer: 'Lamp evening',
      lead: { type: 'marker', markerKey: 'hr7001', phenomenon: 'heliacal-rising', occurrence: 1 },
    });
    const { entries } = await publishDraft(village, id);
    expect(await vega(entries[0]?.dates.marker?.expected.gregorian ?? '')).toEqual(['heliacal-rising']);
  });

  it('looks over New Year in both directions', async () => {
    setDay('2027-01-01');
    const { coming } = await today();
    for (const { daysAway, occurrence } of coming) {
      const from = Date.parse(occurrence.early?.gregorian ?? occurrence.expected.gregorian);
      expect(daysAway >= 0 || from <= Date.parse('2027-01-01')).toBe(true);
    }
    const place = await api.dataSource.getRepository(PlaceEntity).findOneByOrFail({ id: village.placeId });
    // Altair comes back in the second half of January; seen from 28 December it is not near, from 5 January it is.
    const altair = computeMarkerYear('hr7557', place, place, 2027).phenomena['heliacal-rising']
      .occurrences[0];
    const { month, day } = altair?.expected.gregorian ?? { month: 0, day: 0 };
    expect(month).toBe(1);
    setDay(daysLater(`2027-01-${String(day).padStart(2, '0')}`, -14));
    const names = (await today()).coming.map(({ marker }) => marker.name);
    expect(names).toContain('Altair');
  });

  it('falls back to the next markers where nothing is near', async () => {
    // At 75° N most bright stars never set, and in the light months none can be seen coming or going.
    const place = await api.dataSource.getRepository(PlaceEntity).findOneByOrFail({ id: village.placeId });
    await api.dataSource
      .getRepository(PlaceEntity)
      .update({ id: place.id }, { latitudeDeg: 75, skyline: [], timeZone: 'Etc/UTC' });
    let later: Today | null = null;
    for (let days = 0; days < 360 && later === null; days += 12) {
      setDay(daysLater('2027-01-02', days));
      const answer = await today();
      if (answer.comingIsLater) later = answer;
    }
    expect(later?.coming.length).toBeGreaterThan(0);
    const away = later?.coming.map(({ daysAway }) => daysAway) ?? [];
    expect(Math.min(...away)).toBeGreaterThan(14);
    expect(away).toEqual([...away].sort((a, b) => a - b));
  });
});

describe('open work', () => {
  const fixed = (month: number, day: number) =>
    ({ type: 'fixed-date', date: { month, day }, source: 'Council' }) as const;

  it('is open from the earliest to the last advised day, both included; what ends first comes first', async () => {
    const { id } = await beginCalendar(village);
    const offsets = { earliestDays: 0, bestFromDays: 2, bestToDays: 4, lastAdvisedDays: 6 };
    await addEntry(village.officer, id, { titleOfficer: 'Later', lead: fixed(3, 3), offsets });
    await addEntry(village.officer, id, { titleOfficer: 'Mend', lead: fixed(3, 1), offsets });
    await publishDraft(village, id);
    const openOn = async (date: string) => {
      setDay(date);
      return (await today('observer')).openWindows.map(({ titleOfficer }) => titleOfficer);
    };
    expect(await openOn('2027-02-28')).toEqual([]);
    expect(await openOn('2027-03-01')).toEqual(['Mend']);
    expect(await openOn('2027-03-07')).toEqual(['Mend', 'Later']);
    expect(await openOn('2027-03-08')).toEqual(['Later']);
    expect(await openOn('2027-03-10')).toEqual([]);
  });

  it('of last year’s calendar is still open after New Year', async () => {
    const { id } = await beginCalendar(village);
    const offsets = { earliestDays: 0, bestFromDays: 5, bestToDays: 15, lastAdvisedDays: 20 };
    await addEntry(village.officer, id, { titleOfficer: 'Store', lead: fixed(12, 20), offsets });
    await publishDraft(village, id);
    setDay('2028-01-09');
    expect((await today()).openWindows).toMatchObject([
      { titleOfficer: 'Store', calendarId: id, window: { lastAdvised: '2028-01-09' } },
    ]);
  });

  it('comes from what was published, never from the draft', async () => {
    const { id } = await beginCalendar(village);
    await addEntry(village.officer, id, { titleOfficer: 'Mend', lead: fixed(3, 1) });
    setDay('2027-03-10');
    expect((await today()).openWindows).toEqual([]);
    api.clock.set(TEST_NOW);
    await publish(village, await submit(village.officer, id));
    await addEntry(village.officer, id, { titleOfficer: 'Only a draft', lead: fixed(3, 1) });
    setDay('2027-03-10');
    expect((await today()).openWindows.map(({ titleOfficer }) => titleOfficer)).toEqual(['Mend']);
  });
});

describe('what waits', () => {
  let calendar: Calendar;
  beforeEach(async () => {
    calendar = await beginCalendar(village);
    await addEntry(village.officer, calendar.id, { titleOfficer: 'Sow' });
    await addEntry(village.officer, calendar.id, { titleOfficer: 'Weed' });
  });
  const waiting = async (client: Client): Promise<WaitingItem[]> => (await todayOf(client)).waiting;

  it('for the officer is the open draft', async () => {
    expect(await waiting(village.officer)).toMatchObject([
      { kind: 'go-on-with-draft', calendarId: calendar.id, placeName: 'Upper terraces', year: 2027, of: 2 },
    ]);
    expect(await waiting(village.elder)).toEqual([]);
    expect(await waiting(village.steward)).toEqual([]);
  });

  it('for elders is to answer, then to sign', async () => {
    const version = await submit(village.officer, calendar.id);
    expect(await waiting(village.elder)).toMatchObject([
      { kind: 'answer-entries', number: 1, done: 0, of: 2 },
    ]);
    await village.elder
      .put(`${versionPath(version)}/entries/${version.entries[0]?.entryId ?? ''}/answer`, says())
      .expect(200);
    expect(await waiting(village.elder)).toMatchObject([{ kind: 'answer-entries', done: 1, of: 2 }]);
    await answerAll(village.elder, version);
    expect(await waiting(village.elder)).toMatchObject([{ kind: 'sign-as-elder', number: 1 }]);
    await sign(village.elder, version, 'elder').expect(200);
    expect(await waiting(village.elder)).toEqual([]);
  });

  it('for the officer is what an elder asks, how far the elders are, and at last to publish', async () => {
    const version = await submit(village.officer, calendar.id);
    const [sow] = version.entries;
    await village.elder2
      .put(
        `${versionPath(version)}/entries/${sow?.entryId ?? ''}/answer`,
        says({ answer: 'change-this', note: 'Three days later' }),
      )
      .expect(200);
    expect(await waiting(village.officer)).toMatchObject([
      {
        kind: 'elder-asked-change',
        entryId: sow?.entryId,
        entryTitle: 'Sow',
        personName: 'Elder A-2',
        note: 'Three days later',
      },
      { kind: 'review-progress', number: 1, done: 0, of: 3 },
    ]);
    await village.elder2
      .post(`${versionPath(version)}/entries/${sow?.entryId ?? ''}/answer/stand`)
      .expect(200);
    expect((await waiting(village.officer)).map(({ kind }) => kind)).toEqual(['review-progress']);
    await village.elder
      .put(
        `${versionPath(version)}/entries/${sow?.entryId ?? ''}/answer`,
        says({ answer: 'not-for-the-board' }),
      )
      .expect(200);
    expect((await waiting(village.officer))[0]).toMatchObject({
      kind: 'elder-said-not-for-board',
      entryTitle: 'Sow',
      personName: 'Elder A-1',
    });
    await answerAll(village.elder3, version);
    expect((await waiting(village.officer)).at(-1)).toMatchObject({
      kind: 'review-progress',
      done: 1,
      of: 3,
    });
    await signOff(village, version);
    expect(await waiting(village.officer)).toMatchObject([{ kind: 'ready-to-publish', number: 1 }]);
  });

  it('for the steward is to sign', async () => {
    const version = await submit(village.officer, calendar.id);
    for (const elder of [village.elder, village.elder2]) {
      await answerAll(elder, version);
      await sign(elder, version, 'elder').expect(200);
    }
    expect(await waiting(village.steward)).toMatchObject([{ kind: 'sign-as-steward', number: 1 }]);
  });

  it('for staff is to print what was published, and for nobody a draft that equals it', async () => {
    await publishDraft(village, calendar.id);
    const staff = await api.signIn('staff');
    expect(await waiting(staff)).toMatchObject([{ kind: 'print-published', number: 1, label: '2027-1' }]);
    expect(await waiting(village.officer)).toEqual([]);
    expect(await waiting(await api.signIn('observer'))).toEqual([]);
    api.clock.set(new Date('2026-12-02T06:00:00Z'));
    await addEntry(village.officer, calendar.id, { titleOfficer: 'Guard' });
    expect(await waiting(village.officer)).toMatchObject([{ kind: 'go-on-with-draft', of: 3 }]);
  });

  it('comes back to the officer as a draft when a submission is taken back', async () => {
    await takeBack(village.officer, await submit(village.officer, calendar.id));
    expect((await waiting(village.officer)).map(({ kind }) => kind)).toEqual(['go-on-with-draft']);
    expect(await waiting(village.elder)).toEqual([]);
  });

  it('ends with the year: a draft of a year that is over waits for nobody', async () => {
    setDay('2027-12-31', '20:59');
    expect((await today()).waiting.map(({ kind }) => kind)).toEqual(['go-on-with-draft']);
    setDay('2027-12-31', '21:00');
    expect((await today()).waiting).toEqual([]);
  });
});
