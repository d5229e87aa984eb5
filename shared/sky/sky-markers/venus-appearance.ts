import { VENUS_APPEARANCES } from '../moon/words.js';
import { venusYearOf } from '../planets/venus-year.js';
import { labelledDay } from '../time/civil-day.js';
import type { Occurrence } from '../types.js';
import { scatterHalfWidthDeg } from '../visibility/range-width.js';
import { dated, type SkyMarkerKindRules, undated } from './kind.js';
import { checkWord } from './spec-checks.js';
import type { SkyMarkerOccurrence } from './types.js';

/** As bright as the brightest stars, and brighter. */
const VENUS_V_MAG = -3.8;

/** Before the Sun Venus goes so fast that depth alone leaves no range; a day is what eyes need at the least. */
function markerOccurrence({ expected, early, late, notes }: Occurrence): SkyMarkerOccurrence {
  const { dayNumber, gregorian, julian, jdUt, starAzimuthDeg, starAltitudeDeg } = expected;
  return {
    expected: {
      dayNumber,
      gregorian,
      julian,
      jdUt,
      azimuthDeg: starAzimuthDeg,
      altitudeDeg: starAltitudeDeg,
    },
    early: early && labelledDay(Math.min(early.dayNumber, dayNumber - 1)),
    late: late && labelledDay(Math.max(late.dayNumber, dayNumber + 1)),
    notes,
  };
}

/** Venus comes or goes, by the Sun's depth at its crossing of the skyline [Ptolemy]. */
export const venusAppearance: SkyMarkerKindRules<'venus-appearance'> = {
  sourceKey: 'Ptolemy',
  rangeReason: 'venus-depth',
  check(spec, field) {
    checkWord(`${field}.appearance`, spec.appearance, VENUS_APPEARANCES);
  },
  compute(spec, place) {
    const toleranceDeg = scatterHalfWidthDeg(VENUS_V_MAG, 'same');
    const { appearances } = venusYearOf(place.year, place.site, place.settings);
    const { outcome, occurrences } = appearances[spec.appearance];
    if (outcome === 'never-dark-enough') return undated('too-light', toleranceDeg);
    return dated(occurrences.map(markerOccurrence), toleranceDeg);
  },
};
