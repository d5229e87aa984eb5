import { describe, expect, it } from 'vitest';

import { plainAir } from '#shared/sky/visibility/air.js';
import { depthsByAltitude, leastDifferences } from '#shared/sky/visibility/model-depths.js';
import { modelValueDeg } from '#shared/sky/visibility/model-table.js';

const direct = (mag: number, vMag: number): number =>
  leastDifferences(depthsByAltitude(plainAir(mag), 'same', [vMag])[0] ?? new Float64Array())[0] ?? NaN;

describe('the tables of the model', () => {
  it('hold the model’s own values at their steps of air and brightness', () => {
    for (const mag of [0.1, 0.2, 0.25, 0.3, 0.45])
      for (const vMag of [-1.5, 0, 1, 2.25])
        expect(modelValueDeg('same', mag, vMag, 0)).toBeCloseTo(direct(mag, vMag), 9);
  });

  it('come near the model between their steps', () => {
    for (const mag of [0.125, 0.18, 0.22, 0.27, 0.33])
      for (const vMag of [-1.46, 0.85, 1.6])
        expect(Math.abs(modelValueDeg('same', mag, vMag, 0) - direct(mag, vMag))).toBeLessThan(0.1);
  });

  it('stay at their last step in air beyond them', () => {
    expect(modelValueDeg('same', 0.02, 0, 0)).toBe(modelValueDeg('same', 0.1, 0, 0));
    expect(modelValueDeg('opposite', 3, 0, 5)).toBe(modelValueDeg('opposite', 0.5, 0, 5));
  });
});
