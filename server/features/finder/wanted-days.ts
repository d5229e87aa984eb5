import type { WantedDays } from '#shared/calendar/marker-ranking.js';
import { WANTED_DAYS_MAX, type FinderQuery } from '#shared/contracts/finder.js';
import { civilDateOf, dayNumberOf } from '#shared/kernel/iso-date.js';
import { invalidField } from '../../http/app-error.js';

/** The days that a query names in its year; a stretch that ends before it begins runs over New Year. */
export function askedDays({ year, from, to = from }: FinderQuery): WantedDays | null {
  if (from === undefined || to === undefined) return null;
  const first = dayOf(year, from);
  const sameYear = dayOf(year, to);
  const last = sameYear < first ? dayOf(year + 1, to) : sameYear;
  if (last - first >= WANTED_DAYS_MAX) {
    throw invalidField('to', 'span-too-long');
  }
  return { from: first, to: last };
}

/** The civil years that days and a stretch to both sides of them touch, ascending. */
export function yearsAround(wanted: WantedDays, reachDays: number): number[] {
  const first = civilDateOf(wanted.from - reachDays).year;
  const last = civilDateOf(wanted.to + reachDays).year;
  return Array.from({ length: last - first + 1 }, (_, index) => first + index);
}

function dayOf(year: number, monthDay: string): number {
  return dayNumberOf(year, Number(monthDay.slice(0, 2)), Number(monthDay.slice(3)));
}
