import { describe, expect, it } from 'vitest';
import { boardDayOf, boardDaysOf } from '#shared/calendar/board-days.js';

describe('the holes of a board', () => {
  it('are exactly 365, or 366 in a leap year', () => {
    expect(boardDaysOf(2027)).toHaveLength(365);
    expect(boardDaysOf(2028)).toHaveLength(366);
    expect(boardDaysOf(1900)).toHaveLength(365);
    expect(boardDaysOf(2000)).toHaveLength(366);
  });

  it('stand in twelve rows, one for each month, and no row has a hole that its month has no day for', () => {
    const perRow = (year: number) =>
      Array.from(
        { length: 12 },
        (_, index) => boardDaysOf(year).filter(({ row }) => row === index + 1).length,
      );
    expect(perRow(2027)).toEqual([31, 28, 31, 30, 31, 30, 31, 31, 30, 31, 30, 31]);
    expect(perRow(2028)[1]).toBe(29);
  });

  it('are numbered through the year, and 29 February is the only dashed one', () => {
    const days = boardDaysOf(2028);
    expect(days.map(({ hole }) => hole)).toEqual(Array.from({ length: 366 }, (_, index) => index + 1));
    expect(days.filter(({ leapDay }) => leapDay).map(({ date }) => date)).toEqual(['2028-02-29']);
    expect(boardDaysOf(2027).some(({ leapDay }) => leapDay)).toBe(false);
  });

  it('answer the same one by one', () => {
    for (const year of [2027, 2028])
      expect(boardDaysOf(year)).toEqual(boardDaysOf(year).map(({ date }) => boardDayOf(date)));
    expect(boardDayOf('2027-06-07')).toEqual({
      date: '2027-06-07',
      hole: 158,
      row: 6,
      column: 7,
      leapDay: false,
    });
  });
});
