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
/** Between a path and the words above it. */
const CLEAR_PX = 8;
const LINE_PX = 24;
/** Average width of a letter of the small type. */
const LETTER_PX = 8.4;

/** The words beside a path reach about this far: the ground under them must not reach into them. */
const WORDS_PX = 190;

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
  const topDeg = Math.max(horizonDeg + 1.7 * HAND_DEG, highestDeg + 4);
  const bottomDeg = horizonDeg - GROUND_DEG;
  return (width) => {
    const turnDeg = ((topDeg - bottomDeg) / height) * width;
    const left = width < 480 ? 0.4 : 0.5;
    const fromAzimuthDeg = middleDeg - turnDeg * left;
    return { fromAzimuthDeg, toAzimuthDeg: fromAzimuthDeg + turnDeg, topDeg, bottomDeg };
  };
}

/**
 * Tops of the label lines in pixels: beside their points, above the ground, none over another; above the path where it
 * runs along under the words because the picture is too narrow for both.
 */
export function labelTops(
  at: readonly PathPoint[],
  points: readonly HorizonPoint[],
  scale: SkylineScale,
  path: readonly PathPoint[],
): number[] {
  const left = labelsLeft(path, scale) - 8;
  const under = path.filter(({ azimuthDeg }) => {
    const x = scale.x(azimuthDeg);
    return x >= left && x <= left + WORDS_PX;
  });
  const lowestFirst = at
    .map((point, index) => ({ point, index }))
    .sort((a, b) => a.point.altitudeDeg - b.point.altitudeDeg);
  const tops: number[] = [];
  let limit = Math.min(Infinity, ...under.map(({ altitudeDeg }) => scale.y(altitudeDeg))) - CLEAR_PX;
  for (const { point, index } of lowestFirst) {
    const groundY = scale.y(highestHorizon(points, point.azimuthDeg, scale));
    const top = Math.min(scale.y(point.altitudeDeg) - LINE_PX / 2, groundY - LINE_PX, limit - LINE_PX);
    tops[index] = top;
    limit = top;
  }
  return tops;
}

function highestHorizon(points: readonly HorizonPoint[], azimuthDeg: number, scale: SkylineScale): number {
  const toAzimuthDeg = azimuthDeg + WORDS_PX / (scale.x(1) - scale.x(0));
  const corners = horizonWithin(points, { fromAzimuthDeg: azimuthDeg, toAzimuthDeg });
  return Math.max(...corners.map((corner) => corner.altitudeDeg));
}

/** The same direction, counted so that it lies within half a turn of another: a path may run through north. */
export function besideAzimuth(azimuthDeg: number, middleDeg: number): number {
  return middleDeg + ((((azimuthDeg - middleDeg + 180) % 360) + 360) % 360) - 180;
}

/** Where the words beside a path begin: to its right, or to its left where the picture ends too soon. */
export function labelsLeft(path: readonly PathPoint[], scale: SkylineScale): number {
  const across = path.map((point) => scale.x(point.azimuthDeg));
  const right = Math.max(...across) + 26;
  if (right + WORDS_PX <= scale.width || scale.width < 2 * WORDS_PX)
    return Math.min(right, scale.width - 110);
  return Math.max(0, Math.min(...across) - 26 - WORDS_PX);
}

/** A patch of the picture in pixels. */
export interface Patch {
  left: number;
  top: number;
  width: number;
  height: number;
}

/** Room that a line of small type takes. */
export function linePatch(words: string, left: number, top: number): Patch {
  return { left, top: top + 3, width: words.length * LETTER_PX, height: LINE_PX - 6 };
}

export interface PlacedNeighbour {
  x: number;
  y: number;
  /** On which side its name stands; null where there is no room for it. */
  words: 'left' | 'right' | null;
}

/** Neighbours inside the picture and over the ground, each with its name beside it if nothing else stands there. */
export function placeNeighbours(
  neighbours: readonly (PathPoint & { words: string })[],
  points: readonly HorizonPoint[],
  scale: SkylineScale,
  taken: readonly Patch[],
): (PlacedNeighbour | null)[] {
  const patches = [...taken];
  return neighbours.map(({ azimuthDeg, altitudeDeg, words }) => {
    const x = scale.x(azimuthDeg);
    const y = scale.y(altitudeDeg);
    const isInside =
      x > 6 && x < scale.width - 6 && y > 6 && y < scale.y(horizonAltitude(points, azimuthDeg));
    const glyph = { left: x - 8, top: y - 8, width: 16, height: 16 };
    if (!isInside || patches.some((patch) => meets(patch, glyph))) return null;
    patches.push(glyph);
    const right = linePatch(words, x + 12, y - LINE_PX / 2);
    const left = { ...right, left: x - 12 - right.width };
    const isFree = (patch: Patch) =>
      patch.left >= 0 &&
      patch.left + patch.width <= scale.width &&
      !patches.some((other) => meets(other, patch));
    const side = isFree(right) ? 'right' : isFree(left) ? 'left' : null;
    if (side !== null) patches.push(side === 'right' ? right : left);
    return { x, y, words: side };
  });
}

function meets(a: Patch, b: Patch): boolean {
  return (
    a.left < b.left + b.width &&
    b.left < a.left + a.width &&
    a.top < b.top + b.height &&
    b.top < a.top + a.height
  );
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
    (a, b) =>
      Math.abs(besideAzimuth(a.azimuthDeg, starAzimuthDeg) - starAzimuthDeg) -
      Math.abs(besideAzimuth(b.azimuthDeg, starAzimuthDeg) - starAzimuthDeg),
  );
  for (const word of nearestFirst) {
    const x = scale.x(besideAzimuth(word.azimuthDeg, starAzimuthDeg));
    const width = word.words.length * LETTER_PX;
    if (x < 0 || x > scale.width || width > scale.width) continue;
    const left = Math.min(Math.max(0, x - width / 2), scale.width - width);
    const isFree = placed.every((other) => left > other.right + 8 || left + width < other.left - 8);
    if (isFree) placed.push({ ...word, x, left, right: left + width });
  }
  return placed;
}
