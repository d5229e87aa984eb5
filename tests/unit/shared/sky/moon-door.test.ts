import { describe, expect, it } from 'vitest';

import {
  countedMoons,
  localMonths,
  moonDayOf,
  moonsBetween,
  moonYear,
  SkyRangeError,
  venusYear,
} from '#shared/sky/index.js';
import { settingsWith, siteAt } from '#tests/support/sky/builders.js';

const [site, settings] = [siteAt(12, 39), settingsWith()];

describe('the door of the Moon and Venus', () => {
  it('refuses a wrong place, year, day and count by its field', () => {
    const refused = (ask: () => unknown): string => {
      try {
        ask();
      } catch (error) {
        if (error instanceof SkyRangeError) return error.field;
        throw error;
      }
      return 'taken';
    };
    expect(refused(() => moonYear(siteAt(91), settings, 2027))).toBe('site.latitudeDeg');
    expect(refused(() => venusYear(site, settings, 3001))).toBe('year');
    expect(refused(() => moonsBetween(site, settings, 2_461_407.5, 2_461_500))).toBe('fromDay');
    expect(refused(() => countedMoons([], [], 'new', 14))).toBe('count');
    expect(refused(() => localMonths([], [], 0))).toBe('signMonth');
  });

  it('gives new and full Moon a single day and the crescent a range', () => {
    const [lunation] = moonsBetween(site, settings, 2_461_440, 2_461_450);
    if (!lunation) throw new Error('no Moon in February 2027');
    const full = moonDayOf(lunation, 'full');
    expect(full?.early).toBe(full?.expected);
    const crescent = moonDayOf(lunation, 'first-crescent');
    expect((crescent?.late.dayNumber ?? 0) - (crescent?.early.dayNumber ?? 0)).toBe(1);
  });
});
