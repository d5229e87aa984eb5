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

const RING = 16;

/** Rings at both ends of the chosen window and a grip over it: drag them, or press the arrow keys. */
export function DayHandles({ span, days, pxPerDay, top, height, words, onMove }: DayHandlesProps) {
  const middle = top + height / 2;
  const ring = (dayEdge: number) => ({
    left: `calc(${percent(startPercent(dayEdge, span))} - ${String(RING / 2)}px)`,
    top: middle - RING / 2,
    width: RING,
    height: RING,
  });
  const from = Math.max(days.earliest, span.first);
  const to = Math.min(days.lastAdvised, span.last) + 1;
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
          left: percent(startPercent(from, span)),
          width: percent(startPercent(to, span) - startPercent(from, span)),
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
          style={ring(days.earliest)}
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
          style={ring(days.lastAdvised + 1)}
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
