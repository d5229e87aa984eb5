import { describe, expect, it } from 'vitest';
import { boardTiming, safetySideOf, type BoardChoice } from '#shared/calendar/variants.js';
import type { EntryWindow } from '#shared/calendar/entry-model.js';

const days = (earliest: string, bestFrom: string, bestTo: string, lastAdvised: string): EntryWindow => ({
  ...{ earliest, bestFrom, bestTo, lastAdvised },
  lastAdvisedBy: 'offset',
});
const own = days('2027-06-10', '2027-06-14', '2027-06-30', '2027-07-05');
const other = days('2027-06-18', '2027-06-22', '2027-07-08', '2027-07-13');
const plain = { kind: 'farm', hasLastDate: false, protectiveWatch: false, window: own };
const sowing = { ...plain, hasLastDate: true };
const watch = { ...plain, protectiveWatch: true };
const variant = (window: EntryWindow | null = other, isObjection = false) => ({
  variantId: 'by-a-3',
  ...{ isObjection, window },
});
const choose = (changes: Partial<BoardChoice>): BoardChoice => ({
  ...{ shows: 'entry', variantId: null, reason: 'asked at the meeting' },
  ...changes,
});

describe('what the board shows of an entry with variants', () => {
  it('is the entry where nobody chose, the variant where it was chosen, and both as two marks', () => {
    expect(boardTiming(plain, [variant()], null)).toEqual({ window: own, drivenBy: 'entry', beside: [] });
    const chosen = choose({ shows: 'variant', variantId: 'by-a-3' });
    expect(boardTiming(plain, [variant()], chosen)).toEqual({
      window: other,
      drivenBy: 'variant',
      beside: [],
    });
    expect(boardTiming(plain, [variant()], choose({ shows: 'both' }))).toEqual({
      window: own,
      drivenBy: 'entry',
      beside: [{ variantId: 'by-a-3', window: other }],
    });
  });

  it('is the later of the starts and the earlier of the ends where seed, ice, fire or grazing are at stake, whatever was chosen', () => {
    const { window, drivenBy, beside } = boardTiming(sowing, [variant()], choose({ shows: 'entry' }));
    expect(window).toEqual(days('2027-06-18', '2027-06-22', '2027-06-30', '2027-07-05'));
    expect(drivenBy).toBe('later-start-earlier-end');
    expect(beside.map(({ variantId }) => variantId)).toEqual([null, 'by-a-3']);
  });

  it('is the earlier start and the later end for watches against frost, flood and birds', () => {
    const { window, drivenBy } = boardTiming(watch, [variant()], null);
    expect(window).toEqual(days('2027-06-10', '2027-06-14', '2027-07-08', '2027-07-13'));
    expect(drivenBy).toBe('earlier-start-later-end');
  });

  it('is no day at all where the safe days do not meet', () => {
    const late = days('2027-07-10', '2027-07-12', '2027-07-20', '2027-07-25');
    expect(boardTiming(sowing, [variant(late)], null).window).toBeNull();
  });

  it('is what is left of the advised days where the best days do not meet', () => {
    const later = days('2027-06-20', '2027-07-01', '2027-07-10', '2027-07-12');
    expect(boardTiming(sowing, [variant(later)], null).window).toMatchObject({
      ...{ earliest: '2027-06-20', bestFrom: '2027-06-20' },
      ...{ bestTo: '2027-07-05', lastAdvised: '2027-07-05' },
    });
  });

  it('is not moved by an objection, nor by a variant without days this year', () => {
    expect(boardTiming(sowing, [variant(other, true)], null).window).toEqual(own);
    expect(boardTiming(sowing, [variant(null)], null).window).toEqual(own);
  });

  it('never lies between two timings: every day of it is a day that somebody named', () => {
    for (const entry of [plain, sowing, watch]) {
      const { window } = boardTiming(entry, [variant()], choose({ shows: 'both' }));
      const named = [own, other].flatMap((one) => [one.earliest, one.bestFrom, one.bestTo, one.lastAdvised]);
      expect(named).toEqual(expect.arrayContaining([window?.earliest, window?.bestFrom, window?.bestTo]));
    }
  });

  it('takes last dates and safety for narrow, watches for wide, whatever else they are', () => {
    expect(safetySideOf({ ...plain, kind: 'safety' })).toBe('narrow');
    expect(safetySideOf({ ...watch, kind: 'safety' })).toBe('wide');
    expect(safetySideOf(plain)).toBeNull();
  });
});
