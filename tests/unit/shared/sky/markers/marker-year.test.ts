import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import {
  computeMarkerYear,
  type Crossing,
  markerKeyOf,
  type MarkerYear,
  PHENOMENA,
  THRESHOLD_SETS,
} from '#shared/sky/index.js';
import { markerYearOf } from '#shared/sky/markers/marker-year.js';
import { CLARITIES } from '#shared/sky/vocabulary.js';
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

const anySettings = fc.record({
  thresholdSet: fc.constantFrom(...THRESHOLD_SETS),
  clarityByMonth: fc.array(fc.constantFrom(...CLARITIES), { minLength: 12, maxLength: 12 }),
  sameSideShiftDeg: fc.integer({ min: -3, max: 3 }),
  oppositeSideShiftDeg: fc.integer({ min: -3, max: 3 }),
});
/** Poles included: nothing may break there, even where an answer is of little use. */
const anyLatitudeAtAll = fc.oneof(anyLatitudeDeg, fc.constantFrom(-90, -89.99, -66.56, 66.56, 89.99, 90));

const result = (key: string, latitudeDeg: number, year = 2027): MarkerYear => {
  const marker = markerAt(key, siteAt(latitudeDeg), year);
  return markerYearOf(marker, marker.marker);
};

function numbersOf({ gregorian, julian, ...rest }: Crossing): number[] {
  const labels = [gregorian, julian].flatMap(({ year, month, day }) => [year, month, day]);
  return [...Object.values(rest), ...labels];
}

describe('a marker’s year', () => {
  it('names what it rests on', () => {
    expect(result('hr2491', 30).basis).toMatchObject({
      thresholdSet: 'three-class',
      sameSideDeg: 11,
      oppositeSideDeg: 7,
      skylineRule: 'altitude-difference',
      year: 2027,
    });
    expect(result('pleiades', 30).basis).toMatchObject({ sameSideDeg: 16, oppositeSideDeg: 10 });
  });

  it('marks thresholds beyond the source', () => {
    expect(result('hr1178', 30).notes).toContain('threshold-extrapolated');
    expect(result('pleiades', 30).notes).not.toContain('threshold-extrapolated');
  });

  it('has no dates, and no hidden nights, for a star that does not rise and set', () => {
    const polaris = result('hr424', 45);
    expect(polaris).toMatchObject({ outcome: 'never-sets', outcomeDetail: null, nightsHidden: null });
    expect(PHENOMENA.map((one) => polaris.phenomena[one].outcome)).toEqual(
      new Array(4).fill('none-in-this-year'),
    );
    expect(result('hr2326', 45)).toMatchObject({
      outcome: 'never-clears-skyline',
      outcomeDetail: 'never-rises',
    });
  });

  it(
    'is sorted, finite and consistent at any place, year, skyline and setting',
    { timeout: PROPERTY_TIMEOUT_MS },
    () => {
      fc.assert(
        fc.property(
          anyHr,
          anyLatitudeAtAll,
          anyLongitudeDeg,
          anyYear,
          anySkyline,
          anySettings,
          (hr, latitudeDeg, longitudeDeg, year, skyline, settings) => {
            const site = siteAt(latitudeDeg, longitudeDeg, { skyline });
            const { phenomena, nightsHidden } = computeMarkerYear(
              markerKeyOf(hr),
              site,
              settingsWith(settings),
              year,
            );
            if (nightsHidden !== null) expect(nightsHidden).toBeGreaterThanOrEqual(0);
            for (const { outcome, occurrences } of Object.values(phenomena)) {
              expect(outcome === 'dated').toBe(occurrences.length > 0);
              for (const { early, expected, late } of occurrences) {
                for (const crossing of [early, expected, late]) {
                  if (crossing === null) continue;
                  expect(numbersOf(crossing).every(Number.isFinite)).toBe(true);
                  // The crossing is dark enough, to rounding.
                  expect(crossing.sunDepressionDeg).toBeGreaterThan(crossing.neededDepressionDeg - 1e-6);
                }
                expect((early ?? expected).dayNumber).toBeLessThanOrEqual(expected.dayNumber);
                expect((late ?? expected).dayNumber).toBeGreaterThanOrEqual(expected.dayNumber);
              }
            }
          },
        ),
        { seed: SEED, numRuns: 120 },
      );
    },
  );

  it('is the same by both skyline rules on a flat horizon', { timeout: PROPERTY_TIMEOUT_MS }, () => {
    fc.assert(
      fc.property(
        anyHr,
        anyLatitudeDeg,
        anyLongitudeDeg,
        anyYear,
        anySettings,
        (hr, latitudeDeg, longitudeDeg, year, settings) => {
          const [depth, difference] = (['depth-at-crossing', 'altitude-difference'] as const).map(
            (skylineRule) => {
              const all = settingsWith({ ...settings, skylineRule });
              const { basis, ...rest } = computeMarkerYear(
                markerKeyOf(hr),
                siteAt(latitudeDeg, longitudeDeg),
                all,
                year,
              );
              expect(basis.skylineRule).toBe(skylineRule);
              return rest;
            },
          );
          expect(depth).toEqual(difference);
        },
      ),
      { seed: SEED, numRuns: 60 },
    );
  });
});
