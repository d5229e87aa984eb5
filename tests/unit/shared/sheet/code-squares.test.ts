import { create } from 'qrcode';
import { describe, expect, it } from 'vitest';
import { codeSquares, type CodeSquares } from '#shared/sheet/code-squares.js';

const { modules } = create('https://calendar.example.org/open?page=ABCD-EFGH-JKMN-PQRS-TUVW');
const code: CodeSquares = {
  size: modules.size,
  isDark: (row, column) => modules.get(row, column) === 1,
};
const QUIET_SQUARES = 4;
const paper = { x: 30, y: 70, width: 90 };
const runs = codeSquares(code, paper);
const squareMm = paper.width / (code.size + 2 * QUIET_SQUARES);
const isInked = (xMm: number, yMm: number) =>
  runs.some(({ x, y, width, height }) => x <= xMm && xMm <= x + width && y <= yMm && yMm <= y + height);

describe('the squares of a code on paper', () => {
  it('are dark at the middle of exactly those squares that the code makes dark, quiet ground around them', () => {
    const [read, meant] = [[] as string[], [] as string[]];
    for (let row = -QUIET_SQUARES; row < code.size + QUIET_SQUARES; row += 1) {
      const columns = Array.from(
        { length: code.size + 2 * QUIET_SQUARES },
        (_each, at) => at - QUIET_SQUARES,
      );
      const middle = (at: number) => (at + QUIET_SQUARES + 0.5) * squareMm;
      const isWithin = (at: number) => at >= 0 && at < code.size;
      const line = (isDark: (column: number) => boolean) =>
        columns.map((column) => (isDark(column) ? '#' : '.')).join('');
      read.push(line((column) => isInked(paper.x + middle(column), paper.y + middle(row))));
      meant.push(line((column) => isWithin(row) && isWithin(column) && code.isDark(row, column)));
    }
    expect(read).toEqual(meant);
  });

  it('leave no line of light between two that lie above each other: the upper reaches over the edge', () => {
    const places = Array.from({ length: code.size * (code.size - 1) }, (_each, place) => ({
      row: Math.floor(place / code.size),
      column: place % code.size,
    }));
    const pairs = places.filter(
      ({ row, column }) => code.isDark(row, column) && code.isDark(row + 1, column),
    );
    expect(pairs.length).toBeGreaterThan(0);
    for (const { row, column } of pairs) {
      const edgeMm = paper.y + (row + 1 + QUIET_SQUARES) * squareMm;
      const xMm = paper.x + (column + 0.5 + QUIET_SQUARES) * squareMm;
      const over = runs.filter(
        ({ x, y, width, height }) =>
          x < xMm && xMm < x + width && y < edgeMm - squareMm / 2 && y + height > edgeMm + 0.01,
      );
      expect(over).toHaveLength(1);
    }
  });
});
