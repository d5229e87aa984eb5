/**
 * The one door of the numeric core: it checks arguments (SkyRangeError names the field and the remedy), takes degrees
 * and gives words and numbers. Nothing here reads a clock, a file or a screen; the same question has the same answer.
 *
 * Conventions: east longitude positive; azimuth from north through east; astronomical years (0 = 1 BC), Gregorian
 * from 1583 and Julian before; times are Julian Days of UT (`jdUt`); star and Sun without refraction, Sun's centre.
 * Sources: SOURCES.md.
 */
import {
  assertDate,
  assertDayNumber,
  assertFinite,
  assertLongitude,
  assertOneOf,
  assertQuestion,
  assertSettings,
  assertSite,
  assertYear,
  assertYears,
} from './argument-checks.js';
import { airYearOf } from './air/air-year.js';
import type { AirYear } from './air/air-types.js';
import { compassPoint as nearestPoint } from './horizon/compass.js';
import { latitudeOf } from './horizon/horizontal.js';
import { prepareSkyline } from './horizon/skyline.js';
import { lookAt } from './look/look-at.js';
import { moonOverPlaceOf } from './look/moon-over-place.js';
import { moonThen } from './look/moon-then.js';
import { skyAt } from './look/sky-at.js';
import type { Look } from './look/look-types.js';
import { assertFigures } from './markers/figure-checks.js';
import { depthAtCrossingOf, expectedDatesOf } from './markers/expected-dates.js';
import { DriftSolver, gregorianShiftDays as shiftDays } from './markers/marker-drift.js';
import { markerKeyOf, type ResolvedMarker, resolveMarker } from './markers/marker-key.js';
import { markerYearOf } from './markers/marker-year.js';
import { markerAtPlace, placeYearOf } from './markers/place-year.js';
import { yearStripOf } from './markers/year-strip.js';
import { sinDeepestSun } from './phenomena/deepest-sun.js';
import { moonPhasesOf } from './phenomena/moon-phases.js';
import { type PreparedYear, prepareYear as prepare } from './phenomena/prepared-year.js';
import type { Ground } from './phenomena/skyline-crossing.js';
import { watchTimesOf } from './phenomena/watch-times.js';
import { preparedYearOf } from './phenomena/year-cache.js';
import { assertSkyMarkerSpec, skyMarkerYearOf } from './sky-markers/sky-marker-year.js';
import { dayClockOf, labelledDay } from './time/civil-day.js';
import { FIRST_GREGORIAN_YEAR } from './time/civil-year.js';
import {
  type Calendar,
  dayNumberOf as countDays,
  gregorianOf as gregorianLabel,
  julianOf as julianLabel,
} from './time/julian-day.js';
import { assertTimeZone } from './time/zone-offset.js';
import type {
  CalendarDate,
  CivilDay,
  DepthAtCrossingCase,
  DepthAtCrossingYear,
  ExpectedDates,
  Figure,
  MarkerDrift,
  MarkerKey,
  MarkerYear,
  MoonOverPlace,
  MoonPhase,
  Site,
  SkylinePoint,
  SkyMarkerSpec,
  SkyMarkerYear,
  StripSegment,
  VisibilitySettings,
  WatchTimes,
} from './types.js';
import { RAD_PER_DEG, DEG_PER_RAD } from './units/angle.js';
import { SkyRangeError } from './units/sky-range-error.js';
import type { CompassPoint, Moonlight } from './vocabulary.js';
import { WATCH_SIDES, type WatchSide } from './vocabulary.js';

