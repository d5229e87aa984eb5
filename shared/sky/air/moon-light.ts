import { bodyLightAt, bodyPlaceAt } from '../look/body-places.js';
import { separationRad } from '../look/direction.js';
import type { Site } from '../types.js';
import { DEG_PER_RAD } from '../units/angle.js';
import { moonlightNl } from '../visibility/moonlight.js';
import type { MoonNl } from './sighting.js';

/**
 * Light of the Moon as it stands at one moment. It moves by half a degree in an hour, so one moment serves a morning or an
 * evening; only its own rising or setting in between is missed.
 */
export function moonNlAt(site: Site, jdUt: number): MoonNl {
  const moon = bodyPlaceAt('moon', site, jdUt);
  const { litShare } = bodyLightAt('moon', jdUt);
  const phaseAngleDeg = Math.acos(Math.min(1, Math.max(-1, 2 * litShare - 1))) * DEG_PER_RAD;
  return (air, altitudeRad, azimuthRad) =>
    moonlightNl(
      air.magPerAirmass,
      altitudeRad * DEG_PER_RAD,
      moon.altitudeRad * DEG_PER_RAD,
      separationRad(moon, { altitudeRad, azimuthRad }) * DEG_PER_RAD,
      phaseAngleDeg,
    );
}
