import { wrapPi } from '../units/angle.js';
import type { Latitude } from '../horizon/horizontal.js';

/** Sine and cosine of the obliquity of the ecliptic. */
export interface Obliquity {
  sinObliquity: number;
  cosObliquity: number;
}

/**
 * The zenith as seen from the ecliptic. At a fixed local sidereal time the ecliptic stands still over the place, and
 * a Sun at longitude λ has sin(altitude) = reach · cos(λ − highest).
 */
export interface EclipticZenith {
  /** Length of the zenith's part in the plane of the ecliptic; the Sun can be asin(reach) deep at most. */
  reach: number;
  /** Longitude at which the Sun would stand highest, radians in [−π, π]. */
  highestRad: number;
}

export function eclipticZenithAt(
  obliquity: Obliquity,
  latitude: Latitude,
  localSiderealRad: number,
): EclipticZenith {
  const towardEquinox = latitude.cos * Math.cos(localSiderealRad);
  const towardSolstice =
    latitude.cos * Math.sin(localSiderealRad) * obliquity.cosObliquity +
    latitude.sin * obliquity.sinObliquity;
  return {
    reach: Math.sqrt(towardEquinox * towardEquinox + towardSolstice * towardSolstice),
    highestRad: Math.atan2(towardSolstice, towardEquinox),
  };
}

/**
 * How far `highestRad` moves, followed continuously, while the sidereal time runs from one value to a later one less
 * than a turn away. Outside the polar circles the zenith goes once around the pole of the ecliptic in a turn and the
 * longitude never departs by half a turn from the sidereal time; inside them it swings to and fro about the solstice.
 */
export function highestTravelRad(
  obliquity: Obliquity,
  latitude: Latitude,
  fromSiderealRad: number,
  toSiderealRad: number,
): number {
  const from = eclipticZenithAt(obliquity, latitude, fromSiderealRad).highestRad;
  const to = eclipticZenithAt(obliquity, latitude, toSiderealRad).highestRad;
  const goesAround = Math.abs(latitude.sin) * obliquity.sinObliquity < latitude.cos * obliquity.cosObliquity;
  if (goesAround) {
    return toSiderealRad - fromSiderealRad + wrapPi(to - toSiderealRad) - wrapPi(from - fromSiderealRad);
  }
  const solstice = latitude.sin >= 0 ? Math.PI / 2 : -Math.PI / 2;
  return wrapPi(to - solstice) - wrapPi(from - solstice);
}
