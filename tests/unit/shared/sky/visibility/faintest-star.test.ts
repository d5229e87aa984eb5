import { describe, expect, it } from 'vitest';

import { layeredAir, plainAir } from '#shared/sky/visibility/air.js';
import { faintestStarMag } from '#shared/sky/visibility/faintest-star.js';

const night = { sunAltitudeDeg: -40, azimuthDifferenceDeg: 90, moonNl: 0 };
const GAS_AND_OZONE_MAG = 0.1066 + 0.031;
/** Gas and ozone as at sea level, some water, the rest haze. */
const airOf = (magPerAirmass: number, waterMag: number) =>
  layeredAir({
    gasMag: 0.1066,
    aerosolMag: magPerAirmass - GAS_AND_OZONE_MAG - waterMag,
    ozoneMag: 0.031,
    waterMag,
  });
/**
 * Vapour of the same note's worked air (40 %, 15 °C). The angles of the note hold with it: without vapour, all the rest
 * haze, the model comes up to 0.26° higher, because haze lies lowest; no other eye, airmass, refraction or glow of the
 * night brings them nearer than 0.2°. The differences of star and Sun (model-depths) hold with and without.
 */
const WORKED_WATER_MAG = 0.032;

/** Lowest altitude at which a star shows on a dark night. */
function extinctionAngleDeg(magPerAirmass: number, waterMag: number, vMag: number): number {
  const air = airOf(magPerAirmass, waterMag);
  for (let altitudeDeg = 0; altitudeDeg < 90; altitudeDeg += 0.02) {
    if (faintestStarMag(air, { ...night, altitudeDeg }) >= vMag) return altitudeDeg;
  }
  return 90;
}

describe('the faintest star that shows', () => {
  it('has magnitude 6.2 at a dark zenith for an extinction of 0.36 [C]', () => {
    expect(faintestStarMag(plainAir(0.36), { ...night, altitudeDeg: 90 })).toBeCloseTo(6.2, 1);
  });

  const ANGLES = [
    [0.2, [0.1, 0.1, 0.3, 0.7, 1.3, 2.6]],
    [0.25, [0.4, 0.8, 1.1, 1.6, 2.4, 4.0]],
    [0.3, [1.0, 1.4, 1.8, 2.4, 3.3, 5.1]],
  ] as const;
  const furthestDeg = (mag: number, waterMag: number, angles: readonly number[]): number =>
    Math.max(
      ...[-1.46, 0, 1, 2, 3, 4].map((vMag, index) =>
        Math.abs(extinctionAngleDeg(mag, waterMag, vMag) - (angles[index] ?? NaN)),
      ),
    );

  it.each(ANGLES)(
    'comes up from the horizon within 0.2° of an independent implementation, extinction %d [C]',
    (mag, angles) => {
      expect(furthestDeg(mag, WORKED_WATER_MAG, angles)).toBeLessThanOrEqual(0.13);
    },
  );

  it('comes up higher in air without vapour, where all of the rest is haze', () => {
    for (const [mag, angles] of ANGLES) {
      expect(furthestDeg(mag, 0, angles)).toBeLessThanOrEqual(0.28);
      expect(extinctionAngleDeg(mag, 0, 3)).toBeGreaterThan(extinctionAngleDeg(mag, WORKED_WATER_MAG, 3));
    }
  });

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
