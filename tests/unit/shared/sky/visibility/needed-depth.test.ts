import { describe, expect, it } from 'vitest';

import { neededDepthDeg } from '#shared/sky/visibility/needed-depth.js';

describe('the needed depth at a skyline', () => {
  it.each([-2, 0])(
    'is the threshold itself under both rules where the skyline is not above the horizon (%i°)',
    (altitude) => {
      for (const side of ['same', 'opposite'] as const) {
        expect(neededDepthDeg('altitude-difference', side, 11, altitude)).toBe(11);
        expect(neededDepthDeg('depth-at-crossing', side, 11, altitude)).toBe(11);
      }
    },
  );

  it.each([
    [3, 8],
    [5, 6],
    [8, 4.8],
    [10, 4],
    [30, 11 / 3],
  ])('falls with the altitude of a hill on the same side: %i° leaves %d° of 11°', (altitude, expected) => {
    expect(neededDepthDeg('altitude-difference', 'same', 11, altitude)).toBeCloseTo(expected, 12);
  });

  it('stays the threshold over a hill on the opposite side, and under the rule of the depth at the crossing', () => {
    expect(neededDepthDeg('altitude-difference', 'opposite', 7, 8)).toBe(7);
    expect(neededDepthDeg('depth-at-crossing', 'same', 11, 8)).toBe(11);
  });

  it('is never negative, whatever the shifts', () => {
    expect(neededDepthDeg('depth-at-crossing', 'opposite', -2, 0)).toBe(0);
    expect(neededDepthDeg('altitude-difference', 'same', -2, 4)).toBe(0);
  });
});
