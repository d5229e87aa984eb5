const BEGINNING = 'PK\u0003\u0004';
const NAME_LENGTH_AT = 26;
const NAME_AT = 30;
/** As much of a file as is needed to tell. */
export const ARCHIVE_BEGINNING_BYTES = 512;

/**
 * Whether a file begins as a ZIP does that holds a calendar: its first file is the calendar or one of the folder. Workbooks of
 * spreadsheets are ZIPs, too, and begin with something else.
 */
export function beginsAsArchive(bytes: ArrayBuffer): boolean {
  const text = new TextDecoder('latin1').decode(bytes);
  if (!text.startsWith(BEGINNING) || bytes.byteLength < NAME_AT) return false;
  const length = new DataView(bytes).getUint16(NAME_LENGTH_AT, true);
  const name = text.slice(NAME_AT, NAME_AT + length);
  return name.startsWith('files/') || /^[^/]+\.json$/u.test(name);
}
