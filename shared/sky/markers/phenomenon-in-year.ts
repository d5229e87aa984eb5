import { crossingAtDeepest } from '../phenomena/dark-arc.js';
import { PHENOMENON_FACTS, type PhenomenonFacts } from '../phenomena/phenomenon-facts.js';
import { sunAtCrossing } from '../phenomena/skyline-crossing.js';
import { labelledDay } from '../time/civil-day.js';
import { monthOfDay } from '../time/civil-year.js';
import type { Crossing, Occurrence, PhenomenonResult, RangeWidth } from '../types.js';
import { clampUnit, DEG_PER_RAD } from '../units/angle.js';
import { rangeWidthOf } from '../visibility/range-width.js';
import type { Phenomenon } from '../vocabulary.js';
import {
  crossingWithNeed,
  type ExpectedCrossing,
  expectedAroundYear,
  neededIn,
} from './expected-crossing.js';
import type { MarkerAtPlace } from './place-year.js';

/** A range longer than this makes a weak marker. */
const WEAK_RANGE_DAYS = 21;

function describe(marker: MarkerAtPlace, expected: ExpectedCrossing, jdUt: number): Crossing {
  const { crossing, needed } = expected;
  const sunLongitude = marker.year.sun.longitudeRad(jdUt);
  const sun = sunAtCrossing(marker.year, marker.ground.latitude, crossing, sunLongitude);
  const { dayNumber, gregorian, julian } = labelledDay(marker.clock.dayOf(jdUt));
  return {
    dayNumber,
    gregorian,
    julian,
    jdUt,
    sunDepressionDeg: sun.depressionRad * DEG_PER_RAD,
    neededDepressionDeg: Math.asin(clampUnit(needed.sineAt(sunLongitude))) * DEG_PER_RAD,
    starAzimuthDeg: crossing.starAzimuthRad * DEG_PER_RAD,
    starAltitudeDeg: crossing.starAltitudeRad * DEG_PER_RAD,
    sunAzimuthDeg: sun.azimuthRad * DEG_PER_RAD,
  };
}

/** The end of the range that a shift leads to, of the same disappearance as the expected day. */
function rangeEnd(
  marker: MarkerAtPlace,
  facts: PhenomenonFacts,
  expected: ExpectedCrossing,
  byDeg: number,
): Crossing | null {
  const needed = neededIn(marker, expected.crossing, facts.side, expected.clarity, byDeg);
  const jdUt = crossingWithNeed(marker, expected.crossing, facts, expected.highestRad, needed);
  return jdUt === null ? null : describe(marker, { ...expected, needed }, jdUt);
}

/** The width of the range around an expected crossing, in the air of its month. */
function widthOf(
  { marker, threshold, year, airSpanOf }: MarkerAtPlace,
  { side }: PhenomenonFacts,
  { crossing, clarity }: ExpectedCrossing,
  dayNumber: number,
): RangeWidth {
  return rangeWidthOf({
    vMag: marker.vMag,
    side,
    oppositeSideDeg: threshold.oppositeSideDeg,
    altitudeDeg: crossing.starAltitudeRad * DEG_PER_RAD,
    air: airSpanOf(monthOfDay(dayNumber, year.civil.calendar), clarity),
  });
}

/** An expected crossing with the ends of its range. */
export function occurrenceOf(
  marker: MarkerAtPlace,
  facts: PhenomenonFacts,
  expected: ExpectedCrossing,
  jdUt: number,
): Occurrence {
  const middle = describe(marker, expected, jdUt);
  const width = widthOf(marker, facts, expected, middle.dayNumber);
  // Less depth is reached earlier at the arc's dawn end and later at its dusk end.
  const easy = rangeEnd(marker, facts, expected, -width.halfWidthDeg);
  const hard = rangeEnd(marker, facts, expected, width.halfWidthDeg);
  const [early, late] = facts.end === 'dawn' ? [easy, hard] : [hard, easy];
  const rangeDays = (late ?? middle).dayNumber - (early ?? middle).dayNumber;
  return {
    expected: middle,
    early,
    late,
    clarity: expected.clarity,
    width,
    notes: rangeDays > WEAK_RANGE_DAYS ? ['weak-marker'] : [],
  };
}

/** One phenomenon of a marker in the prepared civil year. */
export function phenomenonInYear(marker: MarkerAtPlace, phenomenon: Phenomenon): PhenomenonResult {
  const facts = PHENOMENON_FACTS[phenomenon];
  const crossing = marker.star.crossings?.[facts.crossing];
  if (!crossing) return { phenomenon, outcome: 'none-in-this-year', occurrences: [] };
  const { firstDay, lastDay } = marker.year.civil;
  const inYear = (jdUt: number): boolean => {
    const day = marker.clock.dayOf(jdUt);
    return day >= firstDay && day <= lastDay;
  };

  const occurrences: Occurrence[] = [];
  let tooLight = false;
  for (const expected of expectedAroundYear(marker, crossing, facts)) {
    if (expected.jdUt === null) {
      tooLight ||= inYear(crossingAtDeepest(marker.year, crossing, expected.highestRad));
    } else if (inYear(expected.jdUt)) {
      occurrences.push(occurrenceOf(marker, facts, expected, expected.jdUt));
    }
  }
  const outcome = occurrences.length > 0 ? 'dated' : tooLight ? 'never-dark-enough' : 'none-in-this-year';
  return { phenomenon, outcome, occurrences };
}
