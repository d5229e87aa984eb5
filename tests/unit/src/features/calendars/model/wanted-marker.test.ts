import { describe, expect, it } from 'vitest';
import {
  newEntryPath,
  wantedMarker,
  type WantedMarker,
} from '#src/features/calendars/model/wanted-marker.js';

const searchOf = (path: string) => new URL(path, 'http://board.example').searchParams;
const SOLSTICE = { kind: 'sun-season', season: 'june-solstice' } as const;
const WANTED: WantedMarker[] = [
  { type: 'marker', markerKey: 'pleiades', phenomenon: 'heliacal-setting', occurrence: 1 },
  { type: 'marker', markerKey: 'hr2491', phenomenon: 'acronychal-rising', occurrence: 2 },
  { type: 'sky', spec: SOLSTICE, occurrence: 1 },
  { type: 'sky', spec: { kind: 'moon-phase', event: 'full' }, occurrence: 13 },
];

describe('what an entry shall go by', () => {
  it.each(WANTED)('goes through the address unchanged: %j', (wanted) => {
    expect(wantedMarker(searchOf(newEntryPath('c-1', wanted)))).toEqual(wanted);
  });

  it('opens one unsaved entry for each marker, the same again when asked twice', () => {
    const ids = [...WANTED, ...WANTED].map((wanted) => searchOf(newEntryPath('c-1', wanted)).get('entry'));
    expect(new Set(ids).size).toBe(WANTED.length);
  });

  it('is nothing where the address cannot be read', () => {
    for (const search of [
      '',
      'marker=',
      'sky={',
      'sky={"kind":"sun-season","season":"spring"}',
      'sky=null',
    ]) {
      expect(wantedMarker(new URLSearchParams(search)), search).toBeNull();
    }
    const noSuchMoon = new URLSearchParams({ sky: JSON.stringify(SOLSTICE), occurrence: '14' });
    expect(wantedMarker(noSuchMoon)).toBeNull();
  });
});
