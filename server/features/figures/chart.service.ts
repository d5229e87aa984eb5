import type { Chart } from '#shared/contracts/figures.js';
import { FIGURES, markerKeyOf, starPlaceJ2000, STARS } from '#shared/sky/index.js';
import { markerNamesOf } from '../stars/marker-names.service.js';

/** Everything that somebody needs who picks stars: the same for every village, and made once. */
const CHART: Chart = {
  stars: STARS.flatMap(({ hr, vMag }) => {
    const place = starPlaceJ2000(hr);
    const { name, designation } = markerNamesOf(markerKeyOf(hr));
    return place ? [{ hr, name, designation, ...place, vMag }] : [];
  }),
  startingPoints: FIGURES.flatMap(({ key, name, memberHrs, indicatorHr, thresholdOverride }) =>
    indicatorHr === null
      ? []
      : [
          {
            key,
            name,
            memberHrs: [...memberHrs],
            indicatorHr,
            ownDepths: thresholdOverride && {
              sameSideDeg: thresholdOverride.sameSideDeg,
              oppositeSideDeg: thresholdOverride.oppositeSideDeg,
            },
          },
        ],
  ),
};

export function readChart(): Chart {
  return CHART;
}
