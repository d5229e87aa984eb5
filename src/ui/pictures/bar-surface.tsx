import { useEffect, useMemo, useRef, useState, type KeyboardEvent } from 'react';
import { classNames } from '../class-names.js';
import { daysOfKey, type MovePart } from './day-drag.js';
import { percent, startPercent, type DaySpan } from './day-span.js';
import { useDayDrag } from './use-day-drag.js';
import { WindowShape, type WindowDays } from './window-bar.js';

/** Moving bars: what may be moved, where it would come to stand, and the words for it. */
export interface BarMoves {
  mayMove: (key: string) => boolean;
  onMove: (key: string, part: MovePart, days: number) => void;
  /** Where the window would stand. */
  preview: (key: string, part: MovePart, days: number) => WindowDays;
  /** What a handle moves, and where that stands now; read aloud. */
  label: (key: string, part: MovePart) => string;
  value: (key: string, part: MovePart) => string;
  /** The days of a window that is being dragged. */
  say: (days: WindowDays) => string;
  /** Closer or wider, by the keys + and −. */
  onZoom?: ((step: 1 | -1) => void) | undefined;
}

export interface SurfaceBar {
  key: string;
  days: WindowDays;
  kind?: 'work' | 'watch' | undefined;
  topPx: number;
}

interface BarSurfaceProps {
  span: DaySpan;
  pxPerDay: number;
  barHeightPx: number;
  /** In the order in which keys go from one to the next. */
  bars: readonly SurfaceBar[];
  chosen: string | null;
  moves: BarMoves;
  onOpen: (key: string) => void;
}

/** The least that a finger or a shaking hand should get, pixels. */
const TARGET = 24;

/**
 * Lies over the bars: drag one whole or by an end, or go from bar to bar with the keys up and down, move by a day with left
 * and right, by ten with Shift, and open with Enter. The chosen one has rings at its ends for keys.
 */
export function BarSurface({ span, pxPerDay, barHeightPx, bars, chosen, moves, onOpen }: BarSurfaceProps) {
  const box = useRef<HTMLDivElement>(null);
  const [stop, setStop] = useState<string | null>(null);
  const { drag, cancel, handlers } = useDayDrag({
    ...{ pxPerDay, mayMove: moves.mayMove, onMove: moves.onMove },
    onTap: onOpen,
  });
  // One of them all is in the order of the Tab key; the arrow keys lead on from it.
  const tabStop = [stop, chosen].find((key) => bars.some((bar) => bar.key === key)) ?? bars[0]?.key;
  const goTo = (key: string | undefined) => {
    if (key === undefined) return;
    setStop(key);
    box.current?.querySelector<HTMLElement>(`[data-bar="${key}"]`)?.focus();
  };
  const onKeyDown = (event: KeyboardEvent<HTMLElement>, key: string, part: MovePart) => {
    const at = bars.findIndex((bar) => bar.key === key);
    const days = daysOfKey(event.key, event.shiftKey);
    if (event.key === 'Escape') cancel();
    else if (days !== null && moves.mayMove(key)) moves.onMove(key, part, days);
    else if (event.key === 'Enter' || event.key === ' ') onOpen(key);
    else if (event.key === 'ArrowDown') goTo(bars[at + 1]?.key);
    else if (event.key === 'ArrowUp') goTo(bars[at - 1]?.key);
    else if (event.key === 'Home') goTo(bars[0]?.key);
    else if (event.key === 'End') goTo(bars.at(-1)?.key);
    else if (event.key === '+' || event.key === '=') moves.onZoom?.(1);
    else if (event.key === '-') moves.onZoom?.(-1);
    else return;
    event.preventDefault();
  };
  const keys = useRef(onKeyDown);
  useEffect(() => {
    keys.current = onKeyDown;
  });
  // While one bar is dragged, none of the others is drawn again.
  const handles = useMemo(
    () =>
      bars.map((bar) => (
        <BarHandle
          key={bar.key}
          {...{ span, barHeightPx, bar, moves }}
          isTabStop={bar.key === tabStop}
          isChosen={bar.key === chosen}
          onKeyDown={(event, part) => keys.current(event, bar.key, part)}
        />
      )),
    [span, barHeightPx, bars, moves, tabStop, chosen],
  );
  return (
    <div ref={box} {...handlers}>
      {handles}
      {drag && <Ghost {...{ span, barHeightPx, bars, moves, drag }} />}
    </div>
  );
}

