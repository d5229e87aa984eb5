import type { MarkerRow } from '#shared/contracts/stars.js';
import { fitsSearch, type Searchable } from './star-search.js';

/** Second class and brighter: found without a chart. */
export const GOOD_MARKER_MAG = 2.5;

/**
 * A good marker: bright enough to be found, hidden for a while, and its return sharp within three weeks. That is
 * what a calendar can lean on; everything else stays in the full list.
 */
export function isGoodMarker(row: MarkerRow): boolean {
  const rising = row.phenomena['heliacal-rising'];
  return (
    row.outcome === 'rises-and-sets' &&
    (row.kind !== 'star' || row.vMag <= GOOD_MARKER_MAG) &&
    rising.outcome === 'dated' &&
    rising.occurrences.every((one) => !one.notes.includes('weak-marker')) &&
    !row.notes.some((note) => note === 'never-disappears' || note === 'lost-in-light-nights')
  );
}

/** What the short list shows: good markers, and whatever the village itself has a name for. */
export function isInShortList(row: MarkerRow): boolean {
  return row.kind === 'own-figure' || isGoodMarker(row);
}

/** The village's own figures on top, whatever the order of the rest. */
export function ownFirst<T>(rows: readonly T[], rowOf: (item: T) => MarkerRow): T[] {
  const isOwn = (item: T) => rowOf(item).kind === 'own-figure';
  return [...rows.filter(isOwn), ...rows.filter((item) => !isOwn(item))];
}

/** The brightest stars that never set tell it: where even they are lost for a while, the nights are too light. */
const BRIGHTEST_MAG = 1;

/** Are there nights at this place in which no star can be seen? */
export function hasLightNights(rows: readonly MarkerRow[]): boolean {
  return rows.some(
    (row) =>
      row.kind === 'star' &&
      row.vMag < BRIGHTEST_MAG &&
      row.outcome === 'never-sets' &&
      row.strip.some(({ state }) => state === 'hidden'),
  );
}

export const DOES = [
  'any',
  'dated',
  'never-hidden',
  'never-sets',
  'never-clears-skyline',
  'too-light',
] as const;
/** What the star does at the place, as a choice. */
export type Does = (typeof DOES)[number];

export function doesFit(row: MarkerRow, does: Does): boolean {
  switch (does) {
    case 'any':
      return true;
    case 'dated':
      return Object.values(row.phenomena).some((one) => one.outcome === 'dated');
    case 'never-hidden':
      return row.notes.includes('never-disappears');
    case 'never-sets':
    case 'never-clears-skyline':
      return row.outcome === does;
    case 'too-light':
      return (
        row.notes.includes('lost-in-light-nights') ||
        Object.values(row.phenomena).some((one) => one.outcome === 'never-dark-enough')
      );
  }
}

export interface StarChoice {
  search: string;
  show: 'good' | 'all';
  does: Does;
}

/** Rows to show. A search looks through all stars, also those that are no good markers. */
export function chooseRows(
  rows: readonly MarkerRow[],
  choice: StarChoice,
  searchable: (row: MarkerRow) => Searchable,
): MarkerRow[] {
  const isSearch = choice.search.trim() !== '';
  return rows.filter((row) => {
    if (isSearch) return fitsSearch(searchable(row), choice.search) && doesFit(row, choice.does);
    return (choice.show === 'all' || isInShortList(row)) && doesFit(row, choice.does);
  });
}
