import { AstroTime, Body, Equator, Horizon, Illumination, MoonPhase, Observer } from 'astronomy-engine';

import type { HorizontalPlace } from '../horizon/horizontal.js';
import { JD_J2000 } from '../time/julian-day.js';
import type { Site } from '../types.js';
import { RAD_PER_DEG, wrapTau } from '../units/angle.js';
import type { NakedEyePlanet } from '../vocabulary.js';

/** Where Moon and planets stand, by astronomy-engine: seen from the place itself, light time and aberration included. */

const BODIES: Readonly<Record<NakedEyePlanet | 'moon', Body>> = {
  moon: Body.Moon,
  mercury: Body.Mercury,
  venus: Body.Venus,
  mars: Body.Mars,
  jupiter: Body.Jupiter,
  saturn: Body.Saturn,
};

function timeOf(jdUt: number): AstroTime {
  return new AstroTime(jdUt - JD_J2000);
}

/**
 * Direction without refraction; against PyEphem within 0.01° for the planets and the Moon in the years of calendars
 * (tests/reference/against-ephem-bodies.test.ts).
 */
export function bodyPlaceAt(body: NakedEyePlanet | 'moon', site: Site, jdUt: number): HorizontalPlace {
  const time = timeOf(jdUt);
  const observer = new Observer(site.latitudeDeg, site.longitudeDeg, site.elevationM);
  const { ra, dec } = Equator(BODIES[body], time, observer, true, true);
  const { altitude, azimuth } = Horizon(time, observer, ra, dec);
  return { altitudeRad: altitude * RAD_PER_DEG, azimuthRad: wrapTau(azimuth * RAD_PER_DEG) };
}

/** Visual magnitude and the lit share of the disc, 0…1. Saturn's rings are in it. */
export function bodyLightAt(body: NakedEyePlanet | 'moon', jdUt: number): { vMag: number; litShare: number } {
  const { mag, phase_fraction: litShare } = Illumination(BODIES[body], timeOf(jdUt));
  return { vMag: mag, litShare };
}

/** How far the Moon has run ahead of the Sun: 0° new, 90° first quarter, 180° full; [0, 360). */
export function moonAheadDeg(jdUt: number): number {
  return MoonPhase(timeOf(jdUt));
}
