import { occurrenceDaysOf } from '#shared/calendar/entry-dates.js';
import type { CrossingDetail, MarkerRow, OccurrenceDetail, PhenomenonDays } from '#shared/contracts/stars.js';
import { compassPoint, PHENOMENA } from '#shared/sky/index.js';
import type { Crossing, Figure, Occurrence, Phenomenon, PhenomenonResult } from '#shared/sky/index.js';
import { localTimeOf, type PlaceClock } from './local-time.service.js';
import { markerNamesOf } from './marker-names.service.js';
import type { MarkerNights } from './sky-years.service.js';

export function toMarkerRow({ markerYear, strip }: MarkerNights, figures: readonly Figure[] = []): MarkerRow {
  return {
    ...markerNamesOf(markerYear.markerKey, figures),
    outcome: markerYear.outcome,
    outcomeDetail: markerYear.outcomeDetail,
    nightsHidden: markerYear.nightsHidden,
    notes: [...markerYear.notes],
    phenomena: forEachPhenomenon((phenomenon) => toPhenomenonDays(markerYear.phenomena[phenomenon])),
    strip,
  };
}

export function forEachPhenomenon<T>(make: (phenomenon: Phenomenon) => T): Record<Phenomenon, T> {
  return Object.fromEntries(PHENOMENA.map((phenomenon) => [phenomenon, make(phenomenon)])) as Record<
    Phenomenon,
    T
  >;
}

function toPhenomenonDays({ outcome, occurrences }: PhenomenonResult): PhenomenonDays {
  return { outcome, occurrences: occurrences.map(occurrenceDaysOf) };
}

export interface OccurrenceFacts {
  occurrence: Occurrence;
  /** The same over a flat horizon; null without a skyline or without such a date. */
  flat: Occurrence | null;
  /** When to stop looking before sunrise, or to begin after sunset, on the expected day (Julian Days UT). */
  stopLookingJdUt: number | null;
  startLookingJdUt: number | null;
}

export function toOccurrenceDetail(facts: OccurrenceFacts, clock: PlaceClock): OccurrenceDetail {
  const { occurrence, flat, stopLookingJdUt, startLookingJdUt } = facts;
  const days = occurrenceDaysOf(occurrence);
  return {
    expected: toCrossing(occurrence.expected, days.expected, clock),
    early: occurrence.early && days.early && toCrossing(occurrence.early, days.early, clock),
    late: occurrence.late && days.late && toCrossing(occurrence.late, days.late, clock),
    clarity: occurrence.clarity,
    notes: [...occurrence.notes],
    flatExpected: flat && occurrenceDaysOf(flat).expected,
    // Both are rounded away from the Sun.
    stopLookingAt: stopLookingJdUt === null ? null : localTimeOf(stopLookingJdUt, clock),
    startLookingAt: startLookingJdUt === null ? null : localTimeOf(startLookingJdUt, clock, 'up'),
  };
}

function toCrossing(
  crossing: Crossing,
  day: Pick<CrossingDetail, 'dayNumber' | 'gregorian' | 'julian'>,
  clock: PlaceClock,
): CrossingDetail {
  return {
    ...day,
    jdUt: crossing.jdUt,
    sunDepressionDeg: crossing.sunDepressionDeg,
    neededDepressionDeg: crossing.neededDepressionDeg,
    starAzimuthDeg: crossing.starAzimuthDeg,
    starAltitudeDeg: crossing.starAltitudeDeg,
    sunAzimuthDeg: crossing.sunAzimuthDeg,
    compass: compassPoint(crossing.starAzimuthDeg),
    localTime: localTimeOf(crossing.jdUt, clock),
  };
}
