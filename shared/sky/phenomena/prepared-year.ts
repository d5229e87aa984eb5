import { AstroTime, e_tilt } from 'astronomy-engine';

import { prepareStarFrame, type StarFrame } from '../stars/star-frame.js';
import { prepareSunTable, type SunTable } from '../sun/sun-table.js';
import { type CivilYear, civilYearOf } from '../time/civil-year.js';
import { JD_J2000 } from '../time/julian-day.js';
import { prepareSiderealClock, type SiderealClock } from '../time/sidereal-clock.js';
import { RAD_PER_DEG } from '../units/angle.js';

/** Everything that depends on the year alone: prepared once, applied to every star and every place. */
export interface PreparedYear {
  civil: CivilYear;
  sinObliquity: number;
  cosObliquity: number;
  sidereal: SiderealClock;
  sun: SunTable;
  stars: StarFrame;
}

/**
 * Prepares a civil year; the epoch of all slow quantities is its middle. Precession moves a star by 25″ between the
 * middle and either end, and the sidereal clock by as much the same way.
 */
export function prepareYear(year: number): PreparedYear {
  const civil = civilYearOf(year);
  const epochJdUt = (civil.firstDay + civil.lastDay) / 2;
  const obliquityRad = e_tilt(new AstroTime(epochJdUt - JD_J2000)).tobl * RAD_PER_DEG;
  return {
    civil,
    sinObliquity: Math.sin(obliquityRad),
    cosObliquity: Math.cos(obliquityRad),
    sidereal: prepareSiderealClock(epochJdUt),
    sun: prepareSunTable(epochJdUt),
    stars: prepareStarFrame(epochJdUt),
  };
}
