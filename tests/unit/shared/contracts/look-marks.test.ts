import { describe, expect, it } from 'vitest';
import { limitPoint, lookMarks } from '#shared/contracts/look-marks.js';
import { lookAtPlace } from '#tests/support/look-of-tazimel.js';
import { TAZIMEL } from '#tests/support/stars-of-tazimel.js';

describe('what is said beside the path', () => {
  const at = (marker: string, phenomenon: string, date: string) =>
    lookAtPlace(TAZIMEL, new URLSearchParams({ marker, phenomenon, date }));

  it('on a morning ends with the time to stop, in the order of the clock', async () => {
    const look = await at('pleiades', 'heliacal-rising', '2027-06-10');
    const marks = lookMarks(look);
    expect(marks.map(({ key }) => key)).toEqual(['comesUp', 'tooLight', 'stopLabel']);
    expect(marks.at(-1)?.time).toBe(look.limitAt);
    expect(limitPoint(look)).toMatchObject({ isUp: true, localTime: look.limitAt });
  });

  it('on an evening begins with the time to begin and ends with the setting', async () => {
    const look = await at('hr5056', 'heliacal-setting', '2027-10-01');
    const marks = lookMarks(look);
    expect(marks.map(({ key }) => key)).toEqual(['startLabel', 'darkEnough', 'goesDown']);
    const times = marks.map(({ time }) => time);
    expect([...times].sort()).toEqual(times);
  });

  it('of a star that goes down before the light comes names neither light nor a time to stop', async () => {
    const look = await at('pleiades', 'cosmical-setting', '2027-12-10');
    expect(limitPoint(look)).toBeNull();
    expect(lookMarks(look).map(({ key }) => key)).toEqual(['goesDown']);
  });
});
