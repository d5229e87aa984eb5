import { describe, expect, it } from 'vitest';

import { depthOnHillDeg, hillExcessDeg } from '#shared/sky/visibility/hill-allowance.js';
import { neededDepthDeg } from '#shared/sky/visibility/needed-depth.js';

/** A star of the first class in ordinary air. */
const hill = { vMag: 1, clarity: 'ordinary', flatOppositeDeg: 7 } as const;

describe('the needed depth at a skyline', () => {
  it.each([-2, 0])(
    'is the threshold itself under both rules where the skyline is not above the horizon (%i°)',
    (altitude) => {
      for (const side of ['same', 'opposite'] as const) {
        expect(neededDepthDeg('altitude-difference', side, 11, altitude, hill)).toBe(11);
        expect(neededDepthDeg('depth-at-crossing', side, 11, altitude, hill)).toBe(11);
      }
    },
  );

  it.each([
    [3, 8],
    [5, 6],
    [8, 3.8],
    [10, 11 / 3],
    [30, 11 / 3],
  ])('falls with the altitude of a hill on the same side: %i° leaves %d° of 11°', (altitude, expected) => {
    const depth = neededDepthDeg('altitude-difference', 'same', 11, altitude, hill);
    expect(Math.abs(depth - expected)).toBeLessThan(0.1);
  });

  it('counts the excess of the star’s own brightness', () => {
    const bright = neededDepthDeg('altitude-difference', 'same', 11, 8, { ...hill, vMag: -1.46 });
    expect(bright).toBeCloseTo(11 - 8 + hillExcessDeg(-1.46, 'ordinary', 8), 12);
    expect(bright).toBeGreaterThan(neededDepthDeg('altitude-difference', 'same', 11, 8, hill) + 1);
  });

  it('grows by a low hill on the opposite side, because the Sun sinks while the star climbs out of the haze', () => {
    expect(neededDepthDeg('altitude-difference', 'opposite', 7, 2, hill)).toBe(9);
    // The place's shift and the width of a range go on top of it.
    expect(neededDepthDeg('altitude-difference', 'opposite', 7.5, 2, hill)).toBe(9.5);
  });

  it('is the depth at which the star shows on a high hill, on the opposite side', () => {
    for (const altitude of [6, 8, 12]) {
      expect(neededDepthDeg('altitude-difference', 'opposite', 7, altitude, hill)).toBeCloseTo(
        depthOnHillDeg(1, 'ordinary', altitude),
        12,
      );
    }
  });

  it('passes from a low to a high hill without a jump', () => {
    const at = (altitude: number): number =>
      neededDepthDeg('altitude-difference', 'opposite', 7, altitude, hill);
    for (let altitude = 0; altitude < 12; altitude += 0.05)
      expect(Math.abs(at(altitude + 0.05) - at(altitude))).toBeLessThan(0.7);
  });

  it('stays the threshold under the rule of the depth at the crossing', () => {
    expect(neededDepthDeg('depth-at-crossing', 'same', 11, 8, hill)).toBe(11);
    expect(neededDepthDeg('depth-at-crossing', 'opposite', 7, 8, hill)).toBe(7);
  });

  it('is never negative, and never less than a third of the threshold', () => {
    expect(neededDepthDeg('depth-at-crossing', 'opposite', -2, 0, hill)).toBe(0);
    expect(neededDepthDeg('altitude-difference', 'same', -2, 4, hill)).toBe(0);
    expect(neededDepthDeg('altitude-difference', 'opposite', 9, 50, { ...hill, flatOppositeDeg: 9 })).toBe(3);
  });
});
