import { describe, expect, it } from 'vitest';

import { SkyRangeError, venusYear, VENUS_APPEARANCES, type VenusAppearance } from '#shared/sky/index.js';
import { preparedYearOf } from '#shared/sky/phenomena/year-cache.js';
import { venusYearOf } from '#shared/sky/planets/venus-year.js';
import { settingsWith, siteAt } from '#tests/support/sky/builders.js';

const YEARS = Array.from({ length: 17 }, (_, index) => 2020 + index);
const daysOf = (latitudeDeg: number, appearance: VenusAppearance): number[] =>
  YEARS.flatMap((year) =>
    venusYear(siteAt(latitudeDeg), settingsWith(), year).appearances[appearance].occurrences.map(
      ({ expected }) => expected.dayNumber,
    ),
  );

describe('the year of Venus', () => {
  it('repeats after eight years, two or three days earlier', () => {
    for (const appearance of VENUS_APPEARANCES) {
      const days = daysOf(15, appearance);
      expect(days.length).toBeGreaterThanOrEqual(10);
      days.slice(5).forEach((day, index) => {
        const shift = day - (days[index] ?? 0) - 8 * 365.25;
        expect(shift).toBeGreaterThan(-6);
        expect(shift).toBeLessThan(2);
      });
    }
  });

  it('hides Venus for days before the Sun and for weeks behind it', () => {
    const gaps = (from: VenusAppearance, to: VenusAppearance): number[] => {
      const ends = daysOf(15, to);
      return daysOf(15, from)
        .map((day) => (ends.find((end) => end > day) ?? Infinity) - day)
        .filter((gap) => gap < 400);
    };
    // In the tables of old observers the two gaps are counted as about 8 and 50 to 90 days [from memory].
    for (const gap of gaps('evening-last', 'morning-first')) expect(gap).toBeLessThan(20);
    for (const gap of gaps('morning-last', 'evening-first')) {
      expect(gap).toBeGreaterThan(25);
      expect(gap).toBeLessThan(95);
    }
  });

  it('gives a range in order around each day, wider behind the Sun than before it', () => {
    const { appearances } = venusYearOf(preparedYearOf(2026), siteAt(12), settingsWith());
    const spanOf = (appearance: VenusAppearance): number => {
      const [occurrence] = appearances[appearance].occurrences;
      if (!occurrence?.early || !occurrence.late) throw new Error(`no ${appearance} in 2026`);
      expect(occurrence.early.dayNumber).toBeLessThanOrEqual(occurrence.expected.dayNumber);
      expect(occurrence.late.dayNumber).toBeGreaterThanOrEqual(occurrence.expected.dayNumber);
      return occurrence.late.dayNumber - occurrence.early.dayNumber;
    };
    expect(spanOf('evening-first')).toBeGreaterThan(spanOf('evening-last') + 5);
    expect(appearances['morning-last']).toMatchObject({ outcome: 'none-in-this-year', occurrences: [] });
  });

  it('moves with haze and with the skyline’s own rule', () => {
    const dayIn = (more: Parameters<typeof settingsWith>[0], skylineDeg: number): number => {
      const skyline = [{ azimuthDeg: 0, altitudeDeg: skylineDeg }];
      const result = venusYear(siteAt(12, 0, { skyline }), settingsWith(more), 2026);
      return result.appearances['evening-first'].occurrences[0]?.expected.dayNumber ?? 0;
    };
    const ordinary = dayIn({}, 0);
    expect(dayIn({ clarityByMonth: new Array<'hazy'>(12).fill('hazy') }, 0)).toBeGreaterThan(ordinary);
    expect(dayIn({ skylineRule: 'depth-at-crossing' }, 4)).toBeGreaterThan(dayIn({}, 4));
  });

  it('says what the far north does to it', () => {
    const notesIn = (year: number, appearance: VenusAppearance) =>
      venusYear(siteAt(66, 23), settingsWith(), year).appearances[appearance].occurrences[0]?.notes;
    expect(notesIn(2026, 'evening-last')).toContain('lost-in-light-nights');
    expect(notesIn(2028, 'morning-first')).toContain('never-disappears');
    expect(() => venusYear(siteAt(66, 23), settingsWith(), 4000)).toThrow(SkyRangeError);
  });
});
