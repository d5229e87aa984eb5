import { benchSettings } from './subject.js';

import { candidatesOf } from '#shared/calendar/marker-candidates.js';
import { rankMarkers } from '#shared/calendar/marker-ranking.js';
import {
  computeSkyYear,
  dayNumberOf,
  FIGURES,
  markerKeyOf,
  resolveMarker,
  STARS,
} from '#shared/sky/index.js';
import type { Site } from '#shared/sky/index.js';

export const FOUND_KEYS = [
  ...FIGURES.map((figure) => figure.key),
  ...STARS.map((star) => markerKeyOf(star.hr)),
];
const wantedDay = dayNumberOf({ year: 2027, month: 6, day: 15 }, 'gregorian');

/** The whole catalogue with ranges in one year, ranked against a wanted day: what a first question costs. */
export function findEverything(site: Site): void {
  const candidates = computeSkyYear(FOUND_KEYS, site, benchSettings, 2027).flatMap((markerYear) => {
    const marker = resolveMarker(markerYear.markerKey);
    return candidatesOf(markerYear, { vMag: marker?.vMag ?? 9, isFigure: marker?.figure !== null });
  });
  rankMarkers(candidates, { from: wantedDay, to: wantedDay });
}
