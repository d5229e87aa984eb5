import { horizontalOf, type Latitude } from '../horizon/horizontal.js';
import type { Skyline } from '../horizon/skyline.js';
import { starPathOf } from '../horizon/star-path.js';
import type { StarPlace, StarRef } from '../stars/star-frame.js';
import { instantNearEpoch } from '../time/sidereal-clock.js';
import { clampUnit, wrapTau } from '../units/angle.js';
import type { StarOutcome, StarOutcomeDetail } from '../vocabulary.js';
import { type EclipticZenith, eclipticZenithAt } from './ecliptic-zenith.js';
import type { PreparedYear } from './prepared-year.js';

/** The part of a place that geometry needs. */
export interface Ground {
  latitude: Latitude;
  longitudeRad: number;
  skyline: Skyline;
}

/**
 * One kind of moment that returns every sidereal day (a star's rising, its setting or its culmination), with the
 * ecliptic as it stands over the place at that moment.
 */
export interface SkylineCrossing extends EclipticZenith {
  siderealRad: number;
  starAltitudeRad: number;
  starAzimuthRad: number;
  /** One of the instants (JD UT), the one nearest the year's middle; the others follow at sidereal days. */
  anInstantJdUt: number;
}

export interface StarAtPlace {
  outcome: StarOutcome;
  detail: StarOutcomeDetail | null;
  /** Null unless the outcome is `rises-and-sets`. */
  crossings: { rising: SkylineCrossing; setting: SkylineCrossing } | null;
}

function crossingAt(
  year: PreparedYear,
  ground: Ground,
  place: StarPlace,
  hourAngleRad: number,
): SkylineCrossing {
  const siderealRad = place.rightAscensionRad + hourAngleRad;
  const zenith = eclipticZenithAt(year, ground.latitude, siderealRad);
  const { sinDeclination, cosDeclination } = place;
  const star = horizontalOf(ground.latitude, sinDeclination, cosDeclination, hourAngleRad);
  return {
    reach: zenith.reach,
    highestRad: zenith.highestRad,
    siderealRad,
    starAltitudeRad: star.altitudeRad,
    starAzimuthRad: star.azimuthRad,
    anInstantJdUt: instantNearEpoch(year.sidereal, siderealRad, ground.longitudeRad),
  };
}

/** At a crossing the star's altitude is the skyline's own, free of rounding: flat is exactly flat. */
function onSkyline(crossing: SkylineCrossing, ground: Ground): SkylineCrossing {
  crossing.starAltitudeRad = ground.skyline.altitudeRad(crossing.starAzimuthRad);
  return crossing;
}

/** A star's rising and setting over a place's skyline in a prepared year. */
export function starAtPlace(year: PreparedYear, ground: Ground, star: StarRef): StarAtPlace {
  const place = year.stars.placeOf(star);
  const path = starPathOf(ground.latitude, place, ground.skyline);
  if (path.outcome !== 'rises-and-sets')
    return { outcome: path.outcome, detail: path.detail, crossings: null };
  return {
    outcome: path.outcome,
    detail: path.detail,
    crossings: {
      rising: onSkyline(crossingAt(year, ground, place, path.riseHourAngleRad), ground),
      setting: onSkyline(crossingAt(year, ground, place, path.setHourAngleRad), ground),
    },
  };
}

/** The star's upper culmination, whatever the skyline. */
export function culminationOf(year: PreparedYear, ground: Ground, star: StarRef): SkylineCrossing {
  return crossingAt(year, ground, year.stars.placeOf(star), 0);
}

/** Sine of the Sun's depth at the crossing when the Sun has a given longitude. */
export function sinSunDepth(crossing: EclipticZenith, sunLongitudeRad: number): number {
  return -crossing.reach * Math.cos(sunLongitudeRad - crossing.highestRad);
}

/** Depth and azimuth of the Sun at a crossing. */
export function sunAtCrossing(
  year: PreparedYear,
  latitude: Latitude,
  crossing: Pick<SkylineCrossing, 'siderealRad'>,
  sunLongitudeRad: number,
): { depressionRad: number; azimuthRad: number } {
  const sinLongitude = Math.sin(sunLongitudeRad);
  const x = Math.cos(sunLongitudeRad);
  const y = sinLongitude * year.cosObliquity;
  const sinDeclination = sinLongitude * year.sinObliquity;
  const cosSidereal = Math.cos(crossing.siderealRad);
  const sinSidereal = Math.sin(crossing.siderealRad);
  const towardMeridian = x * cosSidereal + y * sinSidereal;
  const east = y * cosSidereal - x * sinSidereal;
  const north = latitude.cos * sinDeclination - latitude.sin * towardMeridian;
  const up = latitude.sin * sinDeclination + latitude.cos * towardMeridian;
  return { depressionRad: -Math.asin(clampUnit(up)), azimuthRad: wrapTau(Math.atan2(east, north)) };
}
