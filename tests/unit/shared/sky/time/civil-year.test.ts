import { describe, expect, it } from 'vitest';

import { civilYearOf, monthOfDay } from '#shared/sky/time/civil-year.js';

describe('a civil year', () => {
  it('is Julian up to 1582 and Gregorian from 1583', () => {
    expect(civilYearOf(1582)).toMatchObject({ calendar: 'julian', firstDay: 2_298_884 });
    expect(civilYearOf(1583)).toMatchObject({ calendar: 'gregorian', firstDay: 2_299_239 });
  });

  it('has 365 or 366 days', () => {
    const lengthOf = (year: number): number => civilYearOf(year).lastDay - civilYearOf(year).firstDay + 1;
    expect([-4, -3, 0, 1500, 1900, 2000, 2027].map(lengthOf)).toEqual([366, 365, 366, 366, 365, 366, 365]);
  });

  it('tells the month of a day in its own calendar', () => {
    // 1 March 1900 Julian is 13 March Gregorian; on 1 February Gregorian the Julian label still says January.
    expect(monthOfDay(2_415_052, 'gregorian')).toBe(2);
    expect(monthOfDay(2_415_052, 'julian')).toBe(1);
  });
});
