import { useEffect, useRef } from 'react';
import { useSearchParams } from 'react-router-dom';
import { leadPatch } from './entry-draft.js';
import type { Editor } from './use-editor.js';

/**
 * Puts the marker that the address brings into an entry that is written already: whoever went to look for one comes
 * back to the entry they came from. Once for each arrival; then the address is the entry's own again. An entry that
 * begins with this marker needs nothing, and what is chosen in it afterwards stands.
 */
export function useWantedMarker(editor: Editor): void {
  const [search, setSearch] = useSearchParams();
  const { selection, selected, canWrite, edits, newStart } = editor;
  const { wanted, openId } = selection;
  const seen = useRef<string | null>(null);
  useEffect(() => {
    const arrival = search.toString();
    if (wanted === null || selected === null || selected.id !== openId || seen.current === arrival) return;
    seen.current = arrival;
    const isWritten = selected.saved !== null || edits.all.has(selected.id);
    if (!canWrite || !isWritten) return;
    edits.change(selected.id, selected.saved ?? newStart, leadPatch(wanted));
    setSearch({ entry: selected.id }, { replace: true, preventScrollReset: true });
  }, [search, wanted, selected, openId, canWrite, edits, newStart, setSearch]);
}
