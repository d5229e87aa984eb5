import type { Box } from './primitives.js';
import type { PictureDirection, WatchPicture } from './watch-card-model.js';

/** A fist at the end of a straight arm. */
export const HAND_DEG = 10;
const GROUND_DEG = 5;
const LEAST_SKY_DEG = 17;
/** Higher up the picture would shrink until nothing can be told: the path then leaves through the top. */
const MOST_SKY_DEG = 50;

/** Turns directions into millimetres; the sky is never stretched: a hand is as long across as it is high. */
export interface PictureScale {
  readonly mmPerDeg: number;
  x(azimuthDeg: number): number;
  y(altitudeDeg: number): number;
  /** The azimuth at a place across, not wrapped. */
  azimuthAt(x: number): number;
}

/** @param box the picture with its ground; the star stands left of the middle, where the words beside it have room */
export function pictureScale(picture: WatchPicture, box: Box): PictureScale {
  const { star, path, skyline } = picture;
  const ground = skylineAltitude(skyline, star.azimuthDeg);
  const highest = Math.max(star.altitudeDeg, ...path.filter((one) => one.isUp).map((one) => one.altitudeDeg));
  const top = Math.min(
    Math.max(ground + LEAST_SKY_DEG, highest + 3),
    Math.max(ground, star.altitudeDeg) + MOST_SKY_DEG,
  );
  const bottom = ground - GROUND_DEG;
  const mmPerDeg = box.height / (top - bottom);
  const starX = box.x + 0.42 * box.width;
  return {
    mmPerDeg,
    x: (azimuthDeg) => starX + nearestTurn(azimuthDeg - star.azimuthDeg) * mmPerDeg,
    y: (altitudeDeg) => box.y + (top - altitudeDeg) * mmPerDeg,
    azimuthAt: (x) => star.azimuthDeg + (x - starX) / mmPerDeg,
  };
}

function nearestTurn(differenceDeg: number): number {
  return ((((differenceDeg + 180) % 360) + 360) % 360) - 180;
}

/** Straight between the two neighbouring points, round through north; level at 0° without points. */
export function skylineAltitude(points: readonly PictureDirection[], azimuthDeg: number): number {
  const sorted = [...points].sort((a, b) => a.azimuthDeg - b.azimuthDeg);
  const [first] = sorted;
  const last = sorted.at(-1);
  if (!first || !last) return 0;
  const wanted = ((azimuthDeg % 360) + 360) % 360;
  const next = sorted.findIndex((point) => point.azimuthDeg >= wanted);
  const right = sorted[next] ?? { ...first, azimuthDeg: first.azimuthDeg + 360 };
  const left =
    next > 0
      ? (sorted[next - 1] ?? last)
      : next === 0
        ? { ...last, azimuthDeg: last.azimuthDeg - 360 }
        : last;
  const turn = right.azimuthDeg - left.azimuthDeg;
  if (turn === 0) return right.altitudeDeg;
  return left.altitudeDeg + ((wanted - left.azimuthDeg) / turn) * (right.altitudeDeg - left.altitudeDeg);
}
