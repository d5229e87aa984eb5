import { describe, expect, it } from 'vitest';
import { lateSaid, signsSaid } from '#shared/calendar/said-words.js';
import { wholeRecord } from '#tests/support/event-record.js';

describe('words of an entry and of its record, read in one breath', () => {
  const entry = { otherSigns: 'Frogs calling', ifLate: 'Sow short millet.' };

  it('are the free ones alone where there is no record', () => {
    expect(signsSaid(entry)).toBe('Frogs calling');
    expect(lateSaid(entry)).toBe('Sow short millet.');
  });

  it('name the signs of the record first, and the second step last', () => {
    const record = wholeRecord();
    expect(signsSaid({ ...entry, record })).toBe('wet to the hand, the reed caller. Frogs calling');
    expect(lateSaid({ ...entry, record })).toBe('Sow short millet.\nSow beans.');
    expect(signsSaid({ ...entry, otherSigns: '', record })).toBe('wet to the hand, the reed caller');
  });

  it('begin with the sign of nature that leads', () => {
    const usual = { from: { month: 5, day: 23 }, to: { month: 5, day: 27 } };
    const lead = { type: 'nature-sign', name: 'Birch in leaf', usual, source: 'Elder C-2' } as const;
    expect(signsSaid({ ...entry, lead })).toBe('Birch in leaf. Frogs calling');
  });
});
