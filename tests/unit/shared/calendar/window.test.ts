import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { windowOf, type WindowInput } from '#shared/calendar/window.js';
import { dayNumberFromIso } from '#shared/kernel/iso-date.js';

const offsets = { earliestDays: 3, bestFromDays: 7, bestToDays: 23, lastAdvisedDays: 28 };

function windowFrom(lead: string, changes: Partial<WindowInput> = {}) {
  return windowOf({
    leadDayNumber: dayNumberFromIso(lead),
    offsets,
    lastDate: null,
    protectiveWatch: false,
    ...changes,
  });
}

describe('a window without a last date', () => {
  it('is the lead day plus the four offsets', () => {
    expect(windowFrom('2027-06-07')).toEqual({
      window: {
        earliest: '2027-06-10',
        bestFrom: '2027-06-14',
        bestTo: '2027-06-30',
        lastAdvised: '2027-07-05',
        lastAdvisedBy: 'offset',
      },
      lastDateEffect: 'none',
    });
  });

  it('may begin in the year before', () => {
    const early = { earliestDays: -20, bestFromDays: -10, bestToDays: -3, lastAdvisedDays: 0 };
    expect(windowFrom('2027-01-05', { offsets: early }).window).toMatchObject({
      earliest: '2026-12-16',
      bestFrom: '2026-12-26',
      bestTo: '2027-01-02',
      lastAdvised: '2027-01-05',
    });
  });

  it('may end in the year after, over a leap day', () => {
    const watch = { earliestDays: -12, bestFromDays: -8, bestToDays: 77, lastAdvisedDays: 87 };
    expect(windowFrom('2027-12-13', { offsets: watch }).window).toMatchObject({
      earliest: '2027-12-01',
      bestTo: '2028-02-28',
      lastAdvised: '2028-03-09',
    });
  });
});

describe('a fixed last date', () => {
  const fifthOfJuly = { month: 7, day: 5 };

  it('counts where it is earlier than the offset, and cuts the best days', () => {
    expect(windowFrom('2027-06-17', { lastDate: fifthOfJuly })).toEqual({
      window: {
        earliest: '2027-06-20',
        bestFrom: '2027-06-24',
        bestTo: '2027-07-05',
        lastAdvised: '2027-07-05',
        lastAdvisedBy: 'fixed',
      },
      lastDateEffect: 'shortened',
    });
  });

  it('shortens the margin and leaves the best days where it falls behind them', () => {
    const { window, lastDateEffect } = windowFrom('2027-06-10', { lastDate: fifthOfJuly });
    expect(window).toMatchObject({ bestTo: '2027-07-03', lastAdvised: '2027-07-05', lastAdvisedBy: 'fixed' });
    expect(lastDateEffect).toBe('shortened');
  });

  it('never lengthens a window: the earlier of the two counts', () => {
    expect(windowFrom('2027-05-20', { lastDate: fifthOfJuly })).toMatchObject({
      window: { lastAdvised: '2027-06-17', lastAdvisedBy: 'offset' },
      lastDateEffect: 'none',
    });
  });

  it('is the one that is named where both fall on the same day', () => {
    expect(windowFrom('2027-06-07', { lastDate: fifthOfJuly })).toMatchObject({
      window: { lastAdvised: '2027-07-05', lastAdvisedBy: 'fixed' },
      lastDateEffect: 'none',
    });
  });

  it('leaves one best day where it falls on the first of them', () => {
    expect(windowFrom('2027-06-28', { lastDate: fifthOfJuly })).toMatchObject({
      window: { bestFrom: '2027-07-05', bestTo: '2027-07-05', lastAdvised: '2027-07-05' },
      lastDateEffect: 'shortened',
    });
  });

  it('closes the window where no best day is left, although early days are', () => {
    expect(windowFrom('2027-06-29', { lastDate: fifthOfJuly })).toEqual({
      window: null,
      lastDateEffect: 'closed',
    });
  });

  it('closes a window that begins after it, and does not wait for next year', () => {
    expect(windowFrom('2027-07-10', { lastDate: fifthOfJuly }).lastDateEffect).toBe('closed');
    expect(windowFrom('2027-09-01', { lastDate: fifthOfJuly }).lastDateEffect).toBe('closed');
  });

  it('belongs to the next season where that is nearer', () => {
    expect(windowFrom('2027-02-01', { lastDate: fifthOfJuly })).toMatchObject({
      window: { lastAdvised: '2027-03-01', lastAdvisedBy: 'offset' },
      lastDateEffect: 'none',
    });
  });

  it('is taken from the next civil year where the window reaches over the year’s end', () => {
    expect(windowFrom('2027-12-20', { lastDate: { month: 1, day: 10 } })).toMatchObject({
      window: { bestFrom: '2027-12-27', bestTo: '2028-01-10', lastAdvised: '2028-01-10' },
      lastDateEffect: 'shortened',
    });
  });

  it('is taken from this civil year where it cuts such a window before the year’s end', () => {
    expect(windowFrom('2027-12-20', { lastDate: { month: 12, day: 30 } })).toMatchObject({
      window: { bestFrom: '2027-12-27', bestTo: '2027-12-30', lastAdvised: '2027-12-30' },
    });
  });

  it('is taken from the civil year before where the window lies there', () => {
    const before = { earliestDays: -30, bestFromDays: -28, bestToDays: -20, lastAdvisedDays: -15 };
    expect(
      windowFrom('2027-01-10', { offsets: before, lastDate: { month: 12, day: 18 } }).window,
    ).toMatchObject({ bestFrom: '2026-12-13', bestTo: '2026-12-18', lastAdvisedBy: 'fixed' });
  });

  it('closes a window just after the year’s end when it stood just before', () => {
    expect(windowFrom('2027-12-30', { lastDate: { month: 12, day: 31 } }).lastDateEffect).toBe('closed');
  });

  it('cuts a window of a whole year where it first falls into it', () => {
    const whole = { earliestDays: 0, bestFromDays: 0, bestToDays: 365, lastAdvisedDays: 365 };
    expect(windowFrom('2027-07-05', { offsets: whole, lastDate: fifthOfJuly }).window).toMatchObject({
      bestFrom: '2027-07-05',
      lastAdvised: '2027-07-05',
    });
    expect(windowFrom('2027-01-01', { offsets: whole, lastDate: { month: 2, day: 5 } }).window).toMatchObject(
      { lastAdvised: '2027-02-05' },
    );
  });
});

