import { describe, expect, it } from 'vitest';
import type { EntryInput } from '#shared/contracts/calendars.js';
import { contentOf, draftOf } from '#src/features/calendars/model/entry-draft.js';
import { takenIn } from '#src/features/calendars/model/take-in.js';
import { content, entryOf, tazimelMarkers } from '#tests/support/draft-of-tazimel.js';
import { wholeRecord } from '#tests/support/event-record.js';

const markers = await tazimelMarkers();
const theirs = (changes: Partial<EntryInput>) => ({ ...entryOf(markers, 1, changes), version: 2 });
const edit = (changes: Partial<EntryInput>) => ({
  ...{ draft: draftOf(content(changes)), base: content(), baseVersion: 1, keptAt: '2027-06-07T09:00:00Z' },
});

describe('a newer state under what somebody writes', () => {
  it('comes in where only the other changed something; what is being written stays', () => {
    const laid = takenIn(edit({ notes: 'All terraces' }), theirs({ crop: 'millet' }));
    expect(laid).toMatchObject({ baseVersion: 2, base: { crop: 'millet' } });
    expect(laid && contentOf(laid.draft)).toEqual(content({ notes: 'All terraces', crop: 'millet' }));
  });

  it('lays what only the other changed in the record under what is being written there', () => {
    const record = wholeRecord();
    const base = content({ record });
    const mine = { ...record, work: { ...record.work, owns: 'each house' } };
    const saved = { ...record, heard: { ...record.heard, where: 'hall' } };
    const laid = takenIn({ ...edit({ record: mine }), base }, theirs({ record: saved }));
    expect(laid && contentOf(laid.draft).record).toEqual({ ...mine, heard: saved.heard });
  });

  it('brings its lead with all that belongs to it, and leaves another last date that waits in the form', () => {
    const lead = { type: 'fixed-date', date: { month: 6, day: 24 }, source: 'office' } as const;
    const waiting = edit({ notes: 'All terraces' });
    waiting.draft.lastDate = { date: { month: 7, day: 5 }, source: 'letter' };
    const laid = takenIn(waiting, theirs({ lead }));
    expect(laid?.draft).toMatchObject({ leadType: 'fixed-date', lastDate: { source: 'letter' } });
    expect(laid && contentOf(laid.draft).lead).toEqual(lead);
  });

  it('is a person’s to decide where both changed the same part, or where nobody knows what it began from', () => {
    expect(takenIn(edit({ crop: 'beans' }), theirs({ crop: 'millet' }))).toBeNull();
    expect(takenIn({ ...edit({}), base: null }, theirs({ crop: 'millet' }))).toBeNull();
  });

  it('is nothing to decide where both wrote the same', () => {
    const laid = takenIn(edit({ crop: 'millet' }), theirs({ crop: 'millet' }));
    expect(laid && contentOf(laid.draft)).toEqual(content({ crop: 'millet' }));
  });
});
