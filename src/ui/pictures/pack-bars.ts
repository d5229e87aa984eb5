/** A bar with the label under it, in pixels of the picture. */
export interface BarToPlace {
  key: string;
  startPx: number;
  endPx: number;
  labelPx: number;
}

export interface PlacedBar {
  key: string;
  /** Counted from 0, downwards. */
  row: number;
  labelStartPx: number;
  /** What the bar and its label take up together. */
  fromPx: number;
  toPx: number;
}

const GAP_PX = 12;

/**
 * Puts bars into as few rows as their labels allow, each into the first row with room. A label begins at its bar;
 * where it would run over the right edge, it ends at its bar instead.
 */
export function packBars(bars: readonly BarToPlace[], widthPx: number): PlacedBar[] {
  const rows: PlacedBar[][] = [];
  const inOrder = [...bars].sort((a, b) => a.startPx - b.startPx || a.endPx - b.endPx);
  return inOrder.map((bar) => {
    const labelStartPx =
      bar.startPx + bar.labelPx > widthPx ? Math.max(0, bar.endPx - bar.labelPx) : bar.startPx;
    const fromPx = Math.min(bar.startPx, labelStartPx);
    const toPx = Math.max(bar.endPx, labelStartPx + bar.labelPx);
    const free = rows.findIndex((row) =>
      row.every((other) => other.toPx + GAP_PX <= fromPx || toPx + GAP_PX <= other.fromPx),
    );
    const row = free < 0 ? rows.length : free;
    const placed = { key: bar.key, row, labelStartPx, fromPx, toPx };
    (rows[row] ??= []).push(placed);
    return placed;
  });
}
