import { describe, expect, it } from 'vitest';

import { rangeHalfWidthDeg } from '#shared/sky/visibility/range-width.js';

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
});
