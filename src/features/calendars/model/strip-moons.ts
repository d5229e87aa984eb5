import type { MonthDay } from '#shared/contracts/common.js';
import { dayNumberOf } from '#shared/kernel/iso-date.js';
import { dateOfDayNumber } from '#src/lib/days.js';
import type { DaySpan } from '#src/ui/pictures/day-span.js';

/** A Moon by its place in the village's own year. */
export interface CountedMoon {
  /** The evening on which it begins. */
  dayNumber: number;
  /** 1…13: the first is the first to begin in the year; one that runs over the year's end keeps its number. */
  nth: number;
  /** The day on which the year began in which it is counted. */
  yearStartDay: number;
}

/** Longer than any Moon from first evening to first evening, one crescent seen early and the next one late. */
const LONGEST_MOON_DAYS = 35;

/** Civil years whose Moons must be known to count those of a span, the one that runs on its first day included. */
export function yearsToCount({ first, last }: DaySpan, yearStart: MonthDay): number[] {
  const from = dateOfDayNumber(lastYearStart(first - LONGEST_MOON_DAYS, yearStart)).year;
  const to = dateOfDayNumber(last).year;
  return Array.from({ length: to - from + 1 }, (_, index) => from + index);
}

/**
 * Numbers Moons from the day on which the village's year begins: twelve in most years, thirteen in some.
 * @param starts first evenings as day numbers, all of `fromYear` and the civil years that follow; in any order
 * @returns ascending, from the first year that begins in `fromYear`: how many came before is not known
 */
export function countedMoons(
  starts: readonly number[],
  fromYear: number,
  yearStart: MonthDay,
): CountedMoon[] {
  const firstDay = dayNumberOf(fromYear, yearStart.month, yearStart.day);
  const counts = new Map<number, number>();
  return [...new Set(starts)]
    .filter((dayNumber) => dayNumber >= firstDay)
    .sort((a, b) => a - b)
    .map((dayNumber) => {
      const yearStartDay = lastYearStart(dayNumber, yearStart);
      const nth = (counts.get(yearStartDay) ?? 0) + 1;
      counts.set(yearStartDay, nth);
      return { dayNumber, nth, yearStartDay };
    });
}

/** The last day on or before a day on which the village's year began. */
function lastYearStart(dayNumber: number, { month, day }: MonthDay): number {
  const { year } = dateOfDayNumber(dayNumber);
  const inItsYear = dayNumberOf(year, month, day);
  return inItsYear <= dayNumber ? inItsYear : dayNumberOf(year - 1, month, day);
}
