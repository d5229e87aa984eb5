import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Place } from '#shared/contracts/places.js';
import type { Problem } from '#shared/contracts/problem.js';
import type { MarkerDetail, MarkerRow } from '#shared/contracts/stars.js';
import { computeMarkerYear, FIGURES, PHENOMENA, STARS, watchTimes, yearStrip } from '#shared/sky/index.js';
import { openTestApi, type Client, type TestApi } from '#tests/support/api.js';
import { addPlaceLike, firstPlace } from '#tests/support/place-api.js';

let api: TestApi;
let observer: Client;
let officer: Client;
let place: Place;
let stars: string;
beforeAll(async () => {
  api = await openTestApi();
  [observer, officer] = [await api.signIn('observer'), await api.signIn('officer')];
  place = await firstPlace(observer);
  stars = `/api/places/${place.id}/stars`;
});
afterAll(() => api.close());

interface Table {
  items: MarkerRow[];
  year: number;
  firstDayNumber: number;
  lastDayNumber: number;
}

async function table(year = 2027, path = stars): Promise<Table> {
  return (await observer.get(`${path}?year=${year}`).expect(200)).body as Table;
}
async function star(markerKey: string, year = 2027, path = stars): Promise<MarkerDetail> {
  return (await observer.get(`${path}/${markerKey}?year=${year}`).expect(200)).body as MarkerDetail;
}
async function addPlace(changes: Partial<Place>): Promise<string> {
  return `/api/places/${(await addPlaceLike(officer, place, changes)).id}/stars`;
}
const iso = ({ year, month, day }: { year: number; month: number; day: number }) =>
  [String(year).padStart(4, '0'), ...[month, day].map((part) => String(part).padStart(2, '0'))].join('-');

describe('the star table', () => {
  it('holds every star and figure once, figures first', async () => {
    const { items } = await table();
    expect(items.length).toBe(STARS.length + FIGURES.length);
    expect(new Set(items.map((row) => row.markerKey)).size).toBe(items.length);
    expect(items.slice(0, FIGURES.length + 1).map((row) => [row.kind, row.name])).toEqual([
      ...FIGURES.map(({ name }) => ['figure', name]),
      ['star', 'Alpheratz'],
    ]);
  });

  it('calls stars by name, by Greek letter, else by Flamsteed number', async () => {
    const { items } = await table();
    const byHr = (hr: number) => items.find((row) => row.markerKey === `hr${hr}`);
    expect(byHr(2491)).toMatchObject({ name: 'Sirius', designation: 'α CMa', vMag: -1.46 });
    expect(byHr(1178)).toMatchObject({ name: 'Atlas', designation: '27 Tau' });
    expect(byHr(25)).toMatchObject({ name: '', designation: 'ε Phe' });
  });

  it('gives the dates of the engine for the place with its skyline, clarity and clock', async () => {
    const { items, firstDayNumber, lastDayNumber } = await table();
    for (const markerKey of ['pleiades', 'hr2326', 'hr7001', 'hr424']) {
      const expected = computeMarkerYear(markerKey, place, place, 2027);
      const row = items.find((one) => one.markerKey === markerKey);
      expect(row).toMatchObject({
        outcome: expected.outcome,
        nightsHidden: expected.nightsHidden,
        notes: expected.notes,
        strip: yearStrip(expected, place, place),
      });
      for (const phenomenon of PHENOMENA) {
        const { outcome, occurrences } = expected.phenomena[phenomenon];
        expect(row?.phenomena[phenomenon]).toMatchObject({
          outcome,
          occurrences: occurrences.map((one) => ({
            expected: { dayNumber: one.expected.dayNumber, gregorian: iso(one.expected.gregorian) },
            early: one.early && { gregorian: iso(one.early.gregorian) },
            late: one.late && { gregorian: iso(one.late.gregorian) },
          })),
        });
      }
      expect(row?.strip[0]?.fromDayNumber).toBe(firstDayNumber);
      expect(row?.strip.at(-1)?.toDayNumber).toBe(lastDayNumber);
    }
    expect(
      items.filter((row) => row.phenomena['heliacal-rising'].outcome === 'dated').length,
    ).toBeGreaterThan(600);
  });

  it('counts years before 1583 in the Julian calendar and gives both labels', async () => {
    const { firstDayNumber, lastDayNumber, items } = await table(-43);
    // Day 0 is 1 January −4712; from there to −43 lie 4669 years of 365 days and 1168 leap days.
    expect([firstDayNumber, lastDayNumber]).toEqual([1_705_353, 1_705_353 + 364]);
    const sirius = items.find((row) => row.markerKey === 'hr2491');
    const day = sirius?.phenomena['heliacal-rising'].occurrences[0]?.expected;
    expect(day?.julian).toMatch(/^-0043-\d\d-\d\d$/);
    // The two calendars were two days apart then.
    expect(Number(day?.julian.slice(-2)) - Number(day?.gregorian.slice(-2))).toBe(2);
  });

  it('follows a change of the place at once', async () => {
    const path = await addPlace({ name: 'Follows' });
    const before = await table(2027, path);
    const read = (await officer.get(path.replace('/stars', ''))).body as Place;
    const { id: _id, communityId: _communityId, ...update } = read;
    await officer.put(path.replace('/stars', ''), { ...update, sameSideShiftDeg: 3 }).expect(200);
    const after = await table(2027, path);
    const dayOf = (one: Table) =>
      one.items[0]?.phenomena['heliacal-rising'].occurrences[0]?.expected.dayNumber ?? NaN;
    expect(dayOf(after) - dayOf(before)).toBeGreaterThan(1);
  });

  it.each(['3001', '-3001', 'soon', '2027.5'])('refuses the year %s, naming the field', async (year) => {
    const answer = await observer.get(`${stars}?year=${year}`);
    expect(answer.status).toBe(422);
    expect((answer.body as Problem).errors?.[0]?.field).toBe('year');
  });

  it('asks for a year instead of reading an empty one as the year 0', async () => {
    const refusal = (await observer.get(`${stars}?year=`).expect(422)).body as Problem;
    expect(refusal.errors).toEqual([expect.objectContaining({ code: 'not-a-number' })]);
  });

  it('is not there for another village', async () => {
    const stranger = await api.signIn('officer2');
    await stranger.get(`${stars}?year=2027`).expect(404);
    await stranger.get(`${stars}.csv?year=2027`).expect(404);
    await stranger.get(`${stars}/pleiades?year=2027`).expect(404);
  });
});

