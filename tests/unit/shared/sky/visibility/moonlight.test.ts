import { describe, expect, it } from 'vitest';

import { moonlightNl } from '#shared/sky/visibility/moonlight.js';

describe('moonlight in the sky', () => {
  it('is nothing while the Moon is down', () => {
    expect(moonlightNl(0.25, 40, -1, 60, 0)).toBe(0);
  });

  it('of a full Moon high up, 60° away, leaves a sky of about 18.4 mag [Krisciunas & Schaefer 1991, from memory]', () => {
    const nanolamberts = moonlightNl(0.172, 60, 60, 60, 0);
    const mag = (20.7233 - Math.log(nanolamberts / 34.08)) / 0.92104;
    expect(Math.abs(mag - 18.4)).toBeLessThan(0.3);
  });

  it('is a tenth at the quarters, and grows toward the Moon and in haze', () => {
    const full = moonlightNl(0.25, 40, 40, 60, 0);
    expect(moonlightNl(0.25, 40, 40, 60, 90) / full).toBeGreaterThan(0.08);
    expect(moonlightNl(0.25, 40, 40, 60, 90) / full).toBeLessThan(0.12);
    expect(moonlightNl(0.25, 40, 40, 15, 0)).toBeGreaterThan(full);
    expect(moonlightNl(0.35, 40, 70, 60, 0)).toBeGreaterThan(moonlightNl(0.2, 40, 70, 60, 0));
    expect(moonlightNl(0.25, 40, 40, 60, -90)).toBe(moonlightNl(0.25, 40, 40, 60, 90));
  });
});
