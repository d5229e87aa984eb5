import { type Calendar, CALENDARS } from './time/julian-day.js';
import { assertTimeZone } from './time/zone-offset.js';
import type { CalendarDate, DepthAtCrossingCase, Site, SkylinePoint, VisibilitySettings } from './types.js';
import { SkyRangeError } from './units/sky-range-error.js';
import { CLARITIES, FIRST_YEAR, LAST_YEAR, SKYLINE_RULES, THRESHOLD_SETS } from './vocabulary.js';

/** The checks at the core's door. Each throws a SkyRangeError that names the field and what would be right. */

export const SKYLINE_ALTITUDE_DEG = { min: -5, max: 60 } as const;
export const SHIFT_DEG = { min: -10, max: 10 } as const;
export const ELEVATION_M = { min: -500, max: 9000 } as const;
export const THRESHOLD_DEG = { min: 0, max: 45 } as const;

function assertNumber(
  field: string,
  value: unknown,
  min: number,
  max: number,
  unit: string,
): asserts value is number {
  if (typeof value !== 'number' || !Number.isFinite(value) || value < min || value > max) {
    throw new SkyRangeError(field, `Give a number from ${min} to ${max} ${unit}.`.replace(' .', '.'));
  }
}

/** Callers from untyped places (a file, a request) may hand over anything. */
function isPlainObject(value: unknown): value is object {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}

function isList(value: unknown): value is readonly unknown[] {
  return Array.isArray(value);
}

export function assertOneOf(field: string, value: unknown, words: readonly string[]): void {
  if (typeof value !== 'string' || !words.includes(value)) {
    throw new SkyRangeError(field, `Give one of these words: ${words.join(', ')}.`);
  }
}

export function assertYear(year: unknown, field = 'year'): asserts year is number {
  if (typeof year !== 'number' || !Number.isInteger(year) || year < FIRST_YEAR || year > LAST_YEAR) {
    throw new SkyRangeError(
      field,
      `Give a whole year from ${FIRST_YEAR} to ${LAST_YEAR} (0 is 1 BC); outside them the ephemeris is not good enough.`,
    );
  }
}

/** Some years in their order; each one only once. */
export function assertYears(years: readonly number[]): void {
  if (!isList(years) || years.length === 0) throw new SkyRangeError('years', 'Give a list of whole years.');
  years.forEach((year, index) => {
    assertYear(year, `years.${index}`);
    const before = years[index - 1];
    if (before !== undefined && before >= year)
      throw new SkyRangeError(`years.${index}`, 'Give the years in ascending order, each one once.');
  });
}

function assertLatitude(value: unknown, field: string): void {
  assertNumber(field, value, -90, 90, 'degrees, north positive');
}

export function assertLongitude(value: unknown, field: string): void {
  assertNumber(field, value, -180, 180, 'degrees, east positive');
}

function assertSkyline(skyline: readonly SkylinePoint[], field: string): void {
  if (!isList(skyline))
    throw new SkyRangeError(field, 'Give a list of points; an empty one is a flat horizon.');
  const altitudes = new Map<number, number>();
  skyline.forEach((point, index) => {
    const at = `${field}.${index}`;
    assertNumber(`${at}.azimuthDeg`, point.azimuthDeg, 0, 360, 'degrees from north through east');
    assertNumber(
      `${at}.altitudeDeg`,
      point.altitudeDeg,
      SKYLINE_ALTITUDE_DEG.min,
      SKYLINE_ALTITUDE_DEG.max,
      'degrees above the horizon',
    );
    if (altitudes.has(point.azimuthDeg))
      throw new SkyRangeError(`${at}.azimuthDeg`, 'Give each azimuth only once.');
    altitudes.set(point.azimuthDeg, point.altitudeDeg);
  });
  const [atZero, atFullTurn] = [altitudes.get(0), altitudes.get(360)];
  if (atZero !== undefined && atFullTurn !== undefined && atZero !== atFullTurn) {
    throw new SkyRangeError(field, '0° and 360° are the same point; give both the same altitude.');
  }
}

