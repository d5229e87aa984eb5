import { describe, expect, it } from 'vitest';

import { latitudeOf } from '#shared/sky/horizon/horizontal.js';
import { prepareSkyline } from '#shared/sky/horizon/skyline.js';
import { watchWindowOf } from '#shared/sky/look/watch-window.js';
import { prepareYear } from '#shared/sky/phenomena/prepared-year.js';
import { sunPlaceAt } from '#shared/sky/phenomena/sun-place.js';
import type { SkylinePoint } from '#shared/sky/types.js';

const DEG = Math.PI / 180;
const HOUR = 1 / 24;
const year = prepareYear(2027);
/** Noons (UT) at longitude 0. */
const MARCH_21 = 2_461_486;
const JUNE_21 = MARCH_21 + 92;
const DECEMBER_21 = MARCH_21 + 275;

function groundAt(latitudeDeg: number, skyline: SkylinePoint[] = []) {
  return { latitude: latitudeOf(latitudeDeg * DEG), longitudeRad: 0, skyline: prepareSkyline(skyline) };
}
const windowAt = (latitudeDeg: number, noon: number, side: 'dawn' | 'dusk', skyline: SkylinePoint[] = []) =>
  watchWindowOf(year, groundAt(latitudeDeg, skyline), noon, side);
const depthDeg = (latitudeDeg: number, jdUt: number) =>
  -sunPlaceAt(year, groundAt(latitudeDeg), jdUt).altitudeRad / DEG;

describe('the watch of a day', () => {
  it('ends at dawn with the time to stop and begins where the Sun is 20° deep', () => {
    const { span, limitJdUt, sunCourse } = windowAt(0, MARCH_21, 'dawn');
    expect(sunCourse).toBe('sets-and-rises');
    expect(span?.toJdUt).toBe(limitJdUt);
    // At the equator in March the Sun climbs 15° an hour.
    expect(depthDeg(0, span?.fromJdUt ?? 0)).toBeCloseTo(20, 0);
    expect((limitJdUt ?? 0) - (span?.fromJdUt ?? 0)).toBeCloseTo((20 - 0.85) / 15 / 24 - 10 / 1440, 2);
  });

  it('begins at dusk with the time to begin, after noon of the same day', () => {
    const { span, limitJdUt } = windowAt(12, MARCH_21, 'dusk');
    expect(span?.fromJdUt).toBe(limitJdUt);
    expect(limitJdUt).toBeGreaterThan(MARCH_21);
    expect(depthDeg(12, span?.toJdUt ?? 0)).toBeCloseTo(20, 0);
  });

  it('is never longer than three hours, and ends at the middle of a short night', () => {
    const slow = windowAt(60, JUNE_21 - 40, 'dawn').span;
    expect((slow?.toJdUt ?? 0) - (slow?.fromJdUt ?? 0)).toBeLessThanOrEqual(3 * HOUR + 1e-9);
    const short = windowAt(64, JUNE_21, 'dawn').span;
    expect(short?.fromJdUt).toBeGreaterThan(JUNE_21 - 0.5 - HOUR / 4);
    expect((short?.toJdUt ?? 0) - (short?.fromJdUt ?? 0)).toBeLessThan(2 * HOUR);
  });

  it('is not there while the Sun stays up, or shows again within the margins kept from it', () => {
    for (const latitudeDeg of [65.7, 66, 75, 90]) {
      for (const side of ['dawn', 'dusk'] as const) {
        expect(windowAt(latitudeDeg, JUNE_21, side)).toEqual({
          sunCourse: 'stays-up',
          limitJdUt: null,
          span: null,
        });
      }
    }
  });

  it('goes on without a time to stop in the polar night, while the Sun is 6° deep', () => {
    const { sunCourse, limitJdUt, span } = windowAt(70, DECEMBER_21, 'dawn');
    expect({ sunCourse, limitJdUt }).toEqual({ sunCourse: 'stays-down', limitJdUt: null });
    expect(depthDeg(70, span?.toJdUt ?? 0)).toBeCloseTo(6, 0);
    expect(span?.toJdUt).toBeLessThan(DECEMBER_21);
    const deep = windowAt(80, DECEMBER_21, 'dusk').span;
    expect(deep?.fromJdUt).toBeCloseTo(DECEMBER_21, 1);
  });

  it('keeps to the earlier sunrise of flat and real skyline', () => {
    const hills = [{ azimuthDeg: 0, altitudeDeg: 12 }];
    expect(windowAt(12, MARCH_21, 'dawn', hills).limitJdUt).toBe(windowAt(12, MARCH_21, 'dawn').limitJdUt);
  });
});
