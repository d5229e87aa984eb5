import { labelled, occurrenceDaysOf } from '#shared/calendar/entry-dates.js';
import type { AirAnswer, AirOccurrence, ModelDay } from '#shared/contracts/air.js';
import type { MarkerNames } from '#shared/contracts/stars.js';
import { CLARITIES, PHENOMENA, THRESHOLD_SETS } from '#shared/sky/index.js';
import type {
  AirOccurrence as SkyAirOccurrence,
  AirYear,
  Basis,
  ModelDay as SkyModelDay,
} from '#shared/sky/index.js';

export function toAirAnswer(placeId: string, names: MarkerNames, air: AirYear, basis: Basis): AirAnswer {
  return {
    ...names,
    placeId,
    year: air.year,
    outcome: air.outcome,
    outcomeDetail: air.outcomeDetail,
    phenomena: each(PHENOMENA, (phenomenon) => {
      const { outcome, occurrences } = air.phenomena[phenomenon];
      return { outcome, occurrences: occurrences.map(toOccurrence) };
    }),
    extinctionMag: { ...air.extinctionMag },
    basis: { ...basis, clarityByMonth: [...basis.clarityByMonth] },
  };
}

function toOccurrence({ rule, bySet, byModel, nights }: SkyAirOccurrence): AirOccurrence {
  return {
    rule: rule && occurrenceDaysOf(rule),
    ruleClarity: rule?.clarity ?? null,
    ruleWidth: rule?.width ?? null,
    bySet: each(THRESHOLD_SETS, (set) => {
      const occurrence = bySet[set];
      return occurrence && occurrenceDaysOf(occurrence);
    }),
    byModel: each(CLARITIES, (clarity) => toModelDay(byModel[clarity])),
    nights: nights.map(({ dayNumber, byClarity, underMoon }) => ({
      dayNumber,
      byClarity: { ...byClarity },
      underMoon,
    })),
  };
}

function toModelDay(day: SkyModelDay | null): ModelDay | null {
  return day && { ...labelled(day), minutes: day.minutes };
}

/** One value for each word of a list. */
function each<K extends string, T>(keys: readonly K[], valueOf: (key: K) => T): Record<K, T> {
  return Object.fromEntries(keys.map((key) => [key, valueOf(key)])) as Record<K, T>;
}
