import { describe, expect, it } from 'vitest';
import type { SeenDay } from '#shared/calendar/entry-model.js';
import { entryDatesFromDays, entryDatesOf, inOrder, occurrenceDaysOf } from '#shared/calendar/entry-dates.js';
import { markerYear, occurrence, timing } from '#tests/support/calendar-facts.js';

const june = { expected: '2027-06-07', early: '2027-06-03', late: '2027-06-12' };

describe('an entry that goes by nothing yet', () => {
  it('has no days, and says that nothing is chosen rather than that its year has none', () => {
    const unled = timing({ lead: { type: 'none', way: 'marker' } });
    expect(entryDatesOf(unled, 2027, null)).toMatchObject({ window: null, warnings: ['no-lead-yet'] });
  });
});

describe('an entry that goes by a marker', () => {
  it('counts from the expected day; the range stands beside the window and is not added', () => {
    const sharp = entryDatesOf(timing(), 2027, markerYear({ occurrences: [june] }));
    const vague = entryDatesOf(
      timing(),
      2027,
      markerYear({ occurrences: [{ expected: '2027-06-07', early: '2027-05-20', late: null }] }),
    );
    expect(sharp.window).toEqual({
      earliest: '2027-06-10',
      bestFrom: '2027-06-14',
      bestTo: '2027-06-30',
      lastAdvised: '2027-07-05',
      lastAdvisedBy: 'offset',
    });
    expect(vague.window).toEqual(sharp.window);
    expect(sharp.marker).toMatchObject({
      expected: { gregorian: '2027-06-07' },
      early: { gregorian: '2027-06-03' },
      late: { gregorian: '2027-06-12' },
    });
    expect(vague.marker?.late).toBeNull();
    expect(sharp).toMatchObject({
      starOutcome: 'rises-and-sets',
      phenomenonOutcome: 'dated',
      warnings: [],
    });
  });

  it('counts from the second occurrence where it asks for it', () => {
    const twice = markerYear({
      occurrences: [
        { expected: '2027-01-01', early: null, late: null },
        { expected: '2027-12-31', early: null, late: null },
      ],
    });
    const lead = { ...timing().lead, occurrence: 2 as const };
    const dates = entryDatesOf(timing({ lead: lead as never }), 2027, twice);
    expect(dates.window?.earliest).toBe('2028-01-03');
    expect(dates.warnings).toEqual([]);
  });

  it('has no window and says so where the year has only one occurrence', () => {
    const lead = {
      type: 'marker' as const,
      markerKey: 'pleiades',
      phenomenon: 'heliacal-rising' as const,
      occurrence: 2 as const,
    };
    expect(entryDatesOf(timing({ lead }), 2027, markerYear({ occurrences: [june] }))).toEqual({
      starOutcome: 'rises-and-sets',
      phenomenonOutcome: 'dated',
      marker: null,
      window: null,
      warnings: ['one-occurrence-only'],
    });
  });

  it.each([
    ['none-in-this-year', 'no-date-this-year'],
    ['never-dark-enough', 'star-does-not-serve'],
  ] as const)('has no window where the phenomenon is %s', (phenomenonOutcome, warning) => {
    expect(entryDatesOf(timing(), 2027, markerYear({ phenomenonOutcome }))).toMatchObject({
      phenomenonOutcome,
      window: null,
      marker: null,
      warnings: [warning],
    });
  });

  it.each(['never-sets', 'never-clears-skyline'] as const)('has no window where the star %s', (outcome) => {
    expect(entryDatesOf(timing(), 2027, markerYear({ outcome }))).toMatchObject({
      starOutcome: outcome,
      phenomenonOutcome: null,
      window: null,
      warnings: ['star-does-not-serve'],
    });
  });

  it('warns of what the sky remarks about the star and about the day, and of nothing else', () => {
    const year = markerYear({
      notes: ['never-disappears', 'threshold-extrapolated'],
      occurrences: [{ ...june, notes: ['weak-marker'] }],
    });
    expect(entryDatesOf(timing(), 2027, year).warnings).toEqual(['weak-marker', 'never-disappears']);
  });

  it('refuses the year of another marker or another year', () => {
    expect(() => entryDatesOf(timing(), 2027, markerYear({ markerKey: 'hr2491' }))).toThrow(RangeError);
    expect(() => entryDatesOf(timing(), 2028, markerYear())).toThrow(RangeError);
    expect(() => entryDatesOf(timing(), 2027, null)).toThrow(RangeError);
  });
});

describe('an entry that goes by a fixed date', () => {
  it('needs no sky', () => {
    const fixed = timing({
      lead: { type: 'fixed-date', date: { month: 7, day: 5 }, source: 'agricultural office' },
      offsets: { earliestDays: -4, bestFromDays: -2, bestToDays: 0, lastAdvisedDays: 0 },
    });
    expect(entryDatesOf(fixed, 2027, null)).toEqual({
      starOutcome: null,
      phenomenonOutcome: null,
      marker: null,
      window: {
        earliest: '2027-07-01',
        bestFrom: '2027-07-03',
        bestTo: '2027-07-05',
        lastAdvised: '2027-07-05',
        lastAdvisedBy: 'offset',
      },
      warnings: [],
    });
  });
});

