import { useSyncExternalStore } from 'react';

/** The width from which the rail stands on top and screens have columns (`--breakpoint-wide`). */
const WIDE = '(min-width: 64rem)';

/** True from 1024 px. For screens whose parts stand side by side there, and one behind the other on a phone. */
export function useWideScreen(): boolean {
  return useSyncExternalStore(listen, isWide, () => false);
}

function query(): MediaQueryList | null {
  return typeof matchMedia === 'function' ? matchMedia(WIDE) : null;
}

function isWide(): boolean {
  return query()?.matches ?? false;
}

function listen(listener: () => void): () => void {
  const list = query();
  list?.addEventListener('change', listener);
  return () => {
    list?.removeEventListener('change', listener);
  };
}
