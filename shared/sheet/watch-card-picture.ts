import type { Box, DiscPrimitive, Primitive } from './primitives.js';
import { clearing, straight } from './strokes.js';
import { textBlock, type TextMeasurer } from './text-layout.js';
import { MM_PER_PT, roundMm } from './units.js';
import type { PictureDirection, WatchPicture } from './watch-card-model.js';
import { HAND_DEG, pictureScale, type PictureScale, skylineAltitude } from './watch-card-scale.js';

const LABEL = { role: 'foot', sizePt: 12, weight: 700 } as const;
const COMPASS = { role: 'foot', sizePt: 12, weight: 400 } as const;
const LINE_MM = 12 * 1.38 * MM_PER_PT;
/** Level strokes for the ground: no large black, and clear after two copies. */
const GROUND_GAP_MM = 1.7;
const PATH_MM = 1.5;
const DOT_GAP_MM = 2.2;
const STAR_MM = 9;
const ROD_MM = 3.4;

/** Room for the compass words under a picture. */
export const COMPASS_ROOM_MM = LINE_MM + 1;

/** The skyline as a silhouette, the star's path over it, a rod in half hands, times beside the path, compass words. */
export function pictureOf(picture: WatchPicture, box: Box, measurer: TextMeasurer): Primitive[] {
  const scale = pictureScale(picture, box);
  return [
    ...ground(picture, scale, box),
    ...rod(picture, scale, box, measurer),
    ...pathOf(picture, scale, box),
    ...labels(picture, scale, box, measurer),
    ...compass(picture, scale, box, measurer),
  ];
}

const SAMPLE_MM = 0.8;

function ground({ skyline }: WatchPicture, scale: PictureScale, box: Box): Primitive[] {
  const bottom = box.y + box.height;
  const count = Math.round(box.width / SAMPLE_MM);
  const edgeAt = (x: number): number =>
    Math.min(bottom, Math.max(box.y, scale.y(skylineAltitude(skyline, scale.azimuthAt(x)))));
  const edge = Array.from({ length: count + 1 }, (_, index) => {
    const x = box.x + (box.width * index) / count;
    return { x, y: edgeAt(x) };
  });
  const corners = [
    box.x,
    ...skyline.map(({ azimuthDeg }) => scale.x(azimuthDeg)).filter((x) => x > box.x && x < box.x + box.width),
    box.x + box.width,
  ].sort((left, right) => left - right);
  const outline = corners.slice(1).map((x, index) => {
    const from = corners[index] ?? x;
    return straight('skyline', { x: from, y: edgeAt(from) }, { x, y: edgeAt(x) }, 0.8);
  });
  return [...groundStrokes(edge, bottom), ...outline];
}

/** Level lines below the skyline, each cut where the ground does not reach so high. */
function groundStrokes(edge: readonly { x: number; y: number }[], bottom: number): Primitive[] {
  const strokes: Primitive[] = [];
  const top = Math.min(...edge.map(({ y }) => y));
  for (let y = bottom; y > top; y -= GROUND_GAP_MM) {
    let from: number | null = null;
    edge.forEach((point, index) => {
      const isGround = point.y < y - 0.6;
      if (isGround) from ??= point.x;
      const ends = !isGround || index === edge.length - 1;
      if (ends && from !== null) {
        if (point.x - from > 1) strokes.push(straight('ground', { x: from, y }, { x: point.x, y }, 0.45));
        from = null;
      }
    });
  }
  return strokes;
}

/** Three half hands, black and white in turn, standing on the skyline at the left edge. */
function rod(
  { skyline, handWords }: WatchPicture,
  scale: PictureScale,
  box: Box,
  measurer: TextMeasurer,
): Primitive[] {
  const x = box.x + 3;
  const foot = scale.y(skylineAltitude(skyline, scale.azimuthAt(x + ROD_MM / 2)));
  const half = (HAND_DEG / 2) * scale.mmPerDeg;
  const steps = [0, 1, 2].filter((step) => foot - (step + 1) * half >= box.y);
  const tick = foot - 2 * half;
  const words = textBlock([handWords], { x: x + ROD_MM + 4, top: tick - LINE_MM / 2 }, LABEL, measurer);
  return [
    ...steps.map((step): Primitive => ({
      type: 'rect',
      role: 'rod',
      x: roundMm(x),
      y: roundMm(foot - (step + 1) * half),
      width: ROD_MM,
      height: roundMm(half),
      fill: step % 2 === 0 ? 'solid' : 'open',
      strokeMm: 0.5,
      cornerMm: 0,
    })),
    straight('stop', { x: x - 1, y: tick }, { x: x + ROD_MM + 3, y: tick }, 0.6),
    words,
  ];
}

interface Point {
  x: number;
  y: number;
}

