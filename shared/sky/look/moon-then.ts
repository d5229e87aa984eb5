import type { HorizontalPlace } from '../horizon/horizontal.js';
import type { Site } from '../types.js';
import { clampUnit, DEG_PER_RAD } from '../units/angle.js';
import type { Air } from '../visibility/air.js';
import { moonlightNl } from '../visibility/moonlight.js';
import { bodyLightAt, bodyPlaceAt, moonAheadDeg } from './body-places.js';
import { separationRad } from './direction.js';
import { MOON_SHAPES, type Moonlight, type MoonShape } from '../vocabulary.js';
import type { MoonThen } from './look-types.js';
import { sightMoment } from './look-path.js';
import type { Sight } from './sight-rule.js';
import type { SkyAt } from './sky-at.js';

/** New, half and full are moments; the eye gives them about a day and a half each (the Moon runs 12.2° a day). */
const QUARTER_HALF_WIDTH_DEG = 9;

/** @param aheadDeg how far the Moon has run ahead of the Sun, 0…360° */
export function moonShapeOf(aheadDeg: number): MoonShape {
  const quarter = Math.round(aheadDeg / 90);
  if (Math.abs(aheadDeg - quarter * 90) <= QUARTER_HALF_WIDTH_DEG)
    return MOON_SHAPES[(quarter % 4) * 2] ?? 'new';
  return MOON_SHAPES[Math.floor(aheadDeg / 90) * 2 + 1] ?? 'new';
}

/** Losses that nobody notices, and losses that take a star away unless it is bright. */
const NOTICED_MAG = 0.15;
const STRONG_MAG = 0.6;

/** @param lostMag by how much the faintest star that shows there is brighter under the Moon */
export function moonlightOf(lostMag: number): Moonlight {
  if (lostMag < NOTICED_MAG) return 'none';
  return lostMag < STRONG_MAG ? 'some' : 'strong';
}

/** The star that is looked for, at the moment of the Moon's place. */
export interface StarUnderMoon {
  star: HorizontalPlace;
  sight: Sight;
  air: Air;
}

/** @param under null where the star has no place in the sky */
export function moonThen(site: Site, sky: SkyAt, under: StarUnderMoon | null): MoonThen {
  const at = bodyPlaceAt('moon', site, sky.jdUt);
  const { vMag, litShare } = bodyLightAt('moon', sky.jdUt);
  const aboveSkylineDeg = sky.aboveSkylineRad(at) * DEG_PER_RAD;
  return {
    shape: moonShapeOf(moonAheadDeg(sky.jdUt)),
    litShare,
    azimuthDeg: at.azimuthRad * DEG_PER_RAD,
    altitudeDeg: at.altitudeRad * DEG_PER_RAD,
    aboveSkylineDeg,
    isUp: aboveSkylineDeg >= 0,
    vMag,
    separationDeg: under === null ? null : separationRad(under.star, at) * DEG_PER_RAD,
    moonlight: under === null ? 'none' : moonlightOf(lostUnder(sky, under, at, litShare)),
  };
}

/** Magnitudes that moonlight takes there [KrisciunasSchaefer1991]; a hill before the Moon does not keep its light back. */
function lostUnder(
  sky: SkyAt,
  { star, sight, air }: StarUnderMoon,
  moon: HorizontalPlace,
  litShare: number,
): number {
  const phaseAngleDeg = Math.acos(clampUnit(2 * litShare - 1)) * DEG_PER_RAD;
  const moonNl = moonlightNl(
    air.magPerAirmass,
    Math.max(0, star.altitudeRad * DEG_PER_RAD),
    moon.altitudeRad * DEG_PER_RAD,
    separationRad(star, moon) * DEG_PER_RAD,
    phaseAngleDeg,
  );
  const lost = sight.spareMag(sightMoment(sky, star)) - sight.spareMag(sightMoment(sky, star, moonNl));
  // Below the mathematical horizon, over a skyline that lies deeper, no star shows with or without the Moon.
  return Number.isNaN(lost) ? 0 : lost;
}
