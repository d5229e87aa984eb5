import { AstroTime, NextMoonQuarter, SearchMoonQuarter } from 'astronomy-engine';

import { civilYearOf } from '../time/civil-year.js';
import { JD_J2000 } from '../time/julian-day.js';
import { MOON_QUARTERS, type MoonPhase } from '../types.js';

/** A day to either side, so that no clock on Earth misses a phase of its own civil year. */
const MARGIN_DAYS = 1;

/**
 * Instants of the Moon's quarters in a civil year (UT), a day to either side included, ascending.
 * By astronomy-engine; against its own tests good to two minutes in the present centuries.
 */
export function moonPhasesOf(year: number): MoonPhase[] {
  const { firstDay, lastDay } = civilYearOf(year);
  const toJdUt = lastDay + 0.5 + MARGIN_DAYS;
  const phases: MoonPhase[] = [];
  let found = SearchMoonQuarter(new AstroTime(firstDay - 0.5 - MARGIN_DAYS - JD_J2000));
  while (found.time.ut + JD_J2000 < toJdUt) {
    const quarter = MOON_QUARTERS[found.quarter];
    if (quarter) phases.push({ quarter, jdUt: found.time.ut + JD_J2000 });
    found = NextMoonQuarter(found);
  }
  return phases;
}
