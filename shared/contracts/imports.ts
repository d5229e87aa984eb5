import { z } from 'zod';
import { ATTACHMENT_KINDS } from './attachments.js';
import { CALENDAR_ARCHIVE_MAX_BYTES } from './calendar-archive.js';
import { entryLead, entryWarning, entryWindow } from './calendars.js';
import { id } from './common.js';
import { defineEndpoint, member } from './endpoint.js';

/** What is the matter with a voice or a picture that should have come along. */
const MEDIUM_FAULTS = ['missing', 'other-content', 'no-such-file'] as const;
export type MediumFault = (typeof MEDIUM_FAULTS)[number];

/** What a calendar's own file brought in, or would bring in. */
export const fileImport = z.strictObject({
  added: z.number().int(),
  /** Taken back since, or kept by their people today, and what hangs on these; how many, and never which. */
  refused: z.number().int(),
  /** Of those that the file lists and that came along with it. */
  voices: z.number().int(),
  pictures: z.number().int(),
  /** All others that it lists: they stay with the entries to which they were given. */
  mediaLeft: z.number().int(),
  /** Those that should have come and do not fit: as long as there is one, nothing comes in. */
  unfit: z.array(
    z.strictObject({ kind: z.enum(ATTACHMENT_KINDS), title: z.string(), fault: z.enum(MEDIUM_FAULTS) }),
  ),
  /** Lessons and decisions of the year that come along, and those that do not: taken out since, of another year, said already. */
  seasonAdded: z.number().int(),
  seasonLeft: z.number().int(),
  /** Where the file comes from. */
  from: z.strictObject({ year: z.number().int(), placeName: z.string(), label: z.string().nullable() }),
});
export type FileImport = z.infer<typeof fileImport>;

/** What an entry's record says, as columns: all but the checks of an office. */
export const RECORD_COLUMNS = [
  'operation',
  'ownOperation',
  'variety',
  'varietyFromDays',
  'varietyToDays',
  'land',
  'readyDays',
  'graceDays',
  'repeats',
  'everyYears',
  'repeatRule',
  'signs',
  'signsNeeded',
  'mustHaveSign',
  'responsible',
  'helpers',
  'decides',
  'owns',
  'inputs',
  'ifEarly',
  'ifLaterStill',
  'stopDate',
  'stopSource',
  'askWhom',
  'confidence',
  'confidenceBy',
  'basis',
  'sinceYear',
  'heardWhere',
  'heardDay',
  'heardLanguage',
] as const;

/** Columns that a table may have: those of the CSV that make an entry, and plainer ones for tables of other hands. */
export const IMPORT_COLUMNS = [
  'number',
  'titleVillage',
  'titleOfficer',
  'kind',
  'icon',
  'crop',
  /** What leads, in words: `Pleiades, first morning`, or a day of the year. */
  'when',
  'earliest',
  'bestFrom',
  'bestTo',
  'lastAdvised',
  'earliestDays',
  'bestFromDays',
  'bestToDays',
  'lastAdvisedDays',
  'leadType',
  'leadMarker',
  'leadPhenomenon',
  'leadOccurrence',
  'leadDate',
  'leadSource',
  'leadOther',
  'leadEntry',
  'leadDay',
  'usualFrom',
  'usualTo',
  'lastDate',
  'lastDateSource',
  'protectiveWatch',
  'otherSigns',
  'ifLate',
  ...RECORD_COLUMNS,
  'checkedWork',
  'checkedSafety',
  'checkedLate',
  'caution',
  'notes',
  'giver',
  'variantOf',
  'variantDifference',
  'variantConfidence',
  'variantBasis',
  'boardShows',
  'boardVariant',
  'boardReason',
] as const;
export type ImportColumn = (typeof IMPORT_COLUMNS)[number];

export const IMPORT_LINES_MAX = 500;
/** As long as all signs of an entry are together, each letter of them marked. */
const CELL_MAX = 14_000;

