import { describe, expect, it } from 'vitest';

import { latitudeOf } from '#shared/sky/horizon/horizontal.js';
import { levelSkyline } from '#shared/sky/horizon/skyline.js';
import { sinDeepestSun } from '#shared/sky/phenomena/deepest-sun.js';
import { prepareYear } from '#shared/sky/phenomena/prepared-year.js';
import { dayNumberOf } from '#shared/sky/time/julian-day.js';

const DEG = Math.PI / 180;
const year = prepareYear(2027);
const deepestDeg = (latitudeDeg: number, month: number, day: number): number => {
  const ground = { latitude: latitudeOf(latitudeDeg * DEG), longitudeRad: 1, skyline: levelSkyline(0) };
  return Math.asin(sinDeepestSun(year, ground, dayNumberOf({ year: 2027, month, day }, 'gregorian'))) / DEG;
};

describe('the Sun’s greatest depth in a night', () => {
  it('is 90° less the latitude less the obliquity at midsummer', () => {
    expect(deepestDeg(60, 6, 21)).toBeCloseTo(90 - 60 - 23.44, 1);
    expect(deepestDeg(-60, 12, 21)).toBeCloseTo(90 - 60 - 23.44, 1);
  });

  it('is negative under the midnight Sun and greatest in winter', () => {
    expect(deepestDeg(70, 6, 21)).toBeLessThan(0);
    expect(deepestDeg(60, 12, 21)).toBeCloseTo(90 - 60 + 23.44, 1);
    expect(deepestDeg(10, 4, 1)).toBeLessThan(90);
  });
});
