import { memo } from 'react';
import { classNames } from '../class-names.js';
import { useWidth } from '../use-width.js';
import { percent, startPercent, stretch, type DaySpan } from './day-span.js';

/** A month of the scale. `lib/date-words` makes them: `months(year)`. */
export interface ScaleMonth {
  dayNumber: number;
  days: number;
  short: string;
  narrow: string;
}

/** Three letters and a little air, in pixels. */
const SHORT_NAME_WIDTH = 38;

interface MonthScaleProps {
  span: DaySpan;
  months: readonly ScaleMonth[];
  /** Of the names, where it is not the reader's. */
  lang?: string | undefined;
}

/** Names of the months under or over a lane; one letter each where there is little room. */
export const MonthScale = memo(function MonthScale({ span, months, lang }: MonthScaleProps) {
  const [ref, width] = useWidth(600);
  const narrow = width / months.length < SHORT_NAME_WIDTH;
  return (
    <div ref={ref} className={classNames('picture month-scale', narrow && 'short')} lang={lang} aria-hidden>
      {months.map((month) => {
        const place = stretch(month.dayNumber, month.dayNumber + month.days - 1, span);
        if (place === null) return null;
        return (
          <span key={month.dayNumber} style={{ left: percent(place.start), width: percent(place.width) }}>
            {narrow ? month.narrow : month.short}
          </span>
        );
      })}
    </div>
  );
});

/** Thin lines at the beginnings of months, through lanes and bars. Lay it under them in a `relative` box. */
export const MonthLines = memo(function MonthLines({
  span,
  months,
}: {
  span: DaySpan;
  months: readonly ScaleMonth[];
}) {
  return (
    <svg
      className="picture"
      style={{ position: 'absolute', inset: 0 }}
      width="100%"
      height="100%"
      aria-hidden
    >
      {months.map(
        (month) =>
          month.dayNumber > span.first &&
          month.dayNumber <= span.last && (
            <rect
              key={month.dayNumber}
              className="pic-month-line"
              x={percent(startPercent(month.dayNumber, span))}
              width={1.5}
              height="100%"
            />
          ),
      )}
    </svg>
  );
});
