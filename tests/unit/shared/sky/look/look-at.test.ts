import { describe, expect, it } from 'vitest';

import { computeMarkerYear, SkyRangeError, watchTimes, whereToLook } from '#shared/sky/index.js';
import type { Look, Phenomenon, Site, VisibilitySettings } from '#shared/sky/index.js';
import { settingsWith, siteAt } from '#tests/support/sky/builders.js';

const JD_2027_01_01 = 2_461_407;
const MINUTE = 1 / 1440;

function expectedDay(key: string, phenomenon: Phenomenon, site: Site, settings: VisibilitySettings): number {
  const [first] = computeMarkerYear(key, site, settings, 2027).phenomena[phenomenon].occurrences;
  if (!first) throw new Error('no date');
  return first.expected.dayNumber;
}
const seenMinutes = ({ seenFromJdUt, seenToJdUt }: Look): number =>
  seenFromJdUt === null || seenToJdUt === null ? 0 : (seenToJdUt - seenFromJdUt) / MINUTE;

describe('geometry that can be checked by hand', () => {
  it('a star of the equator climbs straight up at the equator, a quarter degree a minute', () => {
    // Mintaka, declination −0.3°.
    const { path, comesUpJdUt } = whereToLook(
      'hr1852',
      siteAt(0),
      settingsWith(),
      JD_2027_01_01 + 190,
      'dawn',
    );
    for (const { jdUt, altitudeDeg, azimuthDeg } of path) {
      expect(altitudeDeg).toBeCloseTo(((jdUt - (comesUpJdUt ?? 0)) / MINUTE) * 0.25068, 1);
      if (altitudeDeg > 0 && altitudeDeg < 45) expect(Math.abs(azimuthDeg - 90.3)).toBeLessThan(0.3);
    }
  });

  it('what stands over the hill is what stands over the ground less the hill', () => {
    const site = siteAt(12, 39, { skyline: [{ azimuthDeg: 0, altitudeDeg: 4 }] });
    for (const moment of whereToLook('pleiades', site, settingsWith(), JD_2027_01_01 + 170, 'dawn').path) {
      expect(moment.aboveSkylineDeg).toBeCloseTo(moment.altitudeDeg - 4, 9);
      expect(moment.isUp).toBe(moment.aboveSkylineDeg >= 0);
    }
  });
});

describe('beyond the arctic circle, behind hills', () => {
  it('a watch ends and begins with the times of the day, and there is none under a midnight Sun that only a hill hides', () => {
    const site = siteAt(68, 20, { skyline: [{ azimuthDeg: 0, altitudeDeg: 12 }] });
    for (let day = JD_2027_01_01 + 120; day < JD_2027_01_01 + 240; day += 4) {
      const times = watchTimes(site, day);
      for (const side of ['dawn', 'dusk'] as const) {
        const look = whereToLook('hr7001', site, settingsWith(), day, side);
        expect(look.limitJdUt).toBe(side === 'dawn' ? times.stopLookingJdUt : times.startLookingJdUt);
        expect(look.sunCourse).toBe(side === 'dawn' ? times.dawnSun : times.duskSun);
      }
    }
    const midsummer = JD_2027_01_01 + 171;
    expect(watchTimes(site, midsummer)).toMatchObject({ stopLookingJdUt: null, startLookingJdUt: null });
    expect(whereToLook('hr7001', site, settingsWith(), midsummer, 'dawn').outcome).toBe('sun-stays-up');
  });
});

describe.each([
  ['Sirius at 12° N', 'hr2491', siteAt(12, 39)],
  [
    'the Pleiades behind hills at 14° S',
    'pleiades',
    siteAt(-14, -70, { skyline: [{ azimuthDeg: 0, altitudeDeg: 7 }] }),
  ],
  ['Spica at 40° N', 'hr5056', siteAt(40, 20)],
])('%s', (_, key, site) => {
  const settings = settingsWith();

  it('is seen on its first morning, before the time to stop, and not a week before', () => {
    const day = expectedDay(key, 'heliacal-rising', site, settings);
    const first = whereToLook(key, site, settings, day, 'dawn');
    expect(first.outcome).toBe('seen');
    expect(first.limitJdUt).toBe(watchTimes(site, day).stopLookingJdUt);
    expect(first.seenToJdUt).toBeLessThan(first.limitJdUt ?? 0);
    expect(first.comesUpJdUt).toBeLessThanOrEqual((first.seenFromJdUt ?? 0) + MINUTE);
    expect(whereToLook(key, site, settings, day - 7, 'dawn').outcome).not.toBe('seen');
  });

  it('is seen longer from morning to morning', () => {
    const day = expectedDay(key, 'heliacal-rising', site, settings);
    const minutes = [0, 3, 6, 9, 12].map((later) =>
      seenMinutes(whereToLook(key, site, settings, day + later, 'dawn')),
    );
    expect([...minutes].sort((a, b) => a - b)).toEqual(minutes);
  });

  it('is seen on its last evening, after the time to begin, and not a week later', () => {
    const day = expectedDay(key, 'heliacal-setting', site, settings);
    const last = whereToLook(key, site, settings, day, 'dusk');
    expect(last.seenFromJdUt ?? 0).toBeGreaterThan(last.limitJdUt ?? Infinity);
    expect(last.goesDownJdUt ?? 0).toBeGreaterThanOrEqual((last.seenToJdUt ?? Infinity) - MINUTE);
    expect(whereToLook(key, site, settings, day + 7, 'dusk').outcome).not.toBe('seen');
  });
});

