import { culminationOf, sinSunDepth, type SkylineCrossing } from '../phenomena/skyline-crossing.js';
import { monthOfDay } from '../time/civil-year.js';
import { RAD_PER_DEG, DEG_PER_RAD } from '../units/angle.js';
import { CLARITY_SHIFT_DEG, clarityOfMonth } from '../visibility/clarity.js';
import { neededDepthDeg } from '../visibility/needed-depth.js';
import { neededIn, placeShiftDeg } from './expected-crossing.js';
import type { MarkerAtPlace } from './place-year.js';

/**
 * Night by night: does one kind of moment (rising, setting, culmination) fall into dark enough a sky?
 * Used where an arc is missing and the dates alone cannot tell whether the star is seen.
 */

/** Degrees that the month of a night adds to the needed depth. */
function clarityShiftOfNight(marker: MarkerAtPlace, night: number): number {
  const month = monthOfDay(night, marker.year.civil.calendar);
  return CLARITY_SHIFT_DEG[clarityOfMonth(marker.settings.clarityByMonth, month)];
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
): (night: number, sun: number) => number {
  const shiftDeg = placeShiftDeg(marker, 'same');
  const byClarity = [-1, 0, 1].map((clarityDeg) => neededIn(marker, crossing, 'same', shiftDeg + clarityDeg));
  return (night, sunLongitudeRad) =>
    byClarity[1 + clarityShiftOfNight(marker, night)]?.sineAt(sunLongitudeRad) ?? Number.POSITIVE_INFINITY;
}

/**
 * Sine of the depth needed at the culmination. The star's altitude counts there under either skyline rule, because no
 * skyline is being crossed: a star high in the sky is seen in a lighter one.
 */
function culminationNeeded(marker: MarkerAtPlace, culmination: SkylineCrossing): (night: number) => number {
  const thresholdDeg = marker.threshold.sameSideDeg + placeShiftDeg(marker, 'same');
  const altitudeDeg = culmination.starAltitudeRad * DEG_PER_RAD;
  return (night) =>
    Math.sin(
      neededDepthDeg(
        'altitude-difference',
        'same',
        thresholdDeg + clarityShiftOfNight(marker, night),
        altitudeDeg,
      ) * RAD_PER_DEG,
    );
}

/** Which nights of a span have a culmination in a dark enough sky; index 0 is the first night. */
export function darkCulminations(marker: MarkerAtPlace, fromNight: number, toNight: number): Uint8Array {
  const dark = new Uint8Array(toNight - fromNight + 1);
  const culmination = culminationOf(marker.year, marker.ground, marker.starIndex);
  const needed = culminationNeeded(marker, culmination);
  eachReturn(marker, culmination, fromNight, toNight, (night, sun) => {
    if (sinSunDepth(culmination, sun) >= needed(night)) dark[night - fromNight] = 1;
  });
  return dark;
}

/** The nights of a span in which neither a crossing nor the culmination falls into a dark enough sky. */
export function nightsWithoutDarkMoment(
  marker: MarkerAtPlace,
  crossings: readonly SkylineCrossing[],
  fromNight: number,
  toNight: number,
): number[] {
  const seen = darkCulminations(marker, fromNight, toNight);
  for (const crossing of crossings) {
    const needed = sameSideNeeded(marker, crossing);
    eachReturn(marker, crossing, fromNight, toNight, (night, sun) => {
      if (sinSunDepth(crossing, sun) >= needed(night, sun)) seen[night - fromNight] = 1;
    });
  }
  const nights: number[] = [];
  for (let index = 0; index < seen.length; index += 1) if (seen[index] === 0) nights.push(fromNight + index);
  return nights;
}
