import { describe, expect, it } from 'vitest';

import { type Calendar, dayNumberOf, gregorianOf, julianOf } from '#shared/sky/time/julian-day.js';

/** Day numbers from Meeus 1998, chapter 7 (Julian Days there begin at noon), and from the definition of the count. */
const KNOWN: [number, number, number, Calendar, number][] = [
  [-4712, 1, 1, 'julian', 0],
  [-1000, 7, 12, 'julian', 1_356_001],
  [-122, 1, 1, 'julian', 1_676_498],
  [0, 2, 29, 'julian', 1_721_117],
  [837, 4, 10, 'julian', 2_026_872],
  [1582, 10, 4, 'julian', 2_299_160],
  [1582, 10, 15, 'gregorian', 2_299_161],
  [1600, 1, 1, 'gregorian', 2_305_448],
  [1987, 6, 19, 'gregorian', 2_446_966],
  [2000, 1, 1, 'gregorian', 2_451_545],
];

describe('day numbers', () => {
  it.each(KNOWN)('of %i-%i-%i (%s) are the published ones', (year, month, day, calendar, dayNumber) => {
    expect(dayNumberOf({ year, month, day }, calendar)).toBe(dayNumber);
    expect((calendar === 'julian' ? julianOf : gregorianOf)(dayNumber)).toEqual({ year, month, day });
  });

  it('and labels lead back to each other on every day around leap days, new years and the year 0', () => {
    for (const start of [-1_000_000, 625_000, 1_721_000, 2_299_000, 2_451_000, 2_816_000]) {
      for (let day = start; day < start + 1600; day += 1) {
        expect(dayNumberOf(gregorianOf(day), 'gregorian')).toBe(day);
        expect(dayNumberOf(julianOf(day), 'julian')).toBe(day);
      }
    }
  });

  it('give 29 February to every fourth Julian year but not to Gregorian centuries', () => {
    const isLeap = (year: number, calendar: Calendar): boolean =>
      dayNumberOf({ year, month: 3, day: 1 }, calendar) -
        dayNumberOf({ year, month: 2, day: 28 }, calendar) ===
      2;
    expect([1900, 2000, 2027, 2028, -4].map((year) => isLeap(year, 'gregorian'))).toEqual([
      false,
      true,
      false,
      true,
      true,
    ]);
    expect([1900, 0, -1, -4].map((year) => isLeap(year, 'julian'))).toEqual([true, true, false, true]);
  });

  it('stand ten days apart in 1582 and thirteen today', () => {
    expect(julianOf(2_299_161)).toEqual({ year: 1582, month: 10, day: 5 });
    expect(julianOf(dayNumberOf({ year: 2027, month: 1, day: 14 }, 'gregorian'))).toEqual({
      year: 2027,
      month: 1,
      day: 1,
    });
  });
});
