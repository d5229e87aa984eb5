import { daysAwayOf, nearnessOf } from '#shared/calendar/marker-ranking.js';
import type { SkyMarkerSpec, SkyMarkerYear } from '#shared/contracts/sky-markers.js';
import type { OccurrenceDays } from '#shared/contracts/stars.js';

interface Days {
  from: number;
  to: number;
}

/** One day of a sign of the Sun, the nights or the stars at an hour, held against the wanted days. */
export interface NearSign {
  spec: SkyMarkerSpec;
  /** Which of the sign's days in its civil year. */
  occurrence: number;
  days: OccurrenceDays;
  /** Negative before the wanted days, positive after, 0 within. */
  daysAway: number;
}

/** Signs that come with a season. A Moon of some kind falls near every day, and Venus keeps no year. */
const WITH_THE_SEASON: readonly SkyMarkerSpec['kind'][] = [
  'sun-season',
  'noon-sun',
  'zenith-sun',
  'dark-night',
  'due-meridian',
  'culmination',
];
const MOST_SIGNS = 6;

/**
 * The signs nearest to the wanted days, nearest first and among equally near ones the sharper. Where none lies within
 * reach, the last one before and the next one after: days can be counted from either.
 */
export function nearSigns(years: readonly SkyMarkerYear[], wanted: Days): NearSign[] {
  const all = years
    .filter(({ spec }) => WITH_THE_SEASON.includes(spec.kind))
    .flatMap(({ spec, occurrences }) =>
      occurrences.map(({ expected, early, late, notes }, index) => ({
        spec,
        occurrence: index + 1,
        days: { expected, early, late, notes },
        daysAway: daysAwayOf(expected.dayNumber, wanted),
      })),
    )
    .sort((a, b) => Math.abs(a.daysAway) - Math.abs(b.daysAway) || rangeDays(a) - rangeDays(b));
  const near = all.filter(({ daysAway }) => nearnessOf(daysAway) !== null).slice(0, MOST_SIGNS);
  if (near.length > 0) return near;
  const [before] = all.filter(({ daysAway }) => daysAway < 0);
  const [after] = all.filter(({ daysAway }) => daysAway > 0);
  return [before, after].filter((sign) => sign !== undefined);
}

/** An end without a date makes a range that cannot be told. */
function rangeDays({ days: { early, late } }: NearSign): number {
  return early && late ? late.dayNumber - early.dayNumber : Number.POSITIVE_INFINITY;
}
