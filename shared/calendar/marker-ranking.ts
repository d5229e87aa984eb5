import { isEasyToFind, type MarkerCandidate } from './marker-candidates.js';

/**
 * Which marker falls near a wanted day? The order is by rules that can be said aloud, one after the other:
 * 1. what a calendar should not lean on alone goes behind everything else, with the reason (`caution`);
 * 2. nearness, in steps that are no finer than a sighting scatters;
 * 3. the width of the range, in weeks;
 * 4. a return or a last sight before a last rising or a first setting: those happen in a sky that holds the star anyway,
 *    and observers agree less about them [Schaefer1987];
 * 5. how easy the star is to see: figures and bright stars first, and a star that shows higher before one that must be
 *    caught low over the ground;
 * 6. days away, days of range and brightness as they are, so that the order is the same every time.
 */

/** The wanted days, both included, as day numbers. */
export interface WantedDays {
  from: number;
  to: number;
}

/** A single sighting scatters by about two days [Vogt1920 p. 24]; "on the day" promises no more than that. */
export const NEARNESS_DAYS = { 'on-the-day': 2, close: 5, near: 10, far: 20 } as const;
export const NEARNESS = ['on-the-day', 'close', 'near', 'far'] as const;
export type Nearness = (typeof NEARNESS)[number];

export const EXACTNESS = ['sharp', 'fair', 'wide', 'weak', 'open'] as const;
/** Range within a week, two weeks, three weeks, longer; `open` where an end of it has no date. */
export type Exactness = (typeof EXACTNESS)[number];

export const EASE = ['very-easy', 'easy', 'middling', 'hard'] as const;
export type Ease = (typeof EASE)[number];

export const CAUTIONS = ['never-disappears', 'lost-in-light-nights', 'weak-marker', 'open-range'] as const;
/** Why a marker stands behind the others. */
export type Caution = (typeof CAUTIONS)[number];

export interface RankedMarker extends MarkerCandidate {
  /** Days from the wanted days to the expected day: negative before them, positive after, 0 within. */
  daysAway: number;
  nearness: Nearness;
  /** Days from the early to the late end; null where an end has no date. */
  rangeDays: number | null;
  exactness: Exactness;
  ease: Ease;
  caution: Caution | null;
}

const SHARP_DAYS = 7;
const FAIR_DAYS = 14;
const WIDE_DAYS = 21;
const VERY_EASY_MAG = 0.5;
const EASY_CLASS_MAG = 1.65;
/** Under this altitude a star is caught in the thickest air, and any bush hides it. */
const LOW_DEG = 2;

/** Days from the wanted days to a day: negative before them, positive after, 0 within. */
export function daysAwayOf(dayNumber: number, wanted: WantedDays): number {
  if (dayNumber < wanted.from) return dayNumber - wanted.from;
  return Math.max(0, dayNumber - wanted.to);
}

/** The step of nearness, or null beyond the last one. */
export function nearnessOf(daysAway: number): Nearness | null {
  return NEARNESS.find((step) => Math.abs(daysAway) <= NEARNESS_DAYS[step]) ?? null;
}

export function easeOf(candidate: Pick<MarkerCandidate, 'vMag' | 'isFigure'>): Ease {
  if (candidate.vMag < VERY_EASY_MAG) return 'very-easy';
  if (candidate.vMag < EASY_CLASS_MAG) return 'easy';
  return isEasyToFind(candidate) ? 'middling' : 'hard';
}

/** The candidates within reach of the wanted days, best first. */
export function rankMarkers(candidates: readonly MarkerCandidate[], wanted: WantedDays): RankedMarker[] {
  return candidates
    .flatMap((candidate) => {
      const daysAway = daysAwayOf(candidate.occurrence.expected.dayNumber, wanted);
      const nearness = nearnessOf(daysAway);
      return nearness === null ? [] : [rankedOf(candidate, daysAway, nearness)];
    })
    .sort(inOrder);
}

/** The nearest marker before and after the wanted days that is easy to find and needs no caution. */
export function nearestServing(
  candidates: readonly MarkerCandidate[],
  wanted: WantedDays,
): { before: MarkerCandidate | null; after: MarkerCandidate | null } {
  let before: MarkerCandidate | null = null;
  let after: MarkerCandidate | null = null;
  for (const candidate of candidates) {
    if (!isEasyToFind(candidate) || cautionOf(candidate, rangeDaysOf(candidate)) !== null) continue;
    const day = candidate.occurrence.expected.dayNumber;
    if (day <= wanted.to && (before === null || day > before.occurrence.expected.dayNumber))
      before = candidate;
    if (day >= wanted.from && (after === null || day < after.occurrence.expected.dayNumber))
      after = candidate;
  }
  return { before, after };
}

function rankedOf(candidate: MarkerCandidate, daysAway: number, nearness: Nearness): RankedMarker {
  const rangeDays = rangeDaysOf(candidate);
  return {
    ...candidate,
    daysAway,
    nearness,
    rangeDays,
    exactness: exactnessOf(rangeDays),
    ease: easeOf(candidate),
    caution: cautionOf(candidate, rangeDays),
  };
}

function rangeDaysOf({ occurrence: { early, late } }: MarkerCandidate): number | null {
  return early && late && late.dayNumber - early.dayNumber;
}

function exactnessOf(rangeDays: number | null): Exactness {
  if (rangeDays === null) return 'open';
  if (rangeDays <= SHARP_DAYS) return 'sharp';
  if (rangeDays <= FAIR_DAYS) return 'fair';
  return rangeDays <= WIDE_DAYS ? 'wide' : 'weak';
}

/** The first reason that weighs: a star that is never away is not missed, so nobody notices its return. */
function cautionOf(candidate: MarkerCandidate, rangeDays: number | null): Caution | null {
  const { notes } = candidate;
  const isBesideHiding = isEndOfSight(candidate);
  if (isBesideHiding && notes.includes('never-disappears')) return 'never-disappears';
  if (isBesideHiding && notes.includes('lost-in-light-nights')) return 'lost-in-light-nights';
  if (rangeDays === null) return 'open-range';
  return rangeDays > WIDE_DAYS ? 'weak-marker' : null;
}

function inOrder(a: RankedMarker, b: RankedMarker): number {
  return (
    Number(a.caution !== null) - Number(b.caution !== null) ||
    NEARNESS.indexOf(a.nearness) - NEARNESS.indexOf(b.nearness) ||
    EXACTNESS.indexOf(a.exactness) - EXACTNESS.indexOf(b.exactness) ||
    Number(!isEndOfSight(a)) - Number(!isEndOfSight(b)) ||
    EASE.indexOf(a.ease) - EASE.indexOf(b.ease) ||
    Number(isLow(a)) - Number(isLow(b)) ||
    Math.abs(a.daysAway) - Math.abs(b.daysAway) ||
    (a.rangeDays ?? 0) - (b.rangeDays ?? 0) ||
    a.vMag - b.vMag ||
    a.markerKey.localeCompare(b.markerKey)
  );
}

/** True for the two days between which a star is out of sight. */
function isEndOfSight({ phenomenon }: MarkerCandidate): boolean {
  return phenomenon === 'heliacal-rising' || phenomenon === 'heliacal-setting';
}

function isLow({ occurrence }: RankedMarker): boolean {
  return occurrence.expected.starAltitudeDeg < LOW_DEG;
}
