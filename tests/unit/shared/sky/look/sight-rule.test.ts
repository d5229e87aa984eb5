import { describe, expect, it } from 'vitest';

import { type Seeing, sightOf } from '#shared/sky/look/sight-rule.js';
import { airAtPlace } from '#shared/sky/visibility/air.js';
import type { Clarity } from '#shared/sky/vocabulary.js';

const PLACE = { latitudeDeg: 12, elevationM: 0 };
const seeing = (clarity: Clarity = 'ordinary', sameSideShiftDeg = 0): Seeing => ({
  air: airAtPlace(PLACE, 6, clarity),
  clarity,
  thresholdSet: 'three-class',
  sameSideShiftDeg,
});

/** Most that a star of V 1 can spare on its way up beside a Sun that stays so many degrees lower. */
function mostSpare(apartDeg: number, given = seeing(), vMag = 1): number {
  const sight = sightOf(given, vMag, null);
  const spares = Array.from({ length: 81 }, (_, index) => index / 4).map((altitudeDeg) =>
    sight.spareMag({
      altitudeDeg,
      sunAltitudeDeg: altitudeDeg - apartDeg,
      azimuthDifferenceDeg: 20,
      moonNl: 0,
    }),
  );
  return Math.max(...spares);
}

describe('whether a star shows', () => {
  it('agrees with the place’s rule: on its arcus visionis the star just shows, a degree less and it does not', () => {
    expect(mostSpare(11)).toBeCloseTo(0, 9);
    expect(mostSpare(10)).toBeLessThan(0);
    expect(mostSpare(12)).toBeGreaterThan(0);
    expect(mostSpare(14, seeing(), 2)).toBeCloseTo(0, 9);
  });

  it('follows the air of the month and the shift of the place', () => {
    expect(mostSpare(12, seeing('hazy'))).toBeCloseTo(0, 9);
    expect(mostSpare(10, seeing('clear'))).toBeCloseTo(0, 9);
    expect(mostSpare(12.5, seeing('ordinary', 1.5))).toBeCloseTo(0, 9);
  });

  it('takes a figure’s own depths where it has them', () => {
    const sight = sightOf(seeing(), 2.85, { sameSideDeg: 20, oppositeSideDeg: 12 });
    const plain = sightOf(seeing(), 2.85, null);
    const moment = { altitudeDeg: 5, sunAltitudeDeg: -12, azimuthDifferenceDeg: 20, moonNl: 0 };
    expect(sight.spareMag(moment)).toBeLessThan(plain.spareMag(moment));
  });

  it('is hopeless in the thick air just over the ground, however dark it is, and easy overhead', () => {
    const sight = sightOf(seeing(), 1, null);
    const at = (altitudeDeg: number) =>
      sight.spareMag({ altitudeDeg, sunAltitudeDeg: -40, azimuthDifferenceDeg: 90, moonNl: 0 });
    expect(at(60)).toBeGreaterThan(at(5));
    expect(at(5)).toBeGreaterThan(at(0.5));
    expect(at(-0.1)).toBe(Number.NEGATIVE_INFINITY);
  });

  it('is better away from the Sun than beside it, and worse under the Moon', () => {
    const sight = sightOf(seeing(), 1, null);
    const at = (azimuthDifferenceDeg: number, moonNl = 0) =>
      sight.spareMag({ altitudeDeg: 8, sunAltitudeDeg: -8, azimuthDifferenceDeg, moonNl });
    expect(at(170)).toBeGreaterThan(at(20));
    expect(at(170, 2000)).toBeLessThan(at(170));
  });
});
