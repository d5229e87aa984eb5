import { describe, expect, it } from 'vitest';
import {
  civilDate,
  dayCount,
  dayOfYear,
  daysInYear,
  isLeapYear,
  isoOf,
  nextLeapYears,
  weekdayOf,
} from '#shared/sheet/civil-days.js';

describe('days of the civil calendar', () => {
  it('follow each other by one, and fall on the weekdays that the machine’s own calendar gives', () => {
    const start = Date.UTC(1899, 11, 1);
    let before = dayCount('1899-11-30');
    for (let index = 0; index < 366 * 5; index += 1) {
      const date = new Date(start + index * 86_400_000);
      const iso = date.toISOString().slice(0, 10);
      expect(dayCount(iso)).toBe(before + 1);
      expect(weekdayOf(iso)).toBe(date.getUTCDay() === 0 ? 7 : date.getUTCDay());
      before = dayCount(iso);
    }
  });

  it('have 29 February by the Gregorian rule', () => {
    expect([1900, 2000, 2024, 2027, 2100, 2200].map(isLeapYear)).toEqual([
      false,
      true,
      true,
      false,
      false,
      false,
    ]);
    expect([daysInYear(2027), daysInYear(2028)]).toEqual([365, 366]);
  });

  it('number the holes of a board from 1 January', () => {
    expect(dayOfYear('2027-01-01')).toBe(1);
    expect(dayOfYear('2027-06-01')).toBe(152);
    expect(dayOfYear('2027-12-31')).toBe(365);
    expect(dayOfYear('2028-12-31')).toBe(366);
  });

  it('know the next leap years, over a century without one too', () => {
    expect(nextLeapYears(2028, 3)).toEqual([2032, 2036, 2040]);
    expect(nextLeapYears(2096, 2)).toEqual([2104, 2108]);
  });

  it.each(['2027-02-29', '2027-13-01', '2027-00-10', '2027-04-31', '7 June', '2027-6-7'])(
    'refuse %s',
    (text) => {
      expect(() => civilDate(text)).toThrow(RangeError);
    },
  );

  it('are written with all their figures', () => {
    expect(isoOf(2027, 6, 7)).toBe('2027-06-07');
  });
});
