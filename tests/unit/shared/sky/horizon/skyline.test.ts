import { describe, expect, it } from 'vitest';

import { levelSkyline, prepareSkyline } from '#shared/sky/horizon/skyline.js';

const DEG = Math.PI / 180;
const at = (points: [number, number][], azimuthDeg: number): number =>
  prepareSkyline(points.map(([azimuth, altitudeDeg]) => ({ azimuthDeg: azimuth, altitudeDeg }))).altitudeRad(
    azimuthDeg * DEG,
  ) / DEG;

describe('a skyline', () => {
  it('joins its points by straight lines, whatever their order', () => {
    const points: [number, number][] = [
      [180, 8],
      [90, 4],
      [270, 0],
    ];
    expect(at(points, 90)).toBeCloseTo(4, 12);
    expect(at(points, 135)).toBeCloseTo(6, 12);
    expect(at(points, 225)).toBeCloseTo(4, 12);
  });

  it('runs on through north, where 0° and 360° are one point', () => {
    expect(
      at(
        [
          [350, 2],
          [10, 6],
        ],
        0,
      ),
    ).toBeCloseTo(4, 12);
    expect(
      at(
        [
          [350, 2],
          [10, 6],
        ],
        355,
      ),
    ).toBeCloseTo(3, 12);
    expect(
      at(
        [
          [0, 5],
          [180, 1],
          [360, 5],
        ],
        270,
      ),
    ).toBeCloseTo(3, 12);
    expect(
      at(
        [
          [0, 5],
          [180, 1],
          [360, 5],
        ],
        360,
      ),
    ).toBeCloseTo(5, 12);
  });

  it('is level without points, with one, and where all have one altitude', () => {
    expect(prepareSkyline([])).toMatchObject({ level: true, lowestRad: 0, highestRad: 0 });
    expect(at([[77, 3]], 200)).toBeCloseTo(3, 12);
    expect(
      prepareSkyline([
        { azimuthDeg: 1, altitudeDeg: 2 },
        { azimuthDeg: 9, altitudeDeg: 2 },
      ]).level,
    ).toBe(true);
    expect(levelSkyline(0.1).altitudeRad(3)).toBe(0.1);
  });
});
