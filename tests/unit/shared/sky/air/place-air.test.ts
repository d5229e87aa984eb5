import { describe, expect, it } from 'vitest';

import { placeAirOf } from '#shared/sky/air/place-air.js';
import { airAtPlace } from '#shared/sky/visibility/air.js';
import { siteAt } from '#tests/support/sky/builders.js';

describe('the air of a place', () => {
  it('is that of its latitude, elevation, month and clarity, made once', () => {
    const site = siteAt(-14, 0, { elevationM: 3800 });
    const air = placeAirOf(site);
    for (const [month, clarity] of [
      [1, 'clear'],
      [7, 'hazy'],
    ] as const) {
      expect(air(month, clarity).magPerAirmass).toBe(airAtPlace(site, month, clarity).magPerAirmass);
      expect(air(month, clarity)).toBe(air(month, clarity));
    }
    expect(air(7, 'clear').magPerAirmass).toBeLessThan(air(7, 'hazy').magPerAirmass);
  });
});
