/** Days of the civil Gregorian calendar as the boards count them. Dates are `YYYY-MM-DD`. Pure integers. */

export interface CivilDate {
  readonly year: number;
  /** 1 to 12. */
  readonly month: number;
  /** 1 to 31. */
  readonly day: number;
}

/** 1 is Monday, 7 is Sunday. */
export type IsoWeekday = 1 | 2 | 3 | 4 | 5 | 6 | 7;

const MONTH_LENGTHS = [31, 28, 31, 30, 31, 30, 31, 31, 30, 31, 30, 31] as const;

export function isLeapYear(year: number): boolean {
  return (year % 4 === 0 && year % 100 !== 0) || year % 400 === 0;
}

/** Number of days of a month (1 to 12). */
export function daysInMonth(year: number, month: number): number {
  return month === 2 && isLeapYear(year) ? 29 : (MONTH_LENGTHS[month - 1] ?? 0);
}

export function daysInYear(year: number): number {
  return isLeapYear(year) ? 366 : 365;
}

export function isoOf(year: number, month: number, day: number): string {
  return `${String(year).padStart(4, '0')}-${String(month).padStart(2, '0')}-${String(day).padStart(2, '0')}`;
}

/** Reads `YYYY-MM-DD`. Throws RangeError for anything that is not a day of the calendar. */
export function civilDate(iso: string): CivilDate {
  const match = /^(\d{4})-(\d{2})-(\d{2})$/u.exec(iso);
  const [year, month, day] = match ? match.slice(1).map(Number) : [];
  if (year === undefined || month === undefined || day === undefined) {
    throw new RangeError(`"${iso}" is not a date of the form YYYY-MM-DD`);
  }
  if (day < 1 || day > daysInMonth(year, month)) throw new RangeError(`"${iso}" is no day of the calendar`);
  return { year, month, day };
}

/** Days from 0000-03-01, so that the leap day is the last of its counting year. Any steady count would do. */
export function dayCount(iso: string): number {
  const { year, month, day } = civilDate(iso);
  const shiftedYear = month > 2 ? year : year - 1;
  const shiftedMonth = (month + 9) % 12;
  return (
    365 * shiftedYear +
    Math.floor(shiftedYear / 4) -
    Math.floor(shiftedYear / 100) +
    Math.floor(shiftedYear / 400) +
    Math.floor((153 * shiftedMonth + 2) / 5) +
    day -
    1
  );
}

/** Number of the hole on a board that begins on 1 January: 1 to 365 or 366. */
export function dayOfYear(iso: string): number {
  return dayCount(iso) - dayCount(isoOf(civilDate(iso).year, 1, 1)) + 1;
}

export function weekdayOf(iso: string): IsoWeekday {
  // 2001-01-01 was a Monday.
  const days = dayCount(iso) - dayCount('2001-01-01');
  return ((((days % 7) + 7) % 7) + 1) as IsoWeekday;
}

/** The next years with a 29 February after the given one. */
export function nextLeapYears(after: number, howMany: number): number[] {
  const years: number[] = [];
  for (let year = after + 1; years.length < howMany; year += 1) if (isLeapYear(year)) years.push(year);
  return years;
}
