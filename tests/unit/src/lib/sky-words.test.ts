import { describe, expect, it } from 'vitest';
import { PHENOMENA } from '#shared/sky/vocabulary.js';
import { compassPoint, endOfNight } from '#src/lib/sky-words.js';
import { texts } from '#shared/locales/en/sky.js';

describe('compass words', () => {
  it('name the nearest of sixteen points, round through north', () => {
    expect(compassPoint(0)).toBe('n');
    expect(compassPoint(359)).toBe('n');
    expect(compassPoint(67)).toBe('ene');
    expect(compassPoint(101)).toBe('e');
    expect(compassPoint(102)).toBe('ese');
    expect(compassPoint(-90)).toBe('w');
  });

  it('exist for every point', () => {
    for (let azimuthDeg = 0; azimuthDeg < 360; azimuthDeg += 10) {
      expect(texts.compass[compassPoint(azimuthDeg)]).toMatch(/north|east|south|west/);
    }
  });
});

describe('the end of the night', () => {
  it('is dawn for the two morning phenomena and dusk for the two evening ones', () => {
    const mornings = PHENOMENA.filter((phenomenon) => endOfNight(phenomenon) === 'dawn');
    expect(mornings).toEqual(
      PHENOMENA.filter((phenomenon) => texts.phenomenon[phenomenon].includes('morning')),
    );
  });
});
