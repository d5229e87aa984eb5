import { describe, expect, it } from 'vitest';

import { airAtPlace, EXTINCTION_OF_CLARITY, layeredAir, plainAir } from '#shared/sky/visibility/air.js';
import { CLARITIES } from '#shared/sky/vocabulary.js';

describe('air', () => {
  it.each(CLARITIES)('%s air at sea level comes to its extinction in the mean of the year', (clarity) => {
    const months = Array.from({ length: 12 }, (_, index) => index + 1);
    const mean =
      months
        .map((month) => airAtPlace({ latitudeDeg: 30, elevationM: 0 }, month, clarity).magPerAirmass)
        .reduce((sum, one) => sum + one, 0) / 12;
    expect(Math.abs(mean - EXTINCTION_OF_CLARITY[clarity])).toBeLessThan(0.015);
  });

  it('is clearer on a mountain, by any word', () => {
    for (const clarity of CLARITIES) {
      const at = (elevationM: number): number =>
        airAtPlace({ latitudeDeg: -14, elevationM }, 6, clarity).magPerAirmass;
      expect(at(3800)).toBeLessThan(at(0) - 0.05);
    }
  });

  it('in layers takes the same overhead and more at the horizon, where the haze lies', () => {
    const layered = layeredAir({ gasMag: 0.1066, aerosolMag: 0.1124, ozoneMag: 0.031, waterMag: 0 });
    const plain = plainAir(0.25);
    expect(layered.magPerAirmass).toBeCloseTo(0.25, 12);
    expect(layered.dimmingMag(90)).toBeCloseTo(plain.dimmingMag(90), 3);
    expect(layered.dimmingMag(0)).toBeGreaterThan(plain.dimmingMag(0) + 2);
  });
});
