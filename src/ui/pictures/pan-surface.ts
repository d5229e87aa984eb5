import { useRef, type PointerEvent } from 'react';

/** What fingers do on a picture that is a surface. Pixels; a tap is counted from the picture's middle. */
export interface SurfaceMoves {
  onPan: (dx: number, dy: number) => void;
  /** Two fingers went apart (over 1) or together (under 1). */
  onZoom: (factor: number) => void;
  onTap: (x: number, y: number) => void;
}

interface Finger {
  x: number;
  y: number;
}

/** A finger may slip this far and still mean a tap. */
const TAP_PX = 8;

/** Handlers that make a picture a surface: drag with one finger or the mouse, pinch with two, tap. */
export function usePanSurface({ onPan, onZoom, onTap }: SurfaceMoves) {
  const fingers = useRef(new Map<number, Finger>());
  const slip = useRef(0);

  const onPointerDown = (event: PointerEvent<HTMLElement>) => {
    // A finger that a browser lost must not stay down for ever.
    if (event.isPrimary) fingers.current.clear();
    event.currentTarget.setPointerCapture(event.pointerId);
    if (fingers.current.size === 0) slip.current = 0;
    fingers.current.set(event.pointerId, { x: event.clientX, y: event.clientY });
  };
  const onPointerMove = (event: PointerEvent<HTMLElement>) => {
    const before = fingers.current.get(event.pointerId);
    if (before === undefined) return;
    const now = { x: event.clientX, y: event.clientY };
    const other = [...fingers.current].find(([id]) => id !== event.pointerId)?.[1];
    slip.current += Math.hypot(now.x - before.x, now.y - before.y);
    fingers.current.set(event.pointerId, now);
    if (other !== undefined) {
      const [was, is] = [distance(before, other), distance(now, other)];
      if (was > 0 && is > 0) onZoom(is / was);
      onPan((now.x - before.x) / 2, (now.y - before.y) / 2);
    } else if (slip.current > TAP_PX) onPan(now.x - before.x, now.y - before.y);
  };
  const onPointerUp = (event: PointerEvent<HTMLElement>) => {
    const wasAlone = fingers.current.size === 1;
    if (!fingers.current.delete(event.pointerId) || !wasAlone || slip.current > TAP_PX) return;
    const box = event.currentTarget.getBoundingClientRect();
    onTap(event.clientX - box.left - box.width / 2, event.clientY - box.top - box.height / 2);
  };
  const onPointerCancel = (event: PointerEvent<HTMLElement>) => {
    fingers.current.delete(event.pointerId);
  };
  return { onPointerDown, onPointerMove, onPointerUp, onPointerCancel };
}

function distance(a: Finger, b: Finger): number {
  return Math.hypot(a.x - b.x, a.y - b.y);
}
