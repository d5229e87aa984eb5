import { describe, expect, it } from 'vitest';
import { horizonAltitude, horizonWithin } from '#src/ui/pictures/skyline.js';

const hills = [
  { azimuthDeg: 350, altitudeDeg: 4 },
  { azimuthDeg: 10, altitudeDeg: 2 },
  { azimuthDeg: 90, altitudeDeg: 10 },
];

describe('the horizon of a picture', () => {
  it('is flat without points', () => {
    expect(horizonAltitude([], 123)).toBe(0);
  });

  it('is straight between two points, round through north', () => {
    expect(horizonAltitude(hills, 50)).toBeCloseTo(6, 10);
    expect(horizonAltitude(hills, 0)).toBeCloseTo(3, 10);
    expect(horizonAltitude(hills, 355)).toBeCloseTo(3.5, 10);
    expect(horizonAltitude(hills, 90)).toBe(10);
  });

  it('runs on through north in a view that crosses it', () => {
    const view = { fromAzimuthDeg: 340, toAzimuthDeg: 400, topDeg: 10, bottomDeg: 0 };
    const corners = horizonWithin(hills, view);
    expect(corners.map((corner) => corner.azimuthDeg)).toEqual([340, 350, 370, 400]);
    expect(corners.at(-1)?.altitudeDeg).toBeCloseTo(5, 10);
  });

  it('with both 0 and 360 degrees in its table has one height in the north', () => {
    const full = [
      { azimuthDeg: 0, altitudeDeg: 3 },
      { azimuthDeg: 180, altitudeDeg: 1 },
      { azimuthDeg: 360, altitudeDeg: 3 },
    ];
    expect(horizonAltitude(full, 0)).toBe(3);
    expect(horizonAltitude(full, 360)).toBe(3);
    expect(horizonAltitude(full, 359)).toBeCloseTo(3 - 2 / 180, 10);
  });
});
