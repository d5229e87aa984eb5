import { useCallback, useState, type RefCallback } from 'react';

/** Width of an element in pixels, kept up to date; `guess` until it is measured. */
export function useWidth(guess: number): [RefCallback<HTMLElement>, number] {
  const [width, setWidth] = useState(guess);
  const ref = useCallback<RefCallback<HTMLElement>>((element) => {
    if (element === null || typeof ResizeObserver === 'undefined') return undefined;
    const observer = new ResizeObserver(([entry]) => {
      if (entry && entry.contentRect.width > 0) setWidth(entry.contentRect.width);
    });
    observer.observe(element);
    return () => {
      observer.disconnect();
    };
  }, []);
  return [ref, width];
}
