import { describe, expect, it } from 'vitest';

import {
  CLARITIES,
  computeAirYear,
  computeMarkerYear,
  PHENOMENA,
  SkyRangeError,
  THRESHOLD_SETS,
} from '#shared/sky/index.js';
import { settingsWith, siteAt } from '#tests/support/sky/builders.js';

const hills = siteAt(12, 39, {
  elevationM: 1950,
  skyline: [{ azimuthDeg: 0, altitudeDeg: 3 }],
});

describe('a marker’s year in clear, ordinary and hazy air', () => {
  it('has the place’s own dates with their ranges beside the model', () => {
    for (const key of ['pleiades', 'hr2491', 'hr6134']) {
      const air = computeAirYear(key, hills, settingsWith(), 2027);
      const rule = computeMarkerYear(key, hills, settingsWith(), 2027);
      for (const phenomenon of PHENOMENA) {
        expect(air.phenomena[phenomenon].outcome).toBe(rule.phenomena[phenomenon].outcome);
        expect(air.phenomena[phenomenon].occurrences.map((one) => one.rule)).toEqual(
          rule.phenomena[phenomenon].occurrences,
        );
      }
    }
  });

  it('has every published set as the place would have it with that set', () => {
    const air = computeAirYear('hr1457', hills, settingsWith(), 2027);
    for (const thresholdSet of THRESHOLD_SETS) {
      const year = computeMarkerYear('hr1457', hills, settingsWith({ thresholdSet }), 2027);
      for (const phenomenon of PHENOMENA) {
        expect(air.phenomena[phenomenon].occurrences[0]?.bySet[thresholdSet]).toEqual(
          year.phenomena[phenomenon].occurrences[0],
        );
      }
    }
  });

  it('is earlier in clear air on mornings of return, later on evenings of leaving, and all of one disappearance', () => {
    const { phenomena } = computeAirYear('hr2326', siteAt(30), settingsWith(), 2027);
    const days = (phenomenon: (typeof PHENOMENA)[number]): number[] =>
      CLARITIES.map((clarity) => phenomena[phenomenon].occurrences[0]?.byModel[clarity]?.dayNumber ?? NaN);
    const [clear = NaN, ordinary = NaN, hazy = NaN] = days('heliacal-rising');
    expect(clear).toBeLessThan(ordinary);
    expect(ordinary).toBeLessThan(hazy);
    const [clearEvening = NaN, ordinaryEvening = NaN, hazyEvening = NaN] = days('heliacal-setting');
    expect(clearEvening).toBeGreaterThan(ordinaryEvening);
    expect(ordinaryEvening).toBeGreaterThan(hazyEvening);
    expect(hazy - clear).toBeLessThan(30);
  });

  it('shows the star on the model’s day and not on the day before', () => {
    const [rising] = computeAirYear('hr2491', siteAt(30), settingsWith(), 2027).phenomena['heliacal-rising']
      .occurrences;
    const day = rising?.byModel.ordinary;
    const minutesOn = (dayNumber: number): number | undefined =>
      rising?.nights.find((night) => night.dayNumber === dayNumber)?.byClarity.ordinary;
    expect(day?.minutes).toBeGreaterThan(0);
    expect(minutesOn(day?.dayNumber ?? 0)).toBe(day?.minutes);
    expect(minutesOn((day?.dayNumber ?? 0) - 1)).toBe(0);
    expect(day?.fromJdUt).toBeLessThan(day?.toJdUt ?? NaN);
  });

  it('has no minutes where star and Sun stand on opposite sides', () => {
    const { phenomena } = computeAirYear('hr2491', siteAt(30), settingsWith(), 2027);
    expect(phenomena['acronychal-rising'].occurrences[0]?.nights).toEqual([]);
    expect(phenomena['cosmical-setting'].occurrences[0]?.nights).toEqual([]);
  });

  it('still has the model’s days where the rule has none in light nights', () => {
    // Aldebaran at 66° N: the Sun is not 11° deep at its rising before autumn, yet it is seen higher up.
    const { outcome, occurrences } = computeAirYear('hr1457', siteAt(66), settingsWith(), 2027).phenomena[
      'heliacal-rising'
    ];
    expect(outcome).toBe('never-dark-enough');
    expect(occurrences.map((one) => [one.rule, one.byModel.clear === null])).toEqual([[null, false]]);
  });

  it('is empty for a star that never sets, and refuses what is wrong', () => {
    const polaris = computeAirYear('hr424', siteAt(45), settingsWith(), 2027);
    expect(polaris.outcome).toBe('never-sets');
    for (const phenomenon of PHENOMENA) expect(polaris.phenomena[phenomenon].occurrences).toEqual([]);
    expect(() => computeAirYear('hr2491', siteAt(91), settingsWith(), 2027)).toThrow(SkyRangeError);
  });

  it('tells the air it rests on', () => {
    const { extinctionMag } = computeAirYear('hr2491', hills, settingsWith(), 2027);
    expect(extinctionMag.clear).toBeLessThan(extinctionMag.hazy);
    expect(extinctionMag.ordinary).toBeLessThan(0.2);
  });
});
