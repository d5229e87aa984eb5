import { IMPORT_COLUMNS, type ImportColumn, type TableLine } from '#shared/contracts/imports.js';
import { plainTitle, type KnownTitle } from './column-words.js';
import type { SavedTable } from './read-table.js';

/** For each column of a table, what it is; null for what is left out. */
export type Matching = readonly (ImportColumn | null)[];

/** By the titles alone; of two columns with the same title the first counts. */
export function guessColumns(titles: readonly string[], known: readonly KnownTitle[]): Matching {
  const columnOf = new Map<string, ImportColumn>();
  for (const [title, column] of known) {
    const plain = plainTitle(title);
    if (!columnOf.has(plain)) columnOf.set(plain, column);
  }
  const taken = new Set<ImportColumn>();
  return titles.map((title) => {
    const column = columnOf.get(plainTitle(title));
    if (column === undefined || taken.has(column)) return null;
    taken.add(column);
    return column;
  });
}

/** One column of the table is chosen for something: no other one is that any more. */
export function matchAnew(matching: Matching, index: number, column: ImportColumn | null): Matching {
  return matching.map((each, at) => (at === index ? column : each === column ? null : each));
}

/** The lines as they are sent. */
export function matchedLines({ lines }: SavedTable, matching: Matching): TableLine[] {
  return lines.map(({ line, cells }) => ({
    line,
    cells: Object.fromEntries(
      matching.flatMap((column, index) => {
        const cell = cells[index] ?? '';
        return column === null || cell === '' ? [] : [[column, cell]];
      }),
    ),
  }));
}

/** A choice that was kept for the same titles, as far as it can still be read. */
export function keptMatching(kept: unknown, titles: readonly string[]): Matching | null {
  if (!Array.isArray(kept) || kept.length !== titles.length) return null;
  return kept.map((value) => IMPORT_COLUMNS.find((column) => column === value) ?? null);
}
