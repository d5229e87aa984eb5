import { describe, expect, it } from 'vitest';
import {
  anchoredDates,
  circleFrom,
  hangingOn,
  inAnchorOrder,
  leadForAnotherYear,
  type ActualSpell,
  type AnchorFacts,
  type TimedEntry,
} from '#shared/calendar/anchors.js';
import { entryDatesFromDays } from '#shared/calendar/entry-dates.js';
import type { EntryLead, EntryTiming } from '#shared/calendar/entry-model.js';

const SOWING: EntryLead = { type: 'fixed-date', date: { month: 6, day: 10 }, source: 'the village' };
const planned = (entryId: string): EntryLead => ({ type: 'entry-planned', entryId, day: 'bestFrom' });
const actual = (entryId: string): EntryLead => ({ type: 'entry-actual', entryId });

function entry(id: string, lead: EntryLead, year = 2027): TimedEntry {
  const timing: EntryTiming = {
    ...{ kind: 'farm', crop: '', lead, agreedToPrint: true },
    offsets: { earliestDays: 10, bestFromDays: 14, bestToDays: 21, lastAdvisedDays: 28 },
    ...{ hasLastDate: false, lastDate: null, protectiveWatch: false },
  };
  const hangs = lead.type === 'entry-planned' || lead.type === 'entry-actual';
  return { id, lead, timing, dates: hangs ? null : entryDatesFromDays(timing, year, null) };
}

function facts(done: Record<string, ActualSpell> = {}): AnchorFacts {
  return { actualOf: (id) => done[id] ?? null, mayHang: () => true };
}

function datesOf(entries: TimedEntry[], known = facts(), year = 2027) {
  return (id: string) => anchoredDates(entries, year, known).get(id);
}

describe('the order of what hangs on each other', () => {
  it('puts every entry behind the one it hangs on, however they stand', () => {
    const entries = [entry('store', planned('reap')), entry('reap', planned('sow')), entry('sow', SOWING)];
    expect(inAnchorOrder(entries).map(({ id }) => id)).toEqual(['sow', 'reap', 'store']);
  });

  it('names a circle from the entry and back to it, also where it is its own', () => {
    const entries = [entry('a', planned('b')), entry('b', actual('c')), entry('c', planned('a'))];
    expect(circleFrom('a', entries)).toEqual(['a', 'b', 'c', 'a']);
    expect(circleFrom('c', entries)).toEqual(['c', 'a', 'b', 'c']);
    expect(circleFrom('own', [entry('own', planned('own'))])).toEqual(['own', 'own']);
  });

  it('finds no circle for what only leads into one, and ends', () => {
    const entries = [entry('in', planned('a')), entry('a', planned('b')), entry('b', planned('a'))];
    expect(circleFrom('in', entries)).toBeNull();
  });

  it('says what hangs on an entry', () => {
    const entries = [entry('sow', SOWING), entry('weed', actual('sow')), entry('reap', planned('weed'))];
    expect(hangingOn('sow', entries).map(({ id }) => id)).toEqual(['weed']);
  });
});