describe('the last date of an entry', () => {
  const lastDate = { date: { month: 6, day: 20 }, source: 'agricultural office' };
  const year = markerYear({ occurrences: [june] });

  it('shortens the window and warns', () => {
    expect(entryDatesOf(timing({ hasLastDate: true, lastDate }), 2027, year)).toMatchObject({
      window: { bestTo: '2027-06-20', lastAdvisedBy: 'fixed' },
      warnings: ['window-shortened-by-last-date'],
    });
  });

  it('closes the window and warns', () => {
    const early = { ...lastDate, date: { month: 6, day: 1 } };
    expect(entryDatesOf(timing({ hasLastDate: true, lastDate: early }), 2027, year)).toMatchObject({
      window: null,
      marker: { expected: { gregorian: '2027-06-07' } },
      warnings: ['window-closed-by-last-date'],
    });
  });

  it('counts only where the entry is marked as having one', () => {
    expect(entryDatesOf(timing({ hasLastDate: false, lastDate }), 2027, year).warnings).toEqual([]);
  });

  it('leaves a protective watch alone', () => {
    const watch = timing({ hasLastDate: true, lastDate, protectiveWatch: true });
    expect(entryDatesOf(watch, 2027, year)).toMatchObject({
      window: { lastAdvised: '2027-07-05' },
      warnings: [],
    });
  });
});

describe('a belief entry', () => {
  it('carries no warning about print: what was agreed stands in the register, and a version does not freeze it', () => {
    const year = markerYear({ occurrences: [june] });
    expect(entryDatesOf(timing({ kind: 'belief' }), 2027, year).warnings).toEqual([]);
  });
});

describe('warnings', () => {
  it('stand once each in the order of their list', () => {
    expect(inOrder(new Set(['windows-overlap', 'weak-marker', 'no-date-this-year'] as const))).toEqual([
      'no-date-this-year',
      'weak-marker',
      'windows-overlap',
    ]);
  });
});

describe('days that a screen has at hand', () => {
  it('give the same answer as the core’s whole result', () => {
    const whole = markerYear({ occurrences: [june], notes: ['weak-marker'] });
    const none = { outcome: 'none-in-this-year' as const, occurrences: [] };
    const { markerKey, year, outcome, notes } = whole;
    const days = {
      ...{ markerKey, year, outcome, notes },
      phenomena: {
        'heliacal-rising': { outcome: 'dated' as const, occurrences: [occurrenceDaysOf(occurrence(june))] },
        'cosmical-setting': none,
        'acronychal-rising': none,
        'heliacal-setting': none,
      },
    };
    expect(entryDatesFromDays(timing(), 2027, days)).toEqual(entryDatesOf(timing(), 2027, whole));
  });
});

describe('an entry that goes by another sign of the sky', () => {
  const spec = { kind: 'noon-sun', passage: 'back', ridgeName: 'the south ridge' } as const;
  const lead = { type: 'sky', spec, occurrence: 1 } as const;
  const days = occurrenceDaysOf(
    occurrence({ expected: '2027-01-06', early: '2027-01-04', late: '2027-01-07' }),
  );
  const sign = { spec, year: 2027, outcome: 'dated', reason: null, occurrences: [days] } as const;

  it('counts from the day of the sign, and keeps nothing of its direction or clock time', () => {
    const told = { ...sign, occurrences: [{ ...days, azimuthDeg: 180, localTime: '11:40' }] };
    const dates = entryDatesFromDays(timing({ lead }), 2027, told);
    expect(dates.window?.earliest).toBe('2027-01-09');
    expect(dates.marker).toEqual(days);
    expect(dates).toMatchObject({ starOutcome: null, phenomenonOutcome: null });
    expect(dates.sky).toEqual({ outcome: 'dated', reason: null });
    expect(dates.warnings).toEqual([]);
  });

  it.each([
    ['sign-not-here', { outcome: 'never-here', reason: 'noon-sun-always-clears' }],
    ['no-date-this-year', { outcome: 'none-in-this-year', reason: 'not-in-this-year' }],
  ] as const)('has no window and warns %s where the sign has no day', (warning, sky) => {
    const dates = entryDatesFromDays(timing({ lead }), 2027, { ...sign, ...sky, occurrences: [] });
    expect(dates).toMatchObject({ window: null, marker: null, warnings: [warning], sky });
  });

  it('says so where the year has the sign only once', () => {
    const second = timing({ lead: { ...lead, occurrence: 2 } });
    expect(entryDatesFromDays(second, 2027, sign).warnings).toEqual(['one-occurrence-only']);
  });

  it('is counted from the day on which people saw it, with the computed counting beside', () => {
    const computed = entryDatesFromDays(timing({ lead }), 2027, sign);
    const asSeen = (seen: SeenDay | null) => timing({ lead: { ...lead, seen } });
    expect(entryDatesFromDays(asSeen(null), 2027, sign)).toEqual(computed);
    const seen = { date: '2027-01-10', by: 'Tirel', agreedBy: 'Elder C-1' };
    const dates = entryDatesFromDays(asSeen(seen), 2027, sign);
    expect(dates.window?.earliest).toBe('2027-01-13');
    expect(dates.marker).toEqual(computed.marker);
    expect(dates.counted).toEqual({
      ...{ basis: 'seen', from: '2027-01-10', to: '2027-01-10' },
      beside: computed.window,
    });
  });

  it('refuses the days of another sign or year: a date must never be lent', () => {
    const other = { ...sign, spec: { ...spec, passage: 'gone' } } as const;
    expect(() => entryDatesFromDays(timing({ lead }), 2027, other)).toThrow(RangeError);
    expect(() => entryDatesFromDays(timing({ lead }), 2028, sign)).toThrow(RangeError);
    expect(() => entryDatesFromDays(timing({ lead }), 2027, null)).toThrow(RangeError);
  });

  it('leaves the text of entries that go by a star as it was before there were such signs', () => {
    const dates = entryDatesOf(timing(), 2027, markerYear({ occurrences: [june] }));
    expect(Object.keys(dates)).not.toContain('sky');
  });
});
