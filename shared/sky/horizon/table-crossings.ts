import type { StarPlace } from '../stars/star-frame.js';
import { clampUnit, RAD_PER_DEG, wrapPi } from '../units/angle.js';
import { horizontalOf, type Latitude } from './horizontal.js';
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
/** A second of arc in hour angle is a fifteenth of a second of time. */
const PRECISION_RAD = RAD_PER_DEG / 36_000;
/** Turning points further from the skyline than this cannot touch it within one step. */
const NEAR_RAD = 2 * RAD_PER_DEG;
const MARGIN_RAD = 1e-6;
const GOLDEN = (Math.sqrt(5) - 1) / 2;

type Clearance = (hourAngleRad: number) => number;

/** Hour angles at which the star stands in the vertical of an azimuth, at most two. */
function hourAnglesOverAzimuth(latitude: Latitude, place: StarPlace, azimuthRad: number): number[] {
  const sinAz = Math.sin(azimuthRad);
  const cosAz = Math.cos(azimuthRad);
  // cosAz·sin H − sinAz·sin φ·cos H = −sinAz·cos φ·tan δ holds on the vertical and on its continuation overhead.
  const amplitude = Math.hypot(cosAz, sinAz * latitude.sin) * place.cosDeclination;
  const ratio = (-sinAz * latitude.cos * place.sinDeclination) / amplitude;
  if (!(Math.abs(ratio) <= 1)) return [];
  const phase = Math.atan2(sinAz * latitude.sin, cosAz);
  const turn = Math.asin(ratio);
  return [wrapPi(phase + turn), wrapPi(phase + Math.PI - turn)];
}

/** Cuts a stretch of the path at the table's points and into short steps, both ends included, ascending. */
function cutsOf(from: number, to: number, bends: readonly number[]): number[] {
  const fixed = [from, ...bends.filter((bend) => bend > from && bend < to), to].sort((a, b) => a - b);
  const cuts: number[] = [];
  for (let index = 0; index + 1 < fixed.length; index += 1) {
    const left = fixed[index] ?? from;
    const right = fixed[index + 1] ?? to;
    const steps = Math.max(1, Math.ceil((right - left) / MAX_STEP_RAD));
    for (let step = 0; step < steps; step += 1) cuts.push(left + ((right - left) * step) / steps);
  }
  cuts.push(to);
  return cuts;
}

/** Hour angle of the largest value of `sign · clearance` between two hour angles, by golden section. */
function turningPoint(clearance: Clearance, from: number, to: number, sign: number): number {
  let left = from;
  let right = to;
  while (right - left > PRECISION_RAD) {
    const inner = right - GOLDEN * (right - left);
    const outer = left + GOLDEN * (right - left);
    if (sign * clearance(inner) > sign * clearance(outer)) right = outer;
    else left = inner;
  }
  return (left + right) / 2;
}

function zeroBetween(clearance: Clearance, from: number, to: number): number {
  let left = from;
  let right = to;
  const leftAbove = clearance(left) >= 0;
  while (right - left > PRECISION_RAD) {
    const middle = (left + right) / 2;
    if (clearance(middle) >= 0 === leftAbove) left = middle;
    else right = middle;
  }
  return (left + right) / 2;
}

/** Adds turning points that may reach over the skyline, or under it, between two cuts. */
function withTurningPoints(clearance: Clearance, cuts: readonly number[]): { at: number[]; value: number[] } {
  const at: number[] = [];
  const value: number[] = [];
  const values = cuts.map(clearance);
  for (let index = 0; index < cuts.length; index += 1) {
    const here = values[index] ?? 0;
    at.push(cuts[index] ?? 0);
    value.push(here);
    const next = values[index + 1];
    if (next === undefined || Math.abs(here) > NEAR_RAD || here >= 0 !== next >= 0) continue;
    // Both ends on the same side: the path may still turn across the skyline between them.
    const from = cuts[index] ?? 0;
    const to = cuts[index + 1] ?? 0;
    const sign = here >= 0 ? -1 : 1;
    const probe = (to - from) / 1000;
    const turns = sign * clearance(from + probe) > sign * here && sign * clearance(to - probe) > sign * next;
    if (!turns) continue;
    const turn = turningPoint(clearance, from, to, sign);
    at.push(turn);
    value.push(clearance(turn));
  }
  return { at, value };
}

/** First upward and last downward crossing between lower culminations; for paths that reach the table's altitudes. */
export function tableCrossings(latitude: Latitude, place: StarPlace, skyline: Skyline): TableCrossings {
  const { sinDeclination, cosDeclination } = place;
  const base = latitude.sin * sinDeclination;
  const swing = latitude.cos * cosDeclination;
  const hourAngleAt = (altitudeRad: number): number =>
    Math.acos(clampUnit((Math.sin(altitudeRad) - base) / swing));
  // At a pole the altitude never changes and the whole circle is in doubt. Elsewhere a hair more than the doubtful
  // stretches is looked at, so that rounding cannot hide a crossing that lies right at their end.
  const atPole = swing < 1e-12;
  const outer = atPole ? Math.PI : Math.min(Math.PI, hourAngleAt(skyline.lowestRad) + MARGIN_RAD);
  const inner = atPole ? 0 : Math.max(0, hourAngleAt(skyline.highestRad) - MARGIN_RAD);

  const clearance: Clearance = (hourAngleRad) => {
    const { altitudeRad, azimuthRad } = horizontalOf(latitude, sinDeclination, cosDeclination, hourAngleRad);
    return altitudeRad - skyline.altitudeRad(azimuthRad);
  };
  const bends = skyline.azimuthsRad.flatMap((azimuth) => hourAnglesOverAzimuth(latitude, place, azimuth));
  const stretches =
    inner > 0 ? [cutsOf(-outer, -inner, bends), cutsOf(inner, outer, bends)] : [cutsOf(-outer, outer, bends)];
  const samples = stretches.map((cuts) => withTurningPoints(clearance, cuts));
  const at = samples.flatMap((sample) => sample.at);
  const value = samples.flatMap((sample) => sample.value);

  let rise: number | null = null;
  let set: number | null = null;
  for (let index = 0; index + 1 < at.length; index += 1) {
    const above = (value[index] ?? 0) >= 0;
    const nextAbove = (value[index + 1] ?? 0) >= 0;
    if (above === nextAbove) continue;
    const zero = zeroBetween(clearance, at[index] ?? 0, at[index + 1] ?? 0);
    if (nextAbove) rise ??= zero;
    else set = zero;
  }
  if (rise === null && set === null)
    return (value[0] ?? 0) >= 0 || inner > 0 ? 'always-above' : 'always-below';
  return { riseHourAngleRad: rise ?? -outer, setHourAngleRad: set ?? outer };
}
