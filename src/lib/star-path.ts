/** A direction in the sky. Azimuth from north through east. */
export interface SkyDirection {
  azimuthDeg: number;
  altitudeDeg: number;
}

/** Degrees that the sky turns in a minute of civil time. */
const SKY_TURN_DEG_PER_MINUTE = 360.985647 / 1440;
const RAD = Math.PI / 180;

/**
 * Where a star stands some minutes before or after it stood somewhere: turned about the pole, without refraction.
 * For pictures; dates and times come from the engine.
 * @param from direction at minute 0, degrees
 * @param latitudeDeg latitude of the place, north positive
 * @param minutes may be negative
 */
export function directionAfter(from: SkyDirection, latitudeDeg: number, minutes: number): SkyDirection {
  const [phi, az, alt] = [latitudeDeg * RAD, from.azimuthDeg * RAD, from.altitudeDeg * RAD];
  const declination = Math.asin(Math.sin(alt) * Math.sin(phi) + Math.cos(alt) * Math.cos(phi) * Math.cos(az));
  // Hour angle, west positive.
  const hour = Math.atan2(
    -Math.sin(az) * Math.cos(alt),
    Math.sin(alt) * Math.cos(phi) - Math.cos(alt) * Math.sin(phi) * Math.cos(az),
  );
  const turned = hour + minutes * SKY_TURN_DEG_PER_MINUTE * RAD;
  const altitude = Math.asin(
    Math.sin(phi) * Math.sin(declination) + Math.cos(phi) * Math.cos(declination) * Math.cos(turned),
  );
  const azimuth = Math.atan2(
    -Math.sin(turned) * Math.cos(declination),
    Math.sin(declination) * Math.cos(phi) - Math.cos(declination) * Math.sin(phi) * Math.cos(turned),
  );
  return { azimuthDeg: (azimuth / RAD + 360) % 360, altitudeDeg: altitude / RAD };
}

/** The path between two minutes, a point every `stepMinutes`; both ends belong to it. */
export function starPath(
  from: SkyDirection,
  latitudeDeg: number,
  fromMinute: number,
  toMinute: number,
  stepMinutes = 4,
): SkyDirection[] {
  const steps = Math.max(1, Math.ceil(Math.abs(toMinute - fromMinute) / stepMinutes));
  return Array.from({ length: steps + 1 }, (_, index) =>
    directionAfter(from, latitudeDeg, fromMinute + ((toMinute - fromMinute) * index) / steps),
  );
}
