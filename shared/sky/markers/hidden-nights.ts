import { sinDeepestSun } from '../phenomena/deepest-sun.js';
import type { SkyNote } from '../vocabulary.js';
import { type Disappearance, disappearancesAround } from './disappearances.js';
import { nightsWithoutDarkMoment, sameSideNeeded } from './night-crossings.js';
import type { MarkerAtPlace } from './place-year.js';

export interface HiddenNights {
  /** Null where the star does not rise and set. */
  nightsHidden: number | null;
  notes: SkyNote[];
}

/** A pair further apart than this is not one disappearance: the star is hidden all year. */
const LONGEST_PAIR_DAYS = 364;

/** First and last hidden night of a disappearance by its two dates, or null where one of them is missing. */
function hiddenSpan(
  marker: MarkerAtPlace,
  disappearance: Disappearance,
): { from: number; to: number } | null {
  const evening = disappearance.lastSettings.lastEvening.jdUt;
  const morning = disappearance.nextRisings.firstMorning.jdUt;
  if (evening === null || morning === null || morning - evening > LONGEST_PAIR_DAYS) return null;
  // The evening's own night and the night that ends with the morning are both seen.
  return { from: marker.clock.dayOf(evening) + 1, to: marker.clock.dayOf(morning) - 2 };
}

/** The disappearance that the year is about: the first one that ends in it, else the first one that begins in it. */
function disappearanceOfYear(marker: MarkerAtPlace): Disappearance | null {
  const { firstDay, lastDay } = marker.year.civil;
  const inYear = (jdUt: number | null): boolean => {
    if (jdUt === null) return false;
    const day = marker.clock.dayOf(jdUt);
    return day >= firstDay && day <= lastDay;
  };
  const all = disappearancesAround(marker);
  return (
    all.find((one) => inYear(one.nextRisings.firstMorning.jdUt)) ??
    all.find((one) => inYear(one.lastSettings.lastEvening.jdUt)) ??
    null
  );
}

/** True when on more than half of the nights the Sun never sinks to the depth that the crossings ask for. */
function mostlyLight(marker: MarkerAtPlace, nights: readonly number[]): boolean {
  const crossings = marker.star.crossings;
  if (!crossings || nights.length === 0) return false;
  const neededAt = [crossings.rising, crossings.setting].map((crossing) => ({
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
 * is missing, or where they leave no night between them, the nights of the year count on which neither the rising, nor
 * the culmination, nor the setting falls into a dark enough sky; none means that the star never disappears.
 */
export function hiddenNightsOf(marker: MarkerAtPlace): HiddenNights {
  const crossings = marker.star.crossings;
  if (!crossings) return { nightsHidden: null, notes: [] };
  const { firstDay, lastDay } = marker.year.civil;
  const disappearance = disappearanceOfYear(marker);
  const span = disappearance && hiddenSpan(marker, disappearance);
  const nights =
    span && span.to >= span.from
      ? Array.from({ length: span.to - span.from + 1 }, (_, index) => span.from + index)
      : nightsWithoutDarkMoment(marker, [crossings.rising, crossings.setting], firstDay, lastDay);
  const notes: SkyNote[] = [];
  if (nights.length === 0) notes.push('never-disappears');
  if (mostlyLight(marker, nights)) notes.push('lost-in-light-nights');
  return { nightsHidden: nights.length, notes };
}
