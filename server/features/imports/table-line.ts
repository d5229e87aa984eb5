import {
  dateCell,
  type DateCell,
  type ImportDateFacts,
  type NamedSign,
} from '#shared/calendar/import-dates.js';
import { WINDOW_DAYS, windowOfCells, type OffsetColumn } from '#shared/calendar/import-window.js';
import {
  ENTRY_ICONS,
  entryInput,
  entryLead,
  type EntryIcon,
  type EntryInput,
  type EntryKind,
  type EntryLead,
  type EntryOffsets,
} from '#shared/contracts/calendars.js';
import type { ImportColumn, ReadLine, TableLine } from '#shared/contracts/imports.js';
import type { MonthDay } from '#shared/contracts/common.js';
import { fieldErrors } from '../../http/field-errors.js';
import { DAY_SOURCE, kindOf, YES, type VillageKinds } from './import-words.js';

type Problem = ReadLine['problems'][number];
type Cells = TableLine['cells'];

/** What tables are read by: days and stars, and what this village calls kinds of events. */
export interface TableFacts extends ImportDateFacts {
  villageKinds: VillageKinds;
}

/** An entry from one line of a table, or everything that is the matter with it. */
export function entryOfLine(
  { cells }: TableLine,
  facts: TableFacts,
): { content: EntryInput | null; problems: Problem[] } {
  const cell = (column: ImportColumn) => (cells[column] ?? '').trim();
  const timing = timingOf(cells, facts);
  const { kind, kindWord } = kindOf(cell('kind'), facts.villageKinds);
  const lastDate = fixedDay(cell('lastDate'), facts);
  const problems = [
    ...timing.problems,
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
    protectiveWatch: YES.has(cell('protectiveWatch').toLowerCase()),
    otherSigns: cell('otherSigns'),
    ifLate: cell('ifLate'),
    giver: cell('giver'),
    agreedToPrint: false,
    // Nobody has agreed to anything: what is believed stays with the elders, all else with the village.
    sharingLevel: kind === 'belief' ? 'elders' : 'village',
  } satisfies Record<
    keyof Omit<EntryInput, 'giverId' | 'board' | 'sharing' | 'record' | 'kindWord'>,
    unknown
  >);
  if (!words.success) {
    for (const { field, code } of fieldErrors(words.error.issues)) {
      problems.push({ column: columnOf(field, cells), code });
    }
  }
  return { content: words.success && problems.length === 0 ? words.data : null, problems };
}

interface Timing {
  lead: EntryLead | null;
  offsets: EntryOffsets | null;
  problems: Problem[];
}

/** By the columns of our own CSV where they are there, else by words and days. */
function timingOf(cells: Cells, facts: ImportDateFacts): Timing {
  const numbers = numbersOf(cells);
  if (numbers.problems.length > 0) return { lead: null, offsets: null, problems: numbers.problems };
  if ((cells.leadType ?? '').trim() !== '') return ownTiming(cells, numbers.days, facts);
  const day = (column: ImportColumn): DateCell => dateCell(cells[column] ?? '', facts);
  const [earliest, bestFrom, bestTo, lastAdvised] = WINDOW_DAYS.map((name) => day(name)) as [
    DateCell,
    DateCell,
    DateCell,
    DateCell,
  ];
  const read = windowOfCells({
    when: day('when'),
    days: { earliest, bestFrom, bestTo, lastAdvised },
    offsetsDays: numbers.days,
  });
  if (!('lead' in read)) {
    const problems = read.problems.map(({ column, problem }) => ({ column, code: problem }));
    return { lead: null, offsets: null, problems };
  }
  const source = (cells.leadSource ?? '').trim() || DAY_SOURCE;
  return { lead: leadOf(read.lead, source), offsets: read.offsets, problems: [] };
}

function leadOf(lead: NamedSign | { type: 'day'; date: MonthDay }, source: string): EntryLead {
  if (lead.type === 'day') return { type: 'fixed-date', date: lead.date, source };
  if (lead.type === 'star') {
    const { markerKey, phenomenon } = lead;
    return { type: 'marker', markerKey, phenomenon, occurrence: 1 };
  }
  const spec = { kind: 'sun-season', season: lead.signKey };
  return entryLead.parse({ type: 'sky', spec, occurrence: 1 });
}

