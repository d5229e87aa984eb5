import {
  AstroTime,
  Body,
  Equator,
  EquatorFromVector,
  GeoVector,
  Observer,
  RotateVector,
  Rotation_EQJ_EQD,
  SiderealTime,
} from 'astronomy-engine';

import { type HorizontalPlace, horizontalOf, type Latitude, latitudeOf } from '../horizon/horizontal.js';
import { JD_J2000 } from '../time/julian-day.js';
import { clampUnit, DEG_PER_RAD, RAD_PER_DEG, TAU } from '../units/angle.js';

/** Where on Earth the Moon is looked at; sea level, as in the published tests. */
export interface MoonSite {
  latitudeDeg: number;
  longitudeDeg: number;
}

/** Moon and Sun at one instant, as the two published tests of the young Moon want them. */
export interface MoonAndSun {
  /** Seen from the place, without refraction. */
  moon: HorizontalPlace;
  sun: HorizontalPlace;
  /** Moon's altitude less the Sun's, seen from the Earth's centre on the place's horizon [Yallop1997]. */
  geocentricArcOfVisionDeg: number;
  /** The same seen from the place [Odeh2004]. */
  topocentricArcOfVisionDeg: number;
  /** Width of the lit crescent at its middle, by Yallop's and by Odeh's way, minutes of arc. */
  widthByYallopArcmin: number;
  widthByOdehArcmin: number;
}

const AU_KM = 149_597_870.7;
const EARTH_RADIUS_KM = 6378.137;
/** The Moon's radius in radii of the Earth's equator, as Yallop takes it [M]. */
const MOON_RADIUS_EARTHS = 0.27245;

interface Equatorial {
  ra: number;
  dec: number;
  dist: number;
}

function onHorizon(latitude: Latitude, siderealRad: number, { ra, dec }: Equatorial): HorizontalPlace {
  const decRad = dec * RAD_PER_DEG;
  return horizontalOf(latitude, Math.sin(decRad), Math.cos(decRad), siderealRad - ra * (TAU / 24));
}

function arcOfLightRad(moon: HorizontalPlace, sun: HorizontalPlace): number {
  const arcOfVision = moon.altitudeRad - sun.altitudeRad;
  return Math.acos(clampUnit(Math.cos(arcOfVision) * Math.cos(moon.azimuthRad - sun.azimuthRad)));
}

/** Width of the crescent, minutes of arc; the arc of light is that of the two tests, which takes altitudes as flat. */
function widthArcmin(semidiameterRad: number, moon: HorizontalPlace, sun: HorizontalPlace): number {
  return semidiameterRad * DEG_PER_RAD * 60 * (1 - Math.cos(arcOfLightRad(moon, sun)));
}

/**
 * Moon and Sun at an instant. Places by astronomy-engine, good to an arcminute in the present centuries
 * (tests/reference/against-ephem-moon.test.ts).
 * @param jdUt Julian Day (UT)
 */
export function moonAndSunAt(jdUt: number, site: MoonSite): MoonAndSun {
  const time = new AstroTime(jdUt - JD_J2000);
  const observer = new Observer(site.latitudeDeg, site.longitudeDeg, 0);
  const latitude = latitudeOf(site.latitudeDeg * RAD_PER_DEG);
  const siderealRad = SiderealTime(time) * (TAU / 24) + site.longitudeDeg * RAD_PER_DEG;
  const toDate = Rotation_EQJ_EQD(time);
  const fromCentre = (body: Body): Equatorial =>
    EquatorFromVector(RotateVector(toDate, GeoVector(body, time, true)));
  const fromPlace = (body: Body): Equatorial => Equator(body, time, observer, true, true);

  const centreMoon = fromCentre(Body.Moon);
  const placeMoon = fromPlace(Body.Moon);
  const geoMoon = onHorizon(latitude, siderealRad, centreMoon);
  const geoSun = onHorizon(latitude, siderealRad, fromCentre(Body.Sun));
  const moon = onHorizon(latitude, siderealRad, placeMoon);
  const sun = onHorizon(latitude, siderealRad, fromPlace(Body.Sun));

  const sinParallax = EARTH_RADIUS_KM / (centreMoon.dist * AU_KM);
  const centreSemidiameterRad = Math.asin(MOON_RADIUS_EARTHS * sinParallax);
  const liftedRad = centreSemidiameterRad * (1 + Math.sin(geoMoon.altitudeRad) * sinParallax);
  const placeSemidiameterRad = Math.asin((MOON_RADIUS_EARTHS * EARTH_RADIUS_KM) / (placeMoon.dist * AU_KM));
  return {
    moon,
    sun,
    geocentricArcOfVisionDeg: (geoMoon.altitudeRad - geoSun.altitudeRad) * DEG_PER_RAD,
    topocentricArcOfVisionDeg: (moon.altitudeRad - sun.altitudeRad) * DEG_PER_RAD,
    widthByYallopArcmin: widthArcmin(liftedRad, geoMoon, geoSun),
    widthByOdehArcmin: widthArcmin(placeSemidiameterRad, moon, sun),
  };
}
