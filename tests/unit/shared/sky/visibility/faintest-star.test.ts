import { describe, expect, it } from 'vitest';

import { layeredAir, plainAir } from '#shared/sky/visibility/air.js';
import { faintestStarMag } from '#shared/sky/visibility/faintest-star.js';

const night = { sunAltitudeDeg: -40, azimuthDifferenceDeg: 90, moonNl: 0 };
const airOf = (magPerAirmass: number) =>
  layeredAir({ gasMag: 0.1066, aerosolMag: magPerAirmass - 0.1376, ozoneMag: 0.031, waterMag: 0 });

/** Lowest altitude at which a star shows on a dark night. */
function extinctionAngleDeg(magPerAirmass: number, vMag: number): number {
  for (let altitudeDeg = 0; altitudeDeg < 90; altitudeDeg += 0.02) {
    if (faintestStarMag(airOf(magPerAirmass), { ...night, altitudeDeg }) >= vMag) return altitudeDeg;
  }
  return 90;
}

describe('the faintest star that shows', () => {
  it('has magnitude 6.2 at a dark zenith for an extinction of 0.36 [C]', () => {
    expect(faintestStarMag(plainAir(0.36), { ...night, altitudeDeg: 90 })).toBeCloseTo(6.2, 1);
  });

  it.each([
    [0.2, [0.1, 0.1, 0.3, 0.7, 1.3, 2.6]],
    [0.25, [0.4, 0.8, 1.1, 1.6, 2.4, 4.0]],
    [0.3, [1.0, 1.4, 1.8, 2.4, 3.3, 5.1]],
  ])(
    'comes up from the horizon as an independent implementation has it, extinction %d [C]',
    (mag, angles) => {
      [-1.46, 0, 1, 2, 3, 4].forEach((vMag, index) => {
        expect(Math.abs(extinctionAngleDeg(mag, vMag) - (angles[index] ?? NaN))).toBeLessThanOrEqual(0.28);
      });
    },
  );

  it('is brighter under a Moon, and there is none below the horizon', () => {
    const dark = faintestStarMag(plainAir(0.25), { ...night, altitudeDeg: 30 });
    expect(faintestStarMag(plainAir(0.25), { ...night, altitudeDeg: 30, moonNl: 1500 })).toBeLessThan(
      dark - 1,
    );
    expect(faintestStarMag(plainAir(0.25), { ...night, altitudeDeg: -0.1 })).toBe(Number.NEGATIVE_INFINITY);
  });

  it('is fainter for a sharper eye', () => {
    const moment = { ...night, altitudeDeg: 30 };
    expect(faintestStarMag(plainAir(0.25), moment, 1.26)).toBeCloseTo(
      faintestStarMag(plainAir(0.25), moment) + 0.5,
      2,
    );
  });
});
