import { sameJson } from '#shared/kernel/canonical-json.js';
import { dayNumberOf } from '#shared/kernel/iso-date.js';
import type { EntryOffsets, MonthDay } from './entry-model.js';
import type { DateCell, ImportDateProblem } from './import-dates.js';
import type { NamedSign } from './import-signs.js';

/** The columns of a line that say when. */
export const WINDOW_DAYS = ['earliest', 'bestFrom', 'bestTo', 'lastAdvised'] as const;
export type WindowDay = (typeof WINDOW_DAYS)[number];
export type OffsetColumn = `${WindowDay}Days`;

export interface WindowCells {
  /** What leads: a sign, or a day of the civil year. */
  when: DateCell;
  days: Readonly<Record<WindowDay, DateCell>>;
  /** Days from what leads; null where the cell is empty. */
  offsetsDays: Readonly<Record<OffsetColumn, number | null>>;
}

export type WindowProblem =
  | ImportDateProblem
  | 'date-missing'
  | 'mixed-dates'
  | 'days-missing'
  /** At the first of two days that are probably the wrong way round, and at the second of them. */
  | 'swapped-first'
  | 'swapped-second';

interface WindowIssue {
  column: 'when' | WindowDay | OffsetColumn;
  problem: WindowProblem;
}

/** What a line's days come to, or what is the matter, by column. */
export type WindowRead =
  | { problems: readonly WindowIssue[] }
  | { problems: readonly []; lead: NamedSign | { type: 'day'; date: MonthDay }; offsets: EntryOffsets };

const DAYS_OF_A_YEAR = 365;
/** Over the year's end from one day to the next one; where it would be longer, the two are probably the wrong way round. */
export const LONGEST_OVER_YEARS_END_DAYS = 183;
/** Which day of a ten-day part a column means. */
const EDGE = {
  ...{ when: 'first', earliest: 'first', bestFrom: 'first', bestTo: 'last', lastAdvised: 'last' },
} as const satisfies Record<'when' | WindowDay, 'first' | 'last'>;

/**
 * What leads a line and how many days before and after it its window lies. A sign leads where one is named, in the column
 * for it or in the days themselves; then the margins may still come from plain days, whose distance is what counts. Else
 * the first best day leads. A later day that lies before an earlier one is the next year's, save where that is so far off
 * that the two are probably the wrong way round; both with their years are taken as they stand.
 */
export function windowOfCells({ when, days, offsetsDays }: WindowCells): WindowRead {
  const all = [['when', when] as const, ...WINDOW_DAYS.map((name) => [name, days[name]] as const)];
  const broken = all.flatMap(([column, cell]) =>
    cell.kind === 'problem' ? [{ column, problem: cell.problem }] : [],
  );
  if (broken.length > 0) return { problems: broken };
  const swapped = swappedDays(when, days, offsetsDays);
  if (swapped.length > 0) return { problems: swapped };
  const named = all.flatMap(([column, cell]) => (cell.kind === 'sign' ? [{ column, ...cell }] : []));
  const [first] = named;
  if (first === undefined) return byDays(when, days, offsetsDays);
  const other = named.find(({ sign }) => !sameJson(sign, first.sign));
  if (other) return { problems: [{ column: other.column, problem: 'mixed-dates' }] };
  return bySign(first.sign, when, days, offsetsDays);
}

function bySign(
  lead: NamedSign,
  when: DateCell,
  days: WindowCells['days'],
  offsetsDays: WindowCells['offsetsDays'],
): WindowRead {
  const own = (name: WindowDay): number | null => {
    const cell = days[name];
    return offsetsDays[`${name}Days`] ?? (cell.kind === 'sign' ? cell.offsetDays : null);
  };
  const base = when.kind === 'sign' && when.offsetDays !== 0 ? when.offsetDays : null;
  const from = own('bestFrom') ?? base;
  if (from === null) return { problems: [{ column: 'bestFromDays', problem: 'days-missing' }] };
  const to = own('bestTo') ?? from + (apart(days, 'bestFrom', 'bestTo') ?? 0);
  return {
    problems: [],
    lead,
    offsets: {
      earliestDays: own('earliest') ?? from - (apart(days, 'earliest', 'bestFrom') ?? 0),
      bestFromDays: from,
      bestToDays: to,
      lastAdvisedDays: own('lastAdvised') ?? to + (apart(days, 'bestTo', 'lastAdvised') ?? 0),
    },
  };
}

