import type { Clarity } from '#shared/sky/vocabulary.js';

/** Months (0…11) of each clarity. */
export function monthsByClarity(clarityByMonth: readonly Clarity[]): Record<Clarity, number[]> {
  const months: Record<Clarity, number[]> = { clear: [], ordinary: [], hazy: [] };
  clarityByMonth.forEach((clarity, month) => {
    months[clarity].push(month);
  });
  return months;
}
