import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { Look } from '#shared/contracts/look.js';
import type { Place } from '#shared/contracts/places.js';
import type { Problem } from '#shared/contracts/problem.js';
import { computeMarkerYear, watchTimes } from '#shared/sky/index.js';
import { openTestApi, TEST_NOW, type Client, type TestApi } from '#tests/support/api.js';
import { asBuffer } from '#tests/support/bytes-of.js';
import { readPdfPages } from '#tests/support/pdf/pdf-content.js';
import { readPdfText } from '#tests/support/pdf/read-text.js';
import { addPlaceLike, firstPlace } from '#tests/support/place-api.js';

let api: TestApi;
let officer: Client;
let observer: Client;
let place: Place;
beforeAll(async () => {
  api = await openTestApi();
  officer = await api.signIn('officer');
  observer = await api.signIn('observer');
  place = await firstPlace(officer);
});
beforeEach(() => {
  api.clock.set(TEST_NOW);
});
afterAll(() => api.close());

type Query = Partial<Record<'marker' | 'phenomenon' | 'date', string>>;
const pathOf = (query: Query, at = place, ending = '') =>
  `/api/places/${at.id}/look${ending}?${new URLSearchParams({ marker: 'pleiades', ...query }).toString()}`;

async function look(query: Query, at = place, client = observer): Promise<Look> {
  return (await client.get(pathOf(query, at)).expect(200)).body as Look;
}
async function refusal(query: Query): Promise<Record<string, string>> {
  const { errors = [] } = (await observer.get(pathOf(query)).expect(422)).body as Problem;
  return Object.fromEntries(errors.map(({ field, code }) => [field, code]));
}
function expectedDay(markerKey: string, at = place): number {
  const [first] = computeMarkerYear(markerKey, at, at, 2027).phenomena['heliacal-rising'].occurrences;
  return first?.expected.dayNumber ?? 0;
}
/** `05:48` at the place's clock, three hours ahead. */
const clock = (jdUt: number | null) =>
  new Date(Math.floor(((jdUt ?? 0) - 2_440_587.5) * 1440 + 1e-5) * 60_000 + 3 * 3_600_000)
    .toISOString()
    .slice(11, 16);

describe('a first morning of the Pleiades over the hills', () => {
  it('says when it comes up, from when to when it is seen, and when to stop', async () => {
    const dayNumber = expectedDay('pleiades');
    const answer = await look({});
    expect(answer).toMatchObject({
      placeName: 'Upper terraces',
      marker: { name: 'Pleiades', kind: 'figure' },
      phenomenon: 'heliacal-rising',
      side: 'dawn',
      dayNumber,
      outcome: 'seen',
      sunCourse: 'sets-and-rises',
      limitAt: clock(watchTimes(place, dayNumber).stopLookingJdUt),
      comesUp: { when: 'in-watch' },
      season: { season: 'within', starOutcome: 'rises-and-sets', phenomenonOutcome: 'dated' },
      alternative: null,
    });
    const times = [
      answer.comesUp?.localTime,
      answer.seenFromAt,
      answer.best?.localTime,
      answer.seenToAt,
      answer.limitAt,
    ];
    expect([...times].sort()).toEqual(times);
    expect(answer.best?.isSeen).toBe(true);
    expect(answer.skyline).toEqual(place.skyline);
  });

  it('goes by the model of visibility, set by that day, with the model’s own opinion beside it', async () => {
    const { sight, date } = await look({});
    expect(sight).toMatchObject({
      by: 'model',
      because: null,
      phenomenon: 'heliacal-rising',
      expectedDate: date,
    });
    expect(Math.abs(sight.offsetMag ?? NaN)).toBeLessThan(3);
  });

  it('names Venus, which stands beside it and is brighter, and stars to start from', async () => {
    const { planets, pointers, moon } = await look({ date: '2027-06-08' });
    expect(planets.map(({ planet, isBrighter }) => ({ planet, isBrighter }))).toEqual([
      { planet: 'venus', isBrighter: true },
    ]);
    expect(pointers.map(({ name }) => name)).toContain('Hamal');
    expect(moon).toMatchObject({ shape: 'waxing-crescent', isUp: false, moonlight: 'none' });
  });
});

