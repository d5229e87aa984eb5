import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import { Disappearances } from '#shared/sky/markers/disappearances.js';
import { highestTravelRad } from '#shared/sky/phenomena/ecliptic-zenith.js';
import { tooHighHalfArcRad } from '#shared/sky/phenomena/dark-arc.js';
import { anyHr, anyLatitudeDeg, anyYear, PROPERTY_TIMEOUT_MS, SEED } from '#tests/support/sky/arbitraries.js';
import { siteAt } from '#tests/support/sky/builders.js';
import { markerAt } from '#tests/support/sky/marker.js';

const TROPICAL_YEAR_DAYS = 365.2422;

describe('disappearances', () => {
  it(
    'last as long as the arcs say: (A rising + A setting − Δλ₀) of a year, to two nights',
    { timeout: PROPERTY_TIMEOUT_MS },
    () => {
      let compared = 0;
      fc.assert(
        fc.property(anyHr, anyLatitudeDeg, anyYear, (hr, latitudeDeg, year) => {
          const marker = markerAt(`hr${hr}`, siteAt(latitudeDeg), year);
          const { crossings } = marker.star;
          if (!crossings) return;
          const { rising, setting } = crossings;
          const sine = Math.sin((marker.threshold.sameSideDeg * Math.PI) / 180);
          const before = tooHighHalfArcRad(setting.reach, sine);
          const after = tooHighHalfArcRad(rising.reach, sine);
          const evening = new Disappearances(marker, crossings).expected(0, 'heliacal-setting').jdUt;
          const morning = new Disappearances(marker, crossings).expected(0, 'heliacal-rising').jdUt;
          if (before === null || after === null || evening === null || morning === null) return;
          compared += 1;
          const travel = highestTravelRad(
            marker.year,
            marker.ground.latitude,
            rising.siderealRad,
            setting.siderealRad,
          );
          const estimateDays = ((before + after - travel) / (2 * Math.PI)) * TROPICAL_YEAR_DAYS;
          // The Sun's uneven pace adds up to 1.9° at either end to what the mean motion says, and the crossings a day.
          expect(Math.abs(morning - evening - estimateDays)).toBeLessThan(6);
        }),
        { seed: SEED, numRuns: 80 },
      );
      expect(compared).toBeGreaterThan(25);
    },
  );

  it('follow each other a year apart', () => {
    const marker = markerAt('hr2491', siteAt(30), 2027);
    if (!marker.star.crossings) throw new Error('Sirius rises and sets at 30° N');
    const all = new Disappearances(marker, marker.star.crossings);
    expect(all.last - all.first).toBeGreaterThanOrEqual(2);
    const mornings = [0, 1].map((next) => all.expected(all.first + next, 'heliacal-rising').jdUt ?? 0);
    expect((mornings[1] ?? 0) - (mornings[0] ?? 0)).toBeGreaterThan(364);
    expect((mornings[1] ?? 0) - (mornings[0] ?? 0)).toBeLessThan(367);
  });
});
