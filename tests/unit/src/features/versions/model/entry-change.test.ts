import { describe, expect, it } from 'vitest';
import type { EntryComparison } from '#shared/contracts/versions.js';
import { dayNumberFromIso } from '#shared/kernel/iso-date.js';
import { barsSpan, changeWord, differing } from '#src/features/versions/model/entry-change.js';

const field = (name: string) => ({ field: name, before: null, after: null });

function entry(change: EntryComparison['change'], names: string[] = [], windows: [string, string][] = []) {
  const [before, after] = windows.map(([earliest, lastAdvised]) => ({
    dates: { window: { earliest, lastAdvised } },
  }));
  return {
    change,
    fields: names.map(field),
    before: before ?? null,
    after: after ?? null,
  } as unknown as EntryComparison;
}

describe('what became of an entry', () => {
  it('is "words only" where no day can move', () => {
    expect(changeWord(entry('changed', ['notes', 'kind', 'dates.warnings']))).toBe('words');
    expect(changeWord(entry('changed', ['notes', 'offsets']))).toBe('changed');
    expect(changeWord(entry('changed', ['lastDate', 'hasLastDate']))).toBe('changed');
    expect(changeWord(entry('same'))).toBe('same');
    expect(changeWord(entry('added'))).toBe('added');
  });

  it('leaves out what stays', () => {
    expect(differing([entry('same'), entry('added'), entry('changed')])).toHaveLength(2);
  });
});

describe('bars before and now', () => {
  it('stand on the whole months that hold both windows', () => {
    const moved = entry(
      'changed',
      ['dates.window'],
      [
        ['2027-06-10', '2027-07-05'],
        ['2027-05-30', '2027-06-20'],
      ],
    );
    expect(barsSpan(moved)).toEqual({
      first: dayNumberFromIso('2027-05-01'),
      last: dayNumberFromIso('2027-07-31'),
    });
  });

  it('reach over New Year, and are not drawn where no window moves', () => {
    const overNewYear = entry(
      'changed',
      ['dates.window'],
      [
        ['2027-12-20', '2028-02-10'],
        ['2027-12-21', '2028-02-11'],
      ],
    );
    expect(barsSpan(overNewYear)?.last).toBe(dayNumberFromIso('2028-02-29'));
    const words = entry(
      'changed',
      ['notes'],
      [
        ['2027-06-10', '2027-07-05'],
        ['2027-06-10', '2027-07-05'],
      ],
    );
    expect(barsSpan(words)).toBeNull();
    expect(barsSpan(entry('added', ['dates.window']))).toBeNull();
  });
});
