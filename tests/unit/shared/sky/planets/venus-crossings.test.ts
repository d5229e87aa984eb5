import { AstroTime, Body, Observer, SearchAltitude } from 'astronomy-engine';
import { describe, expect, it } from 'vitest';

import { latitudeOf } from '#shared/sky/horizon/horizontal.js';
import { prepareSkyline } from '#shared/sky/horizon/skyline.js';
import { preparedYearOf } from '#shared/sky/phenomena/year-cache.js';
import { venusDayOf, venusPlaceAt } from '#shared/sky/planets/venus-crossings.js';
import { JD_J2000 } from '#shared/sky/time/julian-day.js';

const DEG = Math.PI / 180;
const year = preparedYearOf(2026);
const ground = (latitudeDeg: number, skylineDeg = 0) => ({
  latitude: latitudeOf(latitudeDeg * DEG),
  longitudeRad: 0,
  skyline: prepareSkyline([{ azimuthDeg: 0, altitudeDeg: skylineDeg }]),
});
const DAYS = [0, 60, 120, 180, 240, 300].map((step) => year.civil.firstDay + step);

describe('Venus on the skyline', () => {
  it.each([0, 4])('rises and sets over a skyline of %i° when astronomy-engine says so', (skylineDeg) => {
    const observer = new Observer(20, 0, 0);
    for (const day of DAYS) {
      const { rising, setting } = venusDayOf(year, ground(20, skylineDeg), day);
      for (const [crossing, direction] of [
        [rising, 1],
        [setting, -1],
      ] as const) {
        if (!crossing) throw new Error('Venus rises and sets at 20°');
        const from = new AstroTime(crossing.jdUt - 0.1 - JD_J2000);
        const known = SearchAltitude(Body.Venus, observer, direction, from, 0.3, skylineDeg);
        // Half an arcminute of parallax at the most: two seconds of time and some.
        expect(Math.abs((known?.ut ?? 0) + JD_J2000 - crossing.jdUt) * 86_400).toBeLessThan(10);
        expect(crossing.altitudeRad / DEG).toBeCloseTo(skylineDeg, 9);
      }
    }
  });

  it('takes the Sun’s deepest moment where it never sets, and nothing where it never rises', () => {
    const bright = venusDayOf(year, ground(75), year.civil.firstDay + 150);
    expect(bright.rising?.altitudeRad).toBeGreaterThan(0);
    expect((bright.setting?.jdUt ?? 0) - (bright.rising?.jdUt ?? 0)).toBeCloseTo(1, 6);
    const dark = venusDayOf(year, ground(75), year.civil.firstDay);
    expect([dark.rising, dark.setting]).toEqual([null, null]);
    expect(dark.sinDeepestAfter).toBeGreaterThan(0.5);
  });

  it('stands on the ecliptic’s band', () => {
    for (const day of DAYS)
      expect(Math.abs(venusPlaceAt(day).sinDeclination)).toBeLessThan(Math.sin(28 * DEG));
  });
});
