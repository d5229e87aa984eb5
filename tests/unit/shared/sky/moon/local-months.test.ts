import { describe, expect, it } from 'vitest';

import {
  computeMarkerYear,
  localMonths,
  type LocalMonth,
  type MonthSign,
  moonDayOf,
  type MoonDay,
  moonsBetween,
  SkyRangeError,
} from '#shared/sky/index.js';
import { localMonthsOf } from '#shared/sky/moon/local-months.js';
import { gregorianOf, julianOf } from '#shared/sky/time/julian-day.js';
import { settingsWith, siteAt } from '#tests/support/sky/builders.js';

const labelled = (dayNumber: number) => ({
  dayNumber,
  gregorian: gregorianOf(dayNumber),
  julian: julianOf(dayNumber),
});
function moonOn(dayNumber: number): MoonDay {
  const day = labelled(dayNumber);
  return { event: 'first-crescent', expected: day, early: day, late: day, notes: [] };
}
function signOn(dayNumber: number, atDawn = false, reach = 0): MonthSign {
  const [expected, early, late] = [dayNumber, dayNumber - reach, dayNumber + reach].map(labelled);
  if (!expected || !early || !late) throw new Error('three days');
  return { expected, early, late, atDawn };
}

/** Moons thirty days apart from day 2,461,000 on: month k begins on 2,461,000 + 30 k. */
const START = 2_461_000;
const begins = Array.from({ length: 40 }, (_, index) => moonOn(START + 30 * index));
const numbers = (months: LocalMonth[]): number[] => months.map(({ number }) => number);

describe('months kept to the seasons by a star', () => {
  it('count twelve when the sign falls in the twelfth month on, and put a thirteenth in when it falls after it', () => {
    // Held by months 2, 14 and 27: first a year of twelve, then one of thirteen.
    const signs = [signOn(START + 65), signOn(START + 430), signOn(START + 815)];
    const months = localMonths(begins, signs, 1);
    expect(numbers(months)).toEqual([
      ...[1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 12],
      ...[1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 12, 13],
    ]);
    expect(months.filter(({ thirteenth }) => thirteenth)).toHaveLength(1);
    expect(months.filter(({ holdsSign }) => holdsSign).map(({ number }) => number)).toEqual([1, 1]);
  });

  it('put it in right before the month that must hold the sign, and the year turns at month 1', () => {
    const signs = [signOn(START + 65), signOn(START + 455)];
    const months = localMonthsOf(begins, signs, 3);
    expect(numbers(months)).toEqual([3, 4, 5, 6, 7, 8, 9, 10, 11, 12, 1, 2, 13]);
    const years = months.map(({ localYear }) => localYear);
    expect(years.slice(0, 10)).toEqual(new Array(10).fill(years[0]));
    expect(years.slice(10)).toEqual(new Array(3).fill((years[0] ?? 0) + 1));
  });

  it('give a sign of the morning to the month that began on an evening before it', () => {
    const onTheTurn = START + 60;
    const dusk = localMonthsOf(begins, [signOn(onTheTurn), signOn(onTheTurn + 360)], 1);
    const dawn = localMonthsOf(begins, [signOn(onTheTurn, true), signOn(onTheTurn + 360, true)], 1);
    expect(dusk[0]?.begins.expected.dayNumber).toBe(onTheTurn);
    expect(dawn[0]?.begins.expected.dayNumber).toBe(onTheTurn - 30);
  });

  it('say when the range of the sign reaches over the turn of a month', () => {
    const months = localMonthsOf(begins, [signOn(START + 62, false, 4), signOn(START + 437, false, 4)], 1);
    expect(months[0]?.signNearEdge).toBe(true);
    expect(months.slice(1).some(({ signNearEdge }) => signNearEdge)).toBe(false);
  });

  it('name no month where a sign is missing for a year, and refuse a month that is none', () => {
    expect(localMonthsOf(begins, [signOn(START + 65), signOn(START + 65 + 720)], 1)).toEqual([]);
    expect(localMonthsOf(begins, [], 1)).toEqual([]);
    expect(() => localMonths(begins, [], 13)).toThrow(SkyRangeError);
  });

  it('put seven thirteenth months into nineteen years by the Pleiades’ first morning', () => {
    const [site, settings] = [siteAt(12, 39), settingsWith()];
    const years = Array.from({ length: 20 }, (_, index) => 2020 + index);
    const signs = years.flatMap((year) =>
      computeMarkerYear('pleiades', site, settings, year).phenomena['heliacal-rising'].occurrences.map(
        (occurrence) => ({ ...occurrence, atDawn: true }),
      ),
    );
    const [first, last] = [signs[0], signs.at(-1)];
    if (!first || !last) throw new Error('no signs');
    const moons = moonsBetween(site, settings, first.expected.dayNumber - 40, last.expected.dayNumber + 40)
      .map((lunation) => moonDayOf(lunation, 'first-crescent'))
      .filter((moon) => moon !== null);
    const months = localMonths(moons, signs, 1);
    // 235 months are nineteen years: twelve years of twelve and seven of thirteen, one more or less at the edges.
    expect(months.length).toBeGreaterThanOrEqual(234);
    expect(months.length).toBeLessThanOrEqual(236);
    expect(Math.abs(months.filter(({ thirteenth }) => thirteenth).length - 7)).toBeLessThanOrEqual(1);
  });
});
