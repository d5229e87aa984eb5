import type { WatchTimes } from '../types.js';
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

/** First instant after `from` (before it when `to` is earlier) at which the Sun's edge is over the skyline. */
function firstSight(clearance: (jdUt: number) => number, from: number, to: number): number | null {
  const step = to > from ? STEP_DAYS : -STEP_DAYS;
  const steps = Math.round((to - from) / step);
  if (clearance(from) >= 0) return null; // up at midnight: no rising in this day
  for (let index = 1; index <= steps; index += 1) {
    if (clearance(from + index * step) < 0) continue;
    let below = from + (index - 1) * step;
    let above = from + index * step;
    while (Math.abs(above - below) > PRECISION_DAYS) {
      const middle = (below + above) / 2;
      if (clearance(middle) >= 0) above = middle;
      else below = middle;
    }
    return (below + above) / 2;
  }
  return null;
}

const earlier = (left: number | null, right: number | null): number | null =>
  left === null ? right : right === null ? left : Math.min(left, right);
const later = (left: number | null, right: number | null): number | null =>
  left === null ? right : right === null ? left : Math.max(left, right);

/**
 * When to stop looking in the morning and begin in the evening of one civil day: by the earlier (later) of the Sun's
 * appearance (disappearance) on a flat horizon and on the real skyline, ten minutes kept clear. Upper edge, standard
 * refraction; good to half a minute at middle latitudes.
 * @param clockNoonJdUt the noon of the place's clock on that day
 */
export function watchTimesOf(year: PreparedYear, ground: Ground, clockNoonJdUt: number): WatchTimes {
  const flat = levelSkyline(0);
  const transit = clockNoonJdUt - sunPlaceAt(year, ground, clockNoonJdUt).hourAngleRad / TAU;
  const sights = (skyline: Skyline): { rise: number | null; set: number | null } => {
    const clearance = (jdUt: number): number => edgeClearance(year, ground, skyline, jdUt);
    return {
      rise: firstSight(clearance, transit - 0.5, transit),
      set: firstSight(clearance, transit + 0.5, transit),
    };
  };
  const onFlat = sights(flat);
  const onSkyline = ground.skyline.level && ground.skyline.lowestRad === 0 ? onFlat : sights(ground.skyline);
  const rise = earlier(onFlat.rise, onSkyline.rise);
  const set = later(onFlat.set, onSkyline.set);
  return {
    stopLookingJdUt: rise === null ? null : rise - MARGIN_DAYS,
    startLookingJdUt: set === null ? null : set + MARGIN_DAYS,
    flatSunriseJdUt: onFlat.rise,
    flatSunsetJdUt: onFlat.set,
    skylineSunriseJdUt: onSkyline.rise,
    skylineSunsetJdUt: onSkyline.set,
  };
}
