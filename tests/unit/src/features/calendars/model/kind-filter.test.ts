import { describe, expect, it } from 'vitest';
import type { EntryInput } from '#shared/contracts/calendars.js';
import { kindsIn, ofKind } from '#src/features/calendars/model/kind-filter.js';
import type { ShownEntry } from '#src/features/calendars/model/preview-dates.js';
import { content } from '#tests/support/draft-of-tazimel.js';

const entry = (id: string, changes: Partial<EntryInput>): ShownEntry => ({
  ...{ id, saved: null, dates: null, unsaved: false },
  content: content(changes),
});

const OWN = '5f0f7b52-6f0c-4a5e-9a39-0d9c6a3f2b11';
const LIST = [
  entry('a', { kind: 'farm' }),
  entry('b', { kind: 'safety' }),
  entry('c', { kind: 'farm', kindWord: { id: OWN, word: 'Water turn' } }),
  entry('d', { kind: 'farm', kindWord: { word: 'Field work' } }),
];

describe('a list by kinds', () => {
  it('counts each kind; a word of the village’s own is one, a name for a built-in one is not', () => {
    expect(kindsIn(LIST)).toEqual([
      { key: 'farm', kind: 'farm', word: null, count: 2 },
      { key: 'safety', kind: 'safety', word: null, count: 1 },
      { key: OWN, kind: 'farm', word: 'Water turn', count: 1 },
    ]);
  });

  it('shows one kind or all, and never takes the open entry away', () => {
    const ids = (key: string | null, openId: string | null = null) =>
      ofKind(LIST, key, openId).map(({ id }) => id);
    expect(ids(null)).toEqual(['a', 'b', 'c', 'd']);
    expect(ids('farm')).toEqual(['a', 'd']);
    expect(ids(OWN, 'b')).toEqual(['b', 'c']);
  });
});
