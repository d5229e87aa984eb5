import { describe, expect, it } from 'vitest';

import { PATCH_CLASS_FACTS } from '#shared/sky/visibility/patch-classes.js';
import { thresholdOf } from '#shared/sky/visibility/threshold-sets.js';

describe('classes of patches of sky', () => {
  it('ask for the depths of a single star as bright, where such a star exists', () => {
    for (const patchClass of ['third-magnitude', 'faint'] as const) {
      const { vMag, sameSideDeg, oppositeSideDeg } = PATCH_CLASS_FACTS[patchClass];
      const star = thresholdOf('three-class', vMag, null);
      expect(star.sameSideDeg).toBeCloseTo(sameSideDeg, 9);
      expect(star.oppositeSideDeg).toBeCloseTo(oppositeSideDeg, 9);
    }
  });

  it('let the Milky Way wait for the end of astronomical twilight on both sides of the sky', () => {
    expect(PATCH_CLASS_FACTS['full-night']).toMatchObject({ sameSideDeg: 18, oppositeSideDeg: 18 });
  });
});
