import { edgeClearanceRad, sunAtNoon } from '../phenomena/sun-day.js';
import { DEG_PER_RAD, RAD_PER_DEG } from '../units/angle.js';
import { dated, occurrenceOf, type SkyMarkerKindRules, solarDaysOf, undated } from './kind.js';
import { passagesOf } from './passages.js';
import { checkName, checkWord } from './spec-checks.js';
import { NOON_SUN_PASSAGES, POINT_NAME_MAX } from './words.js';

/** Half the Sun's disc: by as much the air near the ridge, snow and trees on it move what is seen. */
const HALF_SUN_DEG = 0.25;

/**
 * The noon Sun over the skyline at the meridian: its highest altitude 90° − |φ − δ|, lifted by refraction and radius,
 * against the skyline where it culminates [Bennett1982]. "Back" is the first day on which its edge shows, "gone" the last.
 */
export const noonSun: SkyMarkerKindRules<'noon-sun'> = {
  sourceKey: 'Bennett1982',
  rangeReason: 'noon-sun-edge',
  check(spec, field) {
    checkWord(`${field}.passage`, spec.passage, NOON_SUN_PASSAGES);
    checkName(`${field}.ridgeName`, spec.ridgeName, POINT_NAME_MAX);
  },
  compute(spec, place) {
    const suns = solarDaysOf(place).map((day) => sunAtNoon(place.year, place.ground, day));
    const samples = suns.map((sun) => ({ jdUt: sun.jdUt, valueRad: edgeClearanceRad(place.ground, sun) }));
    const passages = passagesOf(samples, {
      toleranceRad: HALF_SUN_DEG * RAD_PER_DEG,
      expected: 'not-below',
      neighbours: 'apart',
      touchCounts: false,
    });
    const wanted = passages.filter(({ goes }) => goes === (spec.passage === 'back' ? 'up' : 'down'));
    if (wanted.length === 0) {
      const clears = samples.some(({ valueRad }) => valueRad >= 0);
      return undated(clears ? 'noon-sun-always-clears' : 'noon-sun-never-clears', HALF_SUN_DEG);
    }
    return dated(
      wanted.flatMap((passage) => {
        const sun = suns[passage.expected];
        const degrees = (rad: number | undefined) => (rad === undefined ? null : rad * DEG_PER_RAD);
        return occurrenceOf(place, samples, passage, () => ({
          azimuthDeg: degrees(sun?.azimuthRad),
          altitudeDeg: degrees(sun?.altitudeRad),
        }));
      }),
      HALF_SUN_DEG,
    );
  },
};
