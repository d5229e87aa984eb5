import type { DiscPrimitive } from './primitives.js';
import { STROKE_MM } from './strokes.js';
import { roundMm } from './units.js';

const RADIUS_MM = 2.2;
const STEP_MM = 6;
/** Between the last circle and the words behind it. */
const BEFORE_WORDS_MM = 1.4;

/** How much of a line the circles take, with the gap behind them. */
export function circlesWidthMm(count: number): number {
  return count === 0 ? 0 : count * STEP_MM + BEFORE_WORDS_MM;
}

/** Empty circles in a row, to be ticked with a pencil: one for each sign that is waited for. */
export function tickCircles(count: number, at: { left: number; middle: number }): DiscPrimitive[] {
  return Array.from({ length: count }, (_, index) => ({
    type: 'disc',
    role: 'tick',
    cx: roundMm(at.left + RADIUS_MM + index * STEP_MM),
    cy: roundMm(at.middle),
    radius: RADIUS_MM,
    fill: 'open',
    inkedSide: null,
    strokeMm: STROKE_MM,
  }));
}
