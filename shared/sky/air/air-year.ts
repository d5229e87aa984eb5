import { expectedInTurn } from '../markers/expected-crossing.js';
import type { MarkerAtPlace } from '../markers/place-year.js';
import { occurrenceOf, phenomenonInYear } from '../markers/phenomenon-in-year.js';
import { PHENOMENON_FACTS } from '../phenomena/phenomenon-facts.js';
import { labelledDay } from '../time/civil-day.js';
import { monthOfDay } from '../time/civil-year.js';
import type { Occurrence, Site } from '../types.js';
import { thresholdOf } from '../visibility/threshold-sets.js';
import { CLARITIES, type Clarity, PHENOMENA, type Phenomenon, THRESHOLD_SETS } from '../vocabulary.js';
import type { AirOccurrence, AirPhenomenon, AirYear, ModelDay } from './air-types.js';
import { instantOfTurn, modelTurn, turnsAroundYear } from './model-year.js';
import { nightsAround } from './night-minutes.js';
import { type PlaceAir, placeAirOf } from './place-air.js';
import { sightingAt, watched, type Watched } from './sighting.js';

const MONTHS = Array.from({ length: 12 }, (_, index) => index + 1);

/** One value for each word, in the order of the list. */
function each<K extends string, T>(keys: readonly K[], valueOf: (key: K) => T): Record<K, T> {
  return Object.fromEntries(keys.map((key) => [key, valueOf(key)])) as Record<K, T>;
}

/** The phenomenon by the marker's own rule in one turn of the Sun. */
function byRule(marker: MarkerAtPlace, watch: Watched, highestRad: number): Occurrence | null {
  const expected = expectedInTurn(marker, watch.crossing, watch.facts, highestRad);
  return expected.jdUt === null ? null : occurrenceOf(marker, watch.facts, expected, expected.jdUt);
}

function byModel(watch: Watched, highestRad: number, placeAir: PlaceAir, clarity: Clarity): ModelDay | null {
  const { clock, year } = watch.marker;
  const turn = modelTurn(watch, highestRad, (month) => placeAir(month, clarity));
  if (turn === null) return null;
  const day = clock.dayOf(instantOfTurn(watch, turn));
  const sighting = sightingAt(watch, turn, placeAir(monthOfDay(day, year.civil.calendar), clarity));
  return sighting && { ...labelledDay(day), ...sighting };
}

/** Days of the model in one turn, and the minutes around all days of it. */
function occurrenceIn(
  watch: Watched,
  site: Site,
  placeAir: PlaceAir,
  highestRad: number,
  rule: Occurrence | null,
): AirOccurrence {
  const { marker, facts } = watch;
  const model = each(CLARITIES, (clarity) => byModel(watch, highestRad, placeAir, clarity));
  const days = [rule?.expected, ...CLARITIES.map((clarity) => model[clarity])].flatMap((day) =>
    day ? [day.dayNumber] : [],
  );
  const bySet = each(THRESHOLD_SETS, (thresholdSet) => {
    const settings = { ...marker.settings, thresholdSet };
    const threshold = thresholdOf(thresholdSet, marker.marker.vMag, marker.marker.override);
    return byRule({ ...marker, settings, threshold }, watch, highestRad);
  });
  const nights = facts.side === 'same' && days.length > 0 ? nightsAround(watch, site, placeAir, days) : [];
  return { rule, bySet, byModel: model, nights };
}

function phenomenonOf(
  marker: MarkerAtPlace,
  site: Site,
  placeAir: PlaceAir,
  phenomenon: Phenomenon,
): AirPhenomenon {
  const facts = PHENOMENON_FACTS[phenomenon];
  const crossing = marker.star.crossings?.[facts.crossing];
  const { outcome } = phenomenonInYear(marker, phenomenon);
  if (!crossing) return { phenomenon, outcome, occurrences: [] };
  const watch = watched(marker, facts, crossing);
  const { firstDay, lastDay } = marker.year.civil;
  const inYear = (day: { dayNumber: number } | null | undefined): boolean =>
    day !== null && day !== undefined && day.dayNumber >= firstDay && day.dayNumber <= lastDay;
  const turns = turnsAroundYear(marker, crossing).map((highestRad) => ({
    highestRad,
    rule: byRule(marker, watch, highestRad),
  }));
  // The rule's days say which occurrences are the year's; where it has none, those of the model do.
  const ruled = turns.filter(({ rule }) => inYear(rule?.expected));
  const occurrences = (ruled.length > 0 ? ruled : turns).map(({ highestRad, rule }) =>
    occurrenceIn(watch, site, placeAir, highestRad, rule),
  );
  return {
    phenomenon,
    outcome,
    occurrences:
      ruled.length > 0
        ? occurrences
        : occurrences.filter(({ byModel: model }) => CLARITIES.some((clarity) => inYear(model[clarity]))),
  };
}

/** The year of a marker in clear, ordinary and hazy air beside the published rules. */
export function airYearOf(marker: MarkerAtPlace, site: Site): AirYear {
  const placeAir = placeAirOf(site);
  return {
    markerKey: marker.marker.key,
    year: marker.year.civil.year,
    outcome: marker.star.outcome,
    outcomeDetail: marker.star.detail,
    phenomena: each(PHENOMENA, (phenomenon) => phenomenonOf(marker, site, placeAir, phenomenon)),
    extinctionMag: each(
      CLARITIES,
      (clarity) => MONTHS.reduce((sum, month) => sum + placeAir(month, clarity).magPerAirmass, 0) / 12,
    ),
  };
}
