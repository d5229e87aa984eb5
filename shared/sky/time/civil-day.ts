import type { CivilDay } from '../types.js';
import { gregorianOf, julianOf } from './julian-day.js';
import { zoneOffsetsOf } from './zone-offset.js';

/** 1900-01-01 0h UT. Before it places had no zones worth the name, and local mean solar time counts. */
const FIRST_ZONED_JD_UT = 2_415_020.5;

/** Tells which civil day, and which night, an instant belongs to at one place. */
export interface DayClock {
  /** Days to add to UT to get the place's clock. */
  offsetDays(jdUt: number): number;
  /** Day number of the civil day that holds the instant. */
  dayOf(jdUt: number): number;
  /** Nights run from noon to noon and carry the number of the day on whose evening they begin. */
  nightOf(jdUt: number): number;
}

/**
 * The clock of a place: the IANA zone from 1900 on, local mean solar time before that or without a zone.
 * @param longitudeDeg east positive
 */
export function dayClockOf(timeZone: string | null, longitudeDeg: number): DayClock {
  const meanSolarDays = longitudeDeg / 360;
  const zone = timeZone === null ? null : zoneOffsetsOf(timeZone);
  const offsetDays = (jdUt: number): number =>
    zone === null || jdUt < FIRST_ZONED_JD_UT ? meanSolarDays : zone.offsetDays(jdUt);
  return {
    offsetDays,
    dayOf: (jdUt) => Math.floor(jdUt + offsetDays(jdUt) + 0.5),
    nightOf: (jdUt) => Math.floor(jdUt + offsetDays(jdUt)),
  };
}

/** A day number with both labels. */
export function labelledDay(dayNumber: number): CivilDay {
  return { dayNumber, gregorian: gregorianOf(dayNumber), julian: julianOf(dayNumber) };
}
