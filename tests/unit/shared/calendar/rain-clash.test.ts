import { describe, expect, it } from 'vitest';
import { rainClashOf } from '#shared/calendar/rain-clash.js';
import { dayNumberFromIso } from '#shared/kernel/iso-date.js';

const months = (...named: number[]) => Array.from({ length: 12 }, (_, index) => named.includes(index + 1));
const clash = (from: string, to: string, rain: boolean[]) =>
  rainClashOf({ from: dayNumberFromIso(from), to: dayNumberFromIso(to) }, rain);

describe('days held against months of rain', () => {
  it('clash wholly, partly or not at all, the last day of a month and the first of the next apart', () => {
    expect(clash('2027-06-01', '2027-06-30', months(6))).toBe('whole');
    expect(clash('2027-05-31', '2027-06-30', months(6))).toBe('partly');
    expect(clash('2027-06-01', '2027-07-01', months(6))).toBe('partly');
    expect(clash('2027-05-20', '2027-05-31', months(6))).toBe('none');
  });

  it('may run over New Year', () => {
    expect(clash('2027-12-20', '2028-01-10', months(12, 1))).toBe('whole');
    expect(clash('2027-12-20', '2028-01-10', months(1))).toBe('partly');
  });

  it('never clash where nobody has said a month', () => {
    expect(clash('2027-01-01', '2027-12-31', months())).toBe('none');
  });
});
