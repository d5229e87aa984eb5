import type { YearsAnswer } from '#shared/contracts/finder.js';
import type { Phenomenon } from '#shared/sky/vocabulary.js';
import { dayNumberOf, readDate } from '#src/lib/days.js';

type YearDay = YearsAnswer['items'][number];

/** How one marker kept near the wanted days over some years. */
export interface YearsHeld {
  markerKey: string;
  phenomenon: Phenomenon;
  /** Years in which it falls within HELD_DAYS of them. */
  held: number;
  years: number;
  /** The earliest and the latest day of the year, as days of the civil year asked first; null without any date. */
  earliest: number | null;
  latest: number | null;
}

/** Near enough that work counted from it still fits. */
export const HELD_DAYS = 5;

/**
 * Counts the years of each marker. Dates of other years are carried back to the first one, so that they can be
 * held against the wanted days of the first one, also across New Year.
 * @param wanted day numbers in `year`
 */
export function yearsHeld(
  items: readonly YearDay[],
  year: number,
  wanted: { from: number; to: number },
): YearsHeld[] {
  const byMarker = new Map<string, YearsHeld>();
  for (const item of items) {
    const key = `${item.markerKey} ${item.phenomenon}`;
    const { markerKey, phenomenon } = item;
    const row: YearsHeld = byMarker.get(key) ?? {
      markerKey,
      phenomenon,
      held: 0,
      years: 0,
      earliest: null,
      latest: null,
    };
    byMarker.set(key, row);
    row.years += 1;
    if (item.days === null) continue;
    const day = carriedBack(item.days.expected.gregorian, year, wanted.from);
    if (day >= wanted.from - HELD_DAYS && day <= wanted.to + HELD_DAYS) row.held += 1;
    row.earliest = Math.min(row.earliest ?? day, day);
    row.latest = Math.max(row.latest ?? day, day);
  }
  return [...byMarker.values()];
}

/** The same date in the year asked first, or in the one beside it that lies nearer the wanted days. */
function carriedBack(gregorian: string, year: number, wantedFrom: number): number {
  const date = readDate(gregorian);
  if (date === null) throw new TypeError(`Not a date: ${gregorian}`);
  const [first = 0, ...others] = [year, year - 1, year + 1].map((each) =>
    dayNumberOf({ ...date, year: each }),
  );
  return others.reduce(
    (nearest, day) => (Math.abs(day - wantedFrom) < Math.abs(nearest - wantedFrom) ? day : nearest),
    first,
  );
}
