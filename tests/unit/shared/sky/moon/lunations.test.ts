import { describe, expect, it } from 'vitest';

import { lunationsBetween } from '#shared/sky/moon/lunations.js';
import { moonPhasesOf } from '#shared/sky/phenomena/moon-phases.js';
import { civilYearOf } from '#shared/sky/time/civil-year.js';

describe('lunations', () => {
  it.each([-3000, 50, 2027])('are the new and full Moons among the quarters of %i', (year) => {
    const { firstDay, lastDay } = civilYearOf(year);
    const quarters = moonPhasesOf(year);
    const near = (jdUt: number, quarter: string): boolean =>
      quarters.some((phase) => phase.quarter === quarter && Math.abs(phase.jdUt - jdUt) < 1 / 1440);
    const lunations = lunationsBetween(firstDay, lastDay - 20);
    expect(lunations.length).toBeGreaterThanOrEqual(11);
    for (const { newMoonJdUt, fullMoonJdUt } of lunations) {
      expect(near(newMoonJdUt, 'new')).toBe(true);
      expect(near(fullMoonJdUt, 'full')).toBe(true);
    }
  });

  it('leave none out: 235 of them make nineteen years', () => {
    const from = civilYearOf(2001).firstDay;
    const found = lunationsBetween(from, from + 19 * 365.2422 + 40);
    const span = (found[235]?.newMoonJdUt ?? 0) - (found[0]?.newMoonJdUt ?? 0);
    // 0.09 d of difference in the mean; two single lunations stray by up to half a day each.
    expect(Math.abs(span - 19 * 365.2422)).toBeLessThan(1);
  });
});
