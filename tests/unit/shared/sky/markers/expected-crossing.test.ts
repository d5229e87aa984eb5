import { describe, expect, it } from 'vitest';

import { expectedAroundYear, expectedInTurn, placeShiftDeg } from '#shared/sky/markers/expected-crossing.js';
import { PHENOMENON_FACTS } from '#shared/sky/phenomena/phenomenon-facts.js';
import type { Clarity } from '#shared/sky/vocabulary.js';
import { siteAt } from '#tests/support/sky/builders.js';
import { markerAt } from '#tests/support/sky/marker.js';

const RISING = PHENOMENON_FACTS['heliacal-rising'];

function risingOfSirius(clarityByMonth: Clarity[], sameSideShiftDeg = 0) {
  const marker = markerAt('hr2491', siteAt(30), 2027, { clarityByMonth, sameSideShiftDeg });
  const crossing = marker.star.crossings?.rising;
  if (!crossing) throw new Error('Sirius rises at 30° N');
  const [found] = expectedAroundYear(marker, crossing, RISING).filter(
    ({ jdUt }) => jdUt !== null && jdUt > marker.year.civil.firstDay && jdUt < marker.year.civil.lastDay,
  );
  if (!found) throw new Error('Sirius rises in 2027');
  return { marker, crossing, found };
}

const allYear = (clarity: Clarity): Clarity[] => new Array<Clarity>(12).fill(clarity);
const onlyIn = (month: number, clarity: Clarity): Clarity[] =>
  allYear('ordinary').map((ordinary, index) => (index === month - 1 ? clarity : ordinary));

describe('the expected crossing', () => {
  it('comes earlier in clear air and later in haze, about a day per degree for Sirius', () => {
    const [clear = 0, ordinary = 0, hazy = 0] = (['clear', 'ordinary', 'hazy'] as const).map(
      (clarity) => risingOfSirius(allYear(clarity)).found.jdUt ?? 0,
    );
    expect(ordinary - clear).toBeGreaterThan(0.5);
    expect(ordinary - clear).toBeLessThan(2.5);
    expect(hazy - ordinary).toBeGreaterThan(0.5);
    expect(hazy - ordinary).toBeLessThan(2.5);
  });

  it('takes the clarity of the month in which it would fall without it', () => {
    // Sirius rises at 30° N in the first days of August.
    expect(risingOfSirius(onlyIn(8, 'hazy')).found).toMatchObject({ clarity: 'hazy' });
    expect(risingOfSirius(onlyIn(7, 'hazy')).found).toMatchObject({ clarity: 'ordinary' });
  });

  it('adds the place’s shift for its side', () => {
    const { marker, found } = risingOfSirius(onlyIn(8, 'clear'), 2);
    expect([placeShiftDeg(marker, 'same'), placeShiftDeg(marker, 'opposite')]).toEqual([2, 0]);
    // A clear month takes one of the two degrees back.
    expect((Math.asin(found.needed.sineAt(0)) * 180) / Math.PI).toBeCloseTo(12, 9);
  });

  it('belongs to its turn of the Sun: a turn later it comes a year later', () => {
    const { marker, crossing, found } = risingOfSirius(allYear('ordinary'));
    const next = expectedInTurn(marker, crossing, RISING, found.highestRad + 2 * Math.PI);
    expect((next.jdUt ?? 0) - (found.jdUt ?? 0)).toBeGreaterThan(364);
    expect((next.jdUt ?? 0) - (found.jdUt ?? 0)).toBeLessThan(367);
  });

  it('is none where the Sun is never deep enough at that rising', () => {
    // At 55° N the Pleiades have no first morning with a depth of 16° about midsummer.
    const marker = markerAt('pleiades', siteAt(55), 2000);
    const crossing = marker.star.crossings?.rising;
    if (!crossing) throw new Error('the Pleiades rise at 55° N');
    expect(expectedAroundYear(marker, crossing, RISING).map(({ jdUt }) => jdUt)).toEqual([null]);
  });
});
