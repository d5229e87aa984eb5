import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import { latitudeOf } from '#shared/sky/horizon/horizontal.js';
import { eclipticZenithAt, highestTravelRad } from '#shared/sky/phenomena/ecliptic-zenith.js';
import { PROPERTY_TIMEOUT_MS, SEED } from '#tests/support/sky/arbitraries.js';

const DEG = Math.PI / 180;
const obliquity = { sinObliquity: Math.sin(23.44 * DEG), cosObliquity: Math.cos(23.44 * DEG) };

describe('the zenith seen from the ecliptic', () => {
  it('gives the Sun’s altitude at any longitude', { timeout: PROPERTY_TIMEOUT_MS }, () => {
    fc.assert(
      fc.property(
        fc.integer({ min: -90, max: 90 }),
        fc.integer({ min: 0, max: 359 }),
        fc.integer({ min: 0, max: 359 }),
        (latitudeDeg, siderealDeg, longitudeDeg) => {
          const latitude = latitudeOf(latitudeDeg * DEG);
          const zenith = eclipticZenithAt(obliquity, latitude, siderealDeg * DEG);
          const longitude = longitudeDeg * DEG;
          const declination = Math.asin(obliquity.sinObliquity * Math.sin(longitude));
          const ascension = Math.atan2(obliquity.cosObliquity * Math.sin(longitude), Math.cos(longitude));
          const sinAltitude =
            latitude.sin * Math.sin(declination) +
            latitude.cos * Math.cos(declination) * Math.cos(siderealDeg * DEG - ascension);
          expect(zenith.reach * Math.cos(longitude - zenith.highestRad)).toBeCloseTo(sinAltitude, 12);
        },
      ),
      { seed: SEED },
    );
  });

  it(
    'travels as a walk in small steps says, inside and outside the polar circles',
    { timeout: PROPERTY_TIMEOUT_MS },
    () => {
      fc.assert(
        fc.property(
          fc.integer({ min: -89, max: 89 }),
          fc.integer({ min: 0, max: 359 }),
          fc.integer({ min: 1, max: 359 }),
          (latitudeDeg, fromDeg, upDeg) => {
            // Right on the polar circle the zenith meets the pole of the ecliptic and no direction is left.
            fc.pre(Math.abs(Math.abs(latitudeDeg) - 66.56) > 0.3);
            const latitude = latitudeOf(latitudeDeg * DEG);
            let walked = 0;
            let last = eclipticZenithAt(obliquity, latitude, fromDeg * DEG).highestRad;
            const steps = 4000;
            for (let step = 1; step <= steps; step += 1) {
              const here = eclipticZenithAt(
                obliquity,
                latitude,
                (fromDeg + (upDeg * step) / steps) * DEG,
              ).highestRad;
              walked += Math.atan2(Math.sin(here - last), Math.cos(here - last));
              last = here;
            }
            const travel = highestTravelRad(obliquity, latitude, fromDeg * DEG, (fromDeg + upDeg) * DEG);
            expect(travel).toBeCloseTo(walked, 9);
          },
        ),
        { seed: SEED, numRuns: 60 },
      );
    },
  );
});
