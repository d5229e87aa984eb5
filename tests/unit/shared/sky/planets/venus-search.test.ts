import { describe, expect, it } from 'vitest';

import { latitudeOf } from '#shared/sky/horizon/horizontal.js';
import { levelSkyline } from '#shared/sky/horizon/skyline.js';
import { preparedYearOf } from '#shared/sky/phenomena/year-cache.js';
import { venusCyclesBetween } from '#shared/sky/planets/venus-cycle.js';
import {
  besideLightNights,
  findVenus,
  seenOnBothSides,
  VENUS_ARCUS_VISIONIS_DEG,
  venusAtPlace,
  type VenusAtPlace,
  venusSearchOf,
} from '#shared/sky/planets/venus-search.js';
import { dayClockOf } from '#shared/sky/time/civil-day.js';
import { VENUS_APPEARANCES } from '#shared/sky/vocabulary.js';
import { settingsWith } from '#tests/support/sky/builders.js';

const DEG = Math.PI / 180;
const year = preparedYearOf(2025);
const [cycle] = venusCyclesBetween(year.civil.firstDay, year.civil.firstDay);
const at = (latitudeDeg: number): VenusAtPlace => {
  const ground = { latitude: latitudeOf(latitudeDeg * DEG), longitudeRad: 0, skyline: levelSkyline(0) };
  return venusAtPlace(year, ground, dayClockOf(null, 0), settingsWith());
};

describe('looking for Venus', () => {
  it('finds the day on which the Sun is deep enough and the day beside it on which it is not', () => {
    if (!cycle) throw new Error('no cycle');
    const venus = at(20);
    for (const appearance of VENUS_APPEARANCES) {
      const search = venusSearchOf(appearance, cycle);
      const found = findVenus(venus, search, 0);
      if (!found) throw new Error(`no ${appearance}`);
      const depthOn = (day: number): number => (venus.day(day)[search.crossing]?.sunDepressionRad ?? 0) / DEG;
      expect(depthOn(found.solarDay)).toBeGreaterThanOrEqual(VENUS_ARCUS_VISIONIS_DEG);
      expect(depthOn(found.solarDay - search.step)).toBeLessThan(VENUS_ARCUS_VISIONIS_DEG);
      expect(besideLightNights(venus, search, found)).toBe(false);
    }
  });

  it('finds nothing where no night is as dark as asked', () => {
    if (!cycle) throw new Error('no cycle');
    expect(findVenus(at(20), venusSearchOf('morning-first', cycle), 80)).toBeNull();
  });

  it('sees Venus on both sides of the Sun in the north in March 2025, when it passed 8° north of it', () => {
    const inferior = cycle?.nextInferiorJdUt ?? 0;
    expect(seenOnBothSides(at(50), inferior, 0)).toBe(true);
    expect(seenOnBothSides(at(-35), inferior, 0)).toBe(false);
  });
});
