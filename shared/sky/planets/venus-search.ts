import type { PreparedYear } from '../phenomena/prepared-year.js';
import type { Ground } from '../phenomena/skyline-crossing.js';
import type { DayClock } from '../time/civil-day.js';
import type { VisibilitySettings } from '../types.js';
import { DEG_PER_RAD, RAD_PER_DEG } from '../units/angle.js';
import { type HillView, neededDepthDeg } from '../visibility/needed-depth.js';
import type { VenusAppearance } from '../vocabulary.js';
import { type VenusCrossing, type VenusDay, venusDayOf } from './venus-crossings.js';
import type { VenusCycle } from './venus-cycle.js';

/** How deep the Sun must be for Venus on the horizon [Ptolemy, Almagest XIII 7; value M]. */
export const VENUS_ARCUS_VISIONIS_DEG = 5;
/** What a hill takes and gives follows the brightness that Venus has near its conjunctions. */
const VENUS_VIEW: HillView = { vMag: -4, clarity: 'ordinary', flatOppositeDeg: VENUS_ARCUS_VISIONIS_DEG };
/** So long before the inferior and after the superior conjunction an appearance of the other side may begin. */
const BEFORE_INFERIOR_DAYS = 25;
const AFTER_SUPERIOR_DAYS = 10;

export interface VenusAtPlace {
  year: PreparedYear;
  ground: Ground;
  clock: DayClock;
  settings: VisibilitySettings;
  day(solarDay: number): VenusDay;
}

/** Venus at a place; each day is computed when it is first asked for. */
export function venusAtPlace(
  year: PreparedYear,
  ground: Ground,
  clock: DayClock,
  settings: VisibilitySettings,
): VenusAtPlace {
  const days = new Map<number, VenusDay>();
  return {
    year,
    ground,
    clock,
    settings,
    day(solarDay) {
      const known = days.get(solarDay) ?? venusDayOf(year, ground, solarDay);
      days.set(solarDay, known);
      return known;
    },
  };
}

/** The days in which an appearance is looked for, in the order of looking. */
export interface VenusSearch {
  fromDay: number;
  toDay: number;
  step: 1 | -1;
  crossing: 'rising' | 'setting';
}

/** A day on which Venus meets the skyline of a sky that is dark enough. */
export interface VenusFound {
  solarDay: number;
  crossing: VenusCrossing;
  neededDeg: number;
}

/** Dawn: from the inferior conjunction to the superior one; dusk: from there to the next inferior one. */
export function venusSearchOf(appearance: VenusAppearance, cycle: VenusCycle): VenusSearch {
  const dawn = {
    begin: Math.floor(cycle.inferiorJdUt) - BEFORE_INFERIOR_DAYS,
    end: Math.ceil(cycle.superiorJdUt) + AFTER_SUPERIOR_DAYS,
  };
  const dusk = {
    begin: Math.floor(cycle.superiorJdUt) - AFTER_SUPERIOR_DAYS,
    end: Math.ceil(cycle.nextInferiorJdUt) + BEFORE_INFERIOR_DAYS,
  };
  switch (appearance) {
    case 'morning-first':
      return { fromDay: dawn.begin, toDay: dawn.end, step: 1, crossing: 'rising' };
    case 'morning-last':
      return { fromDay: dawn.end, toDay: dawn.begin, step: -1, crossing: 'rising' };
    case 'evening-first':
      return { fromDay: dusk.begin, toDay: dusk.end, step: 1, crossing: 'setting' };
    case 'evening-last':
      return { fromDay: dusk.end, toDay: dusk.begin, step: -1, crossing: 'setting' };
  }
}

/**
 * The first day of a search on which the Sun is deep enough at the crossing, or null.
 * @param shiftDeg air and range together, on top of the place's own shift
 */
export function findVenus(venus: VenusAtPlace, search: VenusSearch, shiftDeg: number): VenusFound | null {
  const { skylineRule, sameSideShiftDeg } = venus.settings;
  const thresholdDeg = VENUS_ARCUS_VISIONIS_DEG + sameSideShiftDeg + shiftDeg;
  const days = Math.abs(search.toDay - search.fromDay);
  for (let step = 0; step <= days; step += 1) {
    const solarDay = search.fromDay + step * search.step;
    const crossing = venus.day(solarDay)[search.crossing];
    if (!crossing) continue;
    const altitudeDeg = crossing.altitudeRad * DEG_PER_RAD;
    const neededDeg = neededDepthDeg(skylineRule, 'same', thresholdDeg, altitudeDeg, VENUS_VIEW);
    if (crossing.sunDepressionRad * DEG_PER_RAD >= neededDeg) return { solarDay, crossing, neededDeg };
  }
  return null;
}

/** Is the night on the other side of an appearance itself too light for Venus? */
export function besideLightNights(venus: VenusAtPlace, search: VenusSearch, found: VenusFound): boolean {
  const beside = venus.day(found.solarDay - search.step);
  const sinDeepest = search.crossing === 'rising' ? beside.sinDeepestBefore : beside.sinDeepestAfter;
  return sinDeepest < Math.sin(found.neededDeg * RAD_PER_DEG);
}

/** Around an inferior conjunction: is Venus still an evening star when it is a morning star already? */
export function seenOnBothSides(venus: VenusAtPlace, inferiorJdUt: number, shiftDeg: number): boolean {
  const near = {
    begin: Math.floor(inferiorJdUt) - BEFORE_INFERIOR_DAYS,
    end: Math.ceil(inferiorJdUt) + BEFORE_INFERIOR_DAYS,
  };
  const first = findVenus(
    venus,
    { fromDay: near.begin, toDay: near.end, step: 1, crossing: 'rising' },
    shiftDeg,
  );
  const last = findVenus(
    venus,
    { fromDay: near.end, toDay: near.begin, step: -1, crossing: 'setting' },
    shiftDeg,
  );
  return first !== null && last !== null && last.solarDay >= first.solarDay - 1;
}