export const tableLine = z.strictObject({
  /** As the spreadsheet counts it, for whoever has to put something right there. */
  line: z.number().int().min(1),
  cells: z.partialRecord(z.enum(IMPORT_COLUMNS), z.string().max(CELL_MAX, 'too-long')),
});
export type TableLine = z.infer<typeof tableLine>;

export const tableInput = z.strictObject({
  dryRun: z.boolean(),
  /** How `6/7` is meant; null where the table has no such days, or nobody has said so yet. */
  dayOrder: z.enum(['day-first', 'month-first']).nullable(),
  /** Words of this table that somebody said are signs of nature: no list knows them. */
  natureSigns: z.array(z.string().max(CELL_MAX, 'too-long')).max(IMPORT_LINES_MAX, 'too-many'),
  lines: z.array(tableLine).min(1).max(IMPORT_LINES_MAX, 'too-many'),
});
export type TableInput = z.infer<typeof tableInput>;

/** What a line would become, and everything that is the matter with it. */
export const readLine = z.strictObject({
  line: z.number().int(),
  title: z.string(),
  protectiveWatch: z.boolean(),
  /** What it goes by, as the words of the line were understood; null where something is the matter. */
  lead: entryLead.nullable(),
  /** Null where something is the matter, or the sign has no day in this year. */
  window: entryWindow.nullable(),
  warnings: z.array(entryWarning),
  problems: z.array(z.strictObject({ column: z.enum(IMPORT_COLUMNS), code: z.string() })),
});
export type ReadLine = z.infer<typeof readLine>;

export const tableImport = z.strictObject({
  /** Entries, each with the other timings beside it. */
  added: z.number().int(),
  lines: z.array(readLine),
});
export type TableImport = z.infer<typeof tableImport>;

/** What copying changed in an entry, because the other village is another one. */
export const COPY_NOTES = [
  'star-instead-of-figure',
  'figure-left-out',
  'skyline-left-out',
  'anchor-left-out',
  'last-date-dropped',
  'timings-dropped',
  'seen-dropped',
] as const;
export type CopyNote = (typeof COPY_NOTES)[number];

export const villageCopy = z.strictObject({
  added: z.number().int(),
  /** Voices and pictures of what comes: they stay, because a voice or a face is a name. */
  mediaLeft: z.number().int(),
  entries: z.array(
    z.strictObject({
      title: z.string(),
      protectiveWatch: z.boolean(),
      comes: z.boolean(),
      /** At the other place; null where it does not come, or has no day there. */
      window: entryWindow.nullable(),
      warnings: z.array(entryWarning),
      notes: z.array(z.enum(COPY_NOTES)),
    }),
  ),
});
export type VillageCopy = z.infer<typeof villageCopy>;

const params = z.strictObject({ calendarId: id });

/** What is brought into a draft. All of it lands as a draft, or nothing does. */
export const importsEndpoints = {
  file: defineEndpoint({
    id: 'importCalendarFile',
    method: 'POST',
    path: '/api/calendars/:calendarId/imports/file',
    summary:
      'Bring a calendar’s own file, alone or with its voices and pictures, back into a draft of its village; with dryRun nothing is kept',
    access: member('calendar', 'officer'),
    params,
    body: z.strictObject({ dryRun: z.boolean() }),
    upload: { maxBytes: CALENDAR_ARCHIVE_MAX_BYTES },
    response: fileImport,
    countsOnce: true,
  }),
  table: defineEndpoint({
    id: 'importTable',
    method: 'POST',
    path: '/api/calendars/:calendarId/imports/table',
    summary:
      'Bring lines of a table into a draft, all or none; with dryRun each is told what it would become',
    access: member('calendar', 'officer'),
    params,
    body: tableInput,
    response: tableImport,
    countsOnce: true,
  }),
  copy: defineEndpoint({
    id: 'copyCalendar',
    method: 'POST',
    path: '/api/calendars/:calendarId/copies',
    summary:
      'Copy the draft into a draft of another village of the same officer; with dryRun nothing is kept',
    access: member('calendar', 'officer'),
    params,
    body: z.strictObject({ dryRun: z.boolean(), toCalendarId: id }),
    response: villageCopy,
    countsOnce: true,
  }),
} as const;
