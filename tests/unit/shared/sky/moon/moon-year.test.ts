import { describe, expect, it } from 'vitest';

import { type MoonEvent, moonDayOf, moonYear } from '#shared/sky/index.js';
import { lunationsAt, moonYearOf } from '#shared/sky/moon/moon-year.js';
import { settingsWith, siteAt } from '#tests/support/sky/builders.js';

const daysOf = (latitudeDeg: number, year: number, event: MoonEvent): number[] =>
  moonYear(siteAt(latitudeDeg, 39), settingsWith(), year)
    .lunations.map((lunation) => moonDayOf(lunation, event)?.expected.dayNumber)
    .filter((day) => day !== undefined);

describe('the Moons of a year', () => {
  it('hold every Moon of which one day falls in the year, once', () => {
    const { lunations, firstDayNumber, lastDayNumber } = moonYearOf(siteAt(12, 39), settingsWith(), 2027);
    for (const { newMoon, firstCrescent, fullMoon } of lunations) {
      const days = [newMoon.dayNumber, firstCrescent.expected?.dayNumber ?? 0, fullMoon.dayNumber];
      expect(days.some((day) => day >= firstDayNumber && day <= lastDayNumber)).toBe(true);
      expect(newMoon.dayNumber).toBeLessThan(fullMoon.dayNumber);
    }
    expect(lunations).toHaveLength(13);
    const [first] = lunationsAt(siteAt(12, 39), settingsWith(), firstDayNumber - 10, firstDayNumber - 5);
    expect(first?.fullMoon.dayNumber).toBeLessThan(firstDayNumber);
  });

  it('give each Moon the civil day of the place', () => {
    const at = (timeZone: string, longitudeDeg: number): number[] =>
      moonYear(siteAt(0, longitudeDeg, { timeZone }), settingsWith(), 2027).lunations.map(
        ({ newMoon }) => newMoon.dayNumber,
      );
    const [west, east] = [at('Pacific/Honolulu', -157), at('Pacific/Kiritimati', -157)];
    // The two clocks differ by a whole day, the sky does not.
    expect(east).toEqual(west.map((day) => day + 1));
  });

  it('leave the crescent out where it is not seen, and never the new and full Moon', () => {
    expect(daysOf(66, 2027, 'new').length).toBeGreaterThanOrEqual(12);
    expect(daysOf(66, 2027, 'full').length).toBeGreaterThanOrEqual(12);
    expect(daysOf(66, 2027, 'first-crescent').length).toBeLessThan(10);
  });
});
