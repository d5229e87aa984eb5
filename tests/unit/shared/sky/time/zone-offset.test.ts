import { describe, expect, it } from 'vitest';

import { assertTimeZone, zoneOffsetsOf } from '#shared/sky/time/zone-offset.js';
import { SkyRangeError } from '#shared/sky/units/sky-range-error.js';

const JD_UNIX_EPOCH = 2_440_587.5;
const jdOf = (iso: string): number => Date.parse(iso) / 86_400_000 + JD_UNIX_EPOCH;
const hours = (zone: string, iso: string): number => zoneOffsetsOf(zone).offsetDays(jdOf(iso)) * 24;

describe('the offset of a zone', () => {
  it.each([
    ['Asia/Kathmandu', '2027-06-01T00:00:00Z', 5.75],
    ['Asia/Kathmandu', '1980-06-01T00:00:00Z', 5.5],
    ['Pacific/Kiritimati', '2027-01-01T00:00:00Z', 14],
    ['Europe/Stockholm', '2027-01-15T00:00:00Z', 1],
    ['Europe/Stockholm', '2027-07-15T00:00:00Z', 2],
    ['America/St_Johns', '2027-07-15T00:00:00Z', -2.5],
  ])('%s at %s is %d hours', (zone, iso, expected) => expect(hours(zone, iso)).toBeCloseTo(expected, 9));

  it('changes at the minute at which summer time begins and ends', () => {
    expect(hours('Europe/Stockholm', '2027-03-28T00:58:00Z')).toBe(1);
    expect(hours('Europe/Stockholm', '2027-03-28T01:02:00Z')).toBe(2);
    expect(hours('Europe/Stockholm', '2027-10-31T00:58:00Z')).toBe(2);
    expect(hours('Europe/Stockholm', '2027-10-31T01:02:00Z')).toBe(1);
  });

  it('sees summer time suspended for a month', () => {
    // Morocco keeps UTC+1 but goes back to UTC for Ramadan: in 2024 from 10 March to 14 April.
    expect(hours('Africa/Casablanca', '2024-03-01T12:00:00Z')).toBe(1);
    expect(hours('Africa/Casablanca', '2024-03-25T12:00:00Z')).toBe(0);
    expect(hours('Africa/Casablanca', '2024-04-20T12:00:00Z')).toBe(1);
  });

  it('of an unknown zone is refused with the remedy', () => {
    expect(() => assertTimeZone('Mars/Olympus')).toThrow(SkyRangeError);
    expect(() => zoneOffsetsOf('')).toThrow(/IANA/);
  });
});
