import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { directionAfter, starPath } from '#src/lib/star-path.js';

describe('the path of a star', () => {
  it('rises straight up in the east on the equator, 15 degrees and a little in an hour', () => {
    const later = directionAfter({ azimuthDeg: 90, altitudeDeg: 0 }, 0, 60);
    expect(later.azimuthDeg).toBeCloseTo(90, 6);
    // 360.9856 degrees a day: the sidereal turn.
    expect(later.altitudeDeg).toBeCloseTo(15.041, 3);
  });

  it('leans to the south in the north and to the north in the south', () => {
    expect(directionAfter({ azimuthDeg: 90, altitudeDeg: 0 }, 50, 30).azimuthDeg).toBeGreaterThan(90);
    expect(directionAfter({ azimuthDeg: 90, altitudeDeg: 0 }, -50, 30).azimuthDeg).toBeLessThan(90);
  });

  it('comes back to where it stood after one sidereal day', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 1, max: 359, noNaN: true }),
        fc.double({ min: -5, max: 60, noNaN: true }),
        fc.double({ min: -80, max: 80, noNaN: true }),
        (azimuthDeg, altitudeDeg, latitudeDeg) => {
          const back = directionAfter({ azimuthDeg, altitudeDeg }, latitudeDeg, (1440 * 360) / 360.985647);
          expect(back.altitudeDeg).toBeCloseTo(altitudeDeg, 6);
          expect(Math.cos(((back.azimuthDeg - azimuthDeg) * Math.PI) / 180)).toBeCloseTo(1, 8);
        },
      ),
    );
  });

  it('holds both its ends', () => {
    const from = { azimuthDeg: 66, altitudeDeg: 3 };
    const path = starPath(from, 12, -8, 20);
    expect(path[0]).toEqual(directionAfter(from, 12, -8));
    expect(path.at(-1)).toEqual(directionAfter(from, 12, 20));
  });
});