describe('a protective watch', () => {
  it('is never shortened', () => {
    expect(windowFrom('2027-06-17', { lastDate: { month: 7, day: 5 }, protectiveWatch: true })).toMatchObject(
      { window: { lastAdvised: '2027-07-15', lastAdvisedBy: 'offset' }, lastDateEffect: 'none' },
    );
  });
});

describe('whatever the dates', () => {
  const monthDay = fc
    .record({ month: fc.integer({ min: 1, max: 12 }), day: fc.integer({ min: 1, max: 28 }) })
    .map((date) => date);
  const input = fc
    .record({
      leadDayNumber: fc.integer({ min: dayNumberFromIso('1900-01-01'), max: dayNumberFromIso('2200-12-31') }),
      earliestDays: fc.integer({ min: -366, max: 1 }),
      steps: fc.tuple(fc.nat(121), fc.nat(121), fc.nat(121)),
      lastDate: monthDay,
    })
    .map(({ leadDayNumber, earliestDays, steps, lastDate }) => ({
      leadDayNumber,
      offsets: {
        earliestDays,
        bestFromDays: earliestDays + steps[0],
        bestToDays: earliestDays + steps[0] + steps[1],
        lastAdvisedDays: earliestDays + steps[0] + steps[1] + steps[2],
      },
      lastDate,
      protectiveWatch: false,
    }));

  it('a last date only ever takes days away, and no advised day lies behind one that fell into the window', () => {
    fc.assert(
      fc.property(input, (given) => {
        const { window: free } = windowOf({ ...given, lastDate: null });
        const { window, lastDateEffect } = windowOf(given);
        if (free === null) return expect.fail('a window without a last date is never closed');
        if (window === null) {
          expect(lastDateEffect).toBe('closed');
          return;
        }
        expect(window.earliest).toBe(free.earliest);
        expect(window.bestFrom).toBe(free.bestFrom);
        expect(window.bestTo <= free.bestTo).toBe(true);
        expect(window.lastAdvised <= free.lastAdvised).toBe(true);
        expect(window.earliest <= window.bestFrom).toBe(true);
        expect(window.bestFrom <= window.bestTo).toBe(true);
        expect(window.bestTo <= window.lastAdvised).toBe(true);
        const monthDayText = [given.lastDate.month, given.lastDate.day]
          .map((part) => String(part).padStart(2, '0'))
          .join('-');
        for (const year of [window.earliest.slice(0, 4), window.lastAdvised.slice(0, 4)]) {
          const date = `${year}-${monthDayText}`;
          expect(date >= window.earliest && date < window.lastAdvised).toBe(false);
        }
      }),
      { numRuns: 2000, seed: 13 },
    );
  });
});
