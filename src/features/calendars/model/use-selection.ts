import { useCallback, useMemo } from 'react';
import { useSearchParams } from 'react-router-dom';
import { newId } from '#src/lib/new-id.js';
import { useWideScreen } from '#src/lib/wide-screen.js';
import { newEntryId } from './kept-edits.js';
import type { Born } from './use-entry-edits.js';
import { wantedMarker, type WantedMarker } from './wanted-marker.js';

export interface Selection {
  isWide: boolean;
  /** As the address says, and where that names a new entry that is saved by now, the saved one; null for the list. */
  openId: string | null;
  /** What a new entry shall go by, if the address says so. */
  wanted: WantedMarker | null;
  open: (entryId: string) => void;
  /** The new entry that is open is saved: the address names it from now on, and "back" does not lead to it twice. */
  rename: (entryId: string) => void;
  openNew: () => void;
  close: () => void;
}

/** Which entry is open. It stands in the address: on a phone "back" leads from the entry to the list. */
export function useSelection(born: Born): Selection {
  const isWide = useWideScreen();
  const [search, setSearch] = useSearchParams();
  const named = search.get('entry');
  const openId = named === null ? null : (born.get(named)?.id ?? named);
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
    rename: (entryId) => {
      setSearch({ entry: entryId }, { replace: true, preventScrollReset: true });
    },
    openNew: () => {
      // Never a word that was there before: a saved entry goes on being known by the word that it began with.
      open(newEntryId(newId()));
    },
    close: () => {
      setSearch({}, { replace: true, preventScrollReset: isWide });
    },
  };
}
