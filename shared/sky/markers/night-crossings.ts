import { horizontalOf } from '../horizon/horizontal.js';
import { midnightOf, sinDeepestSun } from '../phenomena/deepest-sun.js';
import { culminationOf, sinSunDepth, type SkylineCrossing } from '../phenomena/skyline-crossing.js';
import { monthOfDay } from '../time/civil-year.js';
import { localSiderealRad } from '../time/sidereal-clock.js';
import { DEG_PER_RAD, RAD_PER_DEG, wrapTau } from '../units/angle.js';
import type { Clarity } from '../vocabulary.js';
import { CLARITY_SHIFT_DEG, clarityOfMonth } from '../visibility/clarity.js';
import { highUpDepthDeg } from '../visibility/high-up-depth.js';
import { neededIn, placeShiftDeg } from './expected-crossing.js';
import type { MarkerAtPlace } from './place-year.js';

/**
 * Night by night: is there a moment at which the star stands over the skyline of a dark enough sky? Looked at are the
 * rising, the culmination, the setting and, while the star is up, the Sun's deepest moment. Used where an arc is missing
 * and the dates alone cannot tell whether the star is seen.
 */

function clarityOfNight(marker: MarkerAtPlace, night: number): Clarity {
  return clarityOfMonth(marker.settings.clarityByMonth, monthOfDay(night, marker.year.civil.calendar));
}

/** Calls back for every return of a crossing in a span of nights, with the night and the Sun's longitude. */
function eachReturn(
  marker: MarkerAtPlace,
  crossing: SkylineCrossing,
  fromNight: number,
  toNight: number,
  visit: (night: number, sunLongitudeRad: number) => void,
): void {
  const { periodDays } = marker.year.sidereal;
  const first = Math.ceil((fromNight - 1 - crossing.anInstantJdUt) / periodDays);
  const last = Math.floor((toNight + 2 - crossing.anInstantJdUt) / periodDays);
  for (let turn = first; turn <= last; turn += 1) {
    const jdUt = crossing.anInstantJdUt + turn * periodDays;
    const night = marker.clock.nightOf(jdUt);
    if (night >= fromNight && night <= toNight) visit(night, marker.year.sun.longitudeRad(jdUt));
  }
}

/** Sine of the depth needed on the same side at a rising or setting, in a night's air. */
export function sameSideNeeded(
  marker: MarkerAtPlace,
  crossing: SkylineCrossing,
): (night: number, sunLongitudeRad: number) => number {
  const byClarity = {
    clear: neededIn(marker, crossing, 'same', 'clear'),
    ordinary: neededIn(marker, crossing, 'same', 'ordinary'),
    hazy: neededIn(marker, crossing, 'same', 'hazy'),
  };
  return (night, sunLongitudeRad) => byClarity[clarityOfNight(marker, night)].sineAt(sunLongitudeRad);
}

/**
 * Sine of the depth needed for a star high in the sky. Its altitude counts under either skyline rule, because no skyline
 * is being crossed: a star that stands high is seen in a lighter sky.
 */
export function neededUpThere(marker: MarkerAtPlace, altitudeRad: number, night: number): number {
  const clarity = clarityOfNight(marker, night);
  const thresholdDeg =
    marker.threshold.sameSideDeg + placeShiftDeg(marker, 'same') + CLARITY_SHIFT_DEG[clarity];
  return Math.sin(highUpDepthDeg(thresholdDeg, altitudeRad * DEG_PER_RAD) * RAD_PER_DEG);
}

/**
 * Is the star up, and the sky dark enough for its altitude, when the Sun is deepest?
 * @param crossings null for a star that never sets
 */
function seenAtDeepest(
  marker: MarkerAtPlace,
  crossings: { rising: SkylineCrossing; setting: SkylineCrossing } | null,
  night: number,
): boolean {
  const { year, ground } = marker;
  const sinDepth = sinDeepestSun(year, ground, night);
  if (sinDepth <= 0) return false;
  const siderealRad = localSiderealRad(year.sidereal, midnightOf(ground, night), ground.longitudeRad);
  if (crossings) {
    const sinceRising = wrapTau(siderealRad - crossings.rising.siderealRad);
    if (sinceRising > wrapTau(crossings.setting.siderealRad - crossings.rising.siderealRad)) return false;
  }
  const place = year.stars.placeOf(marker.marker.starRef);
  const { sinDeclination, cosDeclination, rightAscensionRad } = place;
  const star = horizontalOf(ground.latitude, sinDeclination, cosDeclination, siderealRad - rightAscensionRad);
  return sinDepth >= neededUpThere(marker, star.altitudeRad, night);
}

/** Which nights of a span let the star be seen high up, at its culmination or at the Sun's deepest; 1 for each. */
export function seenHighUp(marker: MarkerAtPlace, fromNight: number, toNight: number): Uint8Array {
  const seen = new Uint8Array(toNight - fromNight + 1);
  const { crossings, outcome } = marker.star;
  if (outcome === 'never-clears-skyline') return seen;
  const culmination = culminationOf(marker.year, marker.ground, marker.marker.starRef);
  eachReturn(marker, culmination, fromNight, toNight, (night, sun) => {
    const needed = neededUpThere(marker, culmination.starAltitudeRad, night);
    if (sinSunDepth(culmination, sun) >= needed) seen[night - fromNight] = 1;
  });
  for (let night = fromNight; night <= toNight; night += 1) {
    if (seen[night - fromNight] === 0 && seenAtDeepest(marker, crossings, night)) seen[night - fromNight] = 1;
  }
  return seen;
}

/** The nights of a span without any moment at which the star can be seen. */
export function nightsWithoutDarkMoment(marker: MarkerAtPlace, fromNight: number, toNight: number): number[] {
  const { crossings } = marker.star;
  if (!crossings) return [];
  const seen = seenHighUp(marker, fromNight, toNight);
  for (const crossing of [crossings.rising, crossings.setting]) {
    const needed = sameSideNeeded(marker, crossing);
    eachReturn(marker, crossing, fromNight, toNight, (night, sun) => {
      if (sinSunDepth(crossing, sun) >= needed(night, sun)) seen[night - fromNight] = 1;
    });
  }
  const nights: number[] = [];
  for (let index = 0; index < seen.length; index += 1) if (seen[index] === 0) nights.push(fromNight + index);
  return nights;
}
