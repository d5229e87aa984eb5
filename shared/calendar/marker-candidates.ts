import type { MarkerYear, Occurrence, Phenomenon, SkyNote } from '#shared/sky/index.js';

/** One dated phenomenon of one marker: what a calendar could go by. */
export interface MarkerCandidate {
  markerKey: string;
  phenomenon: Phenomenon;
  /** Brightness of the star that carries the date. */
  vMag: number;
  /** A figure is found by its shape, also where its stars are faint. */
  isFigure: boolean;
  occurrence: Occurrence;
  /** Counted in the civil year of the marker's dates: a day that comes twice in it comes as 1 and as 2. */
  occurrenceNumber: number;
  /** Remarks about the star and about this day. */
  notes: readonly SkyNote[];
}

/** What the ranking needs to know of a marker besides its year. */
export interface MarkerSight {
  vMag: number;
  isFigure: boolean;
}

/** Markers that are easy to find and have no day to offer, counted by the reason. */
export interface WithoutDate {
  neverSets: number;
  neverClearsSkyline: number;
  /** At least one of the four phenomena meets no dark enough sky. */
  neverDarkEnough: number;
}

/** To this magnitude a star is found without a chart: the first two classes of the threshold rules. */
export const EASY_MAG = 2.5;

export function isEasyToFind({ vMag, isFigure }: MarkerSight): boolean {
  return isFigure || vMag <= EASY_MAG;
}

/** Every dated phenomenon of a marker's year. */
export function candidatesOf(markerYear: MarkerYear, sight: MarkerSight): MarkerCandidate[] {
  return Object.values(markerYear.phenomena).flatMap(({ phenomenon, occurrences }) =>
    occurrences.map((occurrence, index) => ({
      markerKey: markerYear.markerKey,
      phenomenon,
      vMag: sight.vMag,
      isFigure: sight.isFigure,
      occurrence,
      occurrenceNumber: index + 1,
      notes: [...new Set([...markerYear.notes, ...occurrence.notes])],
    })),
  );
}

/** Counts the easy markers of a year that offer nothing, so that an empty answer can say why. */
export function countWithoutDate(
  markers: Iterable<{ markerYear: MarkerYear; sight: MarkerSight }>,
): WithoutDate {
  const counts: WithoutDate = { neverSets: 0, neverClearsSkyline: 0, neverDarkEnough: 0 };
  for (const { markerYear, sight } of markers) {
    if (!isEasyToFind(sight)) continue;
    if (markerYear.outcome === 'never-sets') counts.neverSets += 1;
    else if (markerYear.outcome === 'never-clears-skyline') counts.neverClearsSkyline += 1;
    else if (Object.values(markerYear.phenomena).some(({ outcome }) => outcome === 'never-dark-enough'))
      counts.neverDarkEnough += 1;
  }
  return counts;
}
