import { describe, expect, it } from 'vitest';

import { moonOverPlaceOf } from '#shared/sky/look/moon-over-place.js';
import { moonPhasesOf } from '#shared/sky/phenomena/moon-phases.js';
import { siteAt } from '#tests/support/sky/builders.js';

describe('the Moon over a place', () => {
  it('is dark at new Moon and whole at full Moon', () => {
    for (const { quarter, jdUt } of moonPhasesOf(2027)) {
      const { litShare } = moonOverPlaceOf(siteAt(12, 39), jdUt);
      const expected = { new: 0, 'first-quarter': 0.5, full: 1, 'last-quarter': 0.5 }[quarter];
      expect(litShare).toBeCloseTo(expected, 1);
    }
  });

  it('stands opposite the Sun when it is full: up at midnight, down at noon', () => {
    const full = moonPhasesOf(2027).filter(({ quarter }) => quarter === 'full');
    for (const { jdUt } of full) {
      // Midnight at Greenwich is a Julian Day and a half.
      const midnight = Math.floor(jdUt) + 0.5;
      expect(moonOverPlaceOf(siteAt(0, 0), midnight).altitudeDeg).toBeGreaterThan(40);
      expect(moonOverPlaceOf(siteAt(0, 180), midnight).altitudeDeg).toBeLessThan(-40);
    }
  });
});
