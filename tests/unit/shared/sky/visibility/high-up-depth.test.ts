import { describe, expect, it } from 'vitest';

import { highUpDepthDeg } from '#shared/sky/visibility/high-up-depth.js';

describe('the depth for a star high in the sky', () => {
  it.each([
    [-3, 11],
    [0, 11],
    [3, 8],
    [5, 6],
    [8, 4.8],
    [10, 4],
    [30, 11 / 3],
  ])('counts the altitude, fully only in the thick air: at %i° of 11° remain %d°', (altitude, expected) => {
    expect(highUpDepthDeg(11, altitude)).toBeCloseTo(expected, 12);
  });

  it('is never negative', () => {
    expect(highUpDepthDeg(-2, 10)).toBe(0);
  });
});
