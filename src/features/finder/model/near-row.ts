import type { FoundMarker } from '#shared/contracts/finder.js';

interface Days {
  from: number;
  to: number;
}

/** More rings than this melt together on a phone. */
const MOST_DAYS = 45;
const MARGIN_DAYS = 1;

/** First and last day of the row that shows wanted days and range together; null where they lie too far apart. */
export function nearRow(
  found: Pick<FoundMarker, 'days'>,
  wanted: Days,
): { first: number; last: number } | null {
  const { early, expected, late } = found.days;
  const first = Math.min(wanted.from, early?.dayNumber ?? expected.dayNumber) - MARGIN_DAYS;
  const last = Math.max(wanted.to, late?.dayNumber ?? expected.dayNumber) + MARGIN_DAYS;
  return last - first + 1 > MOST_DAYS ? null : { first, last };
}
