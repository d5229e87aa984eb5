import i18next from 'i18next';
import { beforeAll, describe, expect, it } from 'vitest';
import { dateWords, type DateWords } from '#src/lib/date-words.js';
import { resources } from '#shared/locales/index.js';

const NBSP = '\u00a0';
let words: DateWords;

beforeAll(async () => {
  const i18n = i18next.createInstance();
  const t = await i18n.init({
    lng: 'en',
    defaultNS: 'common',
    resources,
    interpolation: { escapeValue: false },
  });
  words = dateWords(t, 'en');
});

describe('a date in words', () => {
  it('never breaks between day, month and year', () => {
    expect(words.day('2027-06-07')).toBe(`7${NBSP}June`);
    expect(words.day('2027-06-07', 'year')).toBe(`7${NBSP}June${NBSP}2027`);
  });

  it('may break after the weekday only', () => {
    expect(words.day('2027-06-07', 'weekday')).toBe(`Monday 7${NBSP}June`);
  });

  it('says BC for years before 1', () => {
    expect(words.day('-0043-07-19', 'year').replaceAll(NBSP, ' ')).toBe('19 July 44 BC');
    expect(words.year(-43)).toBe('44 BC');
    expect(words.year(2027)).toBe('2027');
  });

  it('takes day numbers and parts as well', () => {
    expect(words.day(2_451_545)).toBe(words.day({ year: 2000, month: 1, day: 1 }));
  });
});

describe('a range in words', () => {
  it('says the month once where both days share it', () => {
    expect(words.range('2027-06-03', '2027-06-12')).toBe(`3 to 12${NBSP}June`);
  });

  it('says both months where they differ', () => {
    expect(words.between('2027-05-28', '2027-06-03')).toBe(`between 28${NBSP}May and 3${NBSP}June`);
  });

  it('says both years where they differ and years are wanted', () => {
    expect(words.range('2027-12-28', '2028-01-02', 'year').replaceAll(NBSP, ' ')).toBe(
      '28 December 2027 to 2 January 2028',
    );
  });

  it('of one day is that day', () => {
    expect(words.range('2027-06-07', '2027-06-07')).toBe(`7${NBSP}June`);
  });

  it('stands beside the expected day and never leaves a bare date', () => {
    const said = (early: string | null, late: string | null) =>
      words.aboutBetween('2027-06-07', early, late).replaceAll(NBSP, ' ');
    expect(said('2027-06-03', '2027-06-12')).toBe('About 7 June, between 3 and 12 June');
    expect(said(null, '2027-06-12')).toBe('About 7 June, no later than 12 June');
    expect(said('2027-06-03', null)).toBe('About 7 June, no earlier than 3 June');
    expect(said(null, null)).toBe('About 7 June; how much earlier or later cannot be told');
  });
});

describe('a range within a sentence', () => {
  it('begins with a small letter', () => {
    expect(words.aboutWithin('2027-06-07', '2027-06-03', null).replaceAll(NBSP, ' ')).toBe(
      'about 7 June, no earlier than 3 June',
    );
  });
});

describe('a moment in words', () => {
  const now = new Date(2027, 5, 7, 20, 0);
  it('is a time today, then yesterday, then a date', () => {
    expect(words.moment(new Date(2027, 5, 7, 18, 40), now)).toBe('18:40');
    expect(words.moment(new Date(2027, 5, 6, 18, 40), now)).toBe('yesterday, 18:40');
    expect(words.moment(new Date(2027, 4, 1, 6, 5), now)).toBe(`1${NBSP}May, 06:05`);
    expect(words.moment(new Date(2026, 4, 1, 6, 5), now)).toBe(`1${NBSP}May${NBSP}2026, 06:05`);
  });
});

describe('months of a scale', () => {
  it('cover the year without a gap, leap years too', () => {
    for (const year of [2027, 2028, -3]) {
      const months = words.months(year);
      months.slice(1).forEach((month, index) => {
        const before = months[index];
        expect(month.dayNumber).toBe((before?.dayNumber ?? 0) + (before?.days ?? 0));
      });
      expect(months.reduce((days, month) => days + month.days, 0)).toBe(year === 2028 ? 366 : 365);
    }
  });
});
