import { AstroTime, Body, DefineStar, Equator, Horizon, Observer, SearchRiseSet } from 'astronomy-engine';

import { benchSite } from './subject.js';

import { dayNumberOf } from '#shared/sky/index.js';
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
