import { describe, expect, it } from 'vitest';

import { modelDays } from '#shared/sky/air/model-year.js';
import { showsAtDeg } from '#shared/sky/visibility/hill-allowance.js';
import { PHENOMENA } from '#shared/sky/index.js';
import { civilYearOf } from '#shared/sky/time/civil-year.js';
import { airAtPlace } from '#shared/sky/visibility/air.js';
import { PROPERTY_TIMEOUT_MS } from '#tests/support/sky/arbitraries.js';
import { siteAt } from '#tests/support/sky/builders.js';
import { markerAt } from '#tests/support/sky/marker.js';
import { minuteScanYear } from '#tests/support/sky/minute-scan.js';

/**
 * The model's year finds its days by halving between crossings; the oracle looks at every minute of every night. The
 * two step through the minutes from different ends and may differ by one of them, which is a day at most.
 */
const YEAR = 2027;

describe(
  'the year by the model of visibility and a look at every minute of it',
  { timeout: PROPERTY_TIMEOUT_MS },
  () => {
    it.each([
      { name: 'Sirius', hr: 2491, latitudeDeg: 30, skylineDeg: 0 },
      { name: 'Aldebaran', hr: 1457, latitudeDeg: 30, skylineDeg: 8 },
      { name: 'Antares', hr: 6134, latitudeDeg: -14, skylineDeg: 3 },
      { name: 'Spica', hr: 5056, latitudeDeg: 10, skylineDeg: 0 },
      { name: 'Canopus', hr: 2326, latitudeDeg: 20, skylineDeg: 0 },
      { name: 'Alnilam', hr: 1903, latitudeDeg: 12, skylineDeg: 5 },
    ])(
      '$name at $latitudeDeg° over $skylineDeg°: all four within a day',
      ({ hr, latitudeDeg, skylineDeg }) => {
        const skyline = skylineDeg === 0 ? [] : [{ azimuthDeg: 0, altitudeDeg: skylineDeg }];
        const marker = markerAt(`hr${hr}`, siteAt(latitudeDeg, 0, { skyline }), YEAR);
        const air = airAtPlace({ latitudeDeg, elevationM: 0 }, 6, 'ordinary');
        const scan = minuteScanYear({
          hr,
          latitudeDeg,
          longitudeDeg: 0,
          year: civilYearOf(YEAR),
          skylineDeg,
          // On a hill the scan's grid meets the star up to a minute after it cleared the skyline.
          nearSkylineDeg: Math.max(
            skylineDeg + 0.25,
            showsAtDeg(marker.marker.vMag, marker.threshold.oppositeSideDeg),
          ),
          airOf: () => air,
        });
        for (const phenomenon of PHENOMENA) {
          const [day] = modelDays(marker, phenomenon, () => air);
          const [scanned] = scan[phenomenon];
          expect(Math.abs((day ?? NaN) - (scanned ?? NaN)), phenomenon).toBeLessThanOrEqual(1);
        }
      },
    );
  },
);
