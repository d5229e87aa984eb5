/** The closed lists of words that the core answers with. Sentences are made from them elsewhere. */

export const PHENOMENA = [
  'heliacal-rising',
  'cosmical-setting',
  'acronychal-rising',
  'heliacal-setting',
] as const;
export type Phenomenon = (typeof PHENOMENA)[number];

/** What a star does at a place, whatever the Sun does. */
export const STAR_OUTCOMES = ['rises-and-sets', 'never-sets', 'never-clears-skyline'] as const;
export type StarOutcome = (typeof STAR_OUTCOMES)[number];

/** Why a star never clears the skyline. */
export const STAR_OUTCOME_DETAILS = ['never-rises', 'below-skyline'] as const;
export type StarOutcomeDetail = (typeof STAR_OUTCOME_DETAILS)[number];

/** What one phenomenon does in one civil year. */
export const PHENOMENON_OUTCOMES = ['dated', 'none-in-this-year', 'never-dark-enough'] as const;
export type PhenomenonOutcome = (typeof PHENOMENON_OUTCOMES)[number];

/** Remarks that stand beside dates. */
export const SKY_NOTES = [
  'never-disappears',
  'weak-marker',
  'lost-in-light-nights',
  'threshold-extrapolated',
  'standstill',
] as const;
export type SkyNote = (typeof SKY_NOTES)[number];

export const THRESHOLD_SETS = ['three-class', 'linear-magnitude', 'azimuth-difference'] as const;
export type ThresholdSetId = (typeof THRESHOLD_SETS)[number];

/** Which rule joins the threshold to the skyline; see SOURCES.md. */
export const SKYLINE_RULES = ['depth-at-crossing', 'altitude-difference'] as const;
export type SkylineRule = (typeof SKYLINE_RULES)[number];

/** How bright a patch of sky without a star of its own is taken to be; see visibility/patch-classes.ts. */
export const PATCH_CLASSES = ['third-magnitude', 'faint', 'full-night'] as const;
export type PatchClass = (typeof PATCH_CLASSES)[number];

/** How clear the air usually is in a month. */
export const CLARITIES = ['clear', 'ordinary', 'hazy'] as const;
export type Clarity = (typeof CLARITIES)[number];

/** What a star does on one night; the six states of a year's strip. */
export const NIGHT_STATES = [
  'hidden',
  'before-dawn',
  'all-night',
  'rises-and-sets-in-night',
  'after-dusk',
  'dusk-and-dawn',
] as const;
export type NightState = (typeof NIGHT_STATES)[number];

/** The two ends of a night at which people watch for stars that come and go. */
export const WATCH_SIDES = ['dawn', 'dusk'] as const;
export type WatchSide = (typeof WATCH_SIDES)[number];

/** What the Sun does around the watch. */
export const SUN_COURSES = ['sets-and-rises', 'stays-up', 'stays-down'] as const;
export type SunCourse = (typeof SUN_COURSES)[number];

/** What a watch brings: the star is seen, or why it is not. */
export const LOOK_OUTCOMES = ['seen', 'too-light', 'not-up', 'never-clears-skyline', 'sun-stays-up'] as const;
export type LookOutcome = (typeof LOOK_OUTCOMES)[number];

/** What a watch is drawn by: the model of visibility, set by the expected day, or the rule of the dates. */
export const SIGHT_RULES = ['model', 'dates'] as const;
export type SightRuleWord = (typeof SIGHT_RULES)[number];

/** Why a watch goes by the rule of the dates: no day to set the model by, the star not up in that day's watch, or an offset out of bounds. */
export const SIGHT_FALLBACKS = ['no-day', 'not-in-watch', 'too-far'] as const;
export type SightFallback = (typeof SIGHT_FALLBACKS)[number];

export const NAKED_EYE_PLANETS = ['mercury', 'venus', 'mars', 'jupiter', 'saturn'] as const;
export type NakedEyePlanet = (typeof NAKED_EYE_PLANETS)[number];

export const MOON_SHAPES = [
  'new',
  'waxing-crescent',
  'first-quarter',
  'waxing-gibbous',
  'full',
  'waning-gibbous',
  'last-quarter',
  'waning-crescent',
] as const;
export type MoonShape = (typeof MOON_SHAPES)[number];

/** How much the Moon takes from the view of the star. */
export const MOONLIGHTS = ['none', 'some', 'strong'] as const;
export type Moonlight = (typeof MOONLIGHTS)[number];

/** The sixteen directions of a compass card, clockwise from north. */
export const COMPASS_POINTS = [
  'n',
  'nne',
  'ne',
  'ene',
  'e',
  'ese',
  'se',
  'sse',
  's',
  'ssw',
  'sw',
  'wsw',
  'w',
  'wnw',
  'nw',
  'nnw',
] as const;
export type CompassPoint = (typeof COMPASS_POINTS)[number];

/** Years the engine offers, astronomical numbering (0 = 1 BC). */
export const FIRST_YEAR = -3000;
export const LAST_YEAR = 3000;

/** Version of the method; it changes whenever a date could change. */
export const ENGINE_VERSION = '1.2.0';

export * from './moon/words.js';
export { skyMarkerTimeOf } from './sky-markers/time-of.js';
export * from './sky-markers/words.js';
