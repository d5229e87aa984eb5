import { describe, expect, it } from 'vitest';
import { clashesOf, joined } from '#src/features/calendars/model/stale-choice.js';
import { content } from '#tests/support/draft-of-tazimel.js';

const base = content();
const offsets = (bestFromDays: number) => ({ ...base.offsets, bestFromDays });
const theirs = content({ crop: 'millet', ifLate: 'Ask.', offsets: offsets(8) });
const mine = content({ notes: 'All terraces', ifLate: 'Ask.', offsets: offsets(12) });

describe('two texts of one entry', () => {
  it('differ part by part; what only one of us changed is chosen already', () => {
    expect(clashesOf(base, theirs, mine)).toEqual([
      { unit: 'crop', first: 'theirs' },
      { unit: 'notes', first: 'mine' },
      { unit: 'offsets', first: null },
    ]);
  });

  it('are joined only when everything that both changed is chosen', () => {
    const clashes = clashesOf(base, theirs, mine);
    expect(joined(clashes, {}, theirs, mine)).toBeNull();
    expect(joined(clashes, { offsets: 'mine' }, theirs, mine)).toEqual(
      content({ crop: 'millet', notes: 'All terraces', ifLate: 'Ask.', offsets: offsets(12) }),
    );
    expect(joined(clashes, { offsets: 'theirs', notes: 'theirs' }, theirs, mine)).toEqual(theirs);
  });

  it('keep a last date and its mark together', () => {
    const dated = content({
      hasLastDate: true,
      lastDate: { date: { month: 7, day: 5 }, source: 'office' },
    });
    const [clash, ...more] = clashesOf(null, dated, base);
    expect(clash).toEqual({ unit: 'lastDate', first: null });
    expect(more).toEqual([]);
    expect(joined(clashesOf(null, dated, base), { lastDate: 'mine' }, dated, base)).toEqual(base);
  });
});
