import { describe, expect, it } from 'vitest';

import {
  assertDate,
  assertDayNumber,
  assertFinite,
  assertQuestion,
  assertSettings,
  assertSite,
  assertYear,
} from '#shared/sky/argument-checks.js';
import type { DepthAtCrossingCase, Site } from '#shared/sky/types.js';
import { SkyRangeError } from '#shared/sky/units/sky-range-error.js';
import { settingsWith, siteAt } from '#tests/support/sky/builders.js';

/** The field that a check complains about, or null when all is right. */
function complaint(check: () => void): string | null {
  try {
    check();
    return null;
  } catch (error) {
    if (!(error instanceof SkyRangeError)) throw error;
    expect(error.remedy).toMatch(/\.$/);
    expect(error.message).toContain(error.field);
    return error.field;
  }
}

describe('arguments', () => {
  it.each([-3000, 0, 3000])('may be the year %i', (year) =>
    expect(complaint(() => assertYear(year))).toBeNull(),
  );

  it.each([-3001, 3001, 2027.5, NaN, '2027', null])('may not be the year %s', (year) => {
    expect(complaint(() => assertYear(year))).toBe('year');
  });

  const badSites: [string, Partial<Site>][] = [
    ['site.latitudeDeg', { latitudeDeg: 90.1 }],
    ['site.latitudeDeg', { latitudeDeg: NaN }],
    ['site.longitudeDeg', { longitudeDeg: -181 }],
    ['site.elevationM', { elevationM: 9500 }],
    ['timeZone', { timeZone: 'Nowhere/Land' }],
    ['site.skyline.0.azimuthDeg', { skyline: [{ azimuthDeg: 361, altitudeDeg: 0 }] }],
    [
      'site.skyline.1.altitudeDeg',
      {
        skyline: [
          { azimuthDeg: 0, altitudeDeg: 1 },
          { azimuthDeg: 9, altitudeDeg: 61 },
        ],
      },
    ],
    [
      'site.skyline.1.azimuthDeg',
      {
        skyline: [
          { azimuthDeg: 5, altitudeDeg: 1 },
          { azimuthDeg: 5, altitudeDeg: 1 },
        ],
      },
    ],
    [
      'site.skyline',
      {
        skyline: [
          { azimuthDeg: 0, altitudeDeg: 1 },
          { azimuthDeg: 360, altitudeDeg: 2 },
        ],
      },
    ],
  ];
  it.each(badSites)('of a place are refused by name: %s', (field, part) => {
    expect(complaint(() => assertSite(siteAt(30, 0, part)))).toBe(field);
  });

  it('of a place may close the circle at 360°', () => {
    const skyline = [
      { azimuthDeg: 0, altitudeDeg: 2 },
      { azimuthDeg: 360, altitudeDeg: 2 },
    ];
    expect(complaint(() => assertSite(siteAt(-90, 180, { skyline, timeZone: 'Asia/Kathmandu' })))).toBeNull();
  });

  const badSettings: [string, object][] = [
    ['settings.thresholdSet', { thresholdSet: 'four-class' }],
    ['settings.skylineRule', { skylineRule: '' }],
    ['settings.sameSideShiftDeg', { sameSideShiftDeg: 11 }],
    ['settings.oppositeSideShiftDeg', { oppositeSideShiftDeg: Infinity }],
    ['settings.clarityByMonth', { clarityByMonth: ['clear'] }],
    ['settings.clarityByMonth.0', { clarityByMonth: new Array(12).fill('foggy') }],
  ];
  it.each(badSettings)('of the settings are refused by name: %s', (field, part) => {
    expect(complaint(() => assertSettings({ ...settingsWith(), ...part }))).toBe(field);
  });

  const good = {
    hr: 2491,
    latitudeDeg: 30,
    longitudeDeg: 31,
    year: 2000,
    skylineDeg: 0,
    thresholdsDeg: { sameSide: 0, oppositeSide: 7 },
  };
  const badQuestions: [string, unknown][] = [
    ['case', null],
    ['case', []],
    ['case', 'R1'],
    ['latitudeDeg', { ...good, latitudeDeg: '30' }],
    ['longitudeDeg', { ...good, longitudeDeg: undefined }],
    ['year', { ...good, year: 4000 }],
    ['skylineDeg', { ...good, skylineDeg: 61 }],
    ['thresholdsDeg', { ...good, thresholdsDeg: 9 }],
    ['thresholdsDeg.sameSide', { ...good, thresholdsDeg: { oppositeSide: 7 } }],
    ['thresholdsDeg.oppositeSide', { ...good, thresholdsDeg: { sameSide: 7, oppositeSide: -1 } }],
  ];
  it.each(badQuestions)('of a case are refused by name: %s', (field, question) => {
    expect(complaint(() => assertQuestion(question as DepthAtCrossingCase))).toBe(field);
  });

  it('of a case may hold a threshold of 0 and members that nobody asked for', () => {
    const answered = { ...good, outcome: 'never-sets' };
    expect(complaint(() => assertQuestion(answered))).toBeNull();
  });

  it('of the calendar are whole numbers', () => {
    expect(complaint(() => assertDayNumber(2_451_545.5))).toBe('dayNumber');
    expect(complaint(() => assertDate({ year: 2027, month: 13, day: 1 }, 'gregorian'))).toBe('date.month');
    expect(complaint(() => assertDate({ year: 2027, month: 1, day: 1.5 }, 'gregorian'))).toBe('date.day');
    expect(complaint(() => assertFinite('jdUt', NaN))).toBe('jdUt');
  });
});
