import type { NightSegment } from '#shared/contracts/stars.js';

/** A run of nights as a line of the table behind the strip. */
export interface StripLine extends NightSegment {
  nights: number;
}

/** Runs in order; both their days belong to them. */
export function stripLines(strip: readonly NightSegment[]): StripLine[] {
  return [...strip]
    .sort((a, b) => a.fromDayNumber - b.fromDayNumber)
    .map((segment) => ({ ...segment, nights: segment.toDayNumber - segment.fromDayNumber + 1 }));
}

/** Days of a row of rings round a date: its range and a few days on either side. */
export interface RowDays {
  first: number;
  last: number;
}

const BESIDE_DAYS = 3;
const LEAST_DAYS = 16;
/** More rings than this melt together on a phone; then the sentence alone has to do. */
const MOST_DAYS = 45;

export function rowAround(early: number | null, expected: number, late: number | null): RowDays | null {
  let first = (early ?? expected) - BESIDE_DAYS;
  let last = (late ?? expected) + BESIDE_DAYS;
  for (let side = 0; last - first + 1 < LEAST_DAYS; side = 1 - side) {
    if (side === 0) first -= 1;
    else last += 1;
  }
  return last - first + 1 > MOST_DAYS ? null : { first, last };
}
