import { RAD_PER_DEG } from '../units/angle.js';

/**
 * How much air the light of a star crosses, in units of the air overhead. All take the true altitude in degrees;
 * below the mathematical horizon the value of the horizon stands. Each falls from the horizon to 1 at the zenith.
 */

function cosZenith(altitudeDeg: number): number {
  return Math.sin(Math.max(0, altitudeDeg) * RAD_PER_DEG);
}

/** All of the air as one: 40 at the horizon [Rozenberg1966]. */
export function wholeAirmass(altitudeDeg: number): number {
  const cosine = cosZenith(altitudeDeg);
  return 1 / (cosine + 0.025 * Math.exp(-11 * cosine));
}

/** Gas and water vapour: 35 at the horizon [Schaefer1993]. */
export function gasAirmass(altitudeDeg: number): number {
  const cosine = cosZenith(altitudeDeg);
  return 1 / (cosine + 0.0286 * Math.exp(-10.5 * cosine));
}

/** Haze, which lies lower than the gas: 81 at the horizon [Schaefer1993]. */
export function aerosolAirmass(altitudeDeg: number): number {
  const cosine = cosZenith(altitudeDeg);
  return 1 / (cosine + 0.0123 * Math.exp(-24.5 * cosine));
}

const OZONE_HEIGHT_KM = 20;
const EARTH_RADIUS_KM = 6378;
const OZONE_RADII = 1 + OZONE_HEIGHT_KM / EARTH_RADIUS_KM;

/** A thin layer of ozone at 20 km: 12.7 at the horizon [Schaefer1993]. */
export function ozoneAirmass(altitudeDeg: number): number {
  const sine = Math.cos(Math.max(0, altitudeDeg) * RAD_PER_DEG) / OZONE_RADII;
  return 1 / Math.sqrt(1 - sine * sine);
}
