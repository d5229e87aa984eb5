import { describe, expect, it } from 'vitest';
import {
  readDeclination,
  readRightAscension,
  writeDegrees,
} from '#src/features/figures/model/sky-coordinate.js';

describe('a place among the stars as people write it', () => {
  it.each([
    ['266.4', 266.4],
    ['266,4', 266.4],
    ['17h 45.6m', 266.4],
    ['17h45m36s', 266.4],
    ['0h', 0],
    ['266° 24′', 266.4],
  ])('reads the right ascension %s', (typed, degrees) => {
    expect(readRightAscension(typed)).toBeCloseTo(degrees, 9);
  });

  it.each([
    ['-29', -29],
    ['−29,5', -29.5],
    ['-29 30', -29.5],
    ['-0:30:00', -0.5],
    ['+16° 30′ 36″', 16.51],
  ])('reads the declination %s', (typed, degrees) => {
    expect(readDeclination(typed)).toBeCloseTo(degrees, 9);
  });

  it.each(['', 'south', '361', '25h', '-10'])('knows no right ascension “%s”', (typed) => {
    expect(readRightAscension(typed)).toBeNull();
  });

  it.each(['', '91', '-90.1', '12h'])('knows no declination “%s”', (typed) => {
    expect(readDeclination(typed)).toBeNull();
  });

  it('writes what it reads back as the same place', () => {
    expect(readDeclination(writeDegrees(-29.004))).toBe(-29);
  });
});
