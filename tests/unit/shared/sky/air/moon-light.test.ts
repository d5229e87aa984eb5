import { describe, expect, it } from 'vitest';

import { moonNlAt } from '#shared/sky/air/moon-light.js';
import { moonPhases } from '#shared/sky/index.js';
import { plainAir } from '#shared/sky/visibility/air.js';
import { siteAt } from '#tests/support/sky/builders.js';

const site = siteAt(12);
const air = plainAir(0.25);
const overhead = (jdUt: number): number => moonNlAt(site, jdUt)(air, Math.PI / 3, 0);
const quarter = (name: string): number =>
  moonPhases(2027).find((phase) => phase.quarter === name && phase.jdUt > 2_461_450)?.jdUt ?? Number.NaN;
/** Local midnight next to an instant: the full Moon is up then, the new one is down. */
const midnight = (jdUt: number): number => Math.round(jdUt - 0.5) + 0.5;

describe('moonlight of a night', () => {
  it('is strong under a full Moon at midnight and nothing at new Moon', () => {
    expect(overhead(midnight(quarter('full')))).toBeGreaterThan(300);
    expect(overhead(midnight(quarter('new')))).toBe(0);
  });

  it('is nothing while the full Moon is down at noon', () => {
    expect(overhead(midnight(quarter('full')) + 0.5)).toBe(0);
  });

  it('is a small part of that at the first quarter in the evening', () => {
    const halfMoon = overhead(Math.floor(quarter('first-quarter')) + 0.29);
    expect(halfMoon).toBeGreaterThan(0);
    expect(halfMoon).toBeLessThan(overhead(midnight(quarter('full'))) / 4);
  });
});
