import type { CompassPoint } from '#shared/sky/vocabulary.js';
import { compassPoint } from '#src/lib/sky-words.js';

/** A direction as a person says it: one of eight winds, and whether it lies a little to one side. */
export interface DirectionWords {
  point: CompassPoint;
  /** The next main wind on the side where the direction leans; null when it is the wind itself. */
  leansTo: CompassPoint | null;
}

/** Within this far a direction simply has the wind's name. */
const EXACT_DEG = 4;
/** Nearer to the wind than to the half-way direction. */
const LITTLE_DEG = 11.25;

export function directionWords(azimuthDeg: number): DirectionWords {
  const main = Math.round(azimuthDeg / 45) * 45;
  const leanDeg = azimuthDeg - main;
  const point = compassPoint(main);
  if (Math.abs(leanDeg) <= EXACT_DEG) return { point, leansTo: null };
  if (Math.abs(leanDeg) <= LITTLE_DEG + 10 && main % 90 === 0) {
    return { point, leansTo: compassPoint(main + Math.sign(leanDeg) * 90) };
  }
  return { point: compassPoint(azimuthDeg), leansTo: null };
}

export type Hands =
  { key: 'level' } | { key: 'below' } | { key: 'part'; part: HandPart } | { key: 'hands'; count: number };

/** A height in hands: a fist at the end of a straight arm covers about ten degrees. */
export function handsHigh(altitudeDeg: number): Hands {
  if (altitudeDeg < -0.25) return { key: 'below' };
  if (altitudeDeg < 0.75) return { key: 'level' };
  const hands = altitudeDeg / 10;
  if (hands < 0.875) return { key: 'part', part: nearestPart(hands) };
  return { key: 'hands', count: Math.round(hands * 2) / 2 };
}

export type HandPart = 'eighth' | 'quarter' | 'third' | 'half' | 'two-thirds' | 'three-quarters';
const PARTS: readonly (readonly [HandPart, number])[] = [
  ['eighth', 1 / 8],
  ['quarter', 1 / 4],
  ['third', 1 / 3],
  ['half', 1 / 2],
  ['two-thirds', 2 / 3],
  ['three-quarters', 3 / 4],
];

function nearestPart(hands: number): HandPart {
  let best: HandPart = 'eighth';
  let distance = Infinity;
  for (const [part, share] of PARTS) {
    if (Math.abs(share - hands) < distance) {
      best = part;
      distance = Math.abs(share - hands);
    }
  }
  return best;
}
