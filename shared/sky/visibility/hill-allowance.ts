import type { HorizonSide } from '../phenomena/phenomenon-facts.js';
import type { Clarity } from '../vocabulary.js';
import { EXTINCTION_OF_CLARITY, plainAir } from './air.js';
import {
  ALTITUDE_COUNT,
  ALTITUDE_STEP_DEG,
  depthsByAltitude,
  HIGHEST_ALTITUDE_DEG,
  leastDifferences,
} from './model-depths.js';

/**
 * What a hill changes about the needed depth, from the model of visibility. The tables depend on brightness and clarity
 * alone, so each is made once, when it is first asked for, and serves every place, star and year.
 */

/** Sirius has −1.5; Venus, which follows the same rule, up to −4.5. */
const BRIGHTEST_MAG = -4.5;
const FAINTEST_MAG = 5;
const MAG_STEP = 0.25;
const MAG_COUNT = (FAINTEST_MAG - BRIGHTEST_MAG) / MAG_STEP + 1;
const MAGNITUDES = Array.from({ length: MAG_COUNT }, (_, row) => BRIGHTEST_MAG + row * MAG_STEP);

const tables: Record<HorizonSide, Partial<Record<Clarity, Float64Array>>> = { same: {}, opposite: {} };

/** All magnitudes, one row after the other. */
function tableOf(side: HorizonSide, clarity: Clarity): Float64Array {
  const known = tables[side][clarity];
  if (known) return known;
  const depths = depthsByAltitude(plainAir(EXTINCTION_OF_CLARITY[clarity]), side, MAGNITUDES);
  const table = new Float64Array(MAG_COUNT * ALTITUDE_COUNT);
  depths.forEach((row, index) => {
    table.set(side === 'same' ? leastDifferences(row) : row, index * ALTITUDE_COUNT);
  });
  tables[side][clarity] = table;
  return table;
}

/** Straight lines between neighbouring magnitudes and altitudes; the nearest edge outside. */
function valueIn(table: Float64Array, vMag: number, altitudeDeg: number): number {
  const magAt = Math.min(MAG_COUNT - 1, Math.max(0, (vMag - BRIGHTEST_MAG) / MAG_STEP));
  const row = Math.min(MAG_COUNT - 2, Math.floor(magAt));
  const altitudeAt = Math.min(HIGHEST_ALTITUDE_DEG, Math.max(0, altitudeDeg)) / ALTITUDE_STEP_DEG;
  const column = Math.min(ALTITUDE_COUNT - 2, Math.floor(altitudeAt));
  const cell = row * ALTITUDE_COUNT + column;
  const share = altitudeAt - column;
  const brighter = (table[cell] ?? 0) * (1 - share) + (table[cell + 1] ?? 0) * share;
  const below = cell + ALTITUDE_COUNT;
  const fainter = (table[below] ?? 0) * (1 - share) + (table[below + 1] ?? 0) * share;
  return brighter + (magAt - row) * (fainter - brighter);
}

/**
 * Same side: the excess e(a) by which the difference in altitude between star and Sun must grow because the star is not
 * seen below the hill [C]. Zero while the star is seen best above the hill anyway.
 * @param altitudeDeg of the hill, 0…60
 * @returns degrees, 0 or more
 */
export function hillExcessDeg(vMag: number, clarity: Clarity, altitudeDeg: number): number {
  const table = tableOf('same', clarity);
  return valueIn(table, vMag, altitudeDeg) - valueIn(table, vMag, 0);
}

/**
 * Opposite side: how deep the Sun must be for the star to show just as it clears (or just before it meets) the hill.
 * @param altitudeDeg of the hill, 0…60
 * @returns degrees; NOT_SEEN_DEG and near it where the air hides the star at that altitude all night
 */
export function depthOnHillDeg(vMag: number, clarity: Clarity, altitudeDeg: number): number {
  return valueIn(tableOf('opposite', clarity), vMag, altitudeDeg);
}
