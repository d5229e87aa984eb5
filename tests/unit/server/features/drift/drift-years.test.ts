import { describe, expect, it } from 'vitest';
import { driftYears } from '#server/features/drift/drift-years.js';

describe('the years of a drift', () => {
  it('are round, with the ends as asked', () => {
    expect(driftYears(1493, 1512).slice(0, 3)).toEqual([1493, 1494, 1495]);
    expect(driftYears(-7, 1000).slice(0, 3)).toEqual([-7, 0, 20]);
  });

  it('hold one more year where it is wanted and lies between them', () => {
    expect(driftYears(1000, 2100, 2027)).toContain(2027);
    expect(driftYears(1000, 2100, 2027).length).toBeLessThanOrEqual(101);
    expect(driftYears(1000, 2100, 2500)).not.toContain(2500);
  });

  it('are never more than a hundred and one, for any stretch, and ascend', () => {
    for (const span of [1, 99, 100, 101, 480, 995, 1000, 2027, 4999, 6000]) {
      const years = driftYears(-3000, -3000 + span);
      expect(years.length).toBeLessThanOrEqual(101);
      expect(years.at(-1)).toBe(-3000 + span);
      expect(years.every((year, index) => index === 0 || year > (years[index - 1] ?? 0))).toBe(true);
    }
  });
});