describe('a star that is not seen', () => {
  it('is not up before the time to stop: its coming up is told all the same', () => {
    const look = whereToLook('pleiades', siteAt(12, 39), settingsWith(), JD_2027_01_01 + 139, 'dawn');
    expect(look).toMatchObject({ outcome: 'not-up', best: null, pointers: [], planets: [] });
    expect(look.comesUpJdUt).toBeGreaterThan(look.limitJdUt ?? Infinity);
  });

  it('is up in too light a sky: the moment at which least is missing is told', () => {
    const look = whereToLook('hr2491', siteAt(12, 39), settingsWith(), JD_2027_01_01 + 195, 'dawn');
    expect(look).toMatchObject({ outcome: 'too-light', seenFromJdUt: null });
    expect(look.best).toMatchObject({ isUp: true, isSeen: false });
  });

  it('never comes over the skyline: below the ground, or behind the hills', () => {
    const day = JD_2027_01_01 + 200;
    expect(whereToLook('hr2326', siteAt(50), settingsWith(), day, 'dawn')).toMatchObject({
      outcome: 'never-clears-skyline',
      outcomeDetail: 'never-rises',
    });
    const hills = siteAt(33, 0, { skyline: [{ azimuthDeg: 0, altitudeDeg: 9 }] });
    expect(whereToLook('hr2326', hills, settingsWith(), day, 'dawn').outcomeDetail).toBe('below-skyline');
  });

  it('has no watch while the Sun stays up', () => {
    expect(whereToLook('hr7001', siteAt(68), settingsWith(), JD_2027_01_01 + 172, 'dusk')).toMatchObject({
      outcome: 'sun-stays-up',
      sunCourse: 'stays-up',
      limitJdUt: null,
      watchFromJdUt: null,
      path: [],
      moon: null,
    });
  });
});

describe('a star that never sets', () => {
  it('is seen all the watch, without a coming up or a going down', () => {
    const look = whereToLook('hr7001', siteAt(66, 23), settingsWith(), JD_2027_01_01 + 330, 'dawn');
    expect(look).toMatchObject({ outcome: 'seen', comesUpJdUt: null, goesDownJdUt: null });
    expect(look.seenFromJdUt).toBe(look.watchFromJdUt);
  });

  it('is seen in the polar night, where nobody has to stop for the Sun', () => {
    const look = whereToLook('hr7001', siteAt(70, 23), settingsWith(), JD_2027_01_01 + 354, 'dawn');
    expect(look).toMatchObject({ outcome: 'seen', sunCourse: 'stays-down', limitJdUt: null });
  });
});

describe('the path', () => {
  it('is in order of time, covers the watch and holds the moments that are named', () => {
    const look = whereToLook('pleiades', siteAt(12, 39), settingsWith(), JD_2027_01_01 + 160, 'dawn');
    const times = look.path.map(({ jdUt }) => jdUt);
    expect([...times].sort((a, b) => a - b)).toEqual(times);
    expect(new Set(times).size).toBe(times.length);
    expect(times[0]).toBe(look.watchFromJdUt);
    expect(times.at(-1)).toBe(look.watchToJdUt);
    for (const named of [look.seenFromJdUt, look.seenToJdUt, look.best?.jdUt]) expect(times).toContain(named);
    for (const moment of look.path.filter(({ isSeen }) => isSeen)) {
      expect(moment.jdUt).toBeGreaterThanOrEqual(look.seenFromJdUt ?? Infinity);
      expect(moment.jdUt).toBeLessThanOrEqual(look.seenToJdUt ?? 0);
    }
  });

  it('is shorter in hazy air', () => {
    const site = siteAt(12, 39);
    const at = (clarity: 'clear' | 'ordinary' | 'hazy') =>
      seenMinutes(
        whereToLook(
          'pleiades',
          site,
          settingsWith({ clarityByMonth: new Array<typeof clarity>(12).fill(clarity) }),
          JD_2027_01_01 + 165,
          'dawn',
        ),
      );
    expect(at('clear')).toBeGreaterThan(at('ordinary'));
    expect(at('ordinary')).toBeGreaterThan(at('hazy'));
  });
});

describe('the door', () => {
  it('names the field of a wrong argument', () => {
    const ask = (key: string, day: number, side: string) => () =>
      whereToLook(key, siteAt(12), settingsWith(), day, side as 'dawn');
    expect(ask('nothing', JD_2027_01_01, 'dawn')).toThrow(SkyRangeError);
    expect(ask('pleiades', JD_2027_01_01 + 0.5, 'dawn')).toThrow(/dayNumber/u);
    expect(ask('pleiades', 9_000_000, 'dawn')).toThrow(/dayNumber/u);
    expect(ask('pleiades', JD_2027_01_01, 'noon')).toThrow(/side: Give one of these words: dawn, dusk/u);
  });
});
