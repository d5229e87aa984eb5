import type { WatchTimes } from '../types.js';
import type { SunCourse } from '../vocabulary.js';
import { levelSkyline, type Skyline } from '../horizon/skyline.js';
import { TAU } from '../units/angle.js';
import type { PreparedYear } from './prepared-year.js';
import type { Ground } from './skyline-crossing.js';
import { edgeClearanceRad } from './sun-day.js';
import { sunPlaceAt } from './sun-place.js';

/** Eyes and optics must be off the Sun's place well before it shows [safety margin of the product, not astronomy]. */
const MARGIN_DAYS = 10 / 1440;
const STEP_DAYS = 2 / 1440;
const PRECISION_DAYS = 1 / 86_400;

/** How far the Sun's upper edge stands above a skyline, with refraction, radians. */
function edgeClearance(year: PreparedYear, ground: Ground, skyline: Skyline, jdUt: number): number {
  return edgeClearanceRad({ ...ground, skyline }, sunPlaceAt(year, ground, jdUt));
}

/** The Sun's edge over a skyline between a midnight and noon: up all the time, never, or first shown at an instant. */
type Sight = 'up' | 'down' | { jdUt: number };

/** What the Sun does from `from`, a midnight, to `to`, the noon after it (or before it). */
function firstSight(clearance: (jdUt: number) => number, from: number, to: number): Sight {
  const step = to > from ? STEP_DAYS : -STEP_DAYS;
  const steps = Math.round((to - from) / step);
  if (clearance(from) >= 0) return 'up';
  for (let index = 1; index <= steps; index += 1) {
    if (clearance(from + index * step) < 0) continue;
    let below = from + (index - 1) * step;
    let above = from + index * step;
    while (Math.abs(above - below) > PRECISION_DAYS) {
      const middle = (below + above) / 2;
      if (clearance(middle) >= 0) above = middle;
      else below = middle;
    }
    return { jdUt: (below + above) / 2 };
  }
  return 'down';
}

const jdUtOf = (sight: Sight): number | null => (typeof sight === 'string' ? null : sight.jdUt);

/** When looking must end (or may begin), and what the Sun does on that side of the day. */
interface Limit {
  sunCourse: SunCourse;
  jdUt: number | null;
}

/**
 * The limit of one side of the day. Where the Sun is up at midnight, by a flat horizon or by the real one, there is none
 * to keep: behind a hill that hides a midnight Sun the sky is light, and the Sun stands behind the next tree. Neither is
 * there one where the night is shorter than the margins kept from the Sun.
 * @param sights on a flat horizon and on the real skyline
 * @param intoNight −1 at dawn, 1 at dusk: the way from the Sun's edge to the midnight
 */
function limitOf(sights: readonly Sight[], midnightJdUt: number, intoNight: -1 | 1): Limit {
  if (sights.includes('up')) return { sunCourse: 'stays-up', jdUt: null };
  const shown = sights.map(jdUtOf).filter((jdUt) => jdUt !== null);
  if (shown.length === 0) return { sunCourse: 'stays-down', jdUt: null };
  const nearest = intoNight < 0 ? Math.min(...shown) : Math.max(...shown);
  const jdUt = nearest + intoNight * MARGIN_DAYS;
  return (midnightJdUt - jdUt) * intoNight <= STEP_DAYS
    ? { sunCourse: 'stays-up', jdUt: null }
    : { sunCourse: 'sets-and-rises', jdUt };
}

/**
 * When to stop looking in the morning and begin in the evening of one civil day: by the earlier (later) of the Sun's
 * appearance (disappearance) on a flat horizon and on the real skyline, ten minutes kept clear. Upper edge, standard
 * refraction; good to half a minute at middle latitudes.
 * @param clockNoonJdUt the noon of the place's clock on that day
 */
export function watchTimesOf(year: PreparedYear, ground: Ground, clockNoonJdUt: number): WatchTimes {
  const flat = levelSkyline(0);
  const transit = clockNoonJdUt - sunPlaceAt(year, ground, clockNoonJdUt).hourAngleRad / TAU;
  const [midnightBefore, midnightAfter] = [transit - 0.5, transit + 0.5];
  const sights = (skyline: Skyline): { rise: Sight; set: Sight } => {
    const clearance = (jdUt: number): number => edgeClearance(year, ground, skyline, jdUt);
    return {
      rise: firstSight(clearance, midnightBefore, transit),
      set: firstSight(clearance, midnightAfter, transit),
    };
  };
  const onFlat = sights(flat);
  const onSkyline = ground.skyline.level && ground.skyline.lowestRad === 0 ? onFlat : sights(ground.skyline);
  const dawn = limitOf([onFlat.rise, onSkyline.rise], midnightBefore, -1);
  const dusk = limitOf([onFlat.set, onSkyline.set], midnightAfter, 1);
  return {
    stopLookingJdUt: dawn.jdUt,
    startLookingJdUt: dusk.jdUt,
    dawnSun: dawn.sunCourse,
    duskSun: dusk.sunCourse,
    flatSunriseJdUt: jdUtOf(onFlat.rise),
    flatSunsetJdUt: jdUtOf(onFlat.set),
    skylineSunriseJdUt: jdUtOf(onSkyline.rise),
    skylineSunsetJdUt: jdUtOf(onSkyline.set),
  };
}
