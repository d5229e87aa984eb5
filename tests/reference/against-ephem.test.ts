import { AstroTime, e_tilt } from 'astronomy-engine';
import { describe, expect, it } from 'vitest';

import { prepareSunTable } from '#shared/sky/sun/sun-table.js';
import { JD_J2000 } from '#shared/sky/time/julian-day.js';
import { jsonFixture } from '#tests/support/sky/fixtures.js';

interface EphemCase {
  jdTt: number;
  raDeg: number;
  decDeg: number;
}

const { cases } = jsonFixture('ephem-sun.json') as { cases: EphemCase[] };
const DEG = Math.PI / 180;
/**
 * PyEphem counts longitudes from the equinox of an older precession; the two part by 0.3–0.4 thousandths of a degree per
 * century from 2000. Otherwise 0.0015°, which the Sun moves in two minutes.
 */
const toleranceDeg = (jdTt: number): number => 0.0015 + 0.0004 * Math.abs((jdTt - JD_J2000) / 36_525);

describe('PyEphem: the full VSOP87 Sun', () => {
  it.each(cases)('stands where the table has it at JD $jdTt', ({ jdTt, raDeg, decDeg }) => {
    const time = AstroTime.FromTerrestrialTime(jdTt - JD_J2000);
    const jdUt = time.ut + JD_J2000;
    // A table whose middle lies months away, so that interpolation is part of the check.
    const longitude = prepareSunTable(jdUt - 181.3).longitudeRad(jdUt);
    const obliquity = e_tilt(time).tobl * DEG;
    const dec = Math.asin(Math.sin(obliquity) * Math.sin(longitude)) / DEG;
    const ra = Math.atan2(Math.cos(obliquity) * Math.sin(longitude), Math.cos(longitude)) / DEG;
    const east = ((((ra - raDeg) % 360) + 540) % 360) - 180;
    expect(Math.hypot(dec - decDeg, east * Math.cos(decDeg * DEG))).toBeLessThan(toleranceDeg(jdTt));
  });
});
