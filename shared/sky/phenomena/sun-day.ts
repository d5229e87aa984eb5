import { refractionDeg } from '../horizon/refraction.js';
import { levelSkyline, prepareSkyline, type Skyline } from '../horizon/skyline.js';
import { starPathOf } from '../horizon/star-path.js';
import type { SkylinePoint } from '../types.js';
import { DEG_PER_RAD, RAD_PER_DEG, TAU, wrapPi } from '../units/angle.js';
import type { PreparedYear } from './prepared-year.js';
import type { Ground } from './skyline-crossing.js';
import { type SunPlace, sunPlaceAt } from './sun-place.js';

/** Mean radius of the Sun's disc; it varies by a quarter of a minute of arc through the year. */
const SUN_RADIUS_DEG = 16 / 60;
/** Each step leaves the Sun's motion in a few minutes: two are enough, the third is for grazing paths. */
const STEPS = 3;

export interface SunMoment extends SunPlace {
  jdUt: number;
}

/**
 * The instant (JD UT) at which local mean solar time reaches an hour of a solar day.
 * @param solarDay counted as day numbers are, by local mean solar time
 */
export function solarInstant(ground: Ground, solarDay: number, solarHour: number): number {
  return solarDay - ground.longitudeRad / TAU + (solarHour - 12) / 24;
}

/** The Sun at its upper culmination on a solar day. */
export function sunAtNoon(year: PreparedYear, ground: Ground, solarDay: number): SunMoment {
  const meanNoon = solarInstant(ground, solarDay, 12);
  const jdUt = meanNoon - sunPlaceAt(year, ground, meanNoon).hourAngleRad / TAU;
  return { ...sunPlaceAt(year, ground, jdUt), jdUt };
}

/**
 * The first upward or last downward crossing of a skyline by the Sun's centre on a solar day, without refraction; hand
 * over a lowered skyline for anything that is seen. Null where the Sun stays above or below it.
 */
export function sunCrossing(
  year: PreparedYear,
  ground: Ground,
  solarDay: number,
  skyline: Skyline,
  which: 'rising' | 'setting',
): SunMoment | null {
  let sun = sunAtNoon(year, ground, solarDay);
  for (let step = 0; step < STEPS; step += 1) {
    const path = starPathOf(ground.latitude, { ...sun, rightAscensionRad: 0 }, skyline);
    if (path.outcome !== 'rises-and-sets') return null;
    const goalRad = which === 'rising' ? path.riseHourAngleRad : path.setHourAngleRad;
    const jdUt = sun.jdUt + wrapPi(goalRad - sun.hourAngleRad) / TAU;
    sun = { ...sunPlaceAt(year, ground, jdUt), jdUt };
  }
  return sun;
}

/** How much lower than a skyline the Sun's centre stands when its upper edge shows over it [Bennett1982]. */
function edgeLiftDeg(skylineAltitudeDeg: number): number {
  return refractionDeg(skylineAltitudeDeg) + SUN_RADIUS_DEG;
}

/** The skyline that the Sun's true centre crosses when its upper edge is seen on the real one. */
export function sunriseSkyline(points: readonly SkylinePoint[]): Skyline {
  if (points.length === 0) return levelSkyline(-edgeLiftDeg(0) * RAD_PER_DEG);
  return prepareSkyline(
    points.map(({ azimuthDeg, altitudeDeg }) => ({
      azimuthDeg,
      altitudeDeg: altitudeDeg - edgeLiftDeg(altitudeDeg),
    })),
  );
}

/** By how much the Sun's upper edge stands over the place's skyline, with refraction, radians. */
export function edgeClearanceRad(ground: Ground, sun: SunPlace): number {
  const skylineRad = ground.skyline.altitudeRad(sun.azimuthRad);
  return sun.altitudeRad - skylineRad + edgeLiftDeg(skylineRad * DEG_PER_RAD) * RAD_PER_DEG;
}
