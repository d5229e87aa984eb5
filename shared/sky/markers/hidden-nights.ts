import { sinDeepestSun } from '../phenomena/deepest-sun.js';
import type { SkylineCrossing } from '../phenomena/skyline-crossing.js';
import type { Phenomenon, SkyNote } from '../vocabulary.js';
import { RAD_PER_DEG } from '../units/angle.js';
import { CLARITY_SHIFT_DEG } from '../visibility/clarity.js';
import { Disappearances } from './disappearances.js';
import { nightsWithoutDarkMoment, sameSideNeeded } from './night-crossings.js';
import type { MarkerAtPlace } from './place-year.js';

export interface HiddenNights {
  /** Null where the star does not rise and set. */
  nightsHidden: number | null;
  notes: SkyNote[];
}

/** A pair further apart than this is not one disappearance: the star is hidden all year. */
const LONGEST_PAIR_DAYS = 364;

/** First and last hidden night by the dates of the year's disappearance, or null where one of them is missing. */
function hiddenSpan(
  marker: MarkerAtPlace,
  disappearances: Disappearances,
): { from: number; to: number } | null {
  const index =
    indexInYear(marker, disappearances, 'heliacal-rising') ??
    indexInYear(marker, disappearances, 'heliacal-setting');
  if (index === null) return null;
  const evening = disappearances.expected(index, 'heliacal-setting').jdUt;
  const morning = disappearances.expected(index, 'heliacal-rising').jdUt;
  if (evening === null || morning === null || morning - evening > LONGEST_PAIR_DAYS) return null;
  // The evening's own night and the night that ends with the morning are both seen.
  return { from: marker.clock.dayOf(evening) + 1, to: marker.clock.dayOf(morning) - 2 };
}

/** The first disappearance with this phenomenon in the civil year. */
function indexInYear(
  marker: MarkerAtPlace,
  disappearances: Disappearances,
  phenomenon: Phenomenon,
): number | null {
  const { firstDay, lastDay } = marker.year.civil;
  for (let index = disappearances.first; index <= disappearances.last; index += 1) {
    const { jdUt } = disappearances.expected(index, phenomenon);
    const day = jdUt === null ? Number.NaN : marker.clock.dayOf(jdUt);
    if (day >= firstDay && day <= lastDay) return index;
  }
  return null;
}

/** True where even the lightest night of the year is dark enough in hazy air: most places, most stars. */
function hasNoLightNights({ year, ground, threshold, settings }: MarkerAtPlace): boolean {
  const lightestSine =
    ground.latitude.cos * year.cosObliquity - Math.abs(ground.latitude.sin) * year.sinObliquity;
  const mostDeg = threshold.sameSideDeg + settings.sameSideShiftDeg + CLARITY_SHIFT_DEG.hazy;
  return lightestSine >= Math.sin(Math.min(90, mostDeg) * RAD_PER_DEG);
}

/** True when on more than half of the nights the Sun never sinks to the depth that the crossings ask for. */
function mostlyLight(
  marker: MarkerAtPlace,
  crossings: readonly SkylineCrossing[],
  nights: readonly number[],
): boolean {
  if (nights.length === 0 || hasNoLightNights(marker)) return false;
  const neededAt = crossings.map((crossing) => ({
    needed: sameSideNeeded(marker, crossing),
    middle: crossing.highestRad + Math.PI,
  }));
  const light = nights.filter((night) => {
    const least = Math.min(...neededAt.map(({ needed, middle }) => needed(night, middle)));
    return sinDeepestSun(marker.year, marker.ground, night) < least;
  });
  return light.length * 2 > nights.length;
}

/**
 * How many nights the star is hidden. With both dates of a disappearance: the nights between them. Where one of the two
 * is missing, or where they leave no night between them, the nights of the year count on which neither
 * rising, culmination and setting nor the Sun's deepest moment show the star in a dark enough sky; none means that it
 * never disappears.
 */
export function hiddenNightsOf(marker: MarkerAtPlace): HiddenNights {
  const crossings = marker.star.crossings;
  if (!crossings) return { nightsHidden: null, notes: [] };
  const { firstDay, lastDay } = marker.year.civil;
  const both = [crossings.rising, crossings.setting];
  const span = hiddenSpan(marker, new Disappearances(marker, crossings));
  const nights =
    span && span.to >= span.from
      ? Array.from({ length: span.to - span.from + 1 }, (_, index) => span.from + index)
      : nightsWithoutDarkMoment(marker, firstDay, lastDay);
  const notes: SkyNote[] = [];
  if (nights.length === 0) notes.push('never-disappears');
  if (mostlyLight(marker, both, nights)) notes.push('lost-in-light-nights');
  return { nightsHidden: nights.length, notes };
}
