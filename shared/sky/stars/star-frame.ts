import { AstroTime, Rotation_EQJ_EQD } from 'astronomy-engine';

import { STAR_ROWS } from '../data/star-rows.js';
import { JD_J2000 } from '../time/julian-day.js';
import { movedDirection, type SpaceMotion, spaceMotionOf } from './space-motion.js';

/** A star's place on the true equator and equinox of an epoch. No aberration (20″) and no refraction. */
export interface StarPlace {
  rightAscensionRad: number;
  sinDeclination: number;
  cosDeclination: number;
}

/** What has a place among the stars: a row of the table by its index, or a direction of J2000. */
export type StarRef = number | SpaceMotion;

/** Gives the place of anything among the stars at one epoch; a few multiplications each, nothing is kept. */
export interface StarFrame {
  placeOf(star: StarRef): StarPlace;
}

const DAYS_PER_JULIAN_YEAR = 365.25;

let motions: readonly SpaceMotion[] | null = null;

/**
 * Prepares precession and nutation for an epoch.
 * Accuracy against ERFA's long-term precession with space motion: 0.003° from −1000 to +3000, 0.01° at −3000
 * (tests/reference/against-erfa.test.ts).
 * @param epochJdUt Julian Day (UT)
 */
export function prepareStarFrame(epochJdUt: number): StarFrame {
  motions ??= STAR_ROWS.map(spaceMotionOf);
  const table = motions;
  const time = new AstroTime(epochJdUt - JD_J2000);
  const yearsFromJ2000 = time.tt / DAYS_PER_JULIAN_YEAR;
  const { rot } = Rotation_EQJ_EQD(time);
  const turn = (column: number, from: number): number => rot[from]?.[column] ?? 0;
  const [xx, xy, xz] = [turn(0, 0), turn(0, 1), turn(0, 2)];
  const [yx, yy, yz] = [turn(1, 0), turn(1, 1), turn(1, 2)];
  const [zx, zy, zz] = [turn(2, 0), turn(2, 1), turn(2, 2)];

  return {
    placeOf(star) {
      const motion = typeof star === 'number' ? table[star] : star;
      if (!motion) throw new RangeError('no star at this index of the table');
      const moved = movedDirection(motion, yearsFromJ2000);
      const x = xx * moved.x + xy * moved.y + xz * moved.z;
      const y = yx * moved.x + yy * moved.y + yz * moved.z;
      const z = zx * moved.x + zy * moved.y + zz * moved.z;
      const equatorial = Math.sqrt(x * x + y * y);
      const length = Math.sqrt(x * x + y * y + z * z);
      return {
        rightAscensionRad: Math.atan2(y, x),
        sinDeclination: z / length,
        cosDeclination: equatorial / length,
      };
    },
  };
}
