import { circleFrom } from '#shared/calendar/anchors.js';
import { plainWords } from '#shared/calendar/import-dates.js';
import { entryInput, type EntryInput } from '#shared/contracts/calendars.js';
import type { TableLine } from '#shared/contracts/imports.js';
import { VARIANTS_MAX } from '#shared/contracts/variants.js';
import { randomUUID } from 'node:crypto';
import type { LandingEntry } from './landing.service.js';
import { cellOf, type EntryName, type LineProblem, type TableFacts } from './table-cells.js';
import { entryOfLine, lineProblems, type LineEntry } from './table-line.js';
import { variantOfLine } from './table-variant.js';

/** An entry that stands in the draft and is for everybody of the village to see. */
export interface DraftTitle {
  id: string;
  titles: readonly string[];
}

export interface PlannedLine {
  line: TableLine;
  /** Null for another timing, which stands with its entry. */
  entry: LandingEntry | null;
  problems: readonly LineProblem[];
}

interface EntryLine extends LineEntry {
  id: string;
  line: TableLine;
}

/**
 * What the lines of a table come to together: entries under ids of their own, counted from each other and from the draft's
 * as the lines say by number or title, with the lines that are other timings beside theirs.
 */
export function tablePlan(
  lines: readonly TableLine[],
  facts: TableFacts,
  draft: readonly DraftTitle[],
): PlannedLine[] {
  const isBeside = ({ cells }: TableLine) => cellOf(cells, 'variantOf') !== '';
  const entries = lines
    .filter((line) => !isBeside(line))
    .map((line): EntryLine => ({ id: randomUUID(), line, ...entryOfLine(line.cells, facts) }));
  const names = namesOf(entries, draft);
  for (const entry of entries) hang(entry, names);
  for (const entry of entries) refuseBadAnchor(entry, entries);

  const byNumber = new Map(entries.map((entry) => [cellOf(entry.line.cells, 'number'), entry]));
  const variantsOf = new Map<string, LandingEntry['variants'][number][]>();
  const variantIdOf = new Map<string, string>();
  const beside = new Map<TableLine, readonly LineProblem[]>();
  for (const line of lines.filter(isBeside)) {
    const owner = byNumber.get(cellOf(line.cells, 'variantOf'));
    const { content, problems } = variantOfLine(line.cells, facts, owner?.content?.sharingLevel ?? 'village');
    const own = owner === undefined ? [] : (variantsOf.get(owner.id) ?? []);
    if (owner === undefined) beside.set(line, [...problems, { column: 'variantOf', code: 'which-entry' }]);
    else if (own.length >= VARIANTS_MAX)
      beside.set(line, [...problems, { column: 'variantOf', code: 'too-many' }]);
    else beside.set(line, problems);
    if (content === null || owner === undefined) continue;
    const id = randomUUID();
    variantIdOf.set(cellOf(line.cells, 'number'), id);
    variantsOf.set(owner.id, [...own, { id, content, sameAs: null }]);
  }
  const entryOf = new Map(entries.map((entry) => [entry.line, entry]));
  return lines.map((line) => {
    const entry = entryOf.get(line);
    if (entry === undefined) return { line, entry: null, problems: beside.get(line) ?? [] };
    const variants = variantsOf.get(entry.id) ?? [];
    const content = entry.problems.length === 0 ? withBoard(entry, variantIdOf) : null;
    const { id, problems } = entry;
    return {
      ...{ line, problems },
      entry: content && { id, content, sameAs: null, variants },
    };
  });
}

/** Ids by every name; null where a name is that of several. What the table says comes before what stands in the draft. */
function namesOf(entries: readonly EntryLine[], draft: readonly DraftTitle[]): Map<string, string | null> {
  const names = new Map<string, string | null>();
  const add = (known: Map<string, string | null>, said: string, id: string) => {
    const name = plainWords(said);
    if (name !== '') known.set(name, known.has(name) && known.get(name) !== id ? null : id);
  };
  const ofDraft = new Map<string, string | null>();
  for (const { id, titles } of draft) for (const title of titles) add(ofDraft, title, id);
  for (const { id, line } of entries) {
    for (const column of ['titleOfficer', 'titleVillage'] as const)
      add(names, cellOf(line.cells, column), id);
  }
  const numbers = new Map<string, string | null>();
  for (const { id, line } of entries) add(numbers, cellOf(line.cells, 'number'), id);
  return new Map([...ofDraft, ...names, ...numbers]);
}

function hang(entry: EntryLine, names: ReadonlyMap<string, string | null>): void {
  const { hangsOn, content } = entry;
  if (hangsOn === null) return;
  const entryId = names.get(plainWords(hangsOn.name)) ?? null;
  if (entryId === null) refuse(entry, hangsOn, 'which-entry');
  else if (content !== null) entry.content = { ...content, lead: leadOf(hangsOn, entryId) };
}

function leadOf({ day }: EntryName, entryId: string): EntryInput['lead'] {
  return day === 'actual' ? { type: 'entry-actual', entryId } : { type: 'entry-planned', entryId, day };
}

/** Not on itself by way of others, and not on what fewer people will see. */
function refuseBadAnchor(entry: EntryLine, all: readonly EntryLine[]): void {
  const { id, content, hangsOn } = entry;
  if (content === null || hangsOn === null || !('entryId' in content.lead)) return;
  const hung = all.flatMap((each) => (each.content ? [{ id: each.id, lead: each.content.lead }] : []));
  if (circleFrom(id, hung) !== null) {
    refuse(entry, hangsOn, 'anchor-circle');
    return;
  }
  const { entryId } = content.lead;
  const anchor = all.find((each) => each.id === entryId)?.content;
  if (anchor?.sharingLevel === 'elders' && content.sharingLevel !== 'elders')
    refuse(entry, hangsOn, 'anchor-kept');
}

function refuse(entry: EntryLine, { column }: EntryName, code: string): void {
  entry.problems = [...entry.problems, { column, code }];
}

/** Which timing drives the board, where the line says so. */
function withBoard(entry: EntryLine, variantIdOf: ReadonlyMap<string, string>): EntryInput | null {
  const { content, line } = entry;
  const shows = cellOf(line.cells, 'boardShows');
  if (content === null || shows === '') return content;
  const number = cellOf(line.cells, 'boardVariant');
  const variantId = number === '' ? null : (variantIdOf.get(number) ?? null);
  if (number !== '' && variantId === null) {
    entry.problems = [...entry.problems, { column: 'boardVariant', code: 'which-entry' }];
    return null;
  }
  const read = entryInput.safeParse({
    ...content,
    board: { shows, variantId, reason: cellOf(line.cells, 'boardReason') },
  });
  if (read.success) return read.data;
  entry.problems = [...entry.problems, ...lineProblems(read.error.issues, line.cells)];
  return null;
}