describe('one star', () => {
  it('gives each date with range, geometry, clock time, compass and basis', async () => {
    const detail = await star('pleiades');
    const expected = computeMarkerYear('pleiades', place, place, 2027);
    const [rising] = expected.phenomena['heliacal-rising'].occurrences;
    const [shown] = detail.details['heliacal-rising'];
    expect(shown).toMatchObject({
      clarity: rising?.clarity,
      expected: {
        jdUt: rising?.expected.jdUt,
        sunDepressionDeg: rising?.expected.sunDepressionDeg,
        starAzimuthDeg: rising?.expected.starAzimuthDeg,
        compass: 'ene',
        // Addis Ababa keeps UTC+3 all year.
        localTime: clockTime((rising?.expected.jdUt ?? 0) + 3 / 24),
      },
    });
    expect(detail.basis).toMatchObject({
      thresholdSet: 'three-class',
      skylineRule: 'altitude-difference',
      year: 2027,
      engineVersion: expect.stringMatching(/^\d+\.\d+\.\d+$/) as string,
    });
    expect(detail.basis.thresholdSource).toContain('Vogt 1920');
    expect(detail.skyline).toEqual(place.skyline);
  });

  it('tells when to stop before sunrise and when to begin after sunset, each rounded away from the Sun', async () => {
    const { details } = await star('pleiades');
    const [rising] = details['heliacal-rising'];
    const [setting] = details['heliacal-setting'];
    expect(rising?.startLookingAt).toBeNull();
    expect(setting?.stopLookingAt).toBeNull();
    const stop = watchTimes(place, rising?.expected.dayNumber ?? 0).stopLookingJdUt ?? 0;
    const start = watchTimes(place, setting?.expected.dayNumber ?? 0).startLookingJdUt ?? 0;
    expect(minutes(rising?.stopLookingAt)).toBe(Math.floor(minuteOfDay(stop + 3 / 24)));
    expect(minutes(setting?.startLookingAt)).toBe(Math.ceil(minuteOfDay(start + 3 / 24)));
    // The last moment to look lies after the star has come up.
    expect(minutes(rising?.stopLookingAt)).toBeGreaterThan(minutes(rising?.expected.localTime));
  });

  it('uses the summer clock of the zone, and local mean solar time before 1900', async () => {
    const path = await addPlace({
      name: 'Far north',
      latitudeDeg: 59,
      longitudeDeg: 18,
      timeZone: 'Europe/Stockholm',
      skyline: [],
    });
    const summer = (await star('hr2061', 2027, path)).details['heliacal-rising'][0]?.expected;
    expect(summer?.gregorian).toMatch(/^2027-0[89]/);
    expect(summer?.localTime).toBe(clockTime((summer?.jdUt ?? 0) + 2 / 24));
    const before = (await star('hr2061', 1899, path)).details['heliacal-rising'][0]?.expected;
    expect(before?.localTime).toBe(clockTime((before?.jdUt ?? 0) + 18 / 360));
  });

  it('sets the date over a flat horizon beside the one over the hills, and none where there are no hills', async () => {
    const path = await addPlace({
      name: 'Deep valley',
      skyline: [0, 90, 180, 270].map((azimuthDeg) => ({ azimuthDeg, altitudeDeg: 12 })),
    });
    const [hill] = (await star('hr2491', 2027, path)).details['heliacal-rising'];
    const flat = computeMarkerYear('hr2491', { ...place, skyline: [] }, place, 2027);
    const flatDay = flat.phenomena['heliacal-rising'].occurrences[0]?.expected.dayNumber ?? NaN;
    expect(hill?.flatExpected?.dayNumber).toBe(flatDay);
    expect(hill?.expected.dayNumber).toBeGreaterThan(flatDay);

    const level = await star('hr2491', 2027, await addPlace({ name: 'Plain', skyline: [] }));
    expect(level.details['heliacal-rising'][0]?.flatExpected).toBeNull();
  });

  it('finds the flat date in the neighbouring year where the hills carry a date over New Year', async () => {
    const path = await addPlace({
      name: 'Behind the wall',
      skyline: [0, 90, 180, 270].map((azimuthDeg) => ({ azimuthDeg, altitudeDeg: 15 })),
    });
    const { items } = await table(2027, path);
    const carried = items.flatMap((row) => {
      const day = row.phenomena['heliacal-rising'].occurrences[0]?.expected.gregorian ?? '';
      return day.startsWith('2027-01-0') ? [row.markerKey] : [];
    });
    expect(carried.length).toBeGreaterThan(0);
    const flatDays = await Promise.all(
      carried.map(async (key) => (await star(key, 2027, path)).details['heliacal-rising'][0]?.flatExpected),
    );
    expect(flatDays.some((day) => day?.gregorian.startsWith('2026-12'))).toBe(true);
  });

  it('names the stars of a figure, and none for a single star', async () => {
    const belt = await star('orion-belt');
    expect(belt.members).toEqual([
      { hr: 1852, name: 'Mintaka' },
      { hr: 1903, name: 'Alnilam' },
      { hr: 1948, name: 'Alnitak' },
    ]);
    expect((await star('hr2491')).members).toEqual([]);
  });

  it('answers 404 for a star or figure that is not in the table', async () => {
    await observer.get(`${stars}/hr9999?year=2027`).expect(404);
    await observer.get(`${stars}/ploughshare?year=2027`).expect(404);
  });

  it('says of a star that never sets that it has no dates', async () => {
    const path = await addPlace({ name: 'Ice edge', latitudeDeg: 66, longitudeDeg: 23, skyline: [] });
    const polaris = await star('hr424', 2027, path);
    expect(polaris).toMatchObject({ outcome: 'never-sets', nightsHidden: null });
    expect(Object.values(polaris.details).flat()).toEqual([]);
    // Around midsummer no night at 66° N is dark enough, even for a star that is up.
    expect(polaris.strip.map(({ state }) => state)).toEqual(['all-night', 'hidden', 'all-night']);
  });
});

/** Minute of the day of a Julian Day on its own clock. */
function minuteOfDay(jd: number): number {
  return ((((jd + 0.5) % 1) + 1) % 1) * 1440;
}
function minutes(time: string | null | undefined): number {
  const [hours = NaN, rest = NaN] = (time ?? '').split(':').map(Number);
  return hours * 60 + rest;
}
function clockTime(jd: number): string {
  const whole = Math.floor(minuteOfDay(jd) + 1e-5);
  return [Math.floor(whole / 60), whole % 60].map((part) => String(part).padStart(2, '0')).join(':');
}
