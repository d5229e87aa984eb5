import type { PreparedYear } from '../phenomena/prepared-year.js';
import type { Ground } from '../phenomena/skyline-crossing.js';
import { type SunPlace, sunPlaceAt } from '../phenomena/sun-place.js';
import { watchTimesOf } from '../phenomena/watch-times.js';
import { RAD_PER_DEG, TAU } from '../units/angle.js';
import type { SunCourse, WatchSide } from '../vocabulary.js';

/** The stretch of a morning or an evening in which a star that comes or goes can be looked for. */
export interface WatchWindow {
  sunCourse: SunCourse;
  /** When to stop (dawn) or to begin (dusk); null where the Sun does not cross. */
  limitJdUt: number | null;
  /** Null where the Sun stays up. */
  span: { fromJdUt: number; toJdUt: number } | null;
}

/** The faintest stars of the table need 17.4° of depth: from here on nothing changes any more. */
const NIGHT_DEG = 20;
/** Nobody watches longer for one star; near the polar circles twilight lasts as long. */
const LONGEST_DAYS = 3 / 24;
const STEP_DAYS = 2 / 1440;
/** Without a sunrise the watch ends where the sky is too light for any star low down. */
const LIGHT_DEG = 6;

/**
 * The watch of one civil day: at dawn it ends with the time to stop, at dusk it begins with the time to begin; its dark
 * end is where the Sun is 20° deep, three hours away, or the middle of the night, whichever comes first.
 * @param clockNoonJdUt the noon of the place's clock on that day
 */
export function watchWindowOf(
  year: PreparedYear,
  ground: Ground,
  clockNoonJdUt: number,
  side: WatchSide,
): WatchWindow {
  const times = watchTimesOf(year, ground, clockNoonJdUt);
  const limitJdUt = side === 'dawn' ? times.stopLookingJdUt : times.startLookingJdUt;
  const sunCourse = side === 'dawn' ? times.dawnSun : times.duskSun;
  if (sunCourse === 'stays-up') return { sunCourse, limitJdUt, span: null };
  const sunAt = (jdUt: number): SunPlace => sunPlaceAt(year, ground, jdUt);
  const noonJdUt = clockNoonJdUt - sunAt(clockNoonJdUt).hourAngleRad / TAU;
  /** Away from the day: into the night. */
  const intoNight = side === 'dawn' ? -1 : 1;
  const midnightJdUt = noonJdUt + intoNight * 0.5;
  const sinAltitude = (jdUt: number): number => Math.sin(sunAt(jdUt).altitudeRad);

  const lightEnd = limitJdUt ?? firstDepth(sinAltitude, noonJdUt, midnightJdUt, LIGHT_DEG);
  const longest = lightEnd + intoNight * LONGEST_DAYS;
  const nearer = intoNight * Math.min(intoNight * longest, intoNight * midnightJdUt);
  const darkEnd = firstDepth(sinAltitude, lightEnd, nearer, NIGHT_DEG);
  return {
    sunCourse,
    limitJdUt,
    span: side === 'dawn' ? { fromJdUt: darkEnd, toJdUt: lightEnd } : { fromJdUt: lightEnd, toJdUt: darkEnd },
  };
}

/** First instant on the way from one to another at which the Sun is so deep; the way's end where it never is. */
function firstDepth(
  sinAltitude: (jdUt: number) => number,
  fromJdUt: number,
  toJdUt: number,
  depthDeg: number,
): number {
  const wanted = -Math.sin(depthDeg * RAD_PER_DEG);
  const steps = Math.max(1, Math.ceil(Math.abs(toJdUt - fromJdUt) / STEP_DAYS));
  for (let step = 0; step <= steps; step += 1) {
    const jdUt = fromJdUt + ((toJdUt - fromJdUt) * step) / steps;
    if (sinAltitude(jdUt) <= wanted) return jdUt;
  }
  return toJdUt;
}
