import type { LookedEntry, LookedYear } from '#shared/contracts/decades.js';
import { civilDateFromIso, daysInMonth, dayNumberOf } from '#shared/kernel/iso-date.js';
import { sameDayLater } from '#shared/calendar/rolled-window.js';

/** Whole months, counted from January of the year in question: −1 is the December before it. */
export interface MonthSpan {
  first: number;
  last: number;
}

/** The months that hold an entry's days in every one of the years, so that all rows have the same scale. */
export function monthsOf({ years }: LookedEntry): MonthSpan | null {
  const months = years.flatMap(({ year, window }) =>
    window === null ? [] : [monthFrom(year, window.earliest), monthFrom(year, window.lastAdvised)],
  );
  return months.length === 0 ? null : { first: Math.min(...months), last: Math.max(...months) };
}

/** The same months of one year, as day numbers. */
export function spanIn(year: number, { first, last }: MonthSpan): { first: number; last: number } {
  const from = yearAndMonth(year, first);
  const to = yearAndMonth(year, last);
  return {
    first: dayNumberOf(from.year, from.month, 1),
    last: dayNumberOf(to.year, to.month, daysInMonth(to.year, to.month)),
  };
}

function monthFrom(year: number, iso: string): number {
  const date = civilDateFromIso(iso);
  return (date.year - year) * 12 + date.month - 1;
}

function yearAndMonth(year: number, month: number): { year: number; month: number } {
  return { year: year + Math.floor(month / 12), month: (((month % 12) + 12) % 12) + 1 };
}

export interface BestFromRange {
  /** The year in which its best days begin first, and that in which they begin last, by the day of the civil year. */
  first: LookedYear & { window: NonNullable<LookedYear['window']> };
  last: LookedYear & { window: NonNullable<LookedYear['window']> };
  yearsWithout: number;
}

/** Between which days its best days begin in all those years; null where no year has any. */
export function bestFromRange({ years }: LookedEntry): BestFromRange | null {
  const base = years[0]?.year ?? 0;
  const dated = years.filter((looked): looked is BestFromRange['first'] => looked.window !== null);
  const inOneYear = ({ year, window }: BestFromRange['first']) => sameDayLater(window.bestFrom, base - year);
  const sorted = dated.toSorted((a, b) =>
    inOneYear(a) < inOneYear(b) ? -1 : inOneYear(a) > inOneYear(b) ? 1 : 0,
  );
  const [first] = sorted;
  const last = sorted.at(-1);
  return first && last ? { first, last, yearsWithout: years.length - dated.length } : null;
}
