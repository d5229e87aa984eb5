import type { Lunation, MoonDay } from '../moon/moon-types.js';
import { labelledDay } from '../time/civil-day.js';
import type { CivilDay } from '../types.js';
import type { SkyMarkerPlace } from './kind.js';
import type { SkyMarkerOccurrence } from './types.js';

const WEAK_RANGE_DAYS = 21;

export function isOfYear({ year }: SkyMarkerPlace, { expected }: MoonDay): boolean {
  return expected.dayNumber >= year.civil.firstDay && expected.dayNumber <= year.civil.lastDay;
}

/**
 * A Moon's day as a marker. New and full Moon look the same a day before and after; a crescent that is looked for may
 * be missed on its first evening, so its range ends a day later at the least [C]. It never begins before the first
 * evening on which the tests allow it.
 */
export function moonOccurrence(
  lunation: Lunation,
  moon: MoonDay,
  early: CivilDay,
  late: CivilDay,
): SkyMarkerOccurrence {
  const { dayNumber } = moon.expected;
  const earliest =
    moon.event === 'first-crescent' ? early.dayNumber : Math.min(early.dayNumber, dayNumber - 1);
  const latest = Math.max(late.dayNumber, dayNumber + 1);
  const crescent = lunation.firstCrescent.expected;
  const jdUt =
    moon.event === 'first-crescent'
      ? (crescent?.bestJdUt ?? dayNumber)
      : (moon.event === 'new' ? lunation.newMoon : lunation.fullMoon).jdUt;
  const isCrescent = moon.event === 'first-crescent';
  return {
    expected: {
      ...labelledDay(dayNumber),
      jdUt,
      azimuthDeg: isCrescent ? (crescent?.moonAzimuthDeg ?? null) : null,
      altitudeDeg: isCrescent ? (crescent?.moonAltitudeDeg ?? null) : null,
    },
    early: labelledDay(earliest),
    late: labelledDay(latest),
    notes: latest - earliest > WEAK_RANGE_DAYS ? ['weak-marker'] : [],
  };
}
