import { describe, expect, it } from 'vitest';

import { sightByDates, sightByModel } from '#shared/sky/look/sight.js';
import type { SkyAt } from '#shared/sky/look/sky-at.js';
import { plainAir } from '#shared/sky/visibility/air.js';
import { thresholdOf } from '#shared/sky/visibility/threshold-sets.js';

const DEG = Math.PI / 180;
/** A sky with the Sun in the east, so deep. */
const skyWith = (sunDepressionDeg: number): SkyAt => ({
  jdUt: 0,
  sunAzimuthRad: 90 * DEG,
  sunDepressionDeg,
  starAt: () => ({ altitudeRad: 0, azimuthRad: 0 }),
  aboveSkylineRad: () => 0,
});
const east = (altitudeDeg: number) => ({ altitudeRad: altitudeDeg * DEG, azimuthRad: 90 * DEG });

describe('what is to spare for a star', () => {
  it('by the rule of the dates is the depth of the Sun beyond the needed one', () => {
    const sight = sightByDates(
      {
        threshold: thresholdOf('three-class', 1, null),
        sameSideShiftDeg: 0,
        oppositeSideShiftDeg: 0,
        clarity: 'ordinary',
      },
      1,
    );
    expect(sight.spare(skyWith(11), east(0))).toBeCloseTo(0, 9);
    expect(sight.spare(skyWith(12), east(3))).toBeCloseTo(4, 9);
  });

  it('by the model grows as the Sun sinks and the star climbs, and by its offset', () => {
    const sight = sightByModel(plainAir(0.25), 1, 0);
    expect(sight.spare(skyWith(10), east(5))).toBeGreaterThan(sight.spare(skyWith(9), east(5)));
    expect(sight.spare(skyWith(10), east(8))).toBeGreaterThan(sight.spare(skyWith(10), east(5)));
    const keener = sightByModel(plainAir(0.25), 1, 1.5);
    expect(keener.spare(skyWith(10), east(5)) - sight.spare(skyWith(10), east(5))).toBeCloseTo(1.5, 9);
  });
});
