import { describe, expect, it } from 'vitest';

import {
  computeMarkerYear,
  computeSkyMarker,
  moonYear,
  SkyRangeError,
  type SkyMarkerSpec,
  type SkyMarkerYear,
  venusYear,
} from '#shared/sky/index.js';
import { isOfYear, moonOccurrence } from '#shared/sky/sky-markers/moon-occurrence.js';
import { settingsWith, siteAt } from '#tests/support/sky/builders.js';

const [site, settings] = [siteAt(12, 39), settingsWith()];
const yearOf = (spec: SkyMarkerSpec, year = 2027, at = site): SkyMarkerYear =>
  computeSkyMarker(spec, at, settings, year);
const PLEIADES = { kind: 'moon-counted', markerKey: 'pleiades', phenomenon: 'heliacal-rising' } as const;

describe('the Moons of a year as markers', () => {
  it('are twelve or thirteen of each kind, those of the table of Moons', () => {
    for (const event of ['new', 'first-crescent', 'full'] as const) {
      const { occurrences, time } = yearOf({ kind: 'moon-phase', event });
      expect([12, 13]).toContain(occurrences.length);
      expect(time).toBe(event === 'first-crescent' ? 'evening' : 'day');
    }
    const fulls = moonYear(site, settings, 2027).lunations.map(({ fullMoon }) => fullMoon.dayNumber);
    for (const { expected } of yearOf({ kind: 'moon-phase', event: 'full' }).occurrences)
      expect(fulls).toContain(expected.dayNumber);
  });

  it('begin a crescent’s range with the first evening that the tests allow, and leave a day to miss it', () => {
    const { lunations } = moonYear(site, settings, 2027);
    for (const { expected, early, late } of yearOf({ kind: 'moon-phase', event: 'first-crescent' })
      .occurrences) {
      const lunation = lunations.find(
        ({ firstCrescent }) => firstCrescent.expected?.dayNumber === expected.dayNumber,
      );
      expect(early?.dayNumber).toBe(lunation?.firstCrescent.early?.dayNumber);
      expect(late?.dayNumber).toBeGreaterThan(expected.dayNumber);
    }
  });

  it('have a reason where the young Moon is never seen', () => {
    const canyon = siteAt(60, 0, { skyline: [{ azimuthDeg: 0, altitudeDeg: 60 }] });
    expect(yearOf({ kind: 'moon-phase', event: 'first-crescent' }, 2027, canyon)).toMatchObject({
      outcome: 'never-here',
      reason: 'crescent-not-seen',
      occurrences: [],
    });
  });

  it('belong to the year of their expected day', () => {
    const { lunations, firstDayNumber, lastDayNumber } = moonYear(site, settings, 2027);
    const [first] = lunations;
    if (!first) throw new Error('no Moon in 2027');
    const full = {
      event: 'full',
      expected: first.fullMoon,
      early: first.fullMoon,
      late: first.fullMoon,
      notes: [],
    } as const;
    const place = { year: { civil: { firstDay: firstDayNumber, lastDay: lastDayNumber } } } as never;
    expect(isOfYear(place, full)).toBe(true);
    const { expected, early, late } = moonOccurrence(first, full, first.fullMoon, first.fullMoon);
    expect([early?.dayNumber, late?.dayNumber]).toEqual([expected.dayNumber - 1, expected.dayNumber + 1]);
  });
});

describe('Moons counted from a star as markers', () => {
  const signDay = (year: number): number =>
    computeMarkerYear('pleiades', site, settings, year).phenomena['heliacal-rising'].occurrences[0]?.expected
      .dayNumber ?? 0;

  it('are the n-th on or after the star’s day', () => {
    const [first] = yearOf({ ...PLEIADES, event: 'full', count: 1 }).occurrences;
    const [second] = yearOf({ ...PLEIADES, event: 'full', count: 2 }).occurrences;
    const after = (first?.expected.dayNumber ?? 0) - signDay(2027);
    expect(after).toBeGreaterThanOrEqual(0);
    expect(after).toBeLessThan(30);
    expect((second?.expected.dayNumber ?? 0) - (first?.expected.dayNumber ?? 0)).toBeLessThan(31);
  });

  it('may lead into the next civil year', () => {
    const [ninth] = yearOf({ ...PLEIADES, event: 'new', count: 9 }).occurrences;
    expect(ninth?.expected.gregorian.year).toBe(2027);
    // June of the year before and eight Moons more.
    expect((ninth?.expected.dayNumber ?? 0) - signDay(2026)).toBeGreaterThan(8 * 29);
    expect((ninth?.expected.dayNumber ?? 0) - signDay(2026)).toBeLessThan(9 * 30);
  });

  it('have a range of a month, and are weak, where the star’s range crosses such a Moon', () => {
    const years = Array.from({ length: 12 }, (_, index) => 2024 + index);
    const ranges = years.flatMap((year) =>
      yearOf({ ...PLEIADES, event: 'new', count: 1 }, year).occurrences.map(({ early, late, notes }) => ({
        days: (late?.dayNumber ?? 0) - (early?.dayNumber ?? 0),
        notes,
      })),
    );
    // The range is eight days long and a Moon comes every thirty: about one year in four.
    const wide = ranges.filter(({ days }) => days > 21);
    expect(wide.length).toBeGreaterThanOrEqual(1);
    expect(wide.length).toBeLessThanOrEqual(6);
    expect(wide.every(({ notes }) => notes.includes('weak-marker'))).toBe(true);
    expect(ranges.filter(({ days }) => days === 2).length).toBe(ranges.length - wide.length);
  });

  it('need a star that comes and goes, and a count that a year can hold', () => {
    const spec = {
      kind: 'moon-counted',
      markerKey: 'hr424',
      phenomenon: 'heliacal-rising',
      event: 'full',
    } as const;
    expect(yearOf({ ...spec, count: 1 }, 2027, siteAt(66, 23))).toMatchObject({
      outcome: 'never-here',
      reason: 'star-gives-no-sign',
    });
    expect(() => yearOf({ ...spec, count: 14 })).toThrow(SkyRangeError);
    expect(() => yearOf({ ...spec, markerKey: 'hr9999', count: 1 })).toThrow(SkyRangeError);
  });
});

describe('Venus as a marker', () => {
  it('comes on the day of its year, never surer than a day to either side', () => {
    const spec = { kind: 'venus-appearance', appearance: 'morning-first' } as const;
    const [known] = venusYear(site, settings, 2026).appearances['morning-first'].occurrences;
    const found = yearOf(spec, 2026);
    const [occurrence] = found.occurrences;
    expect(found).toMatchObject({ time: 'morning', sourceKey: 'Ptolemy', basis: { toleranceDeg: 1.5 } });
    expect(occurrence?.expected.dayNumber).toBe(known?.expected.dayNumber);
    expect(occurrence?.early?.dayNumber).toBeLessThan(occurrence?.expected.dayNumber ?? 0);
    expect(occurrence?.late?.dayNumber).toBeGreaterThan(occurrence?.expected.dayNumber ?? 0);
  });

  it('has years without, because its round takes nineteen months', () => {
    expect(yearOf({ kind: 'venus-appearance', appearance: 'morning-last' }, 2026)).toMatchObject({
      outcome: 'none-in-this-year',
      reason: 'not-in-this-year',
    });
  });
});
