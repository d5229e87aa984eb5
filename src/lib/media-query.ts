import { useCallback, useSyncExternalStore } from 'react';

/** From 700 px a table has room; below it rows are cards (`--breakpoint-mid`). */
export const FROM_MID = '(min-width: 43.75rem)';

/** Whether a media query fits just now; false where there is no screen. */
export function useMediaQuery(query: string): boolean {
  const listen = useCallback(
    (listener: () => void) => {
      const list = listOf(query);
      list?.addEventListener('change', listener);
      return () => list?.removeEventListener('change', listener);
    },
    [query],
  );
  return useSyncExternalStore(
    listen,
    () => listOf(query)?.matches ?? false,
    () => false,
  );
}

function listOf(query: string): MediaQueryList | null {
  return typeof matchMedia === 'function' ? matchMedia(query) : null;
}
