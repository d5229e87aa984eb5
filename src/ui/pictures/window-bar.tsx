import { memo } from 'react';
import { classNames } from '../class-names.js';
import { percent, startPercent, stretch, type DaySpan } from './day-span.js';

/** Days of a window by day number, in order. */
export interface WindowDays {
  earliest: number;
  bestFrom: number;
  bestTo: number;
  lastAdvised: number;
}

export interface WindowBarProps {
  span: DaySpan;
  days: WindowDays;
  /** The window as a sentence. Empty where the words stand right beside it. */
  label: string;
  /** `watch` is drawn open: nothing is done, people keep their eyes open. */
  kind?: 'work' | 'watch' | undefined;
  height?: number | undefined;
  /** A ground line with the beginnings of months, for a bar that stands alone in a list. */
  monthStarts?: readonly number[] | undefined;
  className?: string | undefined;
}

const LEAST_WIDTH = 4;

/** Solid: best days. Hatched: early or late, still possible. Open: watch. Diamond: one fixed day. */
export function WindowBar({
  span,
  days,
  label,
  kind = 'work',
  height = 12,
  monthStarts,
  className,
}: WindowBarProps) {
  const spoken = label === '' ? { 'aria-hidden': true } : { role: 'img', 'aria-label': label };
  const foot = monthStarts === undefined ? 0 : 4;
  return (
    <div className={classNames('picture', className)}>
      <svg {...spoken} width="100%" height={height + 2 + foot}>
        {monthStarts !== undefined && (
          <>
            {monthStarts.map((day) => (
              <rect
                key={day}
                className="pic-month-line"
                x={percent(startPercent(day, span))}
                width={1.5}
                height={height + foot}
              />
            ))}
            <rect y={height + foot} width="100%" height={1.25} fill="var(--color-edge)" />
          </>
        )}
        <WindowShape span={span} days={days} kind={kind} y={1} height={height} />
      </svg>
    </div>
  );
}

interface WindowShapeProps {
  span: DaySpan;
  days: WindowDays;
  kind?: 'work' | 'watch' | undefined;
  y: number;
  height: number;
}

/** The bar alone, for pictures that draw several into one SVG. */
export const WindowShape = memo(function WindowShape({
  span,
  days,
  kind = 'work',
  y,
  height,
}: WindowShapeProps) {
  if (days.earliest === days.lastAdvised)
    return <FixedDay span={span} day={days.earliest} y={y} height={height} />;
  if (kind === 'watch')
    return (
      <Part span={span} from={days.earliest} to={days.lastAdvised} look="pic-watch" y={y} height={height} />
    );
  return (
    <>
      <Part span={span} from={days.earliest} to={days.lastAdvised} look="pic-margin" y={y} height={height} />
      <Part span={span} from={days.bestFrom} to={days.bestTo} look="pic-best" y={y} height={height} />
    </>
  );
});

function Part({
  span,
  from,
  to,
  look,
  y,
  height,
}: Omit<WindowShapeProps, 'days' | 'kind'> & { from: number; to: number; look: string }) {
  const place = stretch(from, to, span);
  if (place === null) return null;
  return (
    <rect
      className={look}
      x={percent(place.start)}
      y={y}
      height={height}
      strokeWidth={1.25}
      style={{ width: `max(${String(LEAST_WIDTH)}px, ${percent(place.width)})` }}
    />
  );
}

function FixedDay({ span, day, y, height }: { span: DaySpan; day: number; y: number; height: number }) {
  const half = height * 0.56;
  if (day < span.first || day > span.last) return null;
  return (
    <svg x={percent(startPercent(day + 0.5, span))} y={y + height / 2} overflow="visible">
      <path
        d={`M0 ${String(-half)}L${String(half)} 0 0 ${String(half)}-${String(half)} 0Z`}
        className="pic-best"
        stroke="none"
      />
    </svg>
  );
}
