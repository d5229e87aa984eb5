import { COMPASS_POINTS, type CompassPoint } from '../vocabulary.js';

const DEG_PER_POINT = 360 / COMPASS_POINTS.length;

/** The nearest of the sixteen directions; an azimuth right between two belongs to the one further clockwise. */
export function compassPoint(azimuthDeg: number): CompassPoint {
  const turns = Math.round(azimuthDeg / DEG_PER_POINT);
  const index = ((turns % COMPASS_POINTS.length) + COMPASS_POINTS.length) % COMPASS_POINTS.length;
  return COMPASS_POINTS[index] ?? 'n';
}
