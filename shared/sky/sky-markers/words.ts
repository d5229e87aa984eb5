/** Words of the markers beyond a star's first and last days. The door of the core and vocabulary.ts hand them on. */

export const SKY_MARKER_KINDS = [
  'culmination',
  'star-altitude',
  'due-meridian',
  'about-pole',
  'sun-season',
  'sun-azimuth',
  'noon-sun',
  'zenith-sun',
  'dark-night',
  'moon-phase',
  'moon-counted',
  'venus-appearance',
] as const;
export type SkyMarkerKind = (typeof SKY_MARKER_KINDS)[number];

/** What a marker of the sky does at a place in a civil year. */
export const SKY_MARKER_OUTCOMES = ['dated', 'none-in-this-year', 'never-here'] as const;
export type SkyMarkerOutcome = (typeof SKY_MARKER_OUTCOMES)[number];

/** Why there is no date. */
export const SKY_MARKER_REASONS = [
  'not-in-this-year',
  'star-below-skyline',
  'star-passes-other-side',
  'altitude-not-reached',
  'too-light',
  'azimuth-not-reached',
  'noon-sun-always-clears',
  'noon-sun-never-clears',
  'sun-never-overhead',
  'nights-always-dark',
  'nights-never-dark',
  'crescent-not-seen',
  'star-gives-no-sign',
] as const;
export type SkyMarkerReason = (typeof SKY_MARKER_REASONS)[number];

/** The part of the civil day to which a marker's days belong: "morning of", "evening of", "night of" or just the day. */
export const SKY_MARKER_TIMES = ['morning', 'noon', 'evening', 'night', 'day'] as const;
export type SkyMarkerTime = (typeof SKY_MARKER_TIMES)[number];

export const TWILIGHTS = ['dusk', 'dawn'] as const;
export type Twilight = (typeof TWILIGHTS)[number];

/** Depths of the Sun that may mean "dusk" and "dawn": 6 civil, 12 nautical, 18 astronomical twilight. */
export const TWILIGHT_DEPTHS_DEG = [6, 9, 12, 18] as const;
export type TwilightDepthDeg = (typeof TWILIGHT_DEPTHS_DEG)[number];

/**
 * Depths that may mean a dark night: the brightest stars show (end of civil twilight); all but the faintest show
 * (nautical); the Milky Way shows overhead; no twilight is left anywhere (astronomical). 15° is common practice among
 * people who watch the Milky Way, without a published limit.
 */
export const NIGHT_DEPTHS_DEG = [6, 12, 15, 18] as const;
export type NightDepthDeg = (typeof NIGHT_DEPTHS_DEG)[number];

/** The last night before the light nights, and the first one after them. */
export const DARK_NIGHT_ENDS = ['last', 'first'] as const;
export type DarkNightEnd = (typeof DARK_NIGHT_ENDS)[number];

/** Quarters of a star's circle about the pole, as seen by somebody who faces the pole. */
export const POLE_POSITIONS = ['lowest', 'highest', 'left', 'right'] as const;
export type PolePosition = (typeof POLE_POSITIONS)[number];

export const FACINGS = ['south', 'north'] as const;
export type Facing = (typeof FACINGS)[number];

/** Whether a star climbs in the east or sinks in the west when it has the altitude. */
export const SKY_SIDES = ['east', 'west'] as const;
export type SkySide = (typeof SKY_SIDES)[number];

export const SUN_SEASONS = [
  'march-equinox',
  'june-solstice',
  'september-equinox',
  'december-solstice',
] as const;
export type SunSeason = (typeof SUN_SEASONS)[number];

export const SUN_EVENTS = ['sunrise', 'sunset'] as const;
export type SunEvent = (typeof SUN_EVENTS)[number];

/** The first noon at which the Sun shows over the ridge again, and the last one before it stays behind it. */
export const NOON_SUN_PASSAGES = ['back', 'gone'] as const;
export type NoonSunPassage = (typeof NOON_SUN_PASSAGES)[number];

/** Clocks that people can keep: minutes from sunset or sunrise, or the hour by local mean sun. */
export const SKY_CLOCKS = ['after-sunset', 'before-sunrise', 'solar-hour'] as const;
export type SkyClock = (typeof SKY_CLOCKS)[number];

/** A year has so many Moons of a kind at most; so far may be counted from a star's day. */
export const MOON_COUNT = { min: 1, max: 13 } as const;

/** Limits of a marker's parameters. */
export const STAR_ALTITUDE_DEG = { min: 5, max: 85 } as const;
export const CLOCK_MINUTES = { min: 15, max: 240 } as const;
/** Hours of local mean solar time, in quarters. */
export const SOLAR_HOUR = { min: 0, max: 23.75, step: 0.25 } as const;
/** Length of a skyline point's name. */
export const POINT_NAME_MAX = 80;
