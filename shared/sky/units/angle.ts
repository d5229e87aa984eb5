/** Angles are radians inside the core; degrees appear only at its door and in tables of thresholds. */

export const TAU = 2 * Math.PI;
export const RAD_PER_DEG = Math.PI / 180;
export const DEG_PER_RAD = 180 / Math.PI;

/** The same direction in [0, 2π). */
export function wrapTau(angleRad: number): number {
  const wrapped = angleRad % TAU;
  return wrapped < 0 ? wrapped + TAU : wrapped;
}

/** The same direction in [−π, π). */
export function wrapPi(angleRad: number): number {
  return wrapTau(angleRad + Math.PI) - Math.PI;
}

/** Keeps a sine or cosine that rounding pushed over the edge inside [−1, 1]. */
export function clampUnit(value: number): number {
  return value < -1 ? -1 : value > 1 ? 1 : value;
}
