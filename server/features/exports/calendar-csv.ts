import { CALENDAR_CSV_COLUMNS, type CalendarCsvColumn } from '#shared/calendar/csv-columns.js';
import type { EntryDates, EntryLead } from '#shared/contracts/calendars.js';
import { GIVER_BY_ROLE } from '#shared/contracts/sharing.js';
import type { SeenVariant, VersionEntryBody } from '#shared/contracts/versions.js';
import { canonicalJson } from '#shared/kernel/canonical-json.js';
import { csvText, type CsvCell } from '#shared/kernel/csv.js';
import type { TableLanguage } from '#shared/locales/table-languages.js';
import { tableTexts } from '#shared/locales/tables.js';
import type { CalendarContent } from '../versions/frozen-content.service.js';
import { monthDay, recordCells } from './record-cells.js';

/** Spreadsheets read village names rightly only after this mark. */
const UTF8_MARK = '\ufeff';

export interface CsvOptions {
  mark: boolean;
  language: TableLanguage;
  /** For whoever compiles, reviews and signs. */
  levels: boolean;
}

type Line = Record<CalendarCsvColumn, CsvCell>;

/**
 * A calendar as a table that can be read back: a line an entry and one for each other timing beside it, the columns of
 * `csv-columns.ts`. Lines name each other by number, for ids mean nothing in a table.
 */
export function calendarCsv(content: CalendarContent, { mark, language, levels }: CsvOptions): string {
  const { column, file: words } = tableTexts[language];
  const things = content.entries.flatMap(({ entryId, variants = [] }) => [
    entryId,
    ...variants.map(({ variantId }) => variantId),
  ]);
  const numberOf = new Map(things.map((id, index) => [id, index + 1]));
  const facts = { content, levels, words, numberOf: (id: string) => numberOf.get(id) ?? null };
  const lines = content.entries.flatMap((entry) => [
    entryLine(entry, facts),
    ...(entry.variants ?? []).map((variant) => variantLine(entry, variant, facts)),
  ]);
  const rows = [
    CALENDAR_CSV_COLUMNS.map(({ id }) => column[id]),
    ...lines.map((line) => CALENDAR_CSV_COLUMNS.map(({ id }) => line[id])),
  ];
  return (mark ? UTF8_MARK : '') + csvText(rows);
}

/** What a table says about itself. */
type FileWords = (typeof tableTexts)[TableLanguage]['file'];

interface Facts {
  content: CalendarContent;
  levels: boolean;
  words: FileWords;
  numberOf: (id: string) => number | null;
}

function entryLine({ entryId, content, dates }: VersionEntryBody, facts: Facts): Line {
  const { titleVillage, titleOfficer, icon, crop, otherSigns, ifLate, caution, notes, board } = content;
  const { numberOf } = facts;
  return {
    ...NOTHING,
    ...aboutCells(facts, content.sharingLevel),
    ...{ titleVillage, titleOfficer, icon, crop, otherSigns, ifLate, caution, notes },
    kind: content.kindWord?.word ?? content.kind,
    number: numberOf(entryId),
    ...dayCells(dates),
    ...leadCells(content.lead, numberOf),
    ...content.offsets,
    lastDate: content.lastDate && monthDay(content.lastDate.date),
    lastDateSource: content.lastDate && content.lastDate.source,
    protectiveWatch: content.protectiveWatch ? 'yes' : 'no',
    ...(content.record && recordCells(content.record)),
    giver: giverCell(content.giver, facts.words),
    ...(board && {
      ...{ boardShows: board.shows, boardReason: board.reason },
      boardVariant: board.variantId === null ? null : numberOf(board.variantId),
    }),
  };
}

/** Under its entry's names, so that whoever reads the table knows whose timing it is. */
function variantLine(entry: VersionEntryBody, variant: SeenVariant, facts: Facts): Line {
  const { titleVillage, titleOfficer } = entry.content;
  const { content, dates, variantId } = variant;
  const { otherSigns, ifLate, note, difference, confidence, basis } = content;
  return {
    ...NOTHING,
    ...aboutCells(facts, content.sharingLevel),
    ...{ titleVillage, titleOfficer, otherSigns, ifLate, notes: note },
    number: facts.numberOf(variantId),
    ...dayCells(dates),
    ...leadCells(content.lead, facts.numberOf),
    ...content.offsets,
    giver: giverCell(content.giver, facts.words),
    variantOf: facts.numberOf(entry.entryId),
    ...{ variantDifference: difference, variantConfidence: confidence, variantBasis: basis },
  };
}

const NOTHING = Object.fromEntries(CALENDAR_CSV_COLUMNS.map(({ id }) => [id, null])) as Line;

function aboutCells(
  { content: { header, label, state }, levels, words }: Facts,
  level: string,
): Partial<Line> {
  const stateWord = words.state[state ?? 'draft'];
  return {
    level: levels ? level : null,
    year: header.year,
    place: header.place.name,
    issue: label === null ? stateWord : [label, stateWord].join(', '),
    care: words.caution,
  };
}

function dayCells({ window, marker }: EntryDates): Partial<Line> {
  return {
    earliest: window && window.earliest,
    bestFrom: window && window.bestFrom,
    bestTo: window && window.bestTo,
    lastAdvised: window && window.lastAdvised,
    signExpected: marker && marker.expected.gregorian,
    signEarly: marker?.early?.gregorian ?? null,
    signLate: marker?.late?.gregorian ?? null,
  };
}

function leadCells(lead: EntryLead, numberOf: Facts['numberOf']): Partial<Line> {
  const leadType = lead.type;
  switch (lead.type) {
    case 'marker': {
      const { markerKey, phenomenon, occurrence } = lead;
      return {
        ...{ leadType, leadMarker: markerKey, leadPhenomenon: phenomenon },
        leadOccurrence: occurrence,
      };
    }
    case 'fixed-date':
      return { leadType, leadDate: monthDay(lead.date), leadSource: lead.source };
    case 'nature-sign': {
      const { from, to } = lead.usual;
      return {
        ...{ leadType, leadOther: lead.name, leadSource: lead.source },
        ...{ usualFrom: monthDay(from), usualTo: monthDay(to) },
      };
    }
    case 'entry-planned':
      return { leadType, leadEntry: numberOf(lead.entryId), leadDay: lead.day };
    case 'entry-actual':
      return { leadType, leadEntry: numberOf(lead.entryId) };
    default:
      return { leadType, leadOther: canonicalJson(lead) };
  }
}

function giverCell(giver: string, { byRole }: FileWords): string {
  return giver === GIVER_BY_ROLE ? byRole : giver;
}
