import type { EntryWindow } from './entry-model.js';
import { dayNumberFromIso, dayNumberOf } from '../kernel/iso-date.js';

/** How a sign is told from others: one of the village's list, or one in the entry's own words once it was saved. */
export interface CountedSign {
  sharedId?: string | undefined;
  ownId?: string | undefined;
}

/** Signs for which an event waits, as far as counting them is asked. */
export interface AwaitedSigns<S extends CountedSign> {
  list: readonly S[];
  needed: number | null;
  mustHave: number | null;
}

/** Days in which seeing a sign counts for an event; day numbers, both included. */
export interface SeenSpan {
  first: number;
  last: number;
}

/** A sign that comes long before its work is another year's, or another event's. */
export const SEEN_DAYS_BEFORE = 60;

/**
 * From sixty days before the earliest day, or from when people get ready where that is sooner, to the last advised day and
 * its days of grace. An event without days goes by the calendar's year.
 */
export function spanOfSeen(
  window: Pick<EntryWindow, 'earliest' | 'lastAdvised'> | null,
  year: number,
  { leadDays, graceDays }: { leadDays: number | null; graceDays: number | null },
): SeenSpan {
  if (window === null) return { first: dayNumberOf(year, 1, 1), last: dayNumberOf(year, 12, 31) };
  return {
    first: dayNumberFromIso(window.earliest) - Math.max(SEEN_DAYS_BEFORE, leadDays ?? 0),
    last: dayNumberFromIso(window.lastAdvised) + (graceDays ?? 0),
  };
}

export interface SignsIn {
  /** For each sign of the list, whether it is in; null where it cannot be marked: taken out of the village's list, or not saved yet. */
  isIn: (boolean | null)[];
  inCount: number;
  needed: number;
  total: number;
  /** Place of the sign without which nothing begins, while it is missing. */
  missingMust: number | null;
  /** Never that work begins: people decide. */
  state: 'prepare' | 'signs-are-in';
}

/**
 * How many signs of an event are in. People get ready until the must-have sign and as many as are needed were seen; where
 * no number is said, all are waited for. Null where there is nothing to wait for.
 * @param seenDays day numbers on which each sign was seen, by its id
 */
export function signsIn<S extends CountedSign>(
  { list, needed, mustHave }: AwaitedSigns<S>,
  seenDays: ReadonlyMap<string, readonly number[]>,
  span: SeenSpan,
): SignsIn | null {
  if (list.length === 0) return null;
  const isIn = list.map(({ sharedId, ownId }) => {
    const days = sharedId === undefined ? ownDays(seenDays, ownId) : seenDays.get(sharedId);
    if (days === undefined) return null;
    return days.some((day) => span.first <= day && day <= span.last);
  });
  const inCount = isIn.filter((one) => one === true).length;
  const count = needed ?? list.length;
  const missingMust = mustHave !== null && isIn[mustHave] !== true ? mustHave : null;
  const state = missingMust === null && inCount >= count ? 'signs-are-in' : 'prepare';
  return { isIn, inCount, needed: count, total: list.length, missingMust, state };
}

/** One that was never seen has no days; one without an id cannot have any. */
function ownDays(seenDays: ReadonlyMap<string, readonly number[]>, ownId: string | undefined) {
  return ownId === undefined ? undefined : (seenDays.get(ownId) ?? []);
}

/**
 * Without some signs of the list. The one that must be there stays the same, and no more are needed than are left.
 * @param stays whether the sign at this place stays
 */
export function keepingSigns<S extends CountedSign>(
  signs: AwaitedSigns<S>,
  stays: (sign: S, place: number) => boolean,
): { list: S[]; needed: number | null; mustHave: number | null } {
  const places = signs.list.flatMap((sign, place) => (stays(sign, place) ? [place] : []));
  const list = signs.list.filter((sign, place) => stays(sign, place));
  const must = signs.mustHave === null ? -1 : places.indexOf(signs.mustHave);
  const needed = signs.needed === null || list.length === 0 ? null : Math.min(signs.needed, list.length);
  return { list, needed, mustHave: must < 0 ? null : must };
}
