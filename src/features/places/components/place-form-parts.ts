import type { PlaceDraft, PlaceField } from '../model/place-draft.js';
import type { DraftChange } from './use-place-draft.js';

/** What every part of the form gets: the draft, how to change it, and what stands at a field. */
export interface FieldPart {
  draft: PlaceDraft;
  change: (patch: DraftChange) => void;
  /** The sentence at a field that was left or refused; undefined while all is well. */
  problem: (field: PlaceField) => string | undefined;
  /** A field was left: from now on it says what is not accepted. */
  touch: (field: PlaceField) => void;
}
