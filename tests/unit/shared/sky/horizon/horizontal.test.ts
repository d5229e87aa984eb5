import { describe, expect, it } from 'vitest';

import { horizontalOf, latitudeOf } from '#shared/sky/horizon/horizontal.js';

const DEG = Math.PI / 180;

describe('altitude and azimuth', () => {
  it('agree with a worked example: Venus from Washington [Meeus 1998, example 13.b]', () => {
    const latitude = latitudeOf(38.921389 * DEG);
    const dec = -6.719892 * DEG;
    const place = horizontalOf(latitude, Math.sin(dec), Math.cos(dec), 64.352133 * DEG);
    expect(place.altitudeRad / DEG).toBeCloseTo(15.1249, 4);
    // Meeus counts from south; ours from north.
    expect(place.azimuthRad / DEG).toBeCloseTo(68.0337 + 180, 4);
  });

  it('put a star of the equator that rises due east, and the pole star due north at the latitude', () => {
    const latitude = latitudeOf(50 * DEG);
    expect(horizontalOf(latitude, 0, 1, -Math.PI / 2).azimuthRad / DEG).toBeCloseTo(90, 10);
    const pole = horizontalOf(latitude, 1, 0, 1.2);
    expect(pole.altitudeRad / DEG).toBeCloseTo(50, 10);
    expect(Math.cos(pole.azimuthRad)).toBeCloseTo(1, 10);
  });

  it('are numbers at the poles and in the zenith', () => {
    for (const degrees of [-90, 90]) {
      const latitude = latitudeOf(degrees * DEG);
      expect(latitude.cos).toBeGreaterThanOrEqual(0);
      const zenith = horizontalOf(latitude, latitude.sin, latitude.cos, 0);
      expect(zenith.altitudeRad / DEG).toBeCloseTo(90, 6);
      expect(zenith.azimuthRad).not.toBeNaN();
    }
  });
});
