import { occurrenceDaysOf } from '#shared/calendar/entry-dates.js';
import type { SkyMarkerYear as SkyMarkerAnswer } from '#shared/contracts/sky-markers.js';
import { compassPoint, type SkyMarkerYear } from '#shared/sky/index.js';
import { localTimeOf, type PlaceClock } from '../stars/local-time.service.js';

export function toSkyMarkerYear(markerYear: SkyMarkerYear, clock: PlaceClock): SkyMarkerAnswer {
  const { spec, year, outcome, reason, time, sourceKey, basis } = markerYear;
  const hasTime = time === 'morning' || time === 'evening' || time === 'noon';
  return {
    spec,
    year,
    outcome,
    reason,
    occurrences: markerYear.occurrences.map((occurrence) => {
      const { jdUt, azimuthDeg, altitudeDeg } = occurrence.expected;
      return {
        ...occurrenceDaysOf(occurrence),
        azimuthDeg,
        altitudeDeg,
        compass: azimuthDeg === null ? null : compassPoint(azimuthDeg),
        localTime: hasTime ? localTimeOf(jdUt, clock) : null,
      };
    }),
    time,
    sourceKey,
    basis,
  };
}
