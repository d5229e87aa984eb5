import type { ComingMarker } from '#shared/contracts/today.js';
import { endOfNight } from '#src/lib/sky-words.js';
import { directionAfter, starPath, type SkyDirection } from '#src/lib/star-path.js';

export interface WatchPath {
  /** Where the star stands on the skyline. */
  star: SkyDirection;
  /** From the crossing to the time to stop, or from the time to begin to the crossing. */
  path: SkyDirection[];
  /** Where it is when one stops or begins. */
  limit: SkyDirection | null;
  rises: boolean;
  side: 'dawn' | 'dusk';
}

/** Longer watches leave the picture; the end of the path is then cut. */
const PATH_MAX_MINUTES = 90;

/** The star's way above the skyline between its crossing and the time that the Sun sets for looking. */
export function watchPath(coming: ComingMarker, latitudeDeg: number): WatchPath {
  const { expected, stopLookingAt, startLookingAt } = coming.occurrence;
  const side = endOfNight(coming.phenomenon);
  const rises = coming.phenomenon === 'heliacal-rising' || coming.phenomenon === 'acronychal-rising';
  const star = { azimuthDeg: expected.starAzimuthDeg, altitudeDeg: expected.starAltitudeDeg };
  const limitAt = side === 'dawn' ? stopLookingAt : startLookingAt;
  const minutes = limitAt === null ? null : minutesBetween(expected.localTime, limitAt);
  // Rising: up after the crossing. Setting: it stands above the skyline before the crossing.
  const reach = rises
    ? Math.min(PATH_MAX_MINUTES, minutes !== null && minutes > 0 ? minutes : 30)
    : -Math.min(PATH_MAX_MINUTES, minutes !== null && minutes < 0 ? -minutes : 30);
  const isInside =
    minutes !== null && (rises ? minutes > 0 : minutes < 0) && Math.abs(minutes) <= PATH_MAX_MINUTES;
  return {
    star,
    path: starPath(star, latitudeDeg, 0, reach),
    limit: isInside ? directionAfter(star, latitudeDeg, minutes) : null,
    rises,
    side,
  };
}

/** Minutes from one `HH:MM` to another, the nearer way round midnight. */
export function minutesBetween(from: string, to: string): number {
  const difference = minuteOfDay(to) - minuteOfDay(from);
  return ((difference + 720 + 1440) % 1440) - 720;
}

function minuteOfDay(time: string): number {
  const [hours = 0, minutes = 0] = time.split(':').map(Number);
  return hours * 60 + minutes;
}
