/** A place among the stars, J2000, in degrees. */
export interface SkyPoint {
  rightAscensionDeg: number;
  declinationDeg: number;
}

/** The part of the sky that a picture shows. */
export interface ChartView {
  centre: SkyPoint;
  /** From the middle to the nearer edge. */
  radiusDeg: number;
}

/** Around the middle; x runs to the right, y down, 1 is the radius. */
export interface ChartPoint {
  x: number;
  y: number;
}

const RAD = Math.PI / 180;
export const RADIUS_MIN_DEG = 4;
export const RADIUS_MAX_DEG = 40;

/**
 * Stereographic, north up and east to the left, as somebody sees it who looks up facing south. Null for the far half
 * of the sky.
 */
export function project({ centre, radiusDeg }: ChartView, point: SkyPoint): ChartPoint | null {
  const turn = (point.rightAscensionDeg - centre.rightAscensionDeg) * RAD;
  const [sinDec, cosDec] = [Math.sin(point.declinationDeg * RAD), Math.cos(point.declinationDeg * RAD)];
  const [sinMid, cosMid] = [Math.sin(centre.declinationDeg * RAD), Math.cos(centre.declinationDeg * RAD)];
  const toward = sinMid * sinDec + cosMid * cosDec * Math.cos(turn);
  if (toward <= 0) return null;
  const scale = 2 / (1 + toward) / edgeOf(radiusDeg);
  return {
    x: -scale * cosDec * Math.sin(turn),
    y: -scale * (cosMid * sinDec - sinMid * cosDec * Math.cos(turn)),
  };
}

/** The place among the stars under a point of the picture. */
export function unproject({ centre, radiusDeg }: ChartView, { x, y }: ChartPoint): SkyPoint {
  const [east, north] = [-x * edgeOf(radiusDeg), -y * edgeOf(radiusDeg)];
  const rho = Math.hypot(east, north);
  if (rho === 0) return centre;
  const arc = 2 * Math.atan(rho / 2);
  const [sinArc, cosArc] = [Math.sin(arc), Math.cos(arc)];
  const [sinMid, cosMid] = [Math.sin(centre.declinationDeg * RAD), Math.cos(centre.declinationDeg * RAD)];
  const declination = Math.asin(cosArc * sinMid + (north * sinArc * cosMid) / rho);
  const turn = Math.atan2(east * sinArc, rho * cosMid * cosArc - north * sinMid * sinArc);
  return {
    rightAscensionDeg: (centre.rightAscensionDeg + turn / RAD + 720) % 360,
    declinationDeg: declination / RAD,
  };
}

/** Angle between two places. */
export function separationDeg(a: SkyPoint, b: SkyPoint): number {
  const [u, v] = [vectorOf(a), vectorOf(b)];
  const cross = Math.hypot(u[1] * v[2] - u[2] * v[1], u[2] * v[0] - u[0] * v[2], u[0] * v[1] - u[1] * v[0]);
  return Math.atan2(cross, u[0] * v[0] + u[1] * v[1] + u[2] * v[2]) / RAD;
}

/** A view that holds all points with room around them; null without any. */
export function viewAround(points: readonly SkyPoint[]): ChartView | null {
  if (points.length === 0) return null;
  const sum = points.map(vectorOf).reduce((a, b) => [a[0] + b[0], a[1] + b[1], a[2] + b[2]]);
  const centre = {
    rightAscensionDeg: (Math.atan2(sum[1], sum[0]) / RAD + 360) % 360,
    declinationDeg: Math.atan2(sum[2], Math.hypot(sum[0], sum[1])) / RAD,
  };
  const reach = Math.max(...points.map((point) => separationDeg(centre, point)));
  return { centre, radiusDeg: Math.min(RADIUS_MAX_DEG, Math.max(8, reach * 1.6)) };
}

function edgeOf(radiusDeg: number): number {
  return 2 * Math.tan((radiusDeg / 2) * RAD);
}

function vectorOf({ rightAscensionDeg, declinationDeg }: SkyPoint): [number, number, number] {
  const [ra, dec] = [rightAscensionDeg * RAD, declinationDeg * RAD];
  return [Math.cos(dec) * Math.cos(ra), Math.cos(dec) * Math.sin(ra), Math.sin(dec)];
}
