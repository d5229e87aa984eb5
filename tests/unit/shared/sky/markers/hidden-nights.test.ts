import { describe, expect, it } from 'vitest';

import { hiddenNightsOf } from '#shared/sky/markers/hidden-nights.js';
import { phenomenonInYear } from '#shared/sky/markers/phenomenon-in-year.js';
import { siteAt } from '#tests/support/sky/builders.js';
import { markerAt } from '#tests/support/sky/marker.js';

describe('nights hidden', () => {
  it('are those between the last evening and the first morning', () => {
    const marker = markerAt('hr2491', siteAt(30), 2027);
    const dayOf = (phenomenon: 'heliacal-rising' | 'heliacal-setting'): number =>
      phenomenonInYear(marker, phenomenon).occurrences[0]?.expected.dayNumber ?? 0;
    const between = dayOf('heliacal-rising') - dayOf('heliacal-setting') - 2;
    expect(hiddenNightsOf(marker)).toEqual({ nightsHidden: between, notes: [] });
    expect(between).toBeGreaterThan(60);
  });

  it('count over the turn of the year', () => {
    // Antares: last evening in November, first morning in the next January.
    const { nightsHidden } = hiddenNightsOf(markerAt('hr6134', siteAt(40), 2027));
    expect(nightsHidden).toBeGreaterThan(20);
    expect(nightsHidden).toBeLessThan(90);
  });

  it.each([
    ['Arcturus at 45° N', 'hr5340', 45],
    ['Sirius at 37° S', 'hr2491', -37],
    ['Vega at 35° N', 'hr7001', 35],
  ])('are none for a star that is seen at dusk and at dawn: %s', (_, key, latitudeDeg) => {
    expect(hiddenNightsOf(markerAt(key, siteAt(latitudeDeg), 2027))).toEqual({
      nightsHidden: 0,
      notes: ['never-disappears'],
    });
  });

  it('are counted night by night where a date is missing: Antares at 60° N is away for months', () => {
    const { nightsHidden, notes } = hiddenNightsOf(markerAt('hr6134', siteAt(60), 2027));
    expect(nightsHidden).toBeGreaterThan(150);
    expect(nightsHidden).toBeLessThan(260);
    expect(notes).toEqual([]);
  });

  it('are lost in light nights where most of them never get dark', () => {
    expect(hiddenNightsOf(markerAt('hr1457', siteAt(66), 2027)).notes).toEqual(['lost-in-light-nights']);
    // Altair at 66° N is not hidden by the Sun's place but by the white nights alone.
    const altair = hiddenNightsOf(markerAt('hr7557', siteAt(66), 2027));
    expect(altair.notes).toEqual(['lost-in-light-nights']);
    expect(altair.nightsHidden).toBeGreaterThan(60);
  });

  it('have no answer for a star that does not rise and set', () => {
    expect(hiddenNightsOf(markerAt('hr424', siteAt(45), 2027))).toEqual({ nightsHidden: null, notes: [] });
  });
});
