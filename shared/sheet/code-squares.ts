import type { Box, RectPrimitive } from './primitives.js';

/** The squares of a code to scan, without the quiet ground around them. */
export interface CodeSquares {
  readonly size: number;
  readonly isDark: (row: number, column: number) => boolean;
}

/** Squares are drawn in runs that overlap by a hair, so that no printer leaves a light line between them. */
const OVERLAP_MM = 0.02;
const QUIET_SQUARES = 4;

/** The dark squares in a square piece of paper, with the quiet ground that readers need around them. */
export function codeSquares(
  { size, isDark }: CodeSquares,
  { x, y, width: sideMm }: Pick<Box, 'x' | 'y' | 'width'>,
): RectPrimitive[] {
  const squareMm = sideMm / (size + 2 * QUIET_SQUARES);
  const quietMm = QUIET_SQUARES * squareMm;
  const runs: RectPrimitive[] = [];
  for (let row = 0; row < size; row += 1) {
    for (let column = 0; column < size; column += 1) {
      if (!isDark(row, column)) continue;
      const from = column;
      while (column + 1 < size && isDark(row, column + 1)) column += 1;
      runs.push({
        type: 'rect',
        role: 'code',
        x: x + quietMm + from * squareMm,
        y: y + quietMm + row * squareMm,
        width: (column - from + 1) * squareMm,
        height: squareMm + OVERLAP_MM,
        fill: 'solid',
        strokeMm: 0,
        cornerMm: 0,
      });
    }
  }
  return runs;
}
