import {
  AstroTime,
  Body,
  EquatorFromVector,
  GeoVector,
  RotateVector,
  Rotation_EQJ_EQD,
} from 'astronomy-engine';

import { horizontalOf } from '../horizon/horizontal.js';
import { starPathOf } from '../horizon/star-path.js';
import { midnightOf, sinDeepestSun } from '../phenomena/deepest-sun.js';
import type { PreparedYear } from '../phenomena/prepared-year.js';
import { type Ground, sunAtCrossing } from '../phenomena/skyline-crossing.js';
import type { StarPlace } from '../stars/star-frame.js';
import { JD_J2000 } from '../time/julian-day.js';
import { localSiderealRad } from '../time/sidereal-clock.js';
import { RAD_PER_DEG, TAU, wrapPi } from '../units/angle.js';

/** Venus on the skyline. */
export interface VenusCrossing {
  jdUt: number;
  azimuthRad: number;
  altitudeRad: number;
  sunDepressionRad: number;
  sunAzimuthRad: number;
}

/** What Venus does around one noon; null where it never meets the skyline that day. */
export interface VenusDay {
  /** Its rising before that culmination, and its setting after it. */
  rising: VenusCrossing | null;
  setting: VenusCrossing | null;
  /** Sine of the Sun's greatest depth in the night before and in the night after. */
  sinDeepestBefore: number;
  sinDeepestAfter: number;
}

const STEPS = 3;

/** Apparent place of the true equator and equinox of date, from the Earth's centre; its parallax (30″) is left out. */
export function venusPlaceAt(jdUt: number): StarPlace {
  const time = new AstroTime(jdUt - JD_J2000);
  const vector = RotateVector(Rotation_EQJ_EQD(time), GeoVector(Body.Venus, time, true));
  const { ra, dec } = EquatorFromVector(vector);
  return {
    rightAscensionRad: ra * (TAU / 24),
    sinDeclination: Math.sin(dec * RAD_PER_DEG),
    cosDeclination: Math.cos(dec * RAD_PER_DEG),
  };
}

/** The instant near `aroundJdUt` at which Venus has an hour angle that its own place decides. */
function instantAt(
  year: PreparedYear,
  ground: Ground,
  aroundJdUt: number,
  hourAngleOf: (place: StarPlace) => number | null,
): { jdUt: number; place: StarPlace } | null {
  let jdUt = aroundJdUt;
  let place = venusPlaceAt(jdUt);
  for (let step = 0; step < STEPS; step += 1) {
    const wanted = hourAngleOf(place);
    if (wanted === null) return null;
    const siderealRad = localSiderealRad(year.sidereal, jdUt, ground.longitudeRad);
    jdUt += wrapPi(place.rightAscensionRad + wanted - siderealRad) / year.sidereal.rateRadPerDay;
    place = venusPlaceAt(jdUt);
  }
  return { jdUt, place };
}

/** Venus and the Sun at an instant, at the altitude where Venus stands. */
function venusAndSun(year: PreparedYear, ground: Ground, jdUt: number, place: StarPlace): VenusCrossing {
  const siderealRad = localSiderealRad(year.sidereal, jdUt, ground.longitudeRad);
  const hourAngleRad = siderealRad - place.rightAscensionRad;
  const venus = horizontalOf(ground.latitude, place.sinDeclination, place.cosDeclination, hourAngleRad);
  const sun = sunAtCrossing(year, ground.latitude, { siderealRad }, year.sun.longitudeRad(jdUt));
  return {
    jdUt,
    azimuthRad: venus.azimuthRad,
    altitudeRad: venus.altitudeRad,
    sunDepressionRad: sun.depressionRad,
    sunAzimuthRad: sun.azimuthRad,
  };
}

function crossingNear(
  year: PreparedYear,
  ground: Ground,
  transitJdUt: number,
  side: 'rising' | 'setting',
): VenusCrossing | null {
  const hourAngleOf = (place: StarPlace): number | null => {
    const path = starPathOf(ground.latitude, place, ground.skyline);
    if (path.outcome !== 'rises-and-sets') return null;
    return side === 'rising' ? path.riseHourAngleRad : path.setHourAngleRad;
  };
  const first = hourAngleOf(venusPlaceAt(transitJdUt));
  if (first === null) return null;
  const found = instantAt(year, ground, transitJdUt + first / year.sidereal.rateRadPerDay, hourAngleOf);
  if (!found) return null;
  const crossing = venusAndSun(year, ground, found.jdUt, found.place);
  // The skyline's own altitude, free of rounding: flat is exactly flat.
  return { ...crossing, altitudeRad: ground.skyline.altitudeRad(crossing.azimuthRad) };
}

/**
 * Venus' rising and setting over a place's skyline around one noon, true altitude, and the Sun's depth at both. Where
 * it stays over the skyline all day (far north or south) the Sun's deepest moment of the night stands for both.
 * @param year a prepared year within two years of the day
 * @param solarDay day number of the local mean solar day
 */
export function venusDayOf(year: PreparedYear, ground: Ground, solarDay: number): VenusDay {
  const noonJdUt = solarDay - ground.longitudeRad / TAU;
  const transit = instantAt(year, ground, noonJdUt, () => 0);
  const transitJdUt = transit?.jdUt ?? noonJdUt;
  const place = transit?.place ?? venusPlaceAt(noonJdUt);
  const alwaysUp = starPathOf(ground.latitude, place, ground.skyline).outcome === 'never-sets';
  const atMidnight = (night: number): VenusCrossing => {
    const jdUt = midnightOf(ground, night);
    return venusAndSun(year, ground, jdUt, venusPlaceAt(jdUt));
  };
  return {
    rising: alwaysUp ? atMidnight(solarDay - 1) : crossingNear(year, ground, transitJdUt, 'rising'),
    setting: alwaysUp ? atMidnight(solarDay) : crossingNear(year, ground, transitJdUt, 'setting'),
    sinDeepestBefore: sinDeepestSun(year, ground, solarDay - 1),
    sinDeepestAfter: sinDeepestSun(year, ground, solarDay),
  };
}
