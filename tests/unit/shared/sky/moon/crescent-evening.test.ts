import { describe, expect, it } from 'vitest';

import { prepareSkyline } from '#shared/sky/horizon/skyline.js';
import { crescentEveningOf, type MoonGround } from '#shared/sky/moon/crescent-evening.js';
import { dayClockOf } from '#shared/sky/time/civil-day.js';
import { dayNumberOf } from '#shared/sky/time/julian-day.js';
import type { SkylinePoint } from '#shared/sky/types.js';

const day = (year: number, month: number, date: number): number =>
  dayNumberOf({ year, month, day: date }, 'gregorian');

function ground(latitudeDeg: number, longitudeDeg: number, skyline: SkylinePoint[] = []): MoonGround {
  return {
    latitudeDeg,
    longitudeDeg,
    skyline: prepareSkyline(skyline),
    clock: dayClockOf(null, longitudeDeg),
  };
}
const level = (altitudeDeg: number): SkylinePoint[] => [{ azimuthDeg: 270, altitudeDeg }];

describe('an evening of the young Moon', () => {
  it('is best looked at four ninths of the lag after sunset', () => {
    const evening = crescentEveningOf(ground(12, 39), day(2027, 2, 8));
    const lag = (evening.moonsetJdUt ?? 0) - (evening.sunsetJdUt ?? 0);
    expect(lag * 1440).toBeGreaterThan(80);
    expect((evening.bestJdUt ?? 0) - (evening.sunsetJdUt ?? 0)).toBeCloseTo((lag * 4) / 9, 9);
    expect(evening.word).toBe('easy');
  });

  it('offers nothing when the Moon is down before the Sun', () => {
    const evening = crescentEveningOf(ground(12, 39), day(2027, 2, 5));
    expect(evening).toMatchObject({ word: 'not-by-eye', bestJdUt: null, yallopQ: null, sun: 'sets' });
  });

  it('loses a word to hills that the Moon sinks behind early, and all of it to hills that hide it from sunset on', () => {
    const flat = crescentEveningOf(ground(12, 39), day(2027, 3, 9));
    const hill = crescentEveningOf(ground(12, 39, level(10)), day(2027, 3, 9));
    const wall = crescentEveningOf(ground(12, 39, level(25)), day(2027, 3, 9));
    expect([flat.word, flat.skyline]).toEqual(['easy', 'over']);
    expect([hill.word, hill.skyline]).toEqual(['if-air-is-clear', 'sinks-early']);
    expect([wall.word, wall.skyline]).toEqual(['not-by-eye', 'behind']);
    expect(hill.yallopQ).toBe(flat.yallopQ);
  });

  it('says so where the Sun does not set, does not rise, or the Moon does not set', () => {
    const midsummer = crescentEveningOf(ground(70, 23), day(2027, 6, 20));
    expect(midsummer).toMatchObject({ sun: 'never-sets', word: 'not-by-eye', sunsetJdUt: null });
    const midwinter = crescentEveningOf(ground(78, 15), day(2027, 1, 11));
    expect(midwinter).toMatchObject({ sun: 'never-rises', word: 'easy', sunsetJdUt: null });
    const spring = crescentEveningOf(ground(66, 23), day(2027, 5, 8));
    expect(spring).toMatchObject({ sun: 'sets', moonsetJdUt: null, word: 'easy' });
    // Without a moonset the lag counts as three hours.
    expect(((spring.bestJdUt ?? 0) - (spring.sunsetJdUt ?? 0)) * 1440).toBeCloseTo(80, 3);
  });

  it('carries the civil day of the place’s own clock', () => {
    const samoa = { ...ground(-14, -172), clock: dayClockOf('Pacific/Apia', -172) };
    // The zone lies beyond the date line: its clock is a day ahead of the Sun's.
    expect(crescentEveningOf(samoa, day(2027, 2, 8)).dayNumber).toBe(day(2027, 2, 9));
    expect(crescentEveningOf(ground(-14, -172), day(2027, 2, 8)).dayNumber).toBe(day(2027, 2, 8));
  });
});
