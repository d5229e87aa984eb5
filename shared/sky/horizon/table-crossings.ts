import type { StarPlace } from '../stars/star-frame.js';
import { clampUnit, RAD_PER_DEG } from '../units/angle.js';
import type { Latitude } from './horizontal.js';
import type { Skyline } from './skyline.js';

/**
 * Crossings of a skyline table by a star. Only the stretches of the path between the table's lowest and highest
 * altitude are looked at. They are cut where the star stands over a point of the table, because the skyline bends
 * there, and once more every degree and a half; between two cuts the clearance bends one way only, so that a
 * turning point near zero is found by narrowing down on it.
 */

export type TableCrossings =
  { riseHourAngleRad: number; setHourAngleRad: number } | 'always-above' | 'always-below';

const MAX_STEP_RAD = 1.5 * RAD_PER_DEG;
/** A hundredth of a second of time. */
const PRECISION_RAD = RAD_PER_DEG / 24_000;
/** Turning points further from the skyline than this cannot touch it within one step. */
const NEAR_RAD = 2 * RAD_PER_DEG;
const MARGIN_RAD = 1e-6;
const GOLDEN = (Math.sqrt(5) - 1) / 2;

/** A star's path over a skyline: by how much it is above at an hour angle. */
class PathOverSkyline {
  readonly base: number;
  readonly swing: number;

  constructor(
    private readonly latitude: Latitude,
    private readonly place: StarPlace,
    readonly skyline: Skyline,
  ) {
    this.base = latitude.sin * place.sinDeclination;
    this.swing = latitude.cos * place.cosDeclination;
  }

  clearance(hourAngleRad: number): number {
    const { sinDeclination, cosDeclination } = this.place;
    const cosHour = Math.cos(hourAngleRad);
    const east = -cosDeclination * Math.sin(hourAngleRad);
    const north = this.latitude.cos * sinDeclination - this.latitude.sin * cosDeclination * cosHour;
    const altitude = Math.asin(clampUnit(this.base + this.swing * cosHour));
    return altitude - this.skyline.altitudeRad(Math.atan2(east, north));
  }

  /** Hour angle, not negative, at which the star has an altitude; 0 or π where it never has. */
  hourAngleAt(altitudeRad: number): number {
    return Math.acos(clampUnit((Math.sin(altitudeRad) - this.base) / this.swing));
  }

  /** Hour angles at which the star stands over a point of the table, at an altitude that matters; ascending. */
  bends(): number[] {
    const { sinDeclination, cosDeclination } = this.place;
    const lowest = Math.sin(this.skyline.lowestRad);
    const highest = Math.sin(this.skyline.highestRad);
    const found: number[] = [];
    for (const { sinAzimuth, cosAzimuth } of this.skyline.points) {
      // a·sin H − b·cos H = k on the vertical circle of the azimuth (and on its continuation beyond the zenith).
      const a = cosAzimuth * cosDeclination;
      const b = sinAzimuth * this.latitude.sin * cosDeclination;
      const k = -sinAzimuth * this.latitude.cos * sinDeclination;
      const square = a * a + b * b;
      const rest = square - k * k;
      if (!(rest >= 0)) continue;
      const root = Math.sqrt(rest);
      for (const side of SIDES) {
        const cosHour = (side * a * root - b * k) / square;
        const up = this.base + this.swing * cosHour;
        if (up >= lowest && up <= highest) found.push(Math.atan2(a * k + side * b * root, square * cosHour));
      }
    }
    return found.sort(ascending);
  }
}

const SIDES = [1, -1] as const;

function ascending(left: number, right: number): number {
  return left - right;
}

/** Cuts a stretch of the path at the table's points and into short steps, both ends included, ascending. */
function cutsOf(from: number, to: number, bends: readonly number[], cuts: number[]): void {
  let left = from;
  for (let index = 0; index <= bends.length; index += 1) {
    const right = index === bends.length ? to : (bends[index] ?? to);
    if (right <= left || right > to) continue;
    const steps = Math.ceil((right - left) / MAX_STEP_RAD);
    for (let step = 0; step < steps; step += 1) cuts.push(left + ((right - left) * step) / steps);
    left = right;
  }
  if (left < to) cutsOf(left, to, [], cuts);
  else cuts.push(to);
}

