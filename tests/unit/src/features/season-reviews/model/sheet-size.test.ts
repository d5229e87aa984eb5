import { describe, expect, it } from 'vitest';
import { COLUMN_SHARES, sheetSize, type SheetLine } from '#src/features/season-reviews/model/sheet-size.js';

const LINE: SheetLine = [30, 22, 10, 60, 90];
const year = (entries: number, line: SheetLine = LINE) =>
  sheetSize(
    Array.from({ length: entries }, () => line),
    [],
  );

describe('the size of letters of a printed year', () => {
  it('is large for a dozen entries and smaller for more, always on one page', () => {
    const few = year(12);
    const many = year(40);
    expect(few).toEqual({ letterPt: 9.5, isOnePage: true });
    expect(many.isOnePage).toBe(true);
    expect(many.letterPt).toBeLessThan(few.letterPt);
  });

  it('gets smaller where people say more', () => {
    expect(year(14, [30, 22, 10, 60, 500]).letterPt).toBeLessThan(year(14).letterPt);
  });

  it('goes on over further pages in letters to read where one page does not hold it', () => {
    expect(year(300)).toEqual({ letterPt: 8, isOnePage: false });
  });

  it('shares the whole width among its columns', () => {
    expect(COLUMN_SHARES.reduce((sum, share) => sum + share, 0)).toBeCloseTo(1, 9);
  });
});
