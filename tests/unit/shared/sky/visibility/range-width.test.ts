import { describe, expect, it } from 'vitest';

import { EXTINCTION_OF_CLARITY, plainAir } from '#shared/sky/visibility/air.js';
import { depthsByAltitude, leastDifferences } from '#shared/sky/visibility/model-depths.js';
import { rangeHalfWidthDeg } from '#shared/sky/visibility/range-width.js';
import type { Clarity } from '#shared/sky/vocabulary.js';

describe('half the width of a range', () => {
  it.each([
    [-1.46, 1.5],
    [0, 2],
    [1.49, 2],
    [1.5, 2.5],
    [2.49, 2.5],
    [2.5, 3],
    [4.4, 3],
  ])('grows with faintness: V %d has %d°', (vMag, expected) => {
    expect(rangeHalfWidthDeg(vMag, 'same')).toBe(expected);
    expect(rangeHalfWidthDeg(vMag, 'opposite')).toBe(expected + 1);
  });

  it('holds what a step of clarity and half a magnitude of eyesight come to in the model of visibility', () => {
    const differenceDeg = (vMag: number, clarity: Clarity): number =>
      leastDifferences(
        depthsByAltitude(plainAir(EXTINCTION_OF_CLARITY[clarity]), 'same', [vMag])[0] ?? new Float64Array(),
      )[0] ?? Number.NaN;
    for (const vMag of [-1.46, 0, 0.5, 1, 2]) {
      const byAir = (differenceDeg(vMag, 'hazy') - differenceDeg(vMag, 'clear')) / 2;
      const byEye = (differenceDeg(vMag + 0.5, 'ordinary') - differenceDeg(vMag - 0.5, 'ordinary')) / 2;
      expect(rangeHalfWidthDeg(vMag, 'same'), `V ${vMag}`).toBeGreaterThanOrEqual(
        Math.hypot(byAir, byEye) - 0.1,
      );
    }
  });
});
