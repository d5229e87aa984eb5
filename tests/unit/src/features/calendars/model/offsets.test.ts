import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { OFFSET_MAX_DAYS, entryOffsets, type EntryOffsets } from '#shared/contracts/calendars.js';
import { endMoved, shifted, startMoved } from '#src/features/calendars/model/offsets.js';

const offsets: EntryOffsets = { earliestDays: 3, bestFromDays: 7, bestToDays: 23, lastAdvisedDays: 28 };

describe('moving a window on the strip', () => {
  it('keeps its shape when all of it moves', () => {
    expect(shifted(offsets, -5)).toEqual({
      earliestDays: -2,
      bestFromDays: 2,
      bestToDays: 18,
      lastAdvisedDays: 23,
    });
  });

  it('stops its ends at the best days', () => {
    expect(startMoved(offsets, 30).earliestDays).toBe(7);
    expect(endMoved(offsets, -30).lastAdvisedDays).toBe(23);
    expect(startMoved(offsets, -2).earliestDays).toBe(1);
    expect(endMoved(offsets, 2).lastAdvisedDays).toBe(30);
  });

  it('never makes a window that cannot be saved', () => {
    const ordered = fc
      .tuple(
        fc.integer({ min: -OFFSET_MAX_DAYS, max: 0 }),
        fc.array(fc.nat(60), { minLength: 3, maxLength: 3 }),
      )
      .map(([first, [a = 0, b = 0, c = 0]]) => ({
        earliestDays: first,
        bestFromDays: first + a,
        bestToDays: first + a + b,
        lastAdvisedDays: first + a + b + c,
      }));
    fc.assert(
      fc.property(ordered, fc.integer({ min: -800, max: 800 }), (start, days) => {
        expect(entryOffsets.safeParse(shifted(start, days)).success).toBe(true);
      }),
      { seed: 7, numRuns: 200 },
    );
  });
});
