/** A run of days along a picture, by day number; both ends belong to it. */
export interface DaySpan {
  first: number;
  last: number;
}

/** Where a day begins along the span, in percent of its length. Half days are allowed: 0.5 is the middle. */
export function startPercent(dayNumber: number, span: DaySpan): number {
  return ((dayNumber - span.first) / (span.last - span.first + 1)) * 100;
}

/** The part of `from…to` that lies within the span, as start and width in percent; null for none. */
export function stretch(from: number, to: number, span: DaySpan): { start: number; width: number } | null {
  const first = Math.max(from, span.first);
  const last = Math.min(to, span.last);
  if (last < first) return null;
  const start = startPercent(first, span);
  return { start, width: startPercent(last + 1, span) - start };
}

export function percent(value: number): string {
  return `${String(Math.round(value * 1000) / 1000)}%`;
}
