import { midnightOf, sinDeepestSun } from '../phenomena/deepest-sun.js';
import { clampUnit, RAD_PER_DEG } from '../units/angle.js';
import { dated, occurrenceOf, type SkyMarkerKindRules, solarDaysOf, undated } from './kind.js';
import { passagesOf } from './passages.js';
import { checkWord } from './spec-checks.js';
import { DARK_NIGHT_ENDS, NIGHT_DEPTHS_DEG } from './words.js';

/** Clear and hazy air differ by as much depth of the Sun (the clarity of a month). */
const AIR_DEG = 1;
/** The civil day of a night is that of its evening, so it is looked at an hour and a half before midnight. */
const BEFORE_MIDNIGHT_DAYS = 1 / 16;

/**
 * The light nights of summer: the Sun's greatest depth is 90° − |φ + δ☉| [Meeus1998 ch. 15]. "Last" is the last night whose
 * middle is so dark, "first" the first one again.
 */
export const darkNight: SkyMarkerKindRules<'dark-night'> = {
  sourceKey: 'Meeus1998',
  rangeReason: 'air-depth',
  check(spec, field) {
    checkWord(`${field}.end`, spec.end, DARK_NIGHT_ENDS);
    checkWord(`${field}.depthDeg`, spec.depthDeg, NIGHT_DEPTHS_DEG);
  },
  compute(spec, place) {
    const { ground, year } = place;
    const samples = solarDaysOf(place).map((night) => ({
      jdUt: midnightOf(ground, night) - BEFORE_MIDNIGHT_DAYS,
      valueRad: Math.asin(clampUnit(sinDeepestSun(year, ground, night))) - spec.depthDeg * RAD_PER_DEG,
    }));
    const passages = passagesOf(samples, {
      toleranceRad: AIR_DEG * RAD_PER_DEG,
      expected: 'not-below',
      neighbours: 'apart',
      touchCounts: false,
    });
    const wanted = passages.filter(({ goes }) => goes === (spec.end === 'first' ? 'up' : 'down'));
    if (wanted.length === 0) {
      const isDark = samples.some(({ valueRad }) => valueRad >= 0);
      return undated(isDark ? 'nights-always-dark' : 'nights-never-dark', AIR_DEG);
    }
    return dated(
      wanted.flatMap((passage) =>
        occurrenceOf(place, samples, passage, () => ({ azimuthDeg: null, altitudeDeg: null })),
      ),
      AIR_DEG,
    );
  },
};
