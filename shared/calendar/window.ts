import { civilDateOf, dayNumberOf, isoDateOf } from '#shared/kernel/iso-date.js';
import type { EntryOffsets, EntryWindow, MonthDay } from './entry-model.js';

export interface WindowInput {
  /** Day number of the marker's expected day, or of the fixed date that leads. */
  leadDayNumber: number;
  /** Where a spell of days leads: its last one. Early days count from the first, late days from the last. */
  leadLastDayNumber?: number | undefined;
  offsets: EntryOffsets;
  /** The responsible office's last date; null where the entry has none. */
  lastDate: MonthDay | null;
  /** Frost, flood, birds: such a window is never shortened. */
  protectiveWatch: boolean;
}

export interface WindowResult {
  /** Null where the last date leaves no best day. */
  window: EntryWindow | null;
  lastDateEffect: 'none' | 'shortened' | 'closed';
}

/**
 * The window of an entry: the lead day plus four offsets, cut by the last date. It may reach over either end of
 * the civil year. The range of the marker is no part of it: the range says how sure the sign is and stands
 * beside the window; added to it, the window would grow with every doubt.
 *
 * The earlier of last date and offset counts. Best days behind it fall away; where no best day is left the window
 * is closed, even if a few early days remain: nobody chose those days as good ones.
 */
export function windowOf({
  leadDayNumber,
  leadLastDayNumber = leadDayNumber,
  offsets,
  lastDate,
  protectiveWatch,
}: WindowInput): WindowResult {
  const earliest = leadDayNumber + offsets.earliestDays;
  const bestFrom = leadDayNumber + offsets.bestFromDays;
  const bestTo = leadLastDayNumber + offsets.bestToDays;
  const lastByOffset = leadLastDayNumber + offsets.lastAdvisedDays;

  const fixedLast =
    lastDate === null || protectiveWatch ? null : lastDateFor(lastDate, earliest, lastByOffset);
  if (fixedLast === null || fixedLast > lastByOffset) {
    return { window: written(earliest, bestFrom, bestTo, lastByOffset, 'offset'), lastDateEffect: 'none' };
  }
  if (fixedLast < bestFrom) return { window: null, lastDateEffect: 'closed' };
  return {
    window: written(earliest, bestFrom, Math.min(bestTo, fixedLast), fixedLast, 'fixed'),
    // On the same day the office's date is named, because it has a source, but nothing is lost by it.
    lastDateEffect: fixedLast < lastByOffset ? 'shortened' : 'none',
  };
}

/**
 * The day number of the last date that belongs to a window, given without a year.
 *
 * A last date that falls inside the window cuts it, whatever civil year it lies in. Otherwise the window lies
 * wholly between two last dates, and either the season is over (the one before counts, and closes the window) or
 * it is not (the one after counts, and changes nothing). A window belongs to the nearer of the two: sowing from
 * 10 to 25 July with the last date 5 July is five days late, not 345 days early. Where both are equally far the
 * earlier one counts, because a window closed wrongly is seen and mended, and one left open wrongly costs seed.
 */
function lastDateFor(lastDate: MonthDay, earliest: number, lastByOffset: number): number {
  const firstYear = civilDateOf(earliest).year - 1;
  const lastYear = civilDateOf(lastByOffset).year + 1;
  let before = -Infinity;
  for (let year = firstYear; year <= lastYear; year += 1) {
    const day = dayNumberOf(year, lastDate.month, lastDate.day);
    if (day < earliest) before = day;
    else if (day <= lastByOffset) return day;
    else return earliest - before <= day - lastByOffset ? before : day;
  }
  // The last year tried begins after the window ends, so the loop has answered.
  throw new RangeError('A last date must exist in every year.');
}

function written(
  earliest: number,
  bestFrom: number,
  bestTo: number,
  lastAdvised: number,
  lastAdvisedBy: EntryWindow['lastAdvisedBy'],
): EntryWindow {
  return {
    earliest: isoDateOf(earliest),
    bestFrom: isoDateOf(bestFrom),
    bestTo: isoDateOf(bestTo),
    lastAdvised: isoDateOf(lastAdvised),
    lastAdvisedBy,
  };
}
