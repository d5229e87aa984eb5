import { memo, useCallback, useEffect, useRef, useState, type KeyboardEvent } from 'react';
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
  /** Stays the same until the language changes, so that of hundreds of handles only what was moved is drawn anew. */
  words: MoveWords;
  /** Closer or wider, by the keys + and −. */
  onZoom?: ((step: 1 | -1) => void) | undefined;
}

export interface MoveWords {
  /** What a handle moves, and where that stands now; read aloud. */
  label: (name: string, part: MovePart, mayMove: boolean) => string;
  value: (days: WindowDays, part: MovePart) => string;
  /** The days of a window that is being dragged. */
  say: (days: WindowDays) => string;
}

export interface SurfaceBar {
  key: string;
  name: string;
  days: WindowDays;
  kind?: 'work' | 'watch' | undefined;
  topPx: number;
}

interface BarSurfaceProps {
  span: DaySpan;
  pxPerDay: number;
  barHeightPx: number;
  /** In an order that stays while they are moved. */
  bars: readonly SurfaceBar[];
  /** In which the keys up and down go from one bar to the next. */
  keyOrder: readonly string[];
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
export function BarSurface(props: BarSurfaceProps) {
  const { span, pxPerDay, barHeightPx, bars, keyOrder, chosen, moves, onOpen } = props;
  const box = useRef<HTMLDivElement>(null);
  const [stop, setStop] = useState<string | null>(null);
  const { drag, cancel, handlers } = useDayDrag({
    ...{ pxPerDay, mayMove: moves.mayMove, onMove: moves.onMove },
    onTap: onOpen,
  });
  // One of them all is in the order of the Tab key; the arrow keys lead on from it.
  const tabStop = [stop, chosen].find((key) => bars.some((bar) => bar.key === key)) ?? keyOrder[0];
  const goTo = (key: string | undefined) => {
    if (key === undefined) return;
    setStop(key);
    box.current?.querySelector<HTMLElement>(`[data-bar="${key}"]`)?.focus();
  };
  const onKeyDown = (event: KeyboardEvent<HTMLElement>, key: string, part: MovePart) => {
    const at = keyOrder.indexOf(key);
    const days = daysOfKey(event.key, event.shiftKey);
    if (event.key === 'Escape') cancel();
    else if (days !== null && moves.mayMove(key)) moves.onMove(key, part, days);
    else if (event.key === 'Enter' || event.key === ' ') onOpen(key);
    else if (event.key === 'ArrowDown') goTo(keyOrder[at + 1]);
    else if (event.key === 'ArrowUp') goTo(keyOrder[at - 1]);
    else if (event.key === 'Home') goTo(keyOrder[0]);
    else if (event.key === 'End') goTo(keyOrder.at(-1));
    else if (event.key === '+' || event.key === '=') moves.onZoom?.(1);
    else if (event.key === '-') moves.onZoom?.(-1);
    else return;
    event.preventDefault();
  };
  const keys = useRef(onKeyDown);
  useEffect(() => {
    keys.current = onKeyDown;
  });
  const steadyKeyDown = useCallback<OnBarKey>((...pressed) => {
    keys.current(...pressed);
  }, []);
  return (
    <div ref={box} {...handlers}>
      {bars.map(({ key, name, days, topPx }) => (
        <BarHandle
          key={key}
          {...{ span, barHeightPx, name, days, topPx }}
          barKey={key}
          words={moves.words}
          mayMove={moves.mayMove(key)}
          isTabStop={key === tabStop}
          isChosen={key === chosen}
          onKeyDown={steadyKeyDown}
        />
      ))}
      {drag && <Ghost {...{ span, barHeightPx, bars, moves, drag }} />}
    </div>
  );
}

type OnBarKey = (event: KeyboardEvent<HTMLElement>, key: string, part: MovePart) => void;

/** Every part stays the same while its bar does: `memo` then draws nothing again. */
interface BarHandleProps {
  span: DaySpan;
  barHeightPx: number;
  barKey: string;
  name: string;
  days: WindowDays;
  topPx: number;
  words: MoveWords;
  mayMove: boolean;
  isTabStop: boolean;
  isChosen: boolean;
  onKeyDown: OnBarKey;
}

const BarHandle = memo(function BarHandle(props: BarHandleProps) {
  const { span, barHeightPx, days, topPx, mayMove, isTabStop, isChosen } = props;
  const from = Math.max(days.earliest, span.first);
  const to = Math.min(days.lastAdvised, span.last) + 1;
  const middle = percent(startPercent((from + to) / 2, span));
  const half = `max(${String(TARGET / 2)}px, ${percent((startPercent(to, span) - startPercent(from, span)) / 2)})`;
  const ring = (left: string) => ({
    ...{ left, width: TARGET, height: TARGET },
    top: topPx + barHeightPx / 2 - TARGET / 2,
  });
  return (
    <>
      <DaySlider
        {...props}
        part="all"
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
          {...props}
          part="start"
          className="day-ring"
          style={ring(`calc(${middle} - ${half} - ${String(TARGET)}px)`)}
        />
      )}
      {isChosen && mayMove && days.lastAdvised <= span.last && (
        <DaySlider {...props} part="end" className="day-ring" style={ring(`calc(${middle} + ${half})`)} />
      )}
    </>
  );
});

interface DaySliderProps extends Pick<
  BarHandleProps,
  'span' | 'barKey' | 'name' | 'days' | 'words' | 'mayMove' | 'onKeyDown'
> {
  part: MovePart;
  tabIndex?: 0 | -1;
  className: string;
  style: Record<string, string | number>;
}

function DaySlider(props: DaySliderProps) {
  const { span, barKey, name, days, words, mayMove, onKeyDown, part, tabIndex = 0, className, style } = props;
  const day = part === 'end' ? days.lastAdvised : days.earliest;
  return (
    <div
      role="slider"
      tabIndex={tabIndex}
      data-bar={barKey}
      data-part={part}
      aria-label={words.label(name, part, mayMove)}
      aria-valuemin={span.first}
      aria-valuemax={span.last}
      aria-valuenow={Math.min(span.last, Math.max(span.first, day))}
      aria-valuetext={words.value(days, part)}
      aria-readonly={!mayMove || undefined}
      className={className}
      style={style}
      onKeyDown={(event) => {
        onKeyDown(event, barKey, part);
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
        {moves.words.say(days)}
      </span>
    </div>
  );
}
