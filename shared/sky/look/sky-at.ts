import { horizontalOf, type HorizontalPlace } from '../horizon/horizontal.js';
import type { PreparedYear } from '../phenomena/prepared-year.js';
import type { Ground } from '../phenomena/skyline-crossing.js';
import { sunPlaceAt } from '../phenomena/sun-place.js';
import type { StarPlace } from '../stars/star-frame.js';
import { localSiderealRad } from '../time/sidereal-clock.js';
import { DEG_PER_RAD } from '../units/angle.js';

/** The sky over a place at one moment: where the Sun is, and where any star stands. No refraction. */
export interface SkyAt {
  jdUt: number;
  sunAzimuthRad: number;
  sunDepressionDeg: number;
  starAt(place: StarPlace): HorizontalPlace;
  /** Altitude above the skyline in its own direction. */
  aboveSkylineRad(at: HorizontalPlace): number;
}

export function skyAt(year: PreparedYear, ground: Ground, jdUt: number): SkyAt {
  const sun = sunPlaceAt(year, ground, jdUt);
  const siderealRad = localSiderealRad(year.sidereal, jdUt, ground.longitudeRad);
  return {
    jdUt,
    sunAzimuthRad: sun.azimuthRad,
    sunDepressionDeg: -sun.altitudeRad * DEG_PER_RAD,
    starAt: ({ rightAscensionRad, sinDeclination, cosDeclination }) =>
      horizontalOf(ground.latitude, sinDeclination, cosDeclination, siderealRad - rightAscensionRad),
    aboveSkylineRad: ({ altitudeRad, azimuthRad }) => altitudeRad - ground.skyline.altitudeRad(azimuthRad),
  };
}
