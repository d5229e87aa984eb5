import { describe, expect, it } from 'vitest';

import { separationRad } from '#shared/sky/look/direction.js';
import { skyAt } from '#shared/sky/look/sky-at.js';
import { siteAt } from '#tests/support/sky/builders.js';
import { jsonFixture } from '#tests/support/sky/fixtures.js';
import { markerAt } from '#tests/support/sky/marker.js';

interface HorizontalCase {
  hr: number;
  latitudeDeg: number;
  longitudeDeg: number;
  elevationM: number;
  jdUt: number;
  altitudeDeg: number;
  azimuthDeg: number;
}

const { cases } = jsonFixture('erfa-horizontal.json') as { cases: HorizontalCase[] };
const DEG = Math.PI / 180;
/** Aberration (0.006°), half a year of precession and a second between UT and UTC: the engine leaves them out. */
const TOLERANCE_DEG = 0.02;

describe('ERFA: where a star stands over a place', () => {
  it.each(cases)('HR $hr at JD $jdUt, latitude $latitudeDeg', (expected) => {
    const year = 2000 + Math.floor((expected.jdUt - 2_451_544.5) / 365.25);
    const { latitudeDeg, longitudeDeg } = expected;
    const marker = markerAt(`hr${expected.hr}`, siteAt(latitudeDeg, longitudeDeg), year);
    const star = skyAt(marker.year, marker.ground, expected.jdUt).starAt(
      marker.year.stars.placeOf(marker.marker.starRef),
    );
    const apart = separationRad(star, {
      altitudeRad: expected.altitudeDeg * DEG,
      azimuthRad: expected.azimuthDeg * DEG,
    });
    expect(apart / DEG).toBeLessThan(TOLERANCE_DEG);
  });
});
