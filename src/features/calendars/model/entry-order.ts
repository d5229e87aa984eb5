import type { ShownEntry } from './preview-dates.js';

/** The list with one item put at another place; unchanged where there is no such place. */
export function moved<T>(items: readonly T[], from: number, to: number): T[] {
  const item = items[from];
  if (item === undefined || to < 0 || to >= items.length) return [...items];
  const others = items.filter((_, index) => index !== from);
  return [...others.slice(0, to), item, ...others.slice(to)];
}

/** Ids in the order in which the year brings them; entries without a date stay behind, in their order. */
export function idsByDate(entries: readonly ShownEntry[]): string[] {
  const day = (entry: ShownEntry) => entry.dates?.window?.earliest ?? '9999-12-31';
  const bestDay = (entry: ShownEntry) => entry.dates?.window?.bestFrom ?? '9999-12-31';
  return [...entries]
    .sort((a, b) => compare(day(a), day(b)) || compare(bestDay(a), bestDay(b)))
    .map(({ id }) => id);
}

function compare(a: string, b: string): number {
  return a < b ? -1 : a > b ? 1 : 0;
}
