import type { PreparedYear } from './prepared-year.js';
import type { Ground } from './skyline-crossing.js';

/**
 * Sine of the Sun's greatest depth in a night: at its lower culmination, 90° − |latitude + declination|.
 * @param nightNumber the night that begins on the evening of this day number
 */
export function sinDeepestSun(year: PreparedYear, ground: Ground, nightNumber: number): number {
  // Local mean midnight; the equation of time moves the declination by less than 0.01°.
  const midnightJdUt = nightNumber + 0.5 - ground.longitudeRad / (2 * Math.PI);
  const sinDeclination = Math.sin(year.sun.longitudeRad(midnightJdUt)) * year.sinObliquity;
  const cosDeclination = Math.sqrt(1 - sinDeclination * sinDeclination);
  return ground.latitude.cos * cosDeclination - ground.latitude.sin * sinDeclination;
}
