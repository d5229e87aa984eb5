import { describe, expect, it } from 'vitest';

import { clampUnit, TAU, wrapPi, wrapTau } from '#shared/sky/units/angle.js';

describe('angles', () => {
  it.each([-7, -TAU, -0.5, 0, 3, TAU, 40])(
    'wrap %d into one turn without changing the direction',
    (angle) => {
      for (const wrapped of [wrapTau(angle), wrapPi(angle)]) {
        expect(Math.cos(wrapped)).toBeCloseTo(Math.cos(angle), 12);
        expect(Math.sin(wrapped)).toBeCloseTo(Math.sin(angle), 12);
      }
      expect(wrapTau(angle)).toBeGreaterThanOrEqual(0);
      expect(wrapTau(angle)).toBeLessThan(TAU);
      expect(wrapPi(angle)).toBeGreaterThanOrEqual(-Math.PI);
      expect(wrapPi(angle)).toBeLessThan(Math.PI);
    },
  );

  it('keep a sine that rounding pushed over the edge usable', () => {
    expect(Math.asin(clampUnit(1 + 1e-15))).toBe(Math.PI / 2);
    expect(Math.asin(clampUnit(-1 - 1e-15))).toBe(-Math.PI / 2);
    expect(clampUnit(0.3)).toBe(0.3);
  });
});
