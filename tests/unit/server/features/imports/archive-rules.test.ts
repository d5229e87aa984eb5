import { describe, expect, it } from 'vitest';
import { archiveFault, type PackedFile } from '#server/features/imports/archive-rules.js';
import { AUDIO_PART_MAX_BYTES } from '#shared/contracts/attachments.js';
import {
  CALENDAR_ARCHIVE_FILES_MAX,
  CALENDAR_ARCHIVE_MAX_BYTES,
} from '#shared/contracts/calendar-archive.js';
import { CALENDAR_FILE_MAX_BYTES } from '#shared/contracts/calendar-file.js';

/** What a ZIP may be before anything of it is unpacked. */
const packed = (path: string, changes: Partial<PackedFile> = {}): PackedFile => ({
  ...{ path, bytes: 1_000, packedBytes: 1_000, isEncrypted: false, externalFileAttributes: 0 },
  ...changes,
});
const sha = (index: number) => index.toString(16).padStart(64, '0');
const calendar = packed('Upper Tazimel 2027 calendar.json');
const voice = packed(`files/${sha(1)}.webm`);
const ofMode = (mode: number) => ({ externalFileAttributes: (mode << 16) >>> 0 });

describe('a ZIP that may be read', () => {
  it('holds one calendar and files named by their checksums, whoever packed it', () => {
    expect(archiveFault([calendar])).toBeNull();
    expect(
      archiveFault([packed(`files/${sha(2)}`), voice, packed('files/', { bytes: 0 }), calendar]),
    ).toBeNull();
    expect(archiveFault([packed('calendar.json', ofMode(0o100644)), voice])).toBeNull();
    // A calendar of many like entries is pressed to next to nothing.
    expect(archiveFault([packed('calendar.json', { bytes: 9_000_000, packedBytes: 20_000 })])).toBeNull();
  });
});

describe('a ZIP that may not', () => {
  it.each([
    ['a path out of the folder', [packed(`../files/${sha(3)}.webm`)]],
    ['a path out of the folder, written in another way', [packed(`files/..\\${sha(3)}.webm`)]],
    ['a path from the root', [packed(`/files/${sha(3)}.webm`)]],
    ['a folder within', [packed(`files/more/${sha(3)}.webm`)]],
    ['a name that is no checksum', [packed('files/furrow.jpg')]],
    ['a folder of another name', [packed('voices/', { bytes: 0 })]],
    ['a second calendar', [packed('other.json')]],
    ['the same file twice', [voice]],
    ['the same file under two endings', [packed(`files/${sha(1)}.ogg`)]],
    ['a symbolic link', [packed(`files/${sha(3)}.webm`, ofMode(0o120777))]],
    ['a device', [packed(`files/${sha(3)}.webm`, ofMode(0o020666))]],
    ['something beside', [packed('__MACOSX/._calendar')]],
  ])('holds %s', (_what, others) => {
    expect(archiveFault([calendar, voice, ...others])).toBe('archive-holds-other');
  });

  it('holds no calendar at all', () => {
    expect(archiveFault([])).toBe('archive-holds-other');
    expect(archiveFault([voice])).toBe('archive-holds-other');
  });

  it('is locked with a password', () => {
    expect(archiveFault([calendar, packed(voice.path, { isEncrypted: true })])).toBe('archive-unreadable');
  });

  it.each([
    ['a calendar longer than one may be', [packed('a.json', { bytes: CALENDAR_FILE_MAX_BYTES + 1 })]],
    ['a voice longer than a part may be', [calendar, large(1, AUDIO_PART_MAX_BYTES + 1)]],
    ['more than may be unpacked', [calendar, ...many(9, AUDIO_PART_MAX_BYTES)]],
    ['a voice pressed to nothing', [calendar, packed(voice.path, { bytes: 5_000_000, packedBytes: 5_000 })]],
    ['more files than a calendar lists', [calendar, ...many(CALENDAR_ARCHIVE_FILES_MAX, 1)]],
  ])('holds %s', (_what, files) => {
    expect(archiveFault(files)).toBe('archive-too-large');
  });

  it('is told apart from one that is just as large as it may be', () => {
    const eight = many(8, AUDIO_PART_MAX_BYTES);
    const rest = CALENDAR_ARCHIVE_MAX_BYTES - 8 * AUDIO_PART_MAX_BYTES - calendar.bytes;
    expect(archiveFault([calendar, ...eight, large(99, rest)])).toBeNull();
    expect(archiveFault([calendar, ...eight, large(99, rest + 1)])).toBe('archive-too-large');
  });

  function large(index: number, bytes: number): PackedFile {
    return packed(`files/${sha(index)}.webm`, { bytes, packedBytes: bytes });
  }

  function many(count: number, bytes: number): PackedFile[] {
    return Array.from({ length: count }, (_, index) => large(index + 1, bytes));
  }
});
