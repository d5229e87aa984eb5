import { describe, expect, it } from 'vitest';

import { depthAtCrossingOf, expectedDatesOf } from '#shared/sky/markers/expected-dates.js';
import { resolveMarker } from '#shared/sky/markers/marker-key.js';
import { markerYearOf } from '#shared/sky/markers/marker-year.js';
import { placeYearOf } from '#shared/sky/markers/place-year.js';
import { preparedYearOf } from '#shared/sky/phenomena/year-cache.js';
import { PHENOMENA } from '#shared/sky/vocabulary.js';
import { settingsWith, siteAt } from '#tests/support/sky/builders.js';

const skyline = [
  { azimuthDeg: 60, altitudeDeg: 2 },
  { azimuthDeg: 110, altitudeDeg: 9 },
  { azimuthDeg: 270, altitudeDeg: 1 },
];

describe('expected dates of the whole table', () => {
  it.each([
    ['flat', siteAt(28, 84)],
    ['hills', siteAt(52, 10, { skyline, timeZone: 'Europe/Stockholm' })],
  ])('are the first expected days of the full results (%s)', (_, site) => {
    const year = preparedYearOf(2027);
    const settings = settingsWith({ clarityByMonth: ['hazy', ...new Array<'clear'>(11).fill('clear')] });
    const { hrs, dayNumbers } = expectedDatesOf(year, site, settings);
    const placeYear = placeYearOf(year, site, settings);
    for (let row = 0; row < hrs.length; row += 40) {
      const marker = resolveMarker(`hr${hrs[row] ?? 0}`);
      if (!marker) throw new Error('every row is a star');
      const { phenomena } = markerYearOf(placeYear, marker);
      const expected = PHENOMENA.map(
        (phenomenon) => phenomena[phenomenon].occurrences[0]?.expected.dayNumber ?? 0,
      );
      expect([...dayNumbers.slice(4 * row, 4 * row + 4)]).toEqual(expected);
    }
  });
});

describe('dates by the depth at the crossing', () => {
  const sirius = resolveMarker('hr2491');
  if (!sirius) throw new Error('Sirius is in the table');
  const question = { hr: 2491, latitudeDeg: 30, longitudeDeg: 31, year: 2000, skylineDeg: 0 };
  const daysOf = (sameSide: number, oppositeSide: number, more: Partial<typeof question> = {}) =>
    depthAtCrossingOf(preparedYearOf(2000), sirius, {
      ...question,
      ...more,
      thresholdsDeg: { sameSide, oppositeSide },
    });

  it('use the thresholds as given, whatever the star’s brightness', () => {
    const [shallow = 0] = daysOf(9, 7).dayNumbers?.['heliacal-rising'] ?? [];
    const [deep = 0] = daysOf(12, 7).dayNumbers?.['heliacal-rising'] ?? [];
    expect(deep - shallow).toBeGreaterThanOrEqual(3);
    expect(deep - shallow).toBeLessThanOrEqual(4);
  });

  it('give the true phases with a threshold of 0: rising and setting meet the Sun half a year apart', () => {
    const { dayNumbers } = daysOf(0, 0);
    const [morning = 0] = dayNumbers?.['heliacal-rising'] ?? [];
    const [evening = 0] = dayNumbers?.['acronychal-rising'] ?? [];
    // From the Sun on the eastern horizon to the Sun on the western one.
    expect(Math.abs(((morning - evening + 366) % 366) - 183)).toBeLessThanOrEqual(4);
  });

  it('raise the whole skyline', () => {
    const { dayNumbers } = daysOf(9, 7, { skylineDeg: 5 });
    const [flat = 0] = daysOf(9, 7).dayNumbers?.['heliacal-rising'] ?? [];
    // Published effect of a 5° hill by this rule: 5 days for Sirius at 30° N.
    expect(((dayNumbers?.['heliacal-rising'] ?? [])[0] ?? 0) - flat).toBe(5);
  });

  it('carry no day numbers where the star does not rise and set', () => {
    expect(daysOf(9, 7, { latitudeDeg: 85 })).toEqual({
      outcome: 'never-clears-skyline',
      outcomeDetail: 'never-rises',
      dayNumbers: null,
    });
    expect(daysOf(9, 7, { latitudeDeg: -85 })).toEqual({
      outcome: 'never-sets',
      outcomeDetail: null,
      dayNumbers: null,
    });
  });
});
