import { describe, expect, it } from 'vitest';
import { dayNumberOf } from '#shared/sky/index.js';
import { civilDate, dateWithin, monthStarts, readYear } from '#src/lib/civil-year.js';

describe('a typed year', () => {
  it.each([
    ['2027', 2027],
    [' 2027 ', 2027],
    ['-43', -43],
    ['−43', -43],
    ['44 BC', -43],
    ['44bce', -43],
    ['1 BC', 0],
    ['AD 14', 14],
    ['14 AD', 14],
    ['0', 0],
    ['-3000', -3000],
    ['3001 BC', -3000],
    ['3000', 3000],
  ])('%j is the astronomical year %d', (text, year) => {
    expect(readYear(text)).toBe(year);
  });

  it.each(['', 'soon', '0 BC', '-5 BC', '3001', '3002 BC', '12345', '20.27'])('%j is none', (text) => {
    expect(readYear(text)).toBeNull();
  });
});

describe('a civil year', () => {
  it('has the months of its own calendar, told by the core', () => {
    for (const [year, calendar] of [
      [2028, 'gregorian'],
      [2027, 'gregorian'],
      [1900, 'gregorian'],
      [1500, 'julian'],
      [1000, 'julian'],
      [-43, 'julian'],
      [-44, 'julian'],
    ] as const) {
      const first = dayNumberOf({ year, month: 1, day: 1 }, calendar);
      const expected = Array.from({ length: 12 }, (_, month) =>
        dayNumberOf({ year, month: month + 1, day: 1 }, calendar),
      );
      expect(monthStarts(year, first).map((month) => month.dayNumber)).toEqual(expected);
    }
  });

  it('names each of its days, 29 February 1500 as well', () => {
    const first = dayNumberOf({ year: 1500, month: 1, day: 1 }, 'julian');
    const months = monthStarts(1500, first);
    expect(dateWithin(first + 59, 1500, months)).toMatchObject({ month: 2, day: 29 });
    expect(dateWithin(first + 60, 1500, months)).toMatchObject({ month: 3, day: 1 });
    expect(dateWithin(first + 365, 1500, months)).toMatchObject({ month: 12, day: 31 });
  });
});

describe('a date of a star', () => {
  const day = { dayNumber: 1_705_500, gregorian: '-0043-07-17', julian: '-0043-07-19' };

  it('is Julian before 1583 and Gregorian from then on', () => {
    expect(civilDate(day, -43)).toMatchObject({ month: 7, day: 19 });
    expect(civilDate({ ...day, gregorian: '1583-07-17', julian: '1583-07-07' }, 1583)).toEqual({
      year: 1583,
      month: 7,
      day: 17,
    });
  });

  it('keeps a Julian leap day that the Gregorian calendar does not have', () => {
    expect(civilDate({ ...day, julian: '1500-02-29', gregorian: '1500-03-10' }, 1500)).toMatchObject({
      month: 2,
      day: 29,
    });
  });

  it('stays before or after the others across the turn of a year', () => {
    const late = civilDate({ ...day, julian: '-0043-12-30' }, -43);
    const early = civilDate({ ...day, julian: '-0042-01-02' }, -43);
    expect(early.year - late.year).toBe(1);
  });
});
