import { describe, expect, it } from 'vitest';

import { candidatesOf, countWithoutDate, isEasyToFind } from '#shared/calendar/marker-candidates.js';
import { computeMarkerYear, STARS } from '#shared/sky/index.js';
import { settingsWith, siteAt } from '#tests/support/sky/builders.js';

const yearOf = (key: string, latitudeDeg: number) =>
  computeMarkerYear(key, siteAt(latitudeDeg), settingsWith(), 2027);
const bright = { vMag: 0, isFigure: false };

describe('candidates of a marker', () => {
  it('are its dated phenomena, each with the remarks about star and day', () => {
    const arcturus = yearOf('hr5340', 45);
    const found = candidatesOf(arcturus, bright);
    expect(found.map(({ phenomenon }) => phenomenon).sort()).toEqual([
      'acronychal-rising',
      'cosmical-setting',
      'heliacal-rising',
      'heliacal-setting',
    ]);
    expect(arcturus.notes).toContain('never-disappears');
    for (const candidate of found) expect(candidate.notes).toContain('never-disappears');
  });

  it('count a day that comes twice in a civil year, so that an entry can go by the second one', () => {
    // A civil year of 366 days holds both ends of a year of the stars: some star at this latitude comes so.
    const leapYears = STARS.map(({ hr }) =>
      computeMarkerYear(`hr${String(hr)}`, siteAt(20), settingsWith(), 2028),
    );
    const twice = leapYears.flatMap((markerYear) => {
      const found = candidatesOf(markerYear, bright);
      return found.flatMap((second) =>
        second.occurrenceNumber === 2
          ? found
              .filter(
                ({ phenomenon, occurrenceNumber }) =>
                  phenomenon === second.phenomenon && occurrenceNumber === 1,
              )
              .map((first) => second.occurrence.expected.dayNumber - first.occurrence.expected.dayNumber)
          : [],
      );
    });
    expect(twice.length).toBeGreaterThan(0);
    expect(twice.every((days) => days === 365 || days === 364)).toBe(true);
  });

  it('are none for a star that never sets', () => {
    expect(candidatesOf(yearOf('hr424', 45), bright)).toEqual([]);
  });
});

describe('markers without a date', () => {
  it('are counted by the reason, as far as they would be easy to find', () => {
    const counts = countWithoutDate([
      { markerYear: yearOf('hr424', 66), sight: bright },
      { markerYear: yearOf('hr2326', 66), sight: bright },
      { markerYear: yearOf('pleiades', 62), sight: { vMag: 2.9, isFigure: true } },
      { markerYear: yearOf('hr2326', 66), sight: { vMag: 4, isFigure: false } },
      { markerYear: yearOf('hr2491', 30), sight: bright },
    ]);
    expect(counts).toEqual({ neverSets: 1, neverClearsSkyline: 1, neverDarkEnough: 1 });
  });
});

describe('easy to find', () => {
  it('is a figure by its shape and a star by its brightness', () => {
    expect(isEasyToFind({ vMag: 2.87, isFigure: true })).toBe(true);
    expect(isEasyToFind({ vMag: 2.5, isFigure: false })).toBe(true);
    expect(isEasyToFind({ vMag: 2.51, isFigure: false })).toBe(false);
  });
});
