import { RAD_PER_DEG } from '../units/angle.js';

/**
 * Light that the Moon spreads over the sky [KrisciunasSchaefer1991], good to 8–23 % there. Nothing while it is down.
 */

/** Path through air for scattered moonlight: 5 at the horizon. */
function moonAirmass(altitudeDeg: number): number {
  const sinZenith = Math.cos(altitudeDeg * RAD_PER_DEG);
  return 1 / Math.sqrt(1 - 0.96 * sinZenith * sinZenith);
}

/**
 * @param magPerAirmass extinction overhead
 * @param altitudeDeg where one looks, 0…90
 * @param moonAltitudeDeg true altitude of the Moon
 * @param fromMoonDeg angle between the two
 * @param phaseAngleDeg 0 at full Moon, 180 at new Moon
 * @returns nanolamberts
 */
export function moonlightNl(
  magPerAirmass: number,
  altitudeDeg: number,
  moonAltitudeDeg: number,
  fromMoonDeg: number,
  phaseAngleDeg: number,
): number {
  if (moonAltitudeDeg <= 0) return 0;
  const phase = Math.abs(phaseAngleDeg);
  const moon = 10 ** (-0.4 * (3.84 + 0.026 * phase + 4e-9 * phase ** 4));
  const cosine = Math.cos(fromMoonDeg * RAD_PER_DEG);
  const scattered = 10 ** 5.36 * (1.06 + cosine * cosine) + 10 ** (6.15 - fromMoonDeg / 40);
  const moonPath = 10 ** (-0.4 * magPerAirmass * moonAirmass(moonAltitudeDeg));
  const skyPath = 1 - 10 ** (-0.4 * magPerAirmass * moonAirmass(altitudeDeg));
  return scattered * moon * moonPath * skyPath;
}
