import type { DiscPrimitive } from './primitives.js';
import type { MoonPhase } from './sheet-model.js';
import { roundMm } from './units.js';

/** Nearer to the equator than this the half Moon lies like a boat when it is looked at. */
const BOAT_LATITUDE_DEG = 15;

/**
 * A phase as a village sees it: ink is the dark part, so new is a full disc and full is a ring.
 * The lit side of the first quarter is on the right in the north, on the left in the south, below near the equator.
 */
export function moonDisc(
  phase: MoonPhase,
  latitudeDeg: number,
  at: { readonly cx: number; readonly cy: number; readonly radius: number },
): DiscPrimitive {
  const base = {
    type: 'disc',
    role: 'moon',
    cx: roundMm(at.cx),
    cy: roundMm(at.cy),
    radius: at.radius,
    strokeMm: 0.45,
  } as const;
  if (phase === 'new') return { ...base, fill: 'solid', inkedSide: null };
  if (phase === 'full') return { ...base, fill: 'open', inkedSide: null };
  if (Math.abs(latitudeDeg) < BOAT_LATITUDE_DEG) return { ...base, fill: 'half', inkedSide: 'top' };
  const litOnTheRight = (phase === 'first-quarter') === latitudeDeg > 0;
  return { ...base, fill: 'half', inkedSide: litOnTheRight ? 'left' : 'right' };
}
