import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { FinderAnswer, YearsAnswer } from '#shared/contracts/finder.js';
import type { Place } from '#shared/contracts/places.js';
import type { Problem } from '#shared/contracts/problem.js';
import { computeMarkerYear, driftOf, STARS } from '#shared/sky/index.js';
import { openTestApi, type Client, type TestApi } from '#tests/support/api.js';
import { addPlaceLike, firstPlace } from '#tests/support/place-api.js';

let api: TestApi;
let observer: Client;
let officer: Client;
let place: Place;
beforeAll(async () => {
  api = await openTestApi();
  [observer, officer] = [await api.signIn('observer'), await api.signIn('officer')];
  place = await firstPlace(observer);
});
afterAll(() => api.close());

async function find(query: string, at = place): Promise<FinderAnswer> {
  return (await observer.get(`/api/places/${at.id}/finder?${query}`).expect(200)).body as FinderAnswer;
}
const dayOfYear = (iso: string | undefined) => iso?.slice(5);

describe('markers near a wanted day', () => {
  it('are those whose day falls within twenty days, the nearest step first, with the engine’s own dates', async () => {
    const { items, total, searched, wanted, year } = await find('year=2027&from=06-10');
    expect([year, dayOfYear(wanted?.from.gregorian), dayOfYear(wanted?.to.gregorian)]).toEqual([
      2027,
      '06-10',
      '06-10',
    ]);
    expect(searched).toBeGreaterThan(STARS.length);
    expect(items.length).toBe(total);
    expect(items.length).toBeGreaterThan(3);
    const steps = items.filter(({ caution }) => caution === null).map(({ nearness }) => nearness);
    const rank = ['on-the-day', 'close', 'near', 'far'];
    expect(steps.map((step) => rank.indexOf(step))).toEqual(
      steps.map((step) => rank.indexOf(step)).sort((a, b) => a - b),
    );
    for (const item of items) {
      const [day] = computeMarkerYear(item.markerKey, place, place, 2027).phenomena[item.phenomenon]
        .occurrences;
      expect(item.days.expected.dayNumber).toBe(day?.expected.dayNumber);
      expect(item.days.early?.dayNumber).toBe(day?.early?.dayNumber);
      expect(Math.abs(item.daysAway)).toBeLessThanOrEqual(20);
      expect(item.daysAway).toBe(item.days.expected.dayNumber - (wanted?.from.dayNumber ?? 0));
    }
    expect(items.map(({ markerKey }) => markerKey)).toContain('pleiades');
  });

  it('are easy to find unless all are asked for', async () => {
    const easy = await find('year=2027&from=06-10');
    const all = await find('year=2027&from=06-10&show=all');
    expect(easy.items.every(({ vMag, kind }) => kind === 'figure' || vMag <= 2.5)).toBe(true);
    expect(all.total).toBeGreaterThan(easy.total);
    expect(all.items.some(({ ease }) => ease === 'hard')).toBe(true);
  });

  it('may be wanted for a stretch of days, also one over New Year', async () => {
    const { items, wanted } = await find('year=2027&from=12-20&to=01-10');
    expect([wanted?.from.gregorian, wanted?.to.gregorian]).toEqual(['2027-12-20', '2028-01-10']);
    const within = items.filter(({ daysAway }) => daysAway === 0);
    expect(within.some(({ days }) => days.expected.gregorian.startsWith('2027-12'))).toBe(true);
    expect(within.some(({ days }) => days.expected.gregorian.startsWith('2028-01'))).toBe(true);
  });

  it('say whether they keep their day for fifty years, as the drift has it', async () => {
    const { items } = await find('year=2027&from=06-10');
    const cluster = items.find(({ markerKey }) => markerKey === 'pleiades');
    const { epochs } = driftOf('pleiades', place, place, [2027, 2077]);
    const [now, later] = epochs.map((epoch) => epoch.phenomena['heliacal-rising'].occurrences[0]);
    const fiftyYears = Math.round((later?.expected.jdUt ?? 0) - (now?.expected.jdUt ?? 0) - 50 * 365.2425);
    expect(cluster?.laterDays[1]).toBe(fiftyYears);
    expect(cluster?.moonlight.litShare).toBeGreaterThanOrEqual(0);
  });

  it('follow the skyline of the place', async () => {
    const behindWall = await addPlaceLike(officer, place, {
      name: 'Behind the wall',
      skyline: [0, 90, 180, 270].map((azimuthDeg) => ({ azimuthDeg, altitudeDeg: 12 })),
    });
    const { items } = await find('year=2027&from=06-10', behindWall);
    for (const item of items) expect(item.skylineAltitudeDeg).toBeCloseTo(12, 6);
  });
});

describe('months of rain and cloud', () => {
  it('are held against the days on which each sign may come', async () => {
    const isJune = Array.from({ length: 12 }, (_, month) => month === 5);
    const wet = await addPlaceLike(officer, place, { name: 'Wet in June', rainMonths: isJune });
    const { items } = await find('year=2027&from=06-10', wet);
    const inJune = (day: string | undefined) => day?.slice(5, 7) === '06';
    for (const { rain, days } of items) {
      const ends = [days.early ?? days.expected, days.late ?? days.expected].map(
        ({ gregorian }) => gregorian,
      );
      expect(rain).toBe(ends.every(inJune) ? 'whole' : ends.some(inJune) ? 'partly' : 'none');
    }
    expect(new Set(items.map(({ rain }) => rain))).toEqual(new Set(['whole', 'partly', 'none']));
  });
});

