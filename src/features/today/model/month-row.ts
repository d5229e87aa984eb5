import type { ComingMarker, OpenWindow } from '#shared/contracts/today.js';
import { dayNumberOf, readDate } from '#src/lib/days.js';
import { endOfNight } from '#src/lib/sky-words.js';
import type { DaySpan } from '#src/ui/pictures/day-span.js';
import type { RangeMark, RowWindow } from '#src/ui/pictures/ring-row.js';

/** The board's row of a day's month, with what of the calendar touches it. */
export interface MonthRow {
  span: DaySpan;
  today: number;
  ranges: { mark: RangeMark; coming: ComingMarker }[];
  windows: { row: RowWindow; open: OpenWindow }[];
}

export function monthRow(
  date: string,
  coming: readonly ComingMarker[],
  openWindows: readonly OpenWindow[],
): MonthRow {
  const { year, month, day } = readDate(date) ?? { year: 2000, month: 1, day: 1 };
  const first = dayNumberOf({ year, month, day: 1 });
  const next = month === 12 ? { year: year + 1, month: 1, day: 1 } : { year, month: month + 1, day: 1 };
  const span = { first, last: dayNumberOf(next) - 1 };
  const touches = (from: number, to: number) => to >= span.first && from <= span.last;

  const ranges = coming.flatMap((each) => {
    const { early, expected, late } = each.occurrence;
    const mark: RangeMark = {
      key: `${each.marker.markerKey} ${each.phenomenon}`,
      early: early?.dayNumber ?? null,
      expected: expected.dayNumber,
      late: late?.dayNumber ?? null,
      side: endOfNight(each.phenomenon),
    };
    const from = mark.early ?? mark.expected;
    return touches(from, mark.late ?? mark.expected) ? [{ mark, coming: each }] : [];
  });
  const windows = openWindows.map((open) => ({
    open,
    row: {
      key: open.entryId,
      days: {
        earliest: number(open.window.earliest),
        bestFrom: number(open.window.bestFrom),
        bestTo: number(open.window.bestTo),
        lastAdvised: number(open.window.lastAdvised),
      },
    },
  }));
  return { span, today: first + day - 1, ranges, windows };
}

function number(iso: string): number {
  const date = readDate(iso);
  return date === null ? 0 : dayNumberOf(date);
}
