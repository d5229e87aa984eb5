import { describe, expect, it } from 'vitest';

import { moonYearOf } from '#shared/sky/moon/moon-year.js';
import { keptMoonYearOf } from '#shared/sky/moon/moon-year-cache.js';
import type { Site, VisibilitySettings } from '#shared/sky/types.js';
import { settingsWith, siteAt } from '#tests/support/sky/builders.js';

describe('kept years of Moons', () => {
  it('are the same for the same question and never those of another place, skyline, air or year', () => {
    const skyline = [{ azimuthDeg: 270, altitudeDeg: 8 }];
    const hazy = settingsWith({ clarityByMonth: new Array<'hazy'>(12).fill('hazy') });
    const questions: [Site, VisibilitySettings, number][] = [
      [siteAt(12, 39), settingsWith(), 2027],
      [siteAt(12, 39), settingsWith(), 2028],
      [siteAt(-35, 39), settingsWith(), 2027],
      [siteAt(12, 39, { skyline }), settingsWith(), 2027],
      [siteAt(12, 39), hazy, 2027],
    ];
    for (const question of questions) {
      expect(keptMoonYearOf(...question)).toEqual(moonYearOf(...question));
      expect(keptMoonYearOf(...question)).toBe(keptMoonYearOf(...question));
    }
  });
});
