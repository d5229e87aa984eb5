import { civilDateOf, dayNumberOf, monthDayKey } from '../kernel/iso-date.js';
import type { MonthDay } from './entry-model.js';

/** A month by the name that a village gives it. */
interface LocalMonth {
  name: string;
  begins: MonthDay;
}

/** Larger than every key of a day. */
const KEYS_PER_YEAR = 1300;
/** Any year without a 29 February. */
const ORDINARY_YEAR = 2027;
const ORDINARY_DAYS = 365;
const USUAL_MONTH_DAYS = 30;

/** Months in the order in which the village's year brings them. */
export function fromYearStart(months: readonly LocalMonth[], yearStart: MonthDay): LocalMonth[] {
  const sinceStart = ({ begins }: LocalMonth) =>
    (monthDayKey(begins) - monthDayKey(yearStart) + KEYS_PER_YEAR) % KEYS_PER_YEAR;
  return [...months].sort((a, b) => sinceStart(a) - sinceStart(b));
}

/** First days of every month in civil years, ascending. */
export function localMonthStarts(
  months: readonly LocalMonth[],
  fromYear: number,
  toYear: number,
): { dayNumber: number; name: string }[] {
  const inYear = [...months].sort((a, b) => monthDayKey(a.begins) - monthDayKey(b.begins));
  return Array.from({ length: toYear - fromYear + 1 }, (_, index) => fromYear + index).flatMap((year) =>
    inYear.map(({ name, begins }) => ({ name, dayNumber: dayNumberOf(year, begins.month, begins.day) })),
  );
}

/** A free day for one more month: thirty days after the last one, and the first with the village's year. */
export function nextFreeDay(taken: readonly MonthDay[], yearStart: MonthDay): MonthDay {
  const firstDay = dayNumberOf(ORDINARY_YEAR, 1, 1);
  const last = taken.at(-1);
  const wanted = last
    ? dayNumberOf(ORDINARY_YEAR, last.month, last.day) + USUAL_MONTH_DAYS
    : dayNumberOf(ORDINARY_YEAR, yearStart.month, yearStart.day);
  const keys = new Set(taken.map(monthDayKey));
  for (let later = 0; later < ORDINARY_DAYS; later += 1) {
    const { month, day } = civilDateOf(firstDay + ((wanted + later - firstDay) % ORDINARY_DAYS));
    if (!keys.has(monthDayKey({ month, day }))) return { month, day };
  }
  return yearStart;
}
