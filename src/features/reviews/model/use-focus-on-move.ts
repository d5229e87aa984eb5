import { useEffect, useRef } from 'react';

/** A new entry is read from its title: the focus goes there, and the page to its top. */
export function useFocusOnMove(index: number): void {
  const before = useRef(index);
  useEffect(() => {
    if (before.current === index) return;
    before.current = index;
    window.scrollTo({ top: 0 });
    document.getElementById('entry-title')?.focus({ preventScroll: true });
  }, [index]);
}
