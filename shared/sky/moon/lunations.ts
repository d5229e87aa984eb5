import { AstroTime, SearchMoonPhase } from 'astronomy-engine';

import { JD_J2000 } from '../time/julian-day.js';

/** A new Moon and the full Moon that follows it, Julian Days (UT). */
export interface LunationInstants {
  newMoonJdUt: number;
  fullMoonJdUt: number;
}

const SEARCH_DAYS = 35;
const FULL_DEG = 180;
/** No two new Moons lie nearer together than 29.2 days. */
const SURELY_PAST_DAYS = 20;

function nextPhase(longitudeDeg: number, fromJdUt: number): number {
  const found = SearchMoonPhase(longitudeDeg, new AstroTime(fromJdUt - JD_J2000), SEARCH_DAYS);
  if (!found) throw new RangeError(`no phase of the Moon within ${SEARCH_DAYS} days of ${fromJdUt}`);
  return found.ut + JD_J2000;
}

/**
 * The lunations whose new Moon lies between two instants (UT), ascending.
 * By astronomy-engine; against its own quarters and PyEphem good to two minutes in the present centuries.
 */
export function lunationsBetween(fromJdUt: number, toJdUt: number): LunationInstants[] {
  const found: LunationInstants[] = [];
  for (let newMoonJdUt = nextPhase(0, fromJdUt); newMoonJdUt <= toJdUt;) {
    found.push({ newMoonJdUt, fullMoonJdUt: nextPhase(FULL_DEG, newMoonJdUt) });
    newMoonJdUt = nextPhase(0, newMoonJdUt + SURELY_PAST_DAYS);
  }
  return found;
}
