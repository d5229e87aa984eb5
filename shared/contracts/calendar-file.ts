import { z } from 'zod';
import { ATTACHMENT_KINDS } from './attachments.js';
import { ENTRIES_MAX } from './calendars.js';
import { id, instant, isoDate } from './common.js';
import { DECISION_KINDS } from './season-reviews.js';
import { sharingLevel } from './sharing.js';
import { versionEntryBody, versionHeader, versionState } from './versions.js';

/** What a file says it is, and in which form; a file of another form is refused by its number. */
export const CALENDAR_FILE_FORMAT = 'dawnpeg-calendar';
export const CALENDAR_FILE_SCHEMA = 3;
export const CALENDAR_FILE_MAX_BYTES = 12 * 1024 * 1024;

/** Parts that carry a checksum each: SHA-256 in lower-case hex over the UTF-8 canonical JSON (RFC 8785) of the part. */
export const CALENDAR_FILE_PARTS = ['source', 'header', 'entries', 'media', 'season'] as const;
export type CalendarFilePart = (typeof CALENDAR_FILE_PARTS)[number];
/** The first form that has each part: files of an older one are read without it. */
export const CALENDAR_FILE_PART_SINCE: Readonly<Record<CalendarFilePart, number>> = {
  ...{ source: 1, header: 1, entries: 1, media: 2, season: 3 },
};

const sha256 = z.string().regex(/^[0-9a-f]{64}$/u);

/** Where the file comes from. Of the draft, number, label, state and version hash are null. */
const calendarFileSource = z.strictObject({
  calendarId: id,
  number: z.number().int().min(1).nullable(),
  label: z.string().nullable(),
  state: versionState.nullable(),
  versionHash: sha256.nullable(),
  exportedAt: instant,
  /** What has to be read beside every date, in words. */
  cautions: z.array(z.string()),
});

/**
 * A voice or a picture that belongs to an entry of the file: what it is called, who may know of it, and by which bytes it is
 * known again. It itself stays where it was given.
 */
const calendarFileMedium = z.strictObject({
  attachmentId: id,
  entryId: id,
  kind: z.enum(ATTACHMENT_KINDS),
  title: z.string(),
  level: sharingLevel,
  parts: z.array(
    z.strictObject({
      part: z.number().int().min(0),
      contentType: z.string(),
      bytes: z.number().int().min(0),
      sha256,
    }),
  ),
});
export type CalendarFileMedium = z.infer<typeof calendarFileMedium>;

/**
 * What was said when the year was looked back at, as far as its entries are in the file, for whoever reads drafts. Nobody is
 * named: whose words they are is known by their ids where they are brought back.
 */
const calendarFileSeason = z.strictObject({
  lessons: z.array(
    z.strictObject({ lessonId: id, entryId: id.nullable(), text: z.string(), writtenAt: instant }),
  ),
  decisions: z.array(
    z.strictObject({
      decisionId: id,
      entryId: id.nullable(),
      kind: z.enum(DECISION_KINDS),
      text: z.string(),
      decidedAt: instant,
      /** When it was ticked off in the draft of the year after; null while it waits. */
      doneOn: isoDate.nullable(),
    }),
  ),
});
export type CalendarFileSeason = z.infer<typeof calendarFileSeason>;

/** Read before all else: whether it is such a file, and of which form. */
export const calendarFileKind = z.looseObject({
  format: z.literal(CALENDAR_FILE_FORMAT),
  schemaVersion: z.number().int(),
});

/**
 * A whole calendar as a file: a version as it was frozen, or the draft as it stood. It holds what is open or the
 * village's and was agreed to be handed on, with other timings beside their entries; what is kept is not in it, nor are
 * answers; of voices and pictures it has a list, and what a year taught stands beside. `entries` are in the order of the calendar, each with its own id, by which what was
 * taken back since is known.
 */
export const calendarFile = z.strictObject({
  format: z.literal(CALENDAR_FILE_FORMAT),
  schemaVersion: z.literal(CALENDAR_FILE_SCHEMA),
  source: calendarFileSource,
  header: versionHeader.omit({ salt: true }),
  entries: z.array(versionEntryBody).max(ENTRIES_MAX),
  media: z.array(calendarFileMedium),
  season: calendarFileSeason,
  checksums: z.strictObject({
    ...{ source: sha256, header: sha256, entries: sha256, media: sha256, season: sha256 },
  }),
});
/** The same before what a year taught went along. */
const calendarFileSecond = calendarFile.omit({ season: true }).extend({
  schemaVersion: z.literal(2),
  checksums: calendarFile.shape.checksums.omit({ season: true }),
});
/** And before there was a list of voices and pictures. */
const calendarFileFirst = calendarFileSecond.omit({ media: true }).extend({
  schemaVersion: z.literal(1),
  checksums: calendarFileSecond.shape.checksums.omit({ media: true }),
});
/** Every form that is read, by its number. */
export const readableCalendarFile = z.discriminatedUnion('schemaVersion', [
  calendarFile,
  calendarFileSecond,
  calendarFileFirst,
]);
export type CalendarFile = z.infer<typeof calendarFile>;
/** Of this form or an older one. */
export type ReadableCalendarFile = z.infer<typeof readableCalendarFile>;
