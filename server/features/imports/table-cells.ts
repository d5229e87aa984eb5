import { dateCell, type ImportDateFacts } from '#shared/calendar/import-dates.js';
import type { NamedSign } from '#shared/calendar/import-signs.js';
import type { EntryLead, EntryOffsets } from '#shared/contracts/calendars.js';
import type { MonthDay } from '#shared/contracts/common.js';
import type { ImportColumn, ReadLine, TableLine } from '#shared/contracts/imports.js';
import { DAY_SOURCE, type TableWords, type VillageKinds } from './import-words.js';

/** All that lines are read by. */
export interface TableFacts extends ImportDateFacts, Pick<TableWords, 'kinds' | 'yes'> {
  /** They come before the words of every language. */
  villageKinds: VillageKinds;
}
export type LineProblem = ReadLine['problems'][number];
export type Cells = TableLine['cells'];
/** Another line or entry, as a line names it. */
export type EntryName = Omit<Extract<NamedSign, { type: 'entry' }>, 'type'> & { column: ImportColumn };

export interface Timing {
  lead: EntryLead | null;
  /** What leads instead, to be looked up once every line is known. */
  hangsOn: EntryName | null;
  offsets: EntryOffsets | null;
  problems: LineProblem[];
}

export function cellOf(cells: Cells, column: ImportColumn): string {
  return (cells[column] ?? '').trim();
}

export function sourceOf(cells: Cells): string {
  return cellOf(cells, 'leadSource') || DAY_SOURCE;
}

/** A day of every year; of a ten-day part the last one where an end is meant. */
export function fixedDay(
  text: string,
  facts: ImportDateFacts,
  end: 'first' | 'last' = 'last',
): { date: MonthDay | null; problem: string | null } {
  const read = dateCell(text, facts);
  if (read.kind === 'empty') return { date: null, problem: null };
  if (read.kind === 'day') return { date: read[end], problem: null };
  return { date: null, problem: read.kind === 'problem' ? read.problem : 'date-not-read' };
}
