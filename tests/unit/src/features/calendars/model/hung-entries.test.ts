import { describe, expect, it } from 'vitest';
import { isStarLead } from '#shared/calendar/entry-model.js';
import type { EntryLead } from '#shared/contracts/calendars.js';
import { draftOf, contentOf, newDraft } from '#src/features/calendars/model/entry-draft.js';
import { circleTitles } from '#src/features/calendars/model/hung-entries.js';
import type { EntryEdit } from '#src/features/calendars/model/kept-edits.js';
import { shownEntries } from '#src/features/calendars/model/shown-entries.js';
import { content, entryOf, tazimelMarkers, YEAR } from '#tests/support/draft-of-tazimel.js';

const markers = await tazimelMarkers();
const sowing = entryOf(markers, 1, { titleOfficer: 'Sow' });
const weeding = { ...newDraft(), titleOfficer: 'Weed', leadType: 'entry-planned' as const };

function show(edits: [string, EntryEdit['draft']][], saved = [sowing]) {
  const kept = edits.map(([id, draft]): [string, EntryEdit] => [
    id,
    { draft, base: null, baseVersion: null, keptAt: '2027-06-07T06:00:00Z' },
  ]);
  const sources = { newStart: newDraft(), year: YEAR, markers, signs: new Map(), openId: null };
  return shownEntries({ ...sources, saved, edits: new Map(kept) });
}

describe('an entry that is counted from another one, while it is written', () => {
  it('has its days at once, and moves with the other before anything is saved', () => {
    const anchor = { entryId: sowing.id, day: 'bestFrom' as const };
    const [, weed] = show([['new-1', { ...weeding, anchor }]]);
    expect(weed?.dates?.window?.bestFrom).toBe(sowing.dates.window?.bestFrom);
    const offsets = { ...sowing.content.offsets, bestFromDays: 9 };
    const moved = { ...draftOf(sowing.content), offsets };
    const both = show([
      [sowing.id, moved],
      ['new-1', { ...weeding, anchor }],
    ]);
    expect(both[1]?.dates?.window?.bestFrom).toBe(both[0]?.dates?.window?.bestFrom);
    expect(both[1]?.dates?.window?.bestFrom).not.toBe(sowing.dates.window?.bestFrom);
  });

  it('waits for the day on which the other was done', () => {
    const anchor = { entryId: sowing.id, day: 'bestFrom' as const };
    const draft = { ...weeding, leadType: 'entry-actual' as const, anchor };
    expect(show([['new-1', draft]])[1]?.dates?.window).toBeNull();
    const actual = { from: '2027-06-28', to: null, saidBy: 'a keeper', plots: '' };
    const done = { ...sowing, actual: { ...actual, typedBy: 'Beyno', typedAt: sowing.updatedAt } };
    expect(show([['new-1', draft]], [done])[1]?.dates?.window?.bestFrom).toBe('2027-06-28');
  });

  it('names the circle in which it would wait for itself', () => {
    const anchor = { entryId: 'new-1', day: 'bestFrom' as const };
    const turned = { ...draftOf(sowing.content), leadType: 'entry-planned' as const, anchor };
    const shown = show([
      [sowing.id, turned],
      ['new-1', { ...weeding, anchor: { ...anchor, entryId: sowing.id } }],
    ]);
    expect(circleTitles(sowing.id, shown)).toEqual(['Sow', 'Weed', 'Sow']);
    expect(circleTitles(sowing.id, show([]))).toBeNull();
  });
});

describe('a draft of any lead', () => {
  const usual = { from: { month: 5, day: 23 }, to: { month: 5, day: 27 } };
  const { lead } = sowing.content;
  const star = isStarLead(lead) ? lead : null;
  const seen = { date: '2027-06-12', by: 'Tirel', agreedBy: 'Elder A-1' };
  const leads: EntryLead[] = [
    { type: 'nature-sign', name: 'Birch in leaf', usual, source: 'Elder C-2' },
    { type: 'entry-planned', entryId: sowing.id, day: 'lastAdvised' },
    { type: 'entry-actual', entryId: sowing.id },
    ...(star ? [{ ...star, type: 'marker-as-seen' as const, seen }] : []),
  ];

  it.each(leads)('comes back as it was saved: $type', (own) => {
    const saved = content({ lead: own });
    expect(contentOf(draftOf(saved))).toEqual(saved);
  });
});
