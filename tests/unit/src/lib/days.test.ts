import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { dateOfDayNumber, dayNumberOf, isoOf, readDate, todayIn, utcDate } from '#src/lib/days.js';

describe('day numbers', () => {
  it('count like the Julian Day at noon: 1 January 2000 is 2451545', () => {
    // The J2000 epoch: JD 2451545.0 is 2000 January 1, 12 h (definition by the IAU).
    expect(dayNumberOf({ year: 2000, month: 1, day: 1 })).toBe(2_451_545);
  });

  it('follow the Gregorian rule backwards before 1583', () => {
    // Day 0 began at noon of 24 November 4714 BC in the proleptic Gregorian calendar (year −4713).
    expect(dayNumberOf({ year: -4713, month: 11, day: 24 })).toBe(0);
  });

  it('do not take the years 0 to 99 for the twentieth century', () => {
    expect(utcDate({ year: 50, month: 3, day: 1 }).getUTCFullYear()).toBe(50);
  });

  it('come back as the same date, and their text reads back, over the years the engine offers', () => {
    fc.assert(
      fc.property(fc.integer({ min: 625_000, max: 2_817_000 }), (dayNumber) => {
        const date = dateOfDayNumber(dayNumber);
        expect(dayNumberOf(date)).toBe(dayNumber);
        expect(readDate(isoOf(date))).toEqual(date);
      }),
    );
  });
});

describe('readDate', () => {
  it('answers null for what is no date', () => {
    expect(readDate('7 June')).toBeNull();
    expect(readDate('2027-6-7')).toBeNull();
  });
});

describe('todayIn', () => {
  it('is the civil day at the place, not on the device', () => {
    const lateEveningUtc = new Date('2027-06-06T22:30:00Z');
    expect(todayIn('Africa/Nairobi', lateEveningUtc)).toEqual({ year: 2027, month: 6, day: 7 });
    expect(todayIn('America/La_Paz', lateEveningUtc)).toEqual({ year: 2027, month: 6, day: 6 });
  });
});
