import {
  CALENDAR_FILE_FORMAT,
  CALENDAR_FILE_SCHEMA,
  CALENDAR_FILE_PART_SINCE,
  CALENDAR_FILE_PARTS,
  type CalendarFile,
  type CalendarFileMedium,
  type CalendarFilePart,
  type CalendarFileSeason,
} from '#shared/contracts/calendar-file.js';
import { canonicalJson } from '#shared/kernel/canonical-json.js';
import { DEFAULT_LANGUAGE } from '#shared/locales/languages.js';
import { createHash } from 'node:crypto';
import { translatorFor } from '../../print/translator.js';
import type { CalendarContent } from '../versions/frozen-content.service.js';

/** A calendar as a file that can be read back without loss. */
export function calendarFileOf(
  content: CalendarContent,
  calendarId: string,
  exportedAt: Date,
  { media, season }: { media: CalendarFileMedium[]; season: CalendarFileSeason },
): CalendarFile {
  const { number, label, state, hash: versionHash, entries } = content;
  const { salt: _hidden, ...header } = content.header;
  const caution = translatorFor(DEFAULT_LANGUAGE, 'files')('caution');
  const parts = {
    source: {
      ...{ calendarId, number, label, state, versionHash },
      exportedAt: exportedAt.toISOString(),
      cautions: [caution],
    },
    header,
    entries,
    ...{ media, season },
  };
  return {
    format: CALENDAR_FILE_FORMAT,
    schemaVersion: CALENDAR_FILE_SCHEMA,
    ...parts,
    checksums: {
      source: checksumOf(parts.source),
      header: checksumOf(parts.header),
      entries: checksumOf(parts.entries),
      media: checksumOf(parts.media),
      season: checksumOf(parts.season),
    },
  };
}

/** Parts whose text is not what was written. `file` is as it was read, before any schema puts it in order. */
export function brokenParts(file: Readonly<Record<string, unknown>>): CalendarFilePart[] {
  const { checksums } = file;
  const given = new Map<string, unknown>(
    typeof checksums === 'object' && checksums !== null ? Object.entries(checksums) : [],
  );
  const form = Number(file['schemaVersion']);
  return CALENDAR_FILE_PARTS.filter((part) => CALENDAR_FILE_PART_SINCE[part] <= form).filter(
    (part) => file[part] === undefined || checksumOf(file[part]) !== given.get(part),
  );
}

function checksumOf(part: unknown): string {
  return createHash('sha256').update(canonicalJson(part), 'utf8').digest('hex');
}
