import { describe, expect, it } from 'vitest';

import * as sky from '#shared/sky/index.js';
import { settingsWith, siteAt } from '#tests/support/sky/builders.js';

const settings = settingsWith();

describe('the door of the core', () => {
  it('answers for one marker what it answers for many', () => {
    const site = siteAt(28, 84, { timeZone: 'Asia/Kathmandu' });
    const many = sky.computeSkyYear(['pleiades', 'hr2491'], site, settings, 2027);
    expect(many.map(({ markerKey }) => markerKey)).toEqual(['pleiades', 'hr2491']);
    expect(sky.computeMarkerYear('hr2491', site, settings, 2027)).toEqual(many[1]);
  });

  it('gives a community’s own figure the dates of its indicator star', () => {
    const site = siteAt(12, 39);
    const figure = {
      key: 'f-seed-bowl',
      name: 'Seed bowl',
      indicatorHr: 1457,
      memberHrs: [1412, 1457],
      patch: null,
      thresholdOverride: null,
    };
    const own = sky.computeMarkerYear(figure.key, site, settings, 2027, [figure]);
    const star = sky.computeMarkerYear('hr1457', site, settings, 2027);
    expect(own).toEqual({ ...star, markerKey: figure.key });
    expect(sky.yearStrip(own, site, settings, [figure])).toEqual(sky.yearStrip(star, site, settings));
    expect(() => sky.computeMarkerYear(figure.key, site, settings, 2027)).toThrow(/f-seed-bowl/);
  });

  it('dates a patch of sky as a star at the same place that needs the same depth', () => {
    // 18° deep on both sides at the place of Antares, whose motion is small; the place is that of J2000.
    const site = siteAt(-14, -70);
    const patch = {
      rightAscensionDeg: 247.35167,
      declinationDeg: -26.43194,
      patchClass: 'full-night' as const,
    };
    const figure = {
      key: 'f-dark',
      name: '',
      indicatorHr: null,
      memberHrs: [],
      patch,
      thresholdOverride: null,
    };
    const year = sky.computeMarkerYear(figure.key, site, settings, 2027, [figure]);
    const star = sky.depthAtCrossingYear({
      hr: 6134,
      latitudeDeg: -14,
      longitudeDeg: -70,
      year: 2027,
      skylineDeg: 0,
      thresholdsDeg: { sameSide: 18, oppositeSide: 18 },
    });
    for (const phenomenon of sky.PHENOMENA) {
      const days = year.phenomena[phenomenon].occurrences.map((one) => one.expected.dayNumber);
      expect(days, phenomenon).toEqual(star.dayNumbers?.[phenomenon]);
    }
    expect(year.basis.thresholdSource).toContain('astronomical twilight');
  });

  it('gives the same answer twice, and the same after other years were asked', () => {
    const ask = () => sky.computeMarkerYear('hr5340', siteAt(45), settings, -431);
    const first = ask();
    for (let year = 0; year < 20; year += 1) sky.computeMarkerYear('hr5340', siteAt(45), settings, year);
    expect(ask()).toEqual(first);
  });

  it('refuses what it cannot answer, by field and remedy', () => {
    expect(() => sky.computeMarkerYear('hr1', siteAt(0), settings, 2027)).toThrow(sky.SkyRangeError);
    expect(() => sky.computeSkyYear([], siteAt(95), settings, 2027)).toThrow(/latitudeDeg/);
    expect(() => sky.expectedDates(siteAt(0), settings, 3001)).toThrow(/-3000 to 3000/);
    expect(() => sky.prepareYear(0.5)).toThrow(/year/);
    expect(() => sky.watchTimes(siteAt(0), 0)).toThrow(/dayNumber/);
    expect(() => sky.civilDayOf(NaN, null, 0)).toThrow(/jdUt/);
    expect(() => sky.civilDayOf(2_451_545, 'Nowhere', 0)).toThrow(/timeZone/);
    expect(() => sky.moonPhases(5000)).toThrow(/year/);
    const question = {
      latitudeDeg: 0,
      longitudeDeg: 0,
      year: 0,
      skylineDeg: 0,
      thresholdsDeg: { sameSide: 1, oppositeSide: 1 },
    };
    expect(() => sky.depthAtCrossingYear({ ...question, hr: 9999 })).toThrow(/hr: .*9999/);
  });

  it('speaks degrees', () => {
    const skyline = [
      { azimuthDeg: 90, altitudeDeg: 4 },
      { azimuthDeg: 180, altitudeDeg: 8 },
    ];
    expect(sky.skylineAltitudeDeg(skyline, 135)).toBeCloseTo(6, 9);
    expect(sky.skylineAltitudeDeg([], 12)).toBe(0);
    expect(sky.compassPoint(300)).toBe('wnw');
  });

  it('speaks both calendars', () => {
    const dayNumber = sky.dayNumberOf({ year: 1582, month: 10, day: 15 }, 'gregorian');
    expect(sky.julianOf(dayNumber)).toEqual({ year: 1582, month: 10, day: 5 });
    expect(sky.gregorianOf(dayNumber)).toEqual({ year: 1582, month: 10, day: 15 });
    expect(sky.civilDayOf(dayNumber + 0.4, null, 45).dayNumber).toBe(dayNumber + 1);
  });

  it('tells watch times on the date of the place’s clock, also next to the date line', () => {
    const kiritimati = siteAt(1.9, -157.4, { timeZone: 'Pacific/Kiritimati' });
    const dayNumber = sky.dayNumberOf({ year: 2027, month: 6, day: 1 }, 'gregorian');
    const { flatSunriseJdUt, flatSunsetJdUt } = sky.watchTimes(kiritimati, dayNumber);
    for (const jdUt of [flatSunriseJdUt, flatSunsetJdUt]) {
      expect(sky.civilDayOf(jdUt ?? 0, 'Pacific/Kiritimati', -157.4).dayNumber).toBe(dayNumber);
    }
  });

  it('tells how dark a night gets: the Sun stays up at midsummer inside the polar circle', () => {
    const dayOf = (month: number) => sky.dayNumberOf({ year: 2027, month, day: 21 }, 'gregorian');
    // At its lower culmination the Sun stands 90° − latitude − declination below the horizon.
    expect(sky.darkestOfNightDeg(siteAt(66), dayOf(6))).toBeCloseTo(90 - 66 - 23.44, 1);
    expect(sky.darkestOfNightDeg(siteAt(70), dayOf(6))).toBeLessThan(0);
    expect(sky.darkestOfNightDeg(siteAt(66), dayOf(12))).toBeCloseTo(90 - 66 + 23.44, 1);
  });

  it('draws the strip of the year that it is given', () => {
    const site = siteAt(28);
    const strip = sky.yearStrip(sky.computeMarkerYear('pleiades', site, settings, 1200), site, settings);
    expect(sky.julianOf(strip[0]?.fromDayNumber ?? 0)).toEqual({ year: 1200, month: 1, day: 1 });
    expect(sky.julianOf(strip.at(-1)?.toDayNumber ?? 0)).toEqual({ year: 1200, month: 12, day: 31 });
  });

  it('keeps its tables to itself', () => {
    expect(Object.isFrozen(sky.STARS)).toBe(true);
    expect(Object.isFrozen(sky.STARS[0])).toBe(true);
    expect(sky.findStar(1165)?.name).toBe('Alcyone');
  });
});
