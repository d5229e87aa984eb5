import { describe, expect, it } from 'vitest';

import { bodyLightAt, bodyPlaceAt } from '#shared/sky/look/body-places.js';
import { separationRad } from '#shared/sky/look/direction.js';
import type { NakedEyePlanet } from '#shared/sky/vocabulary.js';
import { siteAt } from '#tests/support/sky/builders.js';
import { jsonFixture } from '#tests/support/sky/fixtures.js';

interface BodyCase {
  latitudeDeg: number;
  longitudeDeg: number;
  elevationM: number;
  jdUt: number;
  body: NakedEyePlanet | 'moon';
  altitudeDeg: number;
  azimuthDeg: number;
  litShare: number;
  vMag?: number;
}

const { cases } = jsonFixture('ephem-bodies.json') as { cases: BodyCase[] };
const DEG = Math.PI / 180;
/** A hundredth of a hand-width is 0.1°; series, ΔT and the Moon's parallax part by far less. */
const TOLERANCE_DEG = 0.02;

describe('PyEphem: Moon and planets over three places', () => {
  it.each(cases)('$body at JD $jdUt, latitude $latitudeDeg', (expected) => {
    const site = siteAt(expected.latitudeDeg, expected.longitudeDeg, { elevationM: expected.elevationM });
    const apart = separationRad(bodyPlaceAt(expected.body, site, expected.jdUt), {
      altitudeRad: expected.altitudeDeg * DEG,
      azimuthRad: expected.azimuthDeg * DEG,
    });
    expect(apart / DEG).toBeLessThan(TOLERANCE_DEG);
    const light = bodyLightAt(expected.body, expected.jdUt);
    // The Moon's lit share is asked of the Earth's centre here, of the place there: up to a degree of phase.
    expect(Math.abs(light.litShare - expected.litShare)).toBeLessThan(
      expected.body === 'moon' ? 0.012 : 0.006,
    );
    // Rules for magnitudes differ between authorities. For a crescent as thin as Mercury's beside the Sun, where nobody
    // sees it, they are stretched beyond their data.
    if (expected.vMag !== undefined && expected.litShare > 0.1)
      expect(Math.abs(light.vMag - expected.vMag)).toBeLessThan(0.5);
  });
});
