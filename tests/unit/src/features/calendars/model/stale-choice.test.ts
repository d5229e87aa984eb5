import { describe, expect, it } from 'vitest';
import { clashesOf, joined, stillStanding } from '#src/features/calendars/model/stale-choice.js';
import { content } from '#tests/support/draft-of-tazimel.js';
import { wholeRecord } from '#tests/support/event-record.js';

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

describe('two records of one entry', () => {
  const record = wholeRecord();
  const saidBy = (changes: Partial<typeof record.work>) => ({
    ...record,
    work: { ...record.work, ...changes },
  });

  it('differ part by part as well, and are joined from both', () => {
    const before = content({ record });
    const saved = content({
      record: { ...saidBy({ helpers: 'youth' }), heard: { ...record.heard, where: 'hall' } },
    });
    const written = content({ record: saidBy({ helpers: 'work-party', owns: 'each house' }) });
    const clashes = clashesOf(before, saved, written);
    expect(clashes).toEqual([
      { unit: 'record.helpers', first: null },
      { unit: 'record.owns', first: 'mine' },
      { unit: 'record.heard', first: 'theirs' },
    ]);
    expect(joined(clashes, { 'record.helpers': 'mine' }, saved, written)?.record).toEqual({
      ...saidBy({ helpers: 'work-party', owns: 'each house' }),
      heard: { ...record.heard, where: 'hall' },
    });
  });

  it('keep signs, how many are needed and the one that must be there together', () => {
    const fewer = { ...record, signs: { list: record.signs.list.slice(1), needed: 1, mustHave: null } };
    const clashes = clashesOf(null, content({ record }), content({ record: fewer }));
    expect(clashes).toEqual([{ unit: 'record.signs', first: null }]);
    const whole = joined(
      clashes,
      { 'record.signs': 'mine' },
      content({ record }),
      content({ record: fewer }),
    );
    expect(whole?.record).toEqual(fewer);
  });

  it('leave no empty record behind, and take a whole one where the other side has none', () => {
    const [none, some] = [content(), content({ record: saidBy({}) })];
    const clashes = clashesOf(null, some, none);
    const all = (side: 'mine' | 'theirs') => Object.fromEntries(clashes.map(({ unit }) => [unit, side]));
    expect(joined(clashes, all('mine'), some, none)).toEqual(none);
    expect(joined(clashesOf(null, none, some), all('mine'), none, some)).toEqual(some);
  });
});

describe('choices over a text that is saved once more', () => {
  it('stand where the other side did not write again', () => {
    const newer = { ...theirs, ifLate: 'Sow beans.' };
    const choices = { crop: 'mine', ifLate: 'mine', 'record.land': 'theirs' } as const;
    expect(stillStanding(choices, theirs, newer)).toEqual({ crop: 'mine', 'record.land': 'theirs' });
  });
});
