import { parse } from 'csv-parse/sync';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { MoonTable } from '#shared/contracts/moons.js';
import type { Place } from '#shared/contracts/places.js';
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

const moonsOf = async (query: string, { id }: Place = place): Promise<MoonTable> =>
  (await observer.get(`/api/places/${id}/moons?${query}`).expect(200)).body as MoonTable;

describe('the Moons of a place', () => {
  it('are those of the year with their ranges, unnumbered without a sign', async () => {
    const table = await moonsOf('year=2027');
    expect(table.moons).toHaveLength(13);
    expect(table.rule).toBeNull();
    for (const { newMoon, firstCrescent, fullMoon, month } of table.moons) {
      expect(month).toBeNull();
      expect(newMoon.dayNumber).toBeLessThan(fullMoon.dayNumber);
      const { early, expected, late } = firstCrescent;
      expect(early?.dayNumber).toBeLessThanOrEqual(expected?.dayNumber ?? 0);
      expect(late?.dayNumber).toBeGreaterThanOrEqual(expected?.dayNumber ?? Infinity);
      expect(['easy', 'if-air-is-clear']).toContain(expected?.word);
    }
  });

  it('are numbered from a sign, each month once, with a thirteenth where one is needed', async () => {
    const years = await Promise.all(
      [2024, 2025, 2026, 2027, 2028].map((year) => moonsOf(`year=${year}&marker=pleiades`)),
    );
    const months = new Map(
      years
        .flatMap(({ moons }) => moons.flatMap(({ month }) => month ?? []))
        .map((month) => [month.begins.dayNumber, month]),
    );
    const inOrder = [...months.values()].sort((a, b) => a.begins.dayNumber - b.begins.dayNumber);
    inOrder.slice(1).forEach((month, index) => {
      const before = inOrder[index]?.number ?? 0;
      const follows = month.number === before + 1 || (month.number === 1 && before >= 12);
      expect(follows, `${before} → ${month.number}`).toBe(true);
    });
    // Five years of the Pleiades: at least one and at most two months were put in.
    const put = inOrder.filter(({ thirteenth }) => thirteenth).length;
    expect(put).toBeGreaterThanOrEqual(1);
    expect(put).toBeLessThanOrEqual(2);
  });

  it('let another month hold the sign and begin with another Moon', async () => {
    const { moons, rule } = await moonsOf('year=2027&marker=hr2491&month=4&begins=full');
    expect(rule).toMatchObject({ signMonth: 4, begins: 'full', phenomenon: 'heliacal-rising' });
    expect(moons.find(({ month }) => month?.holdsSign)?.month).toMatchObject({ number: 4, beginsBy: 'full' });
  });

  it('give a reason in the far north, and count on from the new Moon where the crescent is not seen', async () => {
    const north = await addPlaceLike(officer, place, { name: 'Ice', latitudeDeg: 66, skyline: [] });
    const { moons } = await moonsOf('year=2027&marker=hr1713', north);
    const unseen = moons.filter(({ firstCrescent }) => firstCrescent.outcome !== 'dated');
    expect(unseen.length).toBeGreaterThan(2);
    expect(unseen.every(({ firstCrescent }) => firstCrescent.expected === null)).toBe(true);
    expect(unseen.some(({ month }) => month?.beginsBy === 'new')).toBe(true);
    const { rule } = await moonsOf('year=2027&marker=hr7001', north);
    expect(rule).toMatchObject({ starOutcome: 'never-sets', signs: [] });
  });

  it('come with Venus: in any two years each of its four turning points at least once', async () => {
    const both = [...(await moonsOf('year=2026')).venus, ...(await moonsOf('year=2027')).venus];
    for (const appearance of ['morning-first', 'morning-last', 'evening-first', 'evening-last']) {
      expect(both.some((line) => line.appearance === appearance && line.outcome === 'dated')).toBe(true);
    }
  });

  it('refuse a star that is in no table, a month that is none and a year beyond the engine', async () => {
    const refused = async (query: string) => {
      const answer = await observer.get(`/api/places/${place.id}/moons?${query}`).expect(422);
      return (answer.body as { errors: { field: string; code: string }[] }).errors.map(({ field, code }) => [
        field,
        code,
      ]);
    };
    expect(await refused('year=2027&marker=hr9999')).toEqual([['marker', 'unknown-marker']]);
    expect(await refused('year=2027&marker=pleiades&month=13')).toEqual([['month', 'moon-month']]);
    expect(await refused('year=4000')).toEqual([['year', 'year-range']]);
  });
});

describe('the Moons as CSV', () => {
  it('have the rule and the citation on every line, and the days of the table', async () => {
    const { text, headers } = await observer
      .get(`/api/places/${place.id}/moons.csv?year=2027&marker=pleiades`)
      .buffer(true)
      .expect(200);
    expect(headers['content-type']).toBe('text/csv; charset=utf-8');
    expect(decodeURIComponent(headers['content-disposition'] ?? '')).toContain(
      'Upper terraces 2027 moons.csv',
    );
    const lines = parse<Record<string, string>>(text, { bom: true, columns: true });
    const { moons } = await moonsOf('year=2027&marker=pleiades');
    expect(lines.map((line) => line['first crescent: expected evening'])).toEqual(
      moons.map(({ firstCrescent }) => firstCrescent.expected?.gregorian ?? ''),
    );
    expect(lines.every((line) => line['cite as']?.includes('Yallop 1997'))).toBe(true);
    expect(
      lines.every((line) => line['rule of the months']?.startsWith('Pleiades, first morning seen')),
    ).toBe(true);
    expect(lines.filter((line) => line['month: remark']?.includes('thirteenth'))).toHaveLength(1);
  });
});
