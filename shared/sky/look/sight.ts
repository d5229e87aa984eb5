import type { HorizontalPlace } from '../horizon/horizontal.js';
import { DEG_PER_RAD } from '../units/angle.js';
import type { Air } from '../visibility/air.js';
import { faintestStarMag } from '../visibility/faintest-star.js';
import { neededForSightDeg, type SightRule } from './sight-rule.js';
import type { SkyAt } from './sky-at.js';

/** Tells of one star whether the sky is dark enough for it at a moment. */
export interface Sight {
  /** What is to spare, 0 and more where it shows; in a unit of its own, so that only sign and order count. */
  spare(sky: SkyAt, star: HorizontalPlace): number;
}

/** By the rule of the dates: degrees of the Sun's depth beyond the needed one. */
export function sightByDates(rule: SightRule, vMag: number): Sight {
  return {
    spare: (sky, { altitudeRad, azimuthRad }) =>
      sky.sunDepressionDeg -
      neededForSightDeg(rule, vMag, altitudeRad * DEG_PER_RAD, azimuthRad - sky.sunAzimuthRad),
  };
}

/**
 * By the model of visibility, without a Moon: magnitudes beyond the star's own.
 * @param offsetMag by which eyes here are better than the model has it; 0 leaves the model to itself
 */
export function sightByModel(air: Air, vMag: number, offsetMag: number): Sight {
  return {
    spare: (sky, { altitudeRad, azimuthRad }) =>
      faintestStarMag(air, {
        altitudeDeg: Math.max(0, altitudeRad * DEG_PER_RAD),
        sunAltitudeDeg: -sky.sunDepressionDeg,
        azimuthDifferenceDeg: (azimuthRad - sky.sunAzimuthRad) * DEG_PER_RAD,
        moonNl: 0,
      }) -
      vMag +
      offsetMag,
  };
}
