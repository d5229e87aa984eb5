import { computeAirYear, FIGURES, markerKeyOf, type Phenomenon, STARS } from '#shared/sky/index.js';
import { modelDays } from '#shared/sky/air/model-year.js';
import { calibrationOf } from '#shared/sky/look/calibration.js';
import { phenomenonInYear } from '#shared/sky/markers/phenomenon-in-year.js';
import { airAtPlace } from '#shared/sky/visibility/air.js';
import { settingsWith, siteAt } from '#tests/support/sky/builders.js';
import { markerAt } from '#tests/support/sky/marker.js';

/**
 * The model of visibility in ordinary air against the three-class rule, for the figures and the stars of the first class
 * on flat ground at sea level. Positive: the model sees the star on fewer days than the rule.
 */
const LATITUDES_DEG = [-30, 0, 15, 40];
const YEAR = 2027;
const MARKERS = [
  ...FIGURES.map((figure) => figure.key),
  ...STARS.filter((star) => star.vMag < 1.65).map((star) => markerKeyOf(star.hr)),
];
/** First days come later where more dark is asked for, last days earlier. */
const SIGN: Readonly<Record<Phenomenon, 1 | -1>> = {
  'heliacal-rising': 1,
  'cosmical-setting': 1,
  'acronychal-rising': -1,
  'heliacal-setting': -1,
};

/** Days of the model minus days of the rule, first and last days of either side. */
export function modelAgainstRuleDays(): { sameSide: number[]; oppositeSide: number[] } {
  const years = LATITUDES_DEG.flatMap((latitudeDeg) =>
    MARKERS.map((markerKey) => computeAirYear(markerKey, siteAt(latitudeDeg), settingsWith(), YEAR)),
  );
  const days = (phenomena: readonly Phenomenon[]): number[] =>
    years.flatMap((year) =>
      phenomena.flatMap((phenomenon) => {
        const [occurrence] = year.phenomena[phenomenon].occurrences;
        const model = occurrence?.byModel.ordinary;
        return occurrence?.rule && model
          ? [SIGN[phenomenon] * (model.dayNumber - occurrence.rule.expected.dayNumber)]
          : [];
      }),
    );
  return {
    sameSide: days(['heliacal-rising', 'heliacal-setting']),
    oppositeSide: days(['cosmical-setting', 'acronychal-rising']),
  };
}

/**
 * The model once it is set by the day of one end (the zero point of "where to look"), at the other end, which had no part
 * in setting it: by first mornings, at last evenings. Positive as above.
 */
export function setModelAgainstRuleDays(): number[] {
  return LATITUDES_DEG.flatMap((latitudeDeg) =>
    MARKERS.flatMap((markerKey) => {
      const site = siteAt(latitudeDeg);
      const marker = markerAt(markerKey, site, YEAR);
      const [rising] = phenomenonInYear(marker, 'heliacal-rising').occurrences;
      const [setting] = phenomenonInYear(marker, 'heliacal-setting').occurrences;
      if (!rising || !setting) return [];
      const set = calibrationOf(marker, site, rising.expected.dayNumber, 'dawn');
      if (set.by !== 'model') return [];
      // An eye that is keener by so much sees the star as one that is brighter by so much.
      const seen = { ...marker, marker: { ...marker.marker, vMag: marker.marker.vMag - set.offsetMag } };
      const [day] = modelDays(seen, 'heliacal-setting', (month) => airAtPlace(site, month, 'ordinary'));
      return day === undefined ? [] : [SIGN['heliacal-setting'] * (day - setting.expected.dayNumber)];
    }),
  );
}
