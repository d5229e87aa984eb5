import { describe, expect, it } from 'vitest';
import { comingSigns } from '#server/features/today/coming-signs.service.js';
import type { PublishedCalendar } from '#server/features/today/coming-markers.service.js';
import { TAZIMEL } from '#tests/support/stars-of-tazimel.js';

const day = (dayNumber: number) => ({ dayNumber, gregorian: '2027-06-21', julian: '2027-06-08' });
/** 21 June 2027. */
const SOLSTICE = 2_461_578;

function calendar(...titles: string[]): PublishedCalendar {
  const entry = (titleOfficer: string) => ({
    entryId: '0190a3a0-0000-7000-8000-0000000000e1',
    content: {
      titleOfficer,
      lead: { type: 'sky', spec: { kind: 'sun-season', season: 'june-solstice' }, occurrence: 1 },
    },
    dates: {
      marker: { expected: day(SOLSTICE), early: day(SOLSTICE - 3), late: day(SOLSTICE + 3), notes: [] },
    },
  });
  return { header: { place: TAZIMEL }, entries: titles.map(entry) } as unknown as PublishedCalendar;
}

describe('signs of the sky on Today', () => {
  it('are told two weeks ahead, once for all entries that go by them', () => {
    expect(comingSigns([calendar('Hay', 'Feast')], '2027-06-10')).toEqual([
      expect.objectContaining({
        spec: { kind: 'sun-season', season: 'june-solstice' },
        marker: null,
        daysAway: 11,
        leads: ['Hay', 'Feast'],
      }),
    ]);
    expect(comingSigns([calendar('Hay')], '2027-06-06')).toEqual([]);
  });

  it('stay while their range is open, and go with it', () => {
    expect(comingSigns([calendar('Hay')], '2027-06-24')[0]?.daysAway).toBe(-3);
    expect(comingSigns([calendar('Hay')], '2027-06-25')).toEqual([]);
  });
});
