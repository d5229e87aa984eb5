import { describe, expect, it } from 'vitest';

import { extinctionAngleDeg } from '#shared/sky/look/extinction-angle.js';

describe('the lowest altitude at which a star shows', () => {
  it('takes the tabled values at the tabled magnitudes', () => {
    expect(extinctionAngleDeg(-1.46, 'ordinary')).toBeCloseTo(0.4, 9);
    expect(extinctionAngleDeg(1, 'clear')).toBeCloseTo(0.3, 9);
    expect(extinctionAngleDeg(4, 'hazy')).toBeCloseTo(5.1, 9);
  });

  it('grows with fainter stars and with thicker air, without a step', () => {
    let before = { clear: 0, ordinary: 0, hazy: 0 };
    for (let vMag = -1.4; vMag <= 4.5; vMag += 0.05) {
      const now = {
        clear: extinctionAngleDeg(vMag, 'clear'),
        ordinary: extinctionAngleDeg(vMag, 'ordinary'),
        hazy: extinctionAngleDeg(vMag, 'hazy'),
      };
      expect(now.ordinary).toBeGreaterThan(now.clear);
      expect(now.hazy).toBeGreaterThan(now.ordinary);
      if (vMag > -1.39) {
        expect(now.hazy).toBeGreaterThan(before.hazy);
        expect(now.hazy - before.hazy).toBeLessThan(0.1);
      }
      before = now;
    }
  });

  it('goes on beyond the table: brighter ones keep the least, fainter ones the last slope', () => {
    expect(extinctionAngleDeg(-4, 'hazy')).toBeCloseTo(1.0, 9);
    expect(extinctionAngleDeg(5, 'ordinary')).toBeCloseTo(5.6, 9);
  });
});
