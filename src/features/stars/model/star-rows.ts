import type { MarkerRow } from '#shared/contracts/stars.js';
import type { Phenomenon } from '#shared/sky/vocabulary.js';
import type { Searchable } from './star-search.js';

/** A row of the table with its names in words. */
export interface StarRow extends Searchable {
  row: MarkerRow;
  title: string;
  second: string;
}

/** By what a column of dates sorts: the day number of the expected day; undefined goes last. */
export function dayOf(row: MarkerRow, phenomenon: Phenomenon): number | undefined {
  return row.phenomena[phenomenon].occurrences[0]?.expected.dayNumber;
}

/** Nights hidden, where the star hides at all. */
export function hiddenOf(row: MarkerRow): number | undefined {
  return row.notes.includes('never-disappears') ? undefined : (row.nightsHidden ?? undefined);
}
