import type { CrescentWord } from '../vocabulary.js';

/**
 * Two published tests of the young Moon: the difference in altitude between Moon and Sun (arc of vision) that a
 * crescent of a given width needs. They share a polynomial and nothing else: Yallop's constant 11.8371 goes with the
 * arc of vision of the Earth's centre, Odeh's 7.1651 with the one of the place, which is smaller by the Moon's
 * parallax of nearly a degree. Neither may take the other's.
 */

/** The width's part of the polynomial, degrees; it falls without a turn for every width. */
function byWidthDeg(widthArcmin: number): number {
  return widthArcmin * (-6.3226 + widthArcmin * (0.7319 - 0.1018 * widthArcmin));
}

/**
 * Yallop's q [Yallop1997].
 * @param arcOfVisionDeg of the Earth's centre, without refraction, degrees
 * @param widthArcmin of the place, minutes of arc
 */
export function yallopQ(arcOfVisionDeg: number, widthArcmin: number): number {
  return (arcOfVisionDeg - (11.8371 + byWidthDeg(widthArcmin))) / 10;
}

/**
 * Odeh's V [Odeh2004].
 * @param arcOfVisionDeg of the place, without refraction, degrees
 * @param widthArcmin of the place, minutes of arc
 */
export function odehV(arcOfVisionDeg: number, widthArcmin: number): number {
  return arcOfVisionDeg - (7.1651 + byWidthDeg(widthArcmin));
}

/** Above the first: easy to the unaided eye; above the second: in perfect air [Yallop1997; limits M]. */
const YALLOP_LIMITS = { easy: 0.216, ifAirIsClear: -0.014 } as const;
/** From the first on: to the naked eye; from the second on: perhaps to the naked eye [Odeh2004; limits M]. */
const ODEH_LIMITS = { easy: 5.65, ifAirIsClear: 2 } as const;

export function wordByYallop(q: number): CrescentWord {
  if (q > YALLOP_LIMITS.easy) return 'easy';
  return q > YALLOP_LIMITS.ifAirIsClear ? 'if-air-is-clear' : 'not-by-eye';
}

export function wordByOdeh(v: number): CrescentWord {
  if (v >= ODEH_LIMITS.easy) return 'easy';
  return v >= ODEH_LIMITS.ifAirIsClear ? 'if-air-is-clear' : 'not-by-eye';
}

/** Where the two agree, their word; where they do not, the middle one, because then the air decides. */
export function jointWord(left: CrescentWord, right: CrescentWord): CrescentWord {
  return left === right ? left : 'if-air-is-clear';
}
