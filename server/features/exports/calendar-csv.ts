import { CALENDAR_CSV_COLUMNS, type CalendarCsvColumn } from '#shared/calendar/csv-columns.js';
import type { EntryInput } from '#shared/contracts/calendars.js';
import type { MonthDay } from '#shared/contracts/common.js';
import { GIVER_BY_ROLE } from '#shared/contracts/sharing.js';
import type { VersionEntryBody } from '#shared/contracts/versions.js';
import { canonicalJson } from '#shared/kernel/canonical-json.js';
import { csvText, type CsvCell } from '#shared/kernel/csv.js';
import { DEFAULT_LANGUAGE } from '#shared/locales/languages.js';
import { translatorFor, type Translate } from '../../print/translator.js';
import type { CalendarContent } from '../versions/frozen-content.service.js';

/** Spreadsheets read village names rightly only after this mark. */
const UTF8_MARK = '\ufeff';

export interface CsvOptions {
  mark: boolean;
  /** For whoever compiles, reviews and signs. */
  levels: boolean;
}

type Line = Record<CalendarCsvColumn, CsvCell>;

/** A calendar as a table that can be read back: a line an entry, the columns of `csv-columns.ts`. */
export function calendarCsv(content: CalendarContent, { mark, levels }: CsvOptions): string {
  const t = translatorFor(DEFAULT_LANGUAGE, 'files');
  const lines = content.entries.map((entry) => lineOf(entry, content, levels, t));
  const rows = [
    CALENDAR_CSV_COLUMNS.map(({ id }) => t(`calendarCsv.column.${id}`)),
    ...lines.map((line) => CALENDAR_CSV_COLUMNS.map(({ id }) => line[id])),
  ];
  return (mark ? UTF8_MARK : '') + csvText(rows);
}

function lineOf(
  { content: entry, dates }: VersionEntryBody,
  { header, label, state }: CalendarContent,
  levels: boolean,
  t: Translate,
): Line {
  const { titleVillage, titleOfficer, kind, icon, crop, otherSigns, ifLate, caution, notes } = entry;
  const { window, marker } = dates;
  const stateWord = t(`ics.state.${state ?? 'draft'}`);
  return {
    ...{ titleVillage, titleOfficer, icon, crop, otherSigns, ifLate, caution, notes },
    kind: entry.kindWord?.word ?? kind,
    earliest: window && window.earliest,
    bestFrom: window && window.bestFrom,
    bestTo: window && window.bestTo,
    lastAdvised: window && window.lastAdvised,
    signExpected: marker && marker.expected.gregorian,
    signEarly: marker?.early?.gregorian ?? null,
    signLate: marker?.late?.gregorian ?? null,
    ...leadCells(entry.lead),
    ...entry.offsets,
    lastDate: entry.lastDate && monthDay(entry.lastDate.date),
    lastDateSource: entry.lastDate && entry.lastDate.source,
    protectiveWatch: entry.protectiveWatch ? 'yes' : 'no',
    giver: entry.giver === GIVER_BY_ROLE ? t('sheet.byRole') : entry.giver,
    level: levels ? entry.sharingLevel : null,
    year: header.year,
    place: header.place.name,
    issue: label === null ? stateWord : [label, stateWord].join(', '),
    care: t('caution'),
  };
}

type LeadCells = Pick<
  Line,
  'leadType' | 'leadMarker' | 'leadPhenomenon' | 'leadOccurrence' | 'leadDate' | 'leadSource' | 'leadOther'
>;

function leadCells(lead: EntryInput['lead']): LeadCells {
  const none = { leadMarker: null, leadPhenomenon: null, leadOccurrence: null, leadDate: null };
  const cells = { ...none, leadSource: null, leadOther: null, leadType: lead.type };
  switch (lead.type) {
    case 'marker':
      return {
        ...cells,
        leadMarker: lead.markerKey,
        leadPhenomenon: lead.phenomenon,
        leadOccurrence: lead.occurrence,
      };
    case 'fixed-date':
      return { ...cells, leadDate: monthDay(lead.date), leadSource: lead.source };
    default:
      return { ...cells, leadOther: canonicalJson(lead) };
  }
}

function monthDay({ month, day }: MonthDay): string {
  return [month, day].map((part) => String(part).padStart(2, '0')).join('-');
}
