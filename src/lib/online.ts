import { useSyncExternalStore } from 'react';

let offlineSince: Date | null = null;

/** Since when there has been no network; null while there is one. */
export function useOfflineSince(): Date | null {
  return useSyncExternalStore(listen, read);
}

function read(): Date | null {
  if (navigator.onLine) offlineSince = null;
  else offlineSince ??= new Date();
  return offlineSince;
}

function listen(listener: () => void): () => void {
  addEventListener('online', listener);
  addEventListener('offline', listener);
  return () => {
    removeEventListener('online', listener);
    removeEventListener('offline', listener);
  };
}
