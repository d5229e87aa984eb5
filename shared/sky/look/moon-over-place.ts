import type { MoonOverPlace, Site } from '../types.js';
import { DEG_PER_RAD } from '../units/angle.js';
import { bodyLightAt, bodyPlaceAt } from './body-places.js';

/**
 * The Moon at one instant over a place: how much of it is lit, and how high its centre stands, as the accounts of where to
 * look have it but without a star beside it.
 * @param jdUt Julian Day (UT)
 */
export function moonOverPlaceOf(site: Site, jdUt: number): MoonOverPlace {
  return {
    litShare: bodyLightAt('moon', jdUt).litShare,
    altitudeDeg: bodyPlaceAt('moon', site, jdUt).altitudeRad * DEG_PER_RAD,
  };
}
