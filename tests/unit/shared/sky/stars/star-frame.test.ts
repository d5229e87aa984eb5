import { describe, expect, it } from 'vitest';

import { prepareStarFrame } from '#shared/sky/stars/star-frame.js';
import { starIndexOf } from '#shared/sky/stars/star-table.js';

const DEG = Math.PI / 180;

/** Precession and motion over millennia are held against ERFA in tests/reference/against-erfa.test.ts. */
describe('star places', () => {
  it('at J2000 are the catalogue’s, to the 20″ of nutation', () => {
    const place = prepareStarFrame(2_451_545).placeOf(starIndexOf(1165) ?? -1);
    expect(Math.abs(place.rightAscensionRad / DEG - 56.87125)).toBeLessThan(20 / 3600);
    expect(Math.abs(Math.asin(place.sinDeclination) / DEG - 24.105)).toBeLessThan(20 / 3600);
  });

  it('carry sine and cosine of one declination', () => {
    const place = prepareStarFrame(700_000).placeOf(0);
    expect(place.sinDeclination ** 2 + place.cosDeclination ** 2).toBeCloseTo(1, 14);
  });

  it('refuse a star that is not in the table', () => {
    expect(() => prepareStarFrame(2_451_545).placeOf(831)).toThrow(RangeError);
  });
});
