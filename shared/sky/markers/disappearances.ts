import { highestTravelRad } from '../phenomena/ecliptic-zenith.js';
import { PHENOMENON_FACTS } from '../phenomena/phenomenon-facts.js';
import { TAU, wrapTau } from '../units/angle.js';
import { type ExpectedCrossing, expectedInTurn } from './expected-crossing.js';
import type { MarkerAtPlace } from './place-year.js';

/** The four expected crossings around one disappearance of the star behind the Sun. */
export interface Disappearance {
  /** The setting arc that ends with this disappearance. */
  lastSettings: { firstMorning: ExpectedCrossing; lastEvening: ExpectedCrossing };
  /** The rising arc that begins after it. */
  nextRisings: { firstMorning: ExpectedCrossing; lastEvening: ExpectedCrossing };
}

/**
 * The disappearances around the prepared year, in order. Rising and setting arcs are paired by following the ecliptic
 * continuously from the star's rising to its setting; a difference modulo a year cannot tell a star that hides for a
 * month from one that is seen at dusk and at dawn for a month.
 */
export function disappearancesAround(marker: MarkerAtPlace): Disappearance[] {
  const crossings = marker.star.crossings;
  if (!crossings) return [];
  const { rising, setting } = crossings;
  const upRad = wrapTau(setting.siderealRad - rising.siderealRad);
  const travelRad = highestTravelRad(
    marker.year,
    marker.ground.latitude,
    rising.siderealRad,
    rising.siderealRad + upRad,
  );
  const { firstDay, lastDay } = marker.year.civil;
  const firstTurn = Math.floor((marker.year.sun.longitudeRad(firstDay) - rising.highestRad) / TAU) - 1;
  const lastTurn = Math.floor((marker.year.sun.longitudeRad(lastDay) - rising.highestRad) / TAU) + 1;

  const found: Disappearance[] = [];
  for (let turn = firstTurn; turn <= lastTurn; turn += 1) {
    const risingHighest = rising.highestRad + turn * TAU;
    // The evening end of a setting arc lies before the Sun's next highest point, hence one turn less.
    const settingHighest = risingHighest + travelRad - TAU;
    found.push({
      lastSettings: {
        firstMorning: expectedInTurn(marker, setting, PHENOMENON_FACTS['cosmical-setting'], settingHighest),
        lastEvening: expectedInTurn(marker, setting, PHENOMENON_FACTS['heliacal-setting'], settingHighest),
      },
      nextRisings: {
        firstMorning: expectedInTurn(marker, rising, PHENOMENON_FACTS['heliacal-rising'], risingHighest),
        lastEvening: expectedInTurn(marker, rising, PHENOMENON_FACTS['acronychal-rising'], risingHighest),
      },
    });
  }
  return found;
}
