import { describe, expect, it } from 'vitest';

import { compassPoint } from '#shared/sky/horizon/compass.js';
import { COMPASS_POINTS } from '#shared/sky/vocabulary.js';

describe('compass words', () => {
  it('name the sixteen directions clockwise from north', () => {
    expect(COMPASS_POINTS.map((_, index) => compassPoint(index * 22.5))).toEqual(COMPASS_POINTS);
  });

  it.each([
    [359, 'n'],
    [11.2, 'n'],
    [11.3, 'nne'],
    [-90, 'w'],
    [720 + 135, 'se'],
  ])('%d° is %s', (azimuthDeg, word) => expect(compassPoint(azimuthDeg)).toBe(word));
});
