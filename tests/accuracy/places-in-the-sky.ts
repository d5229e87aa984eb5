import { AstroTime, e_tilt } from 'astronomy-engine';

import { prepareStarFrame } from '#shared/sky/stars/star-frame.js';
import { starIndexOf } from '#shared/sky/stars/star-table.js';
import { prepareSunTable } from '#shared/sky/sun/sun-table.js';
import { JD_J2000 } from '#shared/sky/time/julian-day.js';
import { jsonFixture } from '#tests/support/sky/fixtures.js';

/** Places of stars and Sun, as the days by which they could move a date at most: the Sun runs 0.9856° a day. */

const DEG = Math.PI / 180;
const SUN_DEG_PER_DAY = 0.9856;

interface Equatorial {
  raDeg: number;
  decDeg: number;
}

function separationDays(a: Equatorial, b: Equatorial): number {
  const north = a.decDeg - b.decDeg;
  const east = ((((a.raDeg - b.raDeg) % 360) + 540) % 360) - 180;
  return Math.hypot(north, east * Math.cos(b.decDeg * DEG)) / SUN_DEG_PER_DAY;
}

interface ErfaCase {
  jdUt: number;
  stars: (Equatorial & { hr: number })[];
}

export function erfaStarDays(): number[] {
  const { cases } = jsonFixture('erfa-stars.json') as { cases: ErfaCase[] };
  return cases.flatMap(({ jdUt, stars }) => {
    const frame = prepareStarFrame(jdUt);
    return stars.map((star) => {
      const place = frame.placeOf(starIndexOf(star.hr) ?? -1);
      const engine = {
        raDeg: place.rightAscensionRad / DEG,
        decDeg: Math.asin(place.sinDeclination) / DEG,
      };
      return separationDays(engine, star);
    });
  });
}

export function ephemSunDays(): number[] {
  const { cases } = jsonFixture('ephem-sun.json') as { cases: (Equatorial & { jdTt: number })[] };
  return cases.map((sun) => {
    const time = AstroTime.FromTerrestrialTime(sun.jdTt - JD_J2000);
    const jdUt = time.ut + JD_J2000;
    const longitude = prepareSunTable(jdUt - 181.3).longitudeRad(jdUt);
    const obliquity = e_tilt(time).tobl * DEG;
    const engine = {
      raDeg: Math.atan2(Math.cos(obliquity) * Math.sin(longitude), Math.cos(longitude)) / DEG,
      decDeg: Math.asin(Math.sin(obliquity) * Math.sin(longitude)) / DEG,
    };
    return separationDays(engine, sun);
  });
}
