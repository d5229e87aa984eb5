import type { MonthDay } from '#shared/contracts/common.js';
import { dayNumberOf } from '#shared/kernel/iso-date.js';
import type { DaySpan } from '#src/ui/pictures/day-span.js';

export const ZOOMS = ['year', 'season', 'month'] as const;
export type Zoom = (typeof ZOOMS)[number];

const LENGTH_DAYS: Record<Exclude<Zoom, 'year'>, number> = { season: 92, month: 31 };

/** The year that a strip shows: the civil one, or from the day on which the local year begins in it. */
export function wholeSpan(year: number, localStart: MonthDay | null): DaySpan {
  const { month, day } = localStart ?? { month: 1, day: 1 };
  return { first: dayNumberOf(year, month, day), last: dayNumberOf(year + 1, month, day) - 1 };
}

/** The part of the year that is shown, around a day; it never reaches over the year's ends. */
export function zoomedSpan(zoom: Zoom, whole: DaySpan, centreDay: number): DaySpan {
  if (zoom === 'year') return whole;
  const length = LENGTH_DAYS[zoom];
  const latest = whole.last - length + 1;
  const first = Math.max(whole.first, Math.min(latest, Math.round(centreDay - length / 2)));
  return { first, last: first + length - 1 };
}

export function centreOf({ first, last }: DaySpan): number {
  return Math.round((first + last) / 2);
}

/** The middle of the next part, two thirds further; it stays where the year ends. */
export function nextCentre(zoom: Zoom, whole: DaySpan, centreDay: number, direction: 1 | -1): number {
  const span = zoomedSpan(zoom, whole, centreDay);
  const stepDays = Math.round(((span.last - span.first + 1) * 2) / 3);
  return centreOf(zoomedSpan(zoom, whole, centreOf(span) + direction * stepDays));
}

/** Closer (1) or wider (−1); the ends stay. */
export function zoomedBy(zoom: Zoom, step: 1 | -1): Zoom {
  return ZOOMS[Math.max(0, Math.min(ZOOMS.length - 1, ZOOMS.indexOf(zoom) + step))] ?? zoom;
}
