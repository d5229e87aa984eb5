import { useRef, type KeyboardEvent, type PointerEvent } from 'react';
import { percent, startPercent, type DaySpan } from './day-span.js';
import type { WindowDays } from './window-bar.js';

/** What is moved: the whole window, its first day or its last. */
export type MovePart = 'all' | 'start' | 'end';

export interface HandleWords {
  /** What each handle moves, read aloud. */
  label: Record<MovePart, string>;
  /** Where the part stands now. */
  value: Record<MovePart, string>;
}

interface DayHandlesProps {
  span: DaySpan;
  days: WindowDays;
  pxPerDay: number;
  top: number;
  height: number;
  words: HandleWords;
  onMove: (part: MovePart, days: number) => void;
}

/** Drawn at 16 px within a target of 24, the least that a finger or a shaking hand should get. */
const TARGET = 24;

/**
 * Rings at both ends of the chosen window and a grip over it: drag them, or press the arrow keys. The rings stand
 * outside the grip, so that the three targets of a window of a few days do not cover each other.
 */
export function DayHandles({ span, days, pxPerDay, top, height, words, onMove }: DayHandlesProps) {
  const from = Math.max(days.earliest, span.first);
  const to = Math.min(days.lastAdvised, span.last) + 1;
  const middle = percent(startPercent((from + to) / 2, span));
  const halfWidth = percent((startPercent(to, span) - startPercent(from, span)) / 2);
  const half = `max(${String(TARGET / 2)}px, ${halfWidth})`;
  const ring = (left: string) => ({
    left,
    top: top + height / 2 - TARGET / 2,
    width: TARGET,
    height: TARGET,
  });
  const each = { pxPerDay, span, onMove };
  return (
    <>
      <Handle
        {...each}
        part="all"
        day={days.earliest}
        label={words.label.all}
        value={words.value.all}
        className="day-grip"
        style={{
          left: `calc(${middle} - ${half})`,
          width: `calc(2 * ${half})`,
          top: top - 6,
          height: height + 12,
        }}
      />
      {days.earliest >= span.first && (
        <Handle
          {...each}
          part="start"
          day={days.earliest}
          label={words.label.start}
          value={words.value.start}
          className="day-ring"
          style={ring(`calc(${middle} - ${half} - ${String(TARGET)}px)`)}
        />
      )}
      {days.lastAdvised <= span.last && (
        <Handle
          {...each}
          part="end"
          day={days.lastAdvised}
          label={words.label.end}
          value={words.value.end}
          className="day-ring"
          style={ring(`calc(${middle} + ${half})`)}
        />
      )}
    </>
  );
}

interface HandleProps {
  part: MovePart;
  day: number;
  span: DaySpan;
  pxPerDay: number;
  label: string;
  value: string;
  className: string;
  style: Record<string, string | number>;
  onMove: (part: MovePart, days: number) => void;
}

const KEYS: Record<string, number> = {
  ArrowLeft: -1,
  ArrowDown: -1,
  ArrowRight: 1,
  ArrowUp: 1,
  PageDown: -7,
  PageUp: 7,
};

function Handle({ part, day, span, pxPerDay, label, value, className, style, onMove }: HandleProps) {
  const drag = useRef<{ startX: number; moved: number } | null>(null);
  const onKeyDown = (event: KeyboardEvent) => {
    const days = KEYS[event.key];
    if (days === undefined) return;
    event.preventDefault();
    onMove(part, days);
  };
  const onPointerDown = (event: PointerEvent) => {
    event.currentTarget.setPointerCapture(event.pointerId);
    drag.current = { startX: event.clientX, moved: 0 };
  };
  const onPointerMove = (event: PointerEvent) => {
    if (drag.current === null || pxPerDay <= 0) return;
    const days = Math.round((event.clientX - drag.current.startX) / pxPerDay);
    if (days === drag.current.moved) return;
    onMove(part, days - drag.current.moved);
    drag.current.moved = days;
  };
  const stop = () => {
    drag.current = null;
  };
  return (
    <div
      role="slider"
      tabIndex={0}
      aria-label={label}
      aria-valuemin={span.first}
      aria-valuemax={span.last}
      aria-valuenow={Math.min(span.last, Math.max(span.first, day))}
      aria-valuetext={value}
      className={className}
      style={style}
      onKeyDown={onKeyDown}
      onPointerDown={onPointerDown}
      onPointerMove={onPointerMove}
      onPointerUp={stop}
      onPointerCancel={stop}
    />
  );
}
