import { RangeBracket, type RangeMark } from './ring-row.js';
import type { DaySpan } from './day-span.js';

const LINE = 1.25;

/** A lane of single days: a thin line through the year, and a bracket where the sign may come. */
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
  return (
    <div className="picture">
      <svg role="img" aria-label={label} width="100%" height={height}>
        <rect className="pic-dusk-edge" y={height / 2 - LINE} width="100%" height={LINE} />
        {marks.map((mark) => (
          <RangeBracket key={mark.key} range={mark} span={span} y={height / 2 - 6.5} />
        ))}
      </svg>
    </div>
  );
}
