import { solarInstant } from '../phenomena/sun-day.js';
import { TAU, wrapPi } from '../units/angle.js';
import { type SkyMarkerKindRules, solarDaysOf } from './kind.js';
import { checkSolarHour, checkWord } from './spec-checks.js';
import { EYE_DEG, knownMarker, StarLook } from './star-look.js';
import { POLE_POSITIONS, type PolePosition } from './words.js';

/** Hour angle of a position for somebody who faces the northern pole; in the south left and right change places. */
const NORTHERN_HOUR_ANGLE_RAD: Readonly<Record<PolePosition, number>> = {
  highest: 0,
  left: TAU / 4,
  lowest: TAU / 2,
  right: -TAU / 4,
};

/**
 * Where a star stands on its circle about the pole at an hour of local mean solar time: the line from the pole turns by
 * 0.9856° a day, 30° a month [Aoki1982]. The eye compares it with a plumb line to some 2.5°. Made for places where the
 * star never sets; where its position lies behind the skyline, it is said.
 */
export const aboutPole: SkyMarkerKindRules<'about-pole'> = {
  sourceKey: 'Aoki1982',
  rangeReason: 'eye-direction',
  check(spec, field, figures) {
    knownMarker(spec.markerKey, `${field}.markerKey`, figures);
    checkWord(`${field}.position`, spec.position, POLE_POSITIONS);
    checkSolarHour(`${field}.solarHour`, spec.solarHour);
  },
  compute(spec, place) {
    const look = new StarLook(place, spec.markerKey);
    const mirrored = place.ground.latitude.sin < 0 ? -1 : 1;
    const goalRad = mirrored * NORTHERN_HOUR_ANGLE_RAD[spec.position];
    const samples = solarDaysOf(place).map((day) => {
      const jdUt = solarInstant(place.ground, day, spec.solarHour);
      return { jdUt, valueRad: wrapPi(look.hourAngleRad(jdUt) - goalRad) };
    });
    return look.findings(samples, EYE_DEG);
  },
};
