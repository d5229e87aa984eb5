import { describe, expect, it } from 'vitest';
import { previewDates, withOverlaps, type ShownEntry } from '#src/features/calendars/model/preview-dates.js';
import { content, entryOf, tazimelMarkers, YEAR } from '#tests/support/draft-of-tazimel.js';

const markers = await tazimelMarkers();

describe('the dates of an entry while it is written', () => {
  it('follow each step of the days', () => {
    const lead = markers.get('pleiades')?.phenomena['heliacal-rising'].occurrences[0]?.expected.dayNumber;
    const one = previewDates(content(), YEAR, markers);
    const moved = content({
      offsets: { earliestDays: 4, bestFromDays: 8, bestToDays: 24, lastAdvisedDays: 29 },
    });
    const other = previewDates(moved, YEAR, markers);
    expect(one?.marker?.expected.dayNumber).toBe(lead);
    expect(Date.parse(other?.window?.bestFrom ?? '') - Date.parse(one?.window?.bestFrom ?? '')).toBe(
      24 * 60 * 60 * 1000,
    );
  });

  it('are cut by a last date as soon as it is written, even while its source is missing', () => {
    const cut = content({ hasLastDate: true, lastDate: { date: { month: 6, day: 20 }, source: '' } });
    expect(previewDates(cut, YEAR, markers)?.window).toMatchObject({
      lastAdvised: '2027-06-20',
      lastAdvisedBy: 'fixed',
    });
  });

  it('are none while no star is chosen, the days are out of order, or the stars are on their way', () => {
    const unchosen = content({
      lead: { type: 'marker', markerKey: '', phenomenon: 'heliacal-rising', occurrence: 1 },
    });
    const disordered = content({
      offsets: { earliestDays: 9, bestFromDays: 0, bestToDays: 7, lastAdvisedDays: 14 },
    });
    expect(previewDates(unchosen, YEAR, markers)).toBeNull();
    expect(previewDates(disordered, YEAR, markers)).toBeNull();
    expect(previewDates(content(), YEAR, null)).toBeNull();
  });

  it('need no stars for a fixed date', () => {
    const fixed = content({ lead: { type: 'fixed-date', date: { month: 7, day: 5 }, source: 'office' } });
    expect(previewDates(fixed, YEAR, null)?.window?.earliest).toBe('2027-07-08');
  });
});

describe('the warning that two entries share', () => {
  const shown = (id: number, changes = {}): ShownEntry => {
    const saved = entryOf(markers, id, changes);
    return { id: saved.id, saved, content: saved.content, dates: saved.dates, unsaved: false };
  };

  it('stands at both, and goes when one of them is changed', () => {
    const both = withOverlaps([shown(1), shown(2)]);
    expect(both.map(({ dates }) => dates?.warnings)).toEqual([['windows-overlap'], ['windows-overlap']]);
    const apart = withOverlaps([...both.slice(0, 1), shown(2, { crop: 'beans' })]);
    expect(apart.map(({ dates }) => dates?.warnings)).toEqual([[], []]);
  });
});
