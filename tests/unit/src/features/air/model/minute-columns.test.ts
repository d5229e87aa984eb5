import { describe, expect, it } from 'vitest';
import { columnHeightPx } from '#src/features/air/model/minute-columns.js';

describe('the column of a day', () => {
  it.each([
    [0, 0],
    [1, 3],
    [30, 20],
    [60, 40],
    [200, 40],
  ])('of %i minutes is %i px high in a lane of 40', (minutes, height) => {
    expect(columnHeightPx(minutes, 40)).toBe(height);
  });
});
