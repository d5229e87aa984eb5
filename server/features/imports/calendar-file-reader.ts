import {
  CALENDAR_FILE_SCHEMA,
  calendarFileKind,
  readableCalendarFile,
  type ReadableCalendarFile,
} from '#shared/contracts/calendar-file.js';
import { conflict, invalidField } from '../../http/app-error.js';
import { brokenParts } from '../exports/calendar-file.service.js';

/**
 * A calendar's own file from its text: told apart from other files first, then from other forms, then held against its
 * checksums; its shape last.
 * @throws {AppError} with what is the matter and what to do
 */
export function readCalendarFile(text: string): ReadableCalendarFile {
  const raw = jsonOf(text);
  const kind = calendarFileKind.safeParse(raw);
  if (!kind.success) throw invalidField('file', 'not-a-calendar-file');
  const { schemaVersion } = kind.data;
  if (schemaVersion < 1 || schemaVersion > CALENDAR_FILE_SCHEMA) {
    throw conflict('other-file-version', [String(schemaVersion)]);
  }
  if (isBroken(kind.data)) throw conflict('file-changed');
  const file = readableCalendarFile.safeParse(raw);
  if (!file.success) throw invalidField('file', 'not-a-calendar-file');
  return file.data;
}

function jsonOf(text: string): unknown {
  try {
    return JSON.parse(text.replace(/^\ufeff/u, '')) as unknown;
  } catch {
    return null;
  }
}

/** What has no one text, such as half of a surrogate pair, was written by another hand. */
function isBroken(file: Readonly<Record<string, unknown>>): boolean {
  try {
    return brokenParts(file).length > 0;
  } catch {
    return true;
  }
}
