import { describe, expect, it } from 'vitest';

import { dayNumberOf, moonlightBeside, moonPhases, SkyRangeError, whereToLook } from '#shared/sky/index.js';
import { skyAt } from '#shared/sky/look/sky-at.js';
import { moonlightOf, moonShapeOf, moonThen } from '#shared/sky/look/moon-then.js';
import { settingsWith, siteAt } from '#tests/support/sky/builders.js';
import { markerAt } from '#tests/support/sky/marker.js';

/** The Pleiades are up before dawn from here on. */
const FIRST_MORNING = dayNumberOf({ year: 2027, month: 8, day: 1 }, 'gregorian');

describe('the Moon’s shape', () => {
  it('has a word for each quarter and for the days between', () => {
    const words = [0, 45, 90, 135, 180, 225, 270, 315, 355].map(moonShapeOf);
    expect(words).toEqual([
      'new',
      'waxing-crescent',
      'first-quarter',
      'waxing-gibbous',
      'full',
      'waning-gibbous',
      'last-quarter',
      'waning-crescent',
      'new',
    ]);
  });

  it('agrees with the phases of the year', () => {
    const site = siteAt(12, 39);
    const { year, ground } = markerAt('hr2491', site, 2027);
    for (const { quarter, jdUt } of moonPhases(2027).slice(1, 20)) {
      const moon = moonThen(site, skyAt(year, ground, jdUt), null);
      expect(moon.shape).toBe(quarter);
      expect(moon.separationDeg).toBeNull();
    }
  });
});

describe('moonlight', () => {
  it('is none while the Moon is thin or not up', () => {
    expect(moonlightOf(false, 1, 10)).toBe('none');
    expect(moonlightOf(true, 0.05, 3)).toBe('none');
  });

  it('grows with the lit share and with nearness, and never the other way', () => {
    const order = ['none', 'some', 'strong'];
    for (const separation of [5, 20, 60, 120]) {
      let before = 0;
      for (let lit = 0; lit <= 1; lit += 0.05) {
        const now = order.indexOf(moonlightOf(true, lit, separation));
        expect(now).toBeGreaterThanOrEqual(before);
        expect(now).toBeLessThanOrEqual(order.indexOf(moonlightOf(true, lit, separation / 2)));
        before = now;
      }
    }
  });
});

describe('the Moon beside a star at an instant', () => {
  it('takes as much as the watch of that morning says, at its best moment', () => {
    const site = siteAt(12, 39);
    const settings = settingsWith();
    const said = [0, 4, 8, 12, 16, 20, 24, 28].map((days) => {
      const { best, moon } = whereToLook('pleiades', site, settings, FIRST_MORNING + days, 'dawn');
      const jdUt = best?.jdUt ?? Number.NaN;
      return [moon?.moonlight, moonlightBeside('pleiades', site, jdUt)];
    });
    expect(said.map(([, beside]) => beside)).toEqual(said.map(([watch]) => watch));
    expect(new Set(said.flat()).size).toBeGreaterThan(1);
  });

  it('is asked for a marker and an instant that there are', () => {
    expect(() => moonlightBeside('hr0', siteAt(12, 39), 2_461_600)).toThrow(SkyRangeError);
    expect(() => moonlightBeside('pleiades', siteAt(12, 39), Number.NaN)).toThrow(SkyRangeError);
  });
});
