import { describe, expect, it } from 'vitest';

import { dayClockOf, labelledDay } from '#shared/sky/time/civil-day.js';

describe('the clock of a place', () => {
  it('counts days from midnight of local mean solar time without a zone', () => {
    const clock = dayClockOf(null, 90);
    // 18h UT is midnight at 90° E.
    expect(clock.dayOf(2_461_000.2499)).toBe(2_461_000);
    expect(clock.dayOf(2_461_000.2501)).toBe(2_461_001);
  });

  it('follows the zone from 1900 on and the Sun before', () => {
    const clock = dayClockOf('Asia/Kathmandu', 84);
    expect(clock.offsetDays(2_461_500) * 24).toBeCloseTo(5.75, 9);
    expect(clock.offsetDays(2_000_000)).toBeCloseTo(84 / 360, 12);
  });

  it('lets a night run from noon to noon under the number of its evening', () => {
    const clock = dayClockOf(null, 0);
    const evening = 2_461_000.3;
    const nextMorning = 2_461_000.7;
    expect(clock.nightOf(evening)).toBe(2_461_000);
    expect(clock.nightOf(nextMorning)).toBe(2_461_000);
    expect([clock.dayOf(evening), clock.dayOf(nextMorning)]).toEqual([2_461_000, 2_461_001]);
  });

  it('labels a day in both calendars', () => {
    expect(labelledDay(2_299_161)).toEqual({
      dayNumber: 2_299_161,
      gregorian: { year: 1582, month: 10, day: 15 },
      julian: { year: 1582, month: 10, day: 5 },
    });
  });
});
