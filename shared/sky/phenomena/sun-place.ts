import { horizontalOf, type HorizontalPlace } from '../horizon/horizontal.js';
import { localSiderealRad } from '../time/sidereal-clock.js';
import { wrapPi } from '../units/angle.js';
import type { PreparedYear } from './prepared-year.js';
import type { Ground } from './skyline-crossing.js';

export interface SunPlace extends HorizontalPlace {
  /** [−π, π), west positive. */
  hourAngleRad: number;
  sinDeclination: number;
  cosDeclination: number;
}

/**
 * Where the Sun's centre stands over a place, without refraction.
 * @param jdUt Julian Day (UT) within 1800 days of the prepared year's middle
 */
export function sunPlaceAt(year: PreparedYear, ground: Ground, jdUt: number): SunPlace {
  const longitude = year.sun.longitudeRad(jdUt);
  const sinDeclination = Math.sin(longitude) * year.sinObliquity;
  const rightAscension = Math.atan2(Math.sin(longitude) * year.cosObliquity, Math.cos(longitude));
  const hourAngleRad = wrapPi(localSiderealRad(year.sidereal, jdUt, ground.longitudeRad) - rightAscension);
  const cosDeclination = Math.sqrt(1 - sinDeclination * sinDeclination);
  const horizontal = horizontalOf(ground.latitude, sinDeclination, cosDeclination, hourAngleRad);
  return { ...horizontal, hourAngleRad, sinDeclination, cosDeclination };
}
