import { describe, expect, it } from 'vitest';
import { finderQuery } from '#shared/contracts/finder.js';
import {
  askedOf,
  readForEntry,
  readQuestion,
  writeQuestion,
} from '#src/features/finder/model/finder-question.js';

const today = { year: 2027, month: 2, day: 29 };
const read = (text: string) => readQuestion(new URLSearchParams(text), today);

describe('the question of an address', () => {
  it('is about today’s day in this year without any words, and 29 February is the 28th', () => {
    expect(read('')).toEqual({
      way: 'day',
      from: { month: 2, day: 28 },
      to: null,
      oldMarker: null,
      oldPhenomenon: 'heliacal-rising',
      since: 1500,
      year: 2027,
      show: 'easy',
    });
  });

  it('comes back as it was written, and leaves the rest of the address alone', () => {
    const address = 'calendar=c&entry=e&placeId=p';
    const question = {
      ...read(''),
      way: 'old' as const,
      to: { month: 3, day: 9 },
      oldMarker: 'hr2491',
      oldPhenomenon: 'heliacal-setting' as const,
      since: -1000,
      year: 2030,
      show: 'all' as const,
    };
    const written = writeQuestion(new URLSearchParams(address), question);
    expect(readQuestion(written, today)).toEqual(question);
    expect(readForEntry(written)).toEqual({ calendarId: 'c', entryId: 'e' });
    expect(written.get('placeId')).toBe('p');
  });

  it.each(['year=1', 'year=soon', 'from=13-01', 'from=02-31', 'old=%20', 'its=nothing', 'since=9999'])(
    'survives %s: every address opens',
    (text) => {
      const question = read(text);
      expect(question.year).toBe(2027);
      expect(question.since).toBeLessThan(question.year);
      expect(question.from.day).toBeLessThanOrEqual(28);
    },
  );

  it('is one that the server takes, for a day, for some days and for an old sign', () => {
    for (const text of ['from=06-07', 'from=12-20&to=01-10', 'by=old&old=pleiades&since=1500']) {
      expect(finderQuery.safeParse(askedOf(read(text))).success, text).toBe(true);
    }
    expect(askedOf(read('by=old'))).toBeNull();
  });
});
