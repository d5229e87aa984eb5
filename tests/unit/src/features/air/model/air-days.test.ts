import { describe, expect, it } from 'vitest';
import type { AirOccurrence } from '#shared/contracts/air.js';
import { agreementOf, anchorOf, spreadDays } from '#src/features/air/model/air-days.js';

const day = (dayNumber: number) => ({ dayNumber, gregorian: '2027-06-07', julian: '2027-05-25' });
function occurrence(
  model: (number | null)[],
  rule: { early: number | null; expected: number; late: number | null } | null = {
    early: 4,
    expected: 7,
    late: 12,
  },
): AirOccurrence {
  const [clear = null, ordinary = null, hazy = null] = model.map((one) =>
    one === null ? null : { ...day(one), minutes: 5 },
  );
  return {
    rule: rule && {
      expected: day(rule.expected),
      early: rule.early === null ? null : day(rule.early),
      late: rule.late === null ? null : day(rule.late),
      notes: [],
    },
    ruleClarity: rule && 'ordinary',
    ruleWidth: rule && { halfWidthDeg: 2, byScatterDeg: 2, byModelDeg: 1.4 },
    bySet: { 'three-class': null, 'linear-magnitude': null, 'azimuth-difference': null },
    byModel: { clear, ordinary, hazy },
    nights: [],
  };
}

describe('the days of an occurrence', () => {
  it('spread from the clearest to the haziest air, in either direction', () => {
    expect(spreadDays(occurrence([5, 6, 9]))).toBe(4);
    expect(spreadDays(occurrence([9, 8, 5]))).toBe(4);
    expect(spreadDays(occurrence([7, 7, 7]))).toBe(0);
    expect(spreadDays(occurrence([7, 7, null]))).toBeNull();
  });

  it('of the model lie inside the rule’s range, partly, or outside; both ends belong to it', () => {
    expect(agreementOf(occurrence([4, 8, 12]))).toBe('inside');
    expect(agreementOf(occurrence([3, 8, 12]))).toBe('partly');
    expect(agreementOf(occurrence([13, 14, 20]))).toBe('outside');
    expect(agreementOf(occurrence([13, 14, 20], { early: 4, expected: 7, late: null }))).toBe('inside');
    expect(agreementOf(occurrence([5, 5, 5], null))).toBeNull();
    expect(agreementOf(occurrence([null, null, null]))).toBeNull();
  });

  it('are labelled from the rule’s day, else from the model’s', () => {
    expect(anchorOf(occurrence([5, 6, 7]))?.dayNumber).toBe(7);
    expect(anchorOf(occurrence([null, 6, 7], null))?.dayNumber).toBe(6);
    expect(anchorOf(occurrence([null, null, null], null))).toBeNull();
  });
});
