import { describe, expect, it } from 'vitest';
import type { LookedEntry } from '#shared/contracts/decades.js';
import { dayNumberOf } from '#shared/kernel/iso-date.js';
import { bestFromRange, monthsOf, spanIn } from '#src/features/decades/model/year-rows.js';

const entry = (bestFroms: readonly (string | null)[]): LookedEntry => ({
  ...{ entryId: '0190a3a0-0000-7000-8000-000000000001', titleVillage: '', titleOfficer: 'Sow', icon: 'sow' },
  ...{ kind: 'farm', protectiveWatch: false },
  years: bestFroms.map((bestFrom, index) => ({
    ...{ year: 2027 + index, isPlanned: false, warnings: [] },
    window:
      bestFrom === null
        ? null
        : { earliest: bestFrom, bestFrom, bestTo: bestFrom, lastAdvised: bestFrom, lastAdvisedBy: 'offset' },
  })),
});

describe('years under each other', () => {
  it('share the months that hold the days of all of them, also before New Year', () => {
    expect(monthsOf(entry(['2027-06-14', '2028-05-30']))).toEqual({ first: 4, last: 5 });
    const months = monthsOf(entry(['2026-12-28', '2028-01-05']));
    expect(months).toEqual({ first: -1, last: 0 });
    expect(spanIn(2028, { first: -1, last: 0 })).toEqual({
      first: dayNumberOf(2027, 12, 1),
      last: dayNumberOf(2028, 1, 31),
    });
    expect(monthsOf(entry([null]))).toBeNull();
  });

  it('tell between which days the best days begin, by the day of the civil year', () => {
    const range = bestFromRange(entry(['2027-06-14', '2028-06-12', null, '2030-06-20']));
    expect([range?.first.year, range?.last.year, range?.yearsWithout]).toEqual([2028, 2030, 1]);
    expect(bestFromRange(entry([null, null]))).toBeNull();
  });
});
