import { levelSkyline } from '../horizon/skyline.js';
import { sunCrossing } from '../phenomena/sun-day.js';
import { RAD_PER_DEG } from '../units/angle.js';
import { type SkyMarkerKindRules, solarDaysOf } from './kind.js';
import { checkWord } from './spec-checks.js';
import { knownMarker, StarLook } from './star-look.js';
import { TWILIGHT_DEPTHS_DEG, TWILIGHTS } from './words.js';

/**
 * The star on the meridian when the Sun is X deep: at dusk α★ = α☉ + H₀, at dawn α☉ − H₀ [Meeus1998 ch. 15]. Haze does
 * not matter, the eye does: it judges "highest" to some 2.5° of sky. In autumn of high latitudes dusk comes earlier as
 * fast as the stars do, and one culmination may be met three times: those passages are told as one, with one range.
 */
export const culmination: SkyMarkerKindRules<'culmination'> = {
  sourceKey: 'Meeus1998',
  rangeReason: 'eye-direction',
  check(spec, field, figures) {
    knownMarker(spec.markerKey, `${field}.markerKey`, figures);
    checkWord(`${field}.twilight`, spec.twilight, TWILIGHTS);
    checkWord(`${field}.depthDeg`, spec.depthDeg, TWILIGHT_DEPTHS_DEG);
  },
  compute(spec, place) {
    const look = new StarLook(place, spec.markerKey);
    const twilight = levelSkyline(-spec.depthDeg * RAD_PER_DEG);
    const which = spec.twilight === 'dusk' ? 'setting' : 'rising';
    const samples = solarDaysOf(place).map((day) => {
      const sun = sunCrossing(place.year, place.ground, day, twilight, which);
      return sun && { jdUt: sun.jdUt, valueRad: look.hourAngleRad(sun.jdUt) };
    });
    return look.findings(samples, look.eyeHourAngleDeg);
  },
};
