import type { HorizonSide } from '../phenomena/phenomenon-facts.js';
import type { RangeWidth } from '../types.js';
import type { AirSpan } from './air.js';
import { showsAtDeg } from './hill-allowance.js';
import { modelValueDeg } from './model-table.js';

/** Extra width of acronychal risings and cosmical settings, which are seen less sharply [Schaefer1987]. */
const OPPOSITE_SIDE_EXTRA_DEG = 1;

/**
 * Half the width, in degrees of depth, of the range that holds the date in about eight seasons of ten, from published
 * scatter. Fainter stars depend more on the air and on the eye.
 */
export function scatterHalfWidthDeg(vMag: number, side: HorizonSide): number {
  const byMagnitude = vMag < 0 ? 1.5 : vMag < 1.5 ? 2 : vMag < 2.5 ? 2.5 : 3;
  return side === 'opposite' ? byMagnitude + OPPOSITE_SIDE_EXTRA_DEG : byMagnitude;
}

/** A crossing as the width of its range knows it. */
export interface WidthView {
  vMag: number;
  side: HorizonSide;
  /** The star's own opposite-side threshold, without shifts. */
  oppositeSideDeg: number;
  /** Altitude of the skyline at the crossing. */
  altitudeDeg: number;
  /** The air of the place in that month. */
  air: AirSpan;
}

/** Eyes of ordinary people differ by half a magnitude to either side. */
const EYE_MAG = 0.5;
/** The end of astronomical twilight: no night gets darker, so no air and no eye asks for more. */
const NIGHT_DEG = 18;

/**
 * What the model makes of a crossing: on the same side the least difference of star and Sun over the skyline; on the
 * opposite side the depth at which the star shows where its rising counts as seen, on the hill or in the clear air above.
 */
function asked({
  side,
  vMag,
  oppositeSideDeg,
  altitudeDeg,
}: WidthView): (mag: number, fainter: number) => number {
  if (side === 'same') return (mag, fainter) => modelValueDeg('same', mag, vMag + fainter, altitudeDeg);
  const seenAtDeg = Math.max(altitudeDeg, showsAtDeg(vMag, oppositeSideDeg));
  return (mag, fainter) => Math.min(NIGHT_DEG, modelValueDeg('opposite', mag, vMag + fainter, seenAtDeg));
}

/** Half the width that the model of visibility asks for: clearer and hazier air, and half a magnitude of eyesight. */
export function modelHalfWidthDeg(view: WidthView): number {
  const depthDeg = asked(view);
  const { clearerMag, usualMag, hazierMag } = view.air;
  const byAir = (depthDeg(hazierMag, 0) - depthDeg(clearerMag, 0)) / 2;
  const byEye = (depthDeg(usualMag, EYE_MAG) - depthDeg(usualMag, -EYE_MAG)) / 2;
  return Math.hypot(byAir, byEye);
}

/** The width of a range: that of published scatter, or the model's where it asks for more. Never narrower than scatter. */
export function rangeWidthOf(view: WidthView): RangeWidth {
  const byScatterDeg = scatterHalfWidthDeg(view.vMag, view.side);
  const byModelDeg = modelHalfWidthDeg(view);
  return { halfWidthDeg: Math.max(byScatterDeg, byModelDeg), byScatterDeg, byModelDeg };
}
