import { civilDateOf } from '../kernel/iso-date.js';

/**
 * How much of the days on which a sign may come falls into months in which rain and cloud usually hide the sky.
 * @param days day numbers, both included
 * @param rainMonths twelve months, January first
 */
export function rainClashOf(
  days: { from: number; to: number },
  rainMonths: readonly boolean[],
): 'none' | 'partly' | 'whole' {
  let wet = 0;
  for (let day = days.from; day <= days.to; day += 1) {
    if (rainMonths[civilDateOf(day).month - 1]) wet += 1;
  }
  if (wet === 0) return 'none';
  return wet === days.to - days.from + 1 ? 'whole' : 'partly';
}
