import { describe, expect, it } from 'vitest';

import { bearingRad, separationRad } from '#shared/sky/look/direction.js';

const DEG = Math.PI / 180;
const at = (azimuthDeg: number, altitudeDeg: number) => ({
  azimuthRad: azimuthDeg * DEG,
  altitudeRad: altitudeDeg * DEG,
});
const bearingDeg = (from: ReturnType<typeof at>, to: ReturnType<typeof at>) => bearingRad(from, to) / DEG;

describe('from one direction to another', () => {
  it.each([
    ['up', at(90, 10), at(90, 30), 0, 20],
    ['right, for whoever faces them', at(90, 0), at(110, 0), 90, 20],
    ['down', at(90, 30), at(90, 10), 180, 20],
    ['left', at(90, 0), at(70, 0), 270, 20],
    ['right, through north', at(355, 0), at(5, 0), 90, 10],
  ])('the eye goes %s', (_, from, to, bearing, separation) => {
    expect(bearingDeg(from, to)).toBeCloseTo(bearing, 9);
    expect(separationRad(from, to) / DEG).toBeCloseTo(separation, 9);
  });

  it('is a great circle: between two stars as high as each other the way begins upward', () => {
    const [left, right] = [at(60, 40), at(120, 40)];
    expect(bearingDeg(left, right)).toBeLessThan(90);
    expect(bearingDeg(right, left)).toBeGreaterThan(270);
    expect(separationRad(left, right)).toBeCloseTo(separationRad(right, left), 12);
    // cos s = sin² 40° + cos² 40° · cos 60°, worked by hand: 0.7066, 45.04°.
    expect(separationRad(left, right) / DEG).toBeCloseTo(45.04, 1);
  });

  it('stays a number for one and the same direction', () => {
    expect(separationRad(at(123, 45), at(123, 45))).toBeCloseTo(0, 6);
    expect(bearingDeg(at(123, 45), at(123, 45))).not.toBeNaN();
  });
});
