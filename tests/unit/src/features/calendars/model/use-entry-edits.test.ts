import { describe, expect, it } from 'vitest';
import { draftOf, newDraft } from '#src/features/calendars/model/entry-draft.js';
import { changedEdit } from '#src/features/calendars/model/use-entry-edits.js';
import { entryOf, tazimelMarkers } from '#tests/support/draft-of-tazimel.js';

const saved = entryOf(await tazimelMarkers(), 1);
const now = new Date('2027-06-07T06:00:00Z');

describe('writing over a saved entry', () => {
  it('remembers over which state it was written', () => {
    const edit = changedEdit(undefined, saved, { giver: 'Elder A-1' }, now);
    expect(edit).toMatchObject({
      base: saved.content,
      baseVersion: 1,
      draft: { giver: 'Elder A-1' },
      keptAt: now.toISOString(),
    });
  });

  it('is nothing unsaved any more once it is written back', () => {
    const edit = changedEdit(undefined, saved, { giver: 'x' }, now);
    expect(changedEdit(edit ?? undefined, saved, { giver: saved.content.giver }, now)).toBeNull();
  });

  it('stays unsaved over an older state even where the words are the same, until a person has chosen', () => {
    const edit = changedEdit(undefined, saved, { giver: 'x' }, now) ?? undefined;
    const newer = { ...saved, version: 2 };
    expect(changedEdit(edit, newer, { giver: saved.content.giver }, now)?.baseVersion).toBe(1);
  });

  it('sees what was changed a moment before', () => {
    const first = changedEdit(undefined, saved, { crop: 'beans' }, now) ?? undefined;
    const second = changedEdit(first, saved, ({ crop }) => ({ notes: `for ${crop}` }), now);
    expect(second?.draft).toMatchObject({ crop: 'beans', notes: 'for beans' });
  });
});

describe('a new entry', () => {
  it('takes a kind of the product as well as a word of the village, and gives the word back', () => {
    const kindWord = { id: '0b9f3c1e-6f57-4c39-9b0e-2f6d7a1c5e11', word: 'Work of the water' };
    const own = changedEdit(undefined, newDraft(), { kind: 'safety', kindWord }, now) ?? undefined;
    expect(own?.draft).toMatchObject({ kind: 'safety', kindWord });
    const plain =
      changedEdit(own, newDraft(), { kind: 'herd-fish-gather', kindWord: undefined }, now) ?? undefined;
    expect(plain?.draft.kind).toBe('herd-fish-gather');
    expect(plain?.draft).not.toHaveProperty('kindWord');
    expect(changedEdit(plain, newDraft(), { kind: 'farm', kindWord: undefined }, now)).toBeNull();
  });

  it('is kept from the first change on and has no state that it is written over', () => {
    const start = newDraft({
      type: 'marker',
      markerKey: 'hr2491',
      phenomenon: 'heliacal-rising',
      occurrence: 1,
    });
    expect(changedEdit(undefined, start, {}, now)).toBeNull();
    expect(changedEdit(undefined, start, { titleOfficer: 'Weed' }, now)).toMatchObject({
      base: null,
      baseVersion: null,
      draft: { marker: { markerKey: 'hr2491' }, titleOfficer: 'Weed' },
    });
    expect(draftOf(saved.content).titleOfficer).toBe('Sow long millet');
  });
});
