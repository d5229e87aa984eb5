import { describe, expect, it } from 'vitest';
import { contentOf, differsFrom, draftOf, newDraft } from '#src/features/calendars/model/entry-draft.js';
import { entryInput } from '#shared/contracts/calendars.js';
import { LEAD_WAYS } from '#shared/contracts/entry-lead.js';
import { content } from '#tests/support/draft-of-tazimel.js';

const lastDate = { date: { month: 7, day: 5 }, source: 'agricultural office' };

describe('an entry while it is being written', () => {
  it('comes back as it was saved', () => {
    for (const saved of [
      content(),
      content({ hasLastDate: true, lastDate }),
      content({ lead: { type: 'fixed-date', date: { month: 3, day: 1 }, source: 'the steward' } }),
    ]) {
      expect(contentOf(draftOf(saved))).toEqual(saved);
      expect(differsFrom(draftOf(saved), saved)).toBe(false);
    }
  });

  it('keeps the star while a fixed date is tried, and the last date while its mark is off', () => {
    const draft = draftOf(content({ hasLastDate: true, lastDate }));
    const tried = { ...draft, leadType: 'fixed-date' as const, hasLastDate: false };
    expect(contentOf(tried).lead).toEqual({ type: 'none', way: 'fixed-date' });
    expect(contentOf(tried).lastDate).toBeNull();
    const back = { ...tried, leadType: 'marker' as const, hasLastDate: true };
    expect(contentOf(back)).toEqual(content({ hasLastDate: true, lastDate }));
  });

  it('can be saved before anything is chosen that it goes by, and stays on the way that was picked', () => {
    for (const way of LEAD_WAYS) {
      const draft = { ...newDraft(), titleOfficer: 'Mend the terraces', leadType: way };
      const saved = contentOf(draft);
      expect(saved.lead).toEqual({ type: 'none', way });
      expect(entryInput.safeParse(saved).success).toBe(true);
      expect(draftOf(saved).leadType).toBe(way);
      expect(differsFrom({ ...draftOf(saved), leadType: way === 'sky' ? 'marker' : 'sky' }, saved)).toBe(
        true,
      );
    }
  });

  it('keeps half of a choice from being saved as none', () => {
    const date = { month: 3, day: 1 };
    const half = { ...newDraft(), leadType: 'fixed-date' as const, fixed: { date, source: '' } };
    expect(contentOf(half).lead).toEqual({ type: 'fixed-date', date, source: '' });
  });

  it('is not changed by spaces that are not saved', () => {
    const saved = content({ giver: 'Elder A-1' });
    expect(differsFrom({ ...draftOf(saved), giver: 'Elder A-1 ' }, saved)).toBe(false);
    expect(differsFrom({ ...draftOf(saved), giver: 'Elder A-2' }, saved)).toBe(true);
  });

  it('begins with the star that was chosen on its page', () => {
    const { lead } = contentOf(
      newDraft({ type: 'marker', markerKey: 'hr2491', phenomenon: 'heliacal-setting', occurrence: 1 }),
    );
    expect(lead).toEqual({
      type: 'marker',
      markerKey: 'hr2491',
      phenomenon: 'heliacal-setting',
      occurrence: 1,
    });
  });
});
