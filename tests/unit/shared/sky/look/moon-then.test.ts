import { describe, expect, it } from 'vitest';

import { moonPhases, whereToLook } from '#shared/sky/index.js';
import { skyAt } from '#shared/sky/look/sky-at.js';
import { moonlightOf, moonShapeOf, moonThen } from '#shared/sky/look/moon-then.js';
import { settingsWith, siteAt } from '#tests/support/sky/builders.js';
import { markerAt } from '#tests/support/sky/marker.js';

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
  it('has three words by what it takes from the view, in magnitudes', () => {
    expect([0, 0.1, 0.2, 0.5, 0.7, 2].map(moonlightOf)).toEqual([
      'none',
      'none',
      'some',
      'some',
      'strong',
      'strong',
    ]);
  });

  it('is none from a Moon that is down or thin, and something from a nearly full one beside the star', () => {
    const look = (dayOfYear: number) => {
      const moment = whereToLook('pleiades', siteAt(12, 39), settingsWith(), 2_461_406 + dayOfYear, 'dawn');
      return moment.moon;
    };
    // 10 June 2027: a crescent below the ground. 17 October: two days after full Moon, beside the Pleiades.
    expect(look(161)).toMatchObject({ isUp: false, moonlight: 'none' });
    const beside = look(290);
    expect(beside?.separationDeg).toBeLessThan(25);
    expect(beside?.litShare).toBeGreaterThan(0.85);
    expect(beside?.moonlight).not.toBe('none');
  });
});
