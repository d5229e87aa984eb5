import { describe, expect, it } from 'vitest';
import { submitChecks } from '#src/features/calendars/model/submit-checks.js';
import type { ShownEntry } from '#src/features/calendars/model/preview-dates.js';
import { entryOf, tazimelMarkers } from '#tests/support/draft-of-tazimel.js';

const markers = await tazimelMarkers();
const contacts = { weatherContact: 'call 900', agricultureContact: 'call 901' };
const shown = (id: number, changes = {}, unsaved = false): ShownEntry => {
  const saved = entryOf(markers, id, changes);
  return { id: saved.id, saved, content: saved.content, dates: saved.dates, unsaved };
};

describe('before the draft is submitted', () => {
  it('says everything that is missing at once', () => {
    const bare = { weatherContact: '', agricultureContact: '' };
    expect(submitChecks([], bare, 2).missing).toEqual([
      'already-out',
      'no-entries',
      'no-weather',
      'no-agriculture',
    ]);
  });

  it('names unsaved entries, remarks and farm work without a rule for being late, and lets them go', () => {
    const lastDate = { date: { month: 6, day: 20 }, source: 'Water committee' };
    const shortened = shown(2, { kind: 'household', ifLate: '', hasLastDate: true, lastDate });
    const checks = submitChecks([shown(1, { ifLate: 'Ask.' }, true), shortened, shown(3)], contacts, null);
    expect(checks.missing).toEqual([]);
    expect(checks.unsaved.map(({ id }) => id)).toEqual([shown(1).id]);
    expect(checks.remarked.map(({ id }) => id)).toEqual([shortened.id]);
    expect(checks.withoutLate.map(({ id }) => id)).toEqual([shown(3).id]);
    expect(checks).toMatchObject({ entryCount: 3, markerCount: 1 });
  });

  it('does not count an entry that was never saved', () => {
    const unborn: ShownEntry = { ...shown(4), saved: null, unsaved: true };
    expect(submitChecks([unborn], contacts, null)).toMatchObject({ missing: ['no-entries'], entryCount: 0 });
  });
});
