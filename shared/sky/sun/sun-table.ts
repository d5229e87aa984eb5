import { TAU, wrapPi } from '../units/angle.js';
import { sunLongitudeRad } from './sun-longitude.js';

/**
 * The Sun's apparent ecliptic longitude (true equinox of date, light time and aberration included) around an epoch.
 * Values are exact at nodes four days apart and interpolated between them with four nodes; the error is under
 * 0.0001° (tests/unit/shared/sky/sun/sun-table.test.ts), which moves no crossing by more than nine seconds.
 * Nodes are computed when first asked for: a single date costs a dozen, a whole year a hundred.
 */
export interface SunTable {
  /** Longitude in radians that grows without jumps through the years; at the epoch it lies in [0, 2π). */
  longitudeRad(jdUt: number): number;
  /** The instant (JD UT) at which the Sun reaches such a longitude, good to 0.001 day. */
  instantOf(longitudeRad: number): number;
}

const STEP_DAYS = 4;
/** 1800 days on either side: enough for a year, the disappearances around it and the widest ranges. */
const HALF_NODES = 450;
const MEAN_MOTION_RAD_PER_DAY = TAU / 365.2422;

/** @param epochJdUt Julian Day (UT) of the middle of the table */
export function prepareSunTable(epochJdUt: number): SunTable {
  const nodes = new Float64Array(2 * HALF_NODES + 1).fill(Number.NaN);
  const firstJd = epochJdUt - HALF_NODES * STEP_DAYS;
  const atEpoch = sunLongitudeRad(epochJdUt);

  const node = (index: number): number => {
    const known = nodes[index];
    if (known === undefined) throw new RangeError('the Sun was asked for too far from the prepared year');
    if (!Number.isNaN(known)) return known;
    const jdUt = firstJd + index * STEP_DAYS;
    // The true longitude never strays more than a few degrees from the mean one, so the right turn is the nearest.
    const mean = atEpoch + (jdUt - epochJdUt) * MEAN_MOTION_RAD_PER_DAY;
    const value = mean + wrapPi(sunLongitudeRad(jdUt) - mean);
    nodes[index] = value;
    return value;
  };

  const longitudeRad = (jdUt: number): number => {
    const position = (jdUt - firstJd) / STEP_DAYS;
    const index = Math.floor(position);
    const t = position - index;
    const before = node(index - 1);
    const left = node(index);
    const right = node(index + 1);
    const after = node(index + 2);
    // Lagrange's cubic through the four nodes around the instant.
    return (
      (-t * (t - 1) * (t - 2) * before) / 6 +
      ((t + 1) * (t - 1) * (t - 2) * left) / 2 -
      ((t + 1) * t * (t - 2) * right) / 2 +
      ((t + 1) * t * (t - 1) * after) / 6
    );
  };

  const instantOf = (targetRad: number): number => {
    let jdUt = epochJdUt + (targetRad - atEpoch) / MEAN_MOTION_RAD_PER_DAY;
    // The true motion differs from the mean by at most a thirtieth, so each step leaves a thirtieth of the error.
    for (let step = 0; step < 3; step += 1)
      jdUt += (targetRad - longitudeRad(jdUt)) / MEAN_MOTION_RAD_PER_DAY;
    return jdUt;
  };

  return { longitudeRad, instantOf };
}
