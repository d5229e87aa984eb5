import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import {
  computeMarkerYear,
  driftOf,
  gregorianShiftDays,
  markerKeyOf,
  PHENOMENA,
  type Phenomenon,
} from '#shared/sky/index.js';
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

const settings = settingsWith();
const SIRIUS = 'hr2491';
const ARCTURUS = 'hr5340';
const CANOPUS = 'hr2326';
const ANTARES = 'hr6134';
const VEGA = 'hr7001';
/** The last three millennia. */
const MILLENNIA = Array.from({ length: 31 }, (_, index) => -1000 + 100 * index);

describe('drift of a marker', () => {
  it(
    'has the same days, ranges and outcomes as the marker’s year, at any place and in any year',
    () => {
      const hazy = settingsWith({
        clarityByMonth: ['hazy', 'hazy', ...new Array<'ordinary'>(8).fill('ordinary'), 'clear', 'clear'],
      });
      fc.assert(
        fc.property(
          anyHr,
          anyLatitudeDeg,
          anyLongitudeDeg,
          anySkyline,
          fc.uniqueArray(anyYear, { minLength: 1, maxLength: 3 }),
          (hr, latitudeDeg, longitudeDeg, skyline, unordered) => {
            const site = siteAt(latitudeDeg, longitudeDeg, { skyline });
            const years = unordered.sort((a, b) => a - b);
            const { epochs } = driftOf(markerKeyOf(hr), site, hazy, years);
            for (const [index, year] of years.entries()) {
              const full = computeMarkerYear(markerKeyOf(hr), site, hazy, year);
              const epoch = epochs[index];
              expect([epoch?.year, epoch?.outcome, epoch?.outcomeDetail]).toEqual([
                year,
                full.outcome,
                full.outcomeDetail,
              ]);
              for (const phenomenon of PHENOMENA) {
                expect(epoch?.phenomena[phenomenon]).toMatchObject({
                  outcome: full.phenomena[phenomenon].outcome,
                  occurrences: full.phenomena[phenomenon].occurrences,
                });
              }
            }
          },
        ),
        { seed: SEED, numRuns: 150 },
      );
    },
    PROPERTY_TIMEOUT_MS,
  );

  // Days per century over the last three millennia, computed once with another implementation: precession of Vondrák
  // 2011, the Sun by the short series of Meeus 1998.
  const PUBLISHED: [string, Phenomenon, number, number][] = [
    [SIRIUS, 'heliacal-rising', -35, 0.95],
    [SIRIUS, 'heliacal-rising', 10, 0.99],
    [SIRIUS, 'heliacal-rising', 30, 0.89],
    [SIRIUS, 'heliacal-rising', 45, 0.76],
    [SIRIUS, 'heliacal-rising', 55, 0.65],
    [SIRIUS, 'heliacal-setting', 30, 0.92],
    ['pleiades', 'heliacal-rising', -35, 1.49],
    ['pleiades', 'heliacal-rising', 10, 1.37],
    ['pleiades', 'heliacal-rising', 30, 1.3],
    ['pleiades', 'heliacal-rising', 45, 1.09],
    ['pleiades', 'acronychal-rising', 30, 1.53],
    ['pleiades', 'heliacal-setting', 45, 1.36],
    [ARCTURUS, 'heliacal-rising', -35, 0.66],
    [ARCTURUS, 'heliacal-rising', 30, 1.43],
    [ARCTURUS, 'heliacal-rising', 45, 1.58],
    [ARCTURUS, 'cosmical-setting', 30, 0.78],
    [CANOPUS, 'heliacal-rising', 30, 0.4],
    [ANTARES, 'heliacal-rising', 30, 1.5],
    [ANTARES, 'heliacal-rising', 55, 1.8],
    [VEGA, 'heliacal-rising', 45, 0.74],
  ];

  it.each(PUBLISHED)(
    'moves %s, %s at %d° by about %d days a century',
    (key, phenomenon, latitudeDeg, pace) => {
      const { daysPerCentury } = driftOf(key, siteAt(latitudeDeg), settings, MILLENNIA);
      // A day at either end is 0.03 a century, and depths of the Sun a degree or two apart are as much again.
      expect(Math.abs((daysPerCentury[phenomenon] ?? 99) - pace)).toBeLessThan(0.1);
    },
  );

  it('counts a day that slips over New Year on, not a year back', () => {
    const { epochs, daysPerCentury } = driftOf('hr1708', siteAt(20), settings, [1500, 1800, 2100, 2400]);
    const days = epochs.map((each) => each.phenomena['cosmical-setting'].occurrences[0]?.expected.gregorian);
    expect(days.map((day) => day?.month)).toEqual([12, 12, 1, 1]);
    expect(daysPerCentury['cosmical-setting']).toBeGreaterThan(0.5);
    expect(daysPerCentury['cosmical-setting']).toBeLessThan(3);
  });

  it('finds the year in which a star begins to rise, and says what it did before', () => {
    const { turns } = driftOf(CANOPUS, siteAt(36.6), settings, [-3000, -1000, 1000, 3000]);
    const begins = turns.find((turn) => turn.phenomenon === 'heliacal-rising' && turn.change === 'begins');
    if (!begins) throw new Error('Canopus rises at 36.6° N in some of these years only');
    expect(begins).toMatchObject({ outcome: 'never-clears-skyline', outcomeDetail: 'never-rises' });
    const stateIn = (year: number) => computeMarkerYear(CANOPUS, siteAt(36.6), settings, year).outcome;
    expect(stateIn(begins.year)).toBe('rises-and-sets');
    expect(stateIn(begins.year - 1)).toBe('never-clears-skyline');
  });

  it('takes a year without the day for no end while its neighbours have it', () => {
    // Capella's first morning setting at 20° N slips over New Year in the twentieth century.
    const years = Array.from({ length: 120 }, (_, index) => 1960 + index);
    const { epochs, turns } = driftOf('hr1708', siteAt(20), settings, years);
    const without = epochs.filter((each) => each.phenomena['cosmical-setting'].outcome !== 'dated');
    expect(without.length).toBeGreaterThan(0);
    expect(turns).toEqual([]);
  });

  it('gives the Sun’s longitude: near 90° on the day of the June solstice', () => {
    const { epochs } = driftOf('hr1457', siteAt(36), settings, [2000]);
    const [day] = epochs[0]?.phenomena['heliacal-rising'].occurrences ?? [];
    if (!day) throw new Error('Aldebaran has a first morning');
    // The solstice of 2000 fell on 21 June; the Sun moves 0.95° a day then (memory).
    const sinceSolstice = day.expected.dayNumber - 2_451_717;
    expect(day.sunLongitudeDeg).toBeCloseTo(90 + 0.955 * sinceSolstice, 0);
  });

  it('has no pace from a single date', () => {
    expect(driftOf(SIRIUS, siteAt(30), settings, [2027]).daysPerCentury['heliacal-rising']).toBeNull();
  });

  it('refuses years that are none, or out of order', () => {
    expect(() => driftOf(SIRIUS, siteAt(30), settings, [])).toThrow(/years/);
    expect(() => driftOf(SIRIUS, siteAt(30), settings, [100, 100])).toThrow(/years\.1.*ascending/);
    expect(() => driftOf(SIRIUS, siteAt(30), settings, [0, 4000])).toThrow(/years\.1/);
    expect(() => driftOf('nothing', siteAt(30), settings, [0])).toThrow(/markerKey/);
  });
});

describe('days later in the Gregorian year', () => {
  it('are those of the calendar, whatever lies between', () => {
    const fourHundredYears = 146_097;
    expect(gregorianShiftDays(2_451_545, 2_451_545 + fourHundredYears + 12)).toBeCloseTo(12, 9);
    expect(gregorianShiftDays(2_451_545, 2_451_545 - fourHundredYears - 12)).toBeCloseTo(-12, 9);
  });
});
