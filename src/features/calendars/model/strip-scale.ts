import { localMonthStarts } from '#shared/calendar/local-months.js';
import type { LocalMonth } from '#shared/contracts/local-months.js';
import { dateOfDayNumber, utcDate } from '#src/lib/days.js';
import type { DaySpan } from '#src/ui/pictures/day-span.js';
import type { ScaleMonth } from '#src/ui/pictures/month-scale.js';

/** A part of a second scale: a Moon, a market week, a month of another calendar. */
export interface ScalePart extends ScaleMonth {
  /** What it is in the reader's language; empty where its own name says all. */
  long: string;
  /** What the village calls it, in its own language. */
  ownName?: string;
}

type Start = Omit<ScalePart, 'days'>;

export const MARKET_DAYS_MIN = 2;
export const MARKET_DAYS_MAX = 20;

/**
 * Weeks of so many days, counted from a market day; the first one may have begun before the span.
 * @param name what a week is called, by its first day and its number from the market day, which is 0
 */
export function marketWeeks(
  span: DaySpan,
  weekDays: number,
  marketDay: number,
  name: (firstDay: number, number: number) => Pick<ScalePart, 'short' | 'narrow' | 'long'>,
): ScalePart[] {
  const parts: ScalePart[] = [];
  let number = Math.floor((span.first - marketDay) / weekDays);
  for (let day = marketDay + number * weekDays; day <= span.last; day += weekDays) {
    parts.push({ dayNumber: day, days: weekDays, ...name(day, number) });
    number += 1;
  }
  return parts;
}

/** Runs from each start to the next one; what lies outside the span is left out. */
export function runsFrom(starts: readonly Start[], span: DaySpan): ScalePart[] {
  return starts
    .map((start, index) => {
      const next = starts[index + 1]?.dayNumber ?? span.last + 1;
      return { ...start, days: Math.max(1, next - start.dayNumber) };
    })
    .filter(({ dayNumber, days }) => dayNumber <= span.last && dayNumber + days > span.first);
}

/** The village's own months; the first one may have begun before the span. */
export function villageMonths(span: DaySpan, months: readonly LocalMonth[]): ScalePart[] {
  const [from, to] = [dateOfDayNumber(span.first).year, dateOfDayNumber(span.last).year];
  const starts = localMonthStarts(months, from - 1, to + 1).map(({ dayNumber, name }) => ({
    ...{ dayNumber, short: name, narrow: firstLetter(name), mayCut: true, long: '', ownName: name },
  }));
  return runsFrom(starts, span);
}

/** With all marks that belong to it. */
function firstLetter(name: string): string {
  return /^.\p{M}*/u.exec(name)?.[0] ?? '';
}

/** Every day of a span, for the closest look. */
export function daysOf(span: DaySpan, name: (dayNumber: number) => string): ScalePart[] {
  return Array.from({ length: span.last - span.first + 1 }, (_, index) => {
    const dayNumber = span.first + index;
    const { day } = dateOfDayNumber(dayNumber);
    const short = String(day);
    // Every fifth where there is little room; the 30th would touch the first.
    const isSparse = day === 1 || (day % 5 === 0 && day < 30);
    return { dayNumber, days: 1, short, narrow: isSparse ? short : '', long: name(dayNumber) };
  });
}

/** No month of a calendar is longer. */
const MONTH_DAYS_MAX = 31;

/** Months of a civil calendar that the browser knows, by its CLDR name; whole, where they reach over the span. */
export function civilMonths(span: DaySpan, calendar: string, locale: string): ScalePart[] {
  const format = (month: 'short' | 'narrow' | 'long') =>
    new Intl.DateTimeFormat(locale, { calendar, month, year: 'numeric', timeZone: 'UTC' });
  const [short, narrow, long] = [format('short'), format('narrow'), format('long')];
  const monthIn = (parts: readonly Intl.DateTimeFormatPart[]) =>
    parts.find(({ type }) => type === 'month')?.value ?? '';
  const starts: Start[] = [];
  let before = '';
  const until = span.last + MONTH_DAYS_MAX;
  for (let dayNumber = span.first - MONTH_DAYS_MAX; dayNumber <= until; dayNumber += 1) {
    const date = utcDate(dateOfDayNumber(dayNumber));
    const whole = long.format(date);
    if (whole === before) continue;
    before = whole;
    starts.push({
      dayNumber,
      short: monthIn(short.formatToParts(date)),
      narrow: monthIn(narrow.formatToParts(date)),
      long: whole,
    });
  }
  return runsFrom(starts, span);
}

/** Calendars that this browser knows besides the Gregorian one, with their names. */
export function knownCalendars(locale: string): { calendar: string; name: string }[] {
  const names = new Intl.DisplayNames(locale, { type: 'calendar', fallback: 'code' });
  return Intl.supportedValuesOf('calendar')
    .filter((calendar) => calendar !== 'gregory' && calendar !== 'iso8601')
    .map((calendar) => ({ calendar, name: names.of(calendar) ?? calendar }))
    .sort((a, b) => a.name.localeCompare(b.name, locale));
}
