import { describe, expect, it } from 'vitest';

import {
  type CivilDay,
  computeMarkerYear,
  countedMoons,
  gregorianOf,
  julianOf,
  moonsBetween,
  reachOfCountDays,
  SkyRangeError,
} from '#shared/sky/index.js';
import { countedMoons as countWithin } from '#shared/sky/moon/counted-moons.js';
import { settingsWith, siteAt } from '#tests/support/sky/builders.js';

const day = (dayNumber: number): CivilDay => ({
  dayNumber,
  gregorian: gregorianOf(dayNumber),
  julian: julianOf(dayNumber),
});
const [site, settings] = [siteAt(12, 39), settingsWith()];
const START = 2_461_407;
const moons = moonsBetween(site, settings, START, START + 500);
const news = moons.map(({ newMoon }) => newMoon.dayNumber).filter((number) => number >= START);

describe('Moons counted from a sign', () => {
  it('begin with the Moon on the very day of the sign', () => {
    const [first = 0, second = 0] = news;
    const on = { expected: day(first), early: day(first), late: day(first) };
    const after = { expected: day(first + 1), early: day(first + 1), late: day(first + 1) };
    const found = countedMoons([on, after], moons, 'new', 1);
    expect(found.map(({ moon }) => moon.expected.dayNumber)).toEqual([first, second]);
    expect(found.map(({ countMayShift }) => countMayShift)).toEqual([false, false]);
  });

  it('say when the sign’s range crosses such a Moon', () => {
    const [first = 0] = news;
    const near = { expected: day(first + 1), early: day(first - 3), late: day(first + 5) };
    const far = { expected: day(first + 10), early: day(first + 6), late: day(first + 14) };
    const [shifting, steady] = countWithin([near, far], moons, 'new', 3);
    expect(shifting?.countMayShift).toBe(true);
    expect(steady?.countMayShift).toBe(false);
  });

  it('reach the thirteenth full Moon after the Pleiades’ first morning within the stated span', () => {
    const { phenomena } = computeMarkerYear('pleiades', site, settings, 2027);
    const [occurrence] = phenomena['heliacal-rising'].occurrences;
    if (!occurrence) throw new Error('no first morning');
    const { dayNumber } = occurrence.expected;
    const span = moonsBetween(site, settings, dayNumber, dayNumber + reachOfCountDays(13));
    const [counted] = countedMoons([occurrence], span, 'full', 13);
    expect(counted?.moon.expected.dayNumber).toBeGreaterThan(dayNumber + 12 * 29.4);
    expect(counted?.moon.expected.dayNumber).toBeLessThanOrEqual(dayNumber + reachOfCountDays(13));
  });

  it('are counted with whole numbers from 1 to 13', () => {
    expect(() => countedMoons([], moons, 'new', 0)).toThrow(SkyRangeError);
    expect(() => countedMoons([], moons, 'new', 14)).toThrow(SkyRangeError);
  });
});
