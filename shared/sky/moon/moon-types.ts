import type { CivilDay } from '../types.js';
import type { Clarity, CrescentNote, CrescentOutcome, CrescentWord, MoonEvent } from '../vocabulary.js';

/** How the skyline meets the young Moon: it stands over it, sinks behind it before the best time, or never shows. */
export type CrescentOnSkyline = 'over' | 'sinks-early' | 'behind';

/** The young Moon on one evening at a place. */
export interface CrescentEvening extends CivilDay {
  word: CrescentWord;
  /** Sunset plus four ninths of the lag, Julian Day (UT); null where there is no evening to look on. */
  bestJdUt: number | null;
  /** Null where the Sun does not set, or does not rise. */
  sunsetJdUt: number | null;
  /** Null where the Moon does not set in the night. */
  moonsetJdUt: number | null;
  /** The Moon's true place at the best time, seen from the place; null without one. */
  moonAltitudeDeg: number | null;
  moonAzimuthDeg: number | null;
  skyline: CrescentOnSkyline | null;
  yallopQ: number | null;
  odehV: number | null;
}

/** The first crescent of a lunation: the expected evening and the two ends of its range. */
export interface FirstCrescent {
  outcome: CrescentOutcome;
  expected: CrescentEvening | null;
  early: CrescentEvening | null;
  late: CivilDay | null;
  clarity: Clarity;
  notes: readonly CrescentNote[];
  /** The evenings that were looked at, from the new Moon on. */
  evenings: readonly CrescentEvening[];
}

export interface MoonInstant extends CivilDay {
  jdUt: number;
}

/** One lunation at a place, from its new Moon. */
export interface Lunation {
  newMoon: MoonInstant;
  firstCrescent: FirstCrescent;
  fullMoon: MoonInstant;
}

/** The lunations of which one of the three days falls in a civil year. */
export interface MoonYear {
  year: number;
  firstDayNumber: number;
  lastDayNumber: number;
  lunations: readonly Lunation[];
  /** Keys of SOURCES.md. */
  sourceKeys: readonly string[];
  engineVersion: string;
}

/** A day of a Moon with its range; for new and full Moon the three are one. */
export interface MoonDay {
  event: MoonEvent;
  expected: CivilDay;
  early: CivilDay;
  late: CivilDay;
  notes: readonly CrescentNote[];
}