describe('a day that comes twice in a civil year', () => {
  it('is found under the number by which an entry goes by it', async () => {
    const { items } = await find('year=2028&from=12-31&show=all');
    for (const { markerKey, phenomenon, occurrence, days } of items) {
      const year = Number(days.expected.gregorian.slice(0, 4));
      const there = computeMarkerYear(markerKey, place, place, year).phenomena[phenomenon].occurrences;
      expect(there[occurrence - 1]?.expected.dayNumber).toBe(days.expected.dayNumber);
    }
  });
});

describe('where no marker serves', () => {
  it('says how light the night is, why the bright stars do not help, and which season is next', async () => {
    const north = await addPlaceLike(officer, place, {
      name: 'Far north',
      latitudeDeg: 66,
      longitudeDeg: 14,
      timeZone: 'Europe/Stockholm',
      skyline: [],
    });
    const { items, darkestDeg, without, nearest } = await find('year=2027&from=06-20', north);
    expect(items.filter(({ caution }) => caution === null)).toEqual([]);
    expect(darkestDeg).toBeLessThan(1);
    expect(without.neverSets).toBeGreaterThan(15);
    expect(without.neverClearsSkyline).toBeGreaterThan(20);
    expect(without.neverDarkEnough).toBeGreaterThan(0);
    expect(nearest.after?.daysAway).toBeGreaterThan(20);
    expect(nearest.before?.daysAway).toBeLessThan(-20);
  });
});

describe('an old marker', () => {
  it('wants its day of old, and says how far it has moved since', async () => {
    const { old, wanted, items } = await find(
      'year=2027&oldMarker=pleiades&oldPhenomenon=heliacal-rising&since=1100',
    );
    const then = old?.then.days?.expected.gregorian;
    expect(dayOfYear(wanted?.from.gregorian)).toBe(dayOfYear(then));
    // About 1.37 days a century near the equator.
    expect(old?.movedDays).toBeGreaterThanOrEqual(11);
    expect(old?.movedDays).toBeLessThanOrEqual(14);
    expect(old?.now.days?.expected.dayNumber).toBe((wanted?.from.dayNumber ?? 0) + (old?.movedDays ?? 0));
    expect(items.some(({ nearness }) => nearness === 'on-the-day' || nearness === 'close')).toBe(true);
  });

  it('stands beside a day that was asked for', async () => {
    const { old, wanted } = await find('year=2027&from=05-01&oldMarker=hr2491&since=-1000');
    expect(wanted?.from.gregorian).toBe('2027-05-01');
    expect(old).toMatchObject({ name: 'Sirius', phenomenon: 'heliacal-rising', then: { year: -1000 } });
  });

  it('that had no date of old leaves nothing to look for, and says what the star did', async () => {
    const answer = await find('year=2027&oldMarker=hr424&since=1500');
    expect(answer).toMatchObject({
      wanted: null,
      items: [],
      old: { movedDays: null, then: { days: null, outcome: 'never-sets' } },
    });
  });
});

describe('the years of some markers', () => {
  it('are compared year by year', async () => {
    const { items } = (
      await observer
        .post(`/api/places/${place.id}/finder/years`, {
          years: [2027, 2028, 2029],
          markers: [
            { markerKey: 'pleiades', phenomenon: 'heliacal-rising' },
            { markerKey: 'hr424', phenomenon: 'heliacal-rising' },
          ],
        })
        .expect(200)
    ).body as YearsAnswer;
    expect(items.map(({ markerKey, year }) => `${markerKey} ${year}`)).toEqual([
      'pleiades 2027',
      'pleiades 2028',
      'pleiades 2029',
      'hr424 2027',
      'hr424 2028',
      'hr424 2029',
    ]);
    for (const { days, year } of items.slice(0, 3)) {
      const [day] = computeMarkerYear('pleiades', place, place, year).phenomena['heliacal-rising']
        .occurrences;
      expect(days?.expected.dayNumber).toBe(day?.expected.dayNumber);
    }
  });

  it('are refused beyond ten at a time, and for what is no marker, at the field', async () => {
    const ask = (years: number[], markerKey: string) =>
      observer.post(`/api/places/${place.id}/finder/years`, {
        years,
        markers: [{ markerKey, phenomenon: 'heliacal-rising' }],
      });
    const many = await ask(
      Array.from({ length: 11 }, (_, index) => 2027 + index),
      'pleiades',
    );
    expect([many.status, (many.body as Problem).errors?.[0]]).toMatchObject([
      422,
      { field: 'years', code: 'too-many' },
    ]);
    const unknown = await ask([2027], 'hr9999');
    expect((unknown.body as Problem).errors?.[0]).toMatchObject({
      field: 'markers.0.markerKey',
      code: 'unknown-marker',
    });
  });
});

describe('a question that cannot be answered', () => {
  it.each([
    ['year=2027', 'from', 'required'],
    ['year=2027&from=02-30', 'from', 'no-such-day'],
    ['year=2027&from=June', 'from', 'month-day'],
    ['year=2027&from=03-01&to=08-01', 'to', 'span-too-long'],
    ['year=1500&from=03-01', 'year', 'calendar-year'],
    ['year=2027&oldMarker=pleiades', 'since', 'required'],
    ['year=2027&oldMarker=pleiades&since=2027', 'since', 'not-before-year'],
    ['year=2027&oldMarker=hr9999&since=1500', 'oldMarker', 'unknown-marker'],
    ['year=2027&from=03-01&show=some', 'show', 'not-in-list'],
  ])('%s is refused at %s: %s', async (query, field, code) => {
    const answer = await observer.get(`/api/places/${place.id}/finder?${query}`);
    expect(answer.status).toBe(422);
    expect((answer.body as Problem).errors?.map((each) => [each.field, each.code])).toContainEqual([
      field,
      code,
    ]);
  });

  it('is not found from another village', async () => {
    const stranger = await api.signIn('officer2');
    await stranger.get(`/api/places/${place.id}/finder?year=2027&from=06-10`).expect(404);
  });
});