interface BarHandleProps {
  span: DaySpan;
  barHeightPx: number;
  bar: SurfaceBar;
  moves: BarMoves;
  isTabStop: boolean;
  isChosen: boolean;
  onKeyDown: (event: KeyboardEvent<HTMLElement>, part: MovePart) => void;
}

function BarHandle({ span, barHeightPx, bar, moves, isTabStop, isChosen, onKeyDown }: BarHandleProps) {
  const { key, days, topPx } = bar;
  const from = Math.max(days.earliest, span.first);
  const to = Math.min(days.lastAdvised, span.last) + 1;
  const middle = percent(startPercent((from + to) / 2, span));
  const half = `max(${String(TARGET / 2)}px, ${percent((startPercent(to, span) - startPercent(from, span)) / 2)})`;
  const mayMove = moves.mayMove(key);
  const each = { span, bar, moves, onKeyDown };
  const ring = (left: string) => ({
    ...{ left, width: TARGET, height: TARGET },
    top: topPx + barHeightPx / 2 - TARGET / 2,
  });
  return (
    <>
      <DaySlider
        {...each}
        part="all"
        isFixed={!mayMove}
        tabIndex={isTabStop ? 0 : -1}
        className={classNames('day-grip', !mayMove && 'fixed')}
        style={{
          left: `calc(${middle} - ${half})`,
          width: `calc(2 * ${half})`,
          top: topPx - (TARGET - barHeightPx) / 2,
          height: TARGET,
        }}
      />
      {isChosen && mayMove && days.earliest >= span.first && (
        <DaySlider
          {...each}
          part="start"
          className="day-ring"
          style={ring(`calc(${middle} - ${half} - ${String(TARGET)}px)`)}
        />
      )}
      {isChosen && mayMove && days.lastAdvised <= span.last && (
        <DaySlider {...each} part="end" className="day-ring" style={ring(`calc(${middle} + ${half})`)} />
      )}
    </>
  );
}

interface DaySliderProps extends Pick<BarHandleProps, 'span' | 'bar' | 'moves' | 'onKeyDown'> {
  part: MovePart;
  isFixed?: boolean;
  tabIndex?: 0 | -1;
  className: string;
  style: Record<string, string | number>;
}

function DaySlider({
  span,
  bar: { key, days },
  moves,
  onKeyDown,
  part,
  isFixed = false,
  tabIndex = 0,
  className,
  style,
}: DaySliderProps) {
  const day = part === 'end' ? days.lastAdvised : days.earliest;
  return (
    <div
      role="slider"
      tabIndex={tabIndex}
      data-bar={key}
      data-part={part}
      aria-label={moves.label(key, part)}
      aria-valuemin={span.first}
      aria-valuemax={span.last}
      aria-valuenow={Math.min(span.last, Math.max(span.first, day))}
      aria-valuetext={moves.value(key, part)}
      aria-readonly={isFixed || undefined}
      className={className}
      style={style}
      onKeyDown={(event) => {
        onKeyDown(event, part);
      }}
    />
  );
}

interface GhostProps {
  span: DaySpan;
  barHeightPx: number;
  bars: readonly SurfaceBar[];
  moves: BarMoves;
  drag: { key: string; part: MovePart; days: number };
}

/** Where the dragged window would come to stand, with its days. */
function Ghost({ span, barHeightPx, bars, moves, drag }: GhostProps) {
  const bar = bars.find(({ key }) => key === drag.key);
  if (!bar) return null;
  const days = moves.preview(drag.key, drag.part, drag.days);
  const at = Math.min(70, Math.max(0, startPercent(days.earliest, span)));
  return (
    <div className="bar-ghost" style={{ top: bar.topPx }}>
      <svg width="100%" height={barHeightPx} aria-hidden>
        <WindowShape span={span} days={days} kind={bar.kind} y={0} height={barHeightPx} />
      </svg>
      <span className="on-picture" style={{ left: percent(at) }} aria-hidden>
        {moves.say(days)}
      </span>
    </div>
  );
}
