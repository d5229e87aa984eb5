import { prepareSkyline } from '../horizon/skyline.js';
import { dayClockOf, labelledDay } from '../time/civil-day.js';
import { civilYearOf } from '../time/civil-year.js';
import type { Site, VisibilitySettings } from '../types.js';
import { ENGINE_VERSION, type MoonEvent } from '../vocabulary.js';
import type { MoonGround } from './crescent-evening.js';
import { firstCrescentOf } from './first-crescent.js';
import { lunationsBetween } from './lunations.js';
import type { Lunation, MoonDay, MoonInstant, MoonYear } from './moon-types.js';

/** A lunation may begin this long before the first of its days that falls in a span. */
const LUNATION_REACH_DAYS = 18;

function groundOf(site: Site): MoonGround {
  const { latitudeDeg, longitudeDeg, timeZone, skyline } = site;
  return {
    latitudeDeg,
    longitudeDeg,
    skyline: prepareSkyline(skyline),
    clock: dayClockOf(timeZone, longitudeDeg),
  };
}

/** Lunations at a place whose new Moon, first crescent or full Moon falls between two days, both included. */
export function lunationsAt(
  site: Site,
  settings: VisibilitySettings,
  fromDay: number,
  toDay: number,
): Lunation[] {
  const ground = groundOf(site);
  const onDay = (jdUt: number): MoonInstant => ({ ...labelledDay(ground.clock.dayOf(jdUt)), jdUt });
  const lunations: Lunation[] = [];
  for (const instants of lunationsBetween(fromDay - LUNATION_REACH_DAYS, toDay + 1.5)) {
    const lunation = {
      newMoon: onDay(instants.newMoonJdUt),
      firstCrescent: firstCrescentOf(ground, instants.newMoonJdUt, settings.clarityByMonth),
      fullMoon: onDay(instants.fullMoonJdUt),
    };
    const days = [lunation.newMoon, lunation.firstCrescent.expected, lunation.fullMoon];
    const inside = days.some((day) => day !== null && day.dayNumber >= fromDay && day.dayNumber <= toDay);
    if (inside) lunations.push(lunation);
  }
  return lunations;
}

/** The Moons of a civil year at a place. */
export function moonYearOf(site: Site, settings: VisibilitySettings, year: number): MoonYear {
  const { firstDay, lastDay } = civilYearOf(year);
  return {
    year,
    firstDayNumber: firstDay,
    lastDayNumber: lastDay,
    lunations: lunationsAt(site, settings, firstDay, lastDay),
    sourceKeys: ['Yallop1997', 'Odeh2004'],
    engineVersion: ENGINE_VERSION,
  };
}

/** One of a lunation's three days with its range, or null where the crescent has no date. */
export function moonDayOf(lunation: Lunation, event: MoonEvent): MoonDay | null {
  if (event === 'first-crescent') {
    const { expected, early, late, notes } = lunation.firstCrescent;
    if (!expected || !early || !late) return null;
    return { event, expected, early, late, notes };
  }
  const day = event === 'new' ? lunation.newMoon : lunation.fullMoon;
  return { event, expected: day, early: day, late: day, notes: [] };
}
