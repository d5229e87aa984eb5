import { describe, expect, it } from 'vitest';

import { aerosolAirmass, gasAirmass, ozoneAirmass, wholeAirmass } from '#shared/sky/visibility/airmass.js';

describe('airmass', () => {
  it.each([
    ['all of the air', wholeAirmass, 40, 0.1],
    ['gas', gasAirmass, 35, 0.1],
    ['haze', aerosolAirmass, 81, 0.4],
    ['ozone', ozoneAirmass, 12.7, 0.05],
  ] as const)(
    '%s: the published value at the horizon [Rozenberg 1966; Schaefer 1993], one at the zenith',
    (_name, airmass, atHorizon, within) => {
      expect(Math.abs(airmass(0) - atHorizon)).toBeLessThan(within);
      expect(airmass(90)).toBeCloseTo(1, 4);
      expect(airmass(-3)).toBe(airmass(0));
    },
  );

  it('is near Kasten & Young 1989 from 2° up: 19.4 at 2°, 10.3 at 5°', () => {
    // Their altitudes are apparent ones; refraction is worth 0.3° at 2° and 0.16° at 5°.
    expect(Math.abs(wholeAirmass(2) - 19.4)).toBeLessThan(0.9);
    expect(Math.abs(wholeAirmass(5) - 10.3)).toBeLessThan(0.4);
  });

  it('falls from the horizon up, steepest for haze', () => {
    for (const airmass of [wholeAirmass, gasAirmass, aerosolAirmass, ozoneAirmass]) {
      for (let altitudeDeg = 0; altitudeDeg < 90; altitudeDeg += 1)
        expect(airmass(altitudeDeg)).toBeGreaterThan(airmass(altitudeDeg + 1));
    }
    expect(aerosolAirmass(5) / aerosolAirmass(0)).toBeLessThan(gasAirmass(5) / gasAirmass(0));
  });
});
