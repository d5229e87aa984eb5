import { type PhenomenonFacts, PHENOMENON_FACTS } from '../phenomena/phenomenon-facts.js';
import type { SkylineCrossing } from '../phenomena/skyline-crossing.js';
import { monthOfDay } from '../time/civil-year.js';
import { TAU } from '../units/angle.js';
import type { Air } from '../visibility/air.js';
import type { Phenomenon } from '../vocabulary.js';
import type { MarkerAtPlace } from '../markers/place-year.js';
import { isSighted, watched, type Watched } from './sighting.js';

/** Air of a civil month, 1…12. */
export type AirOfMonth = (month: number) => Air;

/**
 * First mornings and last evenings by the model of visibility. Between the crossing at which the Sun stands highest and
 * the one at which it is deepest a star passes once from never sighted to sighted; halving finds that crossing, and
 * every trial looks through one morning or evening minute by minute.
 */

/** The return of a crossing nearest to a longitude of the Sun. */
function turnAt({ marker, crossing }: Watched, sunLongitudeRad: number): number {
  const { year } = marker;
  return Math.round(
    (year.sun.instantOf(sunLongitudeRad) - crossing.anInstantJdUt) / year.sidereal.periodDays,
  );
}

export function instantOfTurn({ marker, crossing }: Watched, turn: number): number {
  return crossing.anInstantJdUt + turn * marker.year.sidereal.periodDays;
}

/**
 * The return of the crossing that carries the phenomenon, or null where even the darkest one does not show the star.
 * @param highestRad the turn of the Sun, as in the closed form
 */
export function modelTurn(watch: Watched, highestRad: number, airOf: AirOfMonth): number | null {
  const { marker, facts } = watch;
  const { calendar } = marker.year.civil;
  const sighted = (turn: number): boolean => {
    const day = marker.clock.dayOf(instantOfTurn(watch, turn));
    return isSighted(watch, turn, airOf(monthOfDay(day, calendar)));
  };
  let seen = turnAt(watch, highestRad + Math.PI);
  if (!sighted(seen)) return null;
  let hidden = turnAt(watch, facts.end === 'dawn' ? highestRad : highestRad + TAU);
  while (Math.abs(seen - hidden) > 1) {
    const middle = Math.trunc((seen + hidden) / 2);
    if (sighted(middle)) seen = middle;
    else hidden = middle;
  }
  return seen;
}

/** The turns of the Sun whose phenomenon may belong to the prepared civil year. */
export function turnsAroundYear(marker: MarkerAtPlace, crossing: SkylineCrossing): number[] {
  const { fromRad, toRad } = marker.window;
  const first = Math.floor((fromRad - crossing.highestRad) / TAU) - 1;
  const last = Math.floor((toRad - crossing.highestRad) / TAU);
  return Array.from({ length: last - first + 1 }, (_, index) => crossing.highestRad + (first + index) * TAU);
}

/** The days of the civil year on which the model has a phenomenon; mostly one. Empty for a star that does not rise and set. */
export function modelDays(marker: MarkerAtPlace, phenomenon: Phenomenon, airOf: AirOfMonth): number[] {
  const facts: PhenomenonFacts = PHENOMENON_FACTS[phenomenon];
  const crossing = marker.star.crossings?.[facts.crossing];
  if (!crossing) return [];
  const watch = watched(marker, facts, crossing);
  const { firstDay, lastDay } = marker.year.civil;
  return turnsAroundYear(marker, crossing).flatMap((highestRad) => {
    const turn = modelTurn(watch, highestRad, airOf);
    const day = turn === null ? Number.NaN : marker.clock.dayOf(instantOfTurn(watch, turn));
    return day >= firstDay && day <= lastDay ? [day] : [];
  });
}
