import { occurrenceDaysOf } from '#shared/calendar/entry-dates.js';
import type { DriftAnswer } from '#shared/contracts/drift.js';
import {
  PHENOMENA,
  type DriftEpoch,
  type Figure,
  type MarkerDrift,
  type Phenomenon,
} from '#shared/sky/index.js';
import { markerNamesOf } from '../stars/marker-names.service.js';

export function toDriftAnswer(
  drift: MarkerDrift,
  { from, to, figures }: { from: number; to: number; figures: readonly Figure[] },
): DriftAnswer {
  return {
    ...markerNamesOf(drift.markerKey, figures),
    from,
    to,
    epochs: drift.epochs.map(({ year, outcome, outcomeDetail, phenomena }) => ({
      year,
      outcome,
      outcomeDetail,
      phenomena: forEachPhenomenon((phenomenon) => toDays(phenomena[phenomenon])),
    })),
    daysPerCentury: { ...drift.daysPerCentury },
    turns: drift.turns.map((turn) => ({ ...turn })),
    basis: { ...drift.basis, clarityByMonth: [...drift.basis.clarityByMonth] },
  };
}

function toDays({ outcome, occurrences }: DriftEpoch['phenomena'][Phenomenon]) {
  return {
    outcome,
    occurrences: occurrences.map((day) => ({
      ...occurrenceDaysOf(day),
      sunLongitudeDeg: day.sunLongitudeDeg,
    })),
  };
}

function forEachPhenomenon<T>(make: (phenomenon: Phenomenon) => T): Record<Phenomenon, T> {
  return Object.fromEntries(PHENOMENA.map((phenomenon) => [phenomenon, make(phenomenon)])) as Record<
    Phenomenon,
    T
  >;
}
