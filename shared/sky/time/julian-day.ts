import type { CalendarDate } from '../types.js';

/**
 * Day numbers and calendar labels. A day number is the Julian Day at the noon of that day, so it has no fraction.
 * Years are astronomical (0 = 1 BC) and may be negative; both calendars are proleptic. The arithmetic counts days
 * from 1 March, so that the leap day stands at the end of the counted year; it is exact for every integer year.
 */

export const CALENDARS = ['gregorian', 'julian'] as const;
export type Calendar = (typeof CALENDARS)[number];

/** Julian Day of J2000.0. */
export const JD_J2000 = 2_451_545;

/** Day number of 1 March of the year 0. */
const MARCH_YEAR_ZERO = { gregorian: 1_721_120, julian: 1_721_118 } as const;

const DAYS_IN_400_YEARS = 146_097;
const DAYS_IN_100_YEARS = 36_524;
const DAYS_IN_4_YEARS = 1_461;

/** Days from 1 March to the first of the month that comes `monthFromMarch` months later (0…11). */
function daysBeforeMonth(monthFromMarch: number): number {
  return Math.floor((153 * monthFromMarch + 2) / 5);
}

/** Month and day from the day of the counted year (0 = 1 March). */
function dateInMarchYear(marchYear: number, dayOfYear: number): CalendarDate {
  const monthFromMarch = Math.floor((5 * dayOfYear + 2) / 153);
  const month = monthFromMarch < 10 ? monthFromMarch + 3 : monthFromMarch - 9;
  return {
    year: month <= 2 ? marchYear + 1 : marchYear,
    month,
    day: dayOfYear - daysBeforeMonth(monthFromMarch) + 1,
  };
}

/** Day number of a calendar date. The date is taken as it is: 31 June answers the day after 30 June. */
export function dayNumberOf(date: CalendarDate, calendar: Calendar): number {
  const marchYear = date.month <= 2 ? date.year - 1 : date.year;
  const monthFromMarch = date.month <= 2 ? date.month + 9 : date.month - 3;
  const leapDays =
    calendar === 'julian'
      ? Math.floor(marchYear / 4)
      : Math.floor(marchYear / 4) - Math.floor(marchYear / 100) + Math.floor(marchYear / 400);
  return (
    MARCH_YEAR_ZERO[calendar] + 365 * marchYear + leapDays + daysBeforeMonth(monthFromMarch) + date.day - 1
  );
}

/** Proleptic Gregorian label of a day number. */
export function gregorianOf(dayNumber: number): CalendarDate {
  const sinceMarchZero = dayNumber - MARCH_YEAR_ZERO.gregorian;
  const era = Math.floor(sinceMarchZero / DAYS_IN_400_YEARS);
  const dayOfEra = sinceMarchZero - era * DAYS_IN_400_YEARS;
  // The last day of a fourth century and of a fourth year would otherwise open a fifth one.
  const century = Math.min(3, Math.floor(dayOfEra / DAYS_IN_100_YEARS));
  const dayOfCentury = dayOfEra - century * DAYS_IN_100_YEARS;
  const quad = Math.floor(dayOfCentury / DAYS_IN_4_YEARS);
  const dayOfQuad = dayOfCentury - quad * DAYS_IN_4_YEARS;
  const yearOfQuad = Math.min(3, Math.floor(dayOfQuad / 365));
  return dateInMarchYear(400 * era + 100 * century + 4 * quad + yearOfQuad, dayOfQuad - 365 * yearOfQuad);
}

/** Proleptic Julian label of a day number. */
export function julianOf(dayNumber: number): CalendarDate {
  const sinceMarchZero = dayNumber - MARCH_YEAR_ZERO.julian;
  const quad = Math.floor(sinceMarchZero / DAYS_IN_4_YEARS);
  const dayOfQuad = sinceMarchZero - quad * DAYS_IN_4_YEARS;
  const yearOfQuad = Math.min(3, Math.floor(dayOfQuad / 365));
  return dateInMarchYear(4 * quad + yearOfQuad, dayOfQuad - 365 * yearOfQuad);
}