describe('days that are counted from another entry', () => {
  it('begin with its planned day, from entry to entry', () => {
    const dates = datesOf([
      entry('reap', planned('weed')),
      entry('weed', planned('sow')),
      entry('sow', SOWING),
    ]);
    // Sowing is best from 24 June, so weeding from 8 July and reaping from 22 July.
    expect(dates('weed')?.window?.bestFrom).toBe('2027-07-08');
    expect(dates('reap')?.window?.bestFrom).toBe('2027-07-22');
    expect(dates('weed')?.counted).toEqual({
      ...{ basis: 'planned', from: '2027-06-24', to: '2027-06-24', beside: null },
    });
  });

  it('wait for the actual day with the planned one as a preview, and are no window', () => {
    const dates = datesOf([entry('sow', SOWING), entry('weed', actual('sow'))]);
    expect(dates('weed')).toMatchObject({
      window: null,
      warnings: ['waits-for-actual-day'],
      counted: { basis: 'waiting', from: null, beside: { bestFrom: '2027-07-08' } },
    });
  });

  it('count early days from the first and late days from the last day on which it was done', () => {
    const done = facts({ sow: { from: '2027-06-28', to: '2027-07-02' } });
    const dates = datesOf([entry('sow', SOWING), entry('weed', actual('sow'))], done);
    expect(dates('weed')).toMatchObject({
      window: {
        ...{
          earliest: '2027-07-08',
          bestFrom: '2027-07-12',
          bestTo: '2027-07-23',
          lastAdvised: '2027-07-30',
        },
      },
      counted: { basis: 'actual', from: '2027-06-28', to: '2027-07-02' },
      warnings: [],
    });
  });

  it('reach over the end of the year', () => {
    const late: EntryLead = { type: 'fixed-date', date: { month: 12, day: 20 }, source: 'the village' };
    const dates = datesOf([entry('sow', late), entry('weed', planned('sow'))]);
    expect(dates('weed')?.window).toMatchObject({ bestFrom: '2028-01-17', lastAdvised: '2028-01-31' });
  });

  it('are none, with the reason, in a circle, on nothing, and on what fewer people see', () => {
    const gone = { window: null, warnings: ['anchor-gone'], counted: { basis: 'gone' } };
    const circle = datesOf([entry('a', planned('b')), entry('b', planned('a'))]);
    expect(circle('a')).toMatchObject(gone);
    expect(datesOf([entry('weed', planned('nowhere'))])('weed')).toMatchObject(gone);
    const kept = { ...facts(), mayHang: () => false };
    expect(datesOf([entry('sow', SOWING), entry('weed', planned('sow'))], kept)('weed')).toMatchObject(gone);
  });

  it('are none where the other has none this year, and say so', () => {
    const sow = { ...entry('sow', SOWING), dates: null };
    expect(datesOf([sow, entry('weed', planned('sow'))])('weed')).toMatchObject({
      ...{ window: null, warnings: ['anchor-without-days'] },
    });
  });
});

describe('a sign of nature', () => {
  const usual = (from: [number, number], to: [number, number]): EntryLead => ({
    ...{ type: 'nature-sign', name: 'the reed caller', source: 'Elder A-1' },
    usual: { from: { month: from[0], day: from[1] }, to: { month: to[0], day: to[1] } },
  });

  it('gives early days from its first usual day and late ones from its last', () => {
    expect(entry('sow', usual([6, 1], [6, 20])).dates).toMatchObject({
      window: { ...{ earliest: '2027-06-11', bestFrom: '2027-06-15', bestTo: '2027-07-11' } },
      counted: { basis: 'usual', from: '2027-06-01', to: '2027-06-20', beside: null },
      marker: null,
    });
  });

  it('may come over New Year', () => {
    expect(entry('sow', usual([12, 20], [1, 10])).dates?.counted).toMatchObject({
      ...{ from: '2027-12-20', to: '2028-01-10' },
    });
  });
});

describe('a lead in another year', () => {
  it('hangs on the entry of that year, and has seen nothing yet', () => {
    const ids = new Map([['sow', 'sow-2028']]);
    expect(leadForAnotherYear(planned('sow'), ids)).toEqual(planned('sow-2028'));
    expect(leadForAnotherYear(actual('sow'), ids)).toEqual(actual('sow-2028'));
    const star = { markerKey: 'pleiades', phenomenon: 'heliacal-rising', occurrence: 1 } as const;
    const seen = { date: '2027-06-12', by: 'Tirel', agreedBy: 'Elder A-1' };
    expect(leadForAnotherYear({ type: 'marker-as-seen', ...star, seen }, ids)).toEqual({
      ...{ type: 'marker-as-seen', ...star, seen: null },
    });
    const moon = { type: 'sky', spec: { kind: 'moon-phase', event: 'full' }, occurrence: 7 } as const;
    expect(leadForAnotherYear({ ...moon, seen }, ids)).toEqual({ ...moon, seen: null });
    const usual = { from: { month: 5, day: 1 }, to: { month: 5, day: 9 } };
    const asTheyAre: EntryLead[] = [
      SOWING,
      { type: 'marker', ...star },
      moon,
      { type: 'nature-sign', name: 'the hoopoe', usual, source: 'the village' },
    ];
    for (const lead of asTheyAre) expect(leadForAnotherYear(lead, ids)).toBe(lead);
    expect(leadForAnotherYear(planned('gone'), ids)).toEqual(planned('gone'));
  });
});
