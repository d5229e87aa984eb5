import { useMemo } from 'react';
import { useTranslation } from 'react-i18next';
import type { CivilDay } from '#shared/contracts/stars.js';
import { useDateWords, type DayForm } from '#src/lib/date-words.js';
import { dayNumberOf } from '#src/lib/days.js';
import { civilDate, dateWithin, monthStarts } from '#src/lib/civil-year.js';
import type { ScaleMonth } from '#src/ui/pictures/month-scale.js';

/** An expected day with the ends of its range; an end may be missing. */
export interface RangedDays {
  expected: CivilDay;
  early: CivilDay | null;
  late: CivilDay | null;
}

/** Dates of a year as the people of that year wrote them: Gregorian from 1583, Julian before. */
export interface StarDates {
  day: (day: CivilDay, form?: DayForm) => string;
  /** A day number within the year. */
  dayAt: (dayNumber: number, form?: DayForm) => string;
  /** A day number near a known day, also across the turn of the year. */
  dayBeside: (day: CivilDay, dayNumber: number, form?: DayForm) => string;
  rangeAt: (fromDayNumber: number, toDayNumber: number, form?: DayForm) => string;
  /** `3 to 12 Jun`, for a line under a date. */
  shortRange: (days: RangedDays) => string;
  /** `between 3 and 12 June`; says so where an end has no date. */
  between: (days: RangedDays) => string;
  /** `about 7 June, between 3 and 12 June`. */
  aboutBetween: (days: RangedDays) => string;
  year: string;
  months: readonly ScaleMonth[];
}

export function useStarDates(year: number, firstDayNumber: number): StarDates {
  const { t } = useTranslation(['stars', 'common']);
  const words = useDateWords();
  return useMemo(() => {
    const date = (day: CivilDay) => civilDate(day, year);
    const starts = monthStarts(year, firstDayNumber);
    const within = (dayNumber: number) => dateWithin(dayNumber, year, starts);
    // Names of the months are those of any year.
    const names = words.months(2027);
    return {
      day: (day, form) => words.day(date(day), form),
      dayAt: (dayNumber, form) => words.day(within(dayNumber), form),
      dayBeside: (day, dayNumber, form) =>
        words.day(dayNumberOf(date(day)) + dayNumber - day.dayNumber, form),
      rangeAt: (from, to, form) => words.range(within(from), within(to), form),
      shortRange: ({ early, late }) => {
        if (early !== null && late !== null) return words.range(date(early), date(late), 'short');
        if (late !== null) return t('notAfter', { to: words.day(date(late), 'short') });
        if (early !== null) return t('notBefore', { from: words.day(date(early), 'short') });
        return t('openRange');
      },
      between: ({ early, late }) => {
        if (early !== null && late !== null) return words.between(date(early), date(late));
        if (late !== null) return t('card.notAfter', { to: words.day(date(late)) });
        if (early !== null) return t('card.notBefore', { from: words.day(date(early)) });
        return t('card.open');
      },
      aboutBetween: ({ expected, early, late }) =>
        words.aboutBetween(date(expected), early && date(early), late && date(late)),
      year: words.year(year),
      months: starts.map((month, index) => ({
        ...month,
        short: names[index]?.short ?? '',
        narrow: names[index]?.narrow ?? '',
      })),
    };
  }, [t, words, year, firstDayNumber]);
}