export type * from './types.js';
export type * from './air/air-types.js';
export type * from './look/look-types.js';
export * from './moon-door.js';
export * from './vocabulary.js';
export { MOON_QUARTERS } from './types.js';
export { ELEVATION_M, SHIFT_DEG, SKYLINE_ALTITUDE_DEG, THRESHOLD_DEG } from './argument-checks.js';
export { FIGURES } from './markers/figures.js';
export { markerKeyOf, type ResolvedMarker, resolveMarker } from './markers/marker-key.js';
export type { PreparedYear } from './phenomena/prepared-year.js';
export { findStar, starPlaceJ2000, STARS } from './stars/star-table.js';
export type { Calendar } from './time/julian-day.js';
export { SkyRangeError } from './units/sky-range-error.js';
export { CLARITY_SHIFT_DEG } from './visibility/clarity.js';
export { PATCH_CLASS_FACTS, type PatchClassFacts } from './visibility/patch-classes.js';
export {
  THRESHOLD_CONVENTION,
  THRESHOLD_SET_FACTS,
  type ThresholdSetFacts,
} from './visibility/threshold-sets.js';

/** A value from outside in a sentence; text in quotes, so that an empty one is seen. */
function shown(value: unknown): string {
  return typeof value === 'string' ? `"${value}"` : String(value);
}

function markerOf(markerKey: MarkerKey, figures: readonly Figure[]): ResolvedMarker {
  const marker = resolveMarker(markerKey, figures);
  if (!marker) {
    throw new SkyRangeError(
      'markerKey',
      `"${markerKey}" is no marker; give hr and a number of the star table, or a figure.`,
    );
  }
  return marker;
}

function groundOf(site: Site): Ground {
  return {
    latitude: latitudeOf(site.latitudeDeg * RAD_PER_DEG),
    longitudeRad: site.longitudeDeg * RAD_PER_DEG,
    skyline: prepareSkyline(site.skyline),
  };
}

/**
 * Prepares a year once for many places (Sun, obliquity, precession, sidereal time). The functions below do this by
 * themselves and keep the last years; hand one over only to measure or to control the work.
 */
export function prepareYear(year: number): PreparedYear {
  assertYear(year);
  return prepare(year);
}

/**
 * The year of one star or figure at a place: outcome, four phenomena with ranges, nights hidden, notes, basis.
 * @param figures a community's own figures; their keys stand beside the built-in ones
 */
export function computeMarkerYear(
  markerKey: MarkerKey,
  site: Site,
  settings: VisibilitySettings,
  year: number,
  figures: readonly Figure[] = [],
): MarkerYear {
  return computeSkyYear([markerKey], site, settings, year, figures)[0] as MarkerYear;
}

/** The same for many markers; place and year are prepared once. Results in the order of the keys. */
export function computeSkyYear(
  markerKeys: readonly MarkerKey[],
  site: Site,
  settings: VisibilitySettings,
  year: number,
  figures: readonly Figure[] = [],
): MarkerYear[] {
  assertSite(site);
  assertSettings(settings);
  assertYear(year);
  assertFigures(figures);
  const markers = markerKeys.map((markerKey) => markerOf(markerKey, figures));
  const placeYear = placeYearOf(preparedYearOf(year), site, settings);
  return markers.map((marker) => markerYearOf(placeYear, marker));
}

/**
 * One marker at a place in each of some years: four phenomena with ranges and the Sun's longitude, the pace in days per
 * century, and where a phenomenon begins or ceases to exist. Only the instants that are asked for are solved.
 * @param years whole years from −3000 to 3000, ascending
 */
export function driftOf(
  markerKey: MarkerKey,
  site: Site,
  settings: VisibilitySettings,
  years: readonly number[],
  figures: readonly Figure[] = [],
): MarkerDrift {
  assertFigures(figures);
  assertSite(site);
  assertSettings(settings);
  assertYears(years);
  return new DriftSolver(markerOf(markerKey, figures), site, settings).solve(years);
}

/** How many days later in the Gregorian year the second instant (JD UT) falls than the first, −183 to 183. */
export function gregorianShiftDays(fromJdUt: number, toJdUt: number): number {
  assertFinite('fromJdUt', fromJdUt);
  assertFinite('toJdUt', toJdUt);
  return shiftDays(fromJdUt, toJdUt);
}

/**
 * Expected days of the whole star table, without ranges: 4 day numbers per star in the order of PHENOMENA, 0 where
 * there is none in the civil year (the first one where there are two).
 */
