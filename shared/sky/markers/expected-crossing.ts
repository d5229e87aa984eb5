import { arcEndRad, crossingAtArcEnd, type NeededDepth } from '../phenomena/dark-arc.js';
import type { HorizonSide, PhenomenonFacts } from '../phenomena/phenomenon-facts.js';
import type { SkylineCrossing } from '../phenomena/skyline-crossing.js';
import { monthOfDay } from '../time/civil-year.js';
import { TAU } from '../units/angle.js';
import type { Clarity } from '../vocabulary.js';
import { CLARITY_SHIFT_DEG, clarityOfMonth } from '../visibility/clarity.js';
import { neededAtCrossing } from '../visibility/needed-at-crossing.js';
import type { HillView } from '../visibility/needed-depth.js';
import type { MarkerAtPlace } from './place-year.js';

/** The expected crossing of one phenomenon in one turn of the Sun. */
export interface ExpectedCrossing {
  crossing: SkylineCrossing;
  /** The turn: the unwrapped longitude at which the Sun stands highest at this crossing. */
  highestRad: number;
  /** JD UT of the crossing, or null where the sky is not dark enough in this turn. */
  jdUt: number | null;
  clarity: Clarity;
  needed: NeededDepth;
}

export function placeShiftDeg(marker: MarkerAtPlace, side: HorizonSide): number {
  return side === 'same' ? marker.settings.sameSideShiftDeg : marker.settings.oppositeSideShiftDeg;
}

/** @param widthDeg degrees by which the end of a range asks for more (or less) */
export function neededIn(
  marker: MarkerAtPlace,
  crossing: SkylineCrossing,
  side: HorizonSide,
  clarity: Clarity,
  widthDeg = 0,
): NeededDepth {
  const { year, ground, settings, threshold } = marker;
  const clarityDeg = CLARITY_SHIFT_DEG[clarity];
  return neededAtCrossing(year, ground, crossing, {
    rule: settings.skylineRule,
    side,
    threshold,
    shiftDeg: placeShiftDeg(marker, side) + clarityDeg + widthDeg,
    hill: hillViewOf(marker, clarity),
  });
}

/** How the marker is seen over a hill in air of some clarity. */
function hillViewOf({ marker, threshold }: MarkerAtPlace, clarity: Clarity): HillView {
  return {
    vMag: marker.vMag,
    clarity,
    flatOppositeDeg: threshold.oppositeSideDeg + CLARITY_SHIFT_DEG[clarity],
  };
}

/** JD UT of a phenomenon in one turn with a given need, or null. */
export function crossingWithNeed(
  marker: MarkerAtPlace,
  crossing: SkylineCrossing,
  facts: PhenomenonFacts,
  highestRad: number,
  needed: NeededDepth,
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
  const needed = neededIn(marker, crossing, facts.side, 'ordinary');
  const longitudeRad = arcEndRad(crossing, highestRad, needed, facts.end);
  return expectedAtArcEnd(marker, crossing, facts, highestRad, needed, longitudeRad);
}

/** @param longitudeRad end of the arc without clarity, or null */
function expectedAtArcEnd(
  marker: MarkerAtPlace,
  crossing: SkylineCrossing,
  facts: PhenomenonFacts,
  highestRad: number,
  needed: NeededDepth,
  longitudeRad: number | null,
): ExpectedCrossing {
  const jdUt =
    longitudeRad === null ? null : crossingAtArcEnd(marker.year, crossing, longitudeRad, needed, facts.end);
  if (jdUt === null) return { crossing, highestRad, jdUt, clarity: 'ordinary', needed };

  const month = monthOfDay(marker.clock.dayOf(jdUt), marker.year.civil.calendar);
  const clarity = clarityOfMonth(marker.settings.clarityByMonth, month);
  if (clarity === 'ordinary') return { crossing, highestRad, jdUt, clarity, needed };
  const neededInAir = neededIn(marker, crossing, facts.side, clarity);
  return {
    crossing,
    highestRad,
    jdUt: crossingWithNeed(marker, crossing, facts, highestRad, neededInAir),
    clarity,
    needed: neededInAir,
  };
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
  const { fromRad, toRad } = marker.window;
  const needed = neededIn(marker, crossing, facts.side, 'ordinary');
  const firstTurn = Math.floor((fromRad - crossing.highestRad) / TAU);
  const lastTurn = Math.floor((toRad - crossing.highestRad) / TAU);

  const found: ExpectedCrossing[] = [];
  for (let turn = firstTurn; turn <= lastTurn; turn += 1) {
    const highestRad = crossing.highestRad + turn * TAU;
    const longitudeRad = arcEndRad(crossing, highestRad, needed, facts.end);
    // Without an arc the middle of it stands for the place in the year where the phenomenon would be looked for.
    const aboutRad = longitudeRad ?? highestRad + Math.PI;
    if (aboutRad >= fromRad && aboutRad <= toRad) {
      found.push(expectedAtArcEnd(marker, crossing, facts, highestRad, needed, longitudeRad));
    }
  }
  return found;
}
