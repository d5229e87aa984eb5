import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import { EXTINCTION_OF_CLARITY, plainAir } from '#shared/sky/visibility/air.js';
import { depthOnHillDeg, hillExcessDeg, showsAtDeg } from '#shared/sky/visibility/hill-allowance.js';
import {
  ALTITUDE_STEP_DEG,
  depthsByAltitude,
  leastDifferences,
} from '#shared/sky/visibility/model-depths.js';
import { CLARITIES } from '#shared/sky/vocabulary.js';
import { SEED } from '#tests/support/sky/arbitraries.js';

describe('what a hill changes', () => {
  it.each([
    [-1.5, [0, 0.3, 0.8, 2.0, 3.5, 5.1]],
    [0, [0, 0, 0.4, 1.5, 2.9, 4.4]],
    [1, [0, 0, 0, 0.8, 2.1, 3.5]],
    [2, [0, 0, 0, 0, 0.7, 2.0]],
  ])(
    'the excess of a star of V %d within 0.1° of an independent implementation, extinction 0.25 [C]',
    (vMag, expected) => {
      [4, 5, 6, 8, 10, 12].forEach((altitudeDeg, index) => {
        const excess = hillExcessDeg(vMag, 'ordinary', altitudeDeg);
        expect(Math.abs(excess - (expected[index] ?? NaN)), `${altitudeDeg}°`).toBeLessThanOrEqual(0.1);
      });
    },
  );

  it('is nothing on flat ground, grows with the hill and never outgrows it', () => {
    for (const clarity of CLARITIES) {
      for (const vMag of [-1.46, 0.3, 1.77, 2.9, 4.5]) {
        expect(hillExcessDeg(vMag, clarity, 0)).toBe(0);
        for (let altitudeDeg = 0; altitudeDeg < 20; altitudeDeg += 0.5) {
          const step =
            hillExcessDeg(vMag, clarity, altitudeDeg + 0.5) - hillExcessDeg(vMag, clarity, altitudeDeg);
          expect(step).toBeGreaterThanOrEqual(0);
          expect(hillExcessDeg(vMag, clarity, altitudeDeg)).toBeLessThanOrEqual(altitudeDeg);
        }
      }
    }
  });

  it('comes between the rows of its table as the model itself has it', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: -146, max: 200 }),
        fc.constantFrom(...CLARITIES),
        fc.integer({ min: 0, max: 48 }),
        (hundredths, clarity, column) => {
          const vMag = hundredths / 100;
          const [row = new Float64Array()] = depthsByAltitude(
            plainAir(EXTINCTION_OF_CLARITY[clarity]),
            'same',
            [vMag],
          );
          const least = leastDifferences(row);
          const direct = (least[column] ?? NaN) - (least[0] ?? NaN);
          const altitudeDeg = column * ALTITUDE_STEP_DEG;
          expect(Math.abs(hillExcessDeg(vMag, clarity, altitudeDeg) - direct)).toBeLessThan(0.12);
        },
      ),
      { seed: SEED, numRuns: 40 },
    );
  });

  it('asks for less depth on a higher hill where star and Sun move against each other', () => {
    for (const vMag of [-1, 1, 3]) {
      for (let altitudeDeg = 2; altitudeDeg < 20; altitudeDeg += 1) {
        expect(depthOnHillDeg(vMag, 'ordinary', altitudeDeg + 1)).toBeLessThanOrEqual(
          depthOnHillDeg(vMag, 'ordinary', altitudeDeg),
        );
      }
    }
  });

  it('is low enough on flat ground for the depth that the threshold has, and higher for a fainter star', () => {
    // Three-class thresholds of Sirius, Aldebaran and a star of the second class.
    for (const [vMag, oppositeSideDeg] of [
      [-1.46, 7],
      [0.85, 7],
      [2, 8.5],
    ] as const) {
      const atDeg = showsAtDeg(vMag, oppositeSideDeg);
      expect(depthOnHillDeg(vMag, 'ordinary', atDeg) - atDeg).toBeCloseTo(oppositeSideDeg, 1);
    }
    expect(showsAtDeg(-1.46, 7)).toBeLessThan(showsAtDeg(0.85, 7));
    expect(showsAtDeg(0.85, 7)).toBeLessThan(6);
  });

  it('asks for more depth in haze', () => {
    expect(depthOnHillDeg(1, 'hazy', 6)).toBeGreaterThan(depthOnHillDeg(1, 'clear', 6) + 0.5);
  });
});
