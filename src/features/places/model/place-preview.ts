import type { PlaceInput } from '#shared/contracts/places.js';
import { readDraft, type PlaceDraft } from './place-draft.js';

/**
 * What can be computed of a draft already: everything but its name, its height and its clock moves dates, so these
 * may still be missing. Null while coordinates or the skyline table cannot be read.
 */
export function previewOf(draft: PlaceDraft): PlaceInput | null {
  const reading = readDraft({
    ...draft,
    name: draft.name.trim() === '' ? '–' : draft.name,
    elevation: draft.elevation.trim() === '' ? '0' : draft.elevation,
    timeZone: draft.timeZone === '' ? 'UTC' : draft.timeZone,
  });
  return reading.ok ? reading.input : null;
}
