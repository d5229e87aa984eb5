import { type PreparedYear, prepareYear } from './prepared-year.js';

/**
 * Keeps the years asked for last. A prepared year only ever answers the same for the same question, so sharing it
 * changes no result; it saves the preparation when one page asks for many markers of a year.
 */
const KEPT_YEARS = 12;
const kept = new Map<number, PreparedYear>();

export function preparedYearOf(year: number): PreparedYear {
  const prepared = kept.get(year) ?? prepareYear(year);
  kept.delete(year);
  kept.set(year, prepared);
  const [oldest] = kept.keys();
  if (kept.size > KEPT_YEARS && oldest !== undefined) kept.delete(oldest);
  return prepared;
}
