/** What of a window is moved: the whole of it, its first day or its last. */
export type MovePart = 'all' | 'start' | 'end';

/** So near an end a finger means the end. */
const EDGE_PX = 12;
/** A bar must keep this much in its middle to be caught whole. */
const MIDDLE_PX = 20;

/** The part of a bar under a finger, both in pixels from the bar's start. */
export function partAt(xPx: number, widthPx: number): MovePart {
  if (widthPx < 2 * EDGE_PX + MIDDLE_PX) return 'all';
  if (xPx < EDGE_PX) return 'start';
  return xPx > widthPx - EDGE_PX ? 'end' : 'all';
}

/** Whole days of a way in pixels: what is dragged snaps to days. */
export function daysDragged(wayPx: number, pxPerDay: number): number {
  return pxPerDay > 0 ? Math.round(wayPx / pxPerDay) + 0 : 0;
}

/** What a key moves: a day, with Shift ten; null for every other key. */
export function daysOfKey(key: string, withShift: boolean): number | null {
  const step = withShift ? 10 : 1;
  if (key === 'ArrowLeft') return -step;
  return key === 'ArrowRight' ? step : null;
}
