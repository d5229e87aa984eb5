import { AUDIO_PART_MAX_BYTES } from '#shared/contracts/attachments.js';
import {
  ARCHIVE_FOLDER,
  archivedSha256,
  CALENDAR_ARCHIVE_FILES_MAX,
  CALENDAR_ARCHIVE_MAX_BYTES,
  CALENDAR_ARCHIVE_RATIO_MAX,
  isArchivedCalendar,
} from '#shared/contracts/calendar-archive.js';
import { CALENDAR_FILE_MAX_BYTES } from '#shared/contracts/calendar-file.js';

/** What a ZIP says of one of its files, before any of it is unpacked. */
export interface PackedFile {
  path: string;
  bytes: number;
  packedBytes: number;
  isEncrypted: boolean;
  /** Its upper half is the mode of a Unix file, where the program that packed it knows such a thing. */
  externalFileAttributes: number;
}

export type ArchiveFault = 'archive-unreadable' | 'archive-holds-other' | 'archive-too-large';

const KIND_OF_FILE = 0o170000;
const PLAIN_FILE = 0o100000;

/**
 * What is the matter with a ZIP as a whole, by what it says of its files: exactly one calendar, voices and pictures named by
 * their checksums, nothing else, nothing twice, no links, and not more than may be unpacked. Null where it may be read.
 */
export function archiveFault(files: readonly PackedFile[]): ArchiveFault | null {
  if (files.length > CALENDAR_ARCHIVE_FILES_MAX) return 'archive-too-large';
  if (files.some(({ isEncrypted }) => isEncrypted)) return 'archive-unreadable';
  const held = files.filter((file) => !isFolder(file));
  const calendars = held.filter(({ path }) => isArchivedCalendar(path));
  const media = held.filter(({ path }) => archivedSha256(path) !== null);
  const names = new Set(media.map(({ path }) => archivedSha256(path)));
  const isPlain = held.every(isPlainFile);
  if (!isPlain || calendars.length !== 1 || calendars.length + names.size !== held.length) {
    return 'archive-holds-other';
  }
  const isLarge =
    calendars.some(({ bytes }) => bytes > CALENDAR_FILE_MAX_BYTES) ||
    media.some(({ bytes }) => bytes > AUDIO_PART_MAX_BYTES) ||
    media.some(({ bytes, packedBytes }) => bytes > packedBytes * CALENDAR_ARCHIVE_RATIO_MAX) ||
    held.reduce((sum, { bytes }) => sum + bytes, 0) > CALENDAR_ARCHIVE_MAX_BYTES;
  return isLarge ? 'archive-too-large' : null;
}

/** Some programs write the folder down, too. */
function isFolder({ path, bytes }: PackedFile): boolean {
  return path === ARCHIVE_FOLDER && bytes === 0;
}

function isPlainFile({ externalFileAttributes }: PackedFile): boolean {
  const kind = (externalFileAttributes >>> 16) & KIND_OF_FILE;
  return kind === 0 || kind === PLAIN_FILE;
}
