/** Words of the Moon and Venus; vocabulary.ts hands them on. */

/** The three days of a lunation that people go by. */
export const MOON_EVENTS = ['new', 'first-crescent', 'full'] as const;
export type MoonEvent = (typeof MOON_EVENTS)[number];

/** How the young Moon shows itself on an evening. */
export const CRESCENT_WORDS = ['easy', 'if-air-is-clear', 'not-by-eye'] as const;
export type CrescentWord = (typeof CRESCENT_WORDS)[number];

/** What a lunation's first crescent does at a place. */
export const CRESCENT_OUTCOMES = ['dated', 'stays-too-low', 'behind-skyline', 'sun-never-sets'] as const;
export type CrescentOutcome = (typeof CRESCENT_OUTCOMES)[number];

/** Remarks that stand beside a first crescent. */
export const CRESCENT_NOTES = [
  'only-if-air-is-clear',
  'skyline-hides-it-longer',
  'moon-does-not-set',
  'sun-does-not-rise',
] as const;
export type CrescentNote = (typeof CRESCENT_NOTES)[number];

/** The four turning points of Venus' cycle, in the order in which they come after the inferior conjunction. */
export const VENUS_APPEARANCES = ['morning-first', 'morning-last', 'evening-first', 'evening-last'] as const;
export type VenusAppearance = (typeof VENUS_APPEARANCES)[number];
