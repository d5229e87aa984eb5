import type { PlaceInput } from '#shared/contracts/places.js';
import { differingFields, type PlaceField } from './place-draft.js';

export type Side = 'theirs' | 'mine';
export type Choices = Partial<Record<PlaceField, Side>>;

/** One field in which the newer saved state and my text differ. */
export interface Clash {
  field: PlaceField;
  /** Who changed it since I began. `both`: only the person can say which stays. */
  changedBy: Side | 'both';
}

/**
 * Where two people's states of a place differ. `base` is what I started from; where nobody knows it any more, every
 * difference counts as changed by both.
 */
export function clashesOf(base: PlaceInput | null, theirs: PlaceInput, mine: PlaceInput): Clash[] {
  const differs = differingFields(theirs, mine);
  if (base === null) return differs.map((field) => ({ field, changedBy: 'both' }));
  const iChanged = new Set(differingFields(base, mine));
  const theyChanged = new Set(differingFields(base, theirs));
  return differs.map((field) => ({
    field,
    changedBy:
      iChanged.has(field) && theyChanged.has(field) ? 'both' : iChanged.has(field) ? 'mine' : 'theirs',
  }));
}

/** Where only one of the two changed a field, that one's value is chosen to begin with; both stay in sight. */
export function firstChoices(clashes: readonly Clash[]): Choices {
  const choices: Choices = {};
  for (const { field, changedBy } of clashes) if (changedBy !== 'both') choices[field] = changedBy;
  return choices;
}

/** The state that the choices make; null while a field has no choice yet. */
export function joinStates(
  clashes: readonly Clash[],
  choices: Choices,
  theirs: PlaceInput,
  mine: PlaceInput,
): PlaceInput | null {
  let joined = { ...theirs };
  for (const { field } of clashes) {
    const side = choices[field];
    if (side === undefined) return null;
    joined = { ...joined, [field]: (side === 'mine' ? mine : theirs)[field] };
  }
  return joined;
}
