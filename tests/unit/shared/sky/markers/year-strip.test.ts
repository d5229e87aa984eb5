import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import {
  computeMarkerYear,
  markerKeyOf,
  type MarkerYear,
  type Phenomenon,
  type Site,
  yearStrip,
} from '#shared/sky/index.js';
import { yearStripOf } from '#shared/sky/markers/year-strip.js';
import { civilYearOf } from '#shared/sky/time/civil-year.js';
import type { NightState } from '#shared/sky/vocabulary.js';
import {
  anyHr,
  anyLatitudeDeg,
  anyLongitudeDeg,
  anySkyline,
  anyYear,
  PROPERTY_TIMEOUT_MS,
  SEED,
} from '#tests/support/sky/arbitraries.js';
import { settingsWith, siteAt } from '#tests/support/sky/builders.js';
import { markerAt } from '#tests/support/sky/marker.js';

const statesOf = (key: string, latitudeDeg: number): NightState[] =>
  yearStripOf(markerAt(key, siteAt(latitudeDeg), 2027)).map(({ state }) => state);

const settings = settingsWith();
const only = (result: MarkerYear, phenomenon: Phenomenon): number | null => {
  const { occurrences } = result.phenomena[phenomenon];
  return occurrences.length === 1 ? (occurrences[0]?.expected.dayNumber ?? null) : null;
};

describe('the strip of a year', () => {
  it('shows an ordinary star: dusk, gone, dawn, all night, dusk', () => {
    expect(statesOf('pleiades', 28)).toEqual([
      'after-dusk',
      'hidden',
      'before-dawn',
      'all-night',
      'after-dusk',
    ]);
  });

  it('shows a southern star seen from the north: it rises and sets in the same night', () => {
    expect(statesOf('hr2326', 30)).toEqual([
      'rises-and-sets-in-night',
      'after-dusk',
      'hidden',
      'before-dawn',
      'rises-and-sets-in-night',
    ]);
  });

  it('shows a northern star at dusk and at dawn of the same night', () => {
    expect(statesOf('hr5340', 45)).toEqual([
      'before-dawn',
      'all-night',
      'after-dusk',
      'dusk-and-dawn',
      'before-dawn',
    ]);
  });

  it('is one run for a star that never sets, and one for a star that never rises', () => {
    expect(statesOf('hr424', 45)).toEqual(['all-night']);
    expect(statesOf('hr2326', 45)).toEqual(['hidden']);
  });

  it('hides even a star that never sets while no night is dark enough', () => {
    const site = siteAt(66, 23);
    const strip = yearStripOf(markerAt('hr7001', site, 2027));
    expect(strip.map(({ state }) => state)).toEqual(['all-night', 'hidden', 'all-night']);
    const { firstDay } = civilYearOf(2027);
    const [before = 0, after = 0] = [strip[1]?.fromDayNumber, strip[1]?.toDayNumber].map(
      (day) => (day ?? 0) - firstDay,
    );
    // Vega stands high at midnight in summer and shows with the Sun some 4° deep; the Sun is never that deep between
    // early May and early August at 66° N (its depth at midnight is 24° less the declination).
    expect(before).toBeGreaterThan(110);
    expect(before).toBeLessThan(150);
    expect(after).toBeGreaterThan(192);
    expect(after).toBeLessThan(232);
  });

  it('hides a star in nights that are too light for it', () => {
    // Altair at 66° N: between spring and late July the Sun hardly goes below the horizon.
    const strip = yearStripOf(markerAt('hr7557', siteAt(66), 2027));
    const hidden = strip.filter(({ state }) => state === 'hidden');
    expect(hidden).toHaveLength(1);
    expect((hidden[0]?.toDayNumber ?? 0) - (hidden[0]?.fromDayNumber ?? 0)).toBeGreaterThan(50);
  });

  it(
    'has no gaps and no overlaps and fills the civil year, wherever and whenever',
    { timeout: PROPERTY_TIMEOUT_MS },
    () => {
      fc.assert(
        fc.property(
          anyHr,
          anyLatitudeDeg,
          anyLongitudeDeg,
          anyYear,
          anySkyline,
          (hr, latitudeDeg, longitudeDeg, year, skyline) => {
            const site = siteAt(latitudeDeg, longitudeDeg, { skyline });
            const strip = yearStrip(computeMarkerYear(markerKeyOf(hr), site, settings, year), site, settings);
            const { firstDay, lastDay } = civilYearOf(year);
            expect(strip[0]?.fromDayNumber).toBe(firstDay);
            expect(strip.at(-1)?.toDayNumber).toBe(lastDay);
            strip.slice(1).forEach((segment, index) => {
              expect(segment.fromDayNumber).toBe((strip[index]?.toDayNumber ?? 0) + 1);
              expect(segment.state).not.toBe(strip[index]?.state);
              expect(segment.toDayNumber).toBeGreaterThanOrEqual(segment.fromDayNumber);
            });
          },
        ),
        { seed: SEED, numRuns: 80 },
      );
    },
  );

  it(
    'agrees with the dates and with the nights hidden, where there is no light night',
    { timeout: PROPERTY_TIMEOUT_MS },
    () => {
      const anyMiddleLatitude = fc.integer({ min: -45, max: 45 });
      let compared = 0;
      fc.assert(
        fc.property(anyHr, anyMiddleLatitude, anyYear, (hr, latitudeDeg, year) => {
          const site: Site = siteAt(latitudeDeg);
          const result = computeMarkerYear(markerKeyOf(hr), site, settings, year);
          const strip = yearStrip(result, site, settings);
          const evening = only(result, 'heliacal-setting');
          const morning = only(result, 'heliacal-rising');
          if (evening === null || morning === null || morning < evening || result.nightsHidden === 0) return;
          compared += 1;
          const hidden = strip.filter(({ state }) => state === 'hidden');
          // The night of the last evening is seen, and so is the night that ends with the first morning.
          expect(hidden).toEqual([{ state: 'hidden', fromDayNumber: evening + 1, toDayNumber: morning - 2 }]);
          expect(result.nightsHidden).toBe(morning - evening - 2);
        }),
        { seed: SEED, numRuns: 80 },
      );
      expect(compared).toBeGreaterThan(20);
    },
  );
});
