import { daysBetween } from '#shared/kernel/iso-date.js';
import {
  changed,
  differs,
  MOVE_CAUSES,
  type DatedSide,
  type DayGrounds,
  type MoveCause,
  type MovedPlace,
} from './day-grounds.js';
import type { EntryWindow, PlannedDay } from './entry-model.js';
import { sameDayLater } from './rolled-window.js';

export interface CauseOfMove {
  cause: MoveCause;
  /** What this alone does to the day, later positive; null where it alone gives or takes the days altogether. */
  days: number | null;
}

export interface WhyMoved {
  /** The day that moved most, with how far; null where the days were gained or lost altogether. */
  moved: { point: PlannedDay; days: number } | null;
  /** Each alone, the strongest first. Empty where only several of them together have an effect. */
  causes: CauseOfMove[];
  /** What remains: the effect of several acting together, in days; 0 where the causes add up or no days can be counted. */
  togetherDays: number;
}

const POINTS = ['earliest', 'bestFrom', 'bestTo', 'lastAdvised'] as const satisfies readonly PlannedDay[];

/**
 * Why an entry's days moved from one side to the other: everything that differs is changed alone, on the grounds of the
 * older side, and the days are reckoned anew. What the causes leave over is told as such, because two changes can do more
 * or less together than each by itself. The older engine is not at hand: its part is how far today's engine stands from what
 * it said, on either side.
 * @param reckon the window that today's engine gives for these grounds
 * @returns null where nothing moved
 */
export function whyMoved<P extends MovedPlace>(
  before: DatedSide<P>,
  after: DatedSide<P>,
  reckon: (grounds: DayGrounds<P>) => EntryWindow | null,
): WhyMoved | null {
  const years = after.year - before.year;
  const moved = furthest(before.window, after.window, years);
  if (moved === null && (before.window === null) === (after.window === null)) return null;
  const differing = MOVE_CAUSES.filter((cause) => differs(cause, before, after));
  const [only] = differing;
  if (only !== undefined && differing.length === 1) {
    return { moved, causes: [{ cause: only, days: moved?.days ?? null }], togetherDays: 0 };
  }
  if (moved === null)
    return { moved, causes: givingOrTaking(before, after, differing, reckon), togetherDays: 0 };
  const base = reckon(before);
  const causes = differing
    .map((cause) => ({ cause, days: effectOf(cause, moved.point, before, after, base, reckon) }))
    .filter(({ days }) => days !== 0)
    .toSorted((a, b) => strength(b) - strength(a));
  const counted = causes.every(({ days }) => days !== null);
  const sum = causes.reduce((total, { days }) => total + (days ?? 0), 0);
  return { moved, causes, togetherDays: counted ? moved.days - sum : 0 };
}

/** The day that moved furthest, against the same day of the civil year; null where none did or one side has no days. */
function furthest(before: EntryWindow | null, after: EntryWindow | null, years: number): WhyMoved['moved'] {
  if (before === null || after === null) return null;
  const moves = POINTS.map((point) => ({ point, days: shift(before, after, point, years) }));
  const most = moves.reduce((far, move) => (Math.abs(move.days) > Math.abs(far.days) ? move : far));
  return most.days === 0 ? null : most;
}

function shift(before: EntryWindow, after: EntryWindow, point: PlannedDay, years: number): number {
  return daysBetween(sameDayLater(before[point], years), after[point]);
}

function effectOf<P extends MovedPlace>(
  cause: MoveCause,
  point: PlannedDay,
  before: DatedSide<P>,
  after: DatedSide<P>,
  base: EntryWindow | null,
  reckon: (grounds: DayGrounds<P>) => EntryWindow | null,
): number | null {
  if (base === null) return null;
  if (cause === 'engine') {
    const today = reckon(after);
    if (before.window === null || after.window === null || today === null) return null;
    return shift(before.window, base, point, 0) + shift(today, after.window, point, 0);
  }
  const alone = reckon(changed(cause, before, after));
  return alone === null ? null : shift(base, alone, point, cause === 'year' ? after.year - before.year : 0);
}

/** Causes that give or take the days by themselves; where none does, none is named. */
function givingOrTaking<P extends MovedPlace>(
  before: DatedSide<P>,
  after: DatedSide<P>,
  differing: readonly MoveCause[],
  reckon: (grounds: DayGrounds<P>) => EntryWindow | null,
): CauseOfMove[] {
  const had = before.window !== null;
  const has = (window: EntryWindow | null) => window !== null;
  const base = has(reckon(before));
  return differing
    .filter((cause) =>
      cause === 'engine' ? base !== had : base === had && has(reckon(changed(cause, before, after))) !== had,
    )
    .map((cause) => ({ cause, days: null }));
}

function strength({ days }: CauseOfMove): number {
  return days === null ? Infinity : Math.abs(days);
}
