import { describe, expect, it } from 'vitest';
import { fontMeasurer } from '#server/print/font-measurer.js';
import { monthCards } from '#shared/sheet/month-card.js';
import { moonDayOf } from '#shared/sheet/moon-days.js';
import { texts } from '#tests/support/sheet/page-checks.js';
import { upperTazimel } from '#tests/support/sheet/upper-tazimel-sheet.js';

describe('the day of the Moon', () => {
  const begins = ['2026-12-10', '2027-01-09', '2027-02-09'];

  it('is counted from its first crescent, over New Year too', () => {
    expect(moonDayOf('2027-01-01', begins)).toBe(23);
    expect(moonDayOf('2027-01-08', begins)).toBe(30);
    expect(moonDayOf('2027-01-09', begins)).toBe(1);
  });

  it('never goes beyond 30: the evening before a late crescent has no number', () => {
    expect(moonDayOf('2027-02-07', begins)).toBe(30);
    expect(moonDayOf('2027-02-08', begins)).toBeNull();
  });

  it('has no number before the first Moon that is known', () => {
    expect(moonDayOf('2026-12-09', begins)).toBeNull();
    expect(moonDayOf('2027-01-01', [])).toBeNull();
  });
});

describe('a month card', () => {
  it('has the day of the Moon beside every day, explained once, and neither where no Moons are given', () => {
    const cards = monthCards(upperTazimel(), fontMeasurer);
    const june = cards.filter(({ kind, month }) => kind === 'month-card' && month === 6);
    const marks = texts(june).filter(({ role }) => role === 'moon-day');
    // Thirty days and the sample beside its explanation.
    expect(marks).toHaveLength(31);
    const without = monthCards(upperTazimel({ moonBegins: [] }), fontMeasurer);
    expect(texts(without).filter(({ role }) => role === 'moon-day')).toEqual([]);
  }, 60_000);
});
