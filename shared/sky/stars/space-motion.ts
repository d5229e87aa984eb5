import type { StarRow } from '../data/star-rows.js';
import { RAD_PER_DEG } from '../units/angle.js';

export interface Vector3 {
  x: number;
  y: number;
  z: number;
}

/** A star's direction at J2000 (FK5 = J2000 mean equator) and its straight motion through space, per Julian year. */
export interface SpaceMotion {
  direction: Vector3;
  /** In units of the star's distance at J2000. */
  velocityPerYear: Vector3;
}

const RAD_PER_MAS = RAD_PER_DEG / 3_600_000;
/** Kilometres per second that make one astronomical unit in a Julian year. */
const KM_PER_S_PER_AU_PER_YEAR = 4.740_47;

/**
 * Space motion as a vector: proper motion always, the radial part where parallax and radial velocity are known.
 * Over 5000 years the curvature of α Centauri's path is what the radial part is for. A parallax at or below zero is
 * a failed measurement and counts as unknown.
 */
export function spaceMotionOf(row: StarRow): SpaceMotion {
  const [, , , , , , raDeg, decDeg, pmRaMas, pmDecMas, parallaxMas, radialKmPerS] = row;
  const ra = raDeg * RAD_PER_DEG;
  const dec = decDeg * RAD_PER_DEG;
  const [sinRa, cosRa, sinDec, cosDec] = [Math.sin(ra), Math.cos(ra), Math.sin(dec), Math.cos(dec)];
  const direction = { x: cosDec * cosRa, y: cosDec * sinRa, z: sinDec };
  const pmRa = pmRaMas * RAD_PER_MAS;
  const pmDec = pmDecMas * RAD_PER_MAS;
  const radial =
    parallaxMas !== null && parallaxMas > 0 && radialKmPerS !== null
      ? (radialKmPerS / KM_PER_S_PER_AU_PER_YEAR) * parallaxMas * RAD_PER_MAS
      : 0;
  return {
    direction,
    velocityPerYear: {
      x: -pmRa * sinRa - pmDec * sinDec * cosRa + radial * direction.x,
      y: pmRa * cosRa - pmDec * sinDec * sinRa + radial * direction.y,
      z: pmDec * cosDec + radial * direction.z,
    },
  };
}

/** A direction of J2000 that keeps its place among the stars. */
export function fixedDirection(rightAscensionDeg: number, declinationDeg: number): SpaceMotion {
  const ra = rightAscensionDeg * RAD_PER_DEG;
  const dec = declinationDeg * RAD_PER_DEG;
  const direction = { x: Math.cos(dec) * Math.cos(ra), y: Math.cos(dec) * Math.sin(ra), z: Math.sin(dec) };
  return { direction, velocityPerYear: { x: 0, y: 0, z: 0 } };
}

/** Where the star stands some Julian years after J2000, as a vector that is not of unit length. */
export function movedDirection(motion: SpaceMotion, yearsFromJ2000: number): Vector3 {
  const { direction, velocityPerYear } = motion;
  return {
    x: direction.x + velocityPerYear.x * yearsFromJ2000,
    y: direction.y + velocityPerYear.y * yearsFromJ2000,
    z: direction.z + velocityPerYear.z * yearsFromJ2000,
  };
}
