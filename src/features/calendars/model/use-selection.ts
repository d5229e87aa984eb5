import { useCallback, useMemo } from 'react';
import { useSearchParams } from 'react-router-dom';
import { useWideScreen } from '#src/lib/wide-screen.js';
import { newEntryId } from './kept-edits.js';
import { wantedMarker, type WantedMarker } from './wanted-marker.js';

export interface Selection {
  isWide: boolean;
  /** As the address says; null for the list. */
  openId: string | null;
  /** What a new entry shall go by, if the address says so. */
  wanted: WantedMarker | null;
  open: (entryId: string) => void;
  openNew: () => void;
  close: () => void;
}

/** Which entry is open. It stands in the address: on a phone "back" leads from the entry to the list. */
export function useSelection(): Selection {
  const isWide = useWideScreen();
  const [search, setSearch] = useSearchParams();
  const openId = search.get('entry');
  const wanted = useMemo(() => wantedMarker(search), [search]);
  const open = useCallback(
    (entryId: string) => {
      setSearch({ entry: entryId }, { replace: isWide, preventScrollReset: isWide });
    },
    [setSearch, isWide],
  );
  return {
    isWide,
    openId,
    wanted,
    open,
    openNew: () => {
      open(newEntryId(Date.now().toString(36)));
    },
    close: () => {
      setSearch({}, { replace: true, preventScrollReset: isWide });
    },
  };
}
