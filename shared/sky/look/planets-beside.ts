import type { HorizontalPlace } from '../horizon/horizontal.js';
import type { Site } from '../types.js';
import { DEG_PER_RAD } from '../units/angle.js';
import { bodyLightAt, bodyPlaceAt } from './body-places.js';
import { bearingRad, separationRad } from './direction.js';
import { NAKED_EYE_PLANETS } from '../vocabulary.js';
import type { PlanetBeside } from './look-types.js';
import type { SkyAt } from './sky-at.js';

/** Planets are the commonest mistake for a first star: whatever shines in this circle could be taken for it. */
const CIRCLE_DEG = 30;
/** Up to a magnitude fainter still looks much like the star; nearer than one hand, anything may. */
const LIKE_IT_MAG = 1;
const ONE_HAND_DEG = 10;
/** Fainter than the sixth magnitude nobody sees anything. */
const FAINTEST_MAG = 5;

/** A star at the moments of a watch. */
export interface StarThen {
  sky: SkyAt;
  star: HorizontalPlace;
}

/**
 * Every planet within 30° of the star that is brighter than it, like it, or near it, while both stand over the skyline.
 * @param moments the best moment first: a planet is told where it stands at the first of them at which it is up
 */
export function planetsBeside(site: Site, starMag: number, moments: readonly StarThen[]): PlanetBeside[] {
  return NAKED_EYE_PLANETS.flatMap((planet) => {
    for (const { sky, star } of moments) {
      const at = bodyPlaceAt(planet, site, sky.jdUt);
      const aboveSkylineDeg = sky.aboveSkylineRad(at) * DEG_PER_RAD;
      const separationDeg = separationRad(star, at) * DEG_PER_RAD;
      if (aboveSkylineDeg < 0 || separationDeg > CIRCLE_DEG) continue;
      const { vMag } = bodyLightAt(planet, sky.jdUt);
      const isLikely =
        vMag <= starMag + LIKE_IT_MAG || (separationDeg <= ONE_HAND_DEG && vMag <= FAINTEST_MAG);
      if (!isLikely) return [];
      return [
        {
          planet,
          jdUt: sky.jdUt,
          vMag,
          azimuthDeg: at.azimuthRad * DEG_PER_RAD,
          altitudeDeg: at.altitudeRad * DEG_PER_RAD,
          aboveSkylineDeg,
          separationDeg,
          bearingDeg: bearingRad(star, at) * DEG_PER_RAD,
          isBrighter: vMag < starMag,
        },
      ];
    }
    return [];
  }).sort((a, b) => a.vMag - b.vMag);
}
