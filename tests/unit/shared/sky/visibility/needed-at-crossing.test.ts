import { describe, expect, it } from 'vitest';

import { latitudeOf } from '#shared/sky/horizon/horizontal.js';
import { levelSkyline } from '#shared/sky/horizon/skyline.js';
import { prepareYear } from '#shared/sky/phenomena/prepared-year.js';
import { starAtPlace, sunAtCrossing } from '#shared/sky/phenomena/skyline-crossing.js';
import { starIndexOf } from '#shared/sky/stars/star-table.js';
import { neededAtCrossing } from '#shared/sky/visibility/needed-at-crossing.js';
import { thresholdOf } from '#shared/sky/visibility/threshold-sets.js';

const DEG = Math.PI / 180;
const year = prepareYear(2027);
const hill = { vMag: -1.46, clarity: 'ordinary', flatOppositeDeg: 7 } as const;
const degOf = (sine: number): number => Math.asin(sine) / DEG;

function setup(skylineDeg: number) {
  const ground = { latitude: latitudeOf(30 * DEG), longitudeRad: 0, skyline: levelSkyline(skylineDeg * DEG) };
  const { crossings } = starAtPlace(year, ground, starIndexOf(2491) ?? -1);
  if (!crossings) throw new Error('Sirius rises and sets at 30° N');
  return { ground, crossing: crossings.rising };
}

describe('the needed depth at a crossing', () => {
  it('adds shifts before the skyline counts', () => {
    const { ground, crossing } = setup(3);
    const classes = thresholdOf('three-class', -1.46, null);
    const needed = (side: 'same' | 'opposite', shiftDeg: number): number =>
      degOf(
        neededAtCrossing(year, ground, crossing, {
          rule: 'altitude-difference',
          side,
          threshold: classes,
          shiftDeg,
          hill,
        }).sineAt(0),
      );
    // On a hill of 3° Sirius is still seen best higher up: no excess, the whole altitude counts.
    expect(needed('same', 0)).toBeCloseTo(8, 1);
    expect(needed('same', 1.5) - needed('same', 0)).toBeCloseTo(1.5, 9);
    expect(needed('opposite', -1) - needed('opposite', 0)).toBeCloseTo(-1, 9);
  });

  it('follows the Sun’s azimuth where the set asks for it', () => {
    const { ground, crossing } = setup(0);
    const set = thresholdOf('azimuth-difference', -1.46, null);
    const needed = neededAtCrossing(year, ground, crossing, {
      rule: 'depth-at-crossing',
      side: 'same',
      threshold: set,
      shiftDeg: 0.5,
      hill,
    });
    for (const longitude of [0, 1, 2, 3, 4, 5, 6]) {
      const sun = sunAtCrossing(year, ground.latitude, crossing, longitude);
      const expected = 9.5 + 2.5 * Math.cos(crossing.starAzimuthRad - sun.azimuthRad);
      expect(degOf(needed.sineAt(longitude))).toBeCloseTo(expected, 9);
    }
  });
});
