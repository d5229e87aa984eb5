import { dateCell, type ImportDateFacts } from '#shared/calendar/import-dates.js';
import { isFarOverYearsEnd } from '#shared/calendar/import-window.js';
import type { NamedSign } from '#shared/calendar/import-signs.js';
import type { EntryLead, EntryOffsets } from '#shared/contracts/calendars.js';
import type { MonthDay } from '#shared/contracts/common.js';
import type { RecordSign } from '#shared/contracts/event-record.js';
import type { ImportColumn, ReadLine, TableLine } from '#shared/contracts/imports.js';
import { dayNumberOf, daysInMonth, isoDateOf } from '#shared/kernel/iso-date.js';
import { DAY_SOURCE, type TableWords, type VillageKinds, type VillageOperations } from './import-words.js';

/** All that lines are read by. */
export interface TableFacts extends ImportDateFacts, Pick<TableWords, 'kinds' | 'yes' | 'codes'> {
  /** They come before the words of every language. */
  villageKinds: VillageKinds;
  villageOperations: VillageOperations;
  /** Signs of the village's list that everybody sees, by their names as `plainWords` writes them. */
  listedSigns: ReadonlyMap<string, RecordSign>;
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
): { date: MonthDay | null; year: number | null; problem: string | null } {
  const read = dateCell(text, facts);
  if (read.kind === 'empty') return { date: null, year: null, problem: null };
  if (read.kind === 'day') return { date: read[end], year: read.year, problem: null };
  return { date: null, year: null, problem: read.kind === 'problem' ? read.problem : 'date-not-read' };
}

/** Usual days that are probably the wrong way round. A table of our own says what an entry says, whatever that is. */
export function areSwapped(
  from: ReturnType<typeof fixedDay>,
  to: ReturnType<typeof fixedDay>,
  cells: Cells,
): boolean {
  if (from.date === null || to.date === null || cellOf(cells, 'leadType') !== '') return false;
  return isFarOverYearsEnd({ date: from.date, year: from.year }, { date: to.date, year: to.year });
}

const ISO = /^(\d{4})-(\d{2})-(\d{2})$/u;
const YEAR = /(?<!\d)\d{4}(?!\d)/u;

/** A day that was, with its year. */
export function pastDay(
  text: string,
  facts: ImportDateFacts,
): { day: string | null; problem: 'not-a-past-day' | null } {
  if (text === '') return { day: null, problem: null };
  const [year = 0, month = 0, day = 0] = ISO.exec(text)?.slice(1).map(Number) ?? dayInWords(text, facts);
  const isThere = month >= 1 && month <= 12 && day >= 1 && day <= daysInMonth(year, month);
  if (!isThere) return { day: null, problem: 'not-a-past-day' };
  return { day: isoDateOf(dayNumberOf(year, month, day)), problem: null };
}

function dayInWords(text: string, facts: ImportDateFacts): number[] {
  const said = YEAR.exec(text)?.[0];
  if (said === undefined) return [];
  const read = dateCell(text, { ...facts, calendarYear: Number(said) });
  if (read.kind !== 'day' || read.year === null) return [];
  return [read.year, read.first.month, read.first.day];
}
