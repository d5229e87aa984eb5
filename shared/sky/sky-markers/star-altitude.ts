import { RAD_PER_DEG } from '../units/angle.js';
import { type SkyMarkerKindRules, solarDaysOf, undated } from './kind.js';
import { checkSkyHour, instantsOf } from './sky-hour.js';
import { checkNumber, checkWord } from './spec-checks.js';
import { EYE_DEG, knownMarker, StarLook } from './star-look.js';
import { SKY_SIDES, STAR_ALTITUDE_DEG } from './words.js';

/**
 * The star at an altitude at a set time of the evening or morning [Meeus1998 ch. 13]. The eye measures in hand-widths,
 * to some 2.5°; haze does not move it. Two such days a year, told apart by the side of the sky.
 */
export const starAltitude: SkyMarkerKindRules<'star-altitude'> = {
  sourceKey: 'Meeus1998',
  rangeReason: 'eye-height',
  check(spec, field, figures) {
    knownMarker(spec.markerKey, `${field}.markerKey`, figures);
    const { min, max } = STAR_ALTITUDE_DEG;
    checkNumber(`${field}.altitudeDeg`, spec.altitudeDeg, min, max, 'degrees above the horizon');
    checkWord(`${field}.side`, spec.side, SKY_SIDES);
    checkSkyHour(`${field}.at`, spec.at);
  },
  compute(spec, place) {
    const look = new StarLook(place, spec.markerKey);
    const goalRad = spec.altitudeDeg * RAD_PER_DEG;
    const instantOf = instantsOf(spec.at, place);
    const samples = solarDaysOf(place).map((day) => {
      const jdUt = instantOf(day);
      return jdUt === null ? null : { jdUt, valueRad: look.standingAt(jdUt).altitudeRad - goalRad };
    });
    const known = samples.filter((sample) => sample !== null);
    const reaches = known.some(({ valueRad }) => valueRad >= 0) && known.some(({ valueRad }) => valueRad < 0);
    if (known.length > 0 && !reaches) return undated('altitude-not-reached', EYE_DEG);
    // East of the meridian the hour angle is negative.
    return look.findings(
      samples,
      EYE_DEG,
      (_, jdUt) => look.hourAngleRad(jdUt) < 0 === (spec.side === 'east'),
    );
  },
};
