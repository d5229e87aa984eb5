import { describe, expect, it } from 'vitest';

import { computeSkyMarker, dayNumberOf, type Site } from '#shared/sky/index.js';
import { settingsWith, siteAt } from '#tests/support/sky/builders.js';

const settings = settingsWith();

describe('the first night with the Milky Way overhead', () => {
  /** 66° N, 23° E: 15° are reached two weeks before 18°. */
  const north: Site = siteAt(66, 23, { timeZone: 'Europe/Stockholm' });
  const firstNight = (depthDeg: 15 | 18): number =>
    computeSkyMarker({ kind: 'dark-night', end: 'first', depthDeg }, north, settings, 2027).occurrences[0]
      ?.expected.dayNumber ?? Number.NaN;

  it('comes about the end of August at the arctic circle, before the first night without any twilight', () => {
    const september = dayNumberOf({ year: 2027, month: 9, day: 1 }, 'gregorian');
    // At midnight the Sun stands 90° − 66° − declination deep: 15° deep where its declination is 9°, on 29 August.
    expect(firstNight(15)).toBeGreaterThan(september - 6);
    expect(firstNight(15)).toBeLessThan(september);
    expect(firstNight(18)).toBeGreaterThan(september + 3);
  });
});