function pathOf(picture: WatchPicture, scale: PictureScale, box: Box): Primitive[] {
  const points = picture.path
    .filter(({ isUp }) => isUp)
    .map((one) => ({ x: scale.x(one.azimuthDeg), y: scale.y(one.altitudeDeg), isSeen: one.isSeen }));
  const inside = (point: Point): boolean =>
    point.x >= box.x && point.x <= box.x + box.width && point.y >= box.y;
  const drawn: Primitive[] = [];
  points.slice(1).forEach((to, index) => {
    const from = points[index] ?? to;
    if (!inside(from) || !inside(to)) return;
    if (from.isSeen && to.isSeen)
      drawn.push(dot(from, PATH_MM / 2), straight('star-path', from, to, PATH_MM), dot(to, PATH_MM / 2));
    else drawn.push(...dots(from, to));
  });
  const { star, stop } = picture;
  const at = { x: scale.x(star.azimuthDeg), y: scale.y(star.altitudeDeg) };
  const bar = stop === null ? null : { x: scale.x(stop.azimuthDeg), y: scale.y(stop.altitudeDeg) };
  return [
    ...drawn,
    ...(bar !== null && inside(bar)
      ? [straight('stop', { x: bar.x - 5, y: bar.y }, { x: bar.x + 5, y: bar.y }, 1.4)]
      : []),
    {
      type: 'disc',
      role: 'clearing',
      cx: roundMm(at.x),
      cy: roundMm(at.y),
      radius: 3.4,
      fill: 'paper',
      inkedSide: null,
      strokeMm: 0,
    },
    {
      type: 'icon',
      icon: 'star',
      x: roundMm(at.x - STAR_MM / 2),
      y: roundMm(at.y - STAR_MM / 2),
      size: STAR_MM,
    },
  ];
}

function dots(from: Point, to: Point): DiscPrimitive[] {
  const length = Math.hypot(to.x - from.x, to.y - from.y);
  const count = Math.max(1, Math.round(length / DOT_GAP_MM));
  return Array.from({ length: count }, (_, index) => {
    const share = (index + 0.5) / count;
    return dot({ x: from.x + (to.x - from.x) * share, y: from.y + (to.y - from.y) * share }, 0.45);
  });
}

function dot({ x, y }: Point, radius: number): DiscPrimitive {
  return {
    type: 'disc',
    role: 'star-path',
    cx: roundMm(x),
    cy: roundMm(y),
    radius,
    fill: 'solid',
    inkedSide: null,
    strokeMm: 0,
  };
}

/** Times to the right of the path, each beside its point where it can, none over another. */
function labels(picture: WatchPicture, scale: PictureScale, box: Box, measurer: TextMeasurer): Primitive[] {
  const widest = Math.max(0, ...picture.labels.map(({ words }) => measurer.widthMm(words, LABEL)));
  const rightmost = Math.max(...[picture.star, ...picture.labels].map((one) => scale.x(one.azimuthDeg)));
  const leftmost = Math.min(...[picture.star, ...picture.labels].map((one) => scale.x(one.azimuthDeg)));
  const fitsRight = rightmost + 7 + widest <= box.x + box.width;
  const x = fitsRight ? rightmost + 7 : Math.max(box.x, leftmost - 7 - widest);
  const floor = Math.min(box.y + box.height, groundTop(picture, scale, x, widest));
  const highestFirst = [...picture.labels].sort((a, b) => b.altitudeDeg - a.altitudeDeg);
  const tops = spreadOut(
    highestFirst.map(({ altitudeDeg }) => scale.y(altitudeDeg) - LINE_MM / 2),
    box.y,
    floor,
  );
  return highestFirst.flatMap(({ words }, index) => {
    const text = textBlock([words], { x, top: tops[index] ?? box.y }, LABEL, measurer);
    const { box: ink } = text;
    return [clearing(ink.x - 0.6, ink.y + 0.6, ink.width + 1.2, ink.height - 1.2), text];
  });
}

/** Lines as near as they can be to where they belong, none over another, between a ceiling and a floor. */
function spreadOut(wanted: readonly number[], ceiling: number, floor: number): number[] {
  const tops: number[] = [];
  wanted.forEach((top, index) => {
    tops.push(Math.max(top, index === 0 ? ceiling : (tops[index - 1] ?? ceiling) + LINE_MM));
  });
  let below = floor;
  for (let index = tops.length - 1; index >= 0; index -= 1) {
    tops[index] = Math.min(tops[index] ?? ceiling, below - LINE_MM);
    below = tops[index] ?? below;
  }
  return tops;
}

/** The highest ground under a stretch of words. */
function groundTop({ skyline }: WatchPicture, scale: PictureScale, x: number, width: number): number {
  const tops = Array.from({ length: 13 }, (_, index) =>
    scale.y(skylineAltitude(skyline, scale.azimuthAt(x + (width * index) / 12))),
  );
  return Math.min(...tops) - 0.6;
}

/** The words that fit along the foot, those nearest to the star first. */
function compass(picture: WatchPicture, scale: PictureScale, box: Box, measurer: TextMeasurer): Primitive[] {
  const bottom = box.y + box.height;
  const placed: { left: number; right: number; words: string; x: number }[] = [];
  const nearestFirst = [...picture.compass].sort(
    (a, b) => awayFrom(picture.star, a, scale) - awayFrom(picture.star, b, scale),
  );
  for (const { azimuthDeg, words } of nearestFirst) {
    const x = scale.x(azimuthDeg);
    const width = measurer.widthMm(words, COMPASS);
    if (x < box.x || x > box.x + box.width) continue;
    const left = Math.min(Math.max(box.x, x - width / 2), box.x + box.width - width);
    const isFree = placed.every((other) => left > other.right + 3 || left + width < other.left - 3);
    if (isFree) placed.push({ left, right: left + width, words, x });
  }
  return placed.flatMap(({ left, words, x }) => [
    straight('skyline', { x, y: bottom - 2.5 }, { x, y: bottom + 1 }, 0.8),
    textBlock([words], { x: left, top: bottom + 1 }, COMPASS, measurer),
  ]);
}

function awayFrom(star: PictureDirection, one: { azimuthDeg: number }, scale: PictureScale): number {
  return Math.abs(scale.x(one.azimuthDeg) - scale.x(star.azimuthDeg));
}
