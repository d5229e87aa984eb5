import { describe, expect, it } from 'vitest';
import { ARCHIVE_BEGINNING_BYTES, beginsAsArchive } from '#src/features/imports/model/archive-beginning.js';
import { zipped } from '#tests/support/zip.js';

const beginning = async (path: string) => {
  const zip = await zipped([{ path, content: 'x'.repeat(2_000) }]);
  return new Uint8Array(zip).buffer.slice(0, ARCHIVE_BEGINNING_BYTES);
};

describe('the beginning of a file', () => {
  it('tells a calendar with its files, packed in whatever order', async () => {
    expect(beginsAsArchive(await beginning('Upper Tazimel 2027 calendar.json'))).toBe(true);
    expect(beginsAsArchive(await beginning('Ŋɔ́rɛ̃ 2027.json'))).toBe(true);
    expect(beginsAsArchive(await beginning(`files/${'a'.repeat(64)}.webm`))).toBe(true);
  });

  it('tells the workbook of a spreadsheet from it, and whatever is no ZIP', async () => {
    expect(beginsAsArchive(await beginning('[Content_Types].xml'))).toBe(false);
    expect(beginsAsArchive(await beginning('sub/calendar.json'))).toBe(false);
    for (const text of [
      '',
      'PK',
      'PK\u0003\u0004',
      '{"format":"dawnpeg-calendar"}',
      'Work;When\nSow;6 July',
    ]) {
      expect(beginsAsArchive(new TextEncoder().encode(text).buffer)).toBe(false);
    }
  });
});
