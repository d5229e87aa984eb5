import { civilDate, daysInMonth, isoOf } from './civil-days.js';
import type { SheetEntry, SheetMarker } from './sheet-model.js';

/** Days of one month, counted 1 to 31, both ends included. */
export interface DayRange {
  readonly from: number;
  readonly to: number;
}

/** One stretch of a bar and how it is drawn. */
export interface BarPart extends DayRange {
  readonly look: 'best' | 'margin' | 'watch';
}

/** What one marker or entry puts under the holes of one month. */
export interface MonthSpan extends DayRange {
  readonly kind: 'marker' | 'entry';
  /** The letter or the number that names it. */
  readonly tag: string;
  readonly order: number;
  readonly parts: readonly BarPart[];
  /** The marker's expected day, or the entry's single fixed day, where it falls into this month. */
  readonly point: number | null;
  /** The last advised day where the bar ends on it in this month. */
  readonly stop: number | null;
  /** Whether the span really begins and ends here, or comes from or goes on into another month. */
  readonly begins: boolean;
  readonly ends: boolean;
}

interface Stretch {
  readonly from: string;
  readonly to: string;
  readonly look: BarPart['look'];
}

/**
 * The stretches of an entry's bar over the years' edge and all: early margin, best days, late margin.
 * A last advised day ends the bar even where the window goes on, except for a watch.
 */
export function entryStretches(entry: SheetEntry): Stretch[] {
  const { earliest, bestFrom, bestTo, latest } = entry.window;
  const start = earliest ?? bestFrom ?? bestTo ?? latest ?? entry.fixedDate;
  const end = latest ?? bestTo ?? bestFrom ?? earliest ?? entry.fixedDate;
  if (start === null || end === null) return [];
  if (entry.isWatch) return start <= end ? [{ from: start, to: end, look: 'watch' }] : [];

  const last = entry.lastAdvised !== null && entry.lastAdvised.date < end ? entry.lastAdvised.date : end;
  const best = bestRange(
    bestFrom ?? (bestTo === null ? null : start),
    bestTo ?? (bestFrom === null ? null : end),
  );
  const stretches: Stretch[] =
    best === null
      ? [{ from: start, to: end, look: 'margin' }]
      : [
          { from: start, to: dayBefore(best.from), look: 'margin' },
          { from: best.from, to: best.to, look: 'best' },
          { from: dayAfter(best.to), to: end, look: 'margin' },
        ];
  return stretches
    .map((stretch) => ({ ...stretch, to: stretch.to < last ? stretch.to : last }))
    .filter((stretch) => stretch.from <= stretch.to);
}

function bestRange(from: string | null, to: string | null): { from: string; to: string } | null {
  return from !== null && to !== null && from <= to ? { from, to } : null;
}

/** Where the marker can show itself: its range, or its expected day alone. */
export function markerRange(marker: SheetMarker): { from: string; to: string } | null {
  if (marker.expected === null) return null;
  return {
    from: marker.early !== null && marker.early < marker.expected ? marker.early : marker.expected,
    to: marker.late !== null && marker.late > marker.expected ? marker.late : marker.expected,
  };
}

/** Everything that has to be drawn under the holes of a month, markers first, then entries by their number. */
export function spansOfMonth(
  year: number,
  month: number,
  markers: readonly SheetMarker[],
  entries: readonly SheetEntry[],
): MonthSpan[] {
  const first = isoOf(year, month, 1);
  const last = isoOf(year, month, daysInMonth(year, month));
  const inMonth = (date: string): number | null =>
    date >= first && date <= last ? civilDate(date).day : null;
  const clip = (from: string, to: string): DayRange | null => {
    if (to < first || from > last) return null;
    return { from: inMonth(from) ?? 1, to: inMonth(to) ?? daysInMonth(year, month) };
  };

  const spans: MonthSpan[] = [];
  markers.forEach((marker, index) => {
    const range = markerRange(marker);
    const days = range && clip(range.from, range.to);
    if (!range || !days) return;
    spans.push({
      ...days,
      kind: 'marker',
      tag: marker.letter,
      order: index,
      parts: [],
      point: marker.expected === null ? null : inMonth(marker.expected),
      stop: null,
      begins: inMonth(range.from) !== null,
      ends: inMonth(range.to) !== null,
    });
  });

  entries.forEach((entry, index) => {
    const stretches = entryStretches(entry);
    const parts = stretches.flatMap((stretch) => {
      const days = clip(stretch.from, stretch.to);
      return days ? [{ ...days, look: stretch.look }] : [];
    });
    const point = entry.fixedDate === null ? null : inMonth(entry.fixedDate);
    const days = [...parts.flatMap((part) => [part.from, part.to]), ...(point === null ? [] : [point])];
    if (days.length === 0) return;
    const end = stretches.at(-1)?.to;
    spans.push({
      from: Math.min(...days),
      to: Math.max(...days),
      kind: 'entry',
      tag: String(entry.number),
      order: index,
      parts,
      point,
      stop: !entry.isWatch && entry.lastAdvised?.date === end && end !== undefined ? inMonth(end) : null,
      begins: stretches[0] === undefined || inMonth(stretches[0].from) !== null,
      ends: end === undefined || inMonth(end) !== null,
    });
  });
  return spans;
}

function dayBefore(date: string): string {
  const { year, month, day } = civilDate(date);
  if (day > 1) return isoOf(year, month, day - 1);
  return month > 1 ? isoOf(year, month - 1, daysInMonth(year, month - 1)) : isoOf(year - 1, 12, 31);
}

function dayAfter(date: string): string {
  const { year, month, day } = civilDate(date);
  if (day < daysInMonth(year, month)) return isoOf(year, month, day + 1);
  return month < 12 ? isoOf(year, month + 1, 1) : isoOf(year + 1, 1, 1);
}

/** Whether anything of an entry falls into the sheet's year. */
export function touchesYear(entry: SheetEntry, year: number): boolean {
  const within = (from: string, to: string): boolean =>
    from <= isoOf(year, 12, 31) && to >= isoOf(year, 1, 1);
  return (
    entryStretches(entry).some(({ from, to }) => within(from, to)) ||
    (entry.fixedDate !== null && within(entry.fixedDate, entry.fixedDate))
  );
}
