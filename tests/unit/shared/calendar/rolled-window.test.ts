import { describe, expect, it } from 'vitest';
import { rolledWindow, sameDayLater } from '#shared/calendar/rolled-window.js';
import type { EntryWindow } from '#shared/calendar/entry-model.js';

const window = (bestFrom: string, changes: Partial<EntryWindow> = {}): EntryWindow => ({
  earliest: bestFrom,
  bestFrom,
  bestTo: bestFrom,
  lastAdvised: bestFrom,
  lastAdvisedBy: 'offset',
  ...changes,
});

describe('a window of the next year', () => {
  it('stays within three days, a leap day included', () => {
    expect(rolledWindow(window('2027-06-12'), window('2028-06-11'), 1)).toEqual({
      outcome: 'stays',
      movedDays: -1,
    });
    expect(rolledWindow(window('2027-06-12'), window('2028-06-15'), 1).outcome).toBe('stays');
  });

  it('has moved from four days on, to either side', () => {
    expect(rolledWindow(window('2027-06-12'), window('2028-06-16'), 1)).toEqual({
      outcome: 'moved',
      movedDays: 4,
    });
    expect(rolledWindow(window('2027-06-12'), window('2028-06-08'), 1).movedDays).toBe(-4);
  });

  it('tells of whichever of its days moved most', () => {
    const after = window('2028-06-12', { lastAdvised: '2028-06-22' });
    expect(rolledWindow(window('2027-06-12'), after, 1)).toEqual({ outcome: 'moved', movedDays: 10 });
  });

  it('counts over the end of the year', () => {
    expect(rolledWindow(window('2027-12-30'), window('2029-01-01'), 1).movedDays).toBe(2);
  });

  it('says that days were lost, found, or are missing in both years, and never a number for it', () => {
    expect(rolledWindow(window('2027-06-12'), null, 1)).toEqual({ outcome: 'lost-days', movedDays: null });
    expect(rolledWindow(null, window('2028-06-12'), 1)).toEqual({ outcome: 'found-days', movedDays: null });
    expect(rolledWindow(null, null, 1)).toEqual({ outcome: 'without-days', movedDays: null });
  });

  it('takes the 28th for a 29 February that is not there', () => {
    expect(sameDayLater('2028-02-29', 1)).toBe('2029-02-28');
    expect(sameDayLater('2028-02-29', 4)).toBe('2032-02-29');
  });
});
