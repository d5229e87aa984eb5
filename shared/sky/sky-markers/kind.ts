import type { PlaceYear } from '../markers/place-year.js';
import { labelledDay } from '../time/civil-day.js';
import type { Figure, Site } from '../types.js';
import type { DailySample, Passage } from './passages.js';
import type { SkyMarkerDay, SkyMarkerOccurrence, SpecOf } from './types.js';
import type { SkyMarkerKind, SkyMarkerOutcome, SkyMarkerReason } from './words.js';

/** A place in a prepared year, with its skyline as it was given and the figures that people there know. */
export interface SkyMarkerPlace extends PlaceYear {
  site: Site;
  /** A community's own figures; their keys stand beside the built-in ones. */
  figures: readonly Figure[];
}

/** What a kind finds out. */
export interface SkyMarkerFindings {
  outcome: SkyMarkerOutcome;
  reason: SkyMarkerReason | null;
  occurrences: SkyMarkerOccurrence[];
  /** By how much the eye, the air or the day's length may miss, degrees. */
  toleranceDeg: number;
}

/** One kind of marker: a file of its own and a line in `kinds.ts`. */
export interface SkyMarkerKindRules<K extends SkyMarkerKind> {
  /** Throws a SkyRangeError for a parameter that is out of range; `field` is where the spec stands. */
  check(spec: SpecOf<K>, field: string, figures: readonly Figure[]): void;
  compute(spec: SpecOf<K>, place: SkyMarkerPlace): SkyMarkerFindings;
  /** Key of SOURCES.md. */
  sourceKey: string;
  /** Code of the sentence that says why the range is so wide. */
  rangeReason: string;
}

export type AnyKindRules = { [K in SkyMarkerKind]: SkyMarkerKindRules<K> };

/** A range longer than this makes a weak marker, as with stars. */
const WEAK_RANGE_DAYS = 21;
/** Days around the civil year that are looked at, so that a range is whole and a turning day is met. */
const MARGIN_DAYS = 60;

/** Solar days to look at, in order. */
export function solarDaysOf({ year }: PlaceYear): number[] {
  const first = year.civil.firstDay - MARGIN_DAYS;
  const count = year.civil.lastDay + MARGIN_DAYS - first + 1;
  return Array.from({ length: count }, (_, index) => first + index);
}

export function isInYear({ year, clock }: PlaceYear, jdUt: number): boolean {
  const day = clock.dayOf(jdUt);
  return day >= year.civil.firstDay && day <= year.civil.lastDay;
}

/** Where something stands on its day, degrees. */
export interface Standing {
  azimuthDeg: number | null;
  altitudeDeg: number | null;
}

export function skyMarkerDay(place: PlaceYear, jdUt: number, standing: Standing): SkyMarkerDay {
  return { ...labelledDay(place.clock.dayOf(jdUt)), jdUt, ...standing };
}

/** An occurrence from a passage through daily samples. */
export function occurrenceOf(
  place: PlaceYear,
  samples: readonly (DailySample | null)[],
  passage: Passage,
  standingAt: (jdUt: number) => Standing,
): SkyMarkerOccurrence[] {
  const jdAt = (index: number | null): number | null =>
    index === null ? null : (samples[index]?.jdUt ?? null);
  const expectedJd = jdAt(passage.expected);
  if (expectedJd === null || !isInYear(place, expectedJd)) return [];
  const dayAt = (jdUt: number | null) => (jdUt === null ? null : labelledDay(place.clock.dayOf(jdUt)));
  const early = dayAt(jdAt(passage.early));
  const late = dayAt(jdAt(passage.late));
  const expected = skyMarkerDay(place, expectedJd, standingAt(expectedJd));
  const rangeDays = (late ?? expected).dayNumber - (early ?? expected).dayNumber;
  const notes: SkyMarkerOccurrence['notes'] = [
    ...(rangeDays > WEAK_RANGE_DAYS ? (['weak-marker'] as const) : []),
    ...(passage.turns ? (['standstill'] as const) : []),
  ];
  return [{ expected, early, late, notes }];
}

export function dated(occurrences: SkyMarkerOccurrence[], toleranceDeg: number): SkyMarkerFindings {
  return occurrences.length > 0
    ? { outcome: 'dated', reason: null, occurrences, toleranceDeg }
    : undated('not-in-this-year', toleranceDeg);
}

/** No date: for want of one in this civil year, or because the place never has it. */
export function undated(reason: SkyMarkerReason, toleranceDeg: number): SkyMarkerFindings {
  const outcome = reason === 'not-in-this-year' ? 'none-in-this-year' : 'never-here';
  return { outcome, reason, occurrences: [], toleranceDeg };
}
