import { describe, expect, it } from 'vitest';
import { localTimeOf } from '#server/features/stars/local-time.service.js';

/** Julian Day of an instant: 1970-01-01T00:00Z is JD 2440587.5. */
const jdOf = (iso: string) => Date.parse(iso) / 86_400_000 + 2_440_587.5;
const stockholm = { timeZone: 'Europe/Stockholm', longitudeDeg: 18 };

describe('localTimeOf', () => {
  it('goes by the zone’s clock, in summer and in winter', () => {
    expect(localTimeOf(jdOf('2027-01-10T03:15:30Z'), stockholm)).toBe('04:15');
    expect(localTimeOf(jdOf('2027-07-10T03:15:30Z'), stockholm)).toBe('05:15');
  });

  it('cuts seconds off, or rounds a begun minute up where one must not begin too early', () => {
    const instant = jdOf('2027-01-10T03:15:01Z');
    expect(localTimeOf(instant, stockholm, 'down')).toBe('04:15');
    expect(localTimeOf(instant, stockholm, 'up')).toBe('04:16');
    const whole = jdOf('2027-01-10T03:15:00Z');
    expect(localTimeOf(whole, stockholm, 'down')).toBe('04:15');
    expect(localTimeOf(whole, stockholm, 'up')).toBe('04:15');
  });

  it('passes midnight', () => {
    expect(localTimeOf(jdOf('2027-01-10T23:00:00Z'), stockholm)).toBe('00:00');
    expect(localTimeOf(jdOf('2027-01-10T22:59:59Z'), stockholm, 'up')).toBe('00:00');
  });

  it('is local mean solar time before 1900: 18° east is 72 minutes ahead of Greenwich', () => {
    expect(localTimeOf(jdOf('1899-12-31T22:00:00Z'), stockholm)).toBe('23:12');
    expect(localTimeOf(1_705_426.5, { ...stockholm, longitudeDeg: -18 })).toBe('22:48');
  });
});
