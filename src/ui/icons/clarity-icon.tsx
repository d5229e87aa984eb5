import type { Clarity } from '#shared/sky/vocabulary.js';
import { DrawnSvg, type DrawnProps } from './drawn-icon.js';

/** How clear the air is, by shape alone: an open ring, one line across it, a ring full of lines. 24 units. */
const LINES: Record<Clarity, readonly number[]> = { clear: [], ordinary: [12], hazy: [7.6, 12, 16.4] };

export function ClarityIcon({ clarity, size = 24, label, className }: DrawnProps & { clarity: Clarity }) {
  return (
    <DrawnSvg size={size} label={label} className={className} box={24}>
      <circle cx={12} cy={12} r={9} fill="none" stroke="currentColor" strokeWidth={2.4} />
      {LINES[clarity].map((y) => {
        const half = Math.sqrt(81 - (y - 12) ** 2);
        return (
          <path
            key={y}
            d={`M${String(12 - half)} ${String(y)}H${String(12 + half)}`}
            stroke="currentColor"
            strokeWidth={2.2}
          />
        );
      })}
    </DrawnSvg>
  );
}
