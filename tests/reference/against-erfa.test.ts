import { describe, expect, it } from 'vitest';

import { prepareStarFrame } from '#shared/sky/stars/star-frame.js';
import { starIndexOf } from '#shared/sky/stars/star-table.js';
import { localSiderealRad, prepareSiderealClock } from '#shared/sky/time/sidereal-clock.js';
import { jsonFixture } from '#tests/support/sky/fixtures.js';

interface ErfaCase {
  year: number;
  jdUt: number;
  greenwichApparentSiderealDeg: number;
  stars: { hr: number; raDeg: number; decDeg: number }[];
}

const { cases } = jsonFixture('erfa-stars.json') as { cases: ErfaCase[] };
const DEG = Math.PI / 180;

/** The engine's precession is good to 0.003° from −1000 on and to 0.01° at its limit: a hundredth of a day at most. */
const toleranceDeg = (year: number): number => (year >= -1000 ? 0.003 : 0.01);

function separationDeg(a: { raDeg: number; decDeg: number }, b: { raDeg: number; decDeg: number }): number {
  const north = a.decDeg - b.decDeg;
  const east = (((a.raDeg - b.raDeg + 540) % 360) - 180) * Math.cos(b.decDeg * DEG);
  return Math.hypot(north, east);
}

describe('ERFA: space motion, long-term precession, nutation', () => {
  it.each(cases)('places 16 stars in $year', ({ year, jdUt, stars }) => {
    const frame = prepareStarFrame(jdUt);
    for (const star of stars) {
      const place = frame.placeOf(starIndexOf(star.hr) ?? -1);
      const engine = {
        raDeg: (((place.rightAscensionRad / DEG) % 360) + 360) % 360,
        decDeg: Math.asin(place.sinDeclination) / DEG,
      };
      expect(separationDeg(engine, star), `HR ${star.hr}`).toBeLessThan(toleranceDeg(year));
    }
  });

  it.each(cases)('tells the sidereal time in $year, also a year away from the epoch', (one) => {
    for (const offsetDays of [-365, 0, 365]) {
      const clock = prepareSiderealClock(one.jdUt + offsetDays);
      const engineDeg = localSiderealRad(clock, one.jdUt, 0) / DEG;
      const differenceDeg = ((((engineDeg - one.greenwichApparentSiderealDeg) % 360) + 540) % 360) - 180;
      expect(Math.abs(differenceDeg)).toBeLessThan(toleranceDeg(one.year));
    }
  });
});
