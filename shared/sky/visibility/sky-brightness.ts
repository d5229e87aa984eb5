import { clampUnit, DEG_PER_RAD, RAD_PER_DEG } from '../units/angle.js';
import { wholeAirmass } from './airmass.js';

/**
 * Brightness of the cloudless sky behind a star, in nanolamberts (V band): the glow of the night and the light of the
 * Sun, by day or in twilight whichever is less [Schaefer1993]. Published variants of the day and twilight terms
 * disagree by up to a magnitude; against measurements at the zenith the twilight is within one magnitude [Patat2006].
 * The Moon stands in moonlight.ts.
 */

/** erg s⁻¹ cm⁻² µm⁻¹ arcsec⁻² in one nanolambert. */
const PER_NANOLAMBERT = 1.11e-15;
/** Glow of the moonless zenith in mean years of the Sun's cycle. */
const NIGHT_GLOW = 1e-13;
const SUN_MAG = -26.74;
const ZERO_MAG = -11.05;
const SUN_ABOVE_ZERO = 10 ** (-0.4 * (SUN_MAG - ZERO_MAG));
/** The Sun's airmass once it is down. */
const SUNKEN_AIRMASS = 40;

/** Share of light that is left after a path through air. */
const passing = (magnitudes: number): number => 10 ** (-0.4 * magnitudes);

function nightGlow(sinZenith: number, airMag: number): number {
  const layer = 0.4 + 0.6 / Math.sqrt(1 - 0.96 * sinZenith * sinZenith);
  return NIGHT_GLOW * layer * passing(airMag);
}

function twilight(
  magPerAirmass: number,
  zenithDeg: number,
  sunAltitudeDeg: number,
  fromSunDeg: number,
  airMag: number,
): number {
  const fall = 32.5 - sunAltitudeDeg - zenithDeg / (360 * magPerAirmass);
  return SUN_ABOVE_ZERO * passing(fall) * (100 / fromSunDeg) * (1 - passing(airMag));
}

function daylight(
  magPerAirmass: number,
  sunAltitudeDeg: number,
  fromSunDeg: number,
  cosFromSun: number,
  airMag: number,
): number {
  const sunAirmass = sunAltitudeDeg > 0 ? wholeAirmass(sunAltitudeDeg) : SUNKEN_AIRMASS;
  const sunLeft = passing(magPerAirmass * sunAirmass);
  const scattered =
    6.2e7 / (fromSunDeg * fromSunDeg) +
    10 ** (6.15 - fromSunDeg / 40) +
    10 ** 5.36 * (1.06 + cosFromSun * cosFromSun);
  return (
    SUN_ABOVE_ZERO * passing(43.27) * (1 - passing(airMag)) * (scattered * sunLeft + 440_000 * (1 - sunLeft))
  );
}

/** The Sun is never looked at: nearer than this its own light hides everything. */
const LEAST_FROM_SUN_DEG = 1;

/**
 * @param magPerAirmass extinction overhead, 0.05…1
 * @param altitudeDeg where one looks, 0…90
 * @param sunAltitudeDeg negative when the Sun is down
 * @param azimuthDifferenceDeg between that direction and the Sun
 * @returns nanolamberts; about 60 at a dark zenith
 */
export function skyBrightnessNl(
  magPerAirmass: number,
  altitudeDeg: number,
  sunAltitudeDeg: number,
  azimuthDifferenceDeg: number,
): number {
  const altitudeRad = altitudeDeg * RAD_PER_DEG;
  const sunRad = sunAltitudeDeg * RAD_PER_DEG;
  const sinZenith = Math.cos(altitudeRad);
  const airMag = magPerAirmass * wholeAirmass(altitudeDeg);
  const cosFromSun = clampUnit(
    Math.sin(altitudeRad) * Math.sin(sunRad) +
      sinZenith * Math.cos(sunRad) * Math.cos(azimuthDifferenceDeg * RAD_PER_DEG),
  );
  const fromSunDeg = Math.max(LEAST_FROM_SUN_DEG, Math.acos(cosFromSun) * DEG_PER_RAD);
  const sunlight = Math.min(
    twilight(magPerAirmass, 90 - altitudeDeg, sunAltitudeDeg, fromSunDeg, airMag),
    daylight(magPerAirmass, sunAltitudeDeg, fromSunDeg, cosFromSun, airMag),
  );
  return (nightGlow(sinZenith, airMag) + sunlight) / PER_NANOLAMBERT;
}
