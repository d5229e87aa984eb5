import {
  horizonAltitude,
  horizonWithin,
  type HorizonPoint,
  type SkylineScale,
  type SkylineView,
} from './skyline.js';

/** A fist at the end of a straight arm. */
export const HAND_DEG = 10;
/** How much ground is shown below the skyline. */
const GROUND_DEG = 6;
const LINE_PX = 24;
/** Average width of a letter of the small type. */
const LETTER_PX = 8.4;

export interface PathPoint {
  azimuthDeg: number;
  altitudeDeg: number;
}

/**
 * A view that never stretches the sky: one hand is as long across as it is high. On a narrow screen the star
 * stands left of the middle, so that the words beside it have room.
 */
export function lookView(
  points: readonly HorizonPoint[],
  middleDeg: number,
  highestDeg: number,
  height: number,
): (width: number) => SkylineView {
  const horizonDeg = horizonAltitude(points, middleDeg);
  const topDeg = Math.max(horizonDeg + 1.7 * HAND_DEG, highestDeg + 2);
  const bottomDeg = horizonDeg - GROUND_DEG;
  return (width) => {
    const turnDeg = ((topDeg - bottomDeg) / height) * width;
    const left = width < 480 ? 0.4 : 0.5;
    const fromAzimuthDeg = middleDeg - turnDeg * left;
    return { fromAzimuthDeg, toAzimuthDeg: fromAzimuthDeg + turnDeg, topDeg, bottomDeg };
  };
}

/** Tops of the label lines in pixels: beside their points, above the ground, none over another. */
export function labelTops(
  at: readonly PathPoint[],
  points: readonly HorizonPoint[],
  scale: SkylineScale,
): number[] {
  const lowestFirst = at
    .map((point, index) => ({ point, index }))
    .sort((a, b) => a.point.altitudeDeg - b.point.altitudeDeg);
  const tops: number[] = [];
  let limit = Infinity;
  for (const { point, index } of lowestFirst) {
    const groundY = scale.y(highestHorizon(points, point.azimuthDeg, scale));
    const top = Math.min(scale.y(point.altitudeDeg) - LINE_PX / 2, groundY - LINE_PX, limit - LINE_PX);
    tops[index] = top;
    limit = top;
  }
  return tops;
}

/** The words stand to the right of the point, about this far: the ground under them must not reach into them. */
const WORDS_PX = 190;

function highestHorizon(points: readonly HorizonPoint[], azimuthDeg: number, scale: SkylineScale): number {
  const toAzimuthDeg = azimuthDeg + WORDS_PX / (scale.x(1) - scale.x(0));
  const corners = horizonWithin(points, { fromAzimuthDeg: azimuthDeg, toAzimuthDeg });
  return Math.max(...corners.map((corner) => corner.altitudeDeg));
}

export interface CompassWord {
  azimuthDeg: number;
  words: string;
}

/** Compass words that fit along the foot; those nearest to the star first. `left` in pixels. */
export function fittingCompass(
  compass: readonly CompassWord[],
  starAzimuthDeg: number,
  scale: SkylineScale,
): (CompassWord & { x: number; left: number })[] {
  const placed: (CompassWord & { x: number; left: number; right: number })[] = [];
  const nearestFirst = [...compass].sort(
    (a, b) => Math.abs(a.azimuthDeg - starAzimuthDeg) - Math.abs(b.azimuthDeg - starAzimuthDeg),
  );
  for (const word of nearestFirst) {
    const x = scale.x(word.azimuthDeg);
    const width = word.words.length * LETTER_PX;
    if (x < 0 || x > scale.width || width > scale.width) continue;
    const left = Math.min(Math.max(0, x - width / 2), scale.width - width);
    const isFree = placed.every((other) => left > other.right + 8 || left + width < other.left - 8);
    if (isFree) placed.push({ ...word, x, left, right: left + width });
  }
  return placed;
}
