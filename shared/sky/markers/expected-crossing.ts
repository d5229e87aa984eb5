import { arcEndRad, crossingAtArcEnd, type NeededSine } from '../phenomena/dark-arc.js';
import type { HorizonSide, PhenomenonFacts } from '../phenomena/phenomenon-facts.js';
import type { SkylineCrossing } from '../phenomena/skyline-crossing.js';
import { monthOfDay } from '../time/civil-year.js';
import { TAU } from '../units/angle.js';
import type { Clarity } from '../vocabulary.js';
import { CLARITY_SHIFT_DEG, clarityOfMonth } from '../visibility/clarity.js';
import { neededSineAt } from '../visibility/needed-sine.js';
import type { MarkerAtPlace } from './place-year.js';

/** The expected crossing of one phenomenon in one turn of the Sun. */
export interface ExpectedCrossing {
  crossing: SkylineCrossing;
  /** The turn: the unwrapped longitude at which the Sun stands highest at this crossing. */
  highestRad: number;
  /** JD UT of the crossing, or null where the sky is not dark enough in this turn. */
  jdUt: number | null;
  clarity: Clarity;
  /** Place's shift and clarity together. */
  shiftDeg: number;
  needed: NeededSine;
}

/** Days by which a month's clarity may carry an event away from the day computed without it. */
const CLARITY_REACH_DAYS = 60;
/** Half a crossing to either side, the offset of the widest time zone, and a day of grace. */
const EDGE_DAYS = 3;

export function placeShiftDeg(marker: MarkerAtPlace, side: HorizonSide): number {
  return side === 'same' ? marker.settings.sameSideShiftDeg : marker.settings.oppositeSideShiftDeg;
}

export function neededIn(
  marker: MarkerAtPlace,
  crossing: SkylineCrossing,
  side: HorizonSide,
  shiftDeg: number,
): NeededSine {
  const { year, ground, settings, threshold } = marker;
  return neededSineAt(year, ground, crossing, settings.skylineRule, side, threshold, shiftDeg);
}

/** JD UT of a phenomenon in one turn with a given shift, or null. */
export function crossingWithShift(
  marker: MarkerAtPlace,
  crossing: SkylineCrossing,
  facts: PhenomenonFacts,
  highestRad: number,
  needed: NeededSine,
): number | null {
  const longitude = arcEndRad(crossing, highestRad, needed, facts.end);
  return longitude === null ? null : crossingAtArcEnd(marker.year, crossing, longitude, needed, facts.end);
}

/** The month whose clarity counts is that of the day computed without clarity. */
export function expectedInTurn(
  marker: MarkerAtPlace,
  crossing: SkylineCrossing,
  facts: PhenomenonFacts,
  highestRad: number,
): ExpectedCrossing {
  const baseShiftDeg = placeShiftDeg(marker, facts.side);
  const baseNeeded = neededIn(marker, crossing, facts.side, baseShiftDeg);
  const base = crossingWithShift(marker, crossing, facts, highestRad, baseNeeded);
  const expected = { crossing, highestRad, jdUt: base, shiftDeg: baseShiftDeg, needed: baseNeeded };
  if (base === null) return { ...expected, clarity: 'ordinary' };

  const month = monthOfDay(marker.clock.dayOf(base), marker.year.civil.calendar);
  const clarity = clarityOfMonth(marker.settings.clarityByMonth, month);
  if (clarity === 'ordinary') return { ...expected, clarity };
  const shiftDeg = baseShiftDeg + CLARITY_SHIFT_DEG[clarity];
  const needed = neededIn(marker, crossing, facts.side, shiftDeg);
  const jdUt = crossingWithShift(marker, crossing, facts, highestRad, needed);
  return { ...expected, jdUt, clarity, shiftDeg, needed };
}

/**
 * The turns of a phenomenon that can matter to the civil year: those that may be dated in it, and those that would be
 * but for a sky that is never dark enough. Turns that plainly belong to a neighbouring year are not solved.
 */
export function expectedAroundYear(
  marker: MarkerAtPlace,
  crossing: SkylineCrossing,
  facts: PhenomenonFacts,
): ExpectedCrossing[] {
  const { year, settings } = marker;
  const { firstDay, lastDay } = year.civil;
  const steady = settings.clarityByMonth.every((clarity) => clarity === 'ordinary');
  const reachDays = steady ? EDGE_DAYS : CLARITY_REACH_DAYS;
  const from = year.sun.longitudeRad(firstDay - reachDays);
  const to = year.sun.longitudeRad(lastDay + reachDays);
  const baseNeeded = neededIn(marker, crossing, facts.side, placeShiftDeg(marker, facts.side));
  const firstTurn = Math.floor((from - crossing.highestRad) / TAU);
  const lastTurn = Math.floor((to - crossing.highestRad) / TAU);

  const found: ExpectedCrossing[] = [];
  for (let turn = firstTurn; turn <= lastTurn; turn += 1) {
    const highestRad = crossing.highestRad + turn * TAU;
    // Without an arc the middle of it stands for the place in the year where the phenomenon would be looked for.
    const longitude = arcEndRad(crossing, highestRad, baseNeeded, facts.end) ?? highestRad + Math.PI;
    if (longitude >= from && longitude <= to) found.push(expectedInTurn(marker, crossing, facts, highestRad));
  }
  return found;
}
