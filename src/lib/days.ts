/** Days as whole numbers: the Julian Day Number of a civil day (the Julian Day at its noon). */

export interface PlainDate {
  /** Astronomical year: 0 is 1 BC. */
  year: number;
  month: number;
  day: number;
}

const UNIX_EPOCH_DAY_NUMBER = 2_440_588;
const DAY_MS = 86_400_000;

/** Reads `YYYY-MM-DD`, with a leading minus for years before 1 BC; null for anything else. */
export function readDate(iso: string): PlainDate | null {
  const match = /^(-?\d{4,6})-(\d{2})-(\d{2})$/u.exec(iso);
  if (!match) return null;
  return { year: Number(match[1]), month: Number(match[2]), day: Number(match[3]) };
}

/** Gregorian date, also before 1583 (proleptic), as UTC midnight. Date.UTC reads years 0 to 99 as 19xx. */
export function utcDate({ year, month, day }: PlainDate): Date {
  const date = new Date(0);
  date.setUTCFullYear(year, month - 1, day);
  return date;
}

export function dayNumberOf(date: PlainDate): number {
  return Math.round(utcDate(date).getTime() / DAY_MS) + UNIX_EPOCH_DAY_NUMBER;
}

export function dateOfDayNumber(dayNumber: number): PlainDate {
  const date = new Date((dayNumber - UNIX_EPOCH_DAY_NUMBER) * DAY_MS);
  return { year: date.getUTCFullYear(), month: date.getUTCMonth() + 1, day: date.getUTCDate() };
}

export function isoOf({ year, month, day }: PlainDate): string {
  const sign = year < 0 ? '-' : '';
  return `${sign}${String(Math.abs(year)).padStart(4, '0')}-${pad(month)}-${pad(day)}`;
}

/** The present civil day in a time zone; the device's own without one. */
export function todayIn(timeZone: string | null, now: Date = new Date()): PlainDate {
  const parts = new Intl.DateTimeFormat('en-CA', {
    year: 'numeric',
    month: '2-digit',
    day: '2-digit',
    ...(timeZone === null ? {} : { timeZone }),
  }).formatToParts(now);
  const part = (type: string) => Number(parts.find((each) => each.type === type)?.value);
  return { year: part('year'), month: part('month'), day: part('day') };
}

function pad(value: number): string {
  return String(value).padStart(2, '0');
}