function ownTiming(cells: Cells, days: OffsetDays, facts: ImportDateFacts): Timing {
  const raw = ownLead(cells, facts);
  const offsets = {
    earliestDays: days.earliestDays ?? 0,
    bestFromDays: days.bestFromDays ?? 0,
    bestToDays: days.bestToDays ?? 0,
    lastAdvisedDays: days.lastAdvisedDays ?? 0,
  };
  if ('problem' in raw) return { lead: null, offsets, problems: [raw.problem] };
  const lead = entryLead.safeParse(raw.lead);
  if (!lead.success) {
    const problems = fieldErrors(lead.error.issues).map(({ field, code }) => ({
      column: LEAD_COLUMNS[field.split('.')[0] ?? ''] ?? ('leadType' as const),
      code,
    }));
    return { lead: null, offsets, problems };
  }
  if ('entryId' in lead.data) {
    return { lead: null, offsets, problems: [{ column: 'leadType', code: 'needs-another-entry' }] };
  }
  return { lead: lead.data, offsets, problems: [] };
}

const LEAD_COLUMNS: Readonly<Record<string, ImportColumn>> = {
  markerKey: 'leadMarker',
  phenomenon: 'leadPhenomenon',
  occurrence: 'leadOccurrence',
  date: 'leadDate',
  source: 'leadSource',
};

function ownLead(cells: Cells, facts: ImportDateFacts): { lead: unknown } | { problem: Problem } {
  const cell = (column: ImportColumn) => (cells[column] ?? '').trim();
  const type = cell('leadType');
  if (type === 'marker') {
    return {
      lead: {
        ...{ type, markerKey: cell('leadMarker'), phenomenon: cell('leadPhenomenon') },
        occurrence: Number(cell('leadOccurrence') || 1),
      },
    };
  }
  if (type === 'fixed-date') {
    const { date, problem } = fixedDay(cell('leadDate'), facts);
    if (problem !== null) return { problem: { column: 'leadDate', code: problem } };
    return { lead: { type, date: date ?? undefined, source: cell('leadSource') || DAY_SOURCE } };
  }
  try {
    return { lead: JSON.parse(cell('leadOther')) as unknown };
  } catch {
    return { problem: { column: 'leadOther', code: 'not-in-list' } };
  }
}

/** A day of every year; a ten-day part counts by its last day, for it is an end. */
function fixedDay(text: string, facts: ImportDateFacts): { date: MonthDay | null; problem: string | null } {
  const read = dateCell(text, facts);
  if (read.kind === 'empty') return { date: null, problem: null };
  if (read.kind === 'day') return { date: read.last, problem: null };
  return { date: null, problem: read.kind === 'problem' ? read.problem : 'date-not-read' };
}

type OffsetDays = Record<OffsetColumn, number | null>;

function numbersOf(cells: Cells): { days: OffsetDays; problems: Problem[] } {
  const problems: Problem[] = [];
  const number = (column: OffsetColumn): number | null => {
    const text = (cells[column] ?? '').trim().replace('−', '-');
    if (text === '') return null;
    if (/^[+-]?\d{1,3}$/u.test(text)) return Number(text);
    problems.push({ column, code: 'whole-days' });
    return null;
  };
  const days = {
    earliestDays: number('earliestDays'),
    bestFromDays: number('bestFromDays'),
    bestToDays: number('bestToDays'),
    lastAdvisedDays: number('lastAdvisedDays'),
  };
  return { days, problems };
}

function columnOf(field: string, cells: Cells): ImportColumn {
  const [head = '', member = ''] = field.split('.');
  if (head === 'offsets') {
    const column = member as OffsetColumn;
    const day = member.replace(/Days$/u, '') as (typeof WINDOW_DAYS)[number];
    return (cells[column] ?? '').trim() === '' && (cells[day] ?? '').trim() !== '' ? day : column;
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
  caution: 'caution',
  otherSigns: 'otherSigns',
  ifLate: 'ifLate',
  giver: 'giver',
  hasLastDate: 'lastDate',
  protectiveWatch: 'protectiveWatch',
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

/** Stand in where something is the matter, so that the rest of the line can still be looked at. */
const NO_LEAD: EntryLead = { type: 'fixed-date', date: { month: 1, day: 1 }, source: DAY_SOURCE };
const NO_OFFSETS: EntryOffsets = { earliestDays: 0, bestFromDays: 0, bestToDays: 0, lastAdvisedDays: 0 };
