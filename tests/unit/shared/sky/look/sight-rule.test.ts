import { describe, expect, it } from 'vitest';

import { isSeen, neededForSightDeg, type SightRule } from '#shared/sky/look/sight-rule.js';
import { thresholdOf } from '#shared/sky/visibility/threshold-sets.js';

const DEG = Math.PI / 180;
const rule = (more: Partial<SightRule> = {}): SightRule => ({
  threshold: thresholdOf('three-class', 1, null),
  sameSideShiftDeg: 0,
  oppositeSideShiftDeg: 0,
  clarity: 'ordinary',
  ...more,
});

describe('what it takes to see a star at a moment', () => {
  it('on the skyline is what the dates ask for', () => {
    expect(neededForSightDeg(rule(), 1, 0, 0)).toBe(11);
    expect(neededForSightDeg(rule(), 1, 0, Math.PI)).toBe(7);
  });

  it('near the Sun is less by each degree that the star stands higher, never less than a third', () => {
    expect(neededForSightDeg(rule(), 1, 3, 0)).toBeCloseTo(8, 9);
    expect(neededForSightDeg(rule(), 1, 60, 0)).toBeCloseTo(11 / 3, 9);
  });

  it('takes the shifts of the place and the air of the month', () => {
    expect(neededForSightDeg(rule({ clarity: 'hazy', sameSideShiftDeg: 0.5 }), 1, 0, 0)).toBeCloseTo(12.5, 9);
    expect(neededForSightDeg(rule({ clarity: 'clear', oppositeSideShiftDeg: 2 }), 1, 0, Math.PI)).toBeCloseTo(
      8,
      9,
    );
  });

  it('follows the azimuth where the threshold does', () => {
    const byAzimuth = rule({ threshold: thresholdOf('azimuth-difference', 1, null) });
    expect(neededForSightDeg(byAzimuth, 1, 0, 0)).toBeCloseTo(11.5, 9);
    expect(neededForSightDeg(byAzimuth, 1, 0, Math.PI / 2)).toBeCloseTo(9, 9);
    expect(neededForSightDeg(byAzimuth, 1, 0, Math.PI)).toBeCloseTo(6.5, 9);
  });

  it('far from the Sun is never more than beside it once the star stands high', () => {
    for (let altitudeDeg = 10.5; altitudeDeg < 90; altitudeDeg += 5) {
      expect(neededForSightDeg(rule(), 1, altitudeDeg, Math.PI)).toBeLessThanOrEqual(
        neededForSightDeg(rule(), 1, altitudeDeg, 0),
      );
    }
  });

  it('is never enough in the thick air just over the ground, however dark it is', () => {
    expect(isSeen(rule(), 1, 1.0 * DEG, 0, 40)).toBe(false);
    expect(isSeen(rule(), 1, 1.2 * DEG, 0, 40)).toBe(true);
    expect(isSeen(rule(), 1, 1.2 * DEG, 0, 9.7)).toBe(false);
  });
});
