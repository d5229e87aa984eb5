import { civilDateOf, dayNumberOf } from '#shared/kernel/iso-date.js';
import type { EntryOffsets, MonthDay } from './entry-model.js';
import type { DateCell } from './import-dates.js';

/** Days of every year; null where they are not said. */
export interface SaidDays {
  from: MonthDay | null;
  to: MonthDay | null;
}

/** Any year without a leap day, with a year on both sides of it. */
const ANY_YEAR = 2;

/**
 * The days on which a sign of nature usually comes: as said, else the best days less as many days as they are counted from
 * it (early days from its first day, late ones from its last). Null where neither is there.
 */
export function usualDays(
  said: SaidDays,
  best: SaidDays,
  { bestFromDays, bestToDays }: Pick<EntryOffsets, 'bestFromDays' | 'bestToDays'>,
): { from: MonthDay; to: MonthDay } | null {
  const from = said.from ?? (best.from && earlierBy(best.from, bestFromDays));
  if (from === null) return null;
  const counted = said.from === null && best.to !== null ? earlierBy(best.to, bestToDays) : null;
  const to = said.to ?? (counted !== null && follows(counted, from) ? counted : from);
  return { from, to };
}

export function dayOfEveryYear(cell: DateCell, end: 'first' | 'last'): MonthDay | null {
  return cell.kind === 'day' ? cell[end] : null;
}

function earlierBy({ month, day }: MonthDay, days: number): MonthDay {
  const found = civilDateOf(dayNumberOf(ANY_YEAR, month, day) - days);
  return { month: found.month, day: found.day };
}

/** The same day, or within half a year after it: what seems to come before lies a little before, not a year after. */
function follows(later: MonthDay, first: MonthDay): boolean {
  const days = dayNumberOf(ANY_YEAR, later.month, later.day) - dayNumberOf(ANY_YEAR, first.month, first.day);
  return (days + 365) % 365 < 365 / 2;
}
