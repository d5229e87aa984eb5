import { describe, expect, it } from 'vitest';
import { askedDays, yearsAround } from '#server/features/finder/wanted-days.js';
import { dayNumberOf } from '#shared/kernel/iso-date.js';

const query = (from?: string, to?: string) => ({
  year: 2027,
  show: 'easy' as const,
  ...(from === undefined ? {} : { from }),
  ...(to === undefined ? {} : { to }),
});

describe('wanted days', () => {
  it('are one day, some days, or a stretch over New Year', () => {
    const day = dayNumberOf(2027, 6, 7);
    expect(askedDays(query('06-07'))).toEqual({ from: day, to: day });
    expect(askedDays(query('12-20', '01-10'))).toEqual({
      from: dayNumberOf(2027, 12, 20),
      to: dayNumberOf(2028, 1, 10),
    });
    expect(askedDays(query())).toBeNull();
  });

  it('span at most three months', () => {
    expect(askedDays(query('03-01', '05-31'))).not.toBeNull();
    expect(() => askedDays(query('03-01', '06-01'))).toThrow();
  });

  it('touch the years that lie within reach', () => {
    const at = (month: number, day: number) => {
      const dayNumber = dayNumberOf(2027, month, day);
      return { from: dayNumber, to: dayNumber };
    };
    expect(yearsAround(at(7, 1), 120)).toEqual([2027]);
    expect(yearsAround(at(1, 5), 120)).toEqual([2026, 2027]);
    expect(yearsAround(at(12, 5), 120)).toEqual([2027, 2028]);
  });
});
