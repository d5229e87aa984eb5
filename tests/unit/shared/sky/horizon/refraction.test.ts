import { describe, expect, it } from 'vitest';

import { refractionDeg } from '#shared/sky/horizon/refraction.js';

describe('refraction by apparent altitude', () => {
  it('is 34.5′ at the horizon [Bennett 1982] and 5.3′ at 10° [Meeus 1998, chapter 16]', () => {
    expect(refractionDeg(0) * 60).toBeCloseTo(34.5, 1);
    expect(refractionDeg(10) * 60).toBeCloseTo(5.3, 0);
  });

  it('never grows with altitude, and never turns negative or endless', () => {
    let last = refractionDeg(-5);
    expect(last).toBeLessThan(1);
    for (let altitude = -4.9; altitude <= 90; altitude += 0.1) {
      const here = refractionDeg(altitude);
      expect(here).toBeLessThanOrEqual(last);
      expect(here).toBeGreaterThanOrEqual(0);
      last = here;
    }
  });
});
