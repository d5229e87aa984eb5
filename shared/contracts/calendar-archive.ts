/*
 * A calendar's own file together with the voices and pictures that it lists, as a ZIP: the very same JSON at its root, and the
 * files in one folder, each named by the SHA-256 under which the JSON lists it.
 */

/** Packed as well as unpacked. */
export const CALENDAR_ARCHIVE_MAX_BYTES = 512 * 1024 * 1024;
export const CALENDAR_ARCHIVE_FILES_MAX = 4_000;
/** A voice or a picture that is packed more tightly than this was made to fill a disk: they come to about one. */
export const CALENDAR_ARCHIVE_RATIO_MAX = 100;

export const ARCHIVE_FOLDER = 'files/';

const FILE = /^files\/([0-9a-f]{64})(?:\.[0-9a-z]{1,5})?$/u;
const CALENDAR = /^[^/\\]+\.json$/u;

/** @param ending without its dot, for whoever opens the folder by hand; it is never looked at */
export function archivedPath(sha256: string, ending: string): string {
  return `${ARCHIVE_FOLDER}${sha256}.${ending}`;
}

/** The SHA-256 by which a file of the folder is named; null for every other path. */
export function archivedSha256(path: string): string | null {
  return FILE.exec(path)?.[1] ?? null;
}

export function isArchivedCalendar(path: string): boolean {
  return CALENDAR.test(path);
}
