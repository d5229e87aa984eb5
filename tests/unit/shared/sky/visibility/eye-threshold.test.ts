import { describe, expect, it } from 'vitest';

import { faintestMag } from '#shared/sky/visibility/eye-threshold.js';

describe('what the eye finds', () => {
  it('is joined from two laws that meet within 7 % at the change', () => {
    const gap = faintestMag(1499.99) - faintestMag(1500);
    expect(Math.abs(gap)).toBeLessThan(2.5 * Math.log10(1.08));
  });

  it('grows with darkness', () => {
    for (const nanolamberts of [1e6, 1e5, 1e4, 2000, 1000, 300, 60])
      expect(faintestMag(nanolamberts / 2)).toBeGreaterThan(faintestMag(nanolamberts));
  });

  it('gains five magnitudes for ten times the sharpness', () => {
    expect(faintestMag(100, 10) - faintestMag(100)).toBeCloseTo(5, 12);
  });
});
