import { describe, expect, it } from 'vitest';
import { idsByDate, moved } from '#src/features/calendars/model/entry-order.js';
import type { ShownEntry } from '#src/features/calendars/model/preview-dates.js';
import { entryOf, tazimelMarkers } from '#tests/support/draft-of-tazimel.js';

const markers = await tazimelMarkers();
const shown = (id: number, month: number | null): ShownEntry => {
  const lead = { type: 'fixed-date' as const, date: { month: month ?? 1, day: 1 }, source: 'office' };
  const saved = entryOf(markers, id, { lead });
  const dates = month === null ? { ...saved.dates, window: null } : saved.dates;
  return { id: String(id), saved, content: saved.content, dates, unsaved: false };
};

describe('the order of entries', () => {
  it('moves one and keeps the others in theirs', () => {
    expect(moved(['a', 'b', 'c', 'd'], 0, 2)).toEqual(['b', 'c', 'a', 'd']);
    expect(moved(['a', 'b', 'c', 'd'], 3, 0)).toEqual(['d', 'a', 'b', 'c']);
    expect(moved(['a', 'b'], 1, 2)).toEqual(['a', 'b']);
    expect(moved(['a', 'b'], 5, 0)).toEqual(['a', 'b']);
  });

  it('by date follows the year; entries without a date stay behind in theirs', () => {
    expect(idsByDate([shown(1, null), shown(2, 9), shown(3, 4), shown(4, null)])).toEqual([
      '3',
      '2',
      '1',
      '4',
    ]);
  });
});
