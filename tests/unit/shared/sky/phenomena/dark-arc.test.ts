import { describe, expect, it } from 'vitest';

import { latitudeOf } from '#shared/sky/horizon/horizontal.js';
import { levelSkyline } from '#shared/sky/horizon/skyline.js';
import {
  arcEndRad,
  crossingAtArcEnd,
  crossingAtDeepest,
  tooHighHalfArcRad,
} from '#shared/sky/phenomena/dark-arc.js';
import { prepareYear } from '#shared/sky/phenomena/prepared-year.js';
import { sinSunDepth, type SkylineCrossing, starAtPlace } from '#shared/sky/phenomena/skyline-crossing.js';
import { starIndexOf } from '#shared/sky/stars/star-table.js';

const DEG = Math.PI / 180;
const year = prepareYear(2027);

function rising(hr: number, latitudeDeg: number): SkylineCrossing {
  const ground = { latitude: latitudeOf(latitudeDeg * DEG), longitudeRad: 0, skyline: levelSkyline(0) };
  const { crossings } = starAtPlace(year, ground, starIndexOf(hr) ?? -1);
  if (!crossings) throw new Error('does not rise and set');
  return crossings.rising;
}

const depth = (degrees: number) => ({ sineAt: () => Math.sin(degrees * DEG) });

describe('the dark arc', () => {
  it('is half the year for a Sun on the horizon and shrinks to nothing at the greatest depth', () => {
    expect(tooHighHalfArcRad(0.8, 0)).toBeCloseTo(Math.PI / 2, 12);
    expect(tooHighHalfArcRad(0.8, 0.8)).toBeCloseTo(Math.PI, 12);
    expect(tooHighHalfArcRad(0.8, 0.8001)).toBeNull();
  });

  it('does not exist where the zenith is the pole of the ecliptic', () => {
    expect(tooHighHalfArcRad(0, 0)).toBeNull();
  });

  it('ends where the depth is just reached', () => {
    const crossing = rising(2491, 30);
    for (const end of ['dawn', 'dusk'] as const) {
      const longitude = arcEndRad(crossing, crossing.highestRad, depth(10), end) ?? Number.NaN;
      expect(sinSunDepth(crossing, longitude)).toBeCloseTo(Math.sin(10 * DEG), 9);
    }
  });

  it('settles on a threshold that depends on the Sun’s longitude', () => {
    const crossing = rising(2491, 30);
    const needed = { sineAt: (longitude: number) => Math.sin((9 + 2.5 * Math.cos(longitude - 2)) * DEG) };
    const longitude = arcEndRad(crossing, crossing.highestRad, needed, 'dawn') ?? Number.NaN;
    expect(sinSunDepth(crossing, longitude)).toBeCloseTo(needed.sineAt(longitude), 8);
  });

  it('dates the first crossing inside it at dawn and the last at dusk', () => {
    const crossing = rising(2491, 30);
    const { periodDays } = year.sidereal;
    for (const [end, inward] of [
      ['dawn', 1],
      ['dusk', -1],
    ] as const) {
      const longitude = arcEndRad(crossing, crossing.highestRad, depth(10), end) ?? Number.NaN;
      const jdUt = crossingAtArcEnd(year, crossing, longitude, depth(10), end) ?? Number.NaN;
      const turns = (jdUt - crossing.anInstantJdUt) / periodDays;
      expect(Math.abs(turns - Math.round(turns))).toBeLessThan(1e-6);
      const sine = (at: number): number => sinSunDepth(crossing, year.sun.longitudeRad(at));
      expect(sine(jdUt)).toBeGreaterThanOrEqual(Math.sin(10 * DEG));
      expect(sine(jdUt - inward * periodDays)).toBeLessThan(Math.sin(10 * DEG));
    }
  });

  it('may be too short to hold a crossing', () => {
    const crossing = rising(1165, 60);
    // Longitudes go by in steps of about a degree; the arc is narrowed until none falls into it.
    const outcomes = new Set<boolean>();
    for (const share of [1e-3, 1e-4, 1e-5, 1e-7, 1e-9]) {
      const needed = { sineAt: () => crossing.reach * (1 - share) };
      const longitude = arcEndRad(crossing, crossing.highestRad, needed, 'dawn') ?? Number.NaN;
      const jdUt = crossingAtArcEnd(year, crossing, longitude, needed, 'dawn');
      if (jdUt !== null) {
        expect(sinSunDepth(crossing, year.sun.longitudeRad(jdUt))).toBeGreaterThanOrEqual(needed.sineAt());
      }
      outcomes.add(jdUt === null);
    }
    expect(outcomes).toEqual(new Set([true, false]));
  });

  it('is deepest at its middle', () => {
    const crossing = rising(2491, 30);
    const jdUt = crossingAtDeepest(year, crossing, crossing.highestRad);
    const sine = (at: number): number => sinSunDepth(crossing, year.sun.longitudeRad(at));
    expect(sine(jdUt)).toBeGreaterThan(sine(jdUt - 3 * year.sidereal.periodDays));
    expect(sine(jdUt)).toBeGreaterThan(sine(jdUt + 3 * year.sidereal.periodDays));
    expect(Math.asin(sine(jdUt))).toBeCloseTo(Math.asin(crossing.reach), 3);
  });
});
