import type { HorizontalPlace } from '../horizon/horizontal.js';
import type { Site } from '../types.js';
import { DEG_PER_RAD } from '../units/angle.js';
import { bodyLightAt, bodyPlaceAt, moonAheadDeg } from './body-places.js';
import { separationRad } from './direction.js';
import { MOON_SHAPES, type Moonlight, type MoonShape } from '../vocabulary.js';
import type { MoonThen } from './look-types.js';
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

/**
 * A plain rule for plain eyes: a thin or a set Moon takes nothing; a bright one takes most near itself and, when nearly
 * full, everywhere.
 */
export function moonlightOf(isUp: boolean, litShare: number, separationDeg: number): Moonlight {
  if (!isUp || litShare < 0.1) return 'none';
  if (litShare >= 0.9) return separationDeg < 90 ? 'strong' : 'some';
  if (litShare >= 0.4) return separationDeg < 40 ? 'strong' : 'some';
  return separationDeg < 15 ? 'some' : 'none';
}

/** @param star null where the star has no place in the sky to be measured from */
export function moonThen(site: Site, sky: SkyAt, star: HorizontalPlace | null): MoonThen {
  const at = bodyPlaceAt('moon', site, sky.jdUt);
  const { vMag, litShare } = bodyLightAt('moon', sky.jdUt);
  const aboveSkylineDeg = sky.aboveSkylineRad(at) * DEG_PER_RAD;
  const isUp = aboveSkylineDeg >= 0;
  const separationDeg = star === null ? null : separationRad(star, at) * DEG_PER_RAD;
  return {
    shape: moonShapeOf(moonAheadDeg(sky.jdUt)),
    litShare,
    azimuthDeg: at.azimuthRad * DEG_PER_RAD,
    altitudeDeg: at.altitudeRad * DEG_PER_RAD,
    aboveSkylineDeg,
    isUp,
    vMag,
    separationDeg,
    moonlight: separationDeg === null ? 'none' : moonlightOf(isUp, litShare, separationDeg),
  };
}
