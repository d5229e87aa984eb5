import type { HorizontalPlace } from '../horizon/horizontal.js';
import { clampUnit, wrapTau } from '../units/angle.js';

/** Angle between two directions, [0, π]. */
export function separationRad(from: HorizontalPlace, to: HorizontalPlace): number {
  const turn = to.azimuthRad - from.azimuthRad;
  const cosine =
    Math.sin(from.altitudeRad) * Math.sin(to.altitudeRad) +
    Math.cos(from.altitudeRad) * Math.cos(to.altitudeRad) * Math.cos(turn);
  return Math.acos(clampUnit(cosine));
}

/** Which way the eye has to go: 0 is up, a quarter turn to the right (azimuths grow to the right), [0, 2π). */
export function bearingRad(from: HorizontalPlace, to: HorizontalPlace): number {
  const turn = to.azimuthRad - from.azimuthRad;
  const right = Math.sin(turn) * Math.cos(to.altitudeRad);
  const up =
    Math.cos(from.altitudeRad) * Math.sin(to.altitudeRad) -
    Math.sin(from.altitudeRad) * Math.cos(to.altitudeRad) * Math.cos(turn);
  return wrapTau(Math.atan2(right, up));
}
