import type { CivilDay } from '#shared/contracts/stars.js';
import { FIRST_YEAR, LAST_YEAR } from '#shared/sky/vocabulary.js';
import { readDate, type PlainDate } from './days.js';

/** From this year on civil dates are Gregorian; before it the Julian calendar is meant. */
export const FIRST_GREGORIAN_YEAR = 1583;

export function isJulian(year: number): boolean {
  return year < FIRST_GREGORIAN_YEAR;
}

/**
 * The date that people of a year would have written. Julian dates are laid onto the years round 2000 before they go
 * to the browser's own calendar, which is Gregorian throughout: 29 February 1500 would otherwise read 1 March. Their
 * year is therefore never shown from here.
 */
export function civilDate(day: CivilDay, year: number): PlainDate {
  const date = readDate(isJulian(year) ? day.julian : day.gregorian);
  if (date === null) throw new TypeError(`Not a date: ${day.gregorian}`);
  return isJulian(year) ? { ...date, year: 2000 + date.year - year } : date;
}

const MONTH_DAYS = [31, 28, 31, 30, 31, 30, 31, 31, 30, 31, 30, 31] as const;

/** Where the months of a civil year begin, by day number. */
export function monthStarts(year: number, firstDayNumber: number): { dayNumber: number; days: number }[] {
  let dayNumber = firstDayNumber;
  return MONTH_DAYS.map((usual, index) => {
    const days = index === 1 && isLeap(year) ? 29 : usual;
    const month = { dayNumber, days };
    dayNumber += days;
    return month;
  });
}

/** The civil date of a day number within a civil year, whose months begin as `monthStarts` says. */
export function dateWithin(
  dayNumber: number,
  year: number,
  months: readonly { dayNumber: number }[],
): PlainDate {
  let index = 0;
  months.forEach((month, at) => {
    if (dayNumber >= month.dayNumber) index = at;
  });
  const day = dayNumber - (months[index]?.dayNumber ?? dayNumber) + 1;
  return { year: isJulian(year) ? 2000 : year, month: index + 1, day };
}

function isLeap(year: number): boolean {
  if (isJulian(year)) return mod(year, 4) === 0;
  return mod(year, 4) === 0 && (mod(year, 100) !== 0 || mod(year, 400) === 0);
}

function mod(value: number, by: number): number {
  return ((value % by) + by) % by;
}

/**
 * Reads a year as people type it: `2027`, `-43`, `44 BC`, `44 BCE`, `AD 14`. There is no year 0 among BC years:
 * 1 BC is the astronomical year 0.
 * @returns the astronomical year, or null where it is none or beyond what the engine offers
 */
export function readYear(text: string): number | null {
  const found = /^(?:ad|ce)?\s*([-−–]?\d{1,4})\s*(bce?|b\.c\.(?:e\.)?|ad|ce)?$/iu.exec(text.trim());
  if (found === null) return null;
  const number = Number((found[1] ?? '').replace(/[−–]/u, '-'));
  const isBefore = (found[2] ?? '').toLowerCase().startsWith('b');
  if (isBefore && number < 1) return null;
  const year = isBefore ? 1 - number : number;
  return year >= FIRST_YEAR && year <= LAST_YEAR ? year + 0 : null;
}
