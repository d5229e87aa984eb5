import { AstroTime, Body, DefineStar, Equator, Horizon, Observer, SearchRiseSet } from 'astronomy-engine';

import { benchSettings, benchSite } from './subject.js';

import { modelDays } from '#shared/sky/air/model-year.js';
import { dayNumberOf, PHENOMENA } from '#shared/sky/index.js';
import { resolveMarker } from '#shared/sky/markers/marker-key.js';
import { markerAtPlace, placeYearOf } from '#shared/sky/markers/place-year.js';
import { prepareYear } from '#shared/sky/phenomena/prepared-year.js';
import { airAtPlace } from '#shared/sky/visibility/air.js';
import { showsAtDeg } from '#shared/sky/visibility/hill-allowance.js';
import { minuteScanYear } from '#tests/support/sky/minute-scan.js';
import { scanYear } from '#tests/support/sky/oracle-scan.js';

/** Aldebaran: an ordinary bright star near the ecliptic that rises and sets at the measured place. */
const ALDEBARAN = { hr: 1457, raHours: 4.5987, decDeg: 16.5093, lightYears: 65 };
export const DAILY_SEARCH_STAR = 'Aldebaran';

const firstDay = dayNumberOf({ year: 2027, month: 1, day: 1 }, 'gregorian');
const lastDay = firstDay + 364;
const JD_J2000 = 2_451_545;

/** One star-year by the plain scan over every crossing. */
export function scanStarYear(): void {
  scanYear({
    hr: ALDEBARAN.hr,
    latitudeDeg: benchSite.latitudeDeg,
    longitudeDeg: benchSite.longitudeDeg,
    year: { firstDay, lastDay },
    skyline: [],
    neededDeg: (side) => (side === 'same' ? 11 : 7),
  });
}

/** One star-year as one would do it with the library alone: search each day's rising and setting, look at the Sun. */
export function dailySearchStarYear(): void {
  DefineStar(Body.Star1, ALDEBARAN.raHours, ALDEBARAN.decDeg, ALDEBARAN.lightYears);
  const observer = new Observer(benchSite.latitudeDeg, benchSite.longitudeDeg, 0);
  for (let day = firstDay; day <= lastDay; day += 1) {
    const midnight = new AstroTime(day - 0.5 - benchSite.longitudeDeg / 360 - JD_J2000);
    for (const direction of [1, -1]) {
      const found = SearchRiseSet(Body.Star1, observer, direction, midnight, 1);
      if (!found) continue;
      const sun = Equator(Body.Sun, found, observer, true, true);
      Horizon(found, observer, sun.ra, sun.dec);
    }
  }
}

const air = airAtPlace(benchSite, 6, 'ordinary');
const aldebaran = resolveMarker(`hr${ALDEBARAN.hr}`);
const atPlace =
  aldebaran && markerAtPlace(placeYearOf(prepareYear(2027), benchSite, benchSettings), aldebaran);

/** The four phenomena of one star-year by the model of visibility. */
export function modelStarYear(): void {
  if (atPlace) for (const phenomenon of PHENOMENA) modelDays(atPlace, phenomenon, () => air);
}

/** The same four by looking at every minute of the year through the same model. */
export function minuteScanStarYear(): void {
  if (!atPlace) return;
  minuteScanYear({
    hr: ALDEBARAN.hr,
    latitudeDeg: benchSite.latitudeDeg,
    longitudeDeg: benchSite.longitudeDeg,
    year: { firstDay, lastDay },
    skylineDeg: 0,
    nearSkylineDeg: showsAtDeg(atPlace.marker.vMag, atPlace.threshold.oppositeSideDeg),
    airOf: () => air,
  });
}
