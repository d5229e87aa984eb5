import {
  archivedSha256,
  CALENDAR_ARCHIVE_FILES_MAX,
  isArchivedCalendar,
} from '#shared/contracts/calendar-archive.js';
import { createWriteStream } from 'node:fs';
import { open } from 'node:fs/promises';
import { text } from 'node:stream/consumers';
import { pipeline } from 'node:stream/promises';
import { openPromise, type Entry, type ZipFile } from 'yauzl';
import { invalidField } from '../../http/app-error.js';
import { archiveFault } from './archive-rules.js';

const OWNER_ONLY = 0o600;

/** A calendar that came with its voices and pictures. */
export interface CalendarArchive {
  /** The calendar's own file. */
  json: string;
  has: (sha256: string) => boolean;
  /**
   * Puts one file where it can be looked at, under a path that nothing stands at yet.
   * @returns false where what is packed cannot be unpacked
   */
  unpack: (sha256: string, toPath: string) => Promise<boolean>;
}

/** By its beginning, for names of files say little. */
export async function isArchive(filePath: string): Promise<boolean> {
  const file = await open(filePath, 'r');
  try {
    const { buffer } = await file.read(Buffer.alloc(4), 0, 4, 0);
    return buffer.toString('latin1') === 'PK\u0003\u0004';
  } finally {
    await file.close();
  }
}

/**
 * Opens a ZIP for as long as `work` takes. Its list of files is held against the rules before any of them is unpacked, and
 * none can be longer than the list says.
 * @throws {AppError} naming what is the matter
 */
export async function withCalendarArchive<T>(
  filePath: string,
  work: (archive: CalendarArchive) => Promise<T>,
): Promise<T> {
  const zip = await openPromise(filePath, { autoClose: false, decodeStrings: false }).catch(unreadable);
  try {
    if (zip.entryCount > CALENDAR_ARCHIVE_FILES_MAX) throw invalidField('file', 'archive-too-large');
    const entries = await entriesOf(zip).catch(unreadable);
    const fault = archiveFault(entries.map(packedFile));
    if (fault !== null) throw invalidField('file', fault);
    const calendar = entries.find((entry) => isArchivedCalendar(pathOf(entry)));
    const files = new Map(entries.map((entry) => [archivedSha256(pathOf(entry)), entry]));
    const json = calendar && (await zip.openReadStreamPromise(calendar).then(text).catch(unreadable));
    if (json === undefined) throw invalidField('file', 'archive-holds-other');
    return await work({
      json,
      has: (sha256) => files.has(sha256),
      unpack: async (sha256, toPath) => {
        const entry = files.get(sha256);
        return entry !== undefined && unpack(zip, entry, toPath);
      },
    });
  } finally {
    zip.close();
  }
}

async function entriesOf(zip: ZipFile): Promise<Entry[]> {
  const entries: Entry[] = [];
  for await (const entry of zip.eachEntry()) entries.push(entry);
  return entries;
}

function packedFile(entry: Entry) {
  const { uncompressedSize: bytes, compressedSize: packedBytes, externalFileAttributes } = entry;
  return {
    ...{ path: pathOf(entry), bytes, packedBytes, externalFileAttributes },
    isEncrypted: entry.isEncrypted(),
  };
}

/** As it is written there: only the very paths of the rules are known, and none is ever a path of this machine. */
function pathOf({ fileNameRaw }: Entry): string {
  return fileNameRaw.toString('utf8');
}

async function unpack(zip: ZipFile, entry: Entry, toPath: string): Promise<boolean> {
  try {
    const content = await zip.openReadStreamPromise(entry);
    await pipeline(content, createWriteStream(toPath, { flags: 'wx', mode: OWNER_ONLY }));
    return true;
  } catch (cause) {
    if (isOfThisMachine(cause)) throw cause;
    return false;
  }
}

function unreadable(cause: unknown): never {
  throw isOfThisMachine(cause) ? cause : invalidField('file', 'archive-unreadable');
}

/** A full disk is no fault of the file. */
function isOfThisMachine(cause: unknown): boolean {
  return typeof cause === 'object' && cause !== null && 'syscall' in cause;
}
