import type { MarkerNames } from '#shared/contracts/stars.js';

/** How a star or figure is called on screens: its name, else its letter in the constellation, else its number. */
export function markerName(names: Pick<MarkerNames, 'name' | 'designation' | 'hr'>): string {
  if (names.name !== '') return names.name;
  return names.designation === '' ? `HR ${names.hr}` : names.designation;
}
