import { classNames } from '../class-names.js';
import { Peg } from '../pegs.js';
import { percent, startPercent, type DaySpan } from './day-span.js';
import { useWidth } from '../use-width.js';
import { WindowShape, type WindowDays } from './window-bar.js';

/** When a marker may show: the ends of its range and the expected day. Ends may lie outside the row, or be open. */
export interface RangeMark {
  key: string;
  early: number | null;
  expected: number;
  late: number | null;
  /** Dawn is drawn ochre, dusk indigo. */
  side: 'dawn' | 'dusk';
}

export interface RowWindow {
  key: string;
  days: WindowDays;
  kind?: 'work' | 'watch' | undefined;
}

export interface RingRowProps {
  /** Days of the row, one ring each: a month, or the two weeks round a date. At most about sixty. */
  span: DaySpan;
  /** The row as a sentence. */
  label: string;
  /** The peg stands here. */
  today?: number | null | undefined;
  ranges?: readonly RangeMark[] | undefined;
  windows?: readonly RowWindow[] | undefined;
  /** Days that are drawn as dashed holes: 29 February on a board for every year. */
  dashed?: readonly number[] | undefined;
  className?: string | undefined;
}

const PEG_ROOM = 26;
const RANGE_HEIGHT = 22;
const WINDOW_HEIGHT = 12;
const WINDOW_PITCH = 18;

/** A row of the board: a hole for each day, the peg where you are, brackets and windows below. */
export function RingRow({
  span,
  label,
  today,
  ranges = [],
  windows = [],
  dashed = [],
  className,
}: RingRowProps) {
  const [ref, width] = useWidth(320);
  const days = span.last - span.first + 1;
  const radius = Math.min(6.5, (width / days) * 0.36);
  const hasPeg = today !== undefined && today !== null && today >= span.first && today <= span.last;
  const ringY = (hasPeg ? PEG_ROOM : 2) + radius;
  const rangesY = ringY + radius + 5;
  const windowsY = rangesY + ranges.length * RANGE_HEIGHT + 2;
  const height = windows.length > 0 ? windowsY + windows.length * WINDOW_PITCH : windowsY;
  return (
    <div className={classNames('picture', className)} ref={ref}>
      <svg role="img" aria-label={label} width="100%" height={Math.ceil(height)}>
        {Array.from({ length: days }, (_, index) => (
          <circle
            key={index}
            className="pic-hole"
            cx={percent(startPercent(span.first + index + 0.5, span))}
            cy={ringY}
            r={radius}
            strokeWidth={radius > 4.5 ? 2 : 1.6}
            strokeDasharray={dashed.includes(span.first + index) ? '3 2.4' : undefined}
          />
        ))}
        {hasPeg && <Peg x={percent(startPercent(today + 0.5, span))} footY={ringY + 1} />}
        {ranges.map((range, index) => (
          <RangeBracket key={range.key} range={range} span={span} y={rangesY + index * RANGE_HEIGHT} />
        ))}
        {windows.map((window, index) => (
          <WindowShape
            key={window.key}
            span={span}
            days={window.days}
            kind={window.kind}
            y={windowsY + index * WINDOW_PITCH}
            height={WINDOW_HEIGHT}
          />
        ))}
      </svg>
    </div>
  );
}

/** A bracket under the holes with a point at the expected day. An open end has no tick; one beyond the row is cut. */
export function RangeBracket({ range, span, y }: { range: RangeMark; span: DaySpan; y: number }) {
  const from = Math.max(range.early ?? range.expected, span.first);
  const to = Math.min(range.late ?? range.expected, span.last);
  if (to < from) return null;
  const look = range.side === 'dawn' ? 'pic-dawn' : 'pic-dusk';
  const x1 = percent(startPercent(from + 0.5, span));
  const x2 = percent(startPercent(to + 0.5, span));
  const width = percent(startPercent(to + 0.5, span) - startPercent(from + 0.5, span));
  const expectedInside = range.expected >= span.first && range.expected <= span.last;
  return (
    <g className={look}>
      <rect x={x1} y={y + 4} width={width} height={4} />
      {range.early === from && <Tick x={x1} y={y} />}
      {range.late === to && <Tick x={x2} y={y} />}
      {expectedInside && (
        <svg x={percent(startPercent(range.expected + 0.5, span))} y={y + 9} overflow="visible">
          <path d="M0 0 6.5 9H-6.5Z" />
        </svg>
      )}
    </g>
  );
}

function Tick({ x, y }: { x: string; y: number }) {
  return (
    <svg x={x} y={y} overflow="visible">
      <rect x={-1.5} width={3} height={12} />
    </svg>
  );
}
