import type { Site } from '../types.js';
import { type Air, airAtPlace } from '../visibility/air.js';
import type { Clarity } from '../vocabulary.js';

/** Air of a place: month 1…12 and how clear it is. */
export type PlaceAir = (month: number, clarity: Clarity) => Air;

/** Each air is made once, when it is asked for. */
export function placeAirOf(site: Site): PlaceAir {
  const made = new Map<string, Air>();
  return (month, clarity) => {
    const key = `${clarity} ${month}`;
    const air = made.get(key) ?? airAtPlace(site, month, clarity);
    made.set(key, air);
    return air;
  };
}
