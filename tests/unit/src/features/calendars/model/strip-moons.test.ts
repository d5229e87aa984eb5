import { describe, expect, it } from 'vitest';
import { dayNumberFromIso, isoDateOf } from '#shared/kernel/iso-date.js';
import { countedMoons, yearsToCount } from '#src/features/calendars/model/strip-moons.js';

const day = dayNumberFromIso;
const year2027 = { first: day('2027-01-01'), last: day('2027-12-31') };
const JUNE_8 = { month: 6, day: 8 };

/** Moons of 29 and 30 days in turn, from a first evening on. */
function moonsFrom(iso: string, count: number): number[] {
  return Array.from({ length: count }, (_, index) => day(iso) + Math.floor(index * 29.5));
}

describe('Moons of the village’s own year', () => {
  it('are counted from the first that begins in it; one that runs over its end keeps its number', () => {
    const moons = countedMoons(moonsFrom('2026-01-20', 25), 2026, JUNE_8);
    const around = moons.filter(({ dayNumber }) => Math.abs(dayNumber - day('2027-06-08')) < 40);
    expect(around.map(({ dayNumber, nth }) => [isoDateOf(dayNumber), nth])).toEqual([
      ['2027-05-07', 12],
      ['2027-06-05', 13],
      ['2027-07-05', 1],
    ]);
  });

  it('are thirteen where one more begins before the year is over, and twelve where none does', () => {
    const lastOf = (firstEvening: string) =>
      Math.max(
        ...countedMoons(moonsFrom(firstEvening, 40), 2026, JUNE_8)
          .filter(({ yearStartDay }) => yearStartDay === day('2026-06-08'))
          .map(({ nth }) => nth),
      );
    expect(lastOf('2026-06-08')).toBe(13);
    expect(lastOf('2026-06-25')).toBe(12);
  });

  it('begin with the day of the year’s start itself, and the day before belongs to the old year', () => {
    const on = countedMoons([day('2027-06-08')], 2026, JUNE_8);
    expect(on).toEqual([{ dayNumber: day('2027-06-08'), nth: 1, yearStartDay: day('2027-06-08') }]);
    const before = countedMoons([day('2027-06-07')], 2026, JUNE_8);
    expect(before[0]?.yearStartDay).toBe(day('2026-06-08'));
  });

  it('are counted once where two years of the sky both tell of one, and not where nobody knows how many came before', () => {
    const moons = moonsFrom('2026-01-20', 25);
    expect(countedMoons([...moons, ...moons].reverse(), 2026, JUNE_8)).toEqual(
      countedMoons(moons, 2026, JUNE_8),
    );
    const [first] = countedMoons(moons, 2026, JUNE_8);
    expect(first?.nth).toBe(1);
    expect(first?.dayNumber).toBeGreaterThanOrEqual(day('2026-06-08'));
  });
});

describe('civil years to ask for', () => {
  it('reach back to the local year of the Moon that runs when the strip begins', () => {
    expect(yearsToCount(year2027, JUNE_8)).toEqual([2026, 2027]);
    expect(yearsToCount(year2027, { month: 1, day: 1 })).toEqual([2026, 2027]);
    expect(yearsToCount({ first: day('2027-06-08'), last: day('2028-06-07') }, JUNE_8)).toEqual([
      ...[2026, 2027, 2028],
    ]);
    expect(yearsToCount({ first: day('2027-08-01'), last: day('2027-08-31') }, JUNE_8)).toEqual([2027]);
  });
});
