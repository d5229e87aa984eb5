import { memo } from 'react';
import { classNames } from '../class-names.js';
import { useWidth } from '../use-width.js';
import { percent, startPercent, stretch, type DaySpan } from './day-span.js';
import { fitScale, type ScaleMonth } from './fit-scale.js';

export type { ScaleMonth } from './fit-scale.js';

/** A guess for the width of a letter, in pixels, where nobody measures. */
const LETTER_PX = 9;
const guessedWidth = (text: string) => text.length * LETTER_PX;

interface MonthScaleProps {
  span: DaySpan;
  months: readonly ScaleMonth[];
  /** Of the names, where it is not the reader's. */
  lang?: string | undefined;
  /** Of a name as it is drawn, in pixels. */
  textWidth?: ((text: string) => number) | undefined;
}

/** Names of the months under or over a lane; one letter each where there is little room. */
export const MonthScale = memo(function MonthScale({
  span,
  months,
  lang,
  textWidth = guessedWidth,
}: MonthScaleProps) {
  const [ref, width] = useWidth(600);
  const { isNarrow, parts } = fitScale(months, span, width, textWidth);
  return (
    <div ref={ref} className={classNames('picture month-scale', isNarrow && 'short')} lang={lang} aria-hidden>
      {parts.map(({ dayNumber, days, text }) => {
        const place = stretch(dayNumber, dayNumber + days - 1, span);
        return (
          place && (
            <span key={dayNumber} style={{ left: percent(place.start), width: percent(place.width) }}>
              {text}
            </span>
          )
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
