import { moonDisc } from '#shared/sheet/moon.js';
import type { MoonEvent } from '#shared/sky/vocabulary.js';

export interface MoonGlyphProps {
  event: MoonEvent;
  latitudeDeg: number;
  /** Middle and radius in the picture's own units. */
  cx: number;
  cy: number;
  radius: number;
}

/** How far the edge of night reaches over the young Moon's middle: a thin sliver is left. */
const SLIVER = 0.55;
const STROKE_SHARE = 0.24;
/** Degrees by which a crescent lit on the right turns, by the side of the Moon that ink fills. */
const TURN_DEG = { left: 0, right: 180, top: 90 } as const;

/** A Moon as paper draws it: ink is the dark part. The young Moon is lit on the right in the north, on the left in the
 *  south, below near the equator. */
export function MoonGlyph({ event, latitudeDeg, cx, cy, radius }: MoonGlyphProps) {
  const stroke = radius * STROKE_SHARE;
  const ring = <circle r={radius - stroke / 2} className="pic-moon-lit" strokeWidth={stroke} />;
  const at = `translate(${String(cx)} ${String(cy)})`;
  if (event === 'new') return <circle cx={cx} cy={cy} r={radius} className="pic-moon-dark" />;
  if (event === 'full') return <g transform={at}>{ring}</g>;
  const { inkedSide } = moonDisc('first-quarter', latitudeDeg, { cx, cy, radius });
  const inner = radius - stroke / 2;
  const dark = `M0 ${String(-inner)}A${String(inner)} ${String(inner)} 0 0 0 0 ${String(inner)}A${String(inner * SLIVER)} ${String(inner)} 0 0 0 0 ${String(-inner)}Z`;
  return (
    <g transform={`${at} rotate(${String(TURN_DEG[inkedSide ?? 'left'])})`}>
      {ring}
      <path d={dark} className="pic-moon-dark" />
    </g>
  );
}

/** The same beside words. */
export function MoonIcon({
  event,
  latitudeDeg,
  size = 28,
}: Pick<MoonGlyphProps, 'event' | 'latitudeDeg'> & { size?: number }) {
  return (
    <svg aria-hidden width={size} height={size} viewBox="0 0 24 24" className="shrink-0">
      <MoonGlyph event={event} latitudeDeg={latitudeDeg} cx={12} cy={12} radius={10.5} />
    </svg>
  );
}
