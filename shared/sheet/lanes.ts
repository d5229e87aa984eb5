import type { MonthSpan } from './spans.js';

/** The part of a span that one row of holes (a week, or a tile's columns) shows. */
export interface RowSpan {
  readonly span: MonthSpan;
  readonly from: number;
  readonly to: number;
  readonly lane: number;
}

export interface RowLanes {
  readonly placed: readonly RowSpan[];
  /** Spans for which the row has no lane left; they are named instead of drawn. */
  readonly left: readonly MonthSpan[];
  readonly laneCount: number;
}

/**
 * Puts the spans that touch the days `from`–`to` into lanes, each into the lowest that is free, markers first
 * and then in the order given. Where more lanes are needed than there are, the lowest lane is kept free for
 * the names of those left over.
 */
export function lanesOfRow(
  spans: readonly MonthSpan[],
  from: number,
  to: number,
  maxLanes: number,
): RowLanes {
  const touching = spans.filter((span) => span.from <= to && span.to >= from);
  const all = fill(touching, from, to, maxLanes);
  return all.left.length === 0 ? all : fill(touching, from, to, maxLanes - 1);
}

/** The part of a longer row of lanes that the days `from`–`to` show, every span still in its lane. */
export function cutLanes(lanes: RowLanes, from: number, to: number): RowLanes {
  return {
    placed: lanes.placed
      .filter((span) => span.from <= to && span.to >= from)
      .map((span) => ({ ...span, from: Math.max(span.from, from), to: Math.min(span.to, to) })),
    left: lanes.left.filter((span) => span.from <= to && span.to >= from),
    laneCount: lanes.laneCount,
  };
}

function fill(touching: readonly MonthSpan[], from: number, to: number, maxLanes: number): RowLanes {
  const lanes: RowSpan[][] = [];
  const left: MonthSpan[] = [];
  for (const span of touching) {
    const first = Math.max(span.from, from);
    const last = Math.min(span.to, to);
    const free = lanes.findIndex((lane) => lane.every((other) => other.to < first || other.from > last));
    const lane = free === -1 ? lanes.length : free;
    if (lane >= maxLanes) {
      left.push(span);
      continue;
    }
    (lanes[lane] ??= []).push({ span, from: first, to: last, lane });
  }
  return { placed: lanes.flat(), left, laneCount: lanes.length };
}
