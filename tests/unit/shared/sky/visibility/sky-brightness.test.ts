import { describe, expect, it } from 'vitest';

import { skyBrightnessNl } from '#shared/sky/visibility/sky-brightness.js';

/** Magnitudes per square arc second from nanolamberts [Schaefer 1993]. */
const surfaceMag = (nanolamberts: number): number => (20.7233 - Math.log(nanolamberts / 34.08)) / 0.92104;
const zenithMag = (depthDeg: number): number => surfaceMag(skyBrightnessNl(0.12, 90, -depthDeg, 90));

describe('brightness of the sky', () => {
  it.each([
    [6, 14.2],
    [8, 16.2],
    [10, 18.2],
    [12, 20.2],
  ])(
    'at the zenith of a clear site, Sun %d° deep: %d mag, as an independent implementation has it [C]',
    (depthDeg, mag) => {
      expect(Math.abs(zenithMag(depthDeg) - mag)).toBeLessThan(0.3);
    },
  );

  it.each([
    [6, 13.3],
    [8, 15.9],
    [10, 18],
    [12, 19.7],
  ])(
    'and within a magnitude of the measurements at Paranal, Sun %d° deep: %d [Patat et al. 2006, fit from memory]',
    (depthDeg, mag) => {
      expect(Math.abs(zenithMag(depthDeg) - mag)).toBeLessThan(1);
    },
  );

  it('falls by a magnitude for each degree of twilight, down to the glow of the night', () => {
    expect(zenithMag(8) - zenithMag(7)).toBeCloseTo(1, 1);
    expect(zenithMag(19) - zenithMag(18)).toBeLessThan(0.05);
    expect(zenithMag(30)).toBeGreaterThan(21.5);
  });

  it('is greatest on the side of the Sun', () => {
    expect(skyBrightnessNl(0.25, 5, -10, 0)).toBeGreaterThan(2 * skyBrightnessNl(0.25, 5, -10, 180));
  });

  it('is the day’s while the Sun is up: thousands of times the night', () => {
    expect(skyBrightnessNl(0.25, 60, 30, 90) / skyBrightnessNl(0.25, 60, -40, 90)).toBeGreaterThan(1e5);
    expect(Number.isFinite(skyBrightnessNl(0.25, 30, 30, 0))).toBe(true);
  });
});
