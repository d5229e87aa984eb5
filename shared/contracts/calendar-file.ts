import { z } from 'zod';
import { id, instant } from './common.js';
import { versionEntryBody, versionHeader, versionState } from './versions.js';

/** What a file says it is. A file with a higher schema is of a newer Dawnpeg, and is refused by name. */
export const CALENDAR_FILE_FORMAT = 'dawnpeg-calendar';
export const CALENDAR_FILE_SCHEMA = 1;
export const CALENDAR_FILE_TYPE = 'application/json';

/** Parts that carry a checksum each: SHA-256 in lower-case hex over the UTF-8 canonical JSON (RFC 8785) of the part. */
export const CALENDAR_FILE_PARTS = ['source', 'header', 'entries', 'media'] as const;
export type CalendarFilePart = (typeof CALENDAR_FILE_PARTS)[number];

const sha256 = z.string().regex(/^[0-9a-f]{64}$/u);

/** Where the file comes from. For the draft, number, label, state and version hash are null. */
export const calendarFileSource = z.strictObject({
  calendarId: id,
  number: z.number().int().min(1).nullable(),
  label: z.string().nullable(),
  state: versionState.nullable(),
  versionHash: sha256.nullable(),
  exportedAt: instant,
  /** What has to be read beside every date, in words. */
  cautions: z.array(z.string()),
});

/** A recording or picture that belongs to an entry of the file. Its bytes are not in the file. */
export const calendarFileMedium = z.strictObject({
  attachmentId: id,
  entryId: id,
  kind: z.enum(['recording', 'picture']),
});

/**
 * A whole calendar as a file: a version as it was frozen, or the draft as it stood. It holds what is open or the
 * village's and was agreed to be handed on, with other timings beside their entries; what is kept is not in it.
 * `entries` are in the order of the calendar, each with its own id, by which withdrawn ones are refused.
 */
export const calendarFile = z.strictObject({
  format: z.literal(CALENDAR_FILE_FORMAT),
  schemaVersion: z.literal(CALENDAR_FILE_SCHEMA),
  source: calendarFileSource,
  header: versionHeader.omit({ salt: true }),
  entries: z.array(versionEntryBody),
  media: z.array(calendarFileMedium),
  checksums: z.strictObject({ source: sha256, header: sha256, entries: sha256, media: sha256 }),
});
export type CalendarFile = z.infer<typeof calendarFile>;
export type CalendarFileContent = Omit<CalendarFile, 'checksums'>;
