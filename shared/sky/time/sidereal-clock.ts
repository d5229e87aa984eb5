import { AstroTime, SiderealTime } from 'astronomy-engine';

import { TAU, wrapPi } from '../units/angle.js';
import { JD_J2000 } from './julian-day.js';

/** Earth's turning through the months around an epoch: apparent sidereal time at Greenwich as a straight line. */
export interface SiderealClock {
  epochJdUt: number;
  /** Greenwich apparent sidereal time at the epoch, radians. */
  greenwichAtEpochRad: number;
  /** Radians per day of UT. */
  rateRadPerDay: number;
  /** Length of a sidereal day in days of UT: the distance between two risings of a star. */
  periodDays: number;
}

/** Mean turning of the Earth with respect to the equinox, turns per day of UT [Aoki1982]. */
const TURNS_PER_DAY = 1.002_737_909_35;
/** Half the span over which the straight line is laid. */
const HALF_SPAN_DAYS = 180;

function greenwichRad(jdUt: number): number {
  return SiderealTime(new AstroTime(jdUt - JD_J2000)) * (TAU / 24);
}

/**
 * Prepares the line from apparent sidereal time half a year before and after the epoch, so that the slow change of
 * the rate over millennia is in it. Within two years of the epoch it stays within 2″ of the exact value.
 * @param epochJdUt Julian Day (UT)
 */
export function prepareSiderealClock(epochJdUt: number): SiderealClock {
  const before = greenwichRad(epochJdUt - HALF_SPAN_DAYS);
  const after = greenwichRad(epochJdUt + HALF_SPAN_DAYS);
  const expectedTurnRad = TURNS_PER_DAY * 2 * HALF_SPAN_DAYS * TAU;
  const turnRad = expectedTurnRad + wrapPi(after - before - expectedTurnRad);
  const rateRadPerDay = turnRad / (2 * HALF_SPAN_DAYS);
  return {
    epochJdUt,
    greenwichAtEpochRad: greenwichRad(epochJdUt),
    rateRadPerDay,
    periodDays: TAU / rateRadPerDay,
  };
}

/** The instant nearest the epoch at which the local sidereal time has a given value. */
export function instantNearEpoch(
  clock: SiderealClock,
  localSiderealRad: number,
  longitudeRad: number,
): number {
  return (
    clock.epochJdUt +
    wrapPi(localSiderealRad - longitudeRad - clock.greenwichAtEpochRad) / clock.rateRadPerDay
  );
}

/** Local sidereal time at an instant, radians, not wrapped. */
export function localSiderealRad(clock: SiderealClock, jdUt: number, longitudeRad: number): number {
  return clock.greenwichAtEpochRad + clock.rateRadPerDay * (jdUt - clock.epochJdUt) + longitudeRad;
}
