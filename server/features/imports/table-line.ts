import { WINDOW_DAYS } from '#shared/calendar/import-window.js';
import {
  ENTRY_ICONS,
  entryInput,
  type EntryIcon,
  type EntryInput,
  type EntryKind,
  type EntryLead,
  type EntryOffsets,
} from '#shared/contracts/calendars.js';
import { plainWords } from '#shared/calendar/import-dates.js';
import type { ImportColumn } from '#shared/contracts/imports.js';
import { fieldErrors } from '../../http/field-errors.js';
import { DAY_SOURCE } from './import-words.js';
import {
  cellOf,
  fixedDay,
  type Cells,
  type EntryName,
  type LineProblem,
  type TableFacts,
} from './table-cells.js';
import { recordColumn, recordOfLine } from './table-record.js';
import { timingOf } from './table-timing.js';

export interface LineEntry {
  /** Null where something is the matter. What leads stands in it, or is still to be looked up by `hangsOn`. */
  content: EntryInput | null;
  hangsOn: EntryName | null;
  problems: LineProblem[];
}

/** An entry from one line of a table, or everything that is the matter with it. */
export function entryOfLine(cells: Cells, facts: TableFacts): LineEntry {
  const cell = (column: ImportColumn) => cellOf(cells, column);
  const timing = timingOf(cells, facts);
  const { kind, kindWord } = kindOf(plainWords(cell('kind')), facts);
  const lastDate = fixedDay(cell('lastDate'), facts);
  const { record, problems: recordProblems } = recordOfLine(cells, facts);
  const problems = [
    ...timing.problems,
    ...recordProblems,
    ...(kind === null ? [{ column: 'kind' as const, code: 'unknown-kind' }] : []),
    ...(lastDate.problem === null ? [] : [{ column: 'lastDate' as const, code: lastDate.problem }]),
  ];
  const words = entryInput.safeParse({
    titleVillage: cell('titleVillage'),
    titleOfficer: cell('titleOfficer'),
    kind: kind ?? 'farm',
    ...(kindWord && { kindWord }),
    icon: iconOf(cell('icon'), kind ?? 'farm'),
    crop: cell('crop'),
    notes: cell('notes'),
    caution: cell('caution'),
    lead: timing.lead ?? NO_LEAD,
    offsets: timing.offsets ?? NO_OFFSETS,
    hasLastDate: lastDate.date !== null,
    lastDate: lastDate.date && { date: lastDate.date, source: cell('lastDateSource') || DAY_SOURCE },
    protectiveWatch: facts.yes.has(plainWords(cell('protectiveWatch'))),
    otherSigns: cell('otherSigns'),
    ifLate: cell('ifLate'),
    giver: cell('giver'),
    agreedToPrint: false,
    sharingLevel: levelOf(kind ?? 'farm'),
    ...(record && { record }),
  } satisfies Record<
    keyof Omit<EntryInput, 'giverId' | 'board' | 'sharing' | 'record' | 'kindWord'>,
    unknown
  >);
  if (!words.success) problems.push(...lineProblems(words.error.issues, cells));
  const isGood = words.success && problems.length === 0;
  return { content: isGood ? words.data : null, hangsOn: timing.hangsOn, problems };
}

function kindOf(
  words: string,
  { kinds, villageKinds }: TableFacts,
): { kind: EntryKind | null; kindWord?: EntryInput['kindWord'] } {
  return villageKinds.get(words) ?? { kind: kinds.get(words) ?? null };
}

/** Nobody has agreed to anything: what is believed stays with the elders, all else with the village. */
export function levelOf(kind: EntryKind): EntryInput['sharingLevel'] {
  return kind === 'belief' ? 'elders' : 'village';
}

/** What a schema says against the fields of an entry or a timing, by the columns that they came from. */
export function lineProblems(issues: Parameters<typeof fieldErrors>[0], cells: Cells): LineProblem[] {
  return fieldErrors(issues).map(({ field, code }) => ({ column: columnOf(field, cells), code }));
}

function columnOf(field: string, cells: Cells): ImportColumn {
  const [head = '', member = ''] = field.split('.');
  if (head === 'record') return recordColumn(field.slice('record.'.length));
  if (head === 'offsets') {
    const day = WINDOW_DAYS.find((each) => `${each}Days` === member) ?? 'bestFrom';
    return cellOf(cells, `${day}Days`) === '' && cellOf(cells, day) !== '' ? day : `${day}Days`;
  }
  if (head === 'lead') return member === 'source' ? 'leadSource' : 'when';
  if (head === 'lastDate') return member === 'source' ? 'lastDateSource' : 'lastDate';
  return COLUMN_OF_FIELD[head] ?? 'titleOfficer';
}

const COLUMN_OF_FIELD: Readonly<Record<string, ImportColumn>> = {
  titleVillage: 'titleVillage',
  titleOfficer: 'titleOfficer',
  crop: 'crop',
  notes: 'notes',
  note: 'notes',
  caution: 'caution',
  otherSigns: 'otherSigns',
  ifLate: 'ifLate',
  giver: 'giver',
  hasLastDate: 'lastDate',
  protectiveWatch: 'protectiveWatch',
  difference: 'variantDifference',
  confidence: 'variantConfidence',
  basis: 'variantBasis',
  board: 'boardReason',
};

const ICON_OF_KIND: Readonly<Record<EntryKind, EntryIcon>> = {
  farm: 'hoe',
  'herd-fish-gather': 'herd',
  household: 'household',
  community: 'community',
  belief: 'lamp',
  safety: 'caution',
  'marker-only': 'lamp',
};

function iconOf(text: string, kind: EntryKind): EntryIcon {
  return ENTRY_ICONS.find((icon) => icon === text.toLowerCase()) ?? ICON_OF_KIND[kind];
}

/** Stand in where something is the matter or still to be looked up, so that the rest of the line can be looked at. */
export const NO_LEAD: EntryLead = { type: 'fixed-date', date: { month: 1, day: 1 }, source: DAY_SOURCE };
export const NO_OFFSETS: EntryOffsets = {
  earliestDays: 0,
  bestFromDays: 0,
  bestToDays: 0,
  lastAdvisedDays: 0,
};
