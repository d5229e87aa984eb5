import { SearchSunLongitude } from 'astronomy-engine';
import { describe, expect, it } from 'vitest';

import { sunLongitudeRad } from '#shared/sky/sun/sun-longitude.js';

const DEG = Math.PI / 180;

/** Remote centuries are held against PyEphem in tests/reference/against-ephem.test.ts. */
describe('the Sun’s longitude', () => {
  it('is 0°, 90°, 180° and 270° at the equinoxes and solstices of 2000 [Meeus 1998, table 27.E, to the minute]', () => {
    const minutes = 1 / 1440;
    const instants = [
      [2_451_623.8159, 0],
      [2_451_716.5746, 90],
      [2_451_810.2272, 180],
      [2_451_900.0689, 270],
    ] as const;
    for (const [jdTt, degrees] of instants) {
      const jdUt = jdTt - 64 / 86_400;
      const difference = Math.sin(sunLongitudeRad(jdUt) - degrees * DEG);
      // The Sun moves 0.0007° in a minute.
      expect(Math.abs(difference) / DEG).toBeLessThan(2 * minutes);
    }
  });

  it('agrees with the library’s own search in the present years', () => {
    const found = SearchSunLongitude(123, new Date('2027-06-01T00:00:00Z'), 100);
    expect(sunLongitudeRad((found?.ut ?? 0) + 2_451_545) / DEG).toBeCloseTo(123, 4);
  });
});
