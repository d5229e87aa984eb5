import { describe, expect, it } from 'vitest';
import { archivedPath, archivedSha256, isArchivedCalendar } from '#shared/contracts/calendar-archive.js';

const SUM = '0123456789abcdef'.repeat(4);

describe('a path in a ZIP', () => {
  it('names a voice or a picture by its checksum, with or without an ending', () => {
    expect(archivedPath(SUM, 'webm')).toBe(`files/${SUM}.webm`);
    expect(archivedSha256(archivedPath(SUM, 'webm'))).toBe(SUM);
    expect(archivedSha256(`files/${SUM}`)).toBe(SUM);
  });

  it('names nothing where it is written in any other way', () => {
    const others = [
      ...[`../files/${SUM}`, `files/../${SUM}`, `/files/${SUM}`, `files/${SUM}/x`, `files/${SUM}.a.b`],
      ...[`files/${SUM.toUpperCase()}`, `files/${SUM.slice(1)}`, `files/${SUM}\n`, `x\nfiles/${SUM}`, SUM],
    ];
    expect(others.map(archivedSha256)).toEqual(others.map(() => null));
  });

  it('names the calendar at the root alone', () => {
    expect(isArchivedCalendar('Ŋɔ́rɛ̃ 2027 calendar.json')).toBe(true);
    for (const path of ['files/a.json', '/a.json', '..\\a.json', '.json', 'a.json/']) {
      expect([path, isArchivedCalendar(path)]).toEqual([path, false]);
    }
  });
});
