import { turnsAroundYear } from '../air/model-year.js';
import { expectedInTurn } from '../markers/expected-crossing.js';
import type { MarkerAtPlace } from '../markers/place-year.js';
import { PHENOMENON_FACTS, type PhenomenonFacts } from '../phenomena/phenomenon-facts.js';
import type { SkylineCrossing } from '../phenomena/skyline-crossing.js';
import { monthOfDay } from '../time/civil-year.js';
import type { Site } from '../types.js';
import { DEG_PER_RAD } from '../units/angle.js';
import { airAtPlace } from '../visibility/air.js';
import { showsAtDeg } from '../visibility/hill-allowance.js';
import {
  type Clarity,
  PHENOMENA,
  type Phenomenon,
  type SightFallback,
  type WatchSide,
} from '../vocabulary.js';
import { extinctionAngleDeg } from './extinction-angle.js';
import { sightByModel } from './sight.js';
import { skyAt } from './sky-at.js';
import { watchWindowOf } from './watch-window.js';

/**
 * The model of visibility set by one number so that a watch agrees with the dates: on the star's expected day at this very
 * place, over its own skyline, the best minutes of the watch just show the star. The number is an offset in magnitudes:
 * how much better (or worse) eyes and air must be than the model has them. It carries the village's rule and shifts, so
 * a sighting that moves these moves the watch too.
 */
export type Calibration =
  | { by: 'model'; offsetMag: number; phenomenon: Phenomenon; expectedDayNumber: number }
  | { by: 'dates'; because: SightFallback };

/** A first morning is no instant: on the expected day the star shows for so long. A day later it shows at least as long again. */
const SHOWN_MINUTES = 3;
/**
 * Published models and rules differ by up to about two magnitudes for faint stars. What asks for more is no matter of eyes
 * and air any more, and the model is not to be stretched over it.
 */
export const LARGEST_OFFSET_MAG = 3;
const MINUTE_DAYS = 1 / 1440;

interface ExpectedDay {
  phenomenon: Phenomenon;
  facts: PhenomenonFacts;
  crossing: SkylineCrossing;
  /** Of the crossing itself. */
  jdUt: number;
  dayNumber: number;
  clarity: Clarity;
}

/** The day of one of the two phenomena of that side of the night that lies nearest. */
function nearestDay(marker: MarkerAtPlace, side: WatchSide, dayNumber: number): ExpectedDay | null {
  const days = PHENOMENA.flatMap((phenomenon): ExpectedDay[] => {
    const facts = PHENOMENON_FACTS[phenomenon];
    const crossing = marker.star.crossings?.[facts.crossing];
    if (facts.end !== side || !crossing) return [];
    return turnsAroundYear(marker, crossing).flatMap((highestRad) => {
      const { jdUt, clarity } = expectedInTurn(marker, crossing, facts, highestRad);
      return jdUt === null
        ? []
        : [{ phenomenon, facts, crossing, jdUt, dayNumber: marker.clock.dayOf(jdUt), clarity }];
    });
  });
  const distance = (day: ExpectedDay): number => Math.abs(day.dayNumber - dayNumber);
  return days.reduce<ExpectedDay | null>(
    (best, day) => (best === null || distance(day) < distance(best) ? day : best),
    null,
  );
}

/**
 * What the model has to spare in the best minutes of the watch of the expected day; null where the star is not up in it. A star that
 * comes or goes against the Sun is looked for where its rising or setting counts as seen, as with its dates.
 */
function spareOnExpectedDay(
  marker: MarkerAtPlace,
  site: Site,
  side: WatchSide,
  day: ExpectedDay,
): number | null {
  const { year, ground, clock } = marker;
  const { vMag } = marker.marker;
  const meanNoonJdUt = day.dayNumber - site.longitudeDeg / 360;
  const { span } = watchWindowOf(year, ground, day.dayNumber - clock.offsetDays(meanNoonJdUt), side);
  if (span === null) return null;
  const skylineDeg = day.crossing.starAltitudeRad * DEG_PER_RAD;
  const upToDeg =
    day.facts.side === 'same' ? 90 : Math.max(skylineDeg, showsAtDeg(vMag, marker.threshold.oppositeSideDeg));
  const lowestDeg = extinctionAngleDeg(vMag, day.clarity);
  const month = monthOfDay(day.dayNumber, year.civil.calendar);
  const sight = sightByModel(airAtPlace(site, month, day.clarity), vMag, 0);
  const place = year.stars.placeOf(marker.marker.starRef);
  const { fromJdUt, toJdUt } = span;
  const minutes = Math.floor((toJdUt - fromJdUt) / MINUTE_DAYS);
  const moments = Array.from({ length: minutes + 1 }, (_, minute) => fromJdUt + minute * MINUTE_DAYS);
  // On a hill it is the crossing alone that counts, and rounding must not put that behind the hill.
  if (day.jdUt >= fromJdUt && day.jdUt <= toJdUt) moments.push(day.jdUt);
  const spares = moments.flatMap((jdUt) => {
    const sky = skyAt(year, ground, jdUt);
    const star = sky.starAt(place);
    const altitudeDeg = star.altitudeRad * DEG_PER_RAD;
    const isThere = jdUt === day.jdUt || (sky.aboveSkylineRad(star) >= 0 && altitudeDeg <= upToDeg);
    return isThere && altitudeDeg >= lowestDeg ? [sight.spare(sky, star)] : [];
  });
  const best = spares.sort((a, b) => b - a);
  return best[Math.min(SHOWN_MINUTES, best.length - 1)] ?? null;
}

/** @param dayNumber civil day of the watch; the expected day nearest to it sets the model */
export function calibrationOf(
  marker: MarkerAtPlace,
  site: Site,
  dayNumber: number,
  side: WatchSide,
): Calibration {
  const day = nearestDay(marker, side, dayNumber);
  if (day === null) return { by: 'dates', because: 'no-day' };
  const spareMag = spareOnExpectedDay(marker, site, side, day);
  if (spareMag === null) return { by: 'dates', because: 'not-in-watch' };
  const offsetMag = -spareMag;
  if (Math.abs(offsetMag) > LARGEST_OFFSET_MAG) return { by: 'dates', because: 'too-far' };
  return { by: 'model', offsetMag, phenomenon: day.phenomenon, expectedDayNumber: day.dayNumber };
}
