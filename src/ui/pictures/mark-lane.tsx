import { percent, startPercent, stretch, type DaySpan } from './day-span.js';
import type { RangeMark } from './ring-row.js';

const LINE = 1.25;
const BAND = 8;
/** A range of a few days must stay visible. */
const LEAST_WIDTH = 4;
const PEG_RADIUS = 5.5;

/** A lane of single days: a thin line through the year, a band where the sign may come, a filled round on its day. */
export function MarkLane({
  span,
  marks,
  label,
  height,
}: {
  span: DaySpan;
  marks: readonly RangeMark[];
  /** What the lane shows, as a sentence: the picture for ears. */
  label: string;
  height: number;
}) {
  const middle = height / 2;
  return (
    <div className="picture">
      <svg role="img" aria-label={label} width="100%" height={height}>
        <rect className="pic-dusk-edge" y={middle - LINE / 2} width="100%" height={LINE} />
        {marks.map(({ key, early, expected, late, side }) => {
          const band = stretch(early ?? expected, late ?? expected, span);
          const isInside = expected >= span.first && expected <= span.last;
          return (
            <g key={key} className={side === 'dawn' ? 'pic-dawn' : 'pic-dusk'}>
              {band && (
                <rect
                  y={middle - BAND / 2}
                  height={BAND}
                  style={{ x: percent(band.start), width: `max(${LEAST_WIDTH}px, ${percent(band.width)})` }}
                />
              )}
              {isInside && (
                <circle
                  cx={percent(startPercent(expected + 0.5, span))}
                  cy={middle}
                  r={PEG_RADIUS}
                  fill="var(--color-umber)"
                  stroke="var(--ground)"
                  strokeWidth={1.5}
                />
              )}
            </g>
          );
        })}
      </svg>
    </div>
  );
}
