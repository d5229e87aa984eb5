import { describe, expect, it } from 'vitest';
import { readElevationM } from '#src/features/places/model/elevation.js';

describe('a height above the sea', () => {
  it.each([
    ['1950', 1950],
    ['1,950', 1950],
    ['1.950', 1950],
    ['1 950 m', 1950],
    ['1950 metres', 1950],
    ['12.5', 12.5],
    ['12,5', 12.5],
    ['-30', -30],
    ['−30 m', -30],
    ['0', 0],
  ])('%j is %d metres', (text, metres) => {
    expect(readElevationM(text)).toBe(metres);
  });

  it.each(['', 'high', '6400 ft', '1950x', '1,95,0'])('%j is none', (text) => {
    expect(readElevationM(text)).toBeNull();
  });
});
