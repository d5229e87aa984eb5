import { describe, expect, it } from 'vitest';
import { type PassageRule, passagesOf } from '#shared/sky/sky-markers/passages.js';

const NEAREST: PassageRule = {
  toleranceRad: 1,
  expected: 'nearest',
  neighbours: 'apart',
  touchCounts: true,
};

/** Values of consecutive days; null for a day without the moment. */
const samples = (...values: (number | null)[]) =>
  values.map((valueRad, day) => (valueRad === null ? null : { jdUt: day, valueRad }));

describe('passages of a daily quantity', () => {
  it('stand on the day nearest to the goal and last while the eye cannot tell', () => {
    expect(passagesOf(samples(-2.5, -1.6, -0.7, 0.2, 1, 1.9, 2.8), NEAREST)).toEqual([
      { goes: 'up', expected: 3, early: 2, late: 4, turns: false },
    ]);
  });

  it('are never surer than a day to either side', () => {
    expect(passagesOf(samples(-3, -1.5, 0.5, 2, 4), { ...NEAREST, toleranceRad: 0.1 })).toEqual([
      { goes: 'up', expected: 2, early: 1, late: 3, turns: false },
    ]);
  });

  it('stand on the day that is not below where the first or the last such day is asked for', () => {
    const rule: PassageRule = { ...NEAREST, expected: 'not-below', touchCounts: false };
    const found = passagesOf(samples(2, 1.2, 0.4, -0.1, -2, -0.1, 0.4, 2), rule);
    expect(found.map(({ goes, expected }) => [goes, expected])).toEqual([
      ['down', 2],
      ['up', 6],
    ]);
  });

  it('share the turning day where two of them run together, and say that the quantity turns', () => {
    const found = passagesOf(samples(-2, -0.5, 0.3, 0.6, 0.3, -0.5, -2), NEAREST);
    expect(found).toEqual([
      { goes: 'up', expected: 2, early: 1, late: 3, turns: true },
      { goes: 'down', expected: 4, early: 3, late: 5, turns: true },
    ]);
  });

  it('are one where a slow quantity goes to and fro', () => {
    const rule: PassageRule = { ...NEAREST, neighbours: 'together' };
    const found = passagesOf(samples(-2, -0.9, 0.2, -0.3, 0.4, 0.9, 2), rule);
    expect(found).toEqual([{ goes: 'down', expected: 2, early: 1, late: 5, turns: true }]);
  });

  it('count a quantity that turns just short of the goal, where that counts', () => {
    const values = samples(-3, -1.5, -0.4, -0.2, -0.4, -1.5, -3);
    expect(passagesOf(values, NEAREST)).toEqual([
      { goes: null, expected: 3, early: 2, late: 4, turns: true },
    ]);
    expect(passagesOf(values, { ...NEAREST, touchCounts: false })).toEqual([]);
  });

  it('have an open end where the moments break off', () => {
    expect(passagesOf(samples(-2, -0.8, 0.1, null, null), NEAREST)).toEqual([
      { goes: 'up', expected: 2, early: 1, late: null, turns: false },
    ]);
  });

  it('do not take the seam of an angle for a passage', () => {
    expect(passagesOf(samples(2.8, 3.1, -3.1, -2.8), NEAREST)).toEqual([]);
  });
});
