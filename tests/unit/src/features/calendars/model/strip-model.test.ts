import { describe, expect, it } from 'vitest';
import { dayNumberFromIso } from '#shared/kernel/iso-date.js';
import {
  barsOf,
  besideOf,
  lanesOf,
  pairingOf,
  undatedOf,
  unledOf,
} from '#src/features/calendars/model/strip-model.js';
import type { ShownEntry } from '#src/features/calendars/model/preview-dates.js';
import { entryOf, tazimelMarkers } from '#tests/support/draft-of-tazimel.js';

const markers = await tazimelMarkers();
const shown = (id: number, changes = {}): ShownEntry => {
  const saved = entryOf(markers, id, changes);
  return { id: saved.id, saved, content: saved.content, dates: saved.dates, unsaved: false };
};
const goesBy = (markerKey: string, phenomenon = 'heliacal-rising') => ({
  lead: { type: 'marker', markerKey, phenomenon, occurrence: 1 },
});
const fixed = { lead: { type: 'fixed-date', date: { month: 7, day: 5 }, source: 'office' } };

describe('the year’s strip', () => {
  it('has a lane for each star in use, once, in the order of the entries', () => {
    const entries = [shown(1, goesBy('hr5056')), shown(2, fixed), shown(3), shown(4, goesBy('hr5056'))];
    expect(lanesOf(entries, markers).map(({ markerKey }) => markerKey)).toEqual(['hr5056', 'pleiades']);
    expect(lanesOf(entries, null)).toEqual([]);
  });

  it('has a bar for each window and names what has none', () => {
    const undated = shown(2, goesBy('hr424'));
    const entries = [shown(1, { protectiveWatch: true }), undated];
    const [bar, ...more] = barsOf(entries, ({ content }) => content.titleOfficer);
    expect(more).toEqual([]);
    expect(bar).toMatchObject({ name: 'Sow long millet', kind: 'watch' });
    expect(bar?.days.earliest).toBe(dayNumberFromIso(entries[0]?.dates?.window?.earliest ?? ''));
    const begun: ShownEntry = { ...shown(3), saved: null, dates: null };
    expect(undatedOf([...entries, begun])).toEqual([undated]);
  });

  it('lists what goes by nothing yet by itself, and not a new entry to which nobody wrote', () => {
    const unled = shown(2, { lead: { type: 'none', way: 'marker' } });
    const begun: ShownEntry = { ...unled, id: 'new-x', saved: null, dates: null };
    expect(unledOf([shown(1), unled, begun])).toEqual([unled]);
    expect(unledOf([{ ...begun, unsaved: true }])).toHaveLength(1);
    expect(undatedOf([unled])).toEqual([]);
    expect(barsOf([unled], () => '')).toEqual([]);
  });

  it('names what lies wholly beside the year, and nothing that reaches into it', () => {
    const late = { lead: { type: 'fixed-date', date: { month: 12, day: 30 }, source: 'office' } };
    const offsets = { earliestDays: 1, bestFromDays: 5, bestToDays: 9, lastAdvisedDays: 12 };
    const year = { first: dayNumberFromIso('2027-01-01'), last: dayNumberFromIso('2027-12-31') };
    const reaching = shown(1, { ...late, offsets });
    const after = shown(2, { ...late, offsets: { ...offsets, earliestDays: 2 } });
    expect(besideOf([reaching, after, shown(3), shown(4, goesBy('hr424'))], year)).toEqual([after]);
  });

  it('joins a window to its star’s day, and a fixed date to nothing', () => {
    const one = shown(1);
    expect(pairingOf(one)).toEqual({
      laneKey: 'pleiades',
      dayNumber: one.dates?.marker?.expected.dayNumber,
    });
    expect(pairingOf(shown(2, fixed))).toBeNull();
    expect(pairingOf(null)).toBeNull();
  });
});
