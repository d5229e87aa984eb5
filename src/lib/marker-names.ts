import type { MarkerNames } from '#shared/contracts/stars.js';

/** Names of the stars and figures at hand, by key. */
export type NamesByKey = ReadonlyMap<string, Pick<MarkerNames, 'name' | 'designation' | 'hr'>>;

/** How a star or figure is called on screens: its name, else its letter in the constellation, else its number. */
export function markerName(names: Pick<MarkerNames, 'name' | 'designation' | 'hr'>): string {
  if (names.name !== '') return names.name;
  return names.designation === '' ? `HR ${String(names.hr ?? '')}` : names.designation;
}