export function assertSite(site: Site): void {
  if (!isPlainObject(site)) throw new SkyRangeError('site', 'Give a place.');
  assertLatitude(site.latitudeDeg, 'site.latitudeDeg');
  assertLongitude(site.longitudeDeg, 'site.longitudeDeg');
  assertNumber('site.elevationM', site.elevationM, ELEVATION_M.min, ELEVATION_M.max, 'metres');
  if (site.timeZone !== null) assertTimeZone(site.timeZone);
  assertSkyline(site.skyline, 'site.skyline');
}

export function assertSettings(settings: VisibilitySettings): void {
  if (!isPlainObject(settings)) throw new SkyRangeError('settings', 'Give the settings.');
  assertOneOf('settings.thresholdSet', settings.thresholdSet, THRESHOLD_SETS);
  assertOneOf('settings.skylineRule', settings.skylineRule, SKYLINE_RULES);
  assertNumber(
    'settings.sameSideShiftDeg',
    settings.sameSideShiftDeg,
    SHIFT_DEG.min,
    SHIFT_DEG.max,
    'degrees',
  );
  assertNumber(
    'settings.oppositeSideShiftDeg',
    settings.oppositeSideShiftDeg,
    SHIFT_DEG.min,
    SHIFT_DEG.max,
    'degrees',
  );
  const months = settings.clarityByMonth;
  if (!isList(months) || months.length !== 12) {
    throw new SkyRangeError('settings.clarityByMonth', 'Give twelve words, January first.');
  }
  months.forEach((clarity, index) => {
    assertOneOf(`settings.clarityByMonth.${index}`, clarity, CLARITIES);
  });
}

export function assertQuestion(question: DepthAtCrossingCase): void {
  if (!isPlainObject(question)) {
    throw new SkyRangeError(
      'case',
      'Give an object with hr, latitudeDeg, longitudeDeg, year, skylineDeg, thresholdsDeg.',
    );
  }
  assertLatitude(question.latitudeDeg, 'latitudeDeg');
  assertLongitude(question.longitudeDeg, 'longitudeDeg');
  assertYear(question.year);
  assertNumber(
    'skylineDeg',
    question.skylineDeg,
    SKYLINE_ALTITUDE_DEG.min,
    SKYLINE_ALTITUDE_DEG.max,
    'degrees',
  );
  if (!isPlainObject(question.thresholdsDeg)) {
    throw new SkyRangeError('thresholdsDeg', 'Give an object with sameSide and oppositeSide.');
  }
  for (const side of ['sameSide', 'oppositeSide'] as const) {
    const value = question.thresholdsDeg[side];
    assertNumber(`thresholdsDeg.${side}`, value, THRESHOLD_DEG.min, THRESHOLD_DEG.max, 'degrees of depth');
  }
}

export function assertDayNumber(dayNumber: unknown, field = 'dayNumber'): asserts dayNumber is number {
  if (typeof dayNumber !== 'number' || !Number.isInteger(dayNumber)) {
    throw new SkyRangeError(field, 'Give a whole Julian Day Number.');
  }
}

export function assertDate(date: CalendarDate, calendar: Calendar): void {
  assertOneOf('calendar', calendar, CALENDARS);
  for (const field of ['year', 'month', 'day'] as const) {
    if (!Number.isInteger(date[field])) throw new SkyRangeError(`date.${field}`, 'Give a whole number.');
  }
  assertNumber('date.month', date.month, 1, 12, '');
  assertNumber('date.day', date.day, 1, 31, '');
}

export function assertFinite(field: string, value: unknown): void {
  if (typeof value !== 'number' || !Number.isFinite(value))
    throw new SkyRangeError(field, 'Give a finite number.');
}

/** A whole number of a short list: a count, a month. */
export function assertWhole(field: string, value: unknown, min: number, max: number): void {
  if (typeof value !== 'number' || !Number.isInteger(value) || value < min || value > max)
    throw new SkyRangeError(field, `Give a whole number from ${min} to ${max}.`);
}