function byDays(
  when: DateCell,
  days: WindowCells['days'],
  offsetsDays: WindowCells['offsetsDays'],
): WindowRead {
  const start = when.kind === 'day' ? when : days.bestFrom.kind === 'day' ? days.bestFrom : days.earliest;
  if (start.kind !== 'day') return { problems: [{ column: 'bestFrom', problem: 'date-missing' }] };
  const lead = start.first;
  const after = (cell: DateCell, end: 'first' | 'last') =>
    cell.kind === 'day' ? forward(lead, cell[end]) : null;
  const before = days.earliest.kind === 'day' ? -forward(days.earliest.first, lead) : null;
  const from = offsetsDays.bestFromDays ?? fromLead(when, days, after);
  const to = offsetsDays.bestToDays ?? toLead(start, days, from, after);
  return {
    problems: [],
    lead: { type: 'day', date: lead },
    offsets: {
      earliestDays: offsetsDays.earliestDays ?? before ?? from,
      bestFromDays: from,
      bestToDays: to,
      lastAdvisedDays: offsetsDays.lastAdvisedDays ?? after(days.lastAdvised, 'last') ?? to,
    },
  };
}

/** Where a day of its own leads, the best days may begin before it. */
function fromLead(
  when: DateCell,
  { bestFrom }: WindowCells['days'],
  after: (cell: DateCell, end: 'first' | 'last') => number | null,
): number {
  const days = after(bestFrom, 'first') ?? 0;
  const isBefore = when.kind === 'day' && days > DAYS_OF_A_YEAR / 2;
  return isBefore ? days - DAYS_OF_A_YEAR : days;
}

function toLead(
  start: DateCell,
  { bestTo }: WindowCells['days'],
  from: number,
  after: (cell: DateCell, end: 'first' | 'last') => number | null,
): number {
  return Math.max(after(bestTo, 'last') ?? after(start, 'last') ?? from, from);
}

/** Days from one plain day to the next that comes; null where either is none. */
function apart(days: WindowCells['days'], sooner: WindowDay, later: WindowDay): number | null {
  const [from, to] = [days[sooner], days[later]];
  if (from.kind !== 'day' || to.kind !== 'day') return null;
  return forward(from[EDGE[sooner]], to[EDGE[later]]);
}

/** The first two days that are probably the wrong way round; days that stand in numbers are not measured. */
function swappedDays(
  when: DateCell,
  days: WindowCells['days'],
  offsetsDays: WindowCells['offsetsDays'],
): WindowIssue[] {
  for (const lead of ['bestFrom', 'when'] as const) {
    const row = (['earliest', lead, 'bestTo', 'lastAdvised'] as const).flatMap((column) => {
      const cell = column === 'when' ? when : days[column];
      return cell.kind === 'day' ? [{ column, date: cell[EDGE[column]], year: cell.year }] : [];
    });
    for (const [index, later] of row.entries()) {
      const sooner = row[index - 1];
      if (sooner === undefined || !isFarOverYearsEnd(sooner, later)) continue;
      const counted = later.column === 'bestFrom' || later.column === 'when' ? 'earliest' : later.column;
      if (offsetsDays[`${counted}Days`] !== null) continue;
      return [
        { column: sooner.column, problem: 'swapped-first' },
        { column: later.column, problem: 'swapped-second' },
      ];
    }
  }
  return [];
}

/** A day of a table, with its year where it names one. */
export interface DatedDay {
  date: MonthDay;
  year: number | null;
}

/** Are two days probably the wrong way round? Not where both name their years. */
export function isFarOverYearsEnd(sooner: DatedDay, later: DatedDay): boolean {
  const isOverYearsEnd = numberOf(later.date) < numberOf(sooner.date);
  const isSaidSo = sooner.year !== null && later.year !== null && later.year > sooner.year;
  return isOverYearsEnd && !isSaidSo && forward(sooner.date, later.date) > LONGEST_OVER_YEARS_END_DAYS;
}

/** By a year without a leap day, as a day of every year is. */
function forward(from: MonthDay, to: MonthDay): number {
  const days = numberOf(to) - numberOf(from);
  return days < 0 ? days + DAYS_OF_A_YEAR : days;
}

function numberOf({ month, day }: MonthDay): number {
  return dayNumberOf(1, month, day);
}
