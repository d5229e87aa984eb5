import { TAU } from '../units/angle.js';
import type { PreparedYear } from './prepared-year.js';
import type { Ground } from './skyline-crossing.js';

/** Local mean midnight (JD UT) of the night that begins on the evening of a day number. */
export function midnightOf(ground: Ground, nightNumber: number): number {
  return nightNumber + 0.5 - ground.longitudeRad / TAU;
}

/**
 * Sine of the Sun's greatest depth in a night: at its lower culmination, 90° − |latitude + declination|.
 * @param nightNumber the night that begins on the evening of this day number
 */
export function sinDeepestSun(year: PreparedYear, ground: Ground, nightNumber: number): number {
  // The Sun's own midnight differs by the equation of time, in which its declination moves by less than 0.01°.
  const sinDeclination = Math.sin(year.sun.longitudeRad(midnightOf(ground, nightNumber))) * year.sinObliquity;
  const cosDeclination = Math.sqrt(1 - sinDeclination * sinDeclination);
  return ground.latitude.cos * cosDeclination - ground.latitude.sin * sinDeclination;
}
