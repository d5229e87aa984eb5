import { describe, expect, it } from 'vitest';

import { moonPhasesOf } from '#shared/sky/phenomena/moon-phases.js';
import { civilYearOf } from '#shared/sky/time/civil-year.js';

const HOUR = 1 / 24;

describe('the Moon’s quarters', () => {
  it('stand where published: new on 18 Feb 1977 3h37m, last quarter on 21 Jan 2044 [Meeus 1998, chapter 49]', () => {
    const find = (year: number, jd: number) =>
      moonPhasesOf(year).find((phase) => Math.abs(phase.jdUt - jd) < HOUR / 10);
    // Published in dynamical time; ΔT was 48 s in 1977 and is taken as 78 s for 2044.
    expect(find(1977, 2_443_192.65118 - 48 / 86_400)?.quarter).toBe('new');
    expect(find(2044, 2_467_636.49186 - 78 / 86_400)?.quarter).toBe('last-quarter');
  });

  it.each([-3000, 50, 1600, 2027])('follow each other through the year %i about a week apart', (year) => {
    const phases = moonPhasesOf(year);
    const { firstDay, lastDay } = civilYearOf(year);
    expect(phases[0]?.jdUt).toBeGreaterThan(firstDay - 1.6);
    expect(phases.at(-1)?.jdUt).toBeLessThan(lastDay + 1.6);
    expect(phases.length).toBeGreaterThanOrEqual(49);
    phases.slice(1).forEach((phase, index) => {
      const before = phases[index];
      expect(phase.jdUt - (before?.jdUt ?? 0)).toBeGreaterThan(6.4);
      expect(phase.jdUt - (before?.jdUt ?? 0)).toBeLessThan(8.4);
    });
  });
});
