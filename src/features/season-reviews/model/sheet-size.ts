/** One line of the printed year: how many letters stand in each of its columns. */
export type SheetLine = readonly number[];

export interface SheetSize {
  /** Of the letters, in points. */
  letterPt: number;
  /** False where even the smallest letters need a second page: then there are as many as it takes, in letters to read. */
  isOnePage: boolean;
}

/** Of the five columns, in shares of the page's width; the style sheet says the same. */
export const COLUMN_SHARES = [0.21, 0.14, 0.12, 0.23, 0.3] as const;
const LARGEST_PT = 9.5;
const SMALLEST_PT = 5;
const STEP_PT = 0.25;
/** Where one page is not enough, nothing is won by small letters. */
const ON_MANY_PAGES_PT = 8;
const MM_OF_PT = 25.4 / 72;
/** A4 without its margins. */
const PAGE_WIDTH_MM = 190;
const PAGE_HEIGHT_MM = 272;
/** A letter is about half as wide as it is high; words that do not fit leave room at the end of a line. */
const LETTER_WIDTH = 0.56;
const LINE_HEIGHT = 1.28;
const ROW_ROOM = 0.45;
/** Heading, column heads and the legend, in lines. */
const FRAME_LINES = 8;

/**
 * The largest letters with which a year stands on one page of A4: a village with a dozen entries reads it at arm's length,
 * one with sixty still has it on one sheet, one with hundreds has a small book.
 * @param wide letters of each text that goes over the whole width
 */
export function sheetSize(lines: readonly SheetLine[], wide: readonly number[]): SheetSize {
  for (let letterPt = LARGEST_PT; letterPt >= SMALLEST_PT; letterPt -= STEP_PT) {
    if (heightMm(lines, wide, letterPt) <= PAGE_HEIGHT_MM) return { letterPt, isOnePage: true };
  }
  return { letterPt: ON_MANY_PAGES_PT, isOnePage: false };
}

function heightMm(lines: readonly SheetLine[], wide: readonly number[], letterPt: number): number {
  const letterMm = letterPt * MM_OF_PT * LETTER_WIDTH;
  const inColumn = (letters: number, share: number) =>
    Math.ceil(letters / Math.max(1, Math.floor((PAGE_WIDTH_MM * share) / letterMm - 1)));
  const rows = lines.map(
    (line) =>
      Math.max(1, ...line.map((letters, column) => inColumn(letters, COLUMN_SHARES[column] ?? 1))) + ROW_ROOM,
  );
  const across = wide.map((letters) => inColumn(letters, 1));
  const total = [...rows, ...across].reduce((sum, each) => sum + each, FRAME_LINES);
  return total * letterPt * MM_OF_PT * LINE_HEIGHT;
}
