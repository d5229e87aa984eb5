import { skyAt } from '../look/sky-at.js';
import type { PhenomenonFacts } from '../phenomena/phenomenon-facts.js';
import type { SkylineCrossing } from '../phenomena/skyline-crossing.js';
import { DEG_PER_RAD } from '../units/angle.js';
import type { Air } from '../visibility/air.js';
import { faintestStarMag } from '../visibility/faintest-star.js';
import { showsAtDeg } from '../visibility/hill-allowance.js';
import type { MarkerAtPlace } from '../markers/place-year.js';

/**
 * What the model of visibility lets a person see of one rising or setting, minute by minute from the skyline inward: after
 * a rising, before a setting, while the Sun is down. Star and Sun without refraction, as everywhere in the core.
 */

/** The minutes of one morning or evening in which the star shows. */
export interface Sighting {
  fromJdUt: number;
  toJdUt: number;
  /** Whole minutes counted one by one; a hill in between may hide some. */
  minutes: number;
}

/** What is looked for at the crossings of one phenomenon. */
export interface Watched {
  marker: MarkerAtPlace;
  facts: PhenomenonFacts;
  crossing: SkylineCrossing;
  /** Only up to this altitude a rising (or setting) counts as watched; the whole sky for the same side. */
  upToDeg: number;
}

/** Light of the Moon in nanolamberts at a place in the sky. */
export type MoonNl = (air: Air, altitudeRad: number, azimuthRad: number) => number;

const noMoon: MoonNl = () => 0;
const MINUTE_DAYS = 1 / 1440;
/** No star is up longer before it is day again, polar nights apart. */
const LONGEST_MINUTES = 720;

export function watched(marker: MarkerAtPlace, facts: PhenomenonFacts, crossing: SkylineCrossing): Watched {
  const upToDeg =
    facts.side === 'same'
      ? 90
      : Math.max(
          crossing.starAltitudeRad * DEG_PER_RAD,
          showsAtDeg(marker.marker.vMag, marker.threshold.oppositeSideDeg),
        );
  return { marker, facts, crossing, upToDeg };
}

/** Calls back for each minute in which the star shows, from the crossing inward, until told to stop. */
function eachMinuteSeen(
  { marker, facts, crossing, upToDeg }: Watched,
  turn: number,
  air: Air,
  moonNl: MoonNl,
  visit: (jdUt: number) => boolean,
): void {
  const { year, ground } = marker;
  const place = year.stars.placeOf(marker.marker.starRef);
  const atSkyline = crossing.anInstantJdUt + turn * year.sidereal.periodDays;
  const inward = facts.crossing === 'rising' ? MINUTE_DAYS : -MINUTE_DAYS;
  for (let minute = 0; minute < LONGEST_MINUTES; minute += 1) {
    const jdUt = atSkyline + minute * inward;
    const sky = skyAt(year, ground, jdUt);
    if (sky.sunDepressionDeg <= 0) return;
    const star = sky.starAt(place);
    const altitudeDeg = star.altitudeRad * DEG_PER_RAD;
    // The first minute is the crossing itself: rounding must not put it behind the hill.
    if (minute > 0 && altitudeDeg > upToDeg) return;
    if (minute > 0 && sky.aboveSkylineRad(star) < 0) continue;
    const faintest = faintestStarMag(air, {
      altitudeDeg: Math.max(0, altitudeDeg),
      sunAltitudeDeg: -sky.sunDepressionDeg,
      azimuthDifferenceDeg: (star.azimuthRad - sky.sunAzimuthRad) * DEG_PER_RAD,
      moonNl: moonNl(air, star.altitudeRad, star.azimuthRad),
    });
    if (faintest >= marker.marker.vMag && !visit(jdUt)) return;
  }
}

/** Does the star show at all at one return of the crossing, counted in sidereal days from its known instant? */
export function isSighted(watch: Watched, turn: number, air: Air): boolean {
  let sighted = false;
  eachMinuteSeen(watch, turn, air, noMoon, () => {
    sighted = true;
    return false;
  });
  return sighted;
}

/** When the star shows at one return of the crossing; null where it does not. */
export function sightingAt(watch: Watched, turn: number, air: Air, moonNl: MoonNl = noMoon): Sighting | null {
  let sighting: Sighting | null = null;
  eachMinuteSeen(watch, turn, air, moonNl, (jdUt) => {
    sighting = {
      fromJdUt: Math.min(jdUt, sighting?.fromJdUt ?? jdUt),
      toJdUt: Math.max(jdUt, sighting?.toJdUt ?? jdUt),
      minutes: (sighting?.minutes ?? 0) + 1,
    };
    return true;
  });
  return sighting;
}
