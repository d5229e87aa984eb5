import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  addDays,
  civilDateOf,
  dayNumberFromIso,
  dayNumberOf,
  dayOfYear,
  daysBetween,
  daysInMonth,
  daysInYear,
  isLeapYear,
  isoDateOf,
} from '#shared/kernel/iso-date.js';

const MS_PER_DAY = 86_400_000;
/** Julian Day Number of 1970-01-01 (Julian Day 2440587.5 at midnight, 2440588 at noon): definition of Unix time. */
const UNIX_EPOCH_DAY = 2_440_588;

describe('day numbers', () => {
  // Julian Day of J2000.0 (IAU) and of the Modified Julian Day's origin (SAO/IAU): definitions.
  it.each([
    ['2000-01-01', 2_451_545],
    ['1858-11-17', 2_400_001],
    ['1970-01-01', UNIX_EPOCH_DAY],
  ])('%s has the number of its definition', (iso, dayNumber) => {
    expect(dayNumberFromIso(iso)).toBe(dayNumber);
    expect(isoDateOf(dayNumber)).toBe(iso);
  });

  it('agree with the platform on every day from 1 January 0100 to 31 December 9999', () => {
    const first = dayNumberOf(100, 1, 1);
    const last = dayNumberOf(9999, 12, 31);
    fc.assert(
      fc.property(fc.integer({ min: first, max: last }), (dayNumber) => {
        const platform = new Date((dayNumber - UNIX_EPOCH_DAY) * MS_PER_DAY);
        expect(isoDateOf(dayNumber)).toBe(platform.toISOString().slice(0, 10));
      }),
      { numRuns: 2000, seed: 11 },
    );
  });

  it('come back unchanged for every day of 400 years', () => {
    const first = dayNumberOf(1900, 1, 1);
    let expected = first;
    for (let year = 1900; year < 2300; year += 1) {
      for (let month = 1; month <= 12; month += 1) {
        for (let day = 1; day <= daysInMonth(year, month); day += 1) {
          if (dayNumberOf(year, month, day) !== expected) expect.fail(`${year}-${month}-${day}`);
          const back = civilDateOf(expected);
          if (back.year !== year || back.month !== month || back.day !== day)
            expect.fail(isoDateOf(expected));
          expected += 1;
        }
      }
    }
    expect(expected - first).toBe(146_097);
  });

  it('are refused for dates that do not exist', () => {
    expect(() => dayNumberFromIso('2027-02-29')).toThrow(RangeError);
    expect(() => dayNumberFromIso('2027-13-01')).toThrow(RangeError);
    expect(() => dayNumberFromIso('2027-04-00')).toThrow(RangeError);
    expect(() => dayNumberFromIso('7 June 2027')).toThrow(RangeError);
    expect(() => dayNumberOf(10_000, 1, 1)).toThrow(RangeError);
    expect(() => civilDateOf(2_451_545.5)).toThrow(RangeError);
    expect(() => isoDateOf(dayNumberOf(9999, 12, 31) + 1)).toThrow(RangeError);
  });
});

describe('years', () => {
  it('have a leap day by the Gregorian rule', () => {
    expect([1900, 2000, 2027, 2028, 2100].map(isLeapYear)).toEqual([false, true, false, true, false]);
    expect([2027, 2028].map(daysInYear)).toEqual([365, 366]);
  });

  it('count their days from 1 to the last', () => {
    expect(['2027-01-01', '2027-12-31', '2028-02-29', '2028-12-31'].map(dayOfYear)).toEqual([
      1, 365, 60, 366,
    ]);
  });
});

describe('steps', () => {
  it('cross the ends of months and years both ways', () => {
    expect(addDays('2027-12-28', 5)).toBe('2028-01-02');
    expect(addDays('2028-01-02', -5)).toBe('2027-12-28');
    expect(addDays('2028-02-28', 1)).toBe('2028-02-29');
    expect(daysBetween('2028-01-02', '2027-12-28')).toBe(-5);
  });
});
