import { startTransition, useRef, useState, type PointerEvent } from 'react';
import { daysDragged, partAt, type MovePart } from './day-drag.js';

/** A bar that is held, by its key, and how far it was dragged. */
export interface DayDrag {
  key: string;
  part: MovePart;
  days: number;
}

interface Held extends DayDrag {
  startPx: number;
}

interface DayDragWays {
  pxPerDay: number;
  mayMove: (key: string) => boolean;
  onMove: (key: string, part: MovePart, days: number) => void;
  /** Pressed and let go where it was. */
  onTap: (key: string) => void;
}

/**
 * Handlers for a box whose children are bars (`data-bar`, and `data-part` where a child is an end alone). While one is
 * dragged only `drag` changes; the move itself comes once, when it is let go.
 */
export function useDayDrag({ pxPerDay, mayMove, onMove, onTap }: DayDragWays) {
  const [drag, setDrag] = useState<DayDrag | null>(null);
  const held = useRef<Held | null>(null);
  const letGo = () => {
    held.current = null;
    setDrag(null);
  };
  return {
    drag,
    cancel: letGo,
    handlers: {
      onPointerDown: (event: PointerEvent) => {
        const bar = barUnder(event);
        if (bar === null || event.button !== 0) return;
        bar.element.setPointerCapture(event.pointerId);
        held.current = { key: bar.key, part: bar.part, startPx: event.clientX, days: 0 };
      },
      onPointerMove: (event: PointerEvent) => {
        const now = held.current;
        if (now === null) {
          const bar = barUnder(event);
          if (bar) bar.element.style.cursor = mayMove(bar.key) && bar.part !== 'all' ? 'ew-resize' : '';
          return;
        }
        const days = daysDragged(event.clientX - now.startPx, pxPerDay);
        if (days === now.days || !mayMove(now.key)) return;
        now.days = days;
        setDrag({ key: now.key, part: now.part, days });
      },
      onPointerUp: () => {
        const now = held.current;
        held.current = null;
        // Its shadow stays until the bar itself stands there.
        startTransition(() => {
          setDrag(null);
          if (now !== null && now.days !== 0) onMove(now.key, now.part, now.days);
        });
        if (now?.days === 0) onTap(now.key);
      },
      // A finger that goes on to scroll the page drags nothing.
      onPointerCancel: letGo,
    },
  };
}

function barUnder({ target, clientX }: PointerEvent): {
  element: HTMLElement;
  key: string;
  part: MovePart;
} | null {
  const element = (target as Element).closest<HTMLElement>('[data-bar]');
  const key = element?.dataset['bar'];
  if (element === null || key === undefined) return null;
  const { left, width } = element.getBoundingClientRect();
  const end = element.dataset['part'];
  const part = end === 'start' || end === 'end' ? end : partAt(clientX - left, width);
  return { element, key, part };
}
