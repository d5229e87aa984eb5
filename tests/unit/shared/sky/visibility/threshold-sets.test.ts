import { describe, expect, it } from 'vitest';

import { THRESHOLD_SET_FACTS, thresholdOf } from '#shared/sky/visibility/threshold-sets.js';
import { THRESHOLD_SETS } from '#shared/sky/vocabulary.js';

const pair = (...args: Parameters<typeof thresholdOf>): number[] => {
  const { sameSideDeg, oppositeSideDeg } = thresholdOf(...args);
  return [sameSideDeg, oppositeSideDeg];
};

describe('published thresholds', () => {
  it.each([
    [-1.46, 11, 7],
    [1.64, 11, 7],
    [1.65, 14, 8.5],
    [2.5, 14, 8.5],
    [2.51, 16, 10],
    [3.5, 16, 10],
  ])('in three classes: V %d needs %d° and %d° [Vogt1920 p. 17]', (vMag, same, opposite) => {
    expect(pair('three-class', vMag, null)).toEqual([same, opposite]);
    expect(thresholdOf('three-class', vMag, null)).toMatchObject({
      followsAzimuth: false,
      extrapolated: false,
    });
  });

  it('are continued beyond the third class and marked', () => {
    const { sameSideDeg, oppositeSideDeg, extrapolated } = thresholdOf('three-class', 4.5, null);
    expect([sameSideDeg, oppositeSideDeg]).toEqual([17.4, 11.4]);
    expect(extrapolated).toBe(true);
  });

  it('by the linear rule: Alcyone 14.5° and 10.5°', () => {
    const [same = 0, opposite = 0] = pair('linear-magnitude', 2.85, null);
    expect(same).toBeCloseTo(14.49, 9);
    expect(opposite).toBeCloseTo(10.49, 9);
    expect(thresholdOf('linear-magnitude', 4.5, null).extrapolated).toBe(false);
  });

  it('by the difference in azimuth: 9.0 + 2.5 cos E for the first class [Vogt1920 p. 37]', () => {
    expect(thresholdOf('azimuth-difference', 0.5, null)).toEqual({
      sameSideDeg: 11.5,
      oppositeSideDeg: 6.5,
      followsAzimuth: true,
      extrapolated: false,
    });
    expect(pair('azimuth-difference', 2, null)).toEqual([14, 8.5]);
    expect(thresholdOf('azimuth-difference', 4, null).extrapolated).toBe(true);
  });

  it('give way to the class of a figure', () => {
    const override = { sameSideDeg: 16, oppositeSideDeg: 10 };
    for (const set of THRESHOLD_SETS) expect(pair(set, 1.5, override)).toEqual([16, 10]);
  });

  it('name a source each', () => {
    for (const set of THRESHOLD_SETS) expect(THRESHOLD_SET_FACTS[set].source).toMatch(/\d{4}/);
  });
});
