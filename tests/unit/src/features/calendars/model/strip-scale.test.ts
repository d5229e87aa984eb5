import { describe, expect, it } from 'vitest';
import { dayNumberFromIso, isoDateOf } from '#shared/kernel/iso-date.js';
import {
  civilMonths,
  daysOf,
  knownCalendars,
  marketWeeks,
  runsFrom,
  villageMonths,
} from '#src/features/calendars/model/strip-scale.js';
import type { DaySpan } from '#src/ui/pictures/day-span.js';

const span = { first: dayNumberFromIso('2027-01-01'), last: dayNumberFromIso('2027-12-31') };
const named = (firstDay: number, number: number) => ({
  ...{ short: String(number), narrow: '', long: isoDateOf(firstDay) },
});

describe('market weeks', () => {
  it('are counted from a market day both ways, and the first may have begun before the strip', () => {
    const weeks = marketWeeks(span, 5, dayNumberFromIso('2027-06-10'), named);
    expect(weeks.every(({ days }) => days === 5)).toBe(true);
    expect(weeks[0]?.dayNumber).toBeGreaterThan(span.first - 5);
    expect(weeks[0]?.dayNumber).toBeLessThanOrEqual(span.first);
    expect(weeks.find(({ short }) => short === '0')?.long).toBe('2027-06-10');
    expect(weeks.at(-1)?.dayNumber).toBeGreaterThan(span.last - 5);
  });
});

describe('runs from day to day', () => {
  it('reach to the next beginning, the last one to the end; what lies outside is left out', () => {
    const at = (iso: string) => ({ dayNumber: dayNumberFromIso(iso), short: iso, narrow: '', long: iso });
    const june = { first: dayNumberFromIso('2027-06-01'), last: dayNumberFromIso('2027-06-30') };
    const runs = runsFrom([at('2027-04-07'), at('2027-05-07'), at('2027-06-06'), at('2027-07-05')], june);
    expect(runs.map(({ long, days }) => [long, days])).toEqual([
      ['2027-05-07', 30],
      ['2027-06-06', 29],
    ]);
  });
});

describe('months of a village', () => {
  const months = [
    { name: 'Ŋɔ́rɛ̃', begins: { month: 6, day: 8 } },
    { name: 'ɓèŋu̍', begins: { month: 12, day: 28 } },
  ];
  const runs = (year: DaySpan) =>
    villageMonths(year, months).map(({ dayNumber, days, ownName }) => [isoDateOf(dayNumber), days, ownName]);

  it('reach from day to day, the one that runs at New Year included', () => {
    expect(runs(span)).toEqual([
      ['2026-12-28', 162, 'ɓèŋu̍'],
      ['2027-06-08', 203, 'Ŋɔ́rɛ̃'],
      ['2027-12-28', 163, 'ɓèŋu̍'],
    ]);
  });

  it('fill a year that begins with the village’s', () => {
    const own = { first: dayNumberFromIso('2027-06-08'), last: dayNumberFromIso('2028-06-07') };
    expect(runs(own)).toEqual([
      ['2027-06-08', 203, 'Ŋɔ́rɛ̃'],
      ['2027-12-28', 163, 'ɓèŋu̍'],
    ]);
  });

  it('shorten to the first letter with its marks', () => {
    expect(villageMonths(span, months).map(({ narrow }) => narrow)).toEqual(['ɓ', 'Ŋ', 'ɓ']);
    const [marked] = villageMonths(span, [{ name: 'ɛ̃́lo', begins: { month: 1, day: 1 } }]);
    expect(marked?.narrow).toBe('ɛ̃́');
  });
});

describe('months of another calendar', () => {
  // 1 Muharram 1449 of the Umm al-Qura calendar and 1 Mäskäräm 2020 of the Ethiopian one; from memory.
  it.each([
    ['islamic-umalqura', '2027-06-06', /Muharram/u],
    ['ethiopic', '2027-09-12', /Meskerem/u],
  ])('begin on the days on which %s begins them', (calendar, day, name) => {
    const months = civilMonths(span, calendar, 'en-GB');
    expect(months.find(({ dayNumber }) => isoDateOf(dayNumber) === day)?.long).toMatch(name);
  });

  it.each(['islamic-umalqura', 'ethiopic', 'hebrew', 'chinese', 'persian', 'indian', 'buddhist'])(
    '%s fills the year without a gap, with whole months at its ends',
    (calendar) => {
      const months = civilMonths(span, calendar, 'en-GB');
      expect(months[0]?.dayNumber).toBeLessThanOrEqual(span.first);
      expect(months[0]?.days).toBeGreaterThanOrEqual(29);
      months.slice(1).forEach((month, index) => {
        const before = months[index];
        expect(month.dayNumber).toBe((before?.dayNumber ?? 0) + (before?.days ?? 0));
      });
      const last = months.at(-1);
      expect(last?.dayNumber).toBeLessThanOrEqual(span.last);
      expect((last?.dayNumber ?? 0) + (last?.days ?? 0)).toBeGreaterThan(span.last);
      expect(months.length).toBeGreaterThanOrEqual(12);
    },
  );

  it('are those that this browser knows, by name, without the Gregorian one', () => {
    const known = knownCalendars('en-GB');
    expect(known.map(({ calendar }) => calendar)).toContain('ethiopic');
    expect(known.map(({ calendar }) => calendar)).not.toContain('gregory');
    expect(known.every(({ name }) => name.length > 3)).toBe(true);
  });
});

it('the closest look has a part for every day', () => {
  const days = daysOf({ first: span.first, last: span.first + 2 }, String);
  expect(days.map(({ short, days: length }) => [short, length])).toEqual([
    ['1', 1],
    ['2', 1],
    ['3', 1],
  ]);
});
