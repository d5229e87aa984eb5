import { useCallback, useLayoutEffect, useRef, useState } from 'react';
import type { Place, PlaceInput } from '#shared/contracts/places.js';
import { useKeptDraft, type KeptDraft } from '#src/lib/kept-draft.js';
import {
  draftOf,
  emptyDraft,
  inputOf,
  isChanged,
  isKeptPlace,
  joinedDraft,
  type KeptPlace,
  type PlaceDraft,
} from '../model/place-draft.js';

interface DraftState {
  draft: PlaceDraft;
  /** The saved state that the draft began from, and its version; null for a new place. */
  base: PlaceInput | null;
  version: number | null;
  /** A newer saved state that has to be joined with the draft first. */
  newer: Place | null;
  /** When the draft that was found here was kept; null once it is seen to. */
  foundAt: string | null;
}

/** What to change: the new values, or how they follow from the draft as it is at that moment. */
export type DraftChange = Partial<PlaceDraft> | ((draft: PlaceDraft) => Partial<PlaceDraft>);

export interface PlaceDraftState extends DraftState {
  changed: boolean;
  keptAt: Date | null;
  change: (patch: DraftChange) => void;
  /** Back to what is saved. */
  startOver: () => void;
  /** After saving `sent`: what came back is the new start; what was typed meanwhile stays. */
  takeSaved: (place: Place, sent: PlaceDraft) => void;
  /** The server holds a newer state. */
  showNewer: (place: Place) => void;
  /** The two states are joined: the draft now stands on the newer one. */
  join: (joined: PlaceInput, onto: Place) => void;
}

/** The draft of a place, kept on the device. A newer saved state replaces it only where nothing was changed. */
export function usePlaceDraft(place: Place | null, communityId: string): PlaceDraftState {
  const keeper = useKeptDraft<KeptPlace>(
    place === null ? `new-place.${communityId}` : `place.${place.id}`,
    isKeptPlace,
  );
  const [state, setState] = useState<DraftState>(() => startHere(place, keeper.found));
  const changed = isChanged(state.draft, state.base);

  if (place !== null && state.version !== null && place.version > state.version && state.newer === null) {
    setState(changed ? { ...state, newer: place } : startFrom(place));
  }

  // An undo may come a while after its button was drawn: it changes the draft as it is then, not as it was.
  const latest = useRef(state);
  useLayoutEffect(() => {
    latest.current = state;
  }, [state]);
  const { keepDraft } = keeper;
  const keep = useCallback(
    (next: DraftState) => {
      latest.current = next;
      setState(next);
      keepDraft({ draft: next.draft, base: next.base }, next.version);
    },
    [keepDraft],
  );
  const change = useCallback(
    (patch: DraftChange) => {
      const { draft } = latest.current;
      const changes = typeof patch === 'function' ? patch(draft) : patch;
      keep({ ...latest.current, draft: { ...draft, ...changes }, foundAt: null });
    },
    [keep],
  );
  return {
    ...state,
    changed,
    keptAt: keeper.keptAt,
    change,
    startOver: () => {
      keeper.dropDraft();
      setState(startFrom(place));
    },
    takeSaved: (saved, sent) => {
      const { draft } = latest.current;
      if (draft === sent) {
        keeper.dropDraft();
        setState(startFrom(saved));
      } else keep({ ...startFrom(saved), draft });
    },
    showNewer: (newer) => {
      setState({ ...latest.current, newer });
    },
    join: (joined, onto) => {
      keep({ ...startFrom(onto), draft: joinedDraft(latest.current.draft, joined) });
    },
  };
}

/** What was kept here and still differs from what is saved, else what is saved. */
function startHere(place: Place | null, found: KeptDraft<KeptPlace> | null): DraftState {
  if (found === null || !isChanged(found.value.draft, found.value.base)) return startFrom(place);
  return {
    draft: found.value.draft,
    base: found.value.base,
    version: found.baseVersion,
    newer: place !== null && place.version !== found.baseVersion ? place : null,
    foundAt: found.keptAt,
  };
}

function startFrom(place: Place | null): DraftState {
  if (place === null) return { draft: emptyDraft(), base: null, version: null, newer: null, foundAt: null };
  const base = inputOf(place);
  return { draft: draftOf(base), base, version: place.version, newer: null, foundAt: null };
}
