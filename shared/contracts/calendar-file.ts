import { z } from 'zod';
import { ENTRIES_MAX } from './calendars.js';
import { id, instant } from './common.js';
import { versionEntryBody, versionHeader, versionState } from './versions.js';

/** What a file says it is, and in which form; a file of another form is refused by its number. */
export const CALENDAR_FILE_FORMAT = 'dawnpeg-calendar';
export const CALENDAR_FILE_SCHEMA = 1;
export const CALENDAR_FILE_MAX_BYTES = 12 * 1024 * 1024;

/** Parts that carry a checksum each: SHA-256 in lower-case hex over the UTF-8 canonical JSON (RFC 8785) of the part. */
export const CALENDAR_FILE_PARTS = ['source', 'header', 'entries'] as const;
export type CalendarFilePart = (typeof CALENDAR_FILE_PARTS)[number];

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

/** Read before all else: whether it is such a file, and of which form. */
export const calendarFileKind = z.looseObject({
  format: z.literal(CALENDAR_FILE_FORMAT),
  schemaVersion: z.number().int(),
});

/**
 * A whole calendar as a file: a version as it was frozen, or the draft as it stood. It holds what is open or the
 * village's and was agreed to be handed on, with other timings beside their entries; what is kept is not in it, nor are
 * voices, pictures and answers. `entries` are in the order of the calendar, each with its own id, by which what was
 * taken back since is known.
 */
export const calendarFile = z.strictObject({
  format: z.literal(CALENDAR_FILE_FORMAT),
  schemaVersion: z.literal(CALENDAR_FILE_SCHEMA),
  source: calendarFileSource,
  header: versionHeader.omit({ salt: true }),
  entries: z.array(versionEntryBody).max(ENTRIES_MAX),
  checksums: z.strictObject({ source: sha256, header: sha256, entries: sha256 }),
});
export type CalendarFile = z.infer<typeof calendarFile>;
