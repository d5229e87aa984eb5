import type { Box } from './primitives.js';

/** The year board: a row of holes for every month, joined from nine sheets of A4 that lie on their side. */
export const TILE_PAGE_WIDTH_MM = 297;
export const TILE_PAGE_HEIGHT_MM = 210;
export const BOARD_PITCH_MM = 22;
export const BOARD_ROW_MM = 38;
export const LABEL_COLUMN_MM = 80;
/** Wider than any office printer's blank edge. */
export const FLAP_MM = 12;

const TRIM_LEFT_MM = 12.5;
const TRIM_TOP_MM = 22.5;
/** Whole columns and whole rows only, so that no seam can meet a hole, a number or a word. */
const COLUMN_SPLIT = [
  { from: 1, to: 8 },
  { from: 9, to: 20 },
  { from: 21, to: 31 },
] as const;
const ROW_SPLIT = [
  { from: 1, to: 4 },
  { from: 5, to: 8 },
  { from: 9, to: 12 },
] as const;

export interface Tile {
  /** Row, then column, counted from the top left. */
  readonly code: string;
  readonly row: number;
  readonly column: number;
  readonly rows: number;
  readonly columns: number;
  readonly firstDay: number;
  readonly lastDay: number;
  readonly firstMonth: number;
  readonly lastMonth: number;
  readonly trim: Box;
  readonly hasLabels: boolean;
  /** The neighbour to the right, or below, is glued over a flap. */
  readonly flapRight: boolean;
  readonly flapBelow: boolean;
}

export function boardTiles(): Tile[] {
  return ROW_SPLIT.flatMap((months, row) =>
    COLUMN_SPLIT.map((days, column): Tile => {
      const hasLabels = column === 0;
      const width = (days.to - days.from + 1) * BOARD_PITCH_MM + (hasLabels ? LABEL_COLUMN_MM : 0);
      return {
        code: `${row + 1}-${column + 1}`,
        row,
        column,
        rows: ROW_SPLIT.length,
        columns: COLUMN_SPLIT.length,
        firstDay: days.from,
        lastDay: days.to,
        firstMonth: months.from,
        lastMonth: months.to,
        trim: {
          x: TRIM_LEFT_MM,
          y: TRIM_TOP_MM,
          width,
          height: (months.to - months.from + 1) * BOARD_ROW_MM,
        },
        hasLabels,
        flapRight: column < COLUMN_SPLIT.length - 1,
        flapBelow: row < ROW_SPLIT.length - 1,
      };
    }),
  );
}

/** Left edge of a day's column on its tile. */
export function columnLeft(tile: Tile, day: number): number {
  return tile.trim.x + (tile.hasLabels ? LABEL_COLUMN_MM : 0) + (day - tile.firstDay) * BOARD_PITCH_MM;
}

export function rowTop(tile: Tile, month: number): number {
  return tile.trim.y + (month - tile.firstMonth) * BOARD_ROW_MM;
}
