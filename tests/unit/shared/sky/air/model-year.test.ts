import { describe, expect, it } from 'vitest';

import { instantOfTurn, modelDays, modelTurn, turnsAroundYear } from '#shared/sky/air/model-year.js';
import { watched } from '#shared/sky/air/sighting.js';
import { PHENOMENON_FACTS } from '#shared/sky/phenomena/phenomenon-facts.js';
import { plainAir } from '#shared/sky/visibility/air.js';
import { PHENOMENA } from '#shared/sky/vocabulary.js';
import { siteAt } from '#tests/support/sky/builders.js';
import { markerAt } from '#tests/support/sky/marker.js';

const day = (key: string, latitudeDeg: number, phenomenon: (typeof PHENOMENA)[number], mag: number): number =>
  modelDays(markerAt(key, siteAt(latitudeDeg), 2027), phenomenon, () => plainAir(mag))[0] ?? Number.NaN;

describe('first mornings and last evenings by the model', () => {
  it('move about a day for 0.05 of extinction for a bright star: later mornings, earlier evenings', () => {
    for (const mag of [0.2, 0.25, 0.3]) {
      const later =
        day('hr2491', 30, 'heliacal-rising', mag + 0.05) - day('hr2491', 30, 'heliacal-rising', mag);
      const earlier =
        day('hr2491', 30, 'heliacal-setting', mag) - day('hr2491', 30, 'heliacal-setting', mag + 0.05);
      for (const moved of [later, earlier]) {
        expect(moved).toBeGreaterThanOrEqual(0);
        expect(moved).toBeLessThanOrEqual(2);
      }
    }
  });

  it('take the air of the month in which they fall', () => {
    const marker = markerAt('hr2491', siteAt(30), 2027);
    const hazyAugust = (month: number) => plainAir(month === 8 ? 0.45 : 0.2);
    const clear = day('hr2491', 30, 'heliacal-rising', 0.2);
    expect(modelDays(marker, 'heliacal-rising', hazyAugust)[0]).toBeGreaterThan(clear);
    expect(modelDays(marker, 'heliacal-setting', hazyAugust)[0]).toBe(
      day('hr2491', 30, 'heliacal-setting', 0.2),
    );
  });

  it('have none for a star that neither rises nor sets, or is never seen in that air', () => {
    for (const phenomenon of PHENOMENA) {
      expect(day('hr424', 45, phenomenon, 0.25)).toBeNaN();
      expect(day('hr1457', 30, phenomenon, 8)).toBeNaN();
    }
  });

  it('belong to the turn of the Sun: a turn later is a year later', () => {
    const marker = markerAt('hr1457', siteAt(30), 2027);
    const crossing = marker.star.crossings?.rising;
    if (!crossing) throw new Error('Aldebaran rises at 30° N');
    const watch = watched(marker, PHENOMENON_FACTS['heliacal-rising'], crossing);
    const instants = turnsAroundYear(marker, crossing).map((highestRad) =>
      instantOfTurn(watch, modelTurn(watch, highestRad, () => plainAir(0.25)) ?? NaN),
    );
    expect(instants.length).toBeGreaterThanOrEqual(2);
    expect((instants[1] ?? NaN) - (instants[0] ?? NaN)).toBeGreaterThan(364);
    expect((instants[1] ?? NaN) - (instants[0] ?? NaN)).toBeLessThan(367);
  });
});
