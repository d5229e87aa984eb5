import type { BarPart } from './spans.js';
import type { LinePrimitive, LineRole, Primitive, RectPrimitive } from './primitives.js';
import { roundMm } from './units.js';

/** No line of a board is thinner: finer ones are lost on the second copy. */
export const STROKE_MM = 0.35;

/** Slanted lines of a hatch: their width, and the clear paper between two of them, across the slant. */
export const HATCH_STROKE_MM = 0.45;
export const HATCH_GAP_MM = 1.25;
/** The flaps' hatch is wide: it only says "this gets covered". */
export const FLAP_HATCH_STROKE_MM = 0.35;
export const FLAP_HATCH_GAP_MM = 3.4;

export function straight(
  role: LineRole,
  from: { readonly x: number; readonly y: number },
  to: { readonly x: number; readonly y: number },
  strokeMm: number = STROKE_MM,
): LinePrimitive {
  return {
    type: 'line',
    role,
    x1: roundMm(from.x),
    y1: roundMm(from.y),
    x2: roundMm(to.x),
    y2: roundMm(to.y),
    strokeMm,
    ink: 'ink',
  };
}

export function rule(left: number, right: number, y: number, strokeMm = 0.5): LinePrimitive {
  return straight('rule', { x: left, y }, { x: right, y }, strokeMm);
}

/** One stretch of a bar: solid for the best days, hatched for early and late, open for a watch. */
export function hatchedBar(
  look: BarPart['look'],
  at: { readonly left: number; readonly right: number; readonly middle: number; readonly height: number },
): RectPrimitive {
  const outline = look === 'best' ? 0 : look === 'watch' ? 0.5 : STROKE_MM;
  // The outline's outer edge keeps to the stretch.
  const inset = outline / 2;
  return {
    type: 'rect',
    role: look,
    x: roundMm(at.left + inset),
    y: roundMm(at.middle - at.height / 2 + inset),
    width: roundMm(at.right - at.left - 2 * inset),
    height: roundMm(at.height - 2 * inset),
    fill: look === 'best' ? 'solid' : look === 'watch' ? 'open' : 'hatch',
    strokeMm: outline,
    cornerMm: 0,
  };
}

/** White ground under a word or a hole, so that nothing written across the page touches it. */
export function clearing(x: number, y: number, width: number, height: number): Primitive {
  return {
    type: 'rect',
    role: 'clearing',
    x: roundMm(x),
    y: roundMm(y),
    width: roundMm(width),
    height: roundMm(height),
    fill: 'paper',
    strokeMm: 0,
    cornerMm: 0,
  };
}