/** Hour angle of the largest value of `sign · clearance` between two hour angles, by golden section. */
function turningPoint(path: PathOverSkyline, from: number, to: number, sign: number): number {
  let left = from;
  let right = to;
  while (right - left > PRECISION_RAD) {
    const inner = right - GOLDEN * (right - left);
    const outer = left + GOLDEN * (right - left);
    if (sign * path.clearance(inner) > sign * path.clearance(outer)) right = outer;
    else left = inner;
  }
  return (left + right) / 2;
}

/** The crossing between two hour angles on opposite sides of the skyline. */
function zeroBetween(path: PathOverSkyline, from: number, to: number): number {
  let left = from;
  let right = to;
  let leftValue = path.clearance(left);
  let rightValue = path.clearance(right);
  for (let step = 0; right - left > PRECISION_RAD && step < 60; step += 1) {
    // A chord first; halving every third step keeps a bent chord from creeping.
    const chord = left - (leftValue * (right - left)) / (rightValue - leftValue);
    const inside = step % 3 !== 2 && chord > left && chord < right;
    const middle = inside ? chord : (left + right) / 2;
    const value = path.clearance(middle);
    if (Math.abs(value) < 1e-9) return middle;
    if (value >= 0 === leftValue >= 0) {
      left = middle;
      leftValue = value;
    } else {
      right = middle;
      rightValue = value;
    }
  }
  return (left + right) / 2;
}

/** Turning point between two cuts on the same side of the skyline that may reach across it, or null. */
function possibleTurn(
  path: PathOverSkyline,
  from: number,
  to: number,
  here: number,
  next: number,
): number | null {
  if (Math.abs(here) > NEAR_RAD || here >= 0 !== next >= 0) return null;
  const sign = here >= 0 ? -1 : 1;
  const probe = (to - from) / 1000;
  const turns =
    sign * path.clearance(from + probe) > sign * here && sign * path.clearance(to - probe) > sign * next;
  return turns ? turningPoint(path, from, to, sign) : null;
}

/** First upward and last downward crossing between lower culminations; for paths that reach the table's altitudes. */
export function tableCrossings(latitude: Latitude, place: StarPlace, skyline: Skyline): TableCrossings {
  const path = new PathOverSkyline(latitude, place, skyline);
  // At a pole the altitude never changes and the whole circle is in doubt. Elsewhere a hair more than the doubtful
  // stretches is looked at, so that rounding cannot hide a crossing that lies right at their end.
  const atPole = path.swing < 1e-12;
  const outer = atPole ? Math.PI : Math.min(Math.PI, path.hourAngleAt(skyline.lowestRad) + MARGIN_RAD);
  const inner = atPole ? 0 : Math.max(0, path.hourAngleAt(skyline.highestRad) - MARGIN_RAD);
  const bends = path.bends();
  const cuts: number[] = [];
  if (inner > 0) {
    cutsOf(-outer, -inner, bends, cuts);
    cutsOf(inner, outer, bends, cuts);
  } else {
    cutsOf(-outer, outer, bends, cuts);
  }

  let rise: number | null = null;
  let set: number | null = null;
  let at = cuts[0] ?? -outer;
  let value = path.clearance(at);
  const startsAbove = value >= 0;
  for (let index = 1; index < cuts.length; index += 1) {
    const nextAt = cuts[index] ?? outer;
    const nextValue = path.clearance(nextAt);
    const turn = possibleTurn(path, at, nextAt, value, nextValue);
    const turnCrosses = turn !== null && path.clearance(turn) >= 0 !== value >= 0;
    const stops = turnCrosses ? [turn, nextAt] : [nextAt];
    for (const stop of stops) {
      const stopValue = path.clearance(stop);
      if (stopValue >= 0 !== value >= 0) {
        const zero = zeroBetween(path, at, stop);
        if (stopValue >= 0) rise ??= zero;
        else set = zero;
      }
      at = stop;
      value = stopValue;
    }
  }
  if (rise === null && set === null) return startsAbove || inner > 0 ? 'always-above' : 'always-below';
  return { riseHourAngleRad: rise ?? -outer, setHourAngleRad: set ?? outer };
}
