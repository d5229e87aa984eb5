import { describe, expect, it } from 'vitest';
import { FIRST_PART, foundBy, LIST_PART, partWith } from '#src/features/calendars/model/list-part.js';
import type { ShownEntry } from '#src/features/calendars/model/preview-dates.js';
import { content } from '#tests/support/draft-of-tazimel.js';

const named = (id: string, titleOfficer: string, crop = ''): ShownEntry => ({
  ...{ id, saved: null, dates: null, unsaved: false },
  content: content({ titleOfficer, titleVillage: '', crop }),
});

describe('a long list', () => {
  it('stays where it is while the open entry is in it, and goes to where it is otherwise', () => {
    const grown = { from: 0, to: 3 * LIST_PART };
    expect(partWith(FIRST_PART, 3)).toBe(FIRST_PART);
    expect(partWith(FIRST_PART, -1)).toBe(FIRST_PART);
    expect(partWith(grown, LIST_PART + 1)).toBe(grown);
    const part = partWith(FIRST_PART, 499);
    expect(part.from).toBeLessThanOrEqual(499);
    expect(part.to).toBeGreaterThan(499);
    expect(part.to - part.from).toBe(LIST_PART);
  });
});

describe('looking for an entry', () => {
  it('finds every word in names and crop, in any order and in any case', () => {
    const entries = [named('a', 'Sow Éleusine', 'long millet'), named('b', 'Weed', 'beans')];
    const ids = (wanted: string) => foundBy(entries, wanted).map(({ id }) => id);
    expect(ids('MILLET sow')).toEqual(['a']);
    expect(ids('e\u0301leusine')).toEqual(['a']);
    expect(ids('millet beans')).toEqual([]);
    expect(ids('  ')).toEqual(['a', 'b']);
  });
});
