import { latitudeOf } from '../horizon/horizontal.js';
import { prepareSkyline } from '../horizon/skyline.js';
import type { PreparedYear } from '../phenomena/prepared-year.js';
import { type DayClock, dayClockOf, labelledDay } from '../time/civil-day.js';
import { monthOfDay } from '../time/civil-year.js';
import type { Crossing, Occurrence, Site, VisibilitySettings } from '../types.js';
import { DEG_PER_RAD, RAD_PER_DEG } from '../units/angle.js';
import { CLARITY_SHIFT_DEG, clarityOfMonth } from '../visibility/clarity.js';
import { scatterHalfWidthDeg } from '../visibility/range-width.js';
import {
  ENGINE_VERSION,
  type PhenomenonOutcome,
  type SkyNote,
  VENUS_APPEARANCES,
  type VenusAppearance,
} from '../vocabulary.js';
import { type VenusCycle, venusCyclesBetween } from './venus-cycle.js';
import {
  besideLightNights,
  findVenus,
  seenOnBothSides,
  VENUS_ARCUS_VISIONIS_DEG,
  type VenusAtPlace,
  venusAtPlace,
  type VenusFound,
  venusSearchOf,
} from './venus-search.js';

/** Venus is always brighter than this; its range is that of the brightest stars. */
const VENUS_V_MAG = -3.8;
const WEAK_RANGE_DAYS = 21;

export interface VenusAppearanceYear {
  appearance: VenusAppearance;
  outcome: PhenomenonOutcome;
  /** Occurrences whose expected day falls in the civil year: mostly none or one. `starAzimuthDeg` is Venus' own. */
  occurrences: readonly Occurrence[];
}

export interface VenusYear {
  year: number;
  appearances: Readonly<Record<VenusAppearance, VenusAppearanceYear>>;
  /** Depth of the Sun that Venus needs on the horizon, before the place's shift and the month's air. */
  arcusVisionisDeg: number;
  /** Keys of SOURCES.md. */
  sourceKeys: readonly string[];
  engineVersion: string;
}

function describe(clock: DayClock, { crossing, neededDeg }: VenusFound): Crossing {
  return {
    ...labelledDay(clock.dayOf(crossing.jdUt)),
    jdUt: crossing.jdUt,
    sunDepressionDeg: crossing.sunDepressionRad * DEG_PER_RAD,
    neededDepressionDeg: neededDeg,
    starAzimuthDeg: crossing.azimuthRad * DEG_PER_RAD,
    starAltitudeDeg: crossing.altitudeRad * DEG_PER_RAD,
    sunAzimuthDeg: crossing.sunAzimuthRad * DEG_PER_RAD,
  };
}

/** The conjunction at which an appearance begins or ends a time of not being seen, Julian Day (UT). */
function conjunctionOf(appearance: VenusAppearance, cycle: VenusCycle): number {
  if (appearance === 'morning-first') return cycle.inferiorJdUt;
  return appearance === 'evening-last' ? cycle.nextInferiorJdUt : cycle.superiorJdUt;
}

function occurrenceOf(
  venus: VenusAtPlace,
  appearance: VenusAppearance,
  cycle: VenusCycle,
): Occurrence | null {
  const search = venusSearchOf(appearance, cycle);
  const plain = findVenus(venus, search, 0);
  if (!plain) return null;
  const month = monthOfDay(venus.clock.dayOf(plain.crossing.jdUt), venus.year.civil.calendar);
  const clarity = clarityOfMonth(venus.settings.clarityByMonth, month);
  const shiftDeg = CLARITY_SHIFT_DEG[clarity];
  const found = shiftDeg === 0 ? plain : findVenus(venus, search, shiftDeg);
  if (!found) return null;

  const halfWidthDeg = scatterHalfWidthDeg(VENUS_V_MAG, 'same');
  const easy = findVenus(venus, search, shiftDeg - halfWidthDeg);
  const hard = findVenus(venus, search, shiftDeg + halfWidthDeg);
  const [first, second] = search.step === 1 ? [easy, hard] : [hard, easy];
  const expected = describe(venus.clock, found);
  const early = first && describe(venus.clock, first);
  const late = second && describe(venus.clock, second);
  const atInferior = appearance === 'morning-first' || appearance === 'evening-last';
  const notes: SkyNote[] = [];
  if (atInferior && seenOnBothSides(venus, conjunctionOf(appearance, cycle), shiftDeg)) {
    notes.push('never-disappears');
  }
  if ((late ?? expected).dayNumber - (early ?? expected).dayNumber > WEAK_RANGE_DAYS)
    notes.push('weak-marker');
  if (besideLightNights(venus, search, found)) notes.push('lost-in-light-nights');
  return { expected, early, late, clarity, width: null, notes };
}

function appearanceIn(
  venus: VenusAtPlace,
  appearance: VenusAppearance,
  cycles: readonly VenusCycle[],
): VenusAppearanceYear {
  const { firstDay, lastDay } = venus.year.civil;
  const inYear = (dayNumber: number): boolean => dayNumber >= firstDay && dayNumber <= lastDay;
  const occurrences: Occurrence[] = [];
  let tooLight = false;
  for (const cycle of cycles) {
    const occurrence = occurrenceOf(venus, appearance, cycle);
    if (!occurrence) tooLight ||= inYear(Math.round(conjunctionOf(appearance, cycle)));
    else if (inYear(occurrence.expected.dayNumber)) occurrences.push(occurrence);
  }
  const outcome = occurrences.length > 0 ? 'dated' : tooLight ? 'never-dark-enough' : 'none-in-this-year';
  return { appearance, outcome, occurrences };
}

/**
 * The four appearances of Venus in a civil year at a place, by the Sun's depth at the moment Venus crosses the skyline
 * (Venus and Sun without refraction, the Sun's centre), with the range that the brightest stars have.
 */
export function venusYearOf(year: PreparedYear, site: Site, settings: VisibilitySettings): VenusYear {
  const ground = {
    latitude: latitudeOf(site.latitudeDeg * RAD_PER_DEG),
    longitudeRad: site.longitudeDeg * RAD_PER_DEG,
    skyline: prepareSkyline(site.skyline),
  };
  const venus = venusAtPlace(year, ground, dayClockOf(site.timeZone, site.longitudeDeg), settings);
  const cycles = venusCyclesBetween(year.civil.firstDay, year.civil.lastDay);
  const results = VENUS_APPEARANCES.map(
    (appearance) => [appearance, appearanceIn(venus, appearance, cycles)] as const,
  );
  return {
    year: year.civil.year,
    appearances: Object.fromEntries(results) as Record<VenusAppearance, VenusAppearanceYear>,
    arcusVisionisDeg: VENUS_ARCUS_VISIONIS_DEG,
    sourceKeys: ['Ptolemy'],
    engineVersion: ENGINE_VERSION,
  };
}
