/**
 * Lifting of a body near the horizon by the air, from the altitude at which it is seen [Bennett1982].
 * Standard air (1010 hPa, 10 °C); at the horizon ±5′ is normal and much more happens.
 * @param apparentAltitudeDeg −5…90°
 * @returns degrees, 0.575 at the horizon
 */
export function refractionDeg(apparentAltitudeDeg: number): number {
  // Below the mathematical horizon (seen from a mountain) the formula turns round and runs to its pole: hold it before that.
  const altitudeDeg = Math.max(-1.5, apparentAltitudeDeg);
  const arcminutes = 1 / Math.tan((altitudeDeg + 7.31 / (altitudeDeg + 4.4)) * (Math.PI / 180));
  return Math.max(0, arcminutes) / 60;
}
