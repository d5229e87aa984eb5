import { TAU } from '../units/angle.js';
import type { PreparedYear } from './prepared-year.js';
import type { EclipticZenith } from './ecliptic-zenith.js';
import { sinSunDepth, type SkylineCrossing } from './skyline-crossing.js';

/**
 * The closed form. At a fixed crossing the Sun is at least D deep on exactly one arc of longitude. The first crossing
 * in the arc is the dawn phenomenon (heliacal rising, cosmical setting), the last one the dusk phenomenon (acronychal
 * rising, heliacal setting): by the arc, not by the side on which the Sun stands, also where both ends of the arc lie
 * near midnight.
 */
export type ArcEnd = 'dawn' | 'dusk';

/** The depth that is needed at a crossing, as a sine; most rules ignore the Sun's longitude. */
export interface NeededDepth {
  sineAt(sunLongitudeRad: number): number;
}

/** Enough for a threshold that depends on the Sun's azimuth; a constant one is done after the first. */
const MAX_STEPS = 8;
const SETTLED = 1e-9;
/** The closed form and the crossings agree within one crossing; a varying threshold may ask for more. */
const MAX_WALK = 4;
const OTHER_TRIES = [-1, 1, 2, 3, 4] as const;

/**
 * Half the stretch of longitude in which the Sun is too high at a crossing, or null where it is never deep enough.
 * Measured from the crossing's `highestRad`, the arc runs from this value to 2π minus it.
 */
export function tooHighHalfArcRad(reach: number, sinDepth: number): number | null {
  // A reach of zero means that the zenith is the pole of the ecliptic: the Sun stands on the horizon all year.
  if (reach < 1e-12 || sinDepth > reach) return null;
  return Math.acos(-sinDepth / reach);
}

/**
 * Longitude of one end of the arc, for the turn of the Sun whose highest point lies at `highestUnwrappedRad`; null
 * where there is no arc.
 */
export function arcEndRad(
  crossing: EclipticZenith,
  highestUnwrappedRad: number,
  needed: NeededDepth,
  end: ArcEnd,
): number | null {
  let longitude = highestUnwrappedRad + Math.PI;
  let sine = needed.sineAt(longitude);
  for (let step = 0; step < MAX_STEPS; step += 1) {
    const half = tooHighHalfArcRad(crossing.reach, sine);
    longitude = highestUnwrappedRad + (half === null ? Math.PI : end === 'dawn' ? half : TAU - half);
    const next = needed.sineAt(longitude);
    if (Math.abs(next - sine) < SETTLED) return half === null ? null : longitude;
    sine = next;
  }
  return tooHighHalfArcRad(crossing.reach, sine) === null ? null : longitude;
}

/** Is the Sun deep enough at one return of the crossing, counted in sidereal days from its known instant? */
function darkEnough(
  year: PreparedYear,
  crossing: SkylineCrossing,
  turn: number,
  needed: NeededDepth,
): boolean {
  const sunLongitude = year.sun.longitudeRad(crossing.anInstantJdUt + turn * year.sidereal.periodDays);
  return sinSunDepth(crossing, sunLongitude) >= needed.sineAt(sunLongitude);
}

/**
 * The crossing (JD UT) that carries a phenomenon, or null where the arc is so short that no crossing falls into it.
 * The closed form leads to the arc's end; the crossings on both sides of it are then tried with the Sun itself.
 * @param longitudeRad the arc's end from `arcEndRad`
 */
export function crossingAtArcEnd(
  year: PreparedYear,
  crossing: SkylineCrossing,
  longitudeRad: number,
  needed: NeededDepth,
  end: ArcEnd,
): number | null {
  const { periodDays } = year.sidereal;
  const turns = (year.sun.instantOf(longitudeRad) - crossing.anInstantJdUt) / periodDays;
  const inward = end === 'dawn' ? 1 : -1;
  let turn = end === 'dawn' ? Math.ceil(turns) : Math.floor(turns);

  if (darkEnough(year, crossing, turn, needed)) {
    for (let step = 0; step < MAX_WALK && darkEnough(year, crossing, turn - inward, needed); step += 1)
      turn -= inward;
    return crossing.anInstantJdUt + turn * periodDays;
  }
  for (const step of OTHER_TRIES) {
    const candidate = turn + step * inward;
    if (darkEnough(year, crossing, candidate, needed)) return crossing.anInstantJdUt + candidate * periodDays;
  }
  return null;
}

/** The crossing (JD UT) nearest the middle of the arc, where the Sun is deepest. */
export function crossingAtDeepest(
  year: PreparedYear,
  crossing: SkylineCrossing,
  highestUnwrappedRad: number,
): number {
  const middle = year.sun.instantOf(highestUnwrappedRad + Math.PI);
  const turn = Math.round((middle - crossing.anInstantJdUt) / year.sidereal.periodDays);
  return crossing.anInstantJdUt + turn * year.sidereal.periodDays;
}
