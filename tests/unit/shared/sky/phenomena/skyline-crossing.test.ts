import { describe, expect, it } from 'vitest';

import { latitudeOf } from '#shared/sky/horizon/horizontal.js';
import { levelSkyline } from '#shared/sky/horizon/skyline.js';
import { prepareYear } from '#shared/sky/phenomena/prepared-year.js';
import {
  culminationOf,
  sinSunDepth,
  starAtPlace,
  sunAtCrossing,
} from '#shared/sky/phenomena/skyline-crossing.js';
import { starIndexOf } from '#shared/sky/stars/star-table.js';
import { localSiderealRad } from '#shared/sky/time/sidereal-clock.js';
import { sunDepthDeg } from '#tests/support/sky/oracle-scan.js';

const DEG = Math.PI / 180;
const year = prepareYear(2027);
const ground = { latitude: latitudeOf(41 * DEG), longitudeRad: 12 * DEG, skyline: levelSkyline(3 * DEG) };
const aldebaran = starIndexOf(1457) ?? -1;

describe('a star’s crossings at a place', () => {
  const { crossings } = starAtPlace(year, ground, aldebaran);
  if (!crossings) throw new Error('Aldebaran rises and sets at 41° N');

  it('stand on the skyline, in the east and in the west', () => {
    for (const crossing of [crossings.rising, crossings.setting]) {
      expect(crossing.starAltitudeRad / DEG).toBeCloseTo(3, 9);
    }
    expect(crossings.rising.starAzimuthRad / DEG).toBeLessThan(180);
    expect(crossings.setting.starAzimuthRad / DEG).toBeGreaterThan(180);
  });

  it('happen at their sidereal time', () => {
    const { siderealRad, anInstantJdUt } = crossings.rising;
    expect(
      Math.cos(localSiderealRad(year.sidereal, anInstantJdUt, ground.longitudeRad) - siderealRad),
    ).toBeCloseTo(1, 12);
  });

  it('know the Sun’s depth in two ways, and a third way agrees', () => {
    const { setting } = crossings;
    const longitude = year.sun.longitudeRad(setting.anInstantJdUt);
    const sun = sunAtCrossing(year, ground.latitude, setting, longitude);
    expect(Math.sin(sun.depressionRad)).toBeCloseTo(sinSunDepth(setting, longitude), 12);
    // 0.001°: nutation and the sidereal line at the very day.
    expect(Math.abs(sun.depressionRad / DEG - sunDepthDeg(setting.anInstantJdUt, 41, 12))).toBeLessThan(
      0.001,
    );
  });

  it('have the culmination half-way between them on a level skyline, due south for Aldebaran at 41° N', () => {
    const culmination = culminationOf(year, ground, aldebaran);
    expect(2 * culmination.siderealRad).toBeCloseTo(
      crossings.rising.siderealRad + crossings.setting.siderealRad,
      9,
    );
    expect(culmination.starAzimuthRad / DEG).toBeCloseTo(180, 6);
  });

  it('are none where the star never sets', () => {
    expect(starAtPlace(year, ground, starIndexOf(424) ?? -1)).toEqual({
      outcome: 'never-sets',
      detail: null,
      crossings: null,
    });
  });
});
