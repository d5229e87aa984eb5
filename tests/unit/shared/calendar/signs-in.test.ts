import { describe, expect, it } from 'vitest';
import { keepingSigns, signsIn, spanOfSeen } from '#shared/calendar/signs-in.js';
import { dayNumberFromIso } from '#shared/kernel/iso-date.js';

const day = dayNumberFromIso;
const NO_DAYS = { leadDays: null, graceDays: null };
const window = { earliest: '2027-06-10', lastAdvised: '2027-07-05' };
const soil = { sharedId: 'soil' };
const frogs = { sharedId: 'frogs' };
const own = {};

describe('the days in which seeing a sign counts', () => {
  it('begin sixty days before the earliest day and end with the last advised one', () => {
    expect(spanOfSeen(window, 2027, NO_DAYS)).toEqual({ first: day('2027-04-11'), last: day('2027-07-05') });
  });

  it('begin sooner where people get ready sooner, and last through the days of grace', () => {
    expect(spanOfSeen(window, 2027, { leadDays: 90, graceDays: 5 })).toEqual({
      first: day('2027-03-12'),
      last: day('2027-07-10'),
    });
  });

  it('reach over New Year with a window that does', () => {
    const overNewYear = { earliest: '2027-12-01', lastAdvised: '2028-03-10' };
    expect(spanOfSeen(overNewYear, 2027, NO_DAYS).last).toBe(day('2028-03-10'));
  });

  it('are the calendar’s year for an event without days', () => {
    expect(spanOfSeen(null, 2027, NO_DAYS)).toEqual({ first: day('2027-01-01'), last: day('2027-12-31') });
  });
});

describe('how many signs are in', () => {
  const span = spanOfSeen(window, 2027, NO_DAYS);
  const seen = (...which: ('soil' | 'frogs')[]) =>
    new Map<string, number[]>([
      ['soil', which.includes('soil') ? [day('2027-06-12')] : []],
      ['frogs', which.includes('frogs') ? [day('2027-06-12')] : []],
    ]);
  const signs = { list: [soil, frogs, own], needed: 2, mustHave: 0 };

  it('is enough with the must-have sign and as many as are needed', () => {
    expect(signsIn(signs, seen('soil', 'frogs'), span)).toEqual({
      ...{ isIn: [true, true, null], inCount: 2, needed: 2, total: 3, missingMust: null },
      state: 'signs-are-in',
    });
  });

  it('counts one in the entry’s own words once it was saved, whether it was seen yet or not', () => {
    const saved = { list: [{ ownId: 'foam' }, own], needed: 1, mustHave: null };
    expect(signsIn(saved, new Map(), span)).toMatchObject({ isIn: [false, null], state: 'prepare' });
    const days = new Map([['foam', [day('2027-06-12')]]]);
    expect(signsIn(saved, days, span)).toMatchObject({ isIn: [true, null], state: 'signs-are-in' });
  });

  it('is never enough without the must-have sign', () => {
    const without = { ...signs, needed: 1 };
    expect(signsIn(without, seen('frogs'), span)).toMatchObject({ missingMust: 0, state: 'prepare' });
  });

  it('is not enough with the must-have sign alone where more are needed', () => {
    expect(signsIn(signs, seen('soil'), span)).toMatchObject({ inCount: 1, state: 'prepare' });
  });

  it('waits for all of them where no number is said', () => {
    const all = { list: [soil, frogs], needed: null, mustHave: null };
    expect(signsIn(all, seen('soil'), span)?.state).toBe('prepare');
    expect(signsIn(all, seen('soil', 'frogs'), span)?.state).toBe('signs-are-in');
  });

  it('does not count a day of another season', () => {
    const last = new Map([['soil', [day('2026-06-12'), day('2027-07-06')]]]);
    expect(signsIn({ list: [soil], needed: 1, mustHave: null }, last, span)?.inCount).toBe(0);
  });

  it('is nothing to speak of where no sign is named', () => {
    expect(signsIn({ list: [], needed: null, mustHave: null }, new Map(), span)).toBeNull();
  });
});

describe('a list that loses signs', () => {
  const signs = { list: [soil, frogs, own], needed: 3, mustHave: 2 };

  it('keeps the must-have sign at its new place and needs no more than are left', () => {
    expect(keepingSigns(signs, (_one, place) => place !== 0)).toEqual({
      ...{ list: [frogs, own], needed: 2, mustHave: 1 },
    });
  });

  it('has no must-have sign any more where that one goes', () => {
    expect(keepingSigns(signs, (_one, place) => place !== 2).mustHave).toBeNull();
  });

  it('needs nothing where nothing is left', () => {
    expect(keepingSigns(signs, () => false)).toEqual({ list: [], needed: null, mustHave: null });
  });
});
