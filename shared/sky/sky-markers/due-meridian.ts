import { solarInstant } from '../phenomena/sun-day.js';
import { type SkyMarkerKindRules, solarDaysOf, undated } from './kind.js';
import { checkSolarHour, checkWord } from './spec-checks.js';
import { knownMarker, StarLook } from './star-look.js';
import { FACINGS } from './words.js';

/**
 * The star on the meridian, at its highest, at an hour of local mean solar time: a fixed hour sees the sky turn by
 * 0.9856° a day [Aoki1982]. The eye judges "due south" to some 2.5° of sky; haze does not matter.
 */
export const dueMeridian: SkyMarkerKindRules<'due-meridian'> = {
  sourceKey: 'Aoki1982',
  rangeReason: 'eye-direction',
  check(spec, field, figures) {
    knownMarker(spec.markerKey, `${field}.markerKey`, figures);
    checkWord(`${field}.facing`, spec.facing, FACINGS);
    checkSolarHour(`${field}.solarHour`, spec.solarHour);
  },
  compute(spec, place) {
    const look = new StarLook(place, spec.markerKey);
    const toleranceDeg = look.eyeHourAngleDeg;
    if (look.culminatesInSouth !== (spec.facing === 'south')) {
      return undated('star-passes-other-side', toleranceDeg);
    }
    const samples = solarDaysOf(place).map((day) => {
      const jdUt = solarInstant(place.ground, day, spec.solarHour);
      return { jdUt, valueRad: look.hourAngleRad(jdUt) };
    });
    return look.findings(samples, toleranceDeg);
  },
};
