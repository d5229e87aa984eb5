import { AstroTime, Body, SearchRelativeLongitude } from 'astronomy-engine';

import { JD_J2000 } from '../time/julian-day.js';

/** One turn of Venus: between the Earth and the Sun, behind the Sun, and between them again; Julian Days (UT). */
export interface VenusCycle {
  inferiorJdUt: number;
  superiorJdUt: number;
  nextInferiorJdUt: number;
}

const INFERIOR_DEG = 0;
const SUPERIOR_DEG = 180;
/** No two conjunctions of a kind lie nearer together than 577 days. */
const SURELY_PAST_DAYS = 200;
const LONGEST_CYCLE_DAYS = 600;

function next(relativeLongitudeDeg: number, fromJdUt: number): number {
  const time = SearchRelativeLongitude(Body.Venus, relativeLongitudeDeg, new AstroTime(fromJdUt - JD_J2000));
  return time.ut + JD_J2000;
}

/**
 * The cycles of Venus that touch a span of time (UT), ascending. Conjunctions in heliocentric longitude, which is where
 * astronomy-engine searches them; they differ from those in right ascension by hours to two days and only bound a search here.
 */
export function venusCyclesBetween(fromJdUt: number, toJdUt: number): VenusCycle[] {
  const cycles: VenusCycle[] = [];
  let inferiorJdUt = next(INFERIOR_DEG, fromJdUt - LONGEST_CYCLE_DAYS);
  while (inferiorJdUt <= toJdUt) {
    const nextInferiorJdUt = next(INFERIOR_DEG, inferiorJdUt + SURELY_PAST_DAYS);
    const superiorJdUt = next(SUPERIOR_DEG, inferiorJdUt + 1);
    if (nextInferiorJdUt >= fromJdUt) cycles.push({ inferiorJdUt, superiorJdUt, nextInferiorJdUt });
    inferiorJdUt = nextInferiorJdUt;
  }
  return cycles;
}
