import { describe, expect, it } from 'vitest';
import { rowAround, stripLines } from '#src/features/stars/model/strip.js';

describe('the table behind a strip', () => {
  it('counts both ends of a run', () => {
    const lines = stripLines([
      { state: 'before-dawn', fromDayNumber: 11, toDayNumber: 20 },
      { state: 'hidden', fromDayNumber: 1, toDayNumber: 10 },
    ]);
    expect(lines.map(({ state, nights }) => [state, nights])).toEqual([
      ['hidden', 10],
      ['before-dawn', 10],
    ]);
  });
});

describe('the row of rings round a date', () => {
  it('holds the range with some days beside it', () => {
    const row = rowAround(100, 105, 112);
    expect(row && row.first <= 97 && row.last >= 115).toBe(true);
  });

  it('is never so short that it says nothing', () => {
    const row = rowAround(104, 105, 106);
    expect(row && row.last - row.first + 1).toBe(16);
  });

  it('stands round the expected day where the ends are not known', () => {
    const row = rowAround(null, 105, null);
    expect(row && row.first < 105 && row.last > 105).toBe(true);
  });

  it('is left out where its rings would melt together', () => {
    expect(rowAround(1, 60, 120)).toBeNull();
  });
});
