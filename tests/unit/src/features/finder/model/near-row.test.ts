import { describe, expect, it } from 'vitest';
import { nearRow } from '#src/features/finder/model/near-row.js';

const day = (dayNumber: number) => ({ dayNumber, gregorian: '2027-06-01', julian: '2027-05-19' });
const found = (early: number | null, expected: number, late: number | null) => ({
  days: {
    early: early === null ? null : day(early),
    expected: day(expected),
    late: late === null ? null : day(late),
    notes: [],
  },
});

describe('the row of days', () => {
  it('holds the wanted days and the whole range, with a day to spare', () => {
    expect(nearRow(found(105, 110, 116), { from: 100, to: 102 })).toEqual({ first: 99, last: 117 });
    expect(nearRow(found(null, 95, null), { from: 100, to: 100 })).toEqual({ first: 94, last: 101 });
  });

  it('is none where its rings would melt together', () => {
    expect(nearRow(found(105, 140, 180), { from: 100, to: 102 })).toBeNull();
  });
});
