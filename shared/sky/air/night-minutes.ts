import { monthOfDay } from '../time/civil-year.js';
import type { Site } from '../types.js';
import { clarityOfMonth } from '../visibility/clarity.js';
import type { Clarity } from '../vocabulary.js';
import type { NightMinutes } from './air-types.js';
import { instantOfTurn } from './model-year.js';
import { moonNlAt } from './moon-light.js';
import type { PlaceAir } from './place-air.js';
import { type MoonNl, sightingAt, type Watched } from './sighting.js';

/** Days that are shown on the hidden side of the first date, and on the seen side of the last one. */
const HIDDEN_MARGIN_DAYS = 3;
const SEEN_MARGIN_DAYS = 6;
/** A star that climbs at a slant may spread its dates over months: then the seen end is cut. */
const MOST_NIGHTS = 60;

/**
 * Mornings (or evenings) around some dates of one phenomenon, with the minutes in which the star shows.
 * @param days day numbers that must be among them
 */
export function nightsAround(
  watch: Watched,
  site: Site,
  airOf: PlaceAir,
  days: readonly number[],
): NightMinutes[] {
  const { marker, crossing, facts } = watch;
  const { clock, year } = marker;
  const { periodDays } = year.sidereal;
  const isDawn = facts.end === 'dawn';
  const from = Math.min(...days) - (isDawn ? HIDDEN_MARGIN_DAYS : SEEN_MARGIN_DAYS);
  const to = Math.max(...days) + (isDawn ? SEEN_MARGIN_DAYS : HIDDEN_MARGIN_DAYS);
  const first = isDawn ? from : Math.max(from, to - MOST_NIGHTS + 1);
  const last = isDawn ? Math.min(to, from + MOST_NIGHTS - 1) : to;
  const nights: NightMinutes[] = [];
  let turn = Math.floor((first - 1 - crossing.anInstantJdUt) / periodDays);
  for (; instantOfTurn(watch, turn) < last + 1; turn += 1) {
    const jdUt = instantOfTurn(watch, turn);
    const dayNumber = clock.dayOf(jdUt);
    // Once a year a star crosses twice in a civil day: the later crossing is that of the next night.
    if (dayNumber < first || dayNumber > last || nights.at(-1)?.dayNumber === dayNumber) continue;
    nights.push(nightOf(watch, site, airOf, turn, dayNumber));
  }
  return nights;
}

function nightOf(watch: Watched, site: Site, airOf: PlaceAir, turn: number, dayNumber: number): NightMinutes {
  const { marker } = watch;
  const month = monthOfDay(dayNumber, marker.year.civil.calendar);
  const minutes = (clarity: Clarity, moonNl?: MoonNl): number =>
    sightingAt(watch, turn, airOf(month, clarity), moonNl)?.minutes ?? 0;
  const own = clarityOfMonth(marker.settings.clarityByMonth, month);
  return {
    dayNumber,
    byClarity: { clear: minutes('clear'), ordinary: minutes('ordinary'), hazy: minutes('hazy') },
    underMoon: minutes(own, moonNlAt(site, instantOfTurn(watch, turn))),
  };
}
