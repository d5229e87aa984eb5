import type { SkylinePoint } from '../types.js';
import { RAD_PER_DEG, TAU, wrapTau } from '../units/angle.js';

/** A skyline ready for use: level all around, or a table joined by straight lines in azimuth and altitude. */
export interface Skyline {
  level: boolean;
  lowestRad: number;
  highestRad: number;
  /** Directions of the table's points, ascending in azimuth; none on a level skyline. */
  points: readonly { sinAzimuth: number; cosAzimuth: number }[];
  altitudeRad(azimuthRad: number): number;
}

/** The same altitude all around. */
export function levelSkyline(altitudeRad: number): Skyline {
  return {
    level: true,
    lowestRad: altitudeRad,
    highestRad: altitudeRad,
    points: [],
    altitudeRad: () => altitudeRad,
  };
}

/**
 * Prepares a table of any order. 0° and 360° are one point (the door makes sure that they agree); an empty table is
 * a flat horizon, a single point a level one.
 */
export function prepareSkyline(points: readonly SkylinePoint[]): Skyline {
  const unique = new Map<number, number>();
  for (const point of points) unique.set(point.azimuthDeg === 360 ? 0 : point.azimuthDeg, point.altitudeDeg);
  const sorted = [...unique].sort(([left], [right]) => left - right);
  const altitudes = sorted.map(([, altitudeDeg]) => altitudeDeg * RAD_PER_DEG);
  const lowestRad = altitudes.length === 0 ? 0 : Math.min(...altitudes);
  const highestRad = altitudes.length === 0 ? 0 : Math.max(...altitudes);
  if (lowestRad === highestRad) return levelSkyline(lowestRad);

  const azimuths = sorted.map(([azimuthDeg]) => azimuthDeg * RAD_PER_DEG);
  const count = azimuths.length;
  const azimuthAt = Float64Array.from(azimuths);
  const altitudeAt = Float64Array.from(altitudes);
  return {
    level: false,
    lowestRad,
    highestRad,
    points: azimuths.map((azimuth) => ({ sinAzimuth: Math.sin(azimuth), cosAzimuth: Math.cos(azimuth) })),
    altitudeRad(azimuthRad) {
      const azimuth = wrapTau(azimuthRad);
      // First point beyond the azimuth, by halving.
      let low = 0;
      let high = count;
      while (low < high) {
        const middle = (low + high) >> 1;
        if ((azimuthAt[middle] ?? 0) <= azimuth) low = middle + 1;
        else high = middle;
      }
      const right = low === count ? 0 : low;
      const left = low === 0 ? count - 1 : low - 1;
      const leftAzimuth = azimuthAt[left] ?? 0;
      const span = wrapTau((azimuthAt[right] ?? 0) - leftAzimuth) || TAU;
      const share = wrapTau(azimuth - leftAzimuth) / span;
      const leftAltitude = altitudeAt[left] ?? 0;
      return leftAltitude + share * ((altitudeAt[right] ?? 0) - leftAltitude);
    },
  };
}
