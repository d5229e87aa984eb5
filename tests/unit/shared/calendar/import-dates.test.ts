import { describe, expect, it } from 'vitest';
import { dateCell, type DateCell, type ImportDateFacts } from '#shared/calendar/import-dates.js';
import { IMPORT_WORDS, SEASONS } from '#server/features/imports/import-words.js';

const FACTS: ImportDateFacts = {
  words: IMPORT_WORDS,
  dayOrder: null,
  calendarYear: 2027,
  markerKeyOf: new Map([
    ['pleiades', 'pleiades'],
    ['sirius', 'hr2491'],
  ]),
  signKeyOf: SEASONS,
};
const read = (text: string, changes: Partial<ImportDateFacts> = {}): DateCell =>
  dateCell(text, { ...FACTS, ...changes });
const day = (month: number, first: number, last = first, year: number | null = null) => ({
  ...{ kind: 'day', year, first: { month, day: first }, last: { month, day: last } },
});
const problem = (code: string) => ({ kind: 'problem', problem: code });

describe('a cell that says when', () => {
  it.each([
    ['2027-06-14', day(6, 14, 14, 2027)],
    ['06-14', day(6, 14)],
    ['14.6.', day(6, 14)],
    ['14. 6. 2027', day(6, 14, 14, 2027)],
    ['14/6', day(6, 14)],
    ['6/14', day(6, 14)],
    ['6/6', day(6, 6)],
    ['14 June', day(6, 14)],
    ['14. Jun.', day(6, 14)],
    ['june 14', day(6, 14)],
    ['June 14, 2027', day(6, 14, 14, 2027)],
    ['Fixed date: 07-05', day(7, 5)],
    ['2 June', day(6, 2)],
    ['  ', { kind: 'empty' }],
  ])('reads %j as a day', (text, expected) => {
    expect(read(text)).toEqual(expected);
  });

  it.each([
    ['June 1', day(6, 1, 10)],
    ['June 2', day(6, 11, 20)],
    ['Feb 3', day(2, 21, 28)],
    ['D17', day(6, 11, 20)],
    ['D36', day(12, 21, 31)],
    ['D37', problem('no-such-day')],
  ])('reads %j as a ten-day part', (text, expected) => {
    expect(read(text)).toEqual(expected);
  });

  it('asks which comes first where it can be both, and goes by the answer', () => {
    expect(read('6/7')).toEqual(problem('which-first'));
    expect(read('6/7', { dayOrder: 'day-first' })).toEqual(day(7, 6));
    expect(read('6/7', { dayOrder: 'month-first' })).toEqual(day(6, 7));
  });

  it('takes days of the calendar’s year, and of the next for a window over its end', () => {
    expect(read('2028-01-05')).toEqual(day(1, 5, 5, 2028));
    expect(read('2026-06-14')).toEqual(problem('other-year'));
    expect(read('2029-06-14')).toEqual(problem('other-year'));
  });

  it('knows no day that is not in every year', () => {
    for (const text of ['02-29', '31.4.', '13-01', '0 June', '2027-00-10']) {
      expect(read(text)).toEqual(problem('no-such-day'));
    }
  });

  it.each([
    ['Pleiades first morning +7', 'pleiades', 'heliacal-rising', 7],
    ['The  Pleiades, first morning seen', 'pleiades', 'heliacal-rising', 0],
    ['pleiades, first morning setting − 3', 'pleiades', 'cosmical-setting', -3],
    ['SIRIUS: last dusk -10', 'hr2491', 'heliacal-setting', -10],
  ])('reads %j as days from a sign', (text, markerKey, phenomenon, offsetDays) => {
    expect(read(text)).toEqual({ kind: 'sign', sign: { type: 'star', markerKey, phenomenon }, offsetDays });
  });

  it('reads the turns of the Sun', () => {
    expect(read('June solstice +3')).toEqual({
      ...{ kind: 'sign', offsetDays: 3 },
      sign: { type: 'other', signKey: 'june-solstice' },
    });
  });

  it('says what is the matter with the rest', () => {
    expect(read('Weaver star, first dawn')).toEqual(problem('unknown-star-name'));
    expect(read('when the fig has leaves')).toEqual(problem('unknown-sign-words'));
    expect(read('Pleiades')).toEqual(problem('unknown-sign-words'));
    for (const text of ['14', '1.2.3.4', '20270614']) expect(read(text)).toEqual(problem('date-not-read'));
  });
});
