import { dayNumberOf } from '#shared/kernel/iso-date.js';
import type { DaySpan } from '#src/ui/pictures/day-span.js';

/** The civil year of a calendar by day number. */
export function yearSpan(year: number): DaySpan {
  return { first: dayNumberOf(year, 1, 1), last: dayNumberOf(year, 12, 31) };
}