export function expectedDates(
  site: Site,
  settings: VisibilitySettings,
  year: number,
  prepared?: PreparedYear,
): ExpectedDates {
  assertSite(site);
  assertSettings(settings);
  assertYear(year);
  return expectedDatesOf(prepared ?? preparedYearOf(year), site, settings);
}

/** Dates by the depth at the crossing with thresholds exactly as given: the rule of the `dates` command. */
export function depthAtCrossingYear(question: DepthAtCrossingCase): DepthAtCrossingYear {
  assertQuestion(question);
  const marker = resolveMarker(markerKeyOf(question.hr));
  if (!marker)
    throw new SkyRangeError('hr', `Give an HR number of the star table; ${shown(question.hr)} is not in it.`);
  return depthAtCrossingOf(preparedYearOf(question.year), marker, question);
}

/**
 * What the marker does on each night of the civil year, as runs of nights in one state. A night runs from noon to noon
 * and carries the day number of its evening: the first morning seen on day N belongs to the night N − 1.
 * @param markerYear a result of computeMarkerYear for the same site, settings and figures
 */
export function yearStrip(
  markerYear: MarkerYear,
  site: Site,
  settings: VisibilitySettings,
  figures: readonly Figure[] = [],
): StripSegment[] {
  assertSite(site);
  assertSettings(settings);
  assertYear(markerYear.year);
  assertFigures(figures);
  const placeYear = placeYearOf(preparedYearOf(markerYear.year), site, settings);
  return yearStripOf(markerAtPlace(placeYear, markerOf(markerYear.markerKey, figures)));
}

/**
 * The year of a marker beyond a star's first and last days (a culmination, the Sun at a point of the skyline, the light
 * nights …): its days with ranges, or the reason why there are none. Sources and accuracy: the file of its kind.
 * @param figures a community's own figures, patches of sky among them; their keys stand beside the built-in ones
 */
export function computeSkyMarker(
  spec: SkyMarkerSpec,
  site: Site,
  settings: VisibilitySettings,
  year: number,
  figures: readonly Figure[] = [],
): SkyMarkerYear {
  assertFigures(figures);
  assertSkyMarkerSpec(spec, figures);
  assertSite(site);
  assertSettings(settings);
  assertYear(year);
  return skyMarkerYearOf(spec, { ...placeYearOf(preparedYearOf(year), site, settings), site, figures });
}

/** The civil year that a day belongs to, if the engine offers it. */
function civilYearOfDay(dayNumber: number): number {
  assertDayNumber(dayNumber);
  const gregorianYear = gregorianLabel(dayNumber).year;
  const year = gregorianYear >= FIRST_GREGORIAN_YEAR ? gregorianYear : julianLabel(dayNumber).year;
  assertYear(year, 'dayNumber');
  return year;
}

/**
 * A second opinion for one star or figure: the four phenomena by the model of visibility in clear, ordinary and hazy air
 * beside the place's rule and all published threshold sets, and the minutes in which it shows around its dates.
 */
export function computeAirYear(
  markerKey: MarkerKey,
  site: Site,
  settings: VisibilitySettings,
  year: number,
  figures: readonly Figure[] = [],
): AirYear {
  assertFigures(figures);
  assertSite(site);
  assertSettings(settings);
  assertYear(year);
  return airYearOf(
    markerAtPlace(placeYearOf(preparedYearOf(year), site, settings), markerOf(markerKey, figures)),
    site,
  );
}

/** When to stop looking in the morning and to begin in the evening of a civil day, so that nobody looks at the Sun. */
export function watchTimes(site: Site, dayNumber: number): WatchTimes {
  assertSite(site);
  const prepared = preparedYearOf(civilYearOfDay(dayNumber));
  const clock = dayClockOf(site.timeZone, site.longitudeDeg);
  const meanNoonJdUt = dayNumber - site.longitudeDeg / 360;
  return watchTimesOf(prepared, groundOf(site), dayNumber - clock.offsetDays(meanNoonJdUt));
}

/**
 * How deep the Sun sinks at most in the night that begins on the evening of a civil day, degrees below the mathematical
 * horizon; negative where it stays up all night.
 */
