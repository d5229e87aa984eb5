import type { Air } from './air.js';
import { faintestMag } from './eye-threshold.js';
import { skyBrightnessNl } from './sky-brightness.js';

/** A direction in the sky of one moment; angles in degrees, without refraction. */
export interface SkyMoment {
  altitudeDeg: number;
  sunAltitudeDeg: number;
  azimuthDifferenceDeg: number;
  /** Light of the Moon there, nanolamberts; 0 without a Moon. */
  moonNl: number;
}

/**
 * Faintest star that shows at a place in the sky: what the eye finds before that ground, less what the air takes.
 * @param acuity sharpness of the eye, 1 for 20/20
 * @returns visual magnitude outside the air; −Infinity below the mathematical horizon
 */
export function faintestStarMag(air: Air, moment: SkyMoment, acuity = 1): number {
  const { altitudeDeg, sunAltitudeDeg, azimuthDifferenceDeg, moonNl } = moment;
  if (altitudeDeg < 0) return Number.NEGATIVE_INFINITY;
  const sky = skyBrightnessNl(air.magPerAirmass, altitudeDeg, sunAltitudeDeg, azimuthDifferenceDeg);
  return faintestMag(sky + moonNl, acuity) - air.dimmingMag(altitudeDeg);
}
