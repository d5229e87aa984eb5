import type { AirOccurrence } from '#shared/contracts/air.js';
import type { CivilDay } from '#shared/contracts/stars.js';
import { CLARITIES } from '#shared/sky/vocabulary.js';

/** By how many days the model's day moves from clear to hazy air; null where one of them has none. */
export function spreadDays({ byModel }: AirOccurrence): number | null {
  const days = CLARITIES.map((clarity) => byModel[clarity]?.dayNumber ?? Number.NaN);
  const spread = Math.max(...days) - Math.min(...days);
  return Number.isNaN(spread) ? null : spread;
}

export type Agreement = 'inside' | 'partly' | 'outside';

/** Where the model's days lie to the rule's range; null where there is nothing to compare. An open end holds everything. */
export function agreementOf({ rule, byModel }: AirOccurrence): Agreement | null {
  const days = CLARITIES.flatMap((clarity) => byModel[clarity]?.dayNumber ?? []);
  if (rule === null || days.length === 0) return null;
  const from = rule.early?.dayNumber ?? Number.NEGATIVE_INFINITY;
  const to = rule.late?.dayNumber ?? Number.POSITIVE_INFINITY;
  const inside = days.filter((day) => day >= from && day <= to).length;
  if (inside === 0) return 'outside';
  return inside === days.length ? 'inside' : 'partly';
}

/** A known day of an occurrence: dates of days beside it are counted from its label. */
export function anchorOf({ rule, byModel }: AirOccurrence): CivilDay | null {
  return rule?.expected ?? CLARITIES.map((clarity) => byModel[clarity]).find((day) => day !== null) ?? null;
}
