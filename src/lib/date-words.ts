import type { TFunction } from 'i18next';
import { useMemo } from 'react';
import { useTranslation } from 'react-i18next';
import { dateOfDayNumber, dayNumberOf, readDate, utcDate, type PlainDate } from './days.js';

/** A day as the contracts give it (`YYYY-MM-DD`), as parts, or as a day number. */
export type AnyDay = string | PlainDate | number;
export type DayForm = 'long' | 'short' | 'weekday' | 'year' | 'short-year';

/** One month of a year's scale: where it begins, and its name in two lengths. */
export interface MonthMark {
  dayNumber: number;
  days: number;
  short: string;
  narrow: string;
  long: string;
}

/** Dates as a person says them. A date never breaks: day, month and year hang together. */
export interface DateWords {
  /** `7 June`; `year` adds the year, `weekday` the day of the week, `short` shortens the month. */
  day: (day: AnyDay, form?: DayForm) => string;
  /** `3 to 12 June`, `28 May to 3 June`. */
  range: (from: AnyDay, to: AnyDay, form?: DayForm) => string;
  /** `between 3 and 12 June`. */
  between: (from: AnyDay, to: AnyDay, form?: DayForm) => string;
  /** `About 7 June, between 3 and 12 June`; says so where an end of the range has no date. */
  aboutBetween: (expected: AnyDay, early: AnyDay | null, late: AnyDay | null) => string;
  /** The same for the middle of a sentence: `about 7 June, between 3 and 12 June`. */
  aboutWithin: (expected: AnyDay, early: AnyDay | null, late: AnyDay | null) => string;
  /** `2027`, `44 BC` for −43. */
  year: (astronomicalYear: number) => string;
  /** `18:40` today, `yesterday, 18:40`, `7 June, 18:40` before that. */
  moment: (instant: string | Date, now?: Date) => string;
  months: (year: number) => MonthMark[];
}

/** English on screens is written day first. */
export function intlLocale(language: string): string {
  return language === 'en' ? 'en-GB' : language;
}

export function useDateWords(): DateWords {
  const { t, i18n } = useTranslation('common');
  return useMemo(() => dateWords(t, i18n.language), [t, i18n.language]);
}

const FORMS: Record<DayForm, Intl.DateTimeFormatOptions> = {
  long: { day: 'numeric', month: 'long' },
  short: { day: 'numeric', month: 'short' },
  weekday: { weekday: 'long', day: 'numeric', month: 'long' },
  year: { day: 'numeric', month: 'long', year: 'numeric' },
  'short-year': { day: 'numeric', month: 'short', year: 'numeric' },
};

export function dateWords(t: TFunction, language: string): DateWords {
  const locale = intlLocale(language);
  const format = (date: PlainDate, options: Intl.DateTimeFormatOptions) =>
    holdTogether(
      formatOf(locale, {
        ...options,
        ...(options.year !== undefined && date.year < 1 ? { era: 'short' } : {}),
        timeZone: 'UTC',
      }).formatToParts(utcDate(date)),
    );
  const day = (value: AnyDay, form: DayForm = 'long') => format(parts(value), FORMS[form]);

  /** The first day of a pair leaves out what the second repeats. */
  const firstOfPair = (fromDay: AnyDay, toDay: AnyDay, form: DayForm) => {
    const [from, to] = [parts(fromDay), parts(toDay)];
    const sameYear = from.year === to.year;
    if (sameYear && from.month === to.month && form !== 'weekday') return format(from, { day: 'numeric' });
    const { year, ...withoutYear } = FORMS[form];
    return format(from, sameYear ? withoutYear : { ...withoutYear, ...(year ? { year } : {}) });
  };
  const pair =
    (key: 'date.range' | 'date.between') =>
    (from: AnyDay, to: AnyDay, form: DayForm = 'long') =>
      dayNumberOf(parts(from)) === dayNumberOf(parts(to))
        ? day(to, form)
        : t(key, { from: firstOfPair(from, to, form), to: day(to, form) });

  const about =
    (where: 'date' | 'date.within') => (expected: AnyDay, early: AnyDay | null, late: AnyDay | null) => {
      const middle = day(expected);
      if (early !== null && late !== null) {
        const from = firstOfPair(early, late, 'long');
        return t(`${where}.aboutBetween`, { day: middle, from, to: day(late) });
      }
      if (late !== null) return t(`${where}.aboutNotAfter`, { day: middle, to: day(late) });
      if (early !== null) return t(`${where}.aboutNotBefore`, { day: middle, from: day(early) });
      return t(`${where}.aboutOpen`, { day: middle });
    };

  return {
    day,
    range: pair('date.range'),
    between: pair('date.between'),
    aboutBetween: about('date'),
    aboutWithin: about('date.within'),
    year: (year) => (year > 0 ? String(year) : t('date.yearBc', { year: 1 - year })),
    moment: (instant, now = new Date()) => momentWords(t, locale, new Date(instant), now),
    months: (year) =>
      Array.from({ length: 12 }, (_, index) => {
        const first = { year, month: index + 1, day: 1 };
        const next = index === 11 ? { year: year + 1, month: 1, day: 1 } : { year, month: index + 2, day: 1 };
        return {
          dayNumber: dayNumberOf(first),
          days: dayNumberOf(next) - dayNumberOf(first),
          short: format(first, { month: 'short' }),
          narrow: format(first, { month: 'narrow' }),
          long: format(first, { month: 'long' }),
        };
      }),
  };
}

function momentWords(t: TFunction, locale: string, instant: Date, now: Date): string {
  const time = new Intl.DateTimeFormat(locale, {
    hour: '2-digit',
    minute: '2-digit',
    hourCycle: 'h23',
  }).format(instant);
  const daysAgo = localDayNumber(now) - localDayNumber(instant);
  if (daysAgo === 0) return time;
  if (daysAgo === 1) return t('date.yesterdayAt', { time });
  const options: Intl.DateTimeFormatOptions = { day: 'numeric', month: 'long' };
  if (instant.getFullYear() !== now.getFullYear()) options.year = 'numeric';
  const dayText = holdTogether(new Intl.DateTimeFormat(locale, options).formatToParts(instant));
  return t('date.dayAt', { day: dayText, time });
}

function localDayNumber(date: Date): number {
  return dayNumberOf({ year: date.getFullYear(), month: date.getMonth() + 1, day: date.getDate() });
}

function parts(day: AnyDay): PlainDate {
  if (typeof day === 'number') return dateOfDayNumber(day);
  if (typeof day !== 'string') return day;
  const date = readDate(day);
  if (date === null) throw new TypeError(`Not a date: ${day}`);
  return date;
}

const formats = new Map<string, Intl.DateTimeFormat>();

/** Making a format costs some two hundred times as much as using one, and a table of stars holds a thousand dates. */
function formatOf(locale: string, options: Intl.DateTimeFormatOptions): Intl.DateTimeFormat {
  const key = `${locale} ${JSON.stringify(options)}`;
  const format = formats.get(key) ?? new Intl.DateTimeFormat(locale, options);
  formats.set(key, format);
  return format;
}

/** No-break spaces inside a date, an ordinary one after a weekday. */
function holdTogether(pieces: Intl.DateTimeFormatPart[]): string {
  return pieces
    .map((piece, index) =>
      piece.type === 'literal' && pieces[index - 1]?.type !== 'weekday'
        ? piece.value.replaceAll(' ', '\u00a0')
        : piece.value,
    )
    .join('');
}
