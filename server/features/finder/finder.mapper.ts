import { occurrenceDaysOf } from '#shared/calendar/entry-dates.js';
import type { MarkerCandidate } from '#shared/calendar/marker-candidates.js';
import type { RankedMarker, WantedDays } from '#shared/calendar/marker-ranking.js';
import { daysAwayOf } from '#shared/calendar/marker-ranking.js';
import { rainClashOf } from '#shared/calendar/rain-clash.js';
import {
  LATER_YEARS,
  type FoundMarker,
  type NearestMarker,
  type OldMarkerNow,
} from '#shared/contracts/finder.js';
import type { CivilDay } from '#shared/contracts/stars.js';
import { isoDateOf } from '#shared/kernel/iso-date.js';
import {
  gregorianShiftDays,
  julianOf,
  type DriftEpoch,
  type Figure,
  type MarkerDrift,
  type MoonOverPlace,
  type Phenomenon,
} from '#shared/sky/index.js';
import { markerNamesOf } from '../stars/marker-names.service.js';

/** A marker with what was looked up for it alone. */
export interface FoundFacts {
  found: RankedMarker;
  /** The year asked for and LATER_YEARS after it. */
  drift: MarkerDrift;
  moon: MoonOverPlace;
  /** The village's own. */
  figures: readonly Figure[];
  /** Of the place, January first. */
  rainMonths: readonly boolean[];
}

export function toFoundMarker({ found, drift, moon, figures, rainMonths }: FoundFacts): FoundMarker {
  const { early, expected, late } = found.occurrence;
  return {
    ...markerNamesOf(found.markerKey, figures),
    phenomenon: found.phenomenon,
    days: occurrenceDaysOf(found.occurrence),
    occurrence: found.occurrenceNumber === 1 ? 1 : 2,
    daysAway: found.daysAway,
    nearness: found.nearness,
    rangeDays: found.rangeDays,
    exactness: found.exactness,
    ease: found.ease,
    caution: found.caution,
    notes: [...found.notes],
    clarity: found.occurrence.clarity,
    rain: rainClashOf({ from: (early ?? expected).dayNumber, to: (late ?? expected).dayNumber }, rainMonths),
    azimuthDeg: expected.starAzimuthDeg,
    skylineAltitudeDeg: expected.starAltitudeDeg,
    moonlight: { litShare: moon.litShare, isUp: moon.altitudeDeg > 0 },
    laterDays: LATER_YEARS.map((_, index) => {
      const later = firstDay(drift.epochs[index + 1], found.phenomenon);
      return later === null ? null : Math.round(gregorianShiftDays(expected.jdUt, later.expected.jdUt));
    }),
  };
}

export function toNearestMarker(
  candidate: MarkerCandidate,
  wanted: WantedDays,
  figures: readonly Figure[],
): NearestMarker {
  return {
    ...markerNamesOf(candidate.markerKey, figures),
    phenomenon: candidate.phenomenon,
    days: occurrenceDaysOf(candidate.occurrence),
    occurrence: candidate.occurrenceNumber === 1 ? 1 : 2,
    daysAway: daysAwayOf(candidate.occurrence.expected.dayNumber, wanted),
  };
}

/** @param drift the year since which people go by it, and the year asked for */
export function toOldMarkerNow(
  drift: MarkerDrift,
  phenomenon: Phenomenon,
  figures: readonly Figure[],
): OldMarkerNow {
  const [then, now] = drift.epochs;
  if (!then || !now) throw new RangeError('An old marker is looked up in two years.');
  const [dayThen, dayNow] = [firstDay(then, phenomenon), firstDay(now, phenomenon)];
  return {
    ...markerNamesOf(drift.markerKey, figures),
    phenomenon,
    then: toDayIn(then, phenomenon),
    now: toDayIn(now, phenomenon),
    movedDays:
      dayThen === null || dayNow === null
        ? null
        : Math.round(gregorianShiftDays(dayThen.expected.jdUt, dayNow.expected.jdUt)),
  };
}

function toDayIn(epoch: DriftEpoch, phenomenon: Phenomenon): OldMarkerNow['then'] {
  const day = firstDay(epoch, phenomenon);
  return {
    year: epoch.year,
    outcome: epoch.outcome,
    phenomenonOutcome: epoch.phenomena[phenomenon].outcome,
    days: day && occurrenceDaysOf(day),
  };
}

function firstDay(epoch: DriftEpoch | undefined, phenomenon: Phenomenon) {
  return epoch?.phenomena[phenomenon].occurrences[0] ?? null;
}

export function toCivilDay(dayNumber: number): CivilDay {
  const { year, month, day } = julianOf(dayNumber);
  const parts = [String(month), String(day)].map((part) => part.padStart(2, '0'));
  return {
    dayNumber,
    gregorian: isoDateOf(dayNumber),
    julian: [String(year).padStart(4, '0'), ...parts].join('-'),
  };
}