export function darkestOfNightDeg(site: Site, dayNumber: number): number {
  assertSite(site);
  const prepared = preparedYearOf(civilYearOfDay(dayNumber));
  return Math.asin(sinDeepestSun(prepared, groundOf(site), dayNumber)) * DEG_PER_RAD;
}

/** The Moon's lit share and altitude over a place at an instant. */
export function moonOverPlace(site: Site, jdUt: number): MoonOverPlace {
  assertSite(site);
  assertFinite('jdUt', jdUt);
  return moonOverPlaceOf(site, jdUt);
}

/** How much the Moon takes from a star or figure at an instant, as `whereToLook` says it: none, some, strong. */
export function moonlightBeside(
  markerKey: MarkerKey,
  site: Site,
  jdUt: number,
  figures: readonly Figure[] = [],
): Moonlight {
  assertFigures(figures);
  assertSite(site);
  assertFinite('jdUt', jdUt);
  const year = preparedYearOf(civilYearOfDay(Math.round(jdUt)));
  const sky = skyAt(year, groundOf(site), jdUt);
  const star = sky.starAt(year.stars.placeOf(markerOf(markerKey, figures).starRef));
  return moonThen(site, sky, star).moonlight;
}

/**
 * Where and when to look for a star or figure on one morning (`dawn`) or evening (`dusk`) of a civil day: its path over the
 * skyline with the Sun's depth along it, when it can be seen, when to stop or to begin, bright stars to start from, planets
 * that could be taken for it, and the Moon. Altitudes are true ones, without refraction. A star that cannot be seen then is
 * a result with an `outcome`, never a failure.
 */
export function whereToLook(
  markerKey: MarkerKey,
  site: Site,
  settings: VisibilitySettings,
  dayNumber: number,
  side: WatchSide,
  figures: readonly Figure[] = [],
): Look {
  assertFigures(figures);
  assertSite(site);
  assertSettings(settings);
  assertOneOf('side', side, WATCH_SIDES);
  const placeYear = placeYearOf(preparedYearOf(civilYearOfDay(dayNumber)), site, settings);
  return lookAt(markerAtPlace(placeYear, markerOf(markerKey, figures)), site, dayNumber, side);
}

/** Altitude of a skyline in a direction; points are joined by straight lines, 0° and 360° are one point. */
export function skylineAltitudeDeg(skyline: readonly SkylinePoint[], azimuthDeg: number): number {
  assertFinite('azimuthDeg', azimuthDeg);
  return prepareSkyline(skyline).altitudeRad(azimuthDeg * RAD_PER_DEG) * DEG_PER_RAD;
}

/** The nearest of sixteen compass directions. */
export function compassPoint(azimuthDeg: number): CompassPoint {
  assertFinite('azimuthDeg', azimuthDeg);
  return nearestPoint(azimuthDeg);
}

/** Instants of new, half and full Moon in a civil year, with a day to either side for the clocks of other zones. */
export function moonPhases(year: number): MoonPhase[] {
  assertYear(year);
  return moonPhasesOf(year);
}

/** Julian Day Number (at noon) of a calendar date. */
export function dayNumberOf(date: CalendarDate, calendar: Calendar): number {
  assertDate(date, calendar);
  return countDays(date, calendar);
}

/** Proleptic Gregorian label of a day number. */
export function gregorianOf(dayNumber: number): CalendarDate {
  assertDayNumber(dayNumber);
  return gregorianLabel(dayNumber);
}

/** Proleptic Julian label of a day number. */
export function julianOf(dayNumber: number): CalendarDate {
  assertDayNumber(dayNumber);
  return julianLabel(dayNumber);
}

/** The civil day that holds an instant: the zone's from 1900 on, local mean solar time before or without a zone. */
export function civilDayOf(jdUt: number, timeZone: string | null, longitudeDeg: number): CivilDay {
  assertFinite('jdUt', jdUt);
  assertLongitude(longitudeDeg, 'longitudeDeg');
  if (timeZone !== null) assertTimeZone(timeZone);
  return labelledDay(dayClockOf(timeZone, longitudeDeg).dayOf(jdUt));
}
