import { STAR_ROWS, type StarRow } from '../data/star-rows.js';
import type { Star } from '../types.js';

/** The stars of the table as the product names them. */

function designation(row: StarRow): string {
  const [, , , bayer, flamsteed, constellation] = row;
  return `${bayer === '' ? flamsteed : bayer} ${constellation}`;
}

function starOf(row: StarRow): Star {
  const [hr, hip, name, bayer, flamsteed, constellation] = row;
  return {
    hr,
    hip,
    name: name === '' ? designation(row) : name,
    bayer,
    flamsteed,
    constellation,
    vMag: row[12],
  };
}

/** All stars, by HR number. A star without a traditional name is called by its letter or number, as in "κ Cas". */
export const STARS: readonly Star[] = Object.freeze(STAR_ROWS.map((row) => Object.freeze(starOf(row))));

const indexByHr: ReadonlyMap<number, number> = new Map(STARS.map((star, index) => [star.hr, index]));

/** Place of a star in the table, or null for a number that is not in it. */
export function starIndexOf(hr: number): number | null {
  return indexByHr.get(hr) ?? null;
}

/** Where a star stood at J2000 (FK5, degrees), or null for a number that is not in the table. */
export function starPlaceJ2000(hr: number): { rightAscensionDeg: number; declinationDeg: number } | null {
  const index = starIndexOf(hr);
  const row = index === null ? undefined : STAR_ROWS[index];
  return row ? { rightAscensionDeg: row[6], declinationDeg: row[7] } : null;
}

/** A star by its HR number, or null. */
export function findStar(hr: number): Star | null {
  const index = starIndexOf(hr);
  return index === null ? null : (STARS[index] ?? null);
}
