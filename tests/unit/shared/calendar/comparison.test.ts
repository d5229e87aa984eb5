import { describe, expect, it } from 'vitest';
import { compareEntries, compareHeaders } from '#shared/calendar/comparison.js';

const entry = (entryId: string, content: object = {}, dates: object = {}) => ({
  entryId,
  content: { titleOfficer: entryId, offsets: { bestFromDays: 7, bestToDays: 23 }, ...content },
  dates: { window: null, warnings: [] as string[], ...dates },
});

const header = (changes: object = {}) => ({
  schema: 1,
  calendarId: 'c',
  number: 1,
  submittedAt: '2027-01-01T00:00:00.000Z',
  engineVersion: '1.0.0',
  weatherContact: '112',
  markers: ['pleiades'],
  place: { name: 'Upper Tazimel', skyline: [] as object[] },
  ...changes,
});

describe('comparing the entries of two versions', () => {
  it('finds what was added, taken out, changed and kept', () => {
    const compared = compareEntries(
      [entry('kept'), entry('gone'), entry('edited')],
      [entry('edited', { offsets: { bestFromDays: 9, bestToDays: 23 } }), entry('new'), entry('kept')],
    );
    expect(compared.map(({ entryId, change }) => `${entryId} ${change}`)).toEqual([
      'edited changed',
      'new added',
      'kept same',
      'gone removed',
    ]);
    expect(compared[0]?.fields).toEqual([
      {
        field: 'offsets',
        before: { bestFromDays: 7, bestToDays: 23 },
        after: { bestFromDays: 9, bestToDays: 23 },
      },
    ]);
    expect(compared[1]).toMatchObject({ before: null, after: { entryId: 'new' }, fields: [] });
    expect(compared[3]).toMatchObject({ before: { entryId: 'gone' }, after: null, fields: [] });
  });

  it('says that a date moved although the words are the same', () => {
    const moved = { bestFrom: '2027-06-14' };
    expect(compareEntries([entry('a')], [entry('a', {}, { window: moved })])[0]?.fields).toEqual([
      { field: 'dates.window', before: null, after: moved },
    ]);
  });

  it('does not mind the order of members', () => {
    const other = {
      ...entry('a'),
      content: { offsets: { bestToDays: 23, bestFromDays: 7 }, titleOfficer: 'a' },
    };
    expect(compareEntries([entry('a')], [other])[0]?.change).toBe('same');
  });

  it('takes a field that one side does not have as empty', () => {
    expect(compareEntries([entry('a')], [entry('a', { crop: 'millet' })])[0]?.fields).toEqual([
      { field: 'crop', before: null, after: 'millet' },
    ]);
    expect(compareEntries([entry('a')], [entry('a', { crop: null })])[0]?.change).toBe('same');
  });

  it('names the fields in one fixed order', () => {
    const changed = entry(
      'a',
      { titleOfficer: 'z', crop: 'oats' },
      { warnings: ['weak-marker'], window: {} },
    );
    expect(compareEntries([entry('a')], [changed])[0]?.fields.map(({ field }) => field)).toEqual([
      'crop',
      'titleOfficer',
      'dates.warnings',
      'dates.window',
    ]);
  });
});

describe('comparing what two versions rest on', () => {
  it('names place, engine and contacts, but not what every submission has anew', () => {
    const later = header({
      number: 2,
      submittedAt: '2027-02-01T00:00:00.000Z',
      engineVersion: '1.1.0',
      markers: [],
      place: { name: 'Upper Tazimel', skyline: [{ azimuthDeg: 0, altitudeDeg: 3 }] },
    });
    expect(compareHeaders(header(), later, [], [])).toEqual([
      { field: 'engineVersion', before: '1.0.0', after: '1.1.0' },
      { field: 'place.skyline', before: [], after: [{ azimuthDeg: 0, altitudeDeg: 3 }] },
    ]);
    expect(compareHeaders(header(), header({ number: 9 }), [], [])).toEqual([]);
  });

  it('says when the entries that both have stand in another order, whatever came or went', () => {
    expect(compareHeaders(header(), header(), ['a', 'b', 'gone'], ['new', 'b', 'a'])).toEqual([
      { field: 'order', before: ['a', 'b'], after: ['b', 'a'] },
    ]);
    expect(compareHeaders(header(), header(), ['a', 'gone', 'b'], ['a', 'b', 'new'])).toEqual([]);
  });
});
