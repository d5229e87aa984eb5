import { describe, expect, it } from 'vitest';
import type { DriftEpoch } from '#shared/contracts/drift.js';
import { dayNumberOf, readDate } from '#src/lib/days.js';
import { driftRuns, driftScale, plainDate } from '#src/features/drift/model/drift-line.js';

const NONE = { outcome: 'never-dark-enough' as const, occurrences: [] };

function epoch(year: number, gregorian: string | null, more: Partial<DriftEpoch> = {}): DriftEpoch {
  const dayNumber = dayNumberOf(readDate(gregorian ?? '2000-01-01') ?? { year: 2000, month: 1, day: 1 });
  const day = { dayNumber, gregorian: gregorian ?? '', julian: gregorian ?? '' };
  const rising = {
    outcome: 'dated' as const,
    occurrences: [
      {
        expected: day,
        early: { ...day, dayNumber: dayNumber - 3 },
        late: { ...day, dayNumber: dayNumber + 5 },
        notes: [],
        sunLongitudeDeg: 0,
      },
    ],
  };
  return {
    year,
    outcome: 'rises-and-sets',
    outcomeDetail: null,
    phenomena: {
      'cosmical-setting': NONE,
      'acronychal-rising': NONE,
      'heliacal-setting': NONE,
      'heliacal-rising': gregorian === null ? NONE : rising,
    },
    ...more,
  };
}

describe('the line of a marker', () => {
  it('has each year’s date, and its place in the seasons with the range beside it', () => {
    const [run] = driftRuns([epoch(1000, '1000-05-20'), epoch(2000, '2000-06-03')], 'heliacal-rising');
    expect(run?.map(({ date }) => [date.month, date.day])).toEqual([
      [5, 20],
      [6, 3],
    ]);
    const [first] = run ?? [];
    // 20 May is the day 139 after 1 January; leap days push a date by up to a day.
    expect(Math.abs((first?.expected ?? 0) - 139)).toBeLessThan(1.3);
    expect([
      (first?.early ?? 0) - (first?.expected ?? 0),
      (first?.late ?? 0) - (first?.expected ?? 0),
    ]).toEqual([-3, 5]);
  });

  it('lies still for a day that keeps its date, whatever leap days do', () => {
    const years = Array.from({ length: 60 }, (_, index) => 1500 + 10 * index);
    const [run] = driftRuns(
      years.map((year) => epoch(year, `${String(year)}-06-03`)),
      'heliacal-rising',
    );
    const places = (run ?? []).map(({ expected }) => expected);
    expect(Math.max(...places) - Math.min(...places)).toBeLessThan(2.3);
  });

  it('goes on over New Year without a jump', () => {
    const [run] = driftRuns(
      [epoch(1000, '1000-12-20'), epoch(1500, '1500-12-29'), epoch(2000, '2000-01-06')],
      'heliacal-rising',
    );
    const places = (run ?? []).map(({ expected }) => expected);
    for (const [index, about] of [353, 362, 370].entries()) {
      expect(Math.abs((places[index] ?? 0) - about)).toBeLessThan(1.3);
    }
    expect(plainDate(370)).toMatchObject({ month: 1, day: 6 });
  });

  it('breaks where a year has no date, but not where the day only slipped past the year', () => {
    const slipped = epoch(1500, null);
    slipped.phenomena['heliacal-rising'] = { outcome: 'none-in-this-year', occurrences: [] };
    const runsOf = (middle: DriftEpoch) =>
      driftRuns([epoch(1000, '1000-12-30'), middle, epoch(2000, '2000-01-03')], 'heliacal-rising').length;
    expect(runsOf(slipped)).toBe(1);
    expect(runsOf(epoch(1500, null))).toBe(2);
    expect(runsOf(epoch(1500, null, { outcome: 'never-sets' }))).toBe(2);
  });
});

describe('the frame', () => {
  const runs = driftRuns([epoch(1000, '1000-05-20'), epoch(2000, '2000-06-03')], 'heliacal-rising');

  it('holds the whole band, and never makes a quiet marker look restless', () => {
    const { top, bottom } = driftScale(runs, { from: 1000, to: 2000 }, 8);
    const points = runs.flat();
    expect(top).toBeLessThan(Math.min(...points.map(({ early }) => early ?? 0)));
    expect(bottom).toBeGreaterThan(Math.max(...points.map(({ late }) => late ?? 0)));
    expect(bottom - top).toBeGreaterThanOrEqual(40);
  });

  it('has round years, as many as there is room for', () => {
    expect(driftScale(runs, { from: 950, to: 2050 }, 4).years).toEqual([1000, 1500, 2000]);
    expect(driftScale(runs, { from: 950, to: 2050 }, 8).years).toEqual([1000, 1200, 1400, 1600, 1800, 2000]);
  });

  it('has lines at days that people know', () => {
    const { days } = driftScale(runs, { from: 1000, to: 2000 }, 8);
    expect(days.length).toBeGreaterThanOrEqual(3);
    for (const day of days) expect([1, 11, 21]).toContain(plainDate(day).day);
  });
});
