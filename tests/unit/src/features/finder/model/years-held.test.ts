import { describe, expect, it } from 'vitest';
import { dayNumberOf, isoDateOf } from '#shared/kernel/iso-date.js';
import { yearsHeld } from '#src/features/finder/model/years-held.js';

const wanted = (month: number, day: number) => {
  const dayNumber = dayNumberOf(2027, month, day);
  return { from: dayNumber, to: dayNumber };
};
const item = (year: number, dayNumber: number | null) => ({
  markerKey: 'pleiades',
  phenomenon: 'heliacal-rising' as const,
  year,
  days:
    dayNumber === null
      ? null
      : {
          expected: { dayNumber, gregorian: isoDateOf(dayNumber), julian: isoDateOf(dayNumber) },
          early: null,
          late: null,
          notes: [],
        },
});

describe('how a marker holds over the years', () => {
  it('counts the years in which it falls within five days, and those without a date as years', () => {
    const [row] = yearsHeld(
      [
        item(2027, dayNumberOf(2027, 6, 12)),
        item(2028, dayNumberOf(2028, 6, 16)),
        item(2029, dayNumberOf(2029, 6, 5)),
        item(2030, null),
      ],
      2027,
      wanted(6, 10),
    );
    expect(row).toMatchObject({ held: 2, years: 4 });
    expect(isoDateOf(row?.earliest ?? 0)).toBe('2027-06-05');
    expect(isoDateOf(row?.latest ?? 0)).toBe('2027-06-16');
  });

  it('holds days on both sides of New Year against each other', () => {
    const [row] = yearsHeld(
      [item(2027, dayNumberOf(2027, 1, 2)), item(2028, dayNumberOf(2028, 12, 30))],
      2027,
      wanted(12, 31),
    );
    expect(row?.held).toBe(2);
    expect((row?.latest ?? 0) - (row?.earliest ?? 0)).toBeLessThan(5);
  });
});
