import { clampUnit, wrapTau } from '../units/angle.js';

/** Sine and cosine of a place's latitude. */
export interface Latitude {
  sin: number;
  cos: number;
}

export interface HorizontalPlace {
  altitudeRad: number;
  /** From north through east, [0, 2π). */
  azimuthRad: number;
}

export function latitudeOf(latitudeRad: number): Latitude {
  // The cosine is never negative on Earth; rounding at a pole must not make it so.
  return { sin: Math.sin(latitudeRad), cos: Math.max(0, Math.cos(latitudeRad)) };
}

/**
 * Altitude and azimuth of a direction, without refraction.
 * At a pole the azimuth counts from the meridian of the given longitude.
 */
export function horizontalOf(
  latitude: Latitude,
  sinDeclination: number,
  cosDeclination: number,
  hourAngleRad: number,
): HorizontalPlace {
  const cosHour = Math.cos(hourAngleRad);
  const east = -cosDeclination * Math.sin(hourAngleRad);
  const north = latitude.cos * sinDeclination - latitude.sin * cosDeclination * cosHour;
  const up = latitude.sin * sinDeclination + latitude.cos * cosDeclination * cosHour;
  return { altitudeRad: Math.asin(clampUnit(up)), azimuthRad: wrapTau(Math.atan2(east, north)) };
}
