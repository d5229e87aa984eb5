import { describe, expect, it } from 'vitest';
import { allZones, offsetName, offsetsMin, zoneName } from '#src/features/places/model/time-zone.js';

describe('the clock of a place', () => {
  it('is told by its distance from UTC, winter and summer', () => {
    expect(offsetsMin('Africa/Addis_Ababa', 2027)).toEqual({ january: 180, july: 180 });
    expect(offsetsMin('Europe/Stockholm', 2027)).toEqual({ january: 60, july: 120 });
    expect(offsetsMin('Asia/Kathmandu', 2027)).toEqual({ january: 345, july: 345 });
    expect(offsetsMin('America/Lima', 2027)).toEqual({ january: -300, july: -300 });
    expect(offsetsMin('Nowhere/At_All', 2027)).toBeNull();
  });

  it('reads as people write it', () => {
    expect([180, 345, -210, 0].map(offsetName)).toEqual(['UTC+3', 'UTC+5:45', 'UTC−3:30', 'UTC']);
    expect(zoneName('America/Argentina/Buenos_Aires')).toBe('America/Argentina/Buenos Aires');
  });

  it('that this device lists under another name still stands in the list', () => {
    expect(allZones(['Etc/GMT+3', ''])).toContain('Etc/GMT+3');
    expect(allZones([''])).not.toContain('');
  });
});