describe('the day', () => {
  it('is the next expected one while no day of the star is open', async () => {
    // In December 2026 the first morning of 2027 is the next.
    expect((await look({})).dayNumber).toBe(expectedDay('pleiades'));
  });

  it('is the coming morning while the days are open: today before the time to stop, then tomorrow', async () => {
    api.clock.set(new Date('2027-06-08T02:30:00Z'));
    const awake = await api.signIn('observer');
    expect((await look({}, place, awake)).date).toBe('2027-06-08');
    api.clock.set(new Date('2027-06-08T03:30:00Z'));
    expect((await look({}, place, awake)).date).toBe('2027-06-09');
  });

  it('stands within, before or after the star’s days, with the next ones told', async () => {
    expect((await look({ date: '2027-05-20' })).season).toMatchObject({ season: 'before' });
    const after = await look({ date: '2027-08-01' });
    expect(after.season.season).toBe('after');
    expect(after.season.days?.expected.gregorian).toMatch(/^2028-06-/u);
    // Two days after New Year Sirius’ last evening rising is days away, in whichever year it falls.
    const newYear = await look({ marker: 'hr2491', phenomenon: 'acronychal-rising', date: '2027-01-02' });
    expect(newYear.season.days).not.toBeNull();
  });

  it('is refused at its field where it does not exist or lies outside the years of calendars', async () => {
    expect(await refusal({ date: '2027-02-29' })).toEqual({ date: 'no-such-day' });
    expect(await refusal({ date: '2027-13-01' })).toEqual({ date: 'no-such-day' });
    expect(await refusal({ date: '1899-12-31' })).toEqual({ date: 'calendar-year' });
    expect(await refusal({ date: 'tomorrow' })).toEqual({ date: 'date-form' });
    expect((await look({ date: '2028-02-29' })).date).toBe('2028-02-29');
  });
});

describe('the star', () => {
  it('is refused at its field where it is none of the table', async () => {
    expect(await refusal({ marker: 'hr9999' })).toEqual({ marker: 'unknown-marker' });
    expect(await refusal({ marker: 'Sirius!' })).toEqual({ marker: 'marker-key' });
    expect(await refusal({ phenomenon: 'noon' })).toEqual({ phenomenon: 'not-in-list' });
  });

  it('that never rises says so and offers another that serves here', async () => {
    const northern = await addPlaceLike(officer, place, { name: 'Far north', latitudeDeg: 60, skyline: [] });
    const canopus = await look({ marker: 'hr2326', date: '2027-03-01' }, northern);
    expect(canopus).toMatchObject({
      outcome: 'never-clears-skyline',
      outcomeDetail: 'never-rises',
      season: { season: 'never', starOutcome: 'never-clears-skyline', days: null },
      best: null,
    });
    expect(canopus.alternative?.marker.markerKey).not.toBe('hr2326');
    expect(canopus.alternative?.days.expected.gregorian).toMatch(/^2027-/u);
  });

  it('that never sets is shown where it stands, and is no sign of the season', async () => {
    const northern = await addPlaceLike(officer, place, {
      name: 'Further north',
      latitudeDeg: 66,
      skyline: [],
    });
    const vega = await look({ marker: 'hr7001', date: '2027-11-24' }, northern);
    expect(vega).toMatchObject({ outcome: 'seen', season: { season: 'never', starOutcome: 'never-sets' } });
    expect(vega.alternative).not.toBeNull();
    const summer = await look({ marker: 'hr7001', date: '2027-06-21' }, northern);
    expect(summer).toMatchObject({ outcome: 'sun-stays-up', limitAt: null, path: [], moon: null });
  });

  it('behind high hills is looked for over the hills', async () => {
    const valley = await addPlaceLike(officer, place, {
      name: 'Deep valley',
      skyline: [{ azimuthDeg: 0, altitudeDeg: 25 }],
    });
    const { best, comesUp, limitAt } = await look({ date: '2027-06-25' }, valley);
    expect(best?.altitudeDeg).toBeGreaterThanOrEqual(25);
    // Stopping never waits for a Sun that the hills hide.
    expect(limitAt).toBe((await look({ date: '2027-06-25' })).limitAt);
    expect(comesUp).not.toBeNull();
  });
});

describe('the printed card', () => {
  async function card(query: Query): Promise<Buffer> {
    const answer = await observer
      .get(pathOf(query, place, '.pdf'))
      .buffer(true)
      .parse(asBuffer)
      .expect(200);
    expect(answer.headers['content-type']).toBe('application/pdf');
    expect(answer.headers['content-disposition']).toContain('2027-06-10_Pleiades.pdf');
    return answer.body as Buffer;
  }

  it('is one page of A5 that says the same, with the cautions', async () => {
    const file = await card({ date: '2027-06-10' });
    const pages = readPdfPages(file);
    expect(pages).toHaveLength(1);
    const text = readPdfText(file).replace(/\s+/gu, ' ');
    const { limitAt, seenFromAt, seenToAt } = await look({ date: '2027-06-10' });
    expect(text).toContain(`Stop at ${limitAt ?? '—'}`);
    expect(text).toContain(`seen from ${seenFromAt ?? '—'} to ${seenToAt ?? '—'}`);
    expect(text).toContain('Not Venus, a planet');
    expect(text).toMatch(/First morning seen: about 7.June.2027, between/u);
    expect(text).toContain('Eyes only: no phone camera, no binoculars, and never the Sun.');
    expect(text).toContain('Go in pairs');
    expect(text).toContain('Stars tell the season, not the rain.');
  });

  it('has the same bytes for the same question', async () => {
    expect((await card({ date: '2027-06-10' })).equals(await card({ date: '2027-06-10' }))).toBe(true);
  });
});
