import { crossingAtDeepest } from '../phenomena/dark-arc.js';
import type { SkylineCrossing } from '../phenomena/skyline-crossing.js';
import type { StripSegment } from '../types.js';
import type { NightState } from '../vocabulary.js';
import { Disappearances } from './disappearances.js';
import type { ExpectedCrossing } from './expected-crossing.js';
import { seenHighUp } from './night-crossings.js';
import type { MarkerAtPlace } from './place-year.js';

/** The nights in which a rising (or a setting) is seen; both ends belong to it. */
interface SeenNights {
  from: number;
  to: number;
}

/** One disappearance in nights: the settings before it, the risings after it, and the gap between them. */
interface Cycle {
  settings: SeenNights | null;
  risings: SeenNights | null;
  hidden: SeenNights | null;
}

/**
 * The nights of an arc from its two dates. Where one date is missing, the crossing is seen on the other side of the
 * arc's deepest point only; where both are, not at all.
 */
function seenNights(
  marker: MarkerAtPlace,
  crossing: SkylineCrossing,
  firstMorning: ExpectedCrossing,
  lastEvening: ExpectedCrossing,
): SeenNights | null {
  if (firstMorning.jdUt === null && lastEvening.jdUt === null) return null;
  const deepest = crossingAtDeepest(marker.year, crossing, firstMorning.highestRad);
  return {
    from: marker.clock.nightOf(firstMorning.jdUt ?? deepest),
    to: marker.clock.nightOf(lastEvening.jdUt ?? deepest),
  };
}

function cycleOf(
  marker: MarkerAtPlace,
  crossings: { rising: SkylineCrossing; setting: SkylineCrossing },
  disappearances: Disappearances,
  index: number,
): Cycle {
  const lastEvening = disappearances.expected(index, 'heliacal-setting');
  const firstMorning = disappearances.expected(index, 'heliacal-rising');
  const firstSetting = disappearances.expected(index, 'cosmical-setting');
  const lastRising = disappearances.expected(index, 'acronychal-rising');
  return {
    settings: seenNights(marker, crossings.setting, firstSetting, lastEvening),
    risings: seenNights(marker, crossings.rising, firstMorning, lastRising),
    hidden:
      lastEvening.jdUt === null || firstMorning.jdUt === null
        ? null
        : {
            from: marker.clock.nightOf(lastEvening.jdUt) + 1,
            to: marker.clock.nightOf(firstMorning.jdUt) - 1,
          },
  };
}

function cyclesOf(
  marker: MarkerAtPlace,
  crossings: { rising: SkylineCrossing; setting: SkylineCrossing },
): Cycle[] {
  const disappearances = new Disappearances(marker, crossings);
  const cycles: Cycle[] = [];
  for (let index = disappearances.first; index <= disappearances.last; index += 1) {
    cycles.push(cycleOf(marker, crossings, disappearances, index));
  }
  return cycles;
}

function holds(nights: SeenNights | null | undefined, night: number): boolean {
  return nights !== null && nights !== undefined && night >= nights.from && night <= nights.to;
}

function stateOf(night: number, cycles: readonly Cycle[], highUp: boolean): NightState {
  if (cycles.some((cycle) => holds(cycle.hidden, night))) return 'hidden';
  if (cycles.some((cycle) => holds(cycle.settings, night) && holds(cycle.risings, night)))
    return 'dusk-and-dawn';
  const rises = cycles.some((cycle) => holds(cycle.risings, night));
  const sets = cycles.some((cycle) => holds(cycle.settings, night));
  if (rises && sets) return 'rises-and-sets-in-night';
  if (rises) return 'before-dawn';
  if (sets) return 'after-dusk';
  // Between the last evening rising and the first morning setting the star is up all night, and always where it never
  // sets, unless the night is too light even for a star high in the sky.
  return highUp ? 'all-night' : 'hidden';
}

/** The states of all nights of the prepared civil year, joined into runs. */
export function yearStripOf(marker: MarkerAtPlace): StripSegment[] {
  const { firstDay, lastDay } = marker.year.civil;
  const { outcome, crossings } = marker.star;
  if (outcome === 'never-clears-skyline') {
    return [{ state: 'hidden', fromDayNumber: firstDay, toDayNumber: lastDay }];
  }
  const seen = seenHighUp(marker, firstDay, lastDay);
  const cycles = crossings ? cyclesOf(marker, crossings) : [];
  const segments: StripSegment[] = [];
  for (let night = firstDay; night <= lastDay; night += 1) {
    const state = stateOf(night, cycles, seen[night - firstDay] === 1);
    const last = segments.at(-1);
    if (last?.state === state) last.toDayNumber = night;
    else segments.push({ state, fromDayNumber: night, toDayNumber: night });
  }
  return segments;
}
