import { describe, expect, it } from 'vitest';

import { STAR_ROWS, type StarRow } from '#shared/sky/data/star-rows.js';
import { movedDirection, spaceMotionOf } from '#shared/sky/stars/space-motion.js';

function rowOf(hr: number): StarRow {
  const row = STAR_ROWS.find(([candidate]) => candidate === hr);
  if (!row) throw new Error(`no star ${hr}`);
  return row;
}

describe('space motion', () => {
  it('carries Arcturus 1.9° and Sirius 1.1° in 3000 years', () => {
    for (const [hr, degrees] of [
      [5340, 1.9],
      [2491, 1.1],
    ] as const) {
      const motion = spaceMotionOf(rowOf(hr));
      const then = movedDirection(motion, -3000);
      const { direction } = motion;
      const cosine =
        (then.x * direction.x + then.y * direction.y + then.z * direction.z) /
        Math.hypot(then.x, then.y, then.z);
      expect((Math.acos(cosine) * 180) / Math.PI).toBeCloseTo(degrees, 1);
    }
  });

  it('brings α Centauri nearer, because its radial velocity is negative', () => {
    const then = movedDirection(spaceMotionOf(rowOf(5459)), 3000);
    expect(Math.hypot(then.x, then.y, then.z)).toBeLessThan(1);
  });

  it('takes a parallax at or below zero for unknown', () => {
    const motion = spaceMotionOf(rowOf(39)); // parallax −2 mas, moving by 4 km/s
    const { direction, velocityPerYear } = motion;
    const radial =
      direction.x * velocityPerYear.x + direction.y * velocityPerYear.y + direction.z * velocityPerYear.z;
    expect(Math.abs(radial)).toBeLessThan(1e-15);
  });
});
