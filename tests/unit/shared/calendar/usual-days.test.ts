import { describe, expect, it } from 'vitest';
import { usualDays } from '#shared/calendar/usual-days.js';

const on = (month: number, day: number) => ({ month, day });
const NONE = { from: null, to: null };

describe('the usual days of a sign of nature', () => {
  it('are as they are said', () => {
    const said = { from: on(5, 20), to: on(6, 2) };
    expect(usualDays(said, NONE, { bestFromDays: 3, bestToDays: 9 })).toEqual(said);
    expect(usualDays({ from: on(5, 20), to: null }, NONE, { bestFromDays: 3, bestToDays: 9 })).toEqual({
      ...{ from: on(5, 20), to: on(5, 20) },
    });
  });

  it('else are the best days less as many days as they are counted from it, also over the year’s end', () => {
    const best = { from: on(5, 30), to: on(6, 12) };
    expect(usualDays(NONE, best, { bestFromDays: 5, bestToDays: 10 })).toEqual({
      ...{ from: on(5, 25), to: on(6, 2) },
    });
    const winter = { from: on(1, 4), to: on(1, 20) };
    expect(usualDays(NONE, winter, { bestFromDays: 7, bestToDays: 7 })).toEqual({
      ...{ from: on(12, 28), to: on(1, 13) },
    });
  });

  it('are one day where the end would lie before the beginning, and none where no day is known', () => {
    const best = { from: on(5, 30), to: on(6, 1) };
    expect(usualDays(NONE, best, { bestFromDays: 5, bestToDays: 10 })).toEqual({
      ...{ from: on(5, 25), to: on(5, 25) },
    });
    expect(usualDays(NONE, NONE, { bestFromDays: 5, bestToDays: 10 })).toBeNull();
  });
});
