import {
  civilDateFromIso,
  daysBetween,
  daysInMonth,
  dayNumberOf,
  isoDateOf,
} from '#shared/kernel/iso-date.js';
import type { EntryWindow } from './entry-model.js';

/** A window that stays within so many days of the year before is what people are used to. */
export const USUAL_MOVE_DAYS = 3;

export type RolledOutcome = 'moved' | 'stays' | 'lost-days' | 'found-days' | 'without-days';

export interface RolledWindow {
  outcome: RolledOutcome;
  /** Days, later positive, of whichever of the four days moved most; null where one of the years has no window. */
  movedDays: number | null;
}

/**
 * Holds an entry's window against the one of an earlier year, by the day of the civil year: it keeps to the seasons
 * within a day, so that a leap day alone is no news.
 * @param years how many years lie between the two, 1 for the next
 */
export function rolledWindow(
  before: EntryWindow | null,
  after: EntryWindow | null,
  years: number,
): RolledWindow {
  if (before === null) return { outcome: after === null ? 'without-days' : 'found-days', movedDays: null };
  if (after === null) return { outcome: 'lost-days', movedDays: null };
  const moves = (['earliest', 'bestFrom', 'bestTo', 'lastAdvised'] as const).map((name) =>
    daysBetween(sameDayLater(before[name], years), after[name]),
  );
  const movedDays = moves.reduce((most, move) => (Math.abs(move) > Math.abs(most) ? move : most), 0);
  return { outcome: Math.abs(movedDays) > USUAL_MOVE_DAYS ? 'moved' : 'stays', movedDays };
}

/** The same day so many years later; 29 February becomes the 28th where there is none. */
export function sameDayLater(iso: string, years: number): string {
  const date = civilDateFromIso(iso);
  const year = date.year + years;
  return isoDateOf(dayNumberOf(year, date.month, Math.min(date.day, daysInMonth(year, date.month))));
}
