import { Body, Observer, SearchRiseSet } from 'astronomy-engine';
import { describe, expect, it } from 'vitest';

import { latitudeOf } from '#shared/sky/horizon/horizontal.js';
import { prepareSkyline } from '#shared/sky/horizon/skyline.js';
import { prepareYear } from '#shared/sky/phenomena/prepared-year.js';
import { watchTimesOf } from '#shared/sky/phenomena/watch-times.js';
import type { SkylinePoint } from '#shared/sky/types.js';

const DEG = Math.PI / 180;
const MINUTE = 1 / 1440;
const year = prepareYear(2027);
/** 21 March 2027, noon of the clock in Nepal (UT + 5:45). */
const NOON_JD_UT = 2_461_486 - 5.75 / 24;

function timesAt(latitudeDeg: number, skyline: SkylinePoint[] = [], noonJdUt = NOON_JD_UT) {
  const ground = {
    latitude: latitudeOf(latitudeDeg * DEG),
    longitudeRad: 84 * DEG,
    skyline: prepareSkyline(skyline),
  };
  return watchTimesOf(year, ground, noonJdUt);
}

describe('times to stop and to start looking', () => {
  it('keep ten minutes from the Sun’s upper edge on a flat horizon', () => {
    const times = timesAt(28);
    const observer = new Observer(28, 84, 0);
    const search = (direction: number, from: number): number =>
      (SearchRiseSet(Body.Sun, observer, direction, new Date((from - 2_440_587.5) * 86_400_000), 1)?.ut ??
        0) + 2_451_545;
    // The library takes 34′ of refraction, the engine 34.5′: a few seconds of time.
    expect(Math.abs((times.flatSunriseJdUt ?? 0) - search(1, NOON_JD_UT - 0.5))).toBeLessThan(MINUTE / 4);
    expect(Math.abs((times.flatSunsetJdUt ?? 0) - search(-1, NOON_JD_UT))).toBeLessThan(MINUTE / 4);
    expect((times.flatSunriseJdUt ?? 0) - (times.stopLookingJdUt ?? 0)).toBeCloseTo(10 * MINUTE, 6);
    expect((times.startLookingJdUt ?? 0) - (times.flatSunsetJdUt ?? 0)).toBeCloseTo(10 * MINUTE, 6);
  });

  it('do not wait for a Sun that a hill hides: it may stand behind the next tree', () => {
    const hills = timesAt(28, [{ azimuthDeg: 0, altitudeDeg: 12 }]);
    expect(hills.skylineSunriseJdUt ?? 0).toBeGreaterThan(hills.flatSunriseJdUt ?? Infinity);
    expect(hills.skylineSunsetJdUt ?? Infinity).toBeLessThan(hills.flatSunsetJdUt ?? 0);
    expect(hills.stopLookingJdUt).toBe(timesAt(28).stopLookingJdUt);
    expect(hills.startLookingJdUt).toBe(timesAt(28).startLookingJdUt);
  });

  it('follow the real skyline where it lies below the horizontal', () => {
    const pass = timesAt(28, [{ azimuthDeg: 0, altitudeDeg: -3 }]);
    expect(pass.stopLookingJdUt ?? 0).toBeLessThan((timesAt(28).stopLookingJdUt ?? 0) - 10 * MINUTE);
    expect(pass.startLookingJdUt ?? 0).toBeGreaterThan((timesAt(28).startLookingJdUt ?? 0) + 10 * MINUTE);
  });

  it('are none where the Sun does not cross the horizon on that day', () => {
    const none = {
      stopLookingJdUt: null,
      startLookingJdUt: null,
      flatSunriseJdUt: null,
      flatSunsetJdUt: null,
    };
    const midsummer = NOON_JD_UT + 92;
    const midwinter = NOON_JD_UT + 275;
    expect(timesAt(72, [], midsummer)).toMatchObject({ ...none, dawnSun: 'stays-up', duskSun: 'stays-up' });
    expect(timesAt(72, [], midwinter)).toMatchObject({
      ...none,
      dawnSun: 'stays-down',
      duskSun: 'stays-down',
    });
  });

  it('are none for a midnight Sun that only hills hide: the sky is light, and the Sun is behind the next tree', () => {
    const hills = timesAt(72, [{ azimuthDeg: 0, altitudeDeg: 15 }], NOON_JD_UT + 92);
    expect(hills).toMatchObject({ stopLookingJdUt: null, startLookingJdUt: null, dawnSun: 'stays-up' });
    expect(hills.skylineSunriseJdUt).not.toBeNull();
  });

  it('are none for a midnight Sun that shows only where the skyline lies below the horizontal', () => {
    const pass = timesAt(65, [{ azimuthDeg: 0, altitudeDeg: -4 }], NOON_JD_UT + 92);
    expect(pass).toMatchObject({ stopLookingJdUt: null, startLookingJdUt: null, duskSun: 'stays-up' });
    expect(pass.flatSunriseJdUt).not.toBeNull();
  });
});
