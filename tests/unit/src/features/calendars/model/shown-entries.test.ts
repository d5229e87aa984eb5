import { describe, expect, it } from 'vitest';
import { draftOf, newDraft } from '#src/features/calendars/model/entry-draft.js';
import type { EntryEdit } from '#src/features/calendars/model/kept-edits.js';
import { isStale, orphans, shownEntries } from '#src/features/calendars/model/shown-entries.js';
import { entryOf, tazimelMarkers, YEAR } from '#tests/support/draft-of-tazimel.js';

const markers = await tazimelMarkers();
const saved = entryOf(markers, 1);
const start = newDraft();
const edit = (changes = {}, baseVersion: number | null = 1): EntryEdit => ({
  draft: { ...draftOf(saved.content), ...changes },
  base: saved.content,
  baseVersion,
  keptAt: '2027-06-07T06:00:00Z',
});
const show = (edits: Map<string, EntryEdit>, openId: string | null = null) =>
  shownEntries({ saved: [saved], edits, openId, newStart: start, year: YEAR, markers, signs: new Map() });

describe('the entries as they look now', () => {
  it('show what is written and not saved, with the dates it brings', () => {
    const offsets = { earliestDays: 0, bestFromDays: 0, bestToDays: 1, lastAdvisedDays: 2 };
    const [entry] = show(new Map([[saved.id, edit({ offsets })]]));
    expect(entry).toMatchObject({ unsaved: true, content: { offsets } });
    expect(entry?.dates?.window?.bestFrom).toBe(saved.dates.marker?.expected.gregorian);
  });

  it('end with new ones: those that somebody wrote to, and the one that is open', () => {
    const edits = new Map([['new-1', edit({}, null)]]);
    expect(show(edits).map(({ id }) => id)).toEqual([saved.id, 'new-1']);
    expect(show(edits, 'new-2').map(({ id, unsaved }) => [id, unsaved])).toEqual([
      [saved.id, false],
      ['new-1', true],
      ['new-2', false],
    ]);
  });
});

describe('other people’s doing', () => {
  it('makes writing stale only where a newer state was saved', () => {
    expect(isStale(saved, edit())).toBe(false);
    expect(isStale({ ...saved, version: 2 }, edit())).toBe(true);
    expect(isStale({ ...saved, version: 2 }, undefined)).toBe(false);
  });

  it('leaves writing to a taken-out entry as an orphan, never a new entry', () => {
    const edits = new Map([
      ['gone', edit()],
      ['new-1', edit({}, null)],
      [saved.id, edit()],
    ]);
    expect(orphans([saved], edits).map(({ id }) => id)).toEqual(['gone']);
  });
});
