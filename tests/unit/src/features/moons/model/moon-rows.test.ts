import { describe, expect, it } from 'vitest';
import type { MoonMonth, MoonRow } from '#shared/contracts/moons.js';
import { monthCountOf, moonRowsOf, nextCrescent } from '#src/features/moons/model/moon-rows.js';
import { moonMonth, moonRow, moonRule } from '#tests/support/moon-rows.js';

const START = 2_461_413;
const row = (index: number, month: Partial<MoonMonth> | null = null): MoonRow =>
  moonRow(START + index * 30, month && moonMonth(START + index * 30 + 2, month));

describe('the Moons as rows of holes', () => {
  it('run from each new Moon to the day before the next one', () => {
    const rows = moonRowsOf({ moons: [row(0), row(1)], rule: null });
    expect(rows.map(({ first, last }) => [first, last])).toEqual([
      [START, START + 29],
      [START + 30, START + 59],
    ]);
    expect(rows[0]).toMatchObject({ crescentDay: START + 2, fullDay: START + 15, beginsDay: null });
  });

  it('carry the sign in the one row that it falls in', () => {
    const rule = moonRule(START + 40, 4);
    const rows = moonRowsOf({ moons: [row(0), row(1)], rule });
    expect(rows.map(({ sign }) => sign?.expected ?? null)).toEqual([null, START + 40]);
  });

  it('head the first row and each month 1 with the local year', () => {
    const moons = [
      row(0, { number: 12, localYear: 2026 }),
      row(1, { number: 13, thirteenth: true, localYear: 2026 }),
      row(2, { number: 1, localYear: 2027 }),
    ];
    expect(moonRowsOf({ moons, rule: null }).map(({ opensYear }) => opensYear)).toEqual([2026, null, 2027]);
  });
});

describe('what the numbering makes of a year', () => {
  it('names the month that was put in, the year that most months belong to, and doubt', () => {
    const moons = [
      row(0, { number: 12, localYear: 2026 }),
      row(1, { number: 13, thirteenth: true, localYear: 2026 }),
      row(2, { number: 1, localYear: 2027, holdsSign: true, signNearEdge: true }),
    ];
    const count = monthCountOf({ moons, rule: moonRule(START + 61, 2) });
    expect(count.thirteenth).toBe(moons[1]);
    expect(count.localYear).toBe(2026);
    expect(count.nearEdgeYear).toBe(2027);
    expect(count.crescentMissing).toBe(false);
  });

  it('says when a new Moon stood in for a crescent that is not seen', () => {
    const moons = [row(0, { beginsBy: 'new' })];
    expect(monthCountOf({ moons, rule: moonRule(START, 2) }).crescentMissing).toBe(true);
    expect(monthCountOf({ moons: [row(0)], rule: null })).toMatchObject({
      thirteenth: null,
      localYear: null,
    });
  });
});

describe('the next first crescent', () => {
  it('stays until its range is over', () => {
    const moons = [row(0), row(1)];
    expect(nextCrescent(moons, START + 2)).toBe(moons[0]);
    expect(nextCrescent(moons, START + 3)).toBe(moons[1]);
    expect(nextCrescent(moons, START + 60)).toBeNull();
  });
});
