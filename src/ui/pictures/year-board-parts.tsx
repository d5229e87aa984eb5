import { memo } from 'react';
import { classNames } from '../class-names.js';
import type { WindowDays } from './window-bar.js';

/** The day of the window that the line ends at: the marker's own where it lies inside, else the nearer edge. */
export function nearestDay(days: WindowDays, dayNumber: number): number {
  if (dayNumber < days.earliest) return days.earliest;
  return dayNumber > days.lastAdvised ? days.lastAdvised + 1 : dayNumber + 0.5;
}

export function Pairing({ x, fromY, toX, toY }: { x: string; fromY: number; toX: string; toY: number }) {
  const look = { stroke: 'var(--color-umber)', strokeWidth: 2, strokeDasharray: '2 4' };
  return (
    <>
      <line x1={x} x2={x} y1={fromY} y2={toY} {...look} />
      <line x1={x} x2={toX} y1={toY} y2={toY} {...look} />
    </>
  );
}

interface BarNameProps {
  barKey: string;
  name: string;
  isChosen: boolean;
  maxWidthPx: number;
  leftPx: number;
  topPx: number;
  onChoose: ((key: string) => void) | undefined;
}

/** Out of the tab order: the list beside the strip is the way for keys and ears. */
export const BarName = memo(function BarName(props: BarNameProps) {
  const { barKey, name, isChosen, maxWidthPx, leftPx, topPx, onChoose } = props;
  const look = {
    className: classNames('on-picture year-board-label', isChosen && 'chosen'),
    style: { left: leftPx, top: topPx, maxWidth: maxWidthPx },
    title: name,
  };
  if (onChoose === undefined) {
    return (
      <span aria-hidden {...look}>
        {name}
      </span>
    );
  }
  return (
    <button
      type="button"
      tabIndex={-1}
      {...look}
      onClick={() => {
        onChoose(barKey);
      }}
    >
      {name}
    </button>
  );
});
