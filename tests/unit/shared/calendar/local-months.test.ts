import { describe, expect, it } from 'vitest';
import { fromYearStart, localMonthStarts, nextFreeDay } from '#shared/calendar/local-months.js';
import { isoDateOf } from '#shared/kernel/iso-date.js';

const begins = (name: string, month: number, day: number) => ({ name, begins: { month, day } });
const MONTHS = [begins('dry', 12, 28), begins('wet', 6, 8), begins('hot', 3, 1)];

describe('months of a village', () => {
  it('stand in the order in which its year brings them', () => {
    const namesFrom = (month: number, day: number) =>
      fromYearStart(MONTHS, { month, day }).map(({ name }) => name);
    expect(namesFrom(6, 8)).toEqual(['wet', 'dry', 'hot']);
    expect(namesFrom(6, 9)).toEqual(['dry', 'hot', 'wet']);
    expect(namesFrom(1, 1)).toEqual(['hot', 'wet', 'dry']);
  });

  it('begin on the same days in every year, leap years too', () => {
    const starts = localMonthStarts(MONTHS, 2027, 2028).map(
      ({ dayNumber, name }) => `${isoDateOf(dayNumber)} ${name}`,
    );
    expect(starts).toEqual([
      '2027-03-01 hot',
      '2027-06-08 wet',
      '2027-12-28 dry',
      '2028-03-01 hot',
      '2028-06-08 wet',
      '2028-12-28 dry',
    ]);
  });
});

describe('a day for one more month', () => {
  const start = { month: 6, day: 8 };
  it('is that of the year’s beginning, then thirty days after the last one, over New Year too', () => {
    expect(nextFreeDay([], start)).toEqual(start);
    expect(nextFreeDay([start], start)).toEqual({ month: 7, day: 8 });
    expect(nextFreeDay([{ month: 12, day: 28 }], start)).toEqual({ month: 1, day: 27 });
  });

  it('is none that is taken', () => {
    const taken = [
      { month: 7, day: 8 },
      { month: 7, day: 9 },
      { month: 6, day: 8 },
    ];
    expect(nextFreeDay(taken, start)).toEqual({ month: 7, day: 10 });
  });
});
