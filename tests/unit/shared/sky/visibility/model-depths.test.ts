import { describe, expect, it } from 'vitest';

import { layeredAir } from '#shared/sky/visibility/air.js';
import {
  ALTITUDE_COUNT,
  ALTITUDE_STEP_DEG,
  depthsByAltitude,
  leastDifferences,
  NOT_SEEN_DEG,
} from '#shared/sky/visibility/model-depths.js';

/** Air as in the published comparison: gas and ozone as at sea level, the rest haze. */
const airOf = (magPerAirmass: number) =>
  layeredAir({ gasMag: 0.1066, aerosolMag: magPerAirmass - 0.1376, ozoneMag: 0.031, waterMag: 0 });
const MAGNITUDES = [-1.46, 0, 1, 2];

describe('the depths that the model asks for', () => {
  it.each([
    ['same', 0.17, [8.8, 11.0, 13.0, 15.9]],
    ['same', 0.2, [9.4, 11.7, 13.8, 16.9]],
    ['same', 0.25, [10.4, 12.8, 15.0, 18.5]],
    ['same', 0.3, [11.3, 13.8, 16.2, 20.0]],
    ['same', 0.35, [12.1, 14.7, 17.3, 21.5]],
    ['opposite', 0.2, [7.2, 9.6, 11.7, 14.9]],
    ['opposite', 0.25, [8.2, 10.7, 13.0, 16.5]],
  ] as const)(
    'give the smallest difference of star and Sun within 0.2° of an independent implementation: %s side, extinction %d [C]',
    (side, mag, expected) => {
      const least = depthsByAltitude(airOf(mag), side, MAGNITUDES).map(
        (row) => leastDifferences(row)[0] ?? NaN,
      );
      least.forEach((value, index) => {
        expect(Math.abs(value - (expected[index] ?? NaN)), `V ${MAGNITUDES[index]}`).toBeLessThanOrEqual(0.2);
      });
    },
  );

  it('fall with altitude, from "not at all" for a faint star at the horizon', () => {
    const [row = new Float64Array()] = depthsByAltitude(airOf(0.25), 'opposite', [4]);
    expect(row).toHaveLength(ALTITUDE_COUNT);
    expect(row[0]).toBe(NOT_SEEN_DEG);
    for (let column = 1; column < row.length; column += 1)
      expect(row[column]).toBeLessThanOrEqual((row[column - 1] ?? NaN) + 1e-9);
  });

  it('are nought where even a Sun on the horizon does not hide the star', () => {
    const [row = new Float64Array()] = depthsByAltitude(airOf(0.2), 'opposite', [-4.5]);
    expect(row[30 / ALTITUDE_STEP_DEG]).toBe(0);
  });
});
