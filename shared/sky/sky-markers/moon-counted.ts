import { placeYearOf, markerAtPlace } from '../markers/place-year.js';
import { resolveMarker } from '../markers/marker-key.js';
import { phenomenonInYear } from '../markers/phenomenon-in-year.js';
import { countedMoons, type CountedMoon, reachOfCountDays } from '../moon/counted-moons.js';
import type { Lunation } from '../moon/moon-types.js';
import { lunationsAt, moonDayOf } from '../moon/moon-year.js';
import { MOON_EVENTS } from '../moon/words.js';
import { preparedYearOf } from '../phenomena/year-cache.js';
import type { Occurrence } from '../types.js';
import { FIRST_YEAR, LAST_YEAR, PHENOMENA } from '../vocabulary.js';
import { dated, type SkyMarkerKindRules, type SkyMarkerPlace, undated } from './kind.js';
import { isOfYear, moonOccurrence } from './moon-occurrence.js';
import { checkNumber, checkWord } from './spec-checks.js';
import { knownMarker } from './star-look.js';
import type { MoonCountedSpec, SkyMarkerOccurrence } from './types.js';
import { MOON_COUNT } from './words.js';

/** The thirteenth Moon comes up to thirteen months after its sign. */
const YEARS_BACK = [2, 1, 0] as const;
/** A lunation lasts at least so long, so that a sign cannot lead beyond the year sooner. */
const SHORTEST_MOON_DAYS = 29;
/** Days of range that a sign may be away from its expected day. */
const SIGN_REACH_DAYS = 60;

function signsAround(spec: MoonCountedSpec, place: SkyMarkerPlace): Occurrence[] {
  const marker = resolveMarker(spec.markerKey, place.figures);
  if (!marker) return [];
  const years = YEARS_BACK.map((back) => place.year.civil.year - back).filter(
    (year) => year >= FIRST_YEAR && year <= LAST_YEAR,
  );
  return years.flatMap((year) => {
    const atPlace = markerAtPlace(placeYearOf(preparedYearOf(year), place.site, place.settings), marker);
    return phenomenonInYear(atPlace, spec.phenomenon).occurrences;
  });
}

/** Could the count from this sign lead into the civil year? */
function mayLeadHere(
  { expected }: Occurrence,
  { count }: MoonCountedSpec,
  { year }: SkyMarkerPlace,
): boolean {
  const soonest = expected.dayNumber + (count - 1) * SHORTEST_MOON_DAYS;
  return soonest <= year.civil.lastDay && expected.dayNumber + reachOfCountDays(count) >= year.civil.firstDay;
}

function lunationOf(lunations: readonly Lunation[], { moon }: CountedMoon): Lunation | undefined {
  return lunations.find(
    (lunation) => moonDayOf(lunation, moon.event)?.expected.dayNumber === moon.expected.dayNumber,
  );
}

function countFrom(sign: Occurrence, spec: MoonCountedSpec, place: SkyMarkerPlace): SkyMarkerOccurrence[] {
  const { dayNumber } = sign.expected;
  const first = sign.early?.dayNumber ?? dayNumber;
  const last = sign.late?.dayNumber ?? dayNumber + SIGN_REACH_DAYS;
  const lunations = lunationsAt(place.site, place.settings, first, last + reachOfCountDays(spec.count));
  return countedMoons([sign], lunations, spec.event, spec.count).flatMap((counted) => {
    const lunation = lunationOf(lunations, counted);
    if (!lunation || !isOfYear(place, counted.moon)) return [];
    return [moonOccurrence(lunation, counted.moon, counted.early, counted.late)];
  });
}

/**
 * The n-th Moon on or after a star's day. Where the star's range crosses such a Moon the count may lead to the
 * neighbouring one, and the range says so: it then spans a month.
 */
export const moonCounted: SkyMarkerKindRules<'moon-counted'> = {
  sourceKey: 'Nilsson1920',
  rangeReason: 'moon-count',
  check(spec, field, figures) {
    knownMarker(spec.markerKey, `${field}.markerKey`, figures);
    checkWord(`${field}.phenomenon`, spec.phenomenon, PHENOMENA);
    checkWord(`${field}.event`, spec.event, MOON_EVENTS);
    checkNumber(`${field}.count`, spec.count, MOON_COUNT.min, MOON_COUNT.max, 'Moons');
  },
  compute(spec, place) {
    const signs = signsAround(spec, place);
    if (signs.length === 0) return undated('star-gives-no-sign', 0);
    const occurrences = signs
      .filter((sign) => mayLeadHere(sign, spec, place))
      .flatMap((sign) => countFrom(sign, spec, place));
    return dated(occurrences, 0);
  },
};
