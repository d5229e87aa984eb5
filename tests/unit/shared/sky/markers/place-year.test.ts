import { describe, expect, it } from 'vitest';

import { siteAt } from '#tests/support/sky/builders.js';
import { markerAt } from '#tests/support/sky/marker.js';

describe('a marker at a place', () => {
  it('carries the threshold of the place’s set for its own brightness', () => {
    expect(markerAt('hr2491', siteAt(30), 2027).threshold).toMatchObject({
      sameSideDeg: 11,
      oppositeSideDeg: 7,
    });
    expect(markerAt('pleiades', siteAt(30), 2027).threshold).toMatchObject({
      sameSideDeg: 16,
      oppositeSideDeg: 10,
    });
  });

  it('looks further beyond the year where clarity changes with the month', () => {
    const widthOf = (clear: boolean): number => {
      const months = new Array<'ordinary' | 'clear'>(12).fill('ordinary');
      if (clear) months[0] = 'clear';
      const { window } = markerAt('hr2491', siteAt(30), 2027, { clarityByMonth: months });
      return window.toRad - window.fromRad;
    };
    expect(widthOf(false)).toBeGreaterThan(2 * Math.PI);
    expect(widthOf(true)).toBeGreaterThan(widthOf(false) + 1.5);
  });

  it('takes longitude, zone and skyline from the place', () => {
    const site = siteAt(-20, 90, {
      timeZone: 'Asia/Kathmandu',
      skyline: [{ azimuthDeg: 3, altitudeDeg: 4 }],
    });
    const { ground, clock } = markerAt('hr2491', site, 2027);
    expect(ground.longitudeRad).toBeCloseTo(Math.PI / 2, 12);
    expect(ground.skyline.level).toBe(true);
    expect(clock.offsetDays(2_461_500)).toBeCloseTo(5.75 / 24, 9);
  });
});
