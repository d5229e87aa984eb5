import { describe, expect, it } from 'vitest';
import { OFFSET_MAX_DAYS } from '#shared/contracts/calendars.js';
import { movedDays, movedOffsets } from '#src/features/calendars/model/strip-moves.js';

const offsets = { earliestDays: 0, bestFromDays: 2, bestToDays: 9, lastAdvisedDays: 14 };
const days = { earliest: 100, bestFrom: 102, bestTo: 109, lastAdvised: 114 };

describe('a window that is dragged', () => {
  it('keeps its shape as a whole', () => {
    expect(movedDays(days, offsets, 'all', -3)).toEqual({
      ...{ earliest: 97, bestFrom: 99, bestTo: 106, lastAdvised: 111 },
    });
  });

  it('stops at its best days where an end is dragged into them', () => {
    expect(movedDays(days, offsets, 'start', 20).earliest).toBe(days.bestFrom);
    expect(movedDays(days, offsets, 'end', -20).lastAdvised).toBe(days.bestTo);
    expect(movedDays(days, offsets, 'end', 5)).toEqual({ ...days, lastAdvised: 119 });
  });

  it.each(['all', 'start', 'end'] as const)('is shown where letting go (%s) puts it', (part) => {
    for (const by of [-500, -10, -1, 1, 10, 500]) {
      const put = movedOffsets(offsets, part, by);
      expect(movedDays(days, offsets, part, by)).toEqual({
        earliest: days.earliest + put.earliestDays,
        bestFrom: 100 + put.bestFromDays,
        bestTo: 100 + put.bestToDays,
        lastAdvised: 100 + put.lastAdvisedDays,
      });
      expect(Math.max(...Object.values(put).map(Math.abs))).toBeLessThanOrEqual(OFFSET_MAX_DAYS);
    }
  });
});
