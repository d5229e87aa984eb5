import { useState } from 'react';
import type { Place, PlaceInput } from '#shared/contracts/places.js';
import { useKeptDraft } from '#src/lib/kept-draft.js';
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

export interface PlaceDraftState extends DraftState {
  changed: boolean;
  keptAt: Date | null;
  change: (patch: Partial<PlaceDraft>) => void;
  /** Back to what is saved. */
  startOver: () => void;
  /** After saving: what came back is the new start. */
  takeSaved: (place: Place) => void;
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
  const [state, setState] = useState<DraftState>(() => {
    const { found } = keeper;
    if (found === null) return startFrom(place);
    return {
      draft: found.value.draft,
      base: found.value.base,
      version: found.baseVersion,
      newer: place !== null && place.version !== found.baseVersion ? place : null,
      foundAt: found.keptAt,
    };
  });
  const changed = isChanged(state.draft, state.base);

  if (place !== null && state.version !== null && place.version > state.version && state.newer === null) {
    setState(changed ? { ...state, newer: place } : startFrom(place));
  }

  const keep = (next: DraftState) => {
    setState(next);
    keeper.keepDraft({ draft: next.draft, base: next.base }, next.version);
  };
  return {
    ...state,
    changed,
    keptAt: keeper.keptAt,
    change: (patch) => {
      keep({ ...state, draft: { ...state.draft, ...patch }, foundAt: null });
    },
    startOver: () => {
      keeper.dropDraft();
      setState(startFrom(place));
    },
    takeSaved: (saved) => {
      keeper.dropDraft();
      setState(startFrom(saved));
    },
    showNewer: (newer) => {
      setState({ ...state, newer });
    },
    join: (joined, onto) => {
      keep({
        draft: joinedDraft(state.draft, joined),
        base: inputOf(onto),
        version: onto.version,
        newer: null,
        foundAt: null,
      });
    },
  };
}

function startFrom(place: Place | null): DraftState {
  if (place === null) return { draft: emptyDraft(), base: null, version: null, newer: null, foundAt: null };
  const base = inputOf(place);
  return { draft: draftOf(base), base, version: place.version, newer: null, foundAt: null };
}
