import type { HorizonSide } from '../phenomena/phenomenon-facts.js';
import { plainAir } from './air.js';
import {
  ALTITUDE_COUNT,
  ALTITUDE_STEP_DEG,
  depthsByAltitude,
  HIGHEST_ALTITUDE_DEG,
  leastDifferences,
} from './model-depths.js';

/**
 * What the model of visibility asks for, tabled by extinction, brightness and altitude. A table depends on nothing else,
 * so each is made once, when it is first asked for, and serves every place, star and year.
 */

/** Sirius has −1.5; Venus, which follows the same rule, up to −4.5. */
const BRIGHTEST_MAG = -4.5;
const FAINTEST_MAG = 5;
const MAG_STEP = 0.25;
const MAG_COUNT = (FAINTEST_MAG - BRIGHTEST_MAG) / MAG_STEP + 1;
const MAGNITUDES = Array.from({ length: MAG_COUNT }, (_, row) => BRIGHTEST_MAG + row * MAG_STEP);

/** From the air of a high mountain to thick haze, magnitudes per airmass. */
const AIR_STEPS_PER_MAG = 20;
const CLEAREST_STEP = 2;
const HAZIEST_STEP = 10;

const tables: Record<HorizonSide, Partial<Record<number, Float64Array>>> = { same: {}, opposite: {} };

/** All magnitudes, one row after the other. */
function tableOf(side: HorizonSide, airStep: number): Float64Array {
  const known = tables[side][airStep];
  if (known) return known;
  const depths = depthsByAltitude(plainAir(airStep / AIR_STEPS_PER_MAG), side, MAGNITUDES);
  const table = new Float64Array(MAG_COUNT * ALTITUDE_COUNT);
  depths.forEach((row, index) => {
    table.set(side === 'same' ? leastDifferences(row) : row, index * ALTITUDE_COUNT);
  });
  tables[side][airStep] = table;
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
 * Same side: the least difference in altitude between star and Sun at which a star shows while it stands at least so high.
 * Opposite side: how deep the Sun must be for the star to show at that altitude; NOT_SEEN_DEG and near it where the air
 * hides it there all night. Between the tables of neighbouring airs by straight lines, beyond the last ones as these.
 * @param magPerAirmass extinction overhead
 * @param altitudeDeg 0…60
 * @returns degrees
 */
export function modelValueDeg(
  side: HorizonSide,
  magPerAirmass: number,
  vMag: number,
  altitudeDeg: number,
): number {
  // Rounded, so that 0.3 is a step and not a hair beside it.
  const airAt = Math.round(magPerAirmass * AIR_STEPS_PER_MAG * 1e6) / 1e6;
  const within = Math.min(HAZIEST_STEP, Math.max(CLEAREST_STEP, airAt));
  const step = Math.floor(within);
  const share = within - step;
  const clearer = valueIn(tableOf(side, step), vMag, altitudeDeg);
  if (share === 0) return clearer;
  return clearer + share * (valueIn(tableOf(side, step + 1), vMag, altitudeDeg) - clearer);
}
