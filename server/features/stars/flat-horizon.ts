import { FIRST_YEAR, LAST_YEAR } from '#shared/sky/index.js';
import type { MarkerYear, Occurrence, Phenomenon } from '#shared/sky/index.js';
import type { WatchedPlace } from '../places/watched-place.service.js';
import type { SkyYearsService } from './sky-years.service.js';

/** Occurrences of a phenomenon are a year apart, so the same one lies within half a year. */
const HALF_YEAR_DAYS = 182;

/** The place without its hills. */
export function onFlatGround<P extends WatchedPlace>(place: P): P {
  return { ...place, skyline: [] };
}

/**
 * The occurrence over a flat horizon that belongs to the given one; it may fall into the civil year before or
 * after. Null where there is none.
 */
export function flatOccurrence(
  skyYears: SkyYearsService,
  place: WatchedPlace,
  { markerKey, year }: MarkerYear,
  phenomenon: Phenomenon,
  occurrence: Occurrence,
): Occurrence | null {
  const years = [year, year - 1, year + 1].filter((one) => one >= FIRST_YEAR && one <= LAST_YEAR);
  let nearest: Occurrence | null = null;
  for (const one of years) {
    const [flat] = skyYears.markerYears(onFlatGround(place), one, [markerKey]);
    for (const candidate of flat?.phenomena[phenomenon].occurrences ?? []) {
      if (nearest === null || apart(candidate, occurrence) < apart(nearest, occurrence)) nearest = candidate;
    }
    // Hills move a date by days or weeks: what the year itself answers nearby needs no look at its neighbours.
    if (nearest !== null && apart(nearest, occurrence) <= HALF_YEAR_DAYS) return nearest;
  }
  return null;
}

function apart(a: Occurrence, b: Occurrence): number {
  return Math.abs(a.expected.dayNumber - b.expected.dayNumber);
}
